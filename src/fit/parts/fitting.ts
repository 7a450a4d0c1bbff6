import { placesPerSize } from '../../../shared/fit/between-lines.ts';
import { bodyPositions } from '../../../shared/fit/body-position.ts';
import type { FitInput, FitPlan } from '../../../shared/fit/fit.schema.ts';
import type { ZoneId } from '../../../shared/fit/fit-words.ts';
import { easeProfile, planFit } from '../../../shared/fit/plan-fit.ts';
import type { SayContext } from '../../../shared/fit/say-words.ts';
import type { PointId } from '../../../shared/points/point-ids.ts';
import { easeDomain, type EaseDomain } from './ease-scale.ts';

/** Sizes a person has fixed, by position in the grade. */
export type Held = Partial<Record<ZoneId, number>>;

/** Who it is for, in what; what the words need to know. */
export interface Speech {
  unit: SayContext['unit'];
  chestWord: SayContext['chestWord'];
}

/** What does not change while sizes are held: reckoned once an input. */
export interface Ground {
  input: FitInput;
  /** The plan with nothing held. */
  plan: FitPlan;
  context: SayContext;
  /** Where a size may be put: at the sizes, or half-way between two as well. */
  perSize: 1 | 2;
  /** Every size's ease at every point, in mm, by position. */
  ladders: ReadonlyMap<PointId, readonly (number | null)[]>;
  /** Where the body stands among the sizes, by point: between two sizes, or beyond the ends. */
  bodyAt: Partial<Record<PointId, number>>;
  domain: EaseDomain;
}

/** Everything an input says before a hand is laid on it. `plan` is given where a saved plan is shown as it was saved. */
export function groundOf(input: FitInput, speech: Speech, plan: FitPlan = planUnheld(input)): Ground {
  const ladders = easeLadders(input, plan);
  return {
    input,
    plan,
    context: { ...speech, sizes: input.sizes.map((size) => size.label) },
    perSize: placesPerSize(input),
    ladders,
    bodyAt: bodyPositions(input),
    domain: easeDomain([...domainValues(plan), ...neighbourEases(plan, ladders)]),
  };
}

/** The plan round what is held. Nothing held is the plan itself. */
export function planHeld(ground: Ground, held: Held): FitPlan {
  if (Object.keys(held).length === 0) return ground.plan;
  return planFit({ ...ground.input, held });
}

/** Every length that the ease axis must hold to show a plan. */
export function domainValues(plan: FitPlan): number[] {
  return plan.points.flatMap((point) =>
    [point.easeMm, point.floorMm, point.draftedEaseMm].filter((value) => value !== null),
  );
}

function planUnheld(input: FitInput): FitPlan {
  const { held: _held, ...rest } = input;
  return planFit(rest);
}

function easeLadders(input: FitInput, plan: FitPlan): Map<PointId, (number | null)[]> {
  const ladders = new Map<PointId, (number | null)[]>();
  for (const { point } of plan.points)
    ladders.set(point, Array<number | null>(input.sizes.length).fill(null));
  easeProfile(input).forEach((table, position) => {
    for (const { point, easeMm } of table) {
      const ladder = ladders.get(point);
      if (ladder) ladder[position] = easeMm;
    }
  });
  return ladders;
}

/** A size on either side of the plan stays in sight, so that one sees where a drag would lead. */
function neighbourEases(plan: FitPlan, ladders: Map<PointId, (number | null)[]>): (number | null)[] {
  return plan.points.flatMap(({ point, size }) => {
    const ladder = ladders.get(point) ?? [];
    return [ladder[Math.ceil(size.position) - 1] ?? null, ladder[Math.floor(size.position) + 1] ?? null];
  });
}
