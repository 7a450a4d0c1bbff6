import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import type { TableFinding } from '../../../shared/patterns/typed-cells.ts';
import { pointName } from '../../../shared/points/catalogue.ts';
import { TABLE_NAMES } from '../table-names.ts';
import type { EditedTable, Place } from './edited-table.ts';

/** A finding as the page shows it: numbered, so that the list and the table can point at each other. */
export interface FindingNote extends TableFinding {
  number: number;
  /** The id of its line in the list. */
  id: string;
  /** The id of the cell it stands at; null where it is about a whole table. */
  targetId: string | null;
  /** Where it stands, in words. */
  where: string;
}

export const cellId = (role: TableRole, { line, size }: Place) => `${role}-line-${line}-size-${size}`;

/** The names of the sizes stand over both tables; a finding about one points at the first that is drawn. */
const namesRole = (table: EditedTable): TableRole => (table.chart.length > 0 ? 'chart' : 'finished');

/** All findings in the order of the page, errors first. */
export function noteFindings(findings: readonly TableFinding[], table: EditedTable): FindingNote[] {
  const rank = ({ severity }: TableFinding) => (severity === 'error' ? 0 : 1);
  return [...findings]
    .sort((a, b) => rank(a) - rank(b))
    .map((finding, at) => ({
      ...finding,
      number: at + 1,
      id: `finding-${at + 1}`,
      ...placeOf(finding.pointer, table),
    }));
}

/** The notes at each cell, by its id. */
export function notesByCell(notes: readonly FindingNote[]): ReadonlyMap<string, readonly FindingNote[]> {
  const found = new Map<string, FindingNote[]>();
  for (const note of notes) {
    if (note.targetId !== null) found.set(note.targetId, [...(found.get(note.targetId) ?? []), note]);
  }
  return found;
}

function placeOf(pointer: string, table: EditedTable): Pick<FindingNote, 'targetId' | 'where'> {
  const [, part = '', first = '', kind = '', second = ''] = pointer.split('/');
  if (part === 'sizes' && first !== '') {
    const size = Number(first);
    const place = { line: -1, size };
    return { targetId: cellId(namesRole(table), place), where: saySize(table, size) };
  }
  if (part !== 'chart' && part !== 'finished') return { targetId: null, where: 'the sizes' };
  if (first === '') return { targetId: null, where: TABLE_NAMES[part] };
  const place = { line: Number(first), size: kind === 'typed' ? Number(second) : -1 };
  return { targetId: cellId(part, place), where: sayPlace(table, part, place) };
}

/** “size 12”; one without a name yet by its place, counted from 1. */
export function saySize(table: EditedTable, at: number): string {
  const name = table.sizes[at]?.name ?? '';
  return name === '' ? `size no. ${at + 1}` : `size ${name}`;
}

/** “Bust girth”, or the line counted from 1 where its point is not chosen. */
export function sayLine(table: EditedTable, role: TableRole, line: number): string {
  const point = table[role][line]?.point ?? null;
  return point === null ? `line ${line + 1}` : pointName(point);
}

/** Where a cell stands, as one would say it: “Bust girth, size 12”. */
export function sayPlace(table: EditedTable, role: TableRole, { line, size }: Place): string {
  if (line < 0) return `the name of ${saySize(table, size)}`;
  if (size < 0) return sayLine(table, role, line);
  return `${sayLine(table, role, line)}, ${saySize(table, size)}`;
}
