import type { FitInput, Measured } from '../../shared/fit/fit.schema.ts';
import type { ZoneId } from '../../shared/fit/fit-words.ts';
import type { PointId } from '../../shared/points/point-ids.ts';

/** A point of a fitted dress: where it lies, its weight, twice its tape error and its wearing ease in mm. */
interface PlainPoint {
  point: PointId;
  zone: ZoneId;
  weight: number;
  leastStep: number;
  wearing: number | null;
  target: number | null;
  /** Neck and sleeve hang on the shoulder: they and their joins count for little in the whole; a width for a tenth. */
  share: number;
}

const IN = 25.4;
const POINTS: PlainPoint[] = [
  { point: 'neck', zone: 'neck', weight: 1, leastStep: 10, wearing: null, target: null, share: 1e-3 },
  {
    point: 'upperBust',
    zone: 'shoulder',
    weight: 2,
    leastStep: 20,
    wearing: null,
    target: null,
    share: 1,
  },
  { point: 'backWidth', zone: 'shoulder', weight: 1, leastStep: 10, wearing: null, target: null, share: 0.1 },
  { point: 'upperArm', zone: 'sleeve', weight: 1, leastStep: 10, wearing: 2 * IN, target: null, share: 1e-3 },
  { point: 'bust', zone: 'bust', weight: 2, leastStep: 20, wearing: 1.5 * IN, target: 3.5 * IN, share: 1 },
  { point: 'waist', zone: 'waist', weight: 1, leastStep: 20, wearing: 0.75 * IN, target: null, share: 1 },
  { point: 'hip', zone: 'hip', weight: 1, leastStep: 20, wearing: 2 * IN, target: null, share: 1 },
];
const JOINS: [from: ZoneId, to: ZoneId, limit: number, share: number][] = [
  ['shoulder', 'neck', 2, 1e-3],
  ['shoulder', 'sleeve', 1, 1e-3],
  ['shoulder', 'bust', 1, 1],
  ['bust', 'waist', 2, 1],
  ['waist', 'hip', 3, 1],
];
const ZONES = [...new Set(POINTS.map(({ zone }) => zone))];

/** The point ids that the plain plan knows. */
export const PLAIN_POINTS = POINTS.map(({ point }) => point);

const low = (value: Measured) => (typeof value === 'number' ? value : value.low);
const high = (value: Measured) => (typeof value === 'number' ? value : value.high);
const middle = (value: Measured) => (low(value) + high(value)) / 2;

/** Between two values the mean, of ranges end by end; none unless both are there. */
function between(a: Measured | undefined, b: Measured | undefined): Measured | undefined {
  if (a === undefined || b === undefined) return undefined;
  if (typeof a === 'number' && typeof b === 'number') return (a + b) / 2;
  return { low: (low(a) + low(b)) / 2, high: (high(a) + high(b)) / 2 };
}

/** A column at every size, or with the half sizes between them where it is cut between the lines. */
function everyPlace(
  input: FitInput,
  column: (size: FitInput['sizes'][number]) => Measured | undefined,
): (Measured | undefined)[] {
  const values = input.sizes.map(column);
  if (input.cutBetweenLines !== true) return values;
  return values.flatMap((value, at) => (at === 0 ? [value] : [between(values[at - 1], value), value]));
}

/**
 * The least cost of any plan of a fitted dress, by trying every one: the design's formulas written down once more, as
 * plainly as can be and apart from the engine, for the points above. Null where no point chooses.
 */
