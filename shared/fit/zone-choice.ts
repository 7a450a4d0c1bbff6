import { treeMinimum } from '../numeric/tree-minimum.ts';
import type { TreeChoice, TreeProblem } from '../numeric/tree-minimum.ts';
import { JOIN_OVER_LIMIT, TIE } from './constants.ts';
import type { FitInput } from './fit.schema.ts';
import type { Reckoning } from './reckoning.ts';
import { joinCost, zeros } from './zone-costs.ts';
import type { ZoneCosts } from './zone-costs.ts';
import { groupZones } from './zone-groups.ts';
import type { ZoneGroups } from './zone-groups.ts';

/** For patterns of any usual length, worked out once: of whole sizes, and of halves. */
const JOIN_COSTS = { 1: joinCosts(200, 1), 2: joinCosts(400, 2) } as const;

/** A place for every zone, by the garment's zone order, and what it costs with the light pulls. */
export interface ZoneChoice {
  places: number[];
  cost: number;
}

/** The cheapest choice with one size for every zone, and with more than one; null where there is none. */
export interface ZoneChoices {
  oneSize: ZoneChoice | null;
  blend: ZoneChoice | null;
}

/**
 * Finds the best single size and the best blend round the held sizes: the optimum of all points and joins together, by
 * dynamic programming on the tree of zones.
 */
export function chooseZones(reckoning: Reckoning, zones: ZoneCosts, held: FitInput['held']): ZoneChoices {
  const { garment } = reckoning;
  const fixed = garment.zones.map((zone) => held?.[zone]);
  const isFree = zones.speaks.map((speaks, zone) => !speaks && fixed[zone] === undefined);
  const groups = groupZones(garment, isFree);
  const problem = makeProblem(reckoning, zones.costs, groups, fixed);
  let found = treeMinimum(problem);
  // Sizes held so far apart that no allowed join is left: exceed the limits by as little as can be.
  if (found.uniform.cost === Infinity && found.varied === null) {
    found = treeMinimum({ ...problem, overLimit: JOIN_OVER_LIMIT });
  }
  return { oneSize: spread(found.uniform, groups), blend: spread(found.varied, groups) };
}

function spread(choice: TreeChoice | null, groups: ZoneGroups): ZoneChoice | null {
  if (choice === null || choice.cost === Infinity) return null;
  return { places: groups.of.map((group) => choice.states[group] ?? 0), cost: choice.cost };
}

function joinCosts(places: number, perSize: number): number[] {
  return Array.from({ length: places }, (_, apart) => joinCost(apart / perSize));
}

function makeProblem(
  reckoning: Reckoning,
  costs: readonly number[],
  groups: ZoneGroups,
  fixed: readonly (number | undefined)[],
): TreeProblem {
  const { places, perSize } = reckoning;
  const known = JOIN_COSTS[perSize];
  const grouped = zeros(groups.parents.length * places);
  for (let zone = 0; zone < fixed.length; zone++) {
    const from = zone * places;
    const to = (groups.of[zone] ?? 0) * places;
    const only = (fixed[zone] ?? NaN) * perSize;
    for (let s = 0; s < places; s++) {
      const isForbidden = !Number.isNaN(only) && only !== s;
      grouped[to + s] = isForbidden ? Infinity : (grouped[to + s] as number) + (costs[from + s] as number);
    }
  }
  return {
    parents: groups.parents,
    states: places,
    costs: grouped,
    limits: perSize === 1 ? groups.limits : groups.limits.map((limit) => limit * perSize),
    joinCosts: places <= known.length ? known : joinCosts(places, perSize),
    joinWeights: groups.weights,
    overLimit: Infinity,
    tie: TIE,
  };
}
