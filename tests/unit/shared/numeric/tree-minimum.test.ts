import { describe, expect, it } from 'vitest';
import { treeMinimum } from '../../../../shared/numeric/tree-minimum.ts';
import type { TreeProblem } from '../../../../shared/numeric/tree-minimum.ts';
import { deepFreeze } from '../../../support/fit-tables.ts';
import { seededRandom } from '../../../support/seeded-random.ts';

const TIE = 1e-9;

function problem(parents: number[], rows: number[][], more: Partial<TreeProblem> = {}): TreeProblem {
  const states = rows[0]?.length ?? 0;
  return {
    parents,
    states,
    costs: rows.flat(),
    limits: parents.map(() => states),
    joinCosts: Array.from({ length: states }, (_, apart) => (apart === 0 ? 0 : 0.6 + 0.2 * apart * apart)),
    joinWeights: parents.map(() => 1),
    overLimit: Infinity,
    tie: TIE,
    ...more,
  };
}

/** What a choice costs, added up plainly. */
function costOf(of: TreeProblem, states: readonly number[]): number {
  return states.reduce((sum, state, node) => {
    const own = of.costs[node * of.states + state] ?? NaN;
    if (node === 0) return sum + own;
    const apart = Math.abs(state - (states[of.parents[node] ?? 0] ?? NaN));
    const over = apart - (of.limits[node] ?? 0);
    const beyond = over > 0 ? of.overLimit * over : 0;
    return sum + own + (of.joinWeights[node] ?? NaN) * (of.joinCosts[apart] ?? NaN) + beyond;
  }, 0);
}

/** Tries every choice there is. */
function bruteForce(of: TreeProblem): { uniform: number; varied: number } {
  const nodes = of.parents.length;
  const states = new Array<number>(nodes).fill(0);
  let uniform = Infinity;
  let varied = Infinity;
  for (;;) {
    const cost = costOf(of, states);
    if (states.every((state) => state === states[0])) uniform = Math.min(uniform, cost);
    else varied = Math.min(varied, cost);
    let node = 0;
    while (node < nodes && states[node] === of.states - 1) states[node++] = 0;
    if (node === nodes) return { uniform, varied };
    states[node] = (states[node] ?? 0) + 1;
  }
}

function randomProblem(random: () => number): TreeProblem {
  const nodes = 1 + Math.floor(random() * 5);
  const states = 1 + Math.floor(random() * 5);
  const parents = Array.from({ length: nodes }, (_, node) => (node === 0 ? -1 : Math.floor(random() * node)));
  // Whole numbers half of the time, so that ties are met too; some states are forbidden.
  const isWhole = random() < 0.5;
  const cost = () => (random() < 0.08 ? Infinity : isWhole ? Math.floor(random() * 4) : random() * 6);
  const rows = parents.map(() => Array.from({ length: states }, cost));
  return problem(parents, rows, {
    limits: parents.map(() => Math.floor(random() * (states + 1))),
    joinWeights: parents.map(() => (random() < 0.7 ? 1 : random())),
    overLimit: random() < 0.5 ? Infinity : 1000,
  });
}

