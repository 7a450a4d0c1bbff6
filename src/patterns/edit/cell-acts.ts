import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import { textAt, writeAt, type Place } from './edited-table.ts';
import { sayPlace } from './finding-notes.ts';
import type { TableEditing } from './use-table-edit.ts';

/** Writes one cell or the name of one size. */
export function writeCell({ table, act }: TableEditing, role: TableRole, place: Place, written: string) {
  const text = written.trim();
  if (text === textAt(table, role, place)) return;
  const where = sayPlace(table, role, place);
  act(text === '' ? `${where} emptied.` : `${text} at ${where}.`, (current) =>
    writeAt(current, role, [{ place, text }]),
  );
}

/** Empties cells; a point's own cell has nothing to empty. */
export function clearCells({ table, act }: TableEditing, role: TableRole, places: readonly Place[]) {
  const [first] = places;
  const filled = places.filter((place) => textAt(table, role, place) !== '');
  if (first === undefined || filled.length === 0) return;
  const where = filled.length === 1 ? sayPlace(table, role, filled[0] ?? first) : `${filled.length} cells`;
  act(`${where} emptied.`, (current) =>
    writeAt(
      current,
      role,
      filled.map((place) => ({ place, text: '' })),
    ),
  );
}
