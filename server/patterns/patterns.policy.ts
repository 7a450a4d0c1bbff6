import type { User } from '../http/deps.ts';

/** Only who brought a pattern in may see, change or delete it, its revisions, its files and its drafts. */
export const canUsePattern = (user: Pick<User, 'id'>, thing: { ownerId: string }): boolean =>
  thing.ownerId === user.id;
