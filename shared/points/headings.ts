import type { LengthUnit } from '../units.ts';
import { CATALOGUE } from './catalogue.ts';
import { POINT_IDS, type PointId } from './point-ids.ts';

/** Which table a heading stands over: a few names mean one thing on a body and another on a garment. */
export type HeadingTable = 'chart' | 'finished';

/** What a heading was taken for. */
export interface HeadingMatch {
  /** The point, or null where none or more than one fits. */
  point: PointId | null;
  /** `exact`: one of the catalogue's names; `likely`: only after leaving a word out, so a person should look. */
  sureness: 'exact' | 'likely' | 'none';
  /** The unit written in the heading, or null. */
  unit: LengthUnit | null;
  /** The points it could be where it could be more than one. */
  between: readonly PointId[];
  /** What the heading itself says it is: “Finished bust”, “Body hip”, “To fit chest”. */
  says: HeadingTable | null;
  /** Measured across cloth laid flat (“half chest”, “hip flat”, “hip width”), so perhaps half of the girth. */
  flat: boolean;
}

/**
 * Names that mean different points: settled only by the table they stand over, else left open.
 * *Common practice*: a body's back length ends at the waist, a garment's at the hem.
 */
const OPEN_NAMES: Record<string, Partial<Record<HeadingTable, PointId>> & { between: readonly PointId[] }> = {
  length: { finished: 'garmentLength', between: ['backWaistLength', 'garmentLength'] },
  ...sameFor(['backlength', 'cblength', 'centrebacklength', 'centerbacklength', 'lengthcb'], {
    chart: 'backWaistLength',
    finished: 'garmentLength',
    between: ['backWaistLength', 'garmentLength'],
  }),
  ...sameFor(['sleeve', 'sleeves', 'sleevelength'], {
    chart: 'armLength',
    finished: 'sleeveLength',
    between: ['armLength', 'sleeveLength'],
  }),
  ...sameFor(['waistlength', 'bodicelength', 'frontlength'], {
    between: ['backWaistLength', 'frontWaistLength'],
  }),
  ...sameFor(['shoulder', 'shoulders'], { between: ['shoulderLength', 'shoulderWidth'] }),
  ...sameFor(['chestwidth', 'bustwidth'], { between: ['bust', 'frontWidth'] }),
  ...sameFor(['rise', 'crotchrise'], { between: ['bodyRise', 'crotchLengthFront', 'crotchLength'] }),
  ...sameFor(['arm', 'arms'], { between: ['upperArm', 'armLength'] }),
  ...sameFor(['leg', 'legs', 'leglength'], { between: ['insideLeg', 'outsideLeg'] }),
  back: { between: ['backWidth', 'backWaistLength'] },
  front: { between: ['frontWidth', 'frontWaistLength'] },
};

const UNIT = String.raw`inch(?:es)?|ins?\.?|["″”]|''|cms?\.?|centimet(?:re|er)s?|mms?\.?|millimet(?:re|er)s?`;
const UNIT_IN_BRACKETS = new RegExp(String.raw`[([{]\s*(?:in\s+)?(${UNIT})\s*[)\]}]`, 'i');
const UNIT_AT_END = new RegExp(String.raw`(?:[\s,;:_/|–—-]+(?:in\s+)?(${UNIT})|(["″”]|''))\s*$`, 'i');
const TWO_UNITS =
  /[\s([]*\b(?:cms?|mms?|ins|inch|inches|in(?!\s))\b\s*(?:\W|\bor\b|\band\b)\s*\b(?:cms?|mms?|ins|inch|inches|in)\b[)\]]*/i;

const SAYS_FINISHED = new Set(['finished', 'garment', 'sewn', 'actual']);
const SAYS_BODY = new Set(['body', 'tofit', 'fits']);
const QUALIFIERS = new Set([
  ...SAYS_FINISHED,
  ...SAYS_BODY,
  ...['measurement', 'measurements', 'measure', 'the', 'your', 'my'],
]);
const LOOSE_WORDS = new Set([
  'girth',
  'width',
  'line',
  'level',
  'at',
  'around',
  'round',
  'edge',
  'total',
  'approx',
]);
const FLAT_WORDS = new Set(['half', 'flat', 'halfwidth', 'pit', 'folded']);

/**
 * Matches the heading of a column with a point of measure through the catalogue's names and synonyms. Case, punctuation
 * and units do not matter. Empty or unknown headings answer `none`; it never guesses between two points and never throws.
 */
