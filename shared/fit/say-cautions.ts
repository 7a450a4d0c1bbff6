import { printLengthWithUnit } from '../units.ts';
import type { Caution, FitPlan, PointResult } from './fit.schema.ts';
import type { CautionCode } from './fit-words.ts';
import { capital, listWords, sayPoint, sayZone, type SayContext } from './say-words.ts';

/** One sentence beside the answer: `missing` asks for something, `watch` warns, `note` only explains. */
export interface Said {
  code: string;
  tone: 'watch' | 'missing' | 'note';
  words: string;
}

interface Entry {
  tone: Said['tone'];
  say: (cautions: readonly Caution[], context: SayContext) => string;
}

/** Every code has its sentence; their order here is the order in which they are said. */
const SENTENCES: Record<CautionCode, Entry> = {
  nothingShared: {
    tone: 'missing',
    say: () => 'No point is both measured and given by this pattern, so nothing chooses a size yet.',
  },
  knitNotReckoned: {
    tone: 'missing',
    say: () =>
      'Knits and stretch cloth are not reckoned yet: what follows holds for a woven without stretch.',
  },
  layersNotReckoned: {
    tone: 'missing',
    say: () => 'Layers worn underneath are not reckoned yet: the ease shown is over the body alone.',
  },
  shrinkageNotReckoned: {
    tone: 'missing',
    say: () => 'Shrinkage is not reckoned yet: wash the cloth before you cut.',
  },
  leanNotReckoned: {
    tone: 'missing',
    say: () => 'Closer or roomier by choice is not reckoned yet: the plan aims at the draft.',
  },
  beyondLargest: { tone: 'watch', say: (cautions, context) => sayEnd(cautions, context, 'largest') },
  beyondSmallest: { tone: 'watch', say: (cautions, context) => sayEnd(cautions, context, 'smallest') },
  belowFloor: {
    tone: 'watch',
    say: (cautions, context) =>
      cautions.length === 1
        ? `${capital(each(cautions, context, (name, amount) => `the ${name} has ${amount === null ? '' : `${amount} `}less than wearing ease`))}.`
        : `Less than wearing ease: ${each(cautions, context, (name, amount) => (amount === null ? name : `${name} by ${amount}`))}.`,
  },
  notMeasured: {
    tone: 'missing',
    say: (cautions, context) =>
      `The pattern also gives the ${names(cautions, context)}: not measured, so not looked at.`,
  },
  steep: {
    tone: 'watch',
    say: (cautions, context) =>
      `The cutting line runs steeply ${at(cautions, context)} (more than 15°): draw one long smooth curve and try it in a toile.`,
  },
  crotchCurve: {
    tone: 'watch',
    say: () => 'Keep the whole crotch curve in one size, and change size below it on the leg seams only.',
  },
  doesNotPass: {
    tone: 'watch',
    say: (cautions, context) =>
      `Nothing opens, and the ${names(cautions, context)} is smaller than what must pass through it: it needs an opening, or a larger size.`,
  },
  givenAtSomeSizes: {
    tone: 'note',
    say: (cautions, context) =>
      `The pattern gives the ${names(cautions, context)} at some sizes only, so it has no say.`,
  },
  chartFalls: {
    tone: 'watch',
    say: (cautions, context) =>
      `In the size chart the ${names(cautions, context)} falls from one size to the next, so it has no say: compare the table with the printed one.`,
  },
  belowHandbook: {
    tone: 'note',
    say: (cautions, context) =>
      `The draft gives less than the handbook’s wearing ease at the ${names(cautions, context)}; the draft rules, as it was meant.`,
  },
  noTarget: {
    tone: 'note',
    say: (cautions, context) =>
      `Only the finished garment is published at the ${names(cautions, context)}, and no customary ease is known there: the plan just keeps wearing ease.`,
  },
  easeUnknown: {
    tone: 'note',
    say: (cautions, context) =>
      `Only the body chart is published at the ${names(cautions, context)}: the ease the drafter added is not known.`,
  },
  slight: {
    tone: 'note',
    say: (cautions, context) =>
      `The change ${at(cautions, context)} is under 6 mm an edge: it may be left out.`,
  },
};

