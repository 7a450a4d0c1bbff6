import { isGarmentPoint, pointName } from '../../../shared/points/catalogue.ts';
import { isSizeHeading, matchHeading, type HeadingMatch } from '../../../shared/points/headings.ts';
import type { PointId } from '../../../shared/points/point-ids.ts';
import type {
  ImportColumn,
  ImportCorrections,
  ImportIssue,
  TableRole,
} from '../../../shared/patterns/imports.schema.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { isBlank } from '../../../shared/patterns/read-cell.ts';
import { listed, quote, shorten } from '../../../shared/patterns/quote.ts';
import { cautionAt, errorAt } from './issues.ts';

/** The most characters that are kept of a heading. */
const HEADING_MAX = 120;

/** A column before its unit is settled: `written` is the unit that its heading states. */
export type Column = Omit<ImportColumn, 'unit'> & { written: LengthUnit | null };

export interface Columns {
  columns: Column[];
  issues: ImportIssue[];
}

/** Which row holds the headings: the first of the top rows that names a point, else the first that is not blank. Counts from 0. */
export function findHeadingRow(rows: readonly string[][], role: TableRole): number {
  const top = rows.slice(0, 12);
  const naming = top.findIndex((row) => row.length > 1 && looksLikeHeadings(row, role));
  return naming === -1 ? rows.findIndex((row) => row.some((cell) => cell !== '')) : naming;
}

/** A row that names a point in its first cell alone, with numbers after it, is a row of a table with the sizes across. */
function looksLikeHeadings(row: readonly string[], role: TableRole): boolean {
  const [first = '', ...rest] = row;
  if (rest.some((cell) => namesPoint(cell, role))) return true;
  return namesPoint(first, role) && !rest.some((cell) => /^\d/.test(cell));
}

function namesPoint(cell: string, role: TableRole): boolean {
  return matchHeading(cell, role).sureness !== 'none';
}

/** Decides what each column is, by its heading and a person's corrections. `rows` are those below the headings. */
export function decideColumns(
  headings: readonly string[],
  rows: readonly string[][],
  headingRow: number,
  role: TableRole,
  corrections: ImportCorrections,
): Columns {
  const issues: ImportIssue[] = [];
  const sizeAt = findSizeColumn(headings, role);
  const columns = headings.map((heading, at): Column => {
    const place = { row: headingRow + 1, column: at + 1 };
    const base = { column: place.column, heading: shorten(heading, HEADING_MAX) };
    if (at === sizeAt) return { ...base, role: 'size', point: null, sureness: 'exact', written: null };
    const match = matchHeading(heading, role);
    const chosen = corrections.points[String(place.column)];
    if (chosen !== undefined) {
      const taken = chosen === null ? 'ignored' : 'point';
      return { ...base, role: taken, point: chosen, sureness: 'chosen', written: match.unit };
    }
    const isEmpty = heading === '' && rows.every((row) => isBlank(row[at] ?? ''));
    if (!isEmpty) issues.push(...sayMatch(heading, match, place, role));
    const taken = match.point === null ? 'ignored' : 'point';
    return { ...base, role: taken, point: match.point, sureness: match.sureness, written: match.unit };
  });
  issues.push(...sayTables(columns, headingRow, role), ...sayTwice(columns, headingRow));
  if (sizeAt === -1) issues.push(noSizeColumn(headings[0] ?? '', headingRow));
  if (!columns.some((column) => column.role === 'point')) issues.push(noPoints(rows, headingRow, role));
  return { columns, issues };
}

/** A heading “Size” wherever it stands, else the first column; -1 where the first column is a point's. */
function findSizeColumn(headings: readonly string[], role: TableRole): number {
  const plain = headings.findIndex((heading) => /^sizes?$/i.test(heading));
  if (plain !== -1) return plain;
  const named = headings.findIndex((heading) => isSizeHeading(heading));
  if (named !== -1) return named;
  return namesPoint(headings[0] ?? '', role) ? -1 : 0;
}

