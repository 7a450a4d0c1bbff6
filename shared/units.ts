/**
 * Lengths as people write them. Everything inside Leeway is in millimetres (1 in = 25.4 mm exactly, so
 * 1/16 in = 1.5875 mm and is exact in binary to the last place that matters); what was typed is kept beside it.
 */
declare const brand: unique symbol;

/** A length in millimetres. */
export type Millimetres = number & { readonly [brand]?: 'mm' };

/** The units a person may choose. */
export const LENGTH_UNITS = ['cm', 'mm', 'in'] as const;
/** A unit a person may choose. */
export type LengthUnit = (typeof LENGTH_UNITS)[number];

/** Millimetres in one of the unit. */
export const MM_PER: Record<LengthUnit, number> = { cm: 10, mm: 1, in: 25.4 };

/** Why a text is not a length. `words` says what would be right. */
export interface LengthError {
  ok: false;
  code: 'empty' | 'notALength' | 'negative' | 'ambiguous' | 'badFraction';
  words: string;
}
/** A text understood: its length in mm and the unit it was in (written, or the one assumed). */
export interface ParsedLength {
  ok: true;
  mm: Millimetres;
  unit: LengthUnit;
  unitWritten: boolean;
}

const VULGAR: Record<string, string> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
  '⅓': '1/3',
  '⅔': '2/3',
};

const UNIT_WORDS: [RegExp, LengthUnit][] = [
  [/(?:centimet(?:re|er)s?|cms?\.?)$/i, 'cm'],
  [/(?:millimet(?:re|er)s?|mms?\.?)$/i, 'mm'],
  [/(?:inch(?:es)?|ins?\.?|["″”]|'')$/i, 'in'],
];

/**
 * Reads one length: `95.2`, `95,2 cm`, `952 mm`, `37.375 in`, `37 3/8`, `37-3/8"`, `37⅜`, `3/8`.
 * `assumed` is the unit where none is written. Empty and bad input answer `ok: false` with a sentence; it never
 * throws. A comma or point followed by exactly three digits after one to three (`1,050`) could mean two
 * numbers and is refused as ambiguous, except `0,…` and in inches, where it can only be a decimal (`37.375`).
 */
export function parseLength(text: string, assumed: LengthUnit): ParsedLength | LengthError {
  let rest = text
    .normalize('NFC')
    .replace(/[\u00a0\u2009\u202f\u2007]/g, ' ')
    .trim();
  if (rest === '') return { ok: false, code: 'empty', words: 'Nothing is written here.' };
  let unit = assumed;
  let unitWritten = false;
  for (const [pattern, found] of UNIT_WORDS) {
    if (!pattern.test(rest)) continue;
    rest = rest.replace(pattern, '').trim();
    unit = found;
    unitWritten = true;
    break;
  }
  rest = rest
    .replace(/[½¼¾⅛⅜⅝⅞⅓⅔]/g, (sign) => ` ${VULGAR[sign] ?? sign}`)
    .replace(/\u2044/g, '/')
    .trim();
  if (/^[-−–]/.test(rest)) {
    return {
      ok: false,
      code: 'negative',
      words: 'A length cannot be negative: write it without the minus sign.',
    };
  }
  const value = readNumber(rest, unit);
  if (typeof value !== 'number') return value;
  return { ok: true, mm: value * MM_PER[unit], unit, unitWritten };
}

function readNumber(text: string, unit: LengthUnit): number | LengthError {
  const mixed = /^(?:(\d{1,6})\s*[- ]\s*)?(\d{1,3})\s*\/\s*(\d{1,3})$/.exec(text);
  if (mixed) return readFraction(Number(mixed[1] ?? '0'), Number(mixed[2]), Number(mixed[3]));
  if (!/^\d{0,9}(?:[.,]\d{1,9})?$/.test(text) || text === '') {
    const example = unit === 'in' ? '37 3/8 or 37.375' : unit === 'cm' ? '95.2' : '952';
    return {
      ok: false,
      code: 'notALength',
      words: `“${shorten(text)}” is not a length: write it like ${example}.`,
    };
  }
  if (unit !== 'in' && /^[1-9]\d{0,2}[.,]\d{3}$/.test(text)) {
    const plain = text.replace(/[.,]/, '');
    const decimal = String(Number(text.replace(',', '.')));
    return {
      ok: false,
      code: 'ambiguous',
      words: `“${text}” could be ${plain} or ${decimal}: write one of those.`,
    };
  }
  return Number(text.replace(',', '.'));
}

function readFraction(whole: number, part: number, of: number): number | LengthError {
  if (of === 0 || part >= of) {
    return {
      ok: false,
      code: 'badFraction',
      words: `${part}/${of} is not a part of an inch: the upper number is smaller than the lower, as in 3/8.`,
    };
  }
  return whole + part / of;
}

function shorten(text: string): string {
  return text.length > 24 ? `${text.slice(0, 24)}…` : text;
}

/**
 * A length as a person reads it, without its unit: `95.2` (cm, one decimal), `952` (mm, whole unless asked),
 * `37 3/8` (inches, to the nearest sixteenth). `signed` puts `+` or `−` in front. NaN and infinities throw a RangeError.
 */
export function printLength(mm: number, unit: LengthUnit, options: { signed?: boolean } = {}): string {
  if (!Number.isFinite(mm)) throw new RangeError('printLength: mm must be a finite number');
  const size = Math.abs(mm);
  const body = unit === 'in' ? printInches(size) : printDecimal(size / MM_PER[unit], unit === 'cm' ? 1 : 0);
  const isZero = /^0(?:\.0)?$/.test(body);
  const sign = isZero ? '' : mm < 0 ? '−' : options.signed === true ? '+' : '';
  return sign + body;
}

/** As `printLength`, with the unit after it: `95.2 cm`, `37 3/8 in`. */
export function printLengthWithUnit(
  mm: number,
  unit: LengthUnit,
  options: { signed?: boolean } = {},
): string {
  return `${printLength(mm, unit, options)} ${unit}`;
}

function printInches(mm: number): string {
  const sixteenths = Math.round((mm / 25.4) * 16);
  const whole = Math.floor(sixteenths / 16);
  let part = sixteenths % 16;
  if (part === 0) return String(whole);
  let of = 16;
  while (part % 2 === 0) {
    part /= 2;
    of /= 2;
  }
  return whole === 0 ? `${part}/${of}` : `${whole} ${part}/${of}`;
}

/** Rounds half away from zero on the decimal digits, so that 0.25 cm prints as 0.3 however it is stored. */
function printDecimal(value: number, digits: number): string {
  const scale = 10 ** digits;
  return (Math.round(value * scale + 1e-9) / scale).toFixed(digits);
}
