import type { PointId } from '../points/point-ids.ts';
import type { LengthUnit } from '../units.ts';

/** A point down all sizes as typed; its point may not be chosen yet while it is being written. */
export interface TypedColumn {
  point: PointId | null;
  unit: LengthUnit;
  typed: readonly string[];
}

/** Both tables as typed: each column has a cell for every size. */
export interface TypedTable {
  sizes: readonly string[];
  chart: readonly TypedColumn[];
  finished: readonly TypedColumn[];
}

/**
 * What stands at a place of a typed table, a JSON pointer into it (`/chart/2/typed/5`). An error keeps the table from being
 * saved, a caution asks for a look; `isMissing`: nothing is wrong, something is not written yet.
 */
export interface TableFinding {
  severity: 'error' | 'caution';
  pointer: string;
  words: string;
  isMissing: boolean;
}
