import { printLengthWithUnit } from '../units.ts';
import type { Blend, FitOption, FitPlan, PointResult, SizeChoice } from './fit.schema.ts';
import type { Verdict, ZoneId } from './fit-words.ts';
import {
  capital,
  listWords,
  sayInSize,
  sayPoint,
  saySize,
  sayZone,
  VERDICT_WORDS,
  type SayContext,
} from './say-words.ts';
import { sayZones } from './say-plan.ts';

/** Where on a seam a zone's line is left or met, in trade words. */
const LEVELS: Record<ZoneId, string> = {
  neck: 'the neckline',
  shoulder: 'the shoulder end of the armhole',
  sleeve: 'the upper arm',
  bust: 'the underarm',
  waist: 'the waist',
  hip: 'the hip',
  thigh: 'the crotch level',
  knee: 'the knee',
  hem: 'the hem',
};

/** One crossing between two size lines as an instruction at the cutting table: a heading and its sentence. */
export function sayBlend(blend: Blend, context: SayContext): { title: string; words: string } {
  const title = `${capital(sayZone(blend.fromZone, context.chestWord))} to ${sayZone(blend.toZone, context.chestWord)}: ${blend.from.label} to ${blend.to.label}`;
  return { title, words: `${sayCrossing(blend)}${sayShift(blend, context)}.` };
}

/** The branches join their own pieces to the shoulder's, so they are cut differently from a side seam. */
function sayCrossing({ fromZone, toZone, from, to }: Blend): string {
  const has = (zone: ZoneId) => fromZone === zone || toZone === zone;
  const branch = (zone: ZoneId) => (fromZone === zone ? from : to);
  const other = (zone: ZoneId) => (fromZone === zone ? to : from);
  if (has('neck')) {
    return `Cut the neckline, and the collar or facing with it, ${sayInSize(branch('neck'))}; meet the ${sayLine(other('neck'))} along the shoulder seam`;
  }
  if (has('sleeve')) {
    return `Keep the sleeve cap ${sayInSize(other('sleeve'))} to go with the armhole; on the sleeve’s underarm seam leave that line and meet the ${sayLine(branch('sleeve'))} at the upper arm`;
  }
  return `Leave the ${sayLine(from)} at ${LEVELS[fromZone]} and meet the ${sayLine(to)} at ${LEVELS[toZone]}`;
}

function sayLine(size: SizeChoice): string {
  return size.between ? `line ${saySize(size)}` : `${size.label} line`;
}

function sayShift(blend: Blend, context: SayContext): string {
  const size = Math.abs(blend.perEdgeMm);
  if (!Number.isFinite(size) || blend.edges < 1) return '';
  const edges = blend.edges === 1 ? 'on one edge' : `on each of ${blend.edges} edges`;
  const way = blend.perEdgeMm < 0 ? 'in' : 'out';
  const over =
    blend.overMm === null
      ? ''
      : ` over ${printLengthWithUnit(blend.overMm, context.unit)}${blend.overIsAssumed ? ' (assumed)' : ''}`;
  return `: ${printLengthWithUnit(size, context.unit)} ${way} ${edges}${over}`;
}

/** An option beside the plan: its sizes, and what it gives up, in words. */
export interface SaidOption {
  title: string;
  costs: string;
}

/** One option in words: `16 throughout`, and what is given up for it. */
export function sayOption(option: FitOption, context: SayContext): SaidOption {
  const blends = option.blends.length;
  const work = blends === 0 ? 'No line to blend' : blends === 1 ? 'One blend' : `${blends} blends`;
  return {
    title: capital(sayZones(option.zones, context)),
    costs: `${work}. ${sayGivenUp(option.points, context)}`,
  };
}

/** What a set of points gives up against the draft: the closest first, then what is looser. */
export function sayGivenUp(points: readonly PointResult[], context: SayContext): string {
  const of = (verdict: Verdict) => points.filter((point) => point.verdict === verdict);
  const parts = [
    sayGroup(of('belowFloor'), VERDICT_WORDS.belowFloor, (result) => result.leewayMm, context),
    sayGroup(of('closer'), VERDICT_WORDS.closer, (result) => result.deviationMm, context),
    sayGroup(of('looser'), VERDICT_WORDS.looser, (result) => result.deviationMm, context),
  ].filter((part) => part !== '');
  if (parts.length > 0) return `${capital(parts.join('; '))}.`;
  const judged = points.some((point) => point.verdict === 'asDrafted');
  return judged ? 'Every point as drafted.' : 'Nothing here can be held against the draft.';
}

function sayGroup(
  points: readonly PointResult[],
  verdict: string,
  amountOf: (result: PointResult) => number | null,
  context: SayContext,
): string {
  if (points.length === 0) return '';
  const named = points.map((result) => {
    const amount = amountOf(result);
    const name = sayPoint(result.point, context.chestWord);
    return amount === null ? name : `${name} ${printLengthWithUnit(Math.abs(amount), context.unit)}`;
  });
  return `${listWords(named)} ${verdict}`;
}

/**
 * What to do before cutting good cloth (common practice), with what this plan asks for first. `cloth` is what the
 * pattern says it is meant for; empty where it says nothing.
 */
export function sayBeforeCutting(plan: FitPlan, context: SayContext, cloth = ''): string[] {
  const tight = plan.points.filter((result) => result.verdict === 'belowFloor');
  const first = tight.map((result) => {
    const wanted =
      result.leewayMm === null
        ? ''
        : ` wants ${printLengthWithUnit(Math.abs(result.leewayMm), context.unit)} more`;
    return `Sew a toile that takes in the ${sayPoint(result.point, context.chestWord)}: it${wanted}.`;
  });
  return [
    ...sayLinesToDraw(plan),
    ...first,
    ...(tight.length > 0 ? [] : ['Sew a toile first where the cloth is dear or the pattern is new to you.']),
    ...(cloth.trim() === '' ? [] : [`The pattern is meant for ${cloth.trim().replace(/[.]$/, '')}.`]),
    'Fit in the cloth itself, or one that hangs like it: cloth of another weight sits differently.',
    'Measure the printed test square before you cut out the paper.',
  ];
}

/** A line between the printed ones has to be drawn before it can be cut: the middle of the gap, joined (common practice). */
function sayLinesToDraw({ zones }: FitPlan): string[] {
  const between = [...new Set(zones.flatMap(({ size }) => (size.between ? [saySize(size)] : [])))];
  if (between.length === 0) return [];
  return [
    `Draw the line${between.length > 1 ? 's' : ''} ${listWords(between)}: mark the middle of the gap at short intervals and at every corner and notch, and join the marks.`,
  ];
}
