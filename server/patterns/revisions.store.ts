import { count, desc, eq } from 'drizzle-orm';
import { alias } from 'drizzle-orm/mysql-core';
import type { PageQuery } from '../../shared/paging.ts';
import type { PatternRevision } from '../../shared/patterns/patterns.schema.ts';
import type { Db } from '../db/client.ts';
import { rowsOf } from '../http/paging.ts';
import { storedFile } from './files.table.ts';
import { pattern, patternRevision } from './patterns.table.ts';

/** The files that a revision was read from. */
export interface RevisionFiles {
  chartFileId: string | null;
  finishedFileId: string | null;
}

/** A revision, whose it is, and its pattern's title. */
export interface OwnedRevision extends PatternRevision {
  ownerId: string;
  title: string;
}

const chartFile = alias(storedFile, 'chart_file');
const finishedFile = alias(storedFile, 'finished_file');

const columns = {
  id: patternRevision.id,
  patternId: patternRevision.patternId,
  number: patternRevision.number,
  createdAt: patternRevision.createdAt,
  table: patternRevision.table,
  ownerId: pattern.ownerId,
  title: pattern.title,
  chartFile: { id: chartFile.id, name: chartFile.name, bytes: chartFile.bytes },
  finishedFile: { id: finishedFile.id, name: finishedFile.name, bytes: finishedFile.bytes },
};

const select = (db: Db) =>
  db
    .select(columns)
    .from(patternRevision)
    .innerJoin(pattern, eq(pattern.id, patternRevision.patternId))
    .leftJoin(chartFile, eq(chartFile.id, patternRevision.chartFileId))
    .leftJoin(finishedFile, eq(finishedFile.id, patternRevision.finishedFileId));

const withWrittenTime = <T extends { createdAt: Date }>(row: T) => ({
  ...row,
  createdAt: row.createdAt.toISOString(),
});

export async function findRevision(db: Db, id: string): Promise<OwnedRevision | null> {
  const [row] = await select(db).where(eq(patternRevision.id, id));
  return row === undefined ? null : withWrittenTime(row);
}

/** A pattern's revisions, the newest first. */
export async function listRevisions(
  db: Db,
  patternId: string,
  query: PageQuery,
): Promise<{ revisions: OwnedRevision[]; total: number }> {
  const { limit, offset } = rowsOf(query);
  const rows = await select(db)
    .where(eq(patternRevision.patternId, patternId))
    .orderBy(desc(patternRevision.number))
    .limit(limit)
    .offset(offset);
  const [counted] = await db
    .select({ total: count() })
    .from(patternRevision)
    .where(eq(patternRevision.patternId, patternId));
  return { revisions: rows.map(withWrittenTime), total: counted?.total ?? 0 };
}

export async function insertRevision(tx: Db, row: typeof patternRevision.$inferInsert): Promise<void> {
  await tx.insert(patternRevision).values(row);
}
