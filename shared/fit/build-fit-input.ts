import type { PatternInput, PatternTable } from '../patterns/patterns.schema.ts';
import type { MeasurementSet } from '../people/people.schema.ts';
import type { PlanOptions } from '../plans/plans.schema.ts';
import { bodyForFitting } from '../points/measures.ts';
import type { PointId } from '../points/point-ids.ts';
import type { FitInput, SizeRow } from './fit.schema.ts';

/** A pattern, a table of its sizes, a person's measurements and what was set for this plan. */
export interface FitSources {
  pattern: Pick<PatternInput, 'kind' | 'silhouette' | 'structure' | 'worn' | 'seamEdges' | 'compareAs'>;
  table: {
    sizes: PatternTable['sizes'];
    chart: readonly Pick<PatternTable['chart'][number], 'point' | 'mm'>[];
    finished: readonly Pick<PatternTable['finished'][number], 'point' | 'mm'>[];
  };
  values: MeasurementSet['values'];
  takenBy: MeasurementSet['takenBy'];
  options: PlanOptions;
}

/**
 * Makes the engine's input, all in mm: of left and right the larger is fitted, the silhouette and the cloth set for the
 * plan override the pattern's, and empty cells are left out. The same on the server and in the browser.
 */
export function buildFitInput({ pattern, table, values, takenBy, options }: FitSources): FitInput {
  const measured: Partial<Record<PointId, number>> = {};
  for (const [point, value] of Object.entries(values)) measured[point as PointId] = value.mm;
  const { fabric, silhouette, ...rest } = options;
  return {
    garment: {
      kind: pattern.kind,
      silhouette: silhouette ?? pattern.silhouette,
      worn: pattern.worn,
      seamEdges: pattern.seamEdges,
      compareAs: pattern.compareAs,
    },
    fabric: fabric ?? { structure: pattern.structure },
    body: bodyForFitting(measured),
    takenBy,
    sizes: table.sizes.map((label, position) => sizeRow(label, position, table)),
    ...rest,
  };
}

function sizeRow(label: string, position: number, table: FitSources['table']): SizeRow {
  const row: SizeRow = { label, body: {}, finished: {} };
  for (const { point, mm } of table.chart) {
    const value = mm[position];
    if (value !== undefined && value !== null) row.body[point] = value;
  }
  for (const { point, mm } of table.finished) {
    const value = mm[position];
    if (value !== undefined && value !== null) row.finished[point] = value;
  }
  return row;
}
