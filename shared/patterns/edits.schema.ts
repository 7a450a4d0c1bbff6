import { z } from 'zod';
import { POINTS_MAX, SIZES_MAX } from '../fit/fit.schema.ts';
import { pointIdSchema } from '../points/points.schema.ts';
import { LENGTH_UNITS } from '../units.ts';
import { patternInputSchema, patternRevisionSchema, patternTableSchema } from './patterns.schema.ts';

/** The most characters that are taken in at all; what a size's name or a cell may really have is said when it is read. */
const TEXT_MAX = 400;

/** A text on one line: controls, line ends and runs of blanks become one blank, so that it leaves as CSV and comes back alike. */
const oneLine = z
  .string()
  .max(TEXT_MAX)
  .overwrite((text) => text.replace(/[\p{Cc}\p{Cs}\s]+/gu, ' ').trim());

/** One point of a table as typed: a cell a size, beside `sizes`. */
const typedColumnSchema = z.object({
  point: pointIdSchema,
  unit: z.enum(LENGTH_UNITS),
  typed: z.array(oneLine).max(SIZES_MAX),
});

/** Both tables of a pattern as somebody typed them: the lengths are read from the cells, by the same reading as a file's. */
export const typedTableSchema = z.object({
  sizes: z.array(oneLine).max(SIZES_MAX),
  chart: z.array(typedColumnSchema).max(POINTS_MAX),
  finished: z.array(typedColumnSchema).max(POINTS_MAX),
});

/** An edit of a pattern's tables: the whole of them, and the revision it began from. */
export const tableEditSchema = typedTableSchema.extend({ basedOn: z.uuid() });
export type TableEdit = z.infer<typeof tableEditSchema>;

/** A pattern typed in without a file: its details and its first tables. */
export const newPatternSchema = typedTableSchema.extend({ details: patternInputSchema });
export type NewPattern = z.infer<typeof newPatternSchema>;

/** What a refused, stale edit adds to the problem's body: what was sent, as it reads, and the newer revision. */
export const staleEditSchema = z.object({
  versions: z.object({ yours: patternTableSchema, theirs: patternRevisionSchema }),
});
