import { LENGTH_MAX_MM, type Measured } from '../fit/fit.schema.ts';
import type { TableRole } from './imports.schema.ts';
import { parseLength, printLength, type LengthError, type LengthUnit, type ParsedLength } from '../units.ts';
import { isFormula } from './guard.ts';
import { quote } from './quote.ts';

/** The shortest length, in mm, that is taken for a measurement. */
export const LENGTH_MIN_MM = 5;
/** The most characters a cell may have. */
export const CELL_MAX = 120;

/** One cell as understood. */
export type CellReading =
  | { kind: 'blank' }
  | { kind: 'length'; mm: Measured; unit: LengthUnit; unitWritten: boolean }
  | { kind: 'error'; code: string; words: string };

const BLANK = /^(?:[-–—−.…/]*|n\/?a|n\.\s?a\.?|none|nil)$/i;
const DASHES = /[-–—−]|(?<![a-z])to(?![a-z])/gi;

/** True for what people write where there is no number: nothing, a dash, “n/a”. */
export function isBlank(text: string): boolean {
  return BLANK.test(text);
}

/** Reads one cell: a length or, in a size chart, a range of them. `assumed` is the unit where the cell writes none. Never throws. */
export function readCell(text: string, assumed: LengthUnit, role: TableRole): CellReading {
  if (isBlank(text)) return { kind: 'blank' };
  if (text.length > CELL_MAX) {
    return failed('cellTooLong', `This cell has more than ${CELL_MAX} characters: it needs one length.`);
  }
  const single = parseLength(joinFraction(text), assumed);
  if (single.ok) return oneLength(single, text);
  const range = readRange(text, assumed);
  if (range) return role === 'finished' ? rangeRefused(text) : range;
  if (isFormula(text) && single.code !== 'negative') {
    return failed(
      'formula',
      `${quote(text)} is a formula, which is kept as text: write its result as a number.`,
    );
  }
  return failed(single.code, single.words);
}

function oneLength(length: ParsedLength, text: string): CellReading {
  const { mm, unit, unitWritten } = length;
  return outside(mm, unit, text) ?? { kind: 'length', mm, unit, unitWritten };
}

/** `37–3/8` with a long dash is the mixed fraction 37 3/8: a range would not fall from 37 to under 1. */
function joinFraction(text: string): string {
  return text.replace(/^(\d+)\s*[–—−]\s*(\d+\s*[/⁄]\s*\d+|[½¼¾⅛⅜⅝⅞⅓⅔])/, '$1 $2');
}

/**
 * A range is what a dash or “to” cuts into two lengths: `91–94`, `36-1/2 - 38`, `34 to 36 in`. Each dash is tried, since a
 * dash may also join a fraction to its inches; the text counts as a range where exactly one cut gives two lengths.
 */
function readRange(text: string, assumed: LengthUnit): CellReading | null {
  const cuts: [ParsedLength, ParsedLength][] = [];
  for (const dash of text.matchAll(DASHES)) {
    const high = parseLength(joinFraction(text.slice(dash.index + dash[0].length)), assumed);
    if (!high.ok) continue;
    // A unit written once, at the end, is meant for both.
    const low: ParsedLength | LengthError = parseLength(joinFraction(text.slice(0, dash.index)), high.unit);
    if (low.ok) cuts.push([low, high]);
  }
  const [only] = cuts;
  if (!only || cuts.length > 1) return null;
  const [low, high] = only;
  if (low.mm > high.mm) {
    return failed('rangeFalls', `${quote(text)} falls: write the smaller number first.`);
  }
  const bad = outside(low.mm, low.unit, text) ?? outside(high.mm, high.unit, text);
  if (bad) return bad;
  const mm = low.mm === high.mm ? low.mm : { low: low.mm, high: high.mm };
  return { kind: 'length', mm, unit: high.unit, unitWritten: high.unitWritten || low.unitWritten };
}

function rangeRefused(text: string): CellReading {
  return failed(
    'rangeInFinished',
    `${quote(text)} is a range; a sewn garment has one length at a size: write one number. Ranges belong in the size chart.`,
  );
}

function outside(mm: number, unit: LengthUnit, text: string): CellReading | null {
  if (mm > LENGTH_MAX_MM) {
    const most = printLength(LENGTH_MAX_MM, unit);
    return failed(
      'tooLong',
      `${quote(text)} as ${unit} is longer than anything measured here (${most} ${unit} at most): look at the number and its unit.`,
    );
  }
  if (mm < LENGTH_MIN_MM) {
    return failed(
      'tooShort',
      `${quote(text)} as ${unit} is shorter than ${LENGTH_MIN_MM} mm: look at the number and its unit, or leave the cell empty.`,
    );
  }
  return null;
}

function failed(code: string, words: string): CellReading {
  return { kind: 'error', code, words };
}

/** The middle of a range, or the length itself, in mm. */
export function middleOf(mm: Measured): number {
  return typeof mm === 'number' ? mm : (mm.low + mm.high) / 2;
}
