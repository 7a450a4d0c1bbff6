import { buildFitInput } from '../fit/build-fit-input.ts';
import { ENGINE_VERSION, planFit } from '../fit/plan-fit.ts';
import type { FitAnswer } from './plans.schema.ts';

/** What a plan follows from: the measured values in mm, the pattern, its tables and the options of this plan. */
export type PlanGround = Parameters<typeof buildFitInput>[0];

/**
 * The plan, with the input it follows from and the engine that reckoned it. Every length is in mm. Misuse (a size
 * held that the pattern has not, a negative girth) throws a RangeError; a missing measurement is a caution in the plan.
 */
export function makePlan(ground: PlanGround): FitAnswer {
  const input = buildFitInput(ground);
  return { engine: ENGINE_VERSION, input, plan: planFit(input) };
}
