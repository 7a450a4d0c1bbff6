import type { ImportIssue, ImportTable, TableRole } from '../../../shared/patterns/imports.schema.ts';

/** An issue as the page shows it: numbered, so that the list and the table can point at each other. */
export interface Note {
  number: number;
  /** The id of its line in the list. */
  id: string;
  issue: ImportIssue;
  /** The id of the heading, row or cell it stands at; null where it is about the whole table. */
  targetId: string | null;
}

/** The ids of the places in a table that a note can point at. */
export const placeIds = {
  heading: (role: TableRole, column: number) => `${role}-column-${column}`,
  row: (role: TableRole, row: number) => `${role}-row-${row}`,
  cell: (role: TableRole, row: number, column: number) => `${role}-row-${row}-column-${column}`,
};

/** What each kind of note is called; beside the number it needs no colour to be told apart. */
export const NOTE_WORDS: Record<ImportIssue['severity'], string> = { error: 'Error', caution: 'Look' };

/** A table's issues, errors first, then from the top down and from left to right. */
export function noteIssues(table: ImportTable, role: TableRole): Note[] {
  const rows = new Set(table.rows.map((row) => row.row));
  const columns = new Set(table.columns.map((column) => column.column));
  return [...table.issues].sort(byPlace).map((issue, index) => ({
    number: index + 1,
    id: `${role}-note-${index + 1}`,
    issue,
    targetId: targetOf(issue, role, rows, columns),
  }));
}

/** The notes of each place. */
export function byTarget(notes: readonly Note[]): ReadonlyMap<string, readonly Note[]> {
  const found = new Map<string, Note[]>();
  for (const note of notes) {
    if (note.targetId === null) continue;
    found.set(note.targetId, [...(found.get(note.targetId) ?? []), note]);
  }
  return found;
}

function byPlace(a: ImportIssue, b: ImportIssue): number {
  const rank = ({ severity }: ImportIssue) => (severity === 'error' ? 0 : 1);
  return rank(a) - rank(b) || (a.row ?? 0) - (b.row ?? 0) || (a.column ?? 0) - (b.column ?? 0);
}

function targetOf(
  { row, column }: ImportIssue,
  role: TableRole,
  rows: ReadonlySet<number>,
  columns: ReadonlySet<number>,
): string | null {
  const isSize = row !== null && rows.has(row);
  const isKnown = column !== null && columns.has(column);
  if (isSize) return isKnown ? placeIds.cell(role, row, column) : placeIds.row(role, row);
  return isKnown ? placeIds.heading(role, column) : null;
}

/** Where a note stands, as one would say it over the file: “row 3, column 2”. Empty for the whole table. */
export function sayPlace({ row, column }: ImportIssue): string {
  return [row === null ? '' : `row ${row}`, column === null ? '' : `column ${column}`]
    .filter((part) => part !== '')
    .join(', ');
}

/** “14 sizes, 8 points; 2 cells need a look”. */
export function sayTotals(table: ImportTable, notes: readonly Note[]): string {
  const points = table.columns.filter((column) => column.role === 'point').length;
  const errors = notes.filter(({ issue }) => issue.severity === 'error').length;
  const looks = notes.length - errors;
  const read = `${count(table.rows.length, 'size', 'sizes')}, ${count(points, 'point', 'points')}`;
  const parts = [
    ...(errors > 0 ? [count(errors, 'error to mend', 'errors to mend')] : []),
    ...(looks > 0 ? [count(looks, 'place to look at', 'places to look at')] : []),
  ];
  return parts.length === 0 ? `${read}; all of it was understood.` : `${read}; ${parts.join(' and ')}.`;
}

const count = (many: number, one: string, more: string) => `${many} ${many === 1 ? one : more}`;
