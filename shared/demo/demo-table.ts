import type { ChartColumn, FinishedColumn, PatternTable } from '../patterns/patterns.schema.ts';
import type { PointId } from '../points/point-ids.ts';
import { MM_PER, printLength, type LengthUnit } from '../units.ts';
import type { DemoCell, DemoPattern } from './demo-shapes.ts';

/** A demo pattern's tables in mm, shaped as a stored revision's are. */
export function demoTable(pattern: DemoPattern): PatternTable {
  const mm = MM_PER[pattern.unit];
  return {
    sizes: [...pattern.sizes],
    chart: columns(pattern.chart).map(([point, cells]): ChartColumn => ({
      ...columnHead(point, pattern.unit, cells),
      mm: cells.map((cell) =>
        typeof cell === 'number' ? cell * mm : { low: cell[0] * mm, high: cell[1] * mm },
      ),
    })),
    finished: columns(pattern.finished).map(([point, cells]): FinishedColumn => ({
      ...columnHead(point, pattern.unit, cells),
      mm: cells.map((cell) => cell * mm),
    })),
  };
}

/** A demo cell as a drafter would print it, in the pattern's unit: `91.5`, `36 1/8`, `91–94`. */
export function printDemoCell(cell: DemoCell, unit: LengthUnit): string {
  const mm = MM_PER[unit];
  if (typeof cell === 'number') return printLength(cell * mm, unit);
  return `${printLength(cell[0] * mm, unit)}–${printLength(cell[1] * mm, unit)}`;
}

function columnHead(point: PointId, unit: LengthUnit, cells: readonly DemoCell[]) {
  return { point, heading: point, unit, typed: cells.map((cell) => printDemoCell(cell, unit)) };
}

function columns<Cell>(table: Partial<Record<PointId, readonly Cell[]>>): [PointId, readonly Cell[]][] {
  return Object.entries(table) as [PointId, readonly Cell[]][];
}
