import type { FitInput, FitPlan, Measured, SizeRow } from '../../shared/fit/fit.schema.ts';
import type { PatternTable } from '../../shared/patterns/patterns.schema.ts';
import type { PointId } from '../../shared/points/point-ids.ts';

/** One inch in mm. */
export const INCH = 25.4;

type Lengths = Partial<Record<PointId, number>>;

/** Lengths given in inches, in mm. */
export function inches(lengths: Lengths): Lengths {
  return Object.fromEntries(Object.entries(lengths).map(([point, value]) => [point, value * INCH]));
}

/**
 * The invented pattern of the fitter's cases: sizes 12, 14, 16 … at bust 34, 36, 38 …, waist 26½, 28, 30 …, hip 36, 38,
 * 40 … in. `ease` (in) makes finished measurements.
 */
export function caseSizes(points: readonly PointId[], ease?: Lengths, count = 6): SizeRow[] {
  const charts: Partial<Record<PointId, (size: number) => number>> = {
    bust: (size) => 34 + 2 * size,
    waist: (size) => (size === 0 ? 26.5 : 26 + 2 * size),
    hip: (size) => 36 + 2 * size,
  };
  return Array.from({ length: count }, (_, size) => {
    const body: Lengths = {};
    const finished: Lengths = {};
    for (const point of points) {
      const chart = charts[point]?.(size);
      if (chart === undefined) throw new Error(`the case has no ${point}`);
      body[point] = chart * INCH;
      const room = ease?.[point];
      if (room !== undefined) finished[point] = (chart + room) * INCH;
    }
    return { label: String(12 + 2 * size), body, finished };
  });
}

/** The sizes of an imported table, as the engine takes them. */
export function sizesOf(table: PatternTable): SizeRow[] {
  return table.sizes.map((label, at) => {
    const body: Partial<Record<PointId, Measured>> = {};
    for (const { point, mm } of table.chart) {
      const value = mm[at];
      if (value !== null && value !== undefined) body[point] = value;
    }
    return { label, body, finished: {} };
  });
}

/** The body a size is drafted for; of ranges the middle. */
export function bodyOf(row: SizeRow): Lengths {
  return Object.fromEntries(
    Object.entries(row.body).map(([point, value]) => [
      point,
      typeof value === 'number' ? value : (value.low + value.high) / 2,
    ]),
  );
}

/** Adds finished measurements: the chart and so much ease, in mm. */
export function withEase(sizes: readonly SizeRow[], easeMm: (point: PointId) => number): SizeRow[] {
  return sizes.map((row) => ({
    ...row,
    finished: Object.fromEntries(
      Object.entries(bodyOf(row)).map(([point, value]) => [point, value + easeMm(point as PointId)]),
    ),
  }));
}

/** A woven garment, closed, measured by oneself, unless said otherwise. */
export function fitInput(
  garment: FitInput['garment'],
  sizes: SizeRow[],
  body: Lengths,
  more: Partial<FitInput> = {},
): FitInput {
  return { garment, fabric: { structure: 'woven' }, sizes, body, ...more };
}

/** The label of each planned zone: `{ bust: '14', waist: '16' }`. */
export function labels(plan: Pick<FitPlan, 'zones'>): Partial<Record<string, string>> {
  return Object.fromEntries(plan.zones.map(({ zone, size }) => [zone, size.label]));
}

/** Freezes everything below, so that a test fails where anything is written to. */
export function deepFreeze<T>(value: T): T {
  if (typeof value === 'object' && value !== null && !Object.isFrozen(value)) {
    Object.freeze(value);
    Object.values(value).forEach((inner) => void deepFreeze(inner));
  }
  return value;
}
