import type { FitPlan } from './fit.schema.ts';
import { sayWatch, type Said } from './say-cautions.ts';
import { sayReasons } from './say-reasons.ts';
import type { SayContext } from './say-words.ts';

/** Reasons that only explain; the others say what was given up, or what somebody wanted. */
const EXPLAINING: readonly string[] = ['governs', 'followsNeighbour'];

/**
 * Everything to say under an answer, each sentence once: what to watch, what to measure, what was given up, then what
 * only explains. A plan with neither cautions nor reasons gives an empty list.
 */
export function sayNotes(plan: FitPlan, context: SayContext): Said[] {
  const watch = sayWatch(plan, context);
  const reasons = sayReasons(plan, context);
  return [
    ...watch.filter((said) => said.tone !== 'note'),
    ...reasons.filter((said) => !EXPLAINING.includes(said.code)),
    ...watch.filter((said) => said.tone === 'note'),
    ...reasons.filter((said) => EXPLAINING.includes(said.code)),
  ];
}
