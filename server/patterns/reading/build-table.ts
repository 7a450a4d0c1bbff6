import type { ImportTable } from '../../../shared/patterns/imports.schema.ts';
import type { PatternTable } from '../../../shared/patterns/patterns.schema.ts';

/** The tables of a revision, from both tables of a draft as understood; columns without a number are left out. */
export function buildTable(chart: ImportTable | null, finished: ImportTable | null): PatternTable {
  return {
    sizes: (chart ?? finished)?.rows.map((row) => row.label) ?? [],
    chart: chart ? columnsOf(chart) : [],
    // The reading refuses ranges among finished measurements.
    finished: finished
      ? columnsOf(finished).map((column) => ({
          ...column,
          mm: column.mm.map((length) => (typeof length === 'number' ? length : null)),
        }))
      : [],
  };
}

function columnsOf(table: ImportTable): PatternTable['chart'] {
  return table.columns.flatMap((column, at) => {
    const cells = table.rows.map((row) => row.cells[at] ?? { typed: '', mm: null });
    if (column.point === null || cells.every((cell) => cell.mm === null)) return [];
    return [
      {
        point: column.point,
        heading: column.heading,
        unit: column.unit,
        mm: cells.map((cell) => cell.mm),
        typed: cells.map((cell) => cell.typed),
      },
    ];
  });
}
