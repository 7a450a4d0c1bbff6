import type { TableEdit } from '../../../shared/patterns/edits.schema.ts';
import type { TypedTable } from '../../../shared/patterns/typed-cells.ts';

/** A typed table as it is sent; null where a line has no point yet. */
export function sendable({ sizes, chart, finished }: TypedTable): Omit<TableEdit, 'basedOn'> | null {
  const lines = (columns: TypedTable['chart']) =>
    columns.flatMap(({ point, unit, typed }) =>
      point === null ? [] : [{ point, unit, typed: sizes.map((_, at) => typed[at] ?? '') }],
    );
  const sent = { sizes: [...sizes], chart: lines(chart), finished: lines(finished) };
  const isWhole = sent.chart.length === chart.length && sent.finished.length === finished.length;
  return isWhole ? sent : null;
}
