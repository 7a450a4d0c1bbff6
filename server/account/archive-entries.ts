import Papa from 'papaparse';
import { guardText } from '../../shared/patterns/guard.ts';
import type { Belongings } from './archive.store.ts';

/** One text file of the archive. */
export interface Entry {
  path: string;
  text: string;
}

export const README = `All that is yours at Leeway, as it was at one moment.

account.json             your account, where you are signed in, your access tokens by name, what was mailed to you;
                         no password and no key
people.json, people.csv  the people you sew for
measurement-sets.json    every set of measurements, as typed and in millimetres
measurement-sets.csv     the same, one line a measurement
patterns.json            your patterns with every revision of their tables
patterns.csv             your patterns, one line each
patterns/                every revision's tables as CSV; each can be imported again
plans.json, plans.csv    your saved plans
drafts.json              imports you have not finished
files.json, files/       the files you uploaded, byte for byte

Lengths are in millimetres where nothing else is said. Moments are in UTC.
In CSV files a text that a spreadsheet would take for a formula has a ' in front.
`;

/** A JSON file. */
export const jsonEntry = (path: string, value: unknown): Entry => ({
  path,
  text: `${JSON.stringify(value, null, 2)}\n`,
});

type Cell = string | number | boolean | Date | null;

/** A CSV file; the mark in front tells spreadsheets that it is UTF-8. */
export function csvEntry(path: string, headings: string[], rows: Cell[][]): Entry {
  const cells = rows.map((row) => row.map(sayCell));
  return { path, text: `\uFEFF${Papa.unparse([headings, ...cells], { newline: '\r\n' })}\r\n` };
}

function sayCell(cell: Cell): string {
  if (cell === null) return '';
  if (cell instanceof Date) return cell.toISOString();
  return typeof cell === 'string' ? guardText(cell) : String(cell);
}

export function accountFiles({ account, sessions, tokens, teacherRequest, mail }: Belongings): Entry[] {
  return [jsonEntry('account.json', { account, sessions, tokens, teacherRequest, mail })];
}

export function peopleFiles({ people, sets }: Belongings): Entry[] {
  const peopleRows = people.map((row) => [
    row.name,
    row.stage,
    row.chestWord,
    row.unit,
    row.notes,
    row.createdAt,
  ]);
  const setRows = sets.flatMap((set) =>
    Object.entries(set.values).map(([point, { typed, unit, mm }]) => [
      set.personName,
      set.takenOn,
      set.takenBy,
      point,
      typed,
      unit,
      mm,
      set.notes,
      set.id,
    ]),
  );
  return [
    jsonEntry('people.json', people.map(withoutOwner)),
    csvEntry('people.csv', ['name', 'stage', 'word', 'unit', 'notes', 'created'], peopleRows),
    jsonEntry('measurement-sets.json', sets),
    csvEntry(
      'measurement-sets.csv',
      ['person', 'taken on', 'taken by', 'point', 'as typed', 'unit', 'mm', 'notes', 'set'],
      setRows,
    ),
  ];
}

export function planFiles({ plans }: Belongings): Entry[] {
  const rows = plans.map((row) => [
    row.name,
    row.status,
    row.engine,
    row.measurementSetId,
    row.revisionId,
    row.createdAt,
  ]);
  return [
    jsonEntry('plans.json', plans.map(withoutOwner)),
    csvEntry('plans.csv', ['name', 'status', 'engine', 'measurement set', 'pattern revision', 'saved'], rows),
  ];
}

/** Everything in the archive is one person's. */
export function withoutOwner<T extends { ownerId: string }>({ ownerId: _, ...row }: T): Omit<T, 'ownerId'> {
  return row;
}
