import type { FitGarment } from './fit-garment.ts';

/** Zones that must take one size together, as a smaller tree. */
export interface ZoneGroups {
  /** The group of each zone. */
  of: number[];
  parents: number[];
  limits: number[];
  /** What the join of each group to its parent weighs. */
  weights: number[];
}

/**
 * Groups the zones of a garment: one in which nothing speaks (`isFree`) follows its neighbour, unless it lies between
 * two that speak, where it may carry the blend.
 */
export function groupZones({ parents, limits, weights }: FitGarment, isFree: readonly boolean[]): ZoneGroups {
  const follows = followers(parents, isFree);
  const groups: ZoneGroups = { of: [], parents: [], limits: [], weights: [] };
  for (let zone = 0; zone < parents.length; zone++) {
    const above = groups.of[parents[zone] ?? 0] ?? 0;
    if (zone > 0 && follows[zone] === true) {
      groups.of.push(above);
      continue;
    }
    groups.of.push(groups.parents.length);
    groups.parents.push(zone === 0 ? -1 : above);
    groups.limits.push(limits[zone] ?? 0);
    groups.weights.push(weights[zone] ?? 1);
  }
  return groups;
}

/** Whether each zone takes its parent's size. */
function followers(parents: readonly number[], isFree: readonly boolean[]): boolean[] {
  const follows = parents.map(() => false);
  // From the leaves: an empty end of the tree follows its parent.
  const isEmpty = isFree.slice();
  for (let zone = parents.length - 1; zone > 0; zone--) {
    if (isEmpty[zone] === true) follows[zone] = true;
    else isEmpty[parents[zone] ?? 0] = false;
  }
  // From the first zone: an empty beginning follows the only branch that speaks.
  let first = 0;
  while (isFree[first] === true) {
    const branches = branchesOf(parents, follows, first);
    const only = branches[0];
    if (branches.length !== 1 || only === undefined) break;
    follows[only] = true;
    first = only;
  }
  return follows;
}

function branchesOf(parents: readonly number[], follows: readonly boolean[], zone: number): number[] {
  const branches: number[] = [];
  for (let child = zone + 1; child < parents.length; child++) {
    if (parents[child] === zone && follows[child] !== true) branches.push(child);
  }
  return branches;
}
