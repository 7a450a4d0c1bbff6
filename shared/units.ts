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
 * Reads one length: `95.2`, `95,2 cm`, `952 mm`, `37.375 in`, `37 3/8`, `37-3/8"`, `37⅜`, `3/8`; digits of full width too.
 * `assumed` is the unit where none is written. Empty and bad input answer `ok: false` with a sentence; it never
 * throws. Refused as ambiguous: one digit, a comma or point and three digits (`1,050`), except in inches, where it can
 * only be a decimal (`1.375`); and a fraction other than a half with no unit written where centimetres or millimetres
 * are assumed (`37 3/8` is most likely in inches). Feet (`5' 6"`) are refused in words.
 */
export function parseLength(text: string, assumed: LengthUnit): ParsedLength | LengthError {
  let rest = plain(text);
  if (rest === '') return { ok: false, code: 'empty', words: 'Nothing is written here.' };
  if (/\d\s*(?:['’′]|ft\b|feet\b|foot\b)(?!['’′]\s*$)/i.test(rest)) return feet(rest);
  let unit = assumed;
  let unitWritten = false;
  for (const [pattern, found] of UNIT_WORDS) {
    if (!pattern.test(rest)) continue;
    rest = rest.replace(pattern, '').trim();
    unit = found;
    unitWritten = true;
    break;
  }
  if (/^[-−–]/.test(rest)) {
    return {
      ok: false,
      code: 'negative',
      words: 'A length cannot be negative: write it without the minus sign.',
    };
  }
  const value = readMm(rest, unit, unitWritten);
  if (typeof value !== 'number') return value;
  return { ok: true, mm: value, unit, unitWritten };
}

/** Signs of one meaning made one: fraction signs, wide digits, odd blanks. */
function plain(text: string): string {
  return text
    .replace(/[½¼¾⅛⅜⅝⅞⅓⅔]/g, (sign) => ` ${VULGAR[sign] ?? sign}`)
    .replace(/[″”]/g, '"')
    .normalize('NFKC')
    .replace(/\u2044/g, '/')
    .replace(/\s+/g, ' ')
    .trim();
}

function feet(text: string): LengthError {
  return {
    ok: false,
    code: 'notALength',
    words: `“${shorten(text)}” is in feet: write it in inches alone (5 ft 6 in is 66 in), or in centimetres.`,
  };
}

function readMm(text: string, unit: LengthUnit, unitWritten: boolean): number | LengthError {
  const mixed = /^(?:(\d{1,6}) ?[- ] ?)?(\d{1,3}) ?\/ ?(\d{1,3})$/.exec(text);
  if (mixed) {
    const isHalf = mixed[2] === '1' && mixed[3] === '2';
    if (unit !== 'in' && !unitWritten && !isHalf) return fractionWithoutUnit(text, unit);
    return readFraction(Number(mixed[1] ?? '0'), Number(mixed[2]), Number(mixed[3]), unit);
  }
  if (!/^(?:\d{1,9}(?:[.,]\d{0,9})?|[.,]\d{1,9})$/.test(text)) return notALength(text, unit);
  if (unit !== 'in' && /^[1-9][.,]\d{3}$/.test(text)) {
    const thousands = text.replace(/[.,]/, '');
    const decimal = String(Number(text.replace(',', '.')));
    return {
      ok: false,
      code: 'ambiguous',
      words: `“${text}” could be ${thousands} or ${decimal}: write one of those.`,
    };
  }
  const digits = text.replace(',', '.');
  // The point is moved in the text, not multiplied: 1.005 × 10 would not be 10.05 to the last place.
  return unit === 'in' ? inchesToMm(Number(digits)) : Number(`${digits}${unit === 'cm' ? 'e1' : ''}`);
}

/** Through whole tenths: 37.375 × 25.4 is 949.3249999…, 37.375 × 254 ÷ 10 is 949.325. */
function inchesToMm(inches: number): number {
  return (inches * 254) / 10;
}

function notALength(text: string, unit: LengthUnit): LengthError {
  const unitInside = /^(\d+) ?(?:in|ins|inch|inches|") ?(\d+ ?\/ ?\d+)$/i.exec(text);
  if (unitInside) {
    return {
      ok: false,
      code: 'notALength',
      words: `“${shorten(text)}”: write the unit at the end, ${unitInside[1] ?? ''} ${unitInside[2] ?? ''} in.`,
    };
  }
  const example = unit === 'in' ? '37 3/8 or 37.375' : unit === 'cm' ? '95.2' : '952';
  return {
    ok: false,
    code: 'notALength',
    words: `“${shorten(text)}” is not a length: write it like ${example}.`,
  };
}

function fractionWithoutUnit(text: string, unit: LengthUnit): LengthError {
  return {
    ok: false,
    code: 'ambiguous',
    words: `“${shorten(text)}” has a fraction, as inches do: write ${shorten(text)} in, or the number in ${unit} with a decimal point.`,
  };
}

function readFraction(whole: number, part: number, of: number, unit: LengthUnit): number | LengthError {
  if (of === 0 || part >= of) {
    return {
      ok: false,
      code: 'badFraction',
      words: `${part}/${of} is not a part of one: the upper number is smaller than the lower, as in 3/8.`,
    };
  }
  const value = whole + part / of;
  return unit === 'in' ? inchesToMm(value) : value * MM_PER[unit];
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
