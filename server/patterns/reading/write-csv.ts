import Papa from 'papaparse';
import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import type { ChartColumn, FinishedColumn, PatternTable } from '../../../shared/patterns/patterns.schema.ts';
import { pointName } from '../../../shared/points/catalogue.ts';
import { matchHeading } from '../../../shared/points/headings.ts';
import { guardText } from '../../../shared/patterns/guard.ts';

/**
 * One table as a CSV file that reads back to the same lengths: cells as typed, each heading with its unit, and under a name
 * that is known where the one in the file was not. What a spreadsheet would run as a formula is guarded.
 */
export function writeCsv(table: PatternTable, role: TableRole): string {
  const columns: (ChartColumn | FinishedColumn)[] = role === 'chart' ? table.chart : table.finished;
  const headings = ['Size', ...columns.map((column) => headingOf(column, role))];
  const rows = table.sizes.map((label, at) => [label, ...columns.map((column) => column.typed[at] ?? '')]);
  const guarded = [headings, ...rows].map((row) => row.map(guardText));
  // The mark in front tells spreadsheets that the file is UTF-8, so that ⅜ comes through.
  return `\uFEFF${Papa.unparse(guarded, { newline: '\r\n', quotes: couldDelimit })}\r\n`;
}

/** A semicolon or a tab would need no quotation marks here, but bare ones could be taken for the delimiter. */
function couldDelimit(text: unknown): boolean {
  return typeof text === 'string' && /[;\t]/.test(text);
}

function headingOf({ heading, point, unit }: ChartColumn | FinishedColumn, role: TableRole): string {
  const candidates = [heading, pointName(point), point];
  const name = candidates.find((text) => matchHeading(text, role).point === point) ?? point;
  const written = matchHeading(name, role).unit;
  if (written === unit) return name;
  return written === null ? `${name} (${unit})` : `${point} (${unit})`;
}
