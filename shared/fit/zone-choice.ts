import { treeMinimum } from '../numeric/tree-minimum.ts';
import type { TreeChoice, TreeProblem } from '../numeric/tree-minimum.ts';
import { JOIN_OVER_LIMIT, TIE } from './constants.ts';
import type { FitInput } from './fit.schema.ts';
import type { Reckoning } from './reckoning.ts';
import { joinCost, zeros } from './zone-costs.ts';
import type { ZoneCosts } from './zone-costs.ts';
import { groupZones } from './zone-groups.ts';
import type { ZoneGroups } from './zone-groups.ts';

/** For patterns of any usual length, worked out once. */
const JOIN_COSTS = joinCosts(200);

/** A size for every zone, by the garment's zone order, and what it costs with the pull of loose points. */
export interface ZoneChoice {
  positions: number[];
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
  return { positions: groups.of.map((group) => choice.states[group] ?? 0), cost: choice.cost };
}

function joinCosts(sizes: number): number[] {
  return Array.from({ length: sizes }, (_, apart) => joinCost(apart));
}

function makeProblem(
  reckoning: Reckoning,
  costs: readonly number[],
  groups: ZoneGroups,
  fixed: readonly (number | undefined)[],
): TreeProblem {
  const { sizes } = reckoning;
  const grouped = zeros(groups.parents.length * sizes);
  for (let zone = 0; zone < fixed.length; zone++) {
    const from = zone * sizes;
    const to = (groups.of[zone] ?? 0) * sizes;
    const only = fixed[zone];
    for (let s = 0; s < sizes; s++) {
      const isForbidden = only !== undefined && only !== s;
      grouped[to + s] = isForbidden ? Infinity : (grouped[to + s] as number) + (costs[from + s] as number);
    }
  }
  return {
    parents: groups.parents,
    states: sizes,
    costs: grouped,
    limits: groups.limits,
    joinCosts: sizes <= JOIN_COSTS.length ? JOIN_COSTS : joinCosts(sizes),
    joinWeights: groups.weights,
    overLimit: Infinity,
    tie: TIE,
  };
}
