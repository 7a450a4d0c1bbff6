import type { Request } from 'express';
import type { Logger } from 'pino';
import type { Me } from '../../shared/me.ts';
import type { Db } from '../db/client.ts';

/** Who is signed in. */
export type User = NonNullable<Me['user']>;

/** What every noun's routes are given. */
export interface RouteDeps {
  db: Db;
  log: Logger;
  /** Who asks, or null. */
  currentUser: (request: Request) => Promise<User | null>;
  /** Who asks; throws 401 where nobody is signed in. A route asks this before it reads anything that was sent. */
  requireUser: (request: Request) => Promise<User>;
}
