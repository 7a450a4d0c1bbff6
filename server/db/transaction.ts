import { setTimeout as wait } from 'node:timers/promises';
import type { MySqlTransactionConfig } from 'drizzle-orm/mysql-core';
import type { Db } from './client.ts';
import { ERRNO, errnoOf } from './errors.ts';

const ATTEMPTS = 5;
const PAUSE_MS = 20;

/**
 * Runs the work in one transaction and begins again where the database chose it as the victim of a deadlock.
 * The work must use the `tx` it is given: anything else runs on another connection, outside the transaction.
 */
export async function inTransaction<T>(
  db: Db,
  work: (tx: Db) => Promise<T>,
  config?: MySqlTransactionConfig,
): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await db.transaction((tx) => work(tx), config);
    } catch (error) {
      const errno = errnoOf(error);
      const isVictim = errno === ERRNO.deadlock || errno === ERRNO.changedSinceRead;
      if (!isVictim || attempt === ATTEMPTS) throw error;
      await wait(PAUSE_MS * attempt * (0.5 + Math.random()));
    }
  }
}