/** Beyond the first or the last size; a pattern of one size has no ends, only the body it is drafted for. */
function sayEnd(cautions: readonly Caution[], context: SayContext, end: 'largest' | 'smallest'): string {
  const isLargest = end === 'largest';
  const label = context.sizes.at(isLargest ? -1 : 0) ?? 'the last';
  const side = context.sizes.length === 1 ? (isLargest ? 'more' : 'less') : isLargest ? 'beyond' : 'before';
  const than = context.sizes.length === 1 ? `than ${label} is drafted for` : 'it';
  const said = each(
    cautions,
    context,
    (name, amount) => `the ${name} is ${amount === null ? '' : `${amount} `}${side} ${than}`,
  );
  if (context.sizes.length === 1) return `${capital(said)}.`;
  return `This pattern’s sizes ${isLargest ? 'end' : 'begin'} at ${label}: ${said}.`;
}

/** What to know about a plan, one sentence a code, the weightiest first. No cautions give an empty list. */
export function sayCautions(cautions: readonly Caution[], context: SayContext): Said[] {
  return codes().flatMap((code) => {
    const of = cautions.filter((caution) => caution.code === code);
    if (of.length === 0) return [];
    return [{ code, tone: SENTENCES[code].tone, words: SENTENCES[code].say(of, context) }];
  });
}

function codes(): CautionCode[] {
  return Object.keys(SENTENCES) as CautionCode[];
}

/**
 * Which points to measure again, because the tape's own error could turn their verdict; null where none is so close.
 */
export function sayBorderline(points: readonly PointResult[], context: SayContext): Said | null {
  const close = points.filter((point) => point.borderline);
  if (close.length === 0) return null;
  const nearest = [...close].sort((a, b) => Math.abs(a.leewayMm ?? 0) - Math.abs(b.leewayMm ?? 0));
  const named = listWords(nearest.slice(0, 3).map((result) => sayPoint(result.point, context.chestWord)));
  return {
    code: 'borderline',
    tone: 'missing',
    words: `Measure the ${named} again first: ${sayTape(nearest, context)}.`,
  };
}

function sayTape(close: readonly PointResult[], context: SayContext): string {
  const leewayMm = close.length === 1 ? (close[0]?.leewayMm ?? null) : null;
  if (leewayMm === null) {
    const lie = close.length === 1 ? 'it lies' : 'they lie';
    return `${lie} so near wearing ease that the tape alone could decide`;
  }
  const amount = printLengthWithUnit(Math.abs(leewayMm), context.unit);
  return leewayMm < 0
    ? `${amount} is no more than a tape can be out`
    : `${amount} of leeway is no more than a tape can be out`;
}

/** Everything to say under the answer, the weightiest first; sentences that the answer itself has said are left out. */
export function sayWatch(plan: FitPlan, context: SayContext): Said[] {
  const inAnswer = (caution: Caution) =>
    (plan.status === 'outOfRange' &&
      (caution.code === 'beyondLargest' || caution.code === 'beyondSmallest')) ||
    (plan.status === 'notEnough' && (caution.code === 'notMeasured' || caution.code === 'knitNotReckoned'));
  const said = sayCautions(
    plan.cautions.filter((caution) => !inAnswer(caution)),
    context,
  );
  const borderline = sayBorderline(plan.points, context);
  const watch = said.filter((each) => each.tone === 'watch');
  return [...watch, ...(borderline ? [borderline] : []), ...said.filter((each) => each.tone !== 'watch')];
}

function names(cautions: readonly Caution[], context: SayContext): string {
  return listWords([...new Set(cautions.map((caution) => place(caution, context)))]);
}

function at(cautions: readonly Caution[], context: SayContext): string {
  return `at the ${names(cautions, context)}`;
}

function each(
  cautions: readonly Caution[],
  context: SayContext,
  say: (name: string, amount: string | null) => string,
): string {
  return listWords(
    cautions.map((caution) =>
      say(
        place(caution, context),
        caution.amountMm === undefined ? null : printLengthWithUnit(Math.abs(caution.amountMm), context.unit),
      ),
    ),
  );
}

function place({ point, zone }: Caution, context: SayContext): string {
  if (point) return sayPoint(point, context.chestWord);
  return zone ? sayZone(zone, context.chestWord) : 'garment';
}
