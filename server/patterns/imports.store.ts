import { count, desc, eq } from 'drizzle-orm';
import { alias } from 'drizzle-orm/mysql-core';
import type { PageQuery } from '../../shared/paging.ts';
import type { DraftDetails, ImportCorrections, TableRole } from '../../shared/patterns/imports.schema.ts';
import { patternInputSchema, type StoredFile } from '../../shared/patterns/patterns.schema.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { rowsOf } from '../http/paging.ts';
import { storedFile } from './files.table.ts';
import { importDraft, pattern } from './patterns.table.ts';

/** A draft as it is kept: which files, and how a person corrected their reading. */
export interface KeptDraft {
  id: string;
  ownerId: string;
  patternId: string | null;
  createdAt: string;
  updatedAt: string;
  /** What was written on the draft itself: for a new revision, what changes about its pattern. */
  written: DraftDetails;
  /** With its pattern's details where it is for a new revision of one. */
  details: DraftDetails;
  chart: KeptTable;
  finished: KeptTable;
}

export interface KeptTable {
  file: StoredFile | null;
  corrections: ImportCorrections;
}

const NO_CORRECTIONS: ImportCorrections = { unit: null, points: {} };
const chartFile = alias(storedFile, 'chart_file');
const finishedFile = alias(storedFile, 'finished_file');

const columns = {
  draft: importDraft,
  pattern,
  chartFile: { id: chartFile.id, name: chartFile.name, bytes: chartFile.bytes },
  finishedFile: { id: finishedFile.id, name: finishedFile.name, bytes: finishedFile.bytes },
};

const select = (db: Db) =>
  db
    .select(columns)
    .from(importDraft)
    .leftJoin(pattern, eq(pattern.id, importDraft.patternId))
    .leftJoin(chartFile, eq(chartFile.id, importDraft.chartFileId))
    .leftJoin(finishedFile, eq(finishedFile.id, importDraft.finishedFileId));

type Row = Awaited<ReturnType<ReturnType<typeof select>['execute']>>[number];

const toDraft = (row: Row): KeptDraft => ({
  id: row.draft.id,
  ownerId: row.draft.ownerId,
  patternId: row.draft.patternId,
  createdAt: row.draft.createdAt.toISOString(),
  updatedAt: row.draft.updatedAt.toISOString(),
  written: row.draft.details,
  details: { ...(row.pattern ? patternInputSchema.parse(row.pattern) : {}), ...row.draft.details },
  chart: { file: row.chartFile, corrections: row.draft.chartCorrections },
  finished: { file: row.finishedFile, corrections: row.draft.finishedCorrections },
});

/** Somebody's drafts, the last touched first. */
export async function listDrafts(
  db: Db,
  ownerId: string,
  query: PageQuery,
): Promise<{ drafts: KeptDraft[]; total: number }> {
  const { limit, offset } = rowsOf(query);
  const rows = await select(db)
    .where(eq(importDraft.ownerId, ownerId))
    .orderBy(desc(importDraft.updatedAt), desc(importDraft.id))
    .limit(limit)
    .offset(offset);
  const [counted] = await db
    .select({ total: count() })
    .from(importDraft)
    .where(eq(importDraft.ownerId, ownerId));
  return { drafts: rows.map(toDraft), total: counted?.total ?? 0 };
}

export async function findDraft(db: Db, id: string): Promise<KeptDraft | null> {
  const [row] = await select(db).where(eq(importDraft.id, id));
  return row === undefined ? null : toDraft(row);
}

/** A draft that nobody else can change or commit until the transaction ends; null where it is gone. */
export async function holdDraft(tx: Db, id: string): Promise<KeptDraft | null> {
  const [held] = await tx
    .select({ id: importDraft.id })
    .from(importDraft)
    .where(eq(importDraft.id, id))
    .for('update');
  return held === undefined ? null : findDraft(tx, id);
}

export async function createDraft(
  db: Db,
  ownerId: string,
  draft: { patternId: string | null; details: DraftDetails },
): Promise<string> {
  const [id, now] = [newId(), new Date()];
  await db.insert(importDraft).values({
    ...draft,
    id,
    ownerId,
    chartCorrections: NO_CORRECTIONS,
    finishedCorrections: NO_CORRECTIONS,
    createdAt: now,
    updatedAt: now,
  });
  return id;
}

export async function updateDraft(
  tx: Db,
  id: string,
  changes: { details?: DraftDetails; chart?: ImportCorrections; finished?: ImportCorrections },
): Promise<void> {
  await tx
    .update(importDraft)
    .set({
      ...(changes.details ? { details: changes.details } : {}),
      ...(changes.chart ? { chartCorrections: changes.chart } : {}),
      ...(changes.finished ? { finishedCorrections: changes.finished } : {}),
      updatedAt: new Date(),
    })
    .where(eq(importDraft.id, id));
}

/** Puts another file, or none, in a table's place; corrections to the one before are forgotten unless given again. */
export async function setDraftFile(
  tx: Db,
  id: string,
  role: TableRole,
  fileId: string | null,
  corrections: ImportCorrections = NO_CORRECTIONS,
): Promise<void> {
  const changes =
    role === 'chart'
      ? { chartFileId: fileId, chartCorrections: corrections }
      : { finishedFileId: fileId, finishedCorrections: corrections };
  await tx
    .update(importDraft)
    .set({ ...changes, updatedAt: new Date() })
    .where(eq(importDraft.id, id));
}

/** Deletes a draft; its files' rows are the caller's to delete or to give to a revision. */
export async function deleteDraft(tx: Db, id: string): Promise<void> {
  await tx.delete(importDraft).where(eq(importDraft.id, id));
}
