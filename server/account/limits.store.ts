import { createHash } from 'node:crypto';
import { eq, lt, sql } from 'drizzle-orm';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { inTransaction } from '../db/transaction.ts';
import { rateLimit } from './account.table.ts';

/** At most `max` times in `window` seconds, counted from the first. */
export interface LimitRule {
  window: number;
  max: number;
}

const FORGOTTEN_AFTER_MS = 24 * 3_600_000;

/**
 * Counts one more under the key, in one statement, so that any number of processes and of requests at once count right. A
 * count that is full does not begin anew before its window has passed, however often it is asked.
 */
export async function countOne(
  db: Db,
  key: string,
  { window, max }: LimitRule,
): Promise<{ allowed: boolean; retryAfter: number | null }> {
  const now = Date.now();
  return inTransaction(
    db,
    async (tx) => {
      const isOver = sql`${rateLimit.lastRequest} <= ${now - window * 1000}`;
      // MariaDB sets these in order, and each sees what the one before has set: the count comes first.
      await tx
        .insert(rateLimit)
        .values({ id: newId(), key, count: 1, lastRequest: now })
        .onDuplicateKeyUpdate({
          set: {
            count: sql`IF(${isOver}, 1, LEAST(${rateLimit.count} + 1, ${max + 1}))`,
            lastRequest: sql`IF(${isOver}, ${now}, ${rateLimit.lastRequest})`,
          },
        });
      // Read back: a full count stays as it is, and the driver reports a row that stays as it reports a new one.
      const [row] = await tx
        .select({ count: rateLimit.count, since: rateLimit.lastRequest })
        .from(rateLimit)
        .where(eq(rateLimit.key, key));
      if (row?.count === 1) {
        await tx
          .delete(rateLimit)
          .where(lt(rateLimit.lastRequest, now - FORGOTTEN_AFTER_MS))
          .limit(100);
      }
      if (row === undefined || row.count <= max) return { allowed: true, retryAfter: null };
      return { allowed: false, retryAfter: Math.max(1, Math.ceil((row.since + window * 1000 - now) / 1000)) };
    },
    { isolationLevel: 'read committed' },
  );
}

/** Forgets what was counted under the key. */
export async function forgetCount(db: Db, key: string): Promise<void> {
  await db.delete(rateLimit).where(eq(rateLimit.key, key));
}

/** A key for something about an address, in which the address cannot be read. */
export function addressKey(what: string, email: string): string {
  return `${what}|${createHash('sha256').update(email.toLowerCase()).digest('hex')}`;
}
