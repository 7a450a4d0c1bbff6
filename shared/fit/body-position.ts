import { positionAmong } from '../numeric/position-among.ts';
import type { ScaleKnot } from '../numeric/position-among.ts';
import type { PointId } from '../points/point-ids.ts';
import { checkInput } from './check-input.ts';
import { refusals } from './cautions.ts';
import type { FitInput } from './fit.schema.ts';
import { reckon } from './reckon.ts';
import type { ReckonedPoint, Reckoning } from './reckoning.ts';

/**
 * Where the body sits on the size scale at a point: 0 is the first size, 2.5 lies half-way between the third and the
 * fourth, below 0 and beyond the last the end step is drawn on. A range reaches half a size to each side of its size.
 * Null where the point says nothing of sizes (not measured, not given at every size, falling, no target ease). Bad
 * input throws as in `planFit`.
 */
export function bodyPosition(input: FitInput, point: PointId): number | null {
  return bodyPositions(input)[point] ?? null;
}

/** As `bodyPosition`, for every point that says something, at the cost of one reckoning. */
export function bodyPositions(input: FitInput): Partial<Record<PointId, number>> {
  checkInput(input);
  if (refusals(input).length > 0) return {};
  const reckoning = reckon(input, 1);
  const positions: Partial<Record<PointId, number>> = {};
  for (const point of reckoning.points) {
    if (!point.chooses) continue;
    const wanted = point.bodyMm + (input.preferenceMm?.[point.spec.point] ?? 0);
    const position = positionOf(reckoning, point, wanted);
    if (position !== null) positions[point.spec.point] = position;
  }
  return positions;
}

function positionOf(reckoning: Reckoning, point: ReckonedPoint, wanted: number): number | null {
  if (reckoning.places === 1) {
    return (reckoning.deviation[point.at] ?? 0) / (reckoning.step[point.at] ?? 1);
  }
  if (point.case === 'finished') {
    return positionAmong(knots(reckoning, point, 'finished'), wanted + point.spec.targetMm);
  }
  // Overlapping ranges do not rise; then their middles stand for them.
  return (
    positionAmong(knots(reckoning, point, 'ranges'), wanted) ??
    positionAmong(knots(reckoning, point, 'middles'), wanted)
  );
}

function knots(
  reckoning: Reckoning,
  point: ReckonedPoint,
  by: 'finished' | 'ranges' | 'middles',
): ScaleKnot[] {
  const found: ScaleKnot[] = [];
  for (let s = 0; s < reckoning.places; s++) {
    const low = reckoning.chartLow[point.at + s] ?? NaN;
    const high = reckoning.chartHigh[point.at + s] ?? NaN;
    if (by === 'finished') found.push({ value: reckoning.finished[point.at + s] ?? NaN, position: s });
    else if (by === 'middles' || low === high) found.push({ value: (low + high) / 2, position: s });
    else found.push({ value: low, position: s - 0.5 }, { value: high, position: s + 0.5 });
  }
  return found;
}