function sayMatch(
  heading: string,
  match: HeadingMatch,
  place: { row: number; column: number },
  role: TableRole,
): ImportIssue[] {
  const { point } = match;
  if (point === null) return [unknown(heading, match, place)];
  const issues: ImportIssue[] = [];
  if (match.sureness === 'likely') {
    const flat = match.flat
      ? ' If it was measured across cloth laid flat, it is half of that: double it first.'
      : '';
    const words = `${quote(heading)} was taken for ${nameOf(point)}: look whether that is so.${flat}`;
    issues.push(cautionAt(place, 'likelyHeading', words));
  }
  if (match.says !== null && match.says !== role) {
    const other = match.says === 'finished' ? 'the finished measurements' : 'the size chart';
    const words = `${quote(heading)} sounds like a column of ${other}: look whether this file is in its right place.`;
    issues.push(cautionAt(place, 'otherTable', words));
  }
  return issues;
}

function unknown(heading: string, match: HeadingMatch, place: { row: number; column: number }): ImportIssue {
  if (heading === '') {
    const words = 'This column has numbers and no heading: choose its point, or leave the column out.';
    return cautionAt(place, 'noHeading', words);
  }
  if (isSizeHeading(heading)) {
    const words = `${quote(heading)} is a second column of sizes: it is left out, and the sizes keep their first names.`;
    return cautionAt(place, 'secondSizeColumn', words);
  }
  if (match.between.length > 0) {
    const names = listed(match.between.map(nameOf), 'or');
    const words = `${quote(heading)} could be ${names}: choose one, or leave the column out.`;
    return cautionAt(place, 'openHeading', words);
  }
  if (match.flat) {
    const words = `${quote(heading)} sounds like half a girth, measured across cloth laid flat, which is not read yet: double the numbers and name the point alone.`;
    return cautionAt(place, 'flatHeading', words);
  }
  const words = `${quote(heading)} is not a name of a point known here: choose its point, or leave the column out.`;
  return cautionAt(place, 'unknownHeading', words);
}

function sayTables(columns: readonly Column[], headingRow: number, role: TableRole): ImportIssue[] {
  if (role === 'finished') return [];
  return columns
    .filter((column) => column.point !== null && isGarmentPoint(column.point))
    .map(({ column, point }) =>
      cautionAt(
        { row: headingRow + 1, column },
        'garmentPointInChart',
        `Only a garment has ${point ? nameOf(point) : 'this'}: in a size chart it says nothing of the body.`,
      ),
    );
}

function sayTwice(columns: readonly Column[], headingRow: number): ImportIssue[] {
  const byPoint = new Map<PointId, number[]>();
  for (const { point, column } of columns) {
    if (point) byPoint.set(point, [...(byPoint.get(point) ?? []), column]);
  }
  return [...byPoint].flatMap(([point, places]) => {
    if (places.length < 2) return [];
    const words = `Columns ${listed(places.map(String))} were all taken for ${nameOf(point)}: keep one, and choose another point for the rest or leave them out.`;
    return places.map((column) =>
      errorAt(
        { row: headingRow + 1, column },
        'pointTwice',
        words.replace(' all', places.length === 2 ? ' both' : ' all'),
      ),
    );
  });
}

function noSizeColumn(heading: string, headingRow: number): ImportIssue {
  const words = `The first column is headed ${quote(heading)}, a point: put the names of the sizes in the first column, or head their column “Size”.`;
  return errorAt({ row: headingRow + 1, column: 1 }, 'noSizeColumn', words);
}

function noPoints(rows: readonly string[][], headingRow: number, role: TableRole): ImportIssue {
  const down = rows.filter((row) => namesPoint(row[0] ?? '', role)).length;
  if (down > 0) {
    const words =
      'The points run down and the sizes across: turn the table, so that each size has a row and each point a column.';
    return errorAt({ row: headingRow + 1 }, 'sizesAcross', words);
  }
  const words =
    'No heading names a point, such as “Bust (cm)” or “Waist”: write headings in this row, or choose a point for a column.';
  return errorAt({ row: headingRow + 1 }, 'noPoints', words);
}

function nameOf(point: PointId): string {
  return pointName(point).toLowerCase();
}