export function plainLeastCost(input: FitInput): number | null {
  const measured = POINTS.filter((point) => isShared(input, point));
  if (!measured.some((point) => choosesAt(input, point))) return null;
  const speaks = new Set(
    measured.filter((point) => choosesAt(input, point) || point.wearing !== null).map(({ zone }) => zone),
  );
  const perSize = input.cutBetweenLines === true ? 2 : 1;
  const places = Array.from(
    { length: (input.sizes.length - 1) * perSize + 1 },
    (_, place) => place / perSize,
  );
  const costs = measured.map((point) => places.map((place) => plainCost(input, point, place)));
  let least = Infinity;
  for (const taken of assignments(places.length)) {
    const at = Object.fromEntries(ZONES.map((zone, index) => [zone, taken[index] ?? 0])) as Record<
      ZoneId,
      number
    >;
    if (!follows(speaks, at)) continue;
    let cost = 0;
    for (const [from, to, limit, share] of JOINS) {
      const apart = Math.abs(at[from] - at[to]) / perSize;
      cost += apart > limit ? Infinity : apart === 0 ? 0 : share * (0.6 + 0.2 * apart ** 2);
    }
    if (cost >= least) continue;
    measured.forEach(({ zone }, index) => (cost += costs[index]?.[at[zone]] ?? NaN));
    least = Math.min(least, cost);
  }
  return least;
}

/** A zone at an end without a point follows the zone that leads to it. */
function follows(speaks: ReadonlySet<ZoneId>, at: Record<ZoneId, number>): boolean {
  if (!speaks.has('neck') && at.neck !== at.shoulder) return false;
  if (!speaks.has('sleeve') && at.sleeve !== at.shoulder) return false;
  if (!speaks.has('hip') && at.hip !== at.waist) return false;
  return speaks.has('waist') || speaks.has('hip') || at.waist === at.bust;
}

function isShared(input: FitInput, { point }: PlainPoint): boolean {
  const given = input.sizes[0];
  return input.body[point] !== undefined && (given?.body[point] ?? given?.finished[point]) !== undefined;
}

function choosesAt(input: FitInput, { point, target }: PlainPoint): boolean {
  return input.sizes[0]?.body[point] !== undefined || target !== null;
}

function plainCost(input: FitInput, plain: PlainPoint, s: number): number {
  const { point, wearing, target } = plain;
  const perSize = input.cutBetweenLines === true ? 2 : 1;
  const charts = input.sizes.map((size) => size.body[point]);
  const sewn = input.sizes.map((size) => size.finished[point]);
  const body = input.body[point] ?? NaN;
  const chart = everyPlace(input, (size) => size.body[point])[s * perSize];
  const sewnHere = everyPlace(input, (size) => size.finished[point])[s * perSize];
  const garment = sewnHere === undefined ? undefined : middle(sewnHere);
  const liked = body + (input.preferenceMm?.[point] ?? 0);
  let deviation: number | null = null;
  if (chart !== undefined) {
    deviation = liked > high(chart) ? liked - high(chart) : liked < low(chart) ? liked - low(chart) : 0;
  } else if (target !== null && garment !== undefined) deviation = liked + target - garment;
  const scale = charts.map((value, index) => (value === undefined ? (sewn[index] ?? NaN) : middle(value)));
  // Between two sizes both neighbours are those two: the distance between them on either side.
  const gap = (from: number, to: number) =>
    from < 0 || to >= scale.length ? Infinity : (scale[to] ?? NaN) - (scale[from] ?? NaN);
  const isWhole = Number.isInteger(s);
  const down = isWhole ? gap(s - 1, s) : gap(Math.floor(s), Math.ceil(s));
  const up = isWhole ? gap(s, s + 1) : down;
  const side = (deviation ?? 0) < 0 ? [down, up] : [up, down];
  const step = Math.max(plain.leastStep, side.find((gap) => gap !== Infinity) ?? 50);
  const capped = chart !== undefined && garment !== undefined ? garment - high(chart) : Infinity;
  const floor = wearing === null ? null : Math.min(wearing, capped);
  const meant = chart !== undefined && garment !== undefined ? garment - middle(chart) : null;
  const aim = meant ?? (chart === undefined ? target : null);
  const half = aim === null ? step / 2 : Math.max(step, aim - Math.max(floor ?? 0, -0.05 * body)) / 2;
  const share = Math.abs(deviation ?? 0) / half;
  const missing = floor === null || garment === undefined ? 0 : Math.max(0, floor - (garment - body));
  return plain.share * (plain.weight * share ** 2 + 20 * (missing / step) ** 2);
}

function* assignments(states: number): Generator<number[]> {
  const count = states ** ZONES.length;
  for (let n = 0; n < count; n++) {
    yield ZONES.map((_, index) => Math.floor(n / states ** index) % states);
  }
}
