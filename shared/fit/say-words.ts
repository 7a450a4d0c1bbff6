import type { PointId } from '../points/point-ids.ts';
import type { LengthUnit } from '../units.ts';
import type { SizeChoice } from './fit.schema.ts';
import type { GarmentKind, Silhouette, Verdict, ZoneId } from './fit-words.ts';

/** How somebody wants to be spoken to: unit, their own word for the bust, and the pattern's size labels in grade order. */
export interface SayContext {
  unit: LengthUnit;
  chestWord: 'bust' | 'chest';
  sizes: readonly string[];
}

/** What a verdict is called on screen; the body is never wrong, so none of them speaks of the body. */
export const VERDICT_WORDS: Record<Verdict, string> = {
  belowFloor: 'less than wearing ease',
  closer: 'closer than drafted',
  asDrafted: 'as drafted',
  looser: 'looser than drafted',
  unknown: 'cannot be said',
};

/**
 * One point's verdict in words. Where the draft is not known but the floor is, wearing ease can still be said. Empty
 * numbers are as good as none.
 */
export function sayVerdict(result: { verdict: Verdict; leewayMm: number | null }): string {
  if (result.verdict === 'unknown' && result.leewayMm !== null && result.leewayMm >= 0)
    return 'has wearing ease';
  return VERDICT_WORDS[result.verdict];
}

/** A size as it is said: `16`, or `halfway between 16 and 18`. */
export function saySize({ label, between }: Pick<SizeChoice, 'label' | 'between'>): string {
  return between ? `halfway between ${between.smaller} and ${between.larger}` : label;
}

/** The same after a verb, with its preposition where it wants one: `in 16`, `at 16`, `halfway between 16 and 18`. */
export function sayInSize(size: SizeChoice, word = 'in'): string {
  return size.between ? saySize(size) : `${word} ${size.label}`;
}

/** The five silhouettes as a sewist says them after "in the … dress,". */
export const SILHOUETTE_WORDS: Record<Silhouette, string> = {
  close: 'close-fitting',
  fitted: 'fitted',
  semiFitted: 'semi-fitted',
  loose: 'loose',
  veryLoose: 'very loose',
};

/** Garment kinds as they stand in a sentence, without an article. */
export const KIND_WORDS: Record<GarmentKind, string> = {
  shirt: 'shirt or blouse',
  knitTop: 'knit top',
  sweatshirt: 'sweatshirt',
  dress: 'dress',
  skirt: 'skirt',
  fullSkirt: 'full skirt',
  trousers: 'trousers',
  shorts: 'shorts',
  leggings: 'leggings',
  waistcoat: 'waistcoat',
  cardigan: 'cardigan',
  jacket: 'jacket',
  coat: 'coat',
  cape: 'cape',
  wrap: 'wrap',
  jumpsuit: 'jumpsuit',
  dungarees: 'dungarees',
  robe: 'robe',
  nightwear: 'nightwear',
  swimwear: 'swimwear or bodysuit',
  bonedBodice: 'boned bodice',
};

const ZONE_WORDS: Record<Exclude<ZoneId, 'bust'>, string> = {
  neck: 'neck',
  shoulder: 'shoulder',
  sleeve: 'sleeve',
  waist: 'waist',
  hip: 'hip',
  thigh: 'thigh',
  knee: 'knee',
  hem: 'hem',
};

/** A zone in the trade's word, in lower case, with the person's own word for the bust. */
export function sayZone(zone: ZoneId, chestWord: SayContext['chestWord']): string {
  return zone === 'bust' ? chestWord : ZONE_WORDS[zone];
}

const POINT_WORDS: Record<PointId, string> = {
  head: 'head',
  neck: 'neck',
  neckBase: 'neck base',
  upperBust: 'upper bust',
  bust: 'bust',
  underbust: 'underbust',
  waist: 'waist',
  abdomen: 'abdomen',
  highHip: 'high hip',
  hip: 'hip',
  thigh: 'thigh',
  thighLeft: 'left thigh',
  thighRight: 'right thigh',
  knee: 'knee',
  calf: 'calf',
  ankle: 'ankle',
  instepHeel: 'instep and heel',
  armscye: 'armhole',
  upperArm: 'upper arm',
  upperArmLeft: 'left upper arm',
  upperArmRight: 'right upper arm',
  elbow: 'elbow',
  wrist: 'wrist',
  hand: 'hand',
  trunk: 'trunk',
  shoulderLength: 'shoulder length',
  shoulderLengthLeft: 'left shoulder length',
  shoulderLengthRight: 'right shoulder length',
  shoulderWidth: 'shoulder width',
  backWidth: 'back width',
  frontWidth: 'front width',
  bustPointSpan: 'bust point span',
  bustFrontArc: 'front bust arc',
  bustBackArc: 'back bust arc',
  hipFrontArc: 'front hip arc',
  hipBackArc: 'back hip arc',
  shoulderSlope: 'shoulder slope',
  shoulderSlopeLeft: 'left shoulder slope',
  shoulderSlopeRight: 'right shoulder slope',
  backWaistLength: 'back waist length',
  frontWaistLength: 'front waist length',
  bustPointDepth: 'bust point depth',
  scyeDepth: 'armhole depth',
  armLength: 'arm length',
  armLengthLeft: 'left arm length',
  armLengthRight: 'right arm length',
  waistToHip: 'waist to hip',
  waistToKnee: 'waist to knee',
  outsideLeg: 'outside leg',
  insideLeg: 'inside leg',
  bodyRise: 'body rise',
  crotchLength: 'crotch length',
  crotchLengthFront: 'front crotch length',
  crotchLengthBack: 'back crotch length',
  height: 'height',
  cervicalHeight: 'nape height',
  waistHeight: 'waist height',
  hipHeight: 'hip height',
  kneeHeight: 'knee height',
  garmentLength: 'garment length',
  sleeveLength: 'sleeve length',
  hemGirth: 'hem',
  neckOpening: 'neck opening',
  waistOpening: 'waist opening',
  cuffOpening: 'cuff opening',
  legOpening: 'leg opening',
};

/** A point as it is said in a sentence, in lower case, with the person's own word for the bust. */
export function sayPoint(point: PointId, chestWord: SayContext['chestWord']): string {
  const words = POINT_WORDS[point];
  if (chestWord === 'bust') return words;
  if (point === 'underbust') return 'under the chest';
  return words.replace('bust', 'chest');
}

/** Joins words as a sentence does: `a`, `a and b`, `a, b and c`. An empty list gives an empty text. */
export function listWords(words: readonly string[], last: 'and' | 'or' = 'and'): string {
  if (words.length <= 1) return words[0] ?? '';
  return `${words.slice(0, -1).join(', ')} ${last} ${words[words.length - 1] ?? ''}`;
}

/** The text with its first letter raised; an empty text stays empty. */
export function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
