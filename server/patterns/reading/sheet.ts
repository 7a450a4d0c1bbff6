import Papa from 'papaparse';
import { SIZES_MAX } from '../../../shared/fit/fit.schema.ts';
import type { ImportIssue } from '../../../shared/patterns/imports.schema.ts';
import { unguardText } from '../../../shared/patterns/guard.ts';
import { errorAt } from './issues.ts';

/** The most columns a file may have: a column of sizes, the points, and some to leave out. */
export const COLUMNS_MAX = 120;
/** The most lines a file may have, blank ones included. */
const LINES_MAX = 2000;
/** Sizes, heading rows, titles and notes. */
const WRITTEN_LINES_MAX = SIZES_MAX + 60;
const DELIMITERS = ['\t', ';', ','] as const;
/** How much of a file is looked at to find the delimiter. */
const LOOKED_AT = 100_000;

const STRAY_QUOTE =
  'A cell here opens with a quotation mark and goes on after the closing one: double the mark where it means inches.';
const OPEN_QUOTE =
  'A cell in this row opens with a quotation mark that is never closed: close it, or double it where it means inches.';

interface Shape {
  fields: number;
  isBlank: boolean;
  /** A quoted cell opens here and is never closed. */
  isOpen: boolean;
}

/** A file's cells as text, trimmed, by row as in the file. */
export interface Sheet {
  delimiter: string;
  rows: string[][];
  issues: ImportIssue[];
}

/** Cuts a text into cells; answers an error instead where it is larger than a size table can be, before building anything. */
export function readSheet(text: string): Sheet | ImportIssue {
  const { body, said } = takeSeparatorLine(text);
  const delimiter = said ?? findDelimiter(body.slice(0, LOOKED_AT));
  // Rows are counted as in the file, that line included.
  const above = said === null ? 0 : 1;
  const tooLarge = overLimits(body, delimiter, above);
  if (tooLarge) return tooLarge;
  const { data, errors } = Papa.parse<string[]>(body, { delimiter, newline: '\n', skipEmptyLines: false });
  const issues = errors
    .filter((error) => error.type === 'Quotes')
    .slice(0, 1)
    .map((error) => errorAt({ row: (error.row ?? 0) + 1 + above }, 'strayQuote', STRAY_QUOTE));
  const rows = data.map((row) => row.map((cell) => unguardText(cell.trim())));
  return { delimiter, rows: above === 0 ? rows : [[''], ...rows], issues };
}

/** Some spreadsheets write `sep=;` above the table. */
function takeSeparatorLine(text: string): { body: string; said: string | null } {
  const found = /^sep=([,;\t])\n/i.exec(text);
  return found ? { body: text.slice(found[0].length), said: found[1] ?? null } : { body: text, said: null };
}

/**
 * Tabs and semicolons hardly ever stand in a number or a heading, commas do (`84,5`): a delimiter other than the comma is
 * taken where it cuts most lines into equally many cells.
 */
function findDelimiter(head: string): string {
  for (const delimiter of DELIMITERS) {
    if (delimiter === ',') break;
    const counts = [...shapes(head, delimiter, 40)]
      .filter((line) => !line.isBlank)
      .map((line) => line.fields);
    const usual = mostFrequent(counts.filter((count) => count > 1));
    const alike = counts.filter((count) => count === usual).length;
    if (usual > 1 && alike * 2 > counts.length) return delimiter;
  }
  return ',';
}

function overLimits(text: string, delimiter: string, above: number): ImportIssue | null {
  let row = above;
  let written = 0;
  for (const { fields, isBlank, isOpen } of shapes(text, delimiter, LINES_MAX + 1)) {
    row += 1;
    if (!isBlank) written += 1;
    if (isOpen) return errorAt({ row }, 'openQuote', OPEN_QUOTE);
    if (fields > COLUMNS_MAX) {
      const words = `This line has more than ${COLUMNS_MAX} columns: bring the size table alone.`;
      return errorAt({ row }, 'tooManyColumns', words);
    }
    if (written > WRITTEN_LINES_MAX || row > LINES_MAX) {
      const words = `The file goes on beyond ${SIZES_MAX} sizes, the most a pattern may have: bring the size table alone.`;
      return errorAt({ row }, 'tooManySizes', words);
    }
  }
  return null;
}

function mostFrequent(counts: readonly number[]): number {
  const times = (count: number) => counts.filter((found) => found === count).length;
  return counts.reduce((best, count) => (times(count) > times(best) ? count : best), counts[0] ?? 0);
}

/** Counts cells line by line without building any, and stops early where a line has too many. Quotes open at a cell's start only. */
function* shapes(text: string, delimiter: string, mostLines: number): Generator<Shape> {
  let shape: Shape = { fields: 1, isBlank: true, isOpen: false };
  let atStart = true;
  let lines = 0;
  for (let at = 0; at < text.length && lines < mostLines; at += 1) {
    const sign = text[at];
    if (sign === '\n') {
      yield shape;
      lines += 1;
      shape = { fields: 1, isBlank: true, isOpen: false };
      atStart = true;
    } else if (sign === delimiter) {
      shape.fields += 1;
      atStart = true;
      if (shape.fields > COLUMNS_MAX) {
        yield { ...shape, isBlank: false };
        return;
      }
    } else {
      if (sign === '"' && atStart) {
        at = endOfQuoted(text, at + 1);
        shape.isOpen = at === text.length;
      }
      if (sign !== ' ') shape.isBlank = false;
      atStart = false;
    }
  }
  if (lines < mostLines) yield shape;
}

/** Where the quoted cell closes: a doubled quotation mark is part of it. */
function endOfQuoted(text: string, from: number): number {
  let at = text.indexOf('"', from);
  while (at !== -1 && text[at + 1] === '"') at = text.indexOf('"', at + 2);
  return at === -1 ? text.length : at;
}
