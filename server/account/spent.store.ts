import { createHash } from 'node:crypto';
import { and, eq, lt } from 'drizzle-orm';
import type { Db } from '../db/client.ts';
import { ERRNO, errnoOf } from '../db/errors.ts';
import { spentToken, verification } from './account.table.ts';

/**
 * Spends what works once; false where it was spent before. Of two requests at once the second waits for the first, and finds
 * it spent where that one was committed.
 */
export async function spend(tx: Db, userId: string, secret: string, expiresAt: Date): Promise<boolean> {
  const hash = createHash('sha256').update(`${userId} ${secret}`).digest('hex');
  const hasRunOut = lt(spentToken.expiresAt, new Date());
  await tx.delete(spentToken).where(and(eq(spentToken.userId, userId), hasRunOut));
  try {
    await tx.insert(spentToken).values({ hash, userId, expiresAt });
    return true;
  } catch (error) {
    if (errnoOf(error) === ERRNO.duplicate) return false;
    throw error;
  }
}

/** Makes worthless every link for a new password that is still out, and every sign-in that waits for its code. */
export async function forgetLinks(tx: Db, userId: string): Promise<void> {
  await tx.delete(verification).where(eq(verification.value, userId));
}
