import { z } from 'zod';
import {
  fabricSchema,
  garmentSchema,
  LENGTH_MAX_MM,
  measuredSchema,
  POINTS_MAX,
  SIZES_MAX,
} from '../fit/fit.schema.ts';
import { pointIdSchema } from '../points/points.schema.ts';
import { LENGTH_UNITS } from '../units.ts';

const trimmed = (max: number) => z.string().trim().max(max);

/** What is known of a pattern beside its tables. */
export const patternInputSchema = z.object({
  title: trimmed(120).min(1, 'Write the title printed on the pattern.'),
  maker: trimmed(120).default(''),
  number: trimmed(40).default(''),
  kind: garmentSchema.shape.kind,
  silhouette: garmentSchema.shape.silhouette.unwrap(),
  structure: fabricSchema.shape.structure,
  cloth: trimmed(200).default(''),
  worn: z.enum(['closed', 'open']).default('closed'),
  seamEdges: z.partialRecord(pointIdSchema, z.number().int().min(1).max(24)).default({}),
  compareAs: z.partialRecord(pointIdSchema, pointIdSchema).default({}),
  notes: trimmed(4000).default(''),
});
export type PatternInput = z.infer<typeof patternInputSchema>;

/** One column of a table: a point down all sizes, in mm, and the cells as typed beside it. */
const column = <T extends z.ZodType>(value: T) =>
  z.object({
    point: pointIdSchema,
    heading: z.string().max(120),
    unit: z.enum(LENGTH_UNITS),
    mm: z.array(value.nullable()).max(SIZES_MAX),
    typed: z.array(z.string().max(120)).max(SIZES_MAX),
  });
export const chartColumnSchema = column(measuredSchema);
export const finishedColumnSchema = column(z.number().positive().max(LENGTH_MAX_MM));
export type ChartColumn = z.infer<typeof chartColumnSchema>;
export type FinishedColumn = z.infer<typeof finishedColumnSchema>;

/** A pattern's tables: size labels in grade order and, per column, one cell a size. */
export const patternTableSchema = z.object({
  sizes: z.array(z.string().min(1).max(40)).min(1).max(SIZES_MAX),
  chart: z.array(chartColumnSchema).max(POINTS_MAX),
  finished: z.array(finishedColumnSchema).max(POINTS_MAX),
});
export type PatternTable = z.infer<typeof patternTableSchema>;

/** An uploaded file that is kept as it came. */
export const storedFileSchema = z.object({ id: z.uuid(), name: z.string(), bytes: z.number().int() });
export type StoredFile = z.infer<typeof storedFileSchema>;

/** An immutable revision of a pattern's tables. */
export const patternRevisionSchema = z.object({
  id: z.uuid(),
  patternId: z.uuid(),
  number: z.number().int(),
  createdAt: z.string(),
  table: patternTableSchema,
  chartFile: storedFileSchema.nullable(),
  finishedFile: storedFileSchema.nullable(),
});
export type PatternRevision = z.infer<typeof patternRevisionSchema>;

/** A pattern in a list. */
export const patternSummarySchema = patternInputSchema.extend({
  id: z.uuid(),
  createdAt: z.string(),
  updatedAt: z.string(),
  latestRevisionId: z.uuid(),
  latestRevisionNumber: z.number().int(),
  sizes: z.array(z.string()),
  hasChart: z.boolean(),
  hasFinished: z.boolean(),
});
export type PatternSummary = z.infer<typeof patternSummarySchema>;

/** A pattern with its latest tables. */
export const patternSchema = patternSummarySchema.extend({ revision: patternRevisionSchema });
export type Pattern = z.infer<typeof patternSchema>;
