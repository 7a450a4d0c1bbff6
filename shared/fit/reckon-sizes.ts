import { MEASURES } from '../points/measures.ts';
import {
  FLOOR_SHARE_OF_BODY,
  STEP_LEAST_TAPE_ERRORS,
  STEP_ONE_SIZE_GIRTH_MM,
  STEP_ONE_SIZE_WIDTH_MM,
  WEIGHT_FLOOR,
} from './constants.ts';
import type { FitPoint } from './fit-garment.ts';
import type { FitInput } from './fit.schema.ts';
import type { ReckonedPoint, Reckoning } from './reckoning.ts';

/**
 * Fills in deviation, step, half-width, floor and costs of a point at every place; its columns must have been read.
 * The grade step goes from size to size: at a size to the neighbour on the side of the deviation, at an end to the one
 * there is. Half-way between two sizes it is the distance between these two, whichever side the deviation is on: then
 * a body between a size and the half beside it is measured by the same step from both, and the nearer wins.
 */
export function reckonSizes(input: FitInput, reckoning: Reckoning, point: ReckonedPoint): void {
  const { chartLow, chartHigh, finished, places, perSize } = reckoning;
  const { deviation: deviations, step: steps, half: halves, floor: floors } = reckoning;
  const { deviationCost: deviationCosts, floorCost: floorCosts } = reckoning;
  const { spec, at, bodyMm, chooses, case: found } = point;
  const { wearingMm, targetMm } = spec;
  const isSewn = found === 'finished' || found === 'noTarget';
  const hasDraft = found === 'both';
  const floorActs = (chooses || found === 'noTarget') && spec.floorBinds;
  const wanted = bodyMm + (input.preferenceMm?.[spec.point] ?? 0);
  // Rigid cloth carries a draft's smaller ease only where the draft did not count on stretch, and a chart that falls
  // says nothing of the draft. Where a table has no value, NaN runs through every figure that would need it.
  const carriesDraft =
    found !== 'falls' && (input.garment.draftedStretch ?? 0) <= (input.fabric.stretch ?? 0);
  const floorWeight = WEIGHT_FLOOR * spec.share;
  const leastStep = leastStepMm(point, places);
  let before = NaN;
  let size = NaN;
  let next = sizeMm(reckoning, at, isSewn);
  for (let s = 0; s < places; s++) {
    const i = at + s;
    const isSize = s % perSize === 0;
    if (isSize) {
      before = size;
      size = next;
      next = s + perSize < places ? sizeMm(reckoning, i + perSize, isSewn) : NaN;
    }
    const low = chartLow[i] as number;
    const high = chartHigh[i] as number;
    const sewn = finished[i] as number;
    const outside = wanted > high ? wanted - high : wanted < low ? wanted - low : 0;
    const deviation = !chooses ? NaN : isSewn ? wanted + targetMm - sewn : outside;
    const isDown = isSize && (s === places - 1 || (deviation < 0 && s > 0));
    const gap = isDown ? size - before : next - size;
    const step = gap > leastStep ? gap : leastStep;
    // Not below what the drafter meant for the largest body of the size.
    const floor = carriesDraft && sewn - high < wearingMm ? sewn - high : wearingMm;
    const half = halfWidth(step, hasDraft ? sewn - (low + high) / 2 : isSewn ? targetMm : NaN, floor, bodyMm);
    const share = deviation / half;
    const missing = (floor - sewn + bodyMm) / step;
    deviations[i] = deviation;
    steps[i] = step;
    halves[i] = half;
    floors[i] = spec.floorBinds ? floor : NaN;
    deviationCosts[i] = chooses ? deviationCost(spec, share) : 0;
    floorCosts[i] = floorActs && missing > 0 ? floorWeight * missing * missing : 0;
  }
}

/** What stands for a size: the middle of its chart's range, or the sewn garment, in mm. */
function sizeMm(reckoning: Reckoning, i: number, isSewn: boolean): number {
  if (isSewn) return reckoning.finished[i] as number;
  return ((reckoning.chartLow[i] as number) + (reckoning.chartHigh[i] as number)) / 2;
}

/** What tapes can tell apart; with one size, which has no neighbour, a usual grade. */
function leastStepMm({ spec }: ReckonedPoint, places: number): number {
  if (places > 1) return STEP_LEAST_TAPE_ERRORS * MEASURES[spec.point].tapeErrorMm;
  return spec.measure === 'girth' ? STEP_ONE_SIZE_GIRTH_MM : STEP_ONE_SIZE_WIDTH_MM;
}

/** Half of "as drafted": half a size, or half the leeway the draft has, whichever is larger. */
function halfWidth(step: number, target: number, floor: number, bodyMm: number): number {
  const least = FLOOR_SHARE_OF_BODY * bodyMm;
  // Where the handbook has no floor the body itself is one: rigid cloth closes round no less.
  const counted = floor > least ? floor : floor <= least ? least : 0;
  const room = target - counted;
  return (room > step ? room : step) / 2;
}

/** What a deviation of so many half-widths costs. */
function deviationCost({ role, weight }: FitPoint, share: number): number {
  if (role !== 'loose') return weight * share * share;
  const beyond = (share < 0 ? -share : share) - 1;
  return beyond > 0 ? weight * beyond * beyond : 0;
}
