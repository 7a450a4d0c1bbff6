import { asc, eq, inArray } from 'drizzle-orm';
import type { Db } from '../db/client.ts';
import { teacherRequest } from '../admin/admin.table.ts';
import { outbox } from '../mail/mail.table.ts';
import { storedFile } from '../patterns/files.table.ts';
import { importDraft, pattern, patternRevision } from '../patterns/patterns.table.ts';
import { measurementSet, person } from '../people/people.table.ts';
import { savedPlan } from '../plans/plans.table.ts';
import { accessToken } from '../tokens/tokens.table.ts';
import { session, user } from './account.table.ts';

/** All that belongs to an account, as it was at one moment. */
export type Belongings = Awaited<ReturnType<typeof readAll>>;

/**
 * Reads all that belongs to an account as it was at one moment, and hands it to the work while that moment lasts: until the
 * work is done no file of the account can be removed, so that every file named is there to be read.
 */
export function withBelongings<T>(db: Db, userId: string, work: (all: Belongings) => Promise<T>): Promise<T> {
  return db.transaction(
    async (tx) => {
      // Held before anything else is read: the moment begins with the first plain reading.
      await tx
        .select({ id: storedFile.id })
        .from(storedFile)
        .where(eq(storedFile.ownerId, userId))
        .for('update');
      return work(await readAll(tx, userId));
    },
    { isolationLevel: 'repeatable read' },
  );
}

async function readAll(tx: Db, userId: string) {
  return {
    ...(await readAccount(tx, userId)),
    people: await tx
      .select()
      .from(person)
      .where(eq(person.ownerId, userId))
      .orderBy(asc(person.name), asc(person.id)),
    sets: await readSets(tx, userId),
    ...(await readPatterns(tx, userId)),
    plans: await tx
      .select()
      .from(savedPlan)
      .where(eq(savedPlan.ownerId, userId))
      .orderBy(asc(savedPlan.createdAt), asc(savedPlan.id)),
    drafts: await tx
      .select()
      .from(importDraft)
      .where(eq(importDraft.ownerId, userId))
      .orderBy(asc(importDraft.id)),
    files: await tx
      .select()
      .from(storedFile)
      .where(eq(storedFile.ownerId, userId))
      .orderBy(asc(storedFile.id)),
  };
}

/** Named one by one: no password, key, code or token leaves, not even its hash. */
async function readAccount(tx: Db, userId: string) {
  const accounts = await tx
    .select({
      id: user.id,
      name: user.name,
      email: user.email,
      emailVerified: user.emailVerified,
      twoFactorEnabled: user.twoFactorEnabled,
      role: user.role,
      createdAt: user.createdAt,
      updatedAt: user.updatedAt,
    })
    .from(user)
    .where(eq(user.id, userId));
  const sessions = await tx
    .select({
      createdAt: session.createdAt,
      lastUsedAt: session.updatedAt,
      expiresAt: session.expiresAt,
      ipAddress: session.ipAddress,
      userAgent: session.userAgent,
    })
    .from(session)
    .where(eq(session.userId, userId));
  const { name, scopes, createdAt, lastUsedAt, expiresAt } = accessToken;
  const tokens = await tx
    .select({ name, scopes, createdAt, lastUsedAt, expiresAt })
    .from(accessToken)
    .where(eq(accessToken.userId, userId));
  const requests = await tx.select().from(teacherRequest).where(eq(teacherRequest.userId, userId));
  const mail = await tx
    .select({ to: outbox.to, kind: outbox.kind, state: outbox.state, writtenAt: outbox.createdAt })
    .from(outbox)
    .where(eq(outbox.userId, userId));
  return { account: accounts[0] ?? null, sessions, tokens, teacherRequest: requests[0] ?? null, mail };
}

async function readSets(tx: Db, userId: string) {
  const rows = await tx
    .select({ set: measurementSet, personName: person.name })
    .from(measurementSet)
    .innerJoin(person, eq(person.id, measurementSet.personId))
    .where(eq(person.ownerId, userId))
    .orderBy(asc(person.name), asc(measurementSet.takenOn), asc(measurementSet.id));
  return rows.map(({ set, personName }) => ({ ...set, personName }));
}

async function readPatterns(tx: Db, userId: string) {
  const patterns = await tx
    .select()
    .from(pattern)
    .where(eq(pattern.ownerId, userId))
    .orderBy(asc(pattern.title), asc(pattern.id));
  const theirs = tx.select({ id: pattern.id }).from(pattern).where(eq(pattern.ownerId, userId));
  const revisions = await tx
    .select()
    .from(patternRevision)
    .where(inArray(patternRevision.patternId, theirs))
    .orderBy(asc(patternRevision.patternId), asc(patternRevision.number));
  return { patterns, revisions };
}
