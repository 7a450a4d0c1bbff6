import { SIZES_MAX } from '../../../shared/fit/fit.schema.ts';
import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import type { TypedColumn, TypedTable } from '../../../shared/patterns/typed-cells.ts';
import type { PointId } from '../../../shared/points/point-ids.ts';
import type { LengthUnit } from '../../../shared/units.ts';

/** A size while it is edited: its name now, and its name in the revision the edit began from (null: new). */
export interface EditedSize {
  name: string;
  was: string | null;
}

/** Both tables while they are edited. Never changed in place, so that undo is one step back to what was. */
export interface EditedTable {
  sizes: readonly EditedSize[];
  chart: readonly TypedColumn[];
  finished: readonly TypedColumn[];
}

/** A cell's place: the line (a point; −1 is the line of size names) and the size (−1 is the point's own cell). */
export interface Place {
  line: number;
  size: number;
}

export function beginEdit({ sizes, chart, finished }: TypedTable): EditedTable {
  return { sizes: sizes.map((name) => ({ name, was: name })), chart, finished };
}

export function typedTable({ sizes, chart, finished }: EditedTable): TypedTable {
  return { sizes: sizes.map(({ name }) => name), chart, finished };
}

/** What stands at a place: a cell, or the name of a size. */
export function textAt(table: EditedTable, role: TableRole, { line, size }: Place): string {
  if (size < 0) return '';
  return line < 0 ? (table.sizes[size]?.name ?? '') : (table[role][line]?.typed[size] ?? '');
}

/** Writes texts at places; a place that there is not is passed over, and so is what stands there already. */
export function writeAt(
  table: EditedTable,
  role: TableRole,
  texts: readonly { place: Place; text: string }[],
): EditedTable {
  const sizes = table.sizes.map((size, at) => {
    const text = texts.findLast(({ place }) => place.line < 0 && place.size === at)?.text.trim();
    return text === undefined || text === size.name ? size : { ...size, name: text };
  });
  const lines = new Map<number, { at: number; text: string }[]>();
  for (const { place, text } of texts) {
    const line = lines.get(place.line) ?? [];
    line.push({ at: place.size, text: text.trim() });
    lines.set(place.line, line);
  }
  const columns = table[role].map((column, at) => {
    const changes = (lines.get(at) ?? []).filter(({ at: size, text }) => {
      return size >= 0 && size < table.sizes.length && (column.typed[size] ?? '') !== text;
    });
    if (changes.length === 0) return column;
    const typed = table.sizes.map((_, size) => column.typed[size] ?? '');
    for (const { at: size, text } of changes) typed[size] = text;
    return { ...column, typed };
  });
  return { ...table, sizes: keptIfSame(table.sizes, sizes), [role]: keptIfSame(table[role], columns) };
}

/** The list as it was where nothing in it changed: whatever is drawn from it is then not drawn again. */
function keptIfSame<T>(before: readonly T[], after: readonly T[]): readonly T[] {
  return after.every((item, at) => item === before[at]) ? before : after;
}

export function changeLine(
  table: EditedTable,
  role: TableRole,
  line: number,
  change: { point?: PointId; unit?: LengthUnit },
): EditedTable {
  return {
    ...table,
    [role]: table[role].map((column, at) => (at === line ? { ...column, ...change } : column)),
  };
}

/** A new, empty line; it takes the unit of the last one. */
export function addLine(table: EditedTable, role: TableRole, point: PointId | null): EditedTable {
  const unit = (table[role].at(-1) ?? table.chart.at(-1) ?? table.finished.at(-1))?.unit ?? 'cm';
  const line = { point, unit, typed: table.sizes.map(() => '') };
  return { ...table, [role]: [...table[role], line] };
}

export function removeLine(table: EditedTable, role: TableRole, line: number): EditedTable {
  return { ...table, [role]: table[role].filter((_, at) => at !== line) };
}

export function moveLine(table: EditedTable, role: TableRole, line: number, to: number): EditedTable {
  return { ...table, [role]: moved(table[role], line, to) };
}

/** A new size at a place, in both tables; the table as it was where a pattern may have no more. */
export function addSize(table: EditedTable, at: number, name = ''): EditedTable {
  if (table.sizes.length >= SIZES_MAX) return table;
  return everySize(table, { name, was: null }, '', (list, item) => list.toSpliced(at, 0, item));
}

export function removeSize(table: EditedTable, at: number): EditedTable {
  return everySize(table, { name: '', was: null }, '', (list) => list.toSpliced(at, 1));
}

export function moveSize(table: EditedTable, at: number, to: number): EditedTable {
  return everySize(table, { name: '', was: null }, '', (list) => moved(list, at, to));
}

/** Does the same to the sizes and, in both tables, to the cells of every line. */
function everySize(
  table: EditedTable,
  size: EditedSize,
  cell: string,
  act: <T>(list: readonly T[], item: T) => T[],
): EditedTable {
  const lines = (columns: readonly TypedColumn[]) =>
    columns.map((column) => ({
      ...column,
      typed: act(
        table.sizes.map((_, at) => column.typed[at] ?? ''),
        cell,
      ),
    }));
  return { sizes: act(table.sizes, size), chart: lines(table.chart), finished: lines(table.finished) };
}

function moved<T>(list: readonly T[], from: number, to: number): T[] {
  const item = list[from];
  if (item === undefined || to < 0 || to >= list.length) return [...list];
  return list.toSpliced(from, 1).toSpliced(to, 0, item);
}
