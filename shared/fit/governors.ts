import type { PointId } from '../points/point-ids.ts';
import { TIE } from './constants.ts';
import type { ReckonedPoint, Reckoning } from './reckoning.ts';
import type { ZoneCosts } from './zone-costs.ts';

/**
 * For each zone (by the garment's zone order) the point that decided its size: the one that loses most by the zone's
 * next best size. Null where no point says which size is nearer, so that the zone follows its neighbour.
 */
export function governors(
  reckoning: Reckoning,
  zones: ZoneCosts,
  places: readonly number[],
): (ReckonedPoint | null)[] {
  const found = reckoning.garment.zones.map<ReckonedPoint | null>(() => null);
  const losses = found.map(() => -Infinity);
  const others = places.map((place, zone) => bestPlace(reckoning, zones.costs, zone, place));
  for (const point of reckoning.points) {
    const { zoneAt } = point.spec;
    const other = others[zoneAt] ?? 0;
    const here = places[zoneAt] ?? 0;
    if (!point.chooses && pointCost(reckoning, point, other) <= pointCost(reckoning, point, here)) continue;
    if (point.case === 'falls' || point.case === 'someSizes') continue;
    // With one size nothing is lost: then the weightiest point stands for the zone.
    const loss =
      other === here
        ? point.spec.weight
        : pointCost(reckoning, point, other) - pointCost(reckoning, point, here) + TIE * point.spec.weight;
    if (loss <= (losses[zoneAt] ?? 0)) continue;
    losses[zoneAt] = loss;
    found[zoneAt] = point;
  }
  return found;
}

/** What a point costs at a place. */
export function pointCost(reckoning: Reckoning, point: ReckonedPoint, place: number): number {
  const i = point.at + place;
  return (reckoning.deviationCost[i] ?? 0) + (reckoning.floorCost[i] ?? 0);
}

/** The cheapest place of a zone taken by itself, the larger where equal; `except` is passed over where there is another. */
export function bestPlace(reckoning: Reckoning, costs: readonly number[], zone: number, except = -1): number {
  const { places } = reckoning;
  const from = zone * places;
  let best = places === 1 ? 0 : -1;
  let least = Infinity;
  for (let s = 0; s < places; s++) {
    const cost = costs[from + s] as number;
    if (cost > least + TIE || s === except) continue;
    best = s;
    if (cost < least) least = cost;
  }
  return best;
}

/** The id of a governing point, or null. */
export function idOf(point: ReckonedPoint | null | undefined): PointId | null {
  return point?.spec.point ?? null;
}
