import { doubles } from './doubles.ts';

/** A choice of one state for every node of a tree, where nodes and unequal neighbours cost. */
export interface TreeProblem {
  /** The parent of each node, by index; the first node has none (-1), and parents stand before children. */
  parents: readonly number[];
  /** How many states each node may take. */
  states: number;
  /** The cost of each node in each state, node after node; Infinity forbids a state. */
  costs: readonly number[];
  /** For each node, the most states it may lie from its parent (the first node's is not looked at). */
  limits: readonly number[];
  /** The cost of neighbours lying so many states apart, by distance; none for 0. */
  joinCosts: readonly number[];
  /** For each node, what its join to its parent weighs (the first node's is not looked at). */
  joinWeights: readonly number[];
  /** What each state beyond a limit costs; Infinity keeps every limit. */
  overLimit: number;
  /** Costs closer than this are equal, and then the larger state is taken. */
  tie: number;
}

/** One choice: the state of each node, and what it costs. */
export interface TreeChoice {
  states: number[];
  cost: number;
}

/** The cheapest choice with one state everywhere, and the cheapest with at least two. */
export interface TreeMinimum {
  uniform: TreeChoice;
  /** Null where no two different states are allowed. */
  varied: TreeChoice | null;
}

/**
 * Finds both optima by dynamic programming from the leaves to the first node, in time nodes × states × window.
 * Equal costs take the larger state. An empty tree or no state throws a RangeError; a choice that is forbidden
 * everywhere costs Infinity (uniform) or is null (varied).
 */
export function treeMinimum(problem: TreeProblem): TreeMinimum {
  const nodes = problem.parents.length;
  if (nodes === 0) throw new RangeError('treeMinimum: parents must hold at least one node');
  if (!(problem.states >= 1)) throw new RangeError('treeMinimum: states must be at least 1');
  const work = startWork(problem, nodes);
  for (let node = nodes - 1; node > 0; node--) settleEdge(problem, work, node);
  return {
    uniform: traceUniform(problem, work),
    varied: traceVaried(problem, work),
  };
}

interface Work {
  /** Cheapest subtree with one state throughout, by node and state. */
  same: number[];
  /** Cheapest subtree in which some neighbours differ. */
  mixed: number[];
  /** By node and its parent's state: the node's best state, whatever it is. */
  anyState: number[];
  /** The node's best state where this edge or one below it must differ. */
  mixedState: number[];
  /** Whether, in a mixed subtree of the parent, the difference comes first from this child. */
  fromChild: boolean[];
}

function startWork(problem: TreeProblem, nodes: number): Work {
  const size = nodes * problem.states;
  const same = doubles(size);
  const mixed = doubles(size);
  for (let i = 0; i < size; i++) {
    same[i] = problem.costs[i] as number;
    mixed[i] = Infinity;
  }
  return {
    same,
    mixed,
    anyState: new Array<number>(size),
    mixedState: new Array<number>(size),
    fromChild: new Array<boolean>(size),
  };
}

/** Settles, for every state of the parent, what the best state of the child is, and adds it to the parent. */
function settleEdge(problem: TreeProblem, work: Work, node: number): void {
  const { states, tie, overLimit, joinCosts } = problem;
  const { same, mixed, anyState, mixedState, fromChild } = work;
  const limit = problem.limits[node] ?? 0;
  const weight = problem.joinWeights[node] ?? 0;
  const window = overLimit === Infinity ? limit : states;
  const child = node * states;
  const parent = (problem.parents[node] ?? 0) * states;
  for (let s = 0; s < states; s++) {
    let best = Infinity;
    let bestState = s;
    let bestMixed = Infinity;
    let bestMixedState = s;
    const last = s + window < states - 1 ? s + window : states - 1;
    for (let t = s > window ? s - window : 0; t <= last; t++) {
      const a = same[child + t] as number;
      const b = mixed[child + t] as number;
      let whole = a < b ? a : b;
      let differing = b;
      if (t !== s) {
        const apart = t > s ? t - s : s - t;
        whole += weight * (joinCosts[apart] as number);
        if (apart > limit) whole += overLimit * (apart - limit);
        differing = whole;
      }
      if (whole <= best + tie) {
        bestState = t;
        if (whole < best) best = whole;
      }
      if (differing <= bestMixed + tie) {
        bestMixedState = t;
        if (differing < bestMixed) bestMixed = differing;
      }
    }
    anyState[child + s] = bestState;
    mixedState[child + s] = bestMixedState;
    const at = parent + s;
    const before = (mixed[at] as number) + best;
    const here = (same[at] as number) + bestMixed;
    fromChild[child + s] = here < before;
    mixed[at] = here < before ? here : before;
    same[at] = (same[at] as number) + (same[child + s] as number);
  }
}

function traceUniform(problem: TreeProblem, work: Work): TreeChoice {
  const { state, cost } = cheapest(work.same, problem);
  return { states: new Array<number>(problem.parents.length).fill(state), cost };
}

function traceVaried(problem: TreeProblem, work: Work): TreeChoice | null {
  const { state, cost } = cheapest(work.mixed, problem);
  if (cost === Infinity) return null;
  const nodes = problem.parents.length;
  const chosen = new Array<number>(nodes).fill(state);
  // Whether the subtree of a node, as far as it is not yet traced, is the one that holds the difference.
  const holds = new Array<boolean>(nodes).fill(false);
  holds[0] = true;
  for (let node = 1; node < nodes; node++) {
    const parent = problem.parents[node] ?? 0;
    const above = chosen[parent] ?? 0;
    const at = node * problem.states + above;
    if (holds[parent] !== true) {
      chosen[node] = above;
      continue;
    }
    const differs = work.fromChild[at] === true;
    const taken = (differs ? work.mixedState : work.anyState)[at] ?? 0;
    chosen[node] = taken;
    if (differs) {
      holds[parent] = false;
      holds[node] = taken === above || isMixedCheaper(work, node * problem.states + taken);
    } else {
      holds[node] = isMixedCheaper(work, node * problem.states + taken);
    }
  }
  return { states: chosen, cost };
}

function isMixedCheaper(work: Work, at: number): boolean {
  return (work.mixed[at] ?? Infinity) < (work.same[at] ?? Infinity);
}

function cheapest(costs: readonly number[], problem: TreeProblem): { state: number; cost: number } {
  let state = 0;
  let cost = Infinity;
  for (let s = 0; s < problem.states; s++) {
    const here = costs[s] ?? Infinity;
    if (here > cost + problem.tie) continue;
    state = s;
    if (here < cost) cost = here;
  }
  return { state, cost };
}
