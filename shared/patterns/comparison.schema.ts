import { z } from 'zod';
import { measuredSchema } from '../fit/fit.schema.ts';
import { pointIdSchema } from '../points/points.schema.ts';
import { LENGTH_UNITS } from '../units.ts';
import { TABLE_ROLES } from './imports.schema.ts';
import { patternRevisionSchema } from './patterns.schema.ts';

const unit = z.enum(LENGTH_UNITS);
const sideSchema = z.object({ typed: z.string(), unit, mm: measuredSchema.nullable() });

/** One cell that differs: each side as typed, its column's unit, and in mm. */
const cellDifferenceSchema = z.object({
  role: z.enum(TABLE_ROLES),
  point: pointIdSchema,
  /** The size's name on each side. */
  size: z.object({ from: z.string(), to: z.string() }),
  from: sideSchema,
  to: sideSchema,
  /** Written otherwise, the same length: `37 3/8` and `37.375`. */
  isSameLength: z.boolean(),
});
export type CellDifference = z.infer<typeof cellDifferenceSchema>;

/** A column that stands on one side only, or in another unit. */
const columnDifferenceSchema = z.object({
  role: z.enum(TABLE_ROLES),
  point: pointIdSchema,
  change: z.enum(['added', 'removed', 'unit']),
  from: unit.nullable(),
  to: unit.nullable(),
});
export type ColumnDifference = z.infer<typeof columnDifferenceSchema>;

/** What differs between two tables, from the one to the other. */
export const tableDifferenceSchema = z.object({
  isSame: z.boolean(),
  sizes: z.object({
    added: z.array(z.string()),
    removed: z.array(z.string()),
    renamed: z.array(z.object({ from: z.string(), to: z.string() })),
    isReordered: z.boolean(),
  }),
  columns: z.array(columnDifferenceSchema),
  isColumnsReordered: z.boolean(),
  cells: z.array(cellDifferenceSchema),
});
export type TableDifference = z.infer<typeof tableDifferenceSchema>;

const revisionSchema = patternRevisionSchema.pick({
  id: true,
  patternId: true,
  number: true,
  createdAt: true,
});

/** Two revisions and what differs between their tables. */
export const comparisonSchema = z.object({
  from: revisionSchema,
  to: revisionSchema,
  difference: tableDifferenceSchema,
});
