import type { User } from '../http/deps.ts';

/** Only who wrote a person down may see, change or delete them and their measurements. */
export const canUsePerson = (user: Pick<User, 'id'>, person: { ownerId: string }): boolean =>
  person.ownerId === user.id;