export function matchHeading(heading: string, table: HeadingTable | null = null): HeadingMatch {
  const { text, unit } = takeUnit(plain(heading));
  const words = wordsOf(text);
  const says = words.some((word) => SAYS_FINISHED.has(word))
    ? 'finished'
    : words.some((word) => SAYS_BODY.has(word))
      ? 'chart'
      : null;
  const none: HeadingMatch = { point: null, sureness: 'none', unit, between: [], says, flat: false };
  if (/½|⁄|\d/.test(text) || words.some((word) => FLAT_WORDS.has(word))) {
    return { ...none, flat: /½|1\s*[/⁄]\s*2/.test(text) || words.some((word) => FLAT_WORDS.has(word)) };
  }
  const id = POINT_IDS.find((point) => point === text);
  if (id) return { ...none, point: id, sureness: 'exact' };
  const bare = words.filter((word) => !QUALIFIERS.has(word));
  for (const form of [words, bare]) {
    const open = OPEN_NAMES[form.join('')];
    if (open) {
      const role = says ?? table;
      const point = role ? open[role] : undefined;
      return point ? { ...none, point, sureness: 'likely' } : { ...none, between: open.between };
    }
    const point = lookUp(form);
    // “Body rise” is a name whole: then its first word says nothing of the table.
    if (point) return { ...none, point, sureness: 'exact', says: form === words ? null : says };
  }
  const point = looselyMatched(text, bare);
  return point ? { ...none, point, sureness: 'likely', flat: words.includes('width') } : none;
}

/** True where a heading says that its column holds the names of the sizes: “Size”, “UK size”, “Sizes (EU)”. Empty: false. */
export function isSizeHeading(heading: string): boolean {
  const words = wordsOf(plain(heading));
  return (
    words.some((word) => /^(?:sizes?|sz|label)$/.test(word)) && words.every((word) => SIZE_WORDS.has(word))
  );
}

const SIZE_WORDS = new Set(
  'size sizes sz label labels name us uk eu eur fr de it au jp usa pattern garment alpha numeric number no'.split(
    ' ',
  ),
);

const INDEX = buildIndex();

function buildIndex(): ReadonlyMap<string, PointId> {
  const names = POINT_IDS.flatMap((point) => {
    const { name, chestName, shortName, shortChestName, otherNames } = CATALOGUE[point];
    const names = [point, name, chestName ?? name, shortName, shortChestName ?? shortName, ...otherNames];
    return names.map((text): [string, PointId] => [wordsOf(plain(text)).join(''), point]);
  });
  return new Map(names);
}

function lookUp(words: readonly string[]): PointId | null {
  const whole = INDEX.get(words.join(''));
  if (whole) return whole;
  const side = words.find((word) => SIDES[word] !== undefined);
  if (side === undefined) return null;
  const middle = INDEX.get(words.filter((word) => word !== side).join(''));
  const sided = middle ? `${middle}${SIDES[side] ?? ''}` : '';
  return POINT_IDS.find((point) => point === sided) ?? null;
}

const SIDES: Record<string, 'Left' | 'Right'> = { left: 'Left', l: 'Left', right: 'Right', r: 'Right' };

/** One more try, with loose words, plurals or a note in brackets left out; only where one point is what all of them say. */
function looselyMatched(text: string, bare: readonly string[]): PointId | null {
  const singular = bare.map((word) => (/[^s]s$/.test(word) ? word.slice(0, -1) : word));
  const noted = text.replace(/\s*[([{][^)\]}]*[)\]}]\s*/g, ' ');
  const unnoted = wordsOf(noted).filter((word) => !QUALIFIERS.has(word));
  const found = new Set<PointId>();
  for (const form of [singular, bare, unnoted]) {
    const point = lookUp(form) ?? lookUp(form.filter((word) => !LOOSE_WORDS.has(word)));
    if (point) found.add(point);
  }
  const [only] = found;
  return found.size === 1 && only ? only : null;
}

function plain(text: string): string {
  // No heading is longer; what is may be a whole file in one cell.
  return text.slice(0, 200).replace(/½/g, '1/2').normalize('NFKC').replace(/^'+/, '').trim();
}

function takeUnit(text: string): { text: string; unit: LengthUnit | null } {
  if (TWO_UNITS.test(text)) return { text: text.replace(TWO_UNITS, ' ').trim(), unit: null };
  for (const pattern of [UNIT_IN_BRACKETS, UNIT_AT_END]) {
    const found = pattern.exec(text);
    const written = found?.[1] ?? found?.[2];
    if (found && written) return { text: text.replace(found[0], ' ').trim(), unit: unitOf(written) };
  }
  return { text, unit: null };
}

function unitOf(written: string): LengthUnit {
  if (/^c/i.test(written)) return 'cm';
  return /^m/i.test(written) ? 'mm' : 'in';
}

function wordsOf(text: string): string[] {
  return text
    .toLowerCase()
    .replace(/['’.]/g, '')
    .replace(/\b(?:circumference|circumf|circ|perimeter)\b/g, 'girth')
    .replace(/&/g, ' and ')
    .replace(/\bto fit\b/g, 'tofit')
    .split(/[^\p{L}\p{N}]+/u)
    .filter((word) => word !== '');
}

function sameFor<T>(keys: readonly string[], value: T): Record<string, T> {
  return Object.fromEntries(keys.map((key) => [key, value]));
}
