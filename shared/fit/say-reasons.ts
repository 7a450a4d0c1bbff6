import { printLengthWithUnit } from '../units.ts';
import type { FitPlan, Reason } from './fit.schema.ts';
import type { ReasonCode } from './fit-words.ts';
import type { Said } from './say-cautions.ts';
import { capital, listWords, sayPoint, saySize, sayZone, type SayContext } from './say-words.ts';

type Sentence = (reasons: readonly Reason[], plan: FitPlan, context: SayContext) => string;

/** Every code has its sentence; their order here is the order in which they are said. */
const SENTENCES: Record<ReasonCode, Sentence> = {
  held: (reasons, plan, context) =>
    `Held by you: ${listWords(
      reasons.flatMap(({ zone }) => {
        const size = plan.zones.find((choice) => choice.zone === zone)?.size;
        return zone && size ? [`${sayZone(zone, context.chestWord)} ${saySize(size)}`] : [];
      }),
    )}. The rest is planned round it.`,
  oneSizeIsEnough: (reasons, _plan, context) =>
    `${capital(places(reasons, context))} alone would take another size${off(reasons, context)}, but not by enough to be worth a blend.`,
  joinHolds: (reasons, _plan, context) =>
    `The sizes are kept closer together at ${places(reasons, context)} than the measurements alone would have them, so that one line can run through them.`,
  floorDecides: (reasons, _plan, context) =>
    `A larger size is taken at ${places(reasons, context)} to leave wearing ease${short(reasons, context)}.`,
  tieToLarger: (reasons, _plan, context) =>
    `${capital(places(reasons, context))} lies midway between two sizes: the larger is taken, as is usual in a woven.`,
  governs: (reasons, _plan, context) => `Decided by ${points(reasons, context)}.`,
  followsNeighbour: (reasons, _plan, context) => {
    const zones = unique(reasons.flatMap(({ zone }) => (zone ? [sayZone(zone, context.chestWord)] : [])));
    return `${capital(listWords(zones))}: nothing there chooses a size, so ${zones.length === 1 ? 'it follows its neighbour' : 'they follow their neighbours'}.`;
  },
};

/** Why the plan is what it is, one sentence a code. No reasons give an empty list. */
export function sayReasons(plan: FitPlan, context: SayContext): Said[] {
  return (Object.keys(SENTENCES) as ReasonCode[]).flatMap((code) => {
    const of = plan.reasons.filter((reason) => reason.code === code);
    if (of.length === 0) return [];
    return [{ code, tone: 'note' as const, words: SENTENCES[code](of, plan, context) }];
  });
}

function places(reasons: readonly Reason[], context: SayContext): string {
  return listWords(
    unique(
      reasons.flatMap(({ point, zone }) => {
        if (point) return [`the ${sayPoint(point, context.chestWord)}`];
        return zone ? [`the ${sayZone(zone, context.chestWord)}`] : [];
      }),
    ),
  );
}

function points(reasons: readonly Reason[], context: SayContext): string {
  return listWords(
    unique(reasons.flatMap(({ point }) => (point ? [`the ${sayPoint(point, context.chestWord)}`] : []))),
  );
}

/** An amount is said only where there is one to say: several in one sentence would not be told apart. */
function off(reasons: readonly Reason[], context: SayContext): string {
  const amount = only(reasons, context);
  return amount === null ? '' : ` (it is ${amount} from what this one is drafted for)`;
}

function short(reasons: readonly Reason[], context: SayContext): string {
  const amount = only(reasons, context);
  return amount === null ? '' : `: the nearer one would be ${amount} short of it`;
}

function only(reasons: readonly Reason[], context: SayContext): string | null {
  const amount = reasons.length === 1 ? reasons[0]?.amountMm : undefined;
  return amount === undefined ? null : printLengthWithUnit(Math.abs(amount), context.unit);
}

function unique(words: readonly string[]): string[] {
  return [...new Set(words)];
}
