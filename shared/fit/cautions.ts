import type { PointId } from '../points/point-ids.ts';
import { BEYOND_PER_EDGE_MM, SLIGHT_MM, STEEP_DEGREES, TIE } from './constants.ts';
import type { Blend, Caution, FitInput } from './fit.schema.ts';
import type { ZoneId } from './fit-words.ts';
import type { ReckonedPoint, Reckoning } from './reckoning.ts';

/** What the engine does not reckon yet; empty where it can answer. */
export function refusals(input: FitInput): Caution[] {
  const { fabric, layers } = input;
  const refused: Caution[] = [];
  if (fabric.structure === 'knit' || (fabric.stretch ?? 0) > 0) refused.push({ code: 'knitNotReckoned' });
  if ((fabric.shrinkLengthwise ?? 0) !== 0 || (fabric.shrinkCrosswise ?? 0) !== 0) {
    refused.push({ code: 'shrinkageNotReckoned' });
  }
  if (layers !== undefined && layers.length > 0) refused.push({ code: 'layersNotReckoned' });
  if (input.lean !== undefined) refused.push({ code: 'leanNotReckoned' });
  return refused;
}

/** What is missing, and which points abstain, whatever is planned. */
export function tableCautions(reckoning: Reckoning): Caution[] {
  const cautions: Caution[] = [];
  if (reckoning.points.length === 0) cautions.push({ code: 'nothingShared' });
  for (const { point, zone } of reckoning.notMeasured) cautions.push({ code: 'notMeasured', point, zone });
  for (const { spec, case: found } of reckoning.points) {
    const { point, zone } = spec;
    if (found === 'falls') cautions.push({ code: 'chartFalls', point, zone });
    if (found === 'someSizes') cautions.push({ code: 'givenAtSomeSizes', point, zone });
    if (found === 'noTarget') cautions.push({ code: 'noTarget', point, zone });
  }
  return cautions;
}

/** What to know of each point at the planned sizes: unknown ease, less than wearing ease. Amounts in mm. */
export function pointCautions(reckoning: Reckoning, places: readonly number[]): Caution[] {
  const cautions: Caution[] = [];
  for (const { spec, at, bodyMm, case: found } of reckoning.points) {
    const { point, zone } = spec;
    const i = at + (places[spec.zoneAt] ?? 0);
    const ease = (reckoning.finished[i] ?? NaN) - bodyMm;
    const floor = reckoning.floor[i] ?? NaN;
    if (found === 'chart' && Number.isNaN(ease)) cautions.push({ code: 'easeUnknown', point, zone });
    if (ease < floor - TIE) cautions.push({ code: 'belowFloor', point, zone, amountMm: floor - ease });
    else if (floor < spec.wearingMm && ease < spec.wearingMm - TIE) {
      cautions.push({ code: 'belowHandbook', point, zone, amountMm: spec.wearingMm - ease });
    }
  }
  return cautions;
}

/** Where the body lies beyond the pattern's first or last size, and whether so far that there is no plan. */
export function endCautions(
  input: FitInput,
  reckoning: Reckoning,
): { cautions: Caution[]; isOutOfRange: boolean } {
  const cautions: Caution[] = [];
  let isOutOfRange = false;
  const isAllLoose = !reckoning.points.some(({ chooses, spec }) => chooses && spec.role !== 'loose');
  for (const point of reckoning.points) {
    if (!point.chooses) continue;
    const { spec } = point;
    const farMm = BEYOND_PER_EDGE_MM * (input.garment.seamEdges?.[spec.point] ?? spec.edges);
    const isJudged = spec.role !== 'loose' || isAllLoose;
    for (const [code, place, sign] of [
      ['beyondSmallest', 0, -1],
      ['beyondLargest', reckoning.places - 1, 1],
    ] as const) {
      const i = point.at + place;
      const beyond = sign * (reckoning.deviation[i] ?? 0);
      const isBeyond = isJudged && beyond > (reckoning.half[i] ?? 0) + TIE;
      const isShort = sign > 0 && missingAt(reckoning, point, i) > farMm;
      if (!isBeyond && !isShort) continue;
      isOutOfRange ||= isShort || beyond > farMm;
      const steps = beyond / (reckoning.step[i] ?? 1);
      cautions.push({ code, point: spec.point, zone: spec.zone, amountMm: sign * beyond, steps });
    }
  }
  return { cautions, isOutOfRange };
}

/** How much less than wearing ease there is, in mm: however loose the point, cloth that does not close is not a plan. */
function missingAt(reckoning: Reckoning, point: ReckonedPoint, i: number): number {
  return (reckoning.floor[i] ?? NaN) - ((reckoning.finished[i] ?? NaN) - point.bodyMm);
}

/** What to watch when cutting the blends. The amount is the change at one seam edge, in mm. */
export function blendCautions(blends: readonly Blend[]): Caution[] {
  const cautions: Caution[] = [];
  for (const { fromZone, toZone, point, perEdgeMm, angleDegrees } of blends) {
    const where = { point, zone: toZone, amountMm: perEdgeMm };
    if (angleDegrees !== null && angleDegrees > STEEP_DEGREES) cautions.push({ code: 'steep', ...where });
    if (Math.abs(perEdgeMm) < SLIGHT_MM) cautions.push({ code: 'slight', ...where });
    if (fromZone === 'hip' && toZone === 'thigh') cautions.push({ code: 'crotchCurve', ...where });
  }
  return cautions;
}

const PASSES: readonly [opening: PointId, body: PointId, zone: ZoneId][] = [
  ['neckOpening', 'head', 'neck'],
  ['waistOpening', 'hip', 'waist'],
  ['cuffOpening', 'hand', 'sleeve'],
  ['legOpening', 'instepHeel', 'hem'],
];

/** Where nothing opens (`pullOn`): each opening that is smaller than what must pass through it, and by how much in mm. */
export function passCautions(input: FitInput, reckoning: Reckoning, places: readonly number[]): Caution[] {
  if (input.garment.pullOn !== true) return [];
  return PASSES.flatMap(([opening, body, zone]) => {
    const place = places[reckoning.garment.zones.indexOf(zone)];
    const openingMm = place === undefined ? undefined : reckoning.rows[place]?.finished[opening];
    const amountMm = (input.body[body] ?? NaN) - (openingMm ?? NaN);
    return amountMm > 0 ? [{ code: 'doesNotPass' as const, point: opening, zone, amountMm }] : [];
  });
}
