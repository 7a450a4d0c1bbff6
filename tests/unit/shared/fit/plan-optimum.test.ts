import { describe, expect, it } from 'vitest';
import type { FitInput, Measured, SizeRow } from '../../../../shared/fit/fit.schema.ts';
import { planFit } from '../../../../shared/fit/plan-fit.ts';
import type { PointId } from '../../../../shared/points/point-ids.ts';
import { deepFreeze, fitInput } from '../../../support/fit-tables.ts';
import { PLAIN_POINTS, plainLeastCost } from '../../../support/plain-plan.ts';
import { seededRandom } from '../../../support/seeded-random.ts';

/** A dress in three sizes with uneven grades, each point with a chart, ranges, finished measurements or both. */
function randomInput(random: () => number): FitInput {
  const between = (from: number, to: number) => from + random() * (to - from);
  const pick = () => random() < 0.75;
  const sizes: SizeRow[] = [0, 1, 2].map((size) => ({ label: String(size), body: {}, finished: {} }));
  const body: Partial<Record<PointId, number>> = {};
  const preferenceMm: Partial<Record<PointId, number>> = {};
  for (const point of PLAIN_POINTS) {
    const isLarge = !['neck', 'backWidth', 'upperArm'].includes(point);
    const first = isLarge ? between(700, 1000) : between(250, 400);
    const grade = isLarge ? between(0, 60) : between(0, 20);
    const ease = between(-30, 160);
    const tables = random();
    const isRanged = random() < 0.3;
    let at = first;
    for (const row of sizes) {
      const value: Measured = isRanged ? { low: at - grade * 0.4, high: at + grade * 0.4 } : at;
      if (tables < 0.7) row.body[point] = value;
      if (tables > 0.35) row.finished[point] = at + ease;
      at += grade * between(0.8, 1.2);
    }
    if (pick()) body[point] = between(first - 1.5 * grade, first + 3.5 * grade);
    if (random() < 0.2) preferenceMm[point] = between(-20, 20);
  }
  return fitInput({ kind: 'dress', silhouette: 'fitted' }, sizes, body, { preferenceMm });
}

/** How many of so many random plans were planned; each at the cost that trying every plan finds. */
function planAgainstEveryPlan(seed: number, draws: number, more: Partial<FitInput>): number {
  const random = seededRandom(seed);
  let planned = 0;
  for (let draw = 0; draw < draws; draw++) {
    const input = deepFreeze({ ...randomInput(random), ...more });
    const least = plainLeastCost(input);
    const plan = planFit(input);
    if (least === null) expect(plan.status).toBe('notEnough');
    else {
      planned++;
      expect(plan.options[0]?.cost, `draw ${draw}`).toBeCloseTo(least, 7);
    }
  }
  return planned;
}

describe('planFit', () => {
  it('finds the plan of least cost: equal to trying every plan with the formulas written down apart, 1,000 times', () => {
    expect(planAgainstEveryPlan(8559, 1000, {})).toBeGreaterThan(950);
  }, 60_000);

  it('does so on the finer lattice of half sizes, 300 times', () => {
    expect(planAgainstEveryPlan(1604, 300, { cutBetweenLines: true })).toBeGreaterThan(280);
  }, 60_000);
});
