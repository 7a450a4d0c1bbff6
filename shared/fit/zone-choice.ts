import { doubles } from '../numeric/doubles.ts';
import { treeMinimum } from '../numeric/tree-minimum.ts';
import type { TreeChoice, TreeProblem } from '../numeric/tree-minimum.ts';
import { JOIN_FIXED, JOIN_OVER_LIMIT, JOIN_SQUARE, NEARNESS, TIE } from './constants.ts';
import type { FitInput } from './fit.schema.ts';
import type { Reckoning } from './reckoning.ts';

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

/** What a zone costs at each size, zone after zone, with the light pull of loose points towards the nearest size. */
export interface ZoneCosts {
  costs: number[];
  /** The same without the floor and without the light pull. */
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
  const { sizes, garment, deviation, half, deviationCost, floorCost } = reckoning;
  const costs = zeros(garment.zones.length * sizes);
  const deviationCosts = zeros(garment.zones.length * sizes);
  const speaks = garment.zones.map(() => false);
  for (const { spec, at, chooses, case: found } of reckoning.points) {
    // Finished only without a target: the floor is all it can say.
    if (!chooses && !(found === 'noTarget' && spec.floorBinds && !Number.isNaN(spec.wearingMm))) continue;
    speaks[spec.zoneAt] = true;
    const from = spec.zoneAt * sizes;
    const isLoose = chooses && spec.role === 'loose';
    for (let s = 0; s < sizes; s++) {
      const i = at + s;
      const byDeviation = deviationCost[i] as number;
      let cost = byDeviation + (floorCost[i] as number);
      if (isLoose) {
        const share = (deviation[i] as number) / (half[i] as number);
        cost += NEARNESS * (share < 0 ? -share : share);
      }
      costs[from + s] = (costs[from + s] as number) + cost;
      deviationCosts[from + s] = (deviationCosts[from + s] as number) + byDeviation;
    }
  }
  return { costs, deviationCosts, speaks };
}

/**
 * Finds the best single size and the best blend round the held sizes. A zone in which nothing speaks follows its
 * neighbour; between two that speak it may carry the blend.
 */
export function chooseZones(reckoning: Reckoning, zones: ZoneCosts, held: FitInput['held']): ZoneChoices {
  const { garment } = reckoning;
  const fixed = garment.zones.map((zone) => held?.[zone]);
  const groups = groupZones(reckoning, zones.speaks, fixed);
  const problem = makeProblem(reckoning, zones.costs, groups, fixed);
  let found = treeMinimum(problem);
  // Sizes held so far apart that no allowed join is left: exceed the limits by as little as can be.
  if (found.uniform.cost === Infinity && found.varied === null) {
    found = treeMinimum({ ...problem, overLimit: JOIN_OVER_LIMIT });
  }
  return { oneSize: spread(found.uniform, groups), blend: spread(found.varied, groups) };
}

function spread(choice: TreeChoice | null, groups: Groups): ZoneChoice | null {
  if (choice === null || choice.cost === Infinity) return null;
  return { positions: groups.of.map((group) => choice.states[group] ?? 0), cost: choice.cost };
}

function zeros(count: number): number[] {
  const numbers = doubles(count);
  for (let i = 0; i < count; i++) numbers[i] = 0;
  return numbers;
}

interface Groups {
  /** The group of each zone. */
  of: number[];
  parents: number[];
  limits: number[];
}

/** Zones that must take one size together, as a smaller tree. */
function groupZones(reckoning: Reckoning, speaks: readonly boolean[], fixed: readonly unknown[]): Groups {
  const { zones, parents, limits } = reckoning.garment;
  const count = zones.length;
  const isFree = zones.map((_, zone) => speaks[zone] !== true && fixed[zone] === undefined);
  // From the leaves: an empty end of the tree follows its parent.
  const isEmptyBranch = isFree.slice();
  const follows = new Array<boolean>(count).fill(false);
  for (let zone = count - 1; zone > 0; zone--) {
    const parent = parents[zone] ?? 0;
    if (isEmptyBranch[zone] === true) follows[zone] = true;
    else isEmptyBranch[parent] = false;
  }
  // From the first zone: an empty beginning follows the only branch that speaks.
  for (let zone = 0; zone < count && isFree[zone] === true;) {
    const branches = branchesOf(parents, follows, zone);
    const only = branches[0];
    if (branches.length !== 1 || only === undefined) break;
    follows[only] = true;
    zone = only;
  }
  followTrunk(reckoning, isFree, follows, fixed);
  const of: number[] = [];
  const groups: Groups = { of, parents: [], limits: [] };
  for (let zone = 0; zone < count; zone++) {
    const above = of[parents[zone] ?? 0] ?? 0;
    of[zone] = zone > 0 && follows[zone] === true ? above : groups.parents.length;
    if (zone > 0 && follows[zone] === true) continue;
    groups.parents.push(zone === 0 ? -1 : above);
    groups.limits.push(limits[zone] ?? 0);
  }
  return groups;
}

/**
 * The chest rules the shoulder: where no governing or fitted point speaks at the shoulder it takes the bust's size,
 * so that neither neck nor sleeve can draw it along.
 */
function followTrunk(
  reckoning: Reckoning,
  isFree: readonly boolean[],
  follows: boolean[],
  fixed: readonly unknown[],
): void {
  const { zones } = reckoning.garment;
  const shoulder = zones.indexOf('shoulder');
  const bust = zones.indexOf('bust');
  if (shoulder < 0 || bust < 0 || fixed[shoulder] !== undefined) return;
  const hasSay = reckoning.points.some(
    ({ spec, chooses }) => chooses && spec.zoneAt === shoulder && spec.role !== 'loose',
  );
  if (isFree[shoulder] === true || !hasSay) follows[bust] = true;
}

function branchesOf(parents: readonly number[], follows: readonly boolean[], zone: number): number[] {
  const branches: number[] = [];
  for (let child = zone + 1; child < parents.length; child++) {
    if (parents[child] === zone && follows[child] !== true) branches.push(child);
  }
  return branches;
}

function makeProblem(
  reckoning: Reckoning,
  costs: readonly number[],
  groups: Groups,
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
    joinCosts: Array.from({ length: sizes }, (_, apart) => joinCost(apart)),
    overLimit: Infinity,
    tie: TIE,
  };
}
