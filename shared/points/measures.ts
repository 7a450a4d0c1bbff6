import { POINT_IDS } from './point-ids.ts';
import type { PointId } from './point-ids.ts';

/** How a point is measured: a closed loop, open across the body, or along it. */
export type MeasureKind = 'girth' | 'width' | 'length';

/** What reckoning needs to know of a point; its words are in the catalogue. */
export interface Measure {
  kind: MeasureKind;
  /** Only a garment has this point. */
  garmentOnly: boolean;
  /** How far a tape handled by oneself is usually off, in mm. */
  tapeErrorMm: number;
  /** The point of which this is the left or right; null where the point has no side. */
  sideOf: PointId | null;
}

const WIDTHS = new Set<PointId>([
  'shoulderLength',
  'shoulderWidth',
  'backWidth',
  'frontWidth',
  'bustPointSpan',
  'bustFrontArc',
  'bustBackArc',
  'hipFrontArc',
  'hipBackArc',
]);
const LENGTHS = new Set<PointId>([
  'shoulderSlope',
  'backWaistLength',
  'frontWaistLength',
  'bustPointDepth',
  'scyeDepth',
  'armLength',
  'waistToHip',
  'waistToKnee',
  'outsideLeg',
  'insideLeg',
  'bodyRise',
  'crotchLength',
  'crotchLengthFront',
  'crotchLengthBack',
  'height',
  'cervicalHeight',
  'waistHeight',
  'hipHeight',
  'kneeHeight',
  'garmentLength',
  'sleeveLength',
]);
const GARMENT_ONLY = new Set<PointId>([
  'garmentLength',
  'sleeveLength',
  'hemGirth',
  'neckOpening',
  'waistOpening',
  'cuffOpening',
  'legOpening',
]);
const LARGE_GIRTHS = new Set<PointId>([
  'upperBust',
  'bust',
  'underbust',
  'waist',
  'abdomen',
  'highHip',
  'hip',
  'trunk',
]);

/**
 * Judgement, between two published bounds: ISO 20685 allows trained observers 9 mm on large girths and 4 mm on small
 * ones (textbook Anthropometry, Apparel Sizing and Design, p. 41); NATICK/TR-11/017, Appendix G, allows 14 mm at the
 * chest, 12 mm at waist and buttock, 6 mm at neck and thigh, 3 mm at wrist and shoulder length. Repeated tapes by
 * oneself differ by 2 to 19 mm (Barrios et al., BMC Med Res Methodol 2016;16:49).
 */
const LARGE_GIRTH_ERROR_MM = 10;
const OTHER_ERROR_MM = 5;

/** Every point's measure, in mm; sources of the tape errors stand beside the figures above. */
export const MEASURES: Readonly<Record<PointId, Measure>> = Object.fromEntries(
  POINT_IDS.map((point) => [point, measure(point)]),
) as Record<PointId, Measure>;

/**
 * The body to fit from measured points in mm: where only left and right of a point are known, the larger stands for
 * both, since both sides are cut alike. Points without a length are left out; an empty set gives an empty body.
 */
export function bodyForFitting(
  values: Readonly<Partial<Record<PointId, number | undefined>>>,
): Partial<Record<PointId, number>> {
  const body: Partial<Record<PointId, number>> = {};
  for (const point of POINT_IDS) {
    const value = values[point];
    if (value !== undefined) body[point] = value;
  }
  for (const point of POINT_IDS) {
    const { sideOf } = MEASURES[point];
    const value = values[point];
    if (sideOf === null || value === undefined || values[sideOf] !== undefined) continue;
    body[sideOf] = Math.max(body[sideOf] ?? value, value);
  }
  return body;
}

function measure(point: PointId): Measure {
  const sideOf = unsided(point);
  const named = sideOf ?? point;
  return {
    kind: WIDTHS.has(named) ? 'width' : LENGTHS.has(named) ? 'length' : 'girth',
    garmentOnly: GARMENT_ONLY.has(point),
    tapeErrorMm: LARGE_GIRTHS.has(point) ? LARGE_GIRTH_ERROR_MM : OTHER_ERROR_MM,
    sideOf,
  };
}

function unsided(point: PointId): PointId | null {
  const name = point.replace(/(?:Left|Right)$/, '');
  return name === point ? null : (POINT_IDS.find((other) => other === name) ?? null);
}
