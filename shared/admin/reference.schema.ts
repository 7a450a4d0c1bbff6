import { z } from 'zod';
import { GARMENT_KINDS } from '../fit/fit-words.ts';
import { POINT_IDS } from '../points/point-ids.ts';
import { LENGTH_UNITS } from '../units.ts';

/** A published body table that this version carries: where it comes from, its sizes and the points it gives. */
export const carriedTableSchema = z.object({
  title: z.string(),
  maker: z.string(),
  number: z.string(),
  source: z.string(),
  unit: z.enum(LENGTH_UNITS),
  sizes: z.array(z.string()),
  points: z.array(z.enum(POINT_IDS)),
});

/** The movement ease of a garment kind at a point, in mm (`highMm` null: no upper figure), and how well it is founded. */
export const carriedEaseSchema = z.object({
  kind: z.enum(GARMENT_KINDS),
  point: z.enum(POINT_IDS),
  lowMm: z.number(),
  highMm: z.number().nullable(),
  source: z.string(),
  standing: z.enum(['published', 'commonPractice', 'fromMemory']),
});

/** The reference figures that this version of Leeway carries, each with its source. */
export const adminReferenceSchema = z.object({
  bodyTables: z.array(carriedTableSchema),
  wearingEase: z.array(carriedEaseSchema),
});
/** The reference figures that this version of Leeway carries. */
export type AdminReference = z.infer<typeof adminReferenceSchema>;
