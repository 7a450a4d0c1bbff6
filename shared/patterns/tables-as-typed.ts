import { pointName } from '../points/catalogue.ts';
import type { TableRole } from './imports.schema.ts';
import type { PatternTable } from './patterns.schema.ts';
import type { TypedTable } from './typed-cells.ts';
import type { TableReading } from './typed-table.ts';

/** A pattern's tables as they were typed, to be written on. */
export function typedOf({ sizes, chart, finished }: PatternTable): TypedTable {
  const plain = (columns: PatternTable[TableRole]) =>
    columns.map(({ point, unit, typed }) => ({ point, unit, typed: sizes.map((_, at) => typed[at] ?? '') }));
  return { sizes, chart: plain(chart), finished: plain(finished) };
}

/**
 * The tables of a revision from cells as typed and their lengths in mm. A heading that came with a file stays where its
 * column has the same point and unit in `before`; any other is the point's name. Columns without a point are left out.
 */
export function tableOf(typed: TypedTable, reading: TableReading, before: PatternTable | null): PatternTable {
  const columnsOf = (role: TableRole) =>
    typed[role].flatMap(({ point, unit, typed: cells }, at) => {
      if (point === null) return [];
      const known: PatternTable[TableRole] = before?.[role] ?? [];
      const same = known.find((column) => column.point === point && column.unit === unit);
      const heading = same?.heading ?? pointName(point);
      const mm = reading[role][at] ?? [];
      return [{ point, heading, unit, mm, typed: typed.sizes.map((_, place) => cells[place] ?? '') }];
    });
  return {
    sizes: [...typed.sizes],
    chart: columnsOf('chart'),
    // The reading refuses ranges among finished measurements.
    finished: columnsOf('finished').map((column) => ({
      ...column,
      mm: column.mm.map((length) => (typeof length === 'number' ? length : null)),
    })),
  };
}

/** True where two tables have the same sizes, points, units and cells as typed, in the same order. Headings do not count. */
export function isSameTyping(a: TypedTable, b: TypedTable): boolean {
  const plain = ({ sizes, chart, finished }: TypedTable) =>
    JSON.stringify([sizes, ...[chart, finished].map((columns) => columns.map(inOrder))]);
  const inOrder = ({ point, unit, typed }: TypedTable['chart'][number]) => [point, unit, typed];
  return plain(a) === plain(b);
}
