import type { User } from '../http/deps.ts';

/** Only who saved a plan may see, rename or delete it. */
export const canUsePlan = (user: Pick<User, 'id'>, plan: { ownerId: string }): boolean =>
  plan.ownerId === user.id;
