import { z } from 'zod';
import { measuredSchema } from '../fit/fit.schema.ts';
import { pointIdSchema } from '../points/points.schema.ts';
import { LENGTH_UNITS } from '../units.ts';
import { patternInputSchema, storedFileSchema } from './patterns.schema.ts';

/** The largest file that may be uploaded, in bytes (5 MB). */
export const IMPORT_BYTES_MAX = 5_000_000;

/** Which of a pattern's two tables: the bodies its sizes are drafted for, or the sewn garment. */
export const TABLE_ROLES = ['chart', 'finished'] as const;
export type TableRole = (typeof TABLE_ROLES)[number];

/** An error stops the import; a caution asks for a look. `row` and `column` count from 1 as in the file, heading row included. */
export const importIssueSchema = z.object({
  severity: z.enum(['error', 'caution']),
  code: z.string(),
  row: z.number().int().nullable(),
  column: z.number().int().nullable(),
  words: z.string(),
});
export type ImportIssue = z.infer<typeof importIssueSchema>;

/** What a column was taken for, and how surely. */
export const importColumnSchema = z.object({
  column: z.number().int(),
  heading: z.string(),
  role: z.enum(['size', 'point', 'ignored']),
  point: pointIdSchema.nullable(),
  sureness: z.enum(['chosen', 'exact', 'likely', 'none']),
  unit: z.enum(LENGTH_UNITS),
});
export type ImportColumn = z.infer<typeof importColumnSchema>;

/** A cell as typed and as understood; `mm` null where empty or not understood (then an issue stands at its row and column). */
export const importCellSchema = z.object({ typed: z.string(), mm: measuredSchema.nullable() });

export const importRowSchema = z.object({
  row: z.number().int(),
  label: z.string(),
  cells: z.array(importCellSchema),
});

/** One table of a draft as it was understood: `cells` run beside `columns`. */
export const importTableSchema = z.object({
  file: storedFileSchema,
  delimiter: z.string(),
  decimalComma: z.boolean(),
  unit: z.enum(LENGTH_UNITS),
  unitFrom: z.enum(['chosen', 'heading', 'cells', 'size of the numbers']),
  columns: z.array(importColumnSchema),
  rows: z.array(importRowSchema),
  issues: z.array(importIssueSchema),
});
export type ImportTable = z.infer<typeof importTableSchema>;

/** Corrections a person makes to how a table is read: by column number (from 1); null point = leave the column out. */
export const importCorrectionsSchema = z.object({
  unit: z.enum(LENGTH_UNITS).nullable().default(null),
  points: z.record(z.string().regex(/^\d{1,4}$/), pointIdSchema.nullable()).default({}),
});
export type ImportCorrections = z.infer<typeof importCorrectionsSchema>;

const { shape } = patternInputSchema;

/** The details while they are being written: everything may still be missing, and nothing is filled in that was not sent. */
export const draftDetailsSchema = z
  .object({
    ...shape,
    title: z.string().trim().max(120),
    maker: shape.maker.unwrap(),
    number: shape.number.unwrap(),
    cloth: shape.cloth.unwrap(),
    worn: shape.worn.unwrap(),
    seamEdges: shape.seamEdges.unwrap(),
    compareAs: shape.compareAs.unwrap(),
    notes: shape.notes.unwrap(),
  })
  .partial();
export type DraftDetails = z.infer<typeof draftDetailsSchema>;

/** What a person may change on a draft. */
export const importPatchSchema = z.object({
  details: draftDetailsSchema.optional(),
  chart: importCorrectionsSchema.optional(),
  finished: importCorrectionsSchema.optional(),
});
export type ImportPatch = z.infer<typeof importPatchSchema>;

/** A draft: details, both tables as understood, and what still stands in the way. */
export const importDraftSchema = z.object({
  id: z.uuid(),
  patternId: z.uuid().nullable(),
  createdAt: z.string(),
  updatedAt: z.string(),
  details: draftDetailsSchema,
  chart: importTableSchema.nullable(),
  finished: importTableSchema.nullable(),
  issues: z.array(importIssueSchema),
  ready: z.boolean(),
});
export type ImportDraft = z.infer<typeof importDraftSchema>;

/** A draft in a list. */
export const importDraftSummarySchema = importDraftSchema.pick({
  id: true,
  patternId: true,
  createdAt: true,
  updatedAt: true,
  details: true,
});
