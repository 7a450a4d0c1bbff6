import type {
  ImportColumn,
  ImportIssue,
  ImportTable,
  TableRole,
} from '../../../shared/patterns/imports.schema.ts';
import { quote, shorten } from '../../../shared/patterns/quote.ts';
import { cautionAt, errorAt } from './issues.ts';
import { CELL_MAX, isBlank, middleOf, readCell } from '../../../shared/patterns/read-cell.ts';

/** The most characters a size's name may have. */
const LABEL_MAX = 40;

type ImportRow = ImportTable['rows'][number];

/** Reads the rows below the headings: blank ones are passed over, everything else is a size or an issue at its place. */
export function readRows(
  rows: readonly string[][],
  headingRow: number,
  columns: readonly ImportColumn[],
  role: TableRole,
): { rows: ImportRow[]; issues: ImportIssue[] } {
  const issues: ImportIssue[] = [];
  const read: ImportRow[] = [];
  rows.forEach((cells, at) => {
    if (cells.every((cell) => cell === '')) return;
    const row = headingRow + 2 + at;
    issues.push(...sayLength(cells, row, columns.length));
    const label = cells[columns.findIndex((column) => column.role === 'size')] ?? '';
    issues.push(...sayLabel(label, row, cells, columns));
    const found = columns.map((column, place) => readOne(cells[place] ?? '', row, column, role, issues));
    read.push({ row, label: shorten(label, LABEL_MAX), cells: found });
  });
  return { rows: read, issues: [...issues, ...sayTwice(read, columns)] };
}

function readOne(
  text: string,
  row: number,
  column: ImportColumn,
  role: TableRole,
  issues: ImportIssue[],
): ImportRow['cells'][number] {
  const typed = shorten(text, CELL_MAX);
  if (column.role !== 'point') return { typed, mm: null };
  const read = readCell(text, column.unit, role);
  const place = { row, column: column.column };
  if (read.kind === 'blank') return { typed, mm: null };
  if (read.kind === 'error') {
    issues.push(errorAt(place, read.code, read.words));
    return { typed, mm: null };
  }
  if (read.unitWritten && read.unit !== column.unit) {
    const words = `${quote(text)} is read in ${read.unit}, as it says; its column is in ${column.unit}.`;
    issues.push(cautionAt(place, 'mixedUnits', words));
  }
  return { typed, mm: read.mm };
}

function sayLength(cells: readonly string[], row: number, width: number): ImportIssue[] {
  const extra = cells.slice(width).findIndex((cell) => cell !== '');
  if (extra !== -1) {
    const words = `This row has more cells than there are headings. Where a comma is the decimal sign, separate the columns by semicolons, or put quotation marks round the numbers.`;
    return [errorAt({ row, column: width + extra + 1 }, 'rowLonger', words)];
  }
  if (cells.length >= width) return [];
  const words = `This row has ${cells.length} cells and there are ${width} headings: the missing ones were taken as empty.`;
  return [cautionAt({ row, column: cells.length + 1 }, 'rowShorter', words)];
}

function sayLabel(
  label: string,
  row: number,
  cells: readonly string[],
  columns: readonly ImportColumn[],
): ImportIssue[] {
  const size = columns.find((column) => column.role === 'size');
  if (!size) return [];
  const place = { row, column: size.column };
  if (label === '')
    return [errorAt(place, 'noLabel', 'This row has no size: write its name here, such as 12 or M.')];
  if (label.length > LABEL_MAX) {
    const words = `The name of a size may have ${LABEL_MAX} characters: shorten it. If this is a note, leave its row out.`;
    return [errorAt(place, 'labelTooLong', words)];
  }
  const hasPoints = columns.some((column) => column.role === 'point');
  if (hasPoints && columns.every((column, at) => column.role !== 'point' || isBlank(cells[at] ?? ''))) {
    const words = `${quote(label)} has no measurements: fill its row, or leave it out if it is a note and not a size.`;
    return [errorAt({ row }, 'emptyRow', words)];
  }
  return [];
}

function sayTwice(rows: readonly ImportRow[], columns: readonly ImportColumn[]): ImportIssue[] {
  const column = columns.find((found) => found.role === 'size')?.column ?? null;
  const first = new Map<string, number>();
  return rows.flatMap(({ label, row }) => {
    if (label === '' || column === null) return [];
    const key = label.toLowerCase();
    const before = first.get(key);
    first.set(key, before ?? row);
    if (before === undefined) return [];
    const words = `Size ${quote(label)} stands in row ${before} already: give each size a name of its own, or leave one of the rows out.`;
    return [errorAt({ row, column }, 'sizeTwice', words)];
  });
}

/** Sizes run from the smallest to the largest, so each column should rise: where one falls, the place is pointed out. */
export function sayFalling(rows: readonly ImportRow[], columns: readonly ImportColumn[]): ImportIssue[] {
  return columns.flatMap((column, at) => {
    if (column.role !== 'point') return [];
    let last: { mm: number; label: string } | null = null;
    const issues: ImportIssue[] = [];
    for (const { row, label, cells } of rows) {
      const cell = cells[at]?.mm ?? null;
      if (cell === null) continue;
      const mm = middleOf(cell);
      if (last !== null && mm < last.mm) {
        const words = `This is less than at size ${quote(last.label)} above: look at the number, and put the smallest size first.`;
        issues.push(cautionAt({ row, column: column.column }, 'valuesFall', words));
      }
      last = { mm, label };
    }
    return issues;
  });
}

/** Columns that were understood and hold nothing. */
export function sayEmpty(
  rows: readonly ImportRow[],
  columns: readonly ImportColumn[],
  headingRow: number,
): ImportIssue[] {
  if (rows.length === 0) return [];
  return columns.flatMap((column, at) => {
    const isEmpty = column.role === 'point' && rows.every(({ cells }) => isBlank(cells[at]?.typed ?? ''));
    if (!isEmpty) return [];
    const words = `${quote(column.heading)} has no measurement at any size: it will be left out.`;
    return [cautionAt({ row: headingRow + 1, column: column.column }, 'emptyColumn', words)];
  });
}
