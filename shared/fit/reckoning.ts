import type { PointId } from '../points/point-ids.ts';
import type { FitGarment, FitPoint } from './fit-garment.ts';
import type { SizeRow } from './fit.schema.ts';

/**
 * What the pattern publishes at a point. `noTarget`: finished only, and the handbook has no ease to aim at; `falls`:
 * the values fall from a size to a larger one; `someSizes`: not given at every size. The last two abstain.
 */
export type PointCase = 'both' | 'chart' | 'finished' | 'noTarget' | 'falls' | 'someSizes';

/** A point that is measured on the person and given by the pattern; its figures start at `at` in the arrays. */
export interface ReckonedPoint {
  spec: FitPoint;
  case: PointCase;
  at: number;
  bodyMm: number;
  /** The body point it is held against: itself, or what the pattern says (`compareAs`). */
  bodyPoint: PointId;
  /** Whether it says by itself which size is nearest. */
  chooses: boolean;
}

/**
 * Every figure of every point at every place, in mm, point after point; NaN where there is none. Places are the sizes,
 * or the sizes and the lines half-way between them; inside the engine sizes are chosen by place, outside by position.
 */
export interface Reckoning {
  garment: FitGarment;
  /** How many places there are, and how many of them a size. */
  places: number;
  perSize: 1 | 2;
  /** What stands at each place. */
  rows: readonly SizeRow[];
  points: ReckonedPoint[];
  /** Governing or fitted points that the pattern gives and the person has not measured. */
  notMeasured: FitPoint[];
  chartLow: number[];
  chartHigh: number[];
  finished: number[];
  deviation: number[];
  step: number[];
  half: number[];
  floor: number[];
  deviationCost: number[];
  floorCost: number[];
}
