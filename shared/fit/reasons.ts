import { TIE } from './constants.ts';
import type { FitInput, Reason } from './fit.schema.ts';
import { bestPlace, pointCost } from './governors.ts';
import type { ReckonedPoint, Reckoning } from './reckoning.ts';
import type { ZoneCosts } from './zone-costs.ts';

/**
 * Why each zone has its size, from neck to hem: what governs, what was given up for an easier cut, where the floor or a
 * tie decided. Amounts in mm.
 */
export function reasonsFor(
  input: FitInput,
  reckoning: Reckoning,
  zones: ZoneCosts,
  places: readonly number[],
  governing: readonly (ReckonedPoint | null)[],
): Reason[] {
  const reasons: Reason[] = [];
  const isOneSize = places.every((place) => place === places[0]);
  for (const zoneAt of reckoning.garment.shown) {
    const zone = reckoning.garment.zones[zoneAt];
    if (zone === undefined) continue;
    const place = places[zoneAt] ?? 0;
    if (input.held?.[zone] !== undefined) {
      reasons.push({ code: 'held', zone });
      continue;
    }
    const governor = governing[zoneAt];
    if (!governor) {
      reasons.push({ code: 'followsNeighbour', zone });
      continue;
    }
    const deviation = deviationAt(reckoning, governor, place);
    reasons.push({ code: 'governs', zone, point: governor.spec.point, ...amount(deviation) });
    const wanted = bestPlace(reckoning, zones.costs, zoneAt);
    const floor = floorReason(reckoning, zones, zoneAt, wanted, place);
    if (floor) reasons.push(floor);
    if (wanted !== place && !isTied(reckoning, zones, zoneAt, wanted, place)) {
      const given = givenUp(reckoning, zoneAt, wanted, place) ?? governor;
      const code = isOneSize ? 'oneSizeIsEnough' : 'joinHolds';
      const givenDeviation = deviationAt(reckoning, given, place);
      reasons.push({ code, zone, point: given.spec.point, ...amount(givenDeviation) });
    } else if (governor.chooses && isTied(reckoning, zones, zoneAt, place - reckoning.perSize, place)) {
      reasons.push({ code: 'tieToLarger', zone, point: governor.spec.point });
    }
  }
  return reasons;
}

/** Whether the deviations alone would have taken a smaller size than the floor lets them. */
function floorReason(
  reckoning: Reckoning,
  zones: ZoneCosts,
  zoneAt: number,
  wanted: number,
  place: number,
): Reason | null {
  const byDeviation = bestPlace(reckoning, zones.deviationCosts, zoneAt);
  if (byDeviation >= wanted || byDeviation >= place) return null;
  let deepest: Reason | null = null;
  for (const { spec, at, bodyMm } of reckoning.points) {
    if (spec.zoneAt !== zoneAt) continue;
    const i = at + byDeviation;
    const amountMm = (reckoning.floor[i] ?? NaN) - ((reckoning.finished[i] ?? NaN) - bodyMm);
    if (!(amountMm > (deepest?.amountMm ?? 0))) continue;
    deepest = { code: 'floorDecides', zone: spec.zone, point: spec.point, amountMm };
  }
  return deepest;
}

/** The point that gives up most by the zone's not having the size it would take by itself. */
function givenUp(reckoning: Reckoning, zoneAt: number, wanted: number, place: number): ReckonedPoint | null {
  let found: ReckonedPoint | null = null;
  let most = 0;
  for (const point of reckoning.points) {
    if (point.spec.zoneAt !== zoneAt) continue;
    const loss = pointCost(reckoning, point, place) - pointCost(reckoning, point, wanted);
    if (loss <= most) continue;
    most = loss;
    found = point;
  }
  return found;
}

function isTied(reckoning: Reckoning, zones: ZoneCosts, zoneAt: number, a: number, b: number): boolean {
  if (a < 0) return false;
  const from = zoneAt * reckoning.places;
  return Math.abs((zones.costs[from + a] ?? 0) - (zones.costs[from + b] ?? 0)) <= TIE;
}

function deviationAt(reckoning: Reckoning, point: ReckonedPoint, place: number): number {
  return reckoning.deviation[point.at + place] ?? NaN;
}

function amount(mm: number): { amountMm?: number } {
  return Number.isNaN(mm) ? {} : { amountMm: mm };
}