describe('treeMinimum', () => {
  it('equals brute force on ten thousand random trees, with one state and with several', () => {
    const random = seededRandom(20);
    let varying = 0;
    for (let draw = 0; draw < 10_000; draw++) {
      const drawn = deepFreeze(randomProblem(random));
      const found = treeMinimum(drawn);
      const expected = bruteForce(drawn);
      if (expected.uniform === Infinity) expect(found.uniform.cost).toBe(Infinity);
      else {
        expect(found.uniform.cost).toBeCloseTo(expected.uniform, 7);
        expect(costOf(drawn, found.uniform.states)).toBeCloseTo(expected.uniform, 7);
        expect(new Set(found.uniform.states).size).toBe(1);
      }
      if (expected.varied === Infinity) expect(found.varied).toBeNull();
      else {
        varying++;
        expect(found.varied?.cost).toBeCloseTo(expected.varied, 7);
        expect(costOf(drawn, found.varied?.states ?? [])).toBeCloseTo(expected.varied, 7);
        expect(new Set(found.varied?.states).size).toBeGreaterThan(1);
      }
    }
    expect(varying).toBeGreaterThan(5000);
  });

  it('takes the larger of two equally cheap states, first, middle and last', () => {
    expect(treeMinimum(problem([-1], [[1, 1, 5, 5]])).uniform.states).toEqual([1]);
    expect(treeMinimum(problem([-1], [[5, 1, 1, 5]])).uniform.states).toEqual([2]);
    expect(treeMinimum(problem([-1], [[5, 5, 1, 1]])).uniform.states).toEqual([3]);
  });

  it('takes costs within the tie as equal, and no others', () => {
    expect(treeMinimum(problem([-1], [[1, 1 + 5e-10]])).uniform.states).toEqual([1]);
    expect(treeMinimum(problem([-1], [[1, 1 + 2e-9]])).uniform.states).toEqual([0]);
  });

  it('lets a node that costs nothing anywhere lie at the larger of its neighbours', () => {
    const rows = [
      [0, 9, 9],
      [0, 0, 0],
      [9, 0, 9],
    ];
    expect(treeMinimum(problem([-1, 0, 1], rows)).varied?.states).toEqual([0, 1, 1]);
  });

  it('keeps a limit that would be worth exceeding, at the first, a middle and the last node', () => {
    const far = [
      [0, 9, 9, 9],
      [9, 9, 9, 0],
    ];
    const found = treeMinimum(problem([-1, 0], far, { limits: [0, 2] }));
    expect(Math.abs((found.varied?.states[0] ?? 0) - (found.varied?.states[1] ?? 0))).toBeLessThanOrEqual(2);
    for (const limited of [1, 2, 3]) {
      const limits = [4, 4, 4, 4].map((limit, node) => (node === limited ? 1 : limit));
      const rows = [0, 1, 2, 3].map((node) => (node === limited ? [90, 90, 90, 0] : [0, 90, 90, 90]));
      const star = treeMinimum(problem([-1, 0, 0, 0], rows, { limits }));
      const { states = [] } = star.varied ?? {};
      expect(Math.abs((states[limited] ?? 0) - (states[0] ?? 0))).toBe(1);
    }
  });

  it('lets a join that weighs less give way, at the first, a middle and the last node', () => {
    for (const light of [1, 2, 3]) {
      const joinWeights = [1, 1, 1, 1].map((weight, node) => (node === light ? 0.1 : weight));
      const rows = [0, 1, 2, 3].map((node) => (node === 0 ? [0, 9] : [0.5, 0]));
      const { states = [] } = treeMinimum(problem([-1, 0, 0, 0], rows, { joinWeights })).varied ?? {};
      expect(states).toEqual([0, 1, 2, 3].map((node) => (node === light ? 1 : 0)));
    }
  });

  it('exceeds a limit by as little as can be where that is allowed at a price', () => {
    const rows = [
      [0, Infinity, Infinity, Infinity],
      [1, 1, 1, 1],
      [Infinity, Infinity, Infinity, 0],
    ];
    const limits = [0, 1, 1];
    expect(treeMinimum(problem([-1, 0, 1], rows, { limits })).varied).toBeNull();
    const found = treeMinimum(problem([-1, 0, 1], rows, { limits, overLimit: 1e6 }));
    expect(found.varied?.states).toEqual([0, 2, 3]);
  });

  it('answers one state everywhere where every varied choice is dearer, and still tells the best varied one', () => {
    const found = treeMinimum(
      problem(
        [-1, 0],
        [
          [0, 1],
          [0, 1],
        ],
      ),
    );
    expect(found.uniform).toEqual({ states: [0, 0], cost: 0 });
    expect(found.varied?.cost).toBeCloseTo(1.8, 9);
  });

  it('gives no varied choice to a single node or a single state', () => {
    expect(treeMinimum(problem([-1], [[3, 2]])).varied).toBeNull();
    expect(treeMinimum(problem([-1, 0], [[3], [2]])).varied).toBeNull();
  });

  it('refuses an empty tree and no state', () => {
    expect(() => treeMinimum(problem([], []))).toThrow(RangeError);
    expect(() => treeMinimum(problem([-1], [[]]))).toThrow(/states/);
  });
});
