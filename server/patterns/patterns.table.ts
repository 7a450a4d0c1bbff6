import { index, int, mysqlEnum, mysqlTable, text, unique, varchar } from 'drizzle-orm/mysql-core';
import { GARMENT_KINDS, SILHOUETTES } from '../../shared/fit/fit-words.ts';
import type { DraftDetails, ImportCorrections } from '../../shared/patterns/imports.schema.ts';
import type { PatternInput, PatternTable } from '../../shared/patterns/patterns.schema.ts';
import { user } from '../account/account.table.ts';
import { json, moment, uuid } from '../db/columns.ts';
import { storedFile } from './files.table.ts';

/** A sewing pattern, without its tables: those are its revisions. */
export const pattern = mysqlTable(
  'pattern',
  {
    id: uuid().primaryKey(),
    ownerId: uuid('owner_id')
      .notNull()
      .references(() => user.id),
    title: varchar({ length: 120 }).notNull(),
    maker: varchar({ length: 120 }).notNull(),
    number: varchar({ length: 40 }).notNull(),
    kind: mysqlEnum(GARMENT_KINDS).notNull(),
    silhouette: mysqlEnum(SILHOUETTES).notNull(),
    structure: mysqlEnum(['woven', 'knit']).notNull(),
    cloth: varchar({ length: 200 }).notNull(),
    worn: mysqlEnum(['closed', 'open']).notNull(),
    seamEdges: json<PatternInput['seamEdges']>('seam_edges').notNull(),
    compareAs: json<PatternInput['compareAs']>('compare_as').notNull(),
    notes: text().notNull(),
    // No foreign key: a pattern and its first revision refer to each other.
    latestRevisionId: uuid('latest_revision_id').notNull(),
    createdAt: moment('created_at').notNull(),
    updatedAt: moment('updated_at').notNull(),
  },
  (table) => [index('pattern_owner').on(table.ownerId, table.title, table.id)],
);

/** A pattern's tables at one time, as one document: they are read and replaced whole. Never changed. */
export const patternRevision = mysqlTable(
  'pattern_revision',
  {
    id: uuid().primaryKey(),
    patternId: uuid('pattern_id')
      .notNull()
      .references(() => pattern.id),
    number: int().notNull(),
    table: json<PatternTable>('table').notNull(),
    chartFileId: uuid('chart_file_id').references(() => storedFile.id),
    finishedFileId: uuid('finished_file_id').references(() => storedFile.id),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [unique('pattern_revision_number').on(table.patternId, table.number)],
);

/** An import from its first byte to its commit. */
export const importDraft = mysqlTable(
  'import_draft',
  {
    id: uuid().primaryKey(),
    ownerId: uuid('owner_id')
      .notNull()
      .references(() => user.id),
    patternId: uuid('pattern_id').references(() => pattern.id, { onDelete: 'cascade' }),
    details: json<DraftDetails>('details').notNull(),
    chartFileId: uuid('chart_file_id').references(() => storedFile.id),
    chartCorrections: json<ImportCorrections>('chart_corrections').notNull(),
    finishedFileId: uuid('finished_file_id').references(() => storedFile.id),
    finishedCorrections: json<ImportCorrections>('finished_corrections').notNull(),
    createdAt: moment('created_at').notNull(),
    updatedAt: moment('updated_at').notNull(),
  },
  (table) => [index('import_draft_owner').on(table.ownerId, table.id)],
);
