import type { User } from '../http/deps.ts';
import { Problem } from '../http/problem.ts';

/** Only an administrator sees and changes who may do what. What people keep is no part of it. */
export const canAdminister = (user: Pick<User, 'role'>): boolean => user.role === 'admin';

/** The same person where they may; 403 where not. */
export function requireAdmin(user: User): User {
  if (canAdminister(user)) return user;
  throw new Problem('forbidden', { detail: 'This is for the administrators of this instance.' });
}
