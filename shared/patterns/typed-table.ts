import type { Measured } from '../fit/fit.schema.ts';
import type { TableRole } from './imports.schema.ts';
import { quote } from './quote.ts';
import { middleOf, readCell } from './read-cell.ts';
import type { TableFinding, TypedColumn, TypedTable } from './typed-cells.ts';
import { checkShape } from './typed-shape.ts';

/** The lengths of a typed table in mm, beside its columns and cells (null: blank or not understood), and its findings. */
export interface TableReading {
  chart: (Measured | null)[][];
  finished: (Measured | null)[][];
  findings: TableFinding[];
}

/**
 * Reads both tables cell by cell, by the same reading as a file's, in mm. It never throws: an empty table answers what is
 * missing, a cell that is no length answers null and an error at its place.
 */
export function readTypedTable(table: TypedTable): TableReading {
  const findings = checkShape(table);
  const read = (role: TableRole) =>
    table[role].map((column, at) => readColumn(table, role, column, at, findings));
  return { chart: read('chart'), finished: read('finished'), findings };
}

function readColumn(
  { sizes }: TypedTable,
  role: TableRole,
  { unit, typed }: TypedColumn,
  at: number,
  findings: TableFinding[],
): (Measured | null)[] {
  let last: { mm: number; size: string } | null = null;
  return sizes.map((size, place) => {
    const text = typed[place] ?? '';
    const read = readCell(text, unit, role);
    const pointer = `/${role}/${at}/typed/${place}`;
    const say = (severity: TableFinding['severity'], words: string) =>
      void findings.push({ severity, pointer, words, isMissing: false });
    if (read.kind === 'error') say('error', read.words);
    if (read.kind !== 'length') return null;
    if (read.unitWritten && read.unit !== unit) {
      say('caution', `${quote(text)} is read in ${read.unit}, as it says; its line is in ${unit}.`);
    }
    const mm = middleOf(read.mm);
    if (last !== null && mm < last.mm) {
      const than = last.size === '' ? 'at the size before' : `at size ${quote(last.size)} before`;
      say('caution', `This is less than ${than}: look at the number, and put the smallest size first.`);
    }
    last = { mm, size };
    return read.mm;
  });
}
