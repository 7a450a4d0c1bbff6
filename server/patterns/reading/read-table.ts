import { POINTS_MAX, SIZES_MAX } from '../../../shared/fit/fit.schema.ts';
import type {
  ImportColumn,
  ImportCorrections,
  ImportIssue,
  ImportTable,
  TableRole,
} from '../../../shared/patterns/imports.schema.ts';
import type { StoredFile } from '../../../shared/patterns/patterns.schema.ts';
import { decideColumns, findHeadingRow } from './columns.ts';
import { decode } from './decode.ts';
import { quote } from '../../../shared/patterns/quote.ts';
import { cautionAt, errorAt } from './issues.ts';
import { readRows, sayEmpty, sayFalling } from './rows.ts';
import { settleUnits } from './settle-units.ts';
import { readSheet, type Sheet } from './sheet.ts';

/** The most issues that are listed: a file with more is read better after these are mended. */
const ISSUES_MAX = 200;

/**
 * Reads one uploaded file as a size chart or as finished measurements: cell by cell what was understood, and everything that
 * was not, at its place. It never throws; a file that is no table at all answers one error and nothing else (`isRefused`).
 */
export function readTable(
  bytes: Uint8Array,
  file: StoredFile,
  role: TableRole,
  corrections: ImportCorrections,
): ImportTable {
  const decoded = decode(bytes);
  if (!decoded.ok) return refused(file, decoded.issue);
  const sheet = readSheet(decoded.text);
  if (!('rows' in sheet)) return refused(file, sheet);
  const table = readCells(sheet, file, role, corrections);
  return { ...table, issues: capped([...decoded.issues, ...sheet.issues, ...table.issues]) };
}

/** The error of a file that could not be read as a table at all, or null: such a file takes no other's place. */
export function refusalOf(table: ImportTable): ImportIssue | null {
  return table.columns.length === 0 ? (table.issues[0] ?? null) : null;
}

function readCells(
  sheet: Sheet,
  file: StoredFile,
  role: TableRole,
  corrections: ImportCorrections,
): ImportTable {
  const headingRow = findHeadingRow(sheet.rows, role);
  const headings = trimmedEnd(sheet.rows[headingRow] ?? []);
  const below = sheet.rows.slice(headingRow + 1);
  const decided = decideColumns(headings, below, headingRow, role, corrections);
  const units = settleUnits({
    columns: decided.columns,
    rows: below,
    headingRow,
    role,
    around: [...sheet.rows.slice(0, headingRow).flat(), ...sizeHeading(decided.columns)],
    chosen: corrections.unit,
  });
  const columns = decided.columns.map(({ written: _written, ...column }, at): ImportColumn => ({
    ...column,
    unit: units.byColumn[at] ?? units.unit,
  }));
  const { rows, issues } = readRows(below, headingRow, columns, role);
  const decimals = readDecimals(below, headingRow, columns);
  return {
    file,
    delimiter: sheet.delimiter,
    decimalComma: decimals.decimalComma,
    unit: units.unit,
    unitFrom: units.unitFrom,
    columns,
    rows,
    issues: [
      ...sayTitles(sheet.rows.slice(0, headingRow)),
      ...decided.issues,
      ...units.issues,
      ...decimals.issues,
      ...sayCounts(rows, columns, headingRow),
      ...issues,
      ...sayFalling(rows, columns),
      ...sayEmpty(rows, columns, headingRow),
    ],
  };
}

function sizeHeading(columns: readonly { role: string; heading: string }[]): string[] {
  return columns.filter((column) => column.role === 'size').map((column) => column.heading);
}

function trimmedEnd(cells: readonly string[]): string[] {
  return cells.slice(0, cells.findLastIndex((cell) => cell !== '') + 1);
}

function sayTitles(rows: readonly string[][]): ImportIssue[] {
  return rows.flatMap((cells, at) => {
    const text = cells.filter((cell) => cell !== '').join(' ');
    if (text === '') return [];
    const words = `${quote(text)} stands above the headings and was passed over.`;
    return [cautionAt({ row: at + 1 }, 'titleRow', words)];
  });
}

function sayCounts(
  rows: ImportTable['rows'],
  columns: readonly ImportColumn[],
  headingRow: number,
): ImportIssue[] {
  const issues: ImportIssue[] = [];
  const points = columns.filter((column) => column.role === 'point');
  if (rows.length === 0) {
    issues.push(
      errorAt(
        { row: headingRow + 1 },
        'noSizes',
        'There is no row below the headings: write a row for each size.',
      ),
    );
  }
  const over = rows[SIZES_MAX];
  if (over) {
    const words = `A pattern may have ${SIZES_MAX} sizes, and here begins one more: leave some out.`;
    issues.push(errorAt({ row: over.row }, 'tooManySizes', words));
  }
  if (points.length > POINTS_MAX) {
    const words = `A table may have ${POINTS_MAX} points, and here are ${points.length}: leave some out.`;
    issues.push(errorAt({ row: headingRow + 1 }, 'tooManyPoints', words));
  }
  return issues;
}

function readDecimals(
  rows: readonly string[][],
  headingRow: number,
  columns: readonly ImportColumn[],
): { decimalComma: boolean; issues: ImportIssue[] } {
  const cells = rows.flatMap((row, at) =>
    columns.flatMap((column, place) =>
      column.role === 'point'
        ? [{ row: headingRow + 2 + at, column: column.column, text: row[place] ?? '' }]
        : [],
    ),
  );
  const commas = cells.filter((cell) => /\d,\d/.test(cell.text));
  const points = cells.filter((cell) => /\d\.\d/.test(cell.text));
  const decimalComma = commas.length > points.length;
  const [odd] = decimalComma ? points : commas;
  if (!odd) return { decimalComma, issues: [] };
  const words = `${quote(odd.text)} has a decimal ${decimalComma ? 'point' : 'comma'} where other cells have a ${decimalComma ? 'comma' : 'point'}: look whether it was read as you mean it.`;
  return { decimalComma, issues: [cautionAt({ row: odd.row, column: odd.column }, 'mixedDecimals', words)] };
}

/** Errors first, so that none is lost where there are more than can be listed. */
function capped(issues: readonly ImportIssue[]): ImportIssue[] {
  const sorted = [...issues].sort((a, b) => rank(a) - rank(b));
  if (sorted.length <= ISSUES_MAX) return sorted;
  const words = `There are ${sorted.length - ISSUES_MAX} more like these: mend the first ones and look again.`;
  const { severity } = sorted[ISSUES_MAX] ?? { severity: 'caution' };
  return [...sorted.slice(0, ISSUES_MAX), { severity, code: 'more', row: null, column: null, words }];
}

function rank(issue: ImportIssue): number {
  return issue.severity === 'error' ? 0 : 1;
}

function refused(file: StoredFile, issue: ImportIssue): ImportTable {
  return {
    file,
    delimiter: ',',
    decimalComma: false,
    unit: 'cm',
    unitFrom: 'size of the numbers',
    columns: [],
    rows: [],
    issues: [issue],
  };
}
