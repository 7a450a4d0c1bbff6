import type { FitInput } from '../../shared/fit/fit.schema.ts';
import { easeProfile, evaluateAt, planFit } from '../../shared/fit/plan-fit.ts';
import type { PointId } from '../../shared/points/point-ids.ts';
import type { Figure } from './figure.ts';

/** Twelve points over a jumpsuit's nine zones: first size, grade and drafted ease in mm. */
const POINTS: readonly [PointId, first: number, grade: number, ease: number][] = [
  ['neck', 340, 10, 15],
  ['upperBust', 770, 40, 60],
  ['backWidth', 320, 9, 12],
  ['upperArm', 250, 12, 55],
  ['wrist', 145, 5, 40],
  ['bust', 780, 40, 75],
  ['waist', 600, 40, 40],
  ['hip', 840, 40, 70],
  ['highHip', 780, 40, 60],
  ['thigh', 490, 22, 60],
  ['knee', 330, 12, 60],
  ['calf', 310, 12, 60],
];
const SIZES = 20;
const WARMING = 5000;
const ROUNDS = 10_000;

/** A pattern of 20 sizes and 12 points, and a body that needs a blend. */
export function benchInput(shift = 0): FitInput {
  const body: FitInput['body'] = {};
  POINTS.forEach(([point, first, grade], index) => {
    const size = 7 + shift + (index > 5 ? 2 : 0);
    body[point] = first + grade * (size + (index % 3) * 0.15);
  });
  return {
    garment: { kind: 'jumpsuit', silhouette: 'fitted' },
    fabric: { structure: 'woven' },
    takenBy: 'self',
    body,
    sizes: Array.from({ length: SIZES }, (_, size) => ({
      label: String(4 + 2 * size),
      body: Object.fromEntries(POINTS.map(([point, first, grade]) => [point, first + grade * size])),
      finished: Object.fromEntries(
        POINTS.map(([point, first, grade, ease]) => [point, first + grade * size + ease]),
      ),
    })),
  };
}

/** Measures the plan and what the fit view asks of the engine within a frame. */
export function run(): Promise<Figure[]> {
  // Several bodies and tables, made anew: nothing may be remembered from one call to the next.
  const inputs = [0, 1, 2, 3, 4].map(benchInput);
  const zones = planFit(benchInput()).zones;
  const positions = Object.fromEntries(zones.map(({ zone, size }) => [zone, size.position]));
  const reference = 'a plain loop over the same cells that adds up (body - chart)² and nothing else';
  const halves = inputs.map((input): FitInput => ({ ...input, cutBetweenLines: true }));
  const [plan, between, at, profile, plain] = medians([
    (round) => planFit(inputs[round % inputs.length] ?? benchInput()),
    (round) => planFit(halves[round % halves.length] ?? benchInput()),
    (round) => evaluateAt(inputs[round % inputs.length] ?? benchInput(), positions),
    (round) => easeProfile(inputs[round % inputs.length] ?? benchInput()),
    (round) => plainLoop(inputs[round % inputs.length] ?? benchInput()),
  ]);
  const figure = (name: string, micros: number): Figure => ({
    name,
    value: round2(micros),
    unit: 'µs',
    ratio: round2(micros / (plain ?? NaN)),
    reference,
  });
  return Promise.resolve([
    figure('planFit, 20 sizes × 12 points × 9 zones, median', plan ?? NaN),
    figure('planFit by half sizes, 39 places × 12 points × 9 zones, median', between ?? NaN),
    figure('evaluateAt, 20 sizes × 12 points × 9 zones, median', at ?? NaN),
    figure('easeProfile, 20 sizes × 12 points × 9 zones, median', profile ?? NaN),
  ]);
}

/**
 * The median time of one call of each, in µs. Each call is timed by itself and they take turns, so that what else the
 * machine does falls on all of them and out of the median.
 */
function medians(calls: ((round: number) => unknown)[]): number[] {
  const times = calls.map<number[]>(() => []);
  let empty = 0;
  for (let round = 0; round < WARMING + ROUNDS; round++) {
    calls.forEach((call, index) => {
      const start = process.hrtime.bigint();
      const answer = call(round);
      const spent = Number(process.hrtime.bigint() - start) / 1000;
      if (answer === null) empty++;
      if (round >= WARMING) times[index]?.push(spent);
    });
  }
  if (empty > 0) throw new Error('a call gave nothing');
  return times.map((all) => all.sort((a, b) => a - b)[Math.floor(all.length / 2)] ?? NaN);
}

function plainLoop(input: FitInput): number {
  let best = Infinity;
  for (const size of input.sizes) {
    let sum = 0;
    for (const [point] of POINTS) {
      const chart = size.body[point];
      const body = input.body[point];
      if (typeof chart === 'number' && body !== undefined) sum += (body - chart) ** 2;
    }
    if (sum < best) best = sum;
  }
  return best;
}

function round2(value: number): number {
  return Math.round(value * 100) / 100;
}
