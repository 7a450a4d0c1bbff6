import type { PointId } from '../points/point-ids.ts';
import type { FitInput, SizeRow } from './fit.schema.ts';
import type { GarmentKind, ZoneId } from './fit-words.ts';

/** How far it is down the garment from one level to the next, in mm. */
export interface LevelDistance {
  mm: number;
  /** Whether a usual distance stands in, since neither pattern nor person gives the lengths. */
  isAssumed: boolean;
}

interface Rule {
  /** The distance is the first length less the second (or by itself). */
  long: PointId;
  less: PointId | null;
  /** What of it is not used for the crossing, in mm. */
  keptMm: number;
  /** The usual distance, in mm, already without what is kept. */
  usualMm: number;
}

/** A crossing starts about 2 in below the armhole and reaches the new size at the waist: common practice. */
const BELOW_ARMHOLE_MM = 50.8;

const RULES: Partial<Record<`${ZoneId}-${ZoneId}`, Rule>> = {
  // Nape to waist about 410 mm, nape to armhole level about 210 mm: from memory.
  'bust-waist': {
    long: 'backWaistLength',
    less: 'scyeDepth',
    keptMm: BELOW_ARMHOLE_MM,
    usualMm: 200 - BELOW_ARMHOLE_MM,
  },
  // The hip is taken 8 to 9 in below the waist: Carlson, EC 742, Oregon State Univ. Extension, 1969.
  'waist-hip': { long: 'waistToHip', less: null, keptMm: 0, usualMm: 8 * 25.4 },
  // From the hip to the crotch, and on to the knee and the ankle: from memory.
  'hip-thigh': { long: 'bodyRise', less: 'waistToHip', keptMm: 0, usualMm: 75 },
  'thigh-knee': { long: 'waistToKnee', less: 'bodyRise', keptMm: 0, usualMm: 320 },
  'knee-hem': { long: 'outsideLeg', less: 'waistToKnee', keptMm: 0, usualMm: 400 },
  'hip-hem': { long: 'waistToKnee', less: 'waistToHip', keptMm: 0, usualMm: 400 },
};

/** Only of these may a hem at the knee be assumed; a shirt ends soon after the hip, nobody says where. */
const REACH_THE_KNEE = new Set<GarmentKind>(['dress', 'skirt', 'fullSkirt', 'coat', 'robe', 'nightwear']);

/**
 * The distance between two neighbouring levels, in mm: from the chart at a size, else the person's own lengths, else a
 * usual distance, marked as assumed. Null where the cut runs round an armhole or neckline, or nothing is usual.
 */
export function levelDistance(
  input: FitInput,
  size: SizeRow | undefined,
  from: ZoneId,
  to: ZoneId,
): LevelDistance | null {
  const rule = RULES[`${from}-${to}`];
  if (!rule) return null;
  if (from === 'hip' && to === 'hem' && !REACH_THE_KNEE.has(input.garment.kind)) return null;
  const long = lengthOf(input, size, rule.long);
  const less = rule.less === null ? 0 : lengthOf(input, size, rule.less);
  const mm = long === null || less === null ? 0 : long - less - rule.keptMm;
  // Lengths that contradict each other give no distance to cut over.
  return mm > 0 ? { mm, isAssumed: false } : { mm: rule.usualMm, isAssumed: true };
}

function lengthOf(input: FitInput, size: SizeRow | undefined, point: PointId): number | null {
  const chart = size?.body[point];
  if (chart !== undefined) return typeof chart === 'number' ? chart : (chart.low + chart.high) / 2;
  return input.body[point] ?? null;
}
