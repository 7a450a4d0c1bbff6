import type { Measured } from '../fit/fit.schema.ts';
import type { CellDifference, ColumnDifference, TableDifference } from './comparison.schema.ts';
import type { TableRole } from './imports.schema.ts';
import { pairSizes, type SizePair } from './pair-sizes.ts';
import type { PatternTable } from './patterns.schema.ts';

type Column = PatternTable[TableRole][number];
const ROLES = ['chart', 'finished'] as const;

/**
 * What differs between two tables, cell by cell: sizes added, removed and renamed, columns added, removed and in another unit,
 * and each cell of the sizes and points that both have, as typed and in mm. Equal or empty tables answer nothing that differs.
 */
export function compareTables(from: PatternTable, to: PatternTable): TableDifference {
  const pairs = pairSizes(from, to);
  const pairedTo = pairs.map((pair) => pair.to);
  const sizes = {
    added: to.sizes.filter((_, at) => !pairedTo.includes(at)),
    removed: from.sizes.filter((_, at) => !pairs.some((pair) => pair.from === at)),
    renamed: pairs
      .map((pair) => ({ from: from.sizes[pair.from] ?? '', to: to.sizes[pair.to] ?? '' }))
      .filter((names) => names.from !== names.to),
    isReordered: !rises(pairedTo),
  };
  const columns = ROLES.flatMap((role) => compareColumns(from[role], to[role], role));
  const isColumnsReordered = ROLES.some((role) => !rises(placesIn(from[role], to[role])));
  const cells = ROLES.flatMap((role) => compareCells(from, to, role, pairs));
  const { added, removed, renamed, isReordered } = sizes;
  const isSame =
    [added, removed, renamed, columns, cells].every((part) => part.length === 0) &&
    !isReordered &&
    !isColumnsReordered;
  return { isSame, sizes, columns, isColumnsReordered, cells };
}

const rises = (places: readonly number[]): boolean =>
  places.every((place, at) => at === 0 || place > (places[at - 1] ?? -1));

function placesIn(from: readonly Column[], to: readonly Column[]): number[] {
  return from.map(({ point }) => to.findIndex((column) => column.point === point)).filter((at) => at !== -1);
}

function compareColumns(from: readonly Column[], to: readonly Column[], role: TableRole): ColumnDifference[] {
  const removed = from
    .filter(({ point }) => !to.some((column) => column.point === point))
    .map(({ point, unit }): ColumnDifference => ({ role, point, change: 'removed', from: unit, to: null }));
  const rest = to.flatMap(({ point, unit }): ColumnDifference[] => {
    const before = from.find((column) => column.point === point);
    if (!before) return [{ role, point, change: 'added', from: null, to: unit }];
    return before.unit === unit ? [] : [{ role, point, change: 'unit', from: before.unit, to: unit }];
  });
  return [...removed, ...rest];
}

function compareCells(
  from: PatternTable,
  to: PatternTable,
  role: TableRole,
  pairs: readonly SizePair[],
): CellDifference[] {
  const columns: readonly Column[] = to[role];
  return columns.flatMap((after) => {
    const known: readonly Column[] = from[role];
    const before = known.find(({ point }) => point === after.point);
    if (!before) return [];
    return pairs.flatMap((pair): CellDifference[] => {
      const sides = { from: sideOf(before, pair.from), to: sideOf(after, pair.to) };
      const isSameLength = isSame(sides.from.mm, sides.to.mm);
      if (isSameLength && sides.from.typed === sides.to.typed) return [];
      const size = { from: from.sizes[pair.from] ?? '', to: to.sizes[pair.to] ?? '' };
      return [{ role, point: after.point, size, ...sides, isSameLength }];
    });
  });
}

function sideOf({ typed, unit, mm }: Column, at: number): CellDifference['from'] {
  return { typed: typed[at] ?? '', unit, mm: mm[at] ?? null };
}

function isSame(a: Measured | null, b: Measured | null): boolean {
  return JSON.stringify(a) === JSON.stringify(b);
}
