import { MEASURES } from '../points/measures.ts';
import type { PointId } from '../points/point-ids.ts';
import { BORDERLINE_TAPE_ERRORS, ERROR_SHARE_BY_ANOTHER, TIE } from './constants.ts';
import type { FitInput, Measured, PointResult, SizeChoice } from './fit.schema.ts';
import type { Verdict } from './fit-words.ts';
import type { ReckonedPoint, Reckoning } from './reckoning.ts';

/** What stands at a place, with its label and its position in the grade (0 is the first size). */
export function sizeChoice({ rows, perSize }: Reckoning, place: number): SizeChoice {
  const label = rows[place]?.label ?? '';
  if (place % perSize === 0) return { label, position: place / perSize };
  const between = { smaller: rows[place - 1]?.label ?? '', larger: rows[place + 1]?.label ?? '' };
  return { label, position: place / perSize, between };
}

/**
 * Every reckoned point at the places of its zone, from neck to hem; `places` by the garment's zone order, and a zone
 * without one is left out.
 */
export function pointResults(
  input: FitInput,
  reckoning: Reckoning,
  places: readonly (number | undefined)[],
): PointResult[] {
  const results: PointResult[] = [];
  for (const point of reckoning.points) {
    const place = places[point.spec.zoneAt];
    if (place !== undefined) results.push(pointResult(input, reckoning, point, place));
  }
  return results;
}

function pointResult(
  input: FitInput,
  reckoning: Reckoning,
  point: ReckonedPoint,
  place: number,
): PointResult {
  const { spec, bodyMm } = point;
  const i = point.at + place;
  const finishedMm = known(reckoning.finished[i]);
  const easeMm = finishedMm === null ? null : finishedMm - bodyMm;
  const floorMm = known(reckoning.floor[i]);
  const leewayMm = easeMm === null || floorMm === null ? null : easeMm - floorMm;
  const deviationMm = known(reckoning.deviation[i]);
  return {
    point: spec.point,
    zone: spec.zone,
    size: sizeChoice(reckoning, place),
    bodyMm,
    chartMm: chartAt(reckoning, i),
    finishedMm,
    easeMm,
    draftedEaseMm: point.case === 'both' ? draftedEase(reckoning, i) : null,
    floorMm,
    leewayMm,
    deviationMm,
    verdict: verdictOf(leewayMm, deviationMm, reckoning.half[i] ?? 0),
    borderline:
      leewayMm !== null && Math.abs(leewayMm) < BORDERLINE_TAPE_ERRORS * tapeError(input, point.bodyPoint),
  };
}

/** How far the tape may be off at a point, in mm: as stated, or the catalogue's, halved where another person measured. */
export function tapeError(input: FitInput, point: PointId): number {
  const stated = input.tapeErrorMm?.[point];
  if (stated !== undefined) return stated;
  return MEASURES[point].tapeErrorMm * (input.takenBy === 'another' ? ERROR_SHARE_BY_ANOTHER : 1);
}

function verdictOf(leewayMm: number | null, deviationMm: number | null, half: number): Verdict {
  if (leewayMm !== null && leewayMm < -TIE) return 'belowFloor';
  if (deviationMm === null) return 'unknown';
  if (deviationMm > half + TIE) return 'closer';
  return deviationMm < -half - TIE ? 'looser' : 'asDrafted';
}

function draftedEase(reckoning: Reckoning, i: number): number | null {
  const middle = ((reckoning.chartLow[i] ?? NaN) + (reckoning.chartHigh[i] ?? NaN)) / 2;
  return known((reckoning.finished[i] ?? NaN) - middle);
}

function chartAt(reckoning: Reckoning, i: number): Measured | null {
  const low = known(reckoning.chartLow[i]);
  const high = known(reckoning.chartHigh[i]);
  if (low === null || high === null) return null;
  return low === high ? low : { low, high };
}

function known(value: number | undefined): number | null {
  return value === undefined || Number.isNaN(value) ? null : value;
}
