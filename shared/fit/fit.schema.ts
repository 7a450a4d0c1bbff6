import { z } from 'zod';
import { POINT_IDS } from '../points/point-ids.ts';
import { CAUTION_CODES, GARMENT_KINDS, REASON_CODES, SILHOUETTES, VERDICTS, ZONE_IDS } from './fit-words.ts';

/** The longest length, in mm, that any point of measure may have: absurd beyond it. */
export const LENGTH_MAX_MM = 4000;
/** The most sizes one pattern may have. */
export const SIZES_MAX = 200;
/** The most points one table may have. */
export const POINTS_MAX = 60;

const point = z.enum(POINT_IDS);
const zone = z.enum(ZONE_IDS);
const length = z.number().positive().max(LENGTH_MAX_MM);
const amount = z.number().min(-LENGTH_MAX_MM).max(LENGTH_MAX_MM);
const measured = z.union([
  length,
  z
    .object({ low: length, high: length })
    .refine((range) => range.low <= range.high, 'low must not exceed high'),
]);

/** One number in mm, or the range of bodies a size is drafted for. */
export const measuredSchema = measured;
export type Measured = z.infer<typeof measured>;

/** One size of a pattern: the body it is drafted for and the sewn garment, in mm. */
export const sizeRowSchema = z.object({
  label: z.string().min(1).max(40),
  body: z.partialRecord(point, measured),
  finished: z.partialRecord(point, length),
});
export type SizeRow = z.infer<typeof sizeRowSchema>;

/** What the garment is and how it is worn. */
export const garmentSchema = z.object({
  kind: z.enum(GARMENT_KINDS),
  silhouette: z.enum(SILHOUETTES).optional(),
  worn: z.enum(['closed', 'open']).optional(),
  pullOn: z.boolean().optional(),
  seamEdges: z.partialRecord(point, z.number().int().min(1).max(24)).optional(),
  compareAs: z.partialRecord(point, point).optional(),
  draftedBustDifferenceMm: amount.optional(),
  draftedStretch: z.number().min(0).max(3).optional(),
});

/** The cloth it is sewn from. Stretch and shrinkage are fractions. */
export const fabricSchema = z.object({
  structure: z.enum(['woven', 'knit']),
  stretch: z.number().min(0).max(3).optional(),
  usableShare: z.number().min(0).max(1).optional(),
  shrinkLengthwise: z.number().min(-0.1).max(0.3).optional(),
  shrinkCrosswise: z.number().min(-0.1).max(0.3).optional(),
});

/** One layer worn underneath. */
export const layerSchema = z.object({
  name: z.string().min(1).max(80),
  thicknessMm: z.number().min(0).max(40),
  zones: z.array(zone).optional(),
  finishedMm: z.partialRecord(point, length).optional(),
});

/** Everything the plan follows from; the same input always gives the same plan. */
export const fitInputSchema = z.object({
  garment: garmentSchema,
  fabric: fabricSchema,
  layers: z.array(layerSchema).max(8).optional(),
  body: z.partialRecord(point, length),
  takenBy: z.enum(['self', 'another']).optional(),
  tapeErrorMm: z.partialRecord(point, z.number().min(0).max(100)).optional(),
  preferenceMm: z.partialRecord(point, amount).optional(),
  lean: z.enum(['closer', 'roomier']).optional(),
  sizes: z.array(sizeRowSchema).min(1).max(SIZES_MAX),
  cutBetweenLines: z.boolean().optional(),
  held: z.partialRecord(zone, z.number().min(0).max(SIZES_MAX)).optional(),
});
export type FitInput = z.infer<typeof fitInputSchema>;

/**
 * A size by its label and its position in the grade (0 is the first). Half-way between two sizes (3.5, `16–18`)
 * `between` has the labels of both.
 */
export const sizeChoiceSchema = z.object({
  label: z.string(),
  position: z.number(),
  between: z.object({ smaller: z.string(), larger: z.string() }).optional(),
});
export type SizeChoice = z.infer<typeof sizeChoiceSchema>;

/** One point at one size: every length in mm, null where it cannot be said. */
export const pointResultSchema = z.object({
  alteredMm: z.number().optional(),
  point,
  zone,
  size: sizeChoiceSchema,
  bodyMm: z.number(),
  chartMm: measured.nullable(),
  finishedMm: z.number().nullable(),
  easeMm: z.number().nullable(),
  draftedEaseMm: z.number().nullable(),
  floorMm: z.number().nullable(),
  leewayMm: z.number().nullable(),
  deviationMm: z.number().nullable(),
  verdict: z.enum(VERDICTS),
  borderline: z.boolean(),
});
export type PointResult = z.infer<typeof pointResultSchema>;

/** One zone's size in a plan; `governedBy` is null where the zone has no measured point and follows a neighbour. */
export const zonePlanSchema = z.object({ zone, size: sizeChoiceSchema, governedBy: point.nullable() });
export type ZonePlan = z.infer<typeof zonePlanSchema>;

/** An alteration beside the sizes (none are offered yet; the shape is the contract's). */
export const alterationSchema = z.object({
  kind: z.enum(['fullBust', 'smallBust', 'girth', 'length']),
  point,
  amountMm: z.number(),
  edges: z.number().int().nullable(),
  perEdgeMm: z.number().nullable(),
});

/** One crossing from a size line to another, as it is cut. `overMm` is measured down the garment. */
export const blendSchema = z.object({
  fromZone: zone,
  toZone: zone,
  from: sizeChoiceSchema,
  to: sizeChoiceSchema,
  point,
  changeMm: z.number(),
  edges: z.number().int(),
  perEdgeMm: z.number(),
  overMm: z.number().nullable(),
  overIsAssumed: z.boolean(),
  angleDegrees: z.number().nullable(),
});
export type Blend = z.infer<typeof blendSchema>;

export const optionSchema = z.object({
  kind: z.enum(['oneSize', 'blend', 'alter']),
  zones: z.array(zonePlanSchema),
  points: z.array(pointResultSchema),
  alterations: z.array(alterationSchema),
  blends: z.array(blendSchema),
  cost: z.number(),
});
export type FitOption = z.infer<typeof optionSchema>;

export const reasonSchema = z.object({
  code: z.enum(REASON_CODES),
  point: point.optional(),
  zone: zone.optional(),
  amountMm: z.number().optional(),
});
export type Reason = z.infer<typeof reasonSchema>;

export const cautionSchema = z.object({
  code: z.enum(CAUTION_CODES),
  point: point.optional(),
  zone: zone.optional(),
  amountMm: z.number().optional(),
  steps: z.number().optional(),
});
export type Caution = z.infer<typeof cautionSchema>;

/** The plan: which size where, every point at it, the options beside it, and why. */
export const fitPlanSchema = z.object({
  status: z.enum(['planned', 'outOfRange', 'notEnough']),
  zones: z.array(zonePlanSchema),
  points: z.array(pointResultSchema),
  options: z.array(optionSchema),
  blends: z.array(blendSchema),
  alterations: z.array(alterationSchema),
  certainty: z.null(),
  reasons: z.array(reasonSchema),
  cautions: z.array(cautionSchema),
});
export type FitPlan = z.infer<typeof fitPlanSchema>;
