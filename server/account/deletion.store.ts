import { eq, inArray, or } from 'drizzle-orm';
import type { Db } from '../db/client.ts';
import { inTransaction } from '../db/transaction.ts';
import { outbox } from '../mail/mail.table.ts';
import { mailboxMessage } from '../mailbox/mailbox.table.ts';
import { storedFile } from '../patterns/files.table.ts';
import { importDraft, pattern, patternRevision } from '../patterns/patterns.table.ts';
import { measurementSet, person } from '../people/people.table.ts';
import { savedPlan } from '../plans/plans.table.ts';
import { rateLimit, user, verification } from './account.table.ts';
import { addressKey } from './limits.store.ts';

/**
 * Deletes an account and all that is its own, for good; answers whose bytes are to be removed. What belongs to the account
 * by a foreign key with a rule of its own (sessions, tokens, second factor, requests) goes with its row.
 */
export async function deleteAccount(db: Db, userId: string): Promise<string[]> {
  return inTransaction(db, async (tx) => {
    // Whoever adds something to the account meanwhile waits here, and then finds it gone.
    const [held] = await tx.select({ email: user.email }).from(user).where(eq(user.id, userId)).for('update');
    if (held === undefined) return [];
    await deletePlansAndPeople(tx, userId);
    const files = await deletePatterns(tx, userId);
    await deleteTraces(tx, userId, held.email);
    await tx.delete(user).where(eq(user.id, userId));
    return files;
  });
}

async function deletePlansAndPeople(tx: Db, ownerId: string): Promise<void> {
  const people = tx.select({ id: person.id }).from(person).where(eq(person.ownerId, ownerId));
  await tx.delete(savedPlan).where(eq(savedPlan.ownerId, ownerId));
  await tx.delete(measurementSet).where(inArray(measurementSet.personId, people));
  await tx.delete(person).where(eq(person.ownerId, ownerId));
}

async function deletePatterns(tx: Db, ownerId: string): Promise<string[]> {
  const patterns = tx.select({ id: pattern.id }).from(pattern).where(eq(pattern.ownerId, ownerId));
  await tx.delete(importDraft).where(eq(importDraft.ownerId, ownerId));
  await tx.delete(patternRevision).where(inArray(patternRevision.patternId, patterns));
  await tx.delete(pattern).where(eq(pattern.ownerId, ownerId));
  const files = await tx
    .select({ id: storedFile.id })
    .from(storedFile)
    .where(eq(storedFile.ownerId, ownerId))
    .for('update');
  await tx.delete(storedFile).where(eq(storedFile.ownerId, ownerId));
  return files.map(({ id }) => id);
}

/** What names the account by its address or its id without a foreign key. */
async function deleteTraces(tx: Db, userId: string, email: string): Promise<void> {
  await tx.delete(verification).where(eq(verification.value, userId));
  await tx.delete(outbox).where(or(eq(outbox.userId, userId), eq(outbox.to, email)));
  await tx.delete(mailboxMessage).where(eq(mailboxMessage.to, email));
  const keys = [
    addressKey('sign-in', email),
    addressKey('mail', email),
    ...['password', 'code', 'archive'].map((what) => `${what}|${userId}`),
  ];
  await tx.delete(rateLimit).where(inArray(rateLimit.key, keys));
}
