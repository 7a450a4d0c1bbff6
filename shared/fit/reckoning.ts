import { doubles } from '../numeric/doubles.ts';
import type { PointId } from '../points/point-ids.ts';
import { fitGarment } from './fit-garment.ts';
import type { FitGarment, FitPoint } from './fit-garment.ts';
import type { FitInput } from './fit.schema.ts';
import { reckonSizes } from './reckon-sizes.ts';

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

/** Reckons every shared point at every size; the input must have been checked. */
export function reckon(input: FitInput): Reckoning {
  const { kind, silhouette, worn, compareAs } = input.garment;
  const garment = fitGarment(kind, silhouette, worn);
  const reckoning = emptyReckoning(garment, input.sizes.length);
  for (const spec of garment.points) {
    const bodyPoint = compareAs?.[spec.point] ?? spec.point;
    const bodyMm = input.body[bodyPoint];
    if (bodyMm === undefined) {
      if (spec.role !== 'loose' && isGiven(input, spec.point, bodyPoint)) reckoning.notMeasured.push(spec);
      continue;
    }
    const at = reckoning.points.length * reckoning.sizes;
    const found = readColumns(input, reckoning, at, spec, bodyPoint);
    if (found === null) continue;
    const chooses = found === 'both' || found === 'chart' || found === 'finished';
    const point: ReckonedPoint = { spec, case: found, at, bodyMm, bodyPoint, chooses };
    reckoning.points.push(point);
    reckonSizes(input, reckoning, point);
  }
  return reckoning;
}

function emptyReckoning(garment: FitGarment, sizes: number): Reckoning {
  const cells = garment.points.length * sizes;
  return {
    garment,
    sizes,
    points: [],
    notMeasured: [],
    chartLow: doubles(cells),
    chartHigh: doubles(cells),
    finished: doubles(cells),
    deviation: doubles(cells),
    step: doubles(cells),
    half: doubles(cells),
    floor: doubles(cells),
    deviationCost: doubles(cells),
    floorCost: doubles(cells),
  };
}

function isGiven(input: FitInput, point: PointId, bodyPoint: PointId): boolean {
  return input.sizes.some((size) => size.body[bodyPoint] !== undefined || size.finished[point] !== undefined);
}

/** Reads the two tables' columns and says which case the point is; null where the pattern does not give it. */
function readColumns(
  input: FitInput,
  reckoning: Reckoning,
  at: number,
  spec: FitPoint,
  bodyPoint: PointId,
): PointCase | null {
  const { chartLow, chartHigh, finished, sizes } = reckoning;
  let charted = 0;
  let sewn = 0;
  let chartFalls = false;
  let sewnFalls = false;
  for (let s = 0; s < sizes; s++) {
    const row = input.sizes[s];
    const chart = row?.body[bodyPoint];
    const low = chart === undefined ? NaN : typeof chart === 'number' ? chart : chart.low;
    const high = chart === undefined ? NaN : typeof chart === 'number' ? chart : chart.high;
    const garment = row?.finished[spec.point] ?? NaN;
    const i = at + s;
    chartLow[i] = low;
    chartHigh[i] = high;
    finished[i] = garment;
    if (low > 0) charted++;
    if (garment > 0) sewn++;
    if (s === 0) continue;
    // Middle against middle, as the steps are.
    if (low + high < (chartLow[i - 1] as number) + (chartHigh[i - 1] as number)) chartFalls = true;
    if (garment < (finished[i - 1] as number)) sewnFalls = true;
  }
  if (charted === 0 && sewn === 0) return null;
  if (charted > 0 ? chartFalls : sewnFalls) return 'falls';
  if (charted === sizes) return sewn === sizes ? 'both' : 'chart';
  if (charted > 0 || sewn < sizes) return 'someSizes';
  return Number.isNaN(spec.targetMm) ? 'noTarget' : 'finished';
}
