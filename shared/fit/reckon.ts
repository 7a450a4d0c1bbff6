import { doubles } from '../numeric/doubles.ts';
import type { PointId } from '../points/point-ids.ts';
import { latticeRows, placesPerSize } from './between-lines.ts';
import { fitGarment } from './fit-garment.ts';
import type { FitGarment, FitPoint } from './fit-garment.ts';
import type { FitInput, SizeRow } from './fit.schema.ts';
import { reckonSizes } from './reckon-sizes.ts';
import type { PointCase, ReckonedPoint, Reckoning } from './reckoning.ts';

/** Reckons every shared point at every place, or at whole sizes only if asked; the input must have been checked. */
export function reckon(input: FitInput, perSize: 1 | 2 = placesPerSize(input)): Reckoning {
  const { kind, silhouette, worn, compareAs } = input.garment;
  const garment = fitGarment(kind, silhouette, worn);
  const measured: [spec: FitPoint, bodyPoint: PointId, bodyMm: number][] = [];
  const notMeasured: FitPoint[] = [];
  for (const spec of garment.points) {
    const bodyPoint = compareAs?.[spec.point] ?? spec.point;
    const bodyMm = input.body[bodyPoint];
    if (bodyMm !== undefined) measured.push([spec, bodyPoint, bodyMm]);
    else if (spec.role !== 'loose' && isGiven(input, spec.point, bodyPoint)) notMeasured.push(spec);
  }
  const reckoning = emptyReckoning(
    garment,
    latticeRows(input.sizes, perSize),
    perSize,
    measured.length,
    notMeasured,
  );
  for (const [spec, bodyPoint, bodyMm] of measured) {
    const at = reckoning.points.length * reckoning.places;
    const found = readColumns(reckoning, at, spec, bodyPoint);
    if (found === null) continue;
    const chooses = found === 'both' || found === 'chart' || found === 'finished';
    const point: ReckonedPoint = { spec, case: found, at, bodyMm, bodyPoint, chooses };
    reckoning.points.push(point);
    reckonSizes(input, reckoning, point);
  }
  return reckoning;
}

function emptyReckoning(
  garment: FitGarment,
  rows: readonly SizeRow[],
  perSize: 1 | 2,
  points: number,
  notMeasured: FitPoint[],
): Reckoning {
  const cells = points * rows.length;
  return {
    garment,
    places: rows.length,
    perSize,
    rows,
    points: [],
    notMeasured,
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
  for (const size of input.sizes) {
    if (size.body[bodyPoint] !== undefined || size.finished[point] !== undefined) return true;
  }
  return false;
}

/** Reads the two tables' columns and says which case the point is; null where the pattern does not give it. */
function readColumns(reckoning: Reckoning, at: number, spec: FitPoint, bodyPoint: PointId): PointCase | null {
  const { chartLow, chartHigh, finished, places, perSize, rows } = reckoning;
  const { point } = spec;
  let charted = 0;
  let sewn = 0;
  let chartFalls = false;
  let sewnFalls = false;
  for (let s = 0; s < places; s++) {
    const row = rows[s] as SizeRow;
    const chart = row.body[bodyPoint];
    const low = chart === undefined ? NaN : typeof chart === 'number' ? chart : chart.low;
    const high = chart === undefined ? NaN : typeof chart === 'number' ? chart : chart.high;
    const garment = row.finished[point] ?? NaN;
    const i = at + s;
    chartLow[i] = low;
    chartHigh[i] = high;
    finished[i] = garment;
    if (low > 0) charted++;
    if (garment > 0) sewn++;
    if (s === 0 || s % perSize !== 0) continue;
    // Size against size, and middle against middle as the steps are.
    const b = i - perSize;
    if (low + high < (chartLow[b] as number) + (chartHigh[b] as number)) chartFalls = true;
    if (garment < (finished[b] as number)) sewnFalls = true;
  }
  if (charted === 0 && sewn === 0) return null;
  if (charted > 0 ? chartFalls : sewnFalls) return 'falls';
  if (charted === places) return sewn === places ? 'both' : 'chart';
  if (charted > 0 || sewn < places) return 'someSizes';
  return Number.isNaN(spec.targetMm) ? 'noTarget' : 'finished';
}
