import { and, asc, count, eq, like, or } from 'drizzle-orm';
import type { GarmentKind } from '../../shared/fit/fit-words.ts';
import type { DraftDetails } from '../../shared/patterns/imports.schema.ts';
import type {
  Pattern,
  PatternInput,
  PatternSummary,
  PatternTable,
} from '../../shared/patterns/patterns.schema.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { ERRNO, errnoOf } from '../db/errors.ts';
import { containing } from '../db/like.ts';
import { inTransaction } from '../db/transaction.ts';
import { rowsOf, type ListQuery } from '../http/paging.ts';
import { deleteFiles } from './files.store.ts';
import { importDraft, pattern, patternRevision } from './patterns.table.ts';
import { findRevision, insertRevision, type OwnedRevision, type RevisionFiles } from './revisions.store.ts';

/** A pattern in a list, and whose it is. */
export interface OwnedPattern extends PatternSummary {
  ownerId: string;
}

type Row = { pattern: typeof pattern.$inferSelect; number: number; table: PatternTable };

const columns = { pattern, number: patternRevision.number, table: patternRevision.table };

const toSummary = ({ pattern: row, number, table }: Row): OwnedPattern => ({
  ...row,
  createdAt: row.createdAt.toISOString(),
  updatedAt: row.updatedAt.toISOString(),
  latestRevisionNumber: number,
  sizes: table.sizes,
  hasChart: table.chart.length > 0,
  hasFinished: table.finished.length > 0,
});

/** Somebody's patterns by title; `q` is looked for in title, maker and number. */
export async function listPatterns(
  db: Db,
  ownerId: string,
  query: ListQuery & { kind?: GarmentKind | undefined },
): Promise<{ patterns: OwnedPattern[]; total: number }> {
  const text = containing(query.q);
  const theirs = and(
    eq(pattern.ownerId, ownerId),
    query.kind === undefined ? undefined : eq(pattern.kind, query.kind),
    query.q === ''
      ? undefined
      : or(like(pattern.title, text), like(pattern.maker, text), like(pattern.number, text)),
  );
  const { limit, offset } = rowsOf(query);
  const rows = await db
    .select(columns)
    .from(pattern)
    .innerJoin(patternRevision, eq(patternRevision.id, pattern.latestRevisionId))
    .where(theirs)
    .orderBy(asc(pattern.title), asc(pattern.id))
    .limit(limit)
    .offset(offset);
  const [counted] = await db.select({ total: count() }).from(pattern).where(theirs);
  return { patterns: rows.map(toSummary), total: counted?.total ?? 0 };
}

export async function findPattern(db: Db, id: string): Promise<OwnedPattern | null> {
  const [row] = await db
    .select(columns)
    .from(pattern)
    .innerJoin(patternRevision, eq(patternRevision.id, pattern.latestRevisionId))
    .where(eq(pattern.id, id));
  return row === undefined ? null : toSummary(row);
}

/** A pattern with its latest tables. */
export async function findWholePattern(db: Db, id: string): Promise<Pattern | null> {
  const summary = await findPattern(db, id);
  const revision = summary && (await findRevision(db, summary.latestRevisionId));
  return summary && revision && { ...summary, revision };
}

/** A new pattern with its first revision: in a transaction, since each refers to the other. */
export async function createPattern(
  tx: Db,
  ownerId: string,
  input: PatternInput,
  table: PatternTable,
  files: RevisionFiles,
): Promise<{ patternId: string; revisionId: string }> {
  const [patternId, revisionId, now] = [newId(), newId(), new Date()];
  await tx.insert(pattern).values({
    ...input,
    id: patternId,
    ownerId,
    latestRevisionId: revisionId,
    createdAt: now,
    updatedAt: now,
  });
  await insertRevision(tx, { id: revisionId, patternId, number: 1, table, ...files, createdAt: now });
  return { patternId, revisionId };
}

/** The latest revision of a pattern, in a transaction: until it ends nobody adds another. Null where the pattern is gone. */
export async function holdLatestRevision(tx: Db, patternId: string): Promise<OwnedRevision | null> {
  // The first thing a transaction reads: what it reads afterwards is as it was once the row was held.
  const [held] = await tx
    .select({ latestId: pattern.latestRevisionId })
    .from(pattern)
    .where(eq(pattern.id, patternId))
    .for('update');
  return held === undefined ? null : findRevision(tx, held.latestId);
}

/** The next revision of a pattern, in a transaction: holding the pattern keeps another from taking the same number. */
export async function addRevision(
  tx: Db,
  patternId: string,
  changes: DraftDetails,
  table: PatternTable,
  files: RevisionFiles,
): Promise<string> {
  const [held] = await tx
    .select({ id: pattern.latestRevisionId })
    .from(pattern)
    .where(eq(pattern.id, patternId))
    .for('update');
  const [last] = await tx
    .select({ number: patternRevision.number })
    .from(patternRevision)
    .where(eq(patternRevision.id, held?.id ?? ''))
    // As it is now, not as it was when this transaction first read: another may have added one meanwhile.
    .for('update');
  const [id, now] = [newId(), new Date()];
  await insertRevision(tx, {
    id,
    patternId,
    number: (last?.number ?? 0) + 1,
    table,
    ...files,
    createdAt: now,
  });
  await tx
    .update(pattern)
    .set({ ...changes, latestRevisionId: id, updatedAt: now })
    .where(eq(pattern.id, patternId));
  return id;
}

/** Changes what is given; nothing given changes nothing, the time of the last change included. */
export async function updatePattern(db: Db, id: string, changes: Partial<PatternInput>): Promise<void> {
  if (Object.keys(changes).length === 0) return;
  await db
    .update(pattern)
    .set({ ...changes, updatedAt: new Date() })
    .where(eq(pattern.id, id));
}

/**
 * Deletes a pattern with its revisions, the drafts of new ones and the files' rows; answers whose bytes may now go, or
 * null where a saved plan refers to it, and then nothing is deleted.
 */
export async function deletePattern(db: Db, id: string): Promise<string[] | null> {
  try {
    return await inTransaction(db, async (tx) => {
      await tx.select({ id: pattern.id }).from(pattern).where(eq(pattern.id, id)).for('update');
      const files = await filesOf(tx, id);
      await tx.delete(importDraft).where(eq(importDraft.patternId, id));
      await tx.delete(patternRevision).where(eq(patternRevision.patternId, id));
      await tx.delete(pattern).where(eq(pattern.id, id));
      await deleteFiles(tx, files);
      return files;
    });
  } catch (error) {
    if (errnoOf(error) === ERRNO.stillReferred) return null;
    throw error;
  }
}

async function filesOf(tx: Db, patternId: string): Promise<string[]> {
  const revisions = await tx
    .select({ chart: patternRevision.chartFileId, finished: patternRevision.finishedFileId })
    .from(patternRevision)
    .where(eq(patternRevision.patternId, patternId));
  const drafts = await tx
    .select({ chart: importDraft.chartFileId, finished: importDraft.finishedFileId })
    .from(importDraft)
    .where(eq(importDraft.patternId, patternId))
    .for('update');
  return [...revisions, ...drafts]
    .flatMap((row) => [row.chart, row.finished])
    .filter((file) => file !== null);
}
