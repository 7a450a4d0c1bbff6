import type { PointId } from '../points/point-ids.ts';
import type { FitGarment, FitPoint } from './fit-garment.ts';

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

/** Every figure of every point at every size, in mm, point after point; NaN where there is none. */
export interface Reckoning {
  garment: FitGarment;
  sizes: number;
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
