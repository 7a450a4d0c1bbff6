import { doubles } from '../numeric/doubles.ts';
import { BETWEEN_LINES, JOIN_FIXED, JOIN_SQUARE, NEARNESS } from './constants.ts';
import type { Reckoning } from './reckoning.ts';

/** What a zone costs at each place, zone after zone, with the light pulls: to the nearest where loose, to a size's line. */
export interface ZoneCosts {
  costs: number[];
  /** The same without the floor and without the light pulls. */
  deviationCosts: number[];
  /** Whether a point says anything in the zone. */
  speaks: boolean[];
}

/** The cost of a join between neighbouring zones that lie so many sizes apart. */
export function joinCost(apart: number): number {
  return apart === 0 ? 0 : JOIN_FIXED + JOIN_SQUARE * apart * apart;
}

/** Adds up what the points of each zone cost. */
export function zoneCosts(reckoning: Reckoning): ZoneCosts {
  const { places, garment, deviation, half, deviationCost, floorCost } = reckoning;
  const costs = zeros(garment.zones.length * places);
  const deviationCosts = zeros(garment.zones.length * places);
  const speaking = garment.zones.map(() => false);
  for (const { spec, at, chooses, case: found } of reckoning.points) {
    // Finished only without a target: the floor is all it can say.
    if (!chooses && !(found === 'noTarget' && spec.floorBinds && !Number.isNaN(spec.wearingMm))) continue;
    speaking[spec.zoneAt] = true;
    const from = spec.zoneAt * places;
    const isLoose = chooses && spec.role === 'loose';
    const pull = NEARNESS * spec.share;
    for (let s = 0; s < places; s++) {
      const i = at + s;
      const byDeviation = deviationCost[i] as number;
      let cost = byDeviation + (floorCost[i] as number);
      if (isLoose) {
        const share = (deviation[i] as number) / (half[i] as number);
        cost += pull * (share < 0 ? -share : share);
      }
      costs[from + s] = (costs[from + s] as number) + cost;
      deviationCosts[from + s] = (deviationCosts[from + s] as number) + byDeviation;
    }
  }
  if (reckoning.perSize > 1) pullToLines(reckoning, costs);
  return { costs, deviationCosts, speaks: speaking };
}

function pullToLines({ garment, places }: Reckoning, costs: number[]): void {
  garment.weights.forEach((weight, zone) => {
    for (let s = 1; s < places; s += 2) {
      const i = zone * places + s;
      costs[i] = (costs[i] as number) + BETWEEN_LINES * weight;
    }
  });
}

/** So many zeros. */
export function zeros(count: number): number[] {
  const numbers = doubles(count);
  for (let i = 0; i < count; i++) numbers[i] = 0;
  return numbers;
}
