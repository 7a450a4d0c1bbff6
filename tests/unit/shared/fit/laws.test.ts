import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FitInput, SizeRow } from '../../../../shared/fit/fit.schema.ts';
import { evaluateAt, planFit } from '../../../../shared/fit/plan-fit.ts';
import type { PointId } from '../../../../shared/points/point-ids.ts';
import { deepFreeze, fitInput, labels } from '../../../support/fit-tables.ts';

const RUNS = { numRuns: 500, seed: 1898 };
const COUNT = 14;
/** First size, grade and drafted ease in mm, in an evenly graded pattern. */
const POINTS: [PointId, number, number, number][] = [
  ['neck', 330, 10, 12],
  ['upperBust', 760, 40, 50],
  ['upperArm', 260, 12, 60],
  ['bust', 780, 40, 80],
  ['waist', 600, 40, 45],
  ['hip', 840, 40, 75],
];

/** The pattern; `tables` says what it publishes. */
function pattern(tables: 'chart' | 'both', scale = (mm: number) => mm): SizeRow[] {
  return Array.from({ length: COUNT }, (_, size) => ({
    label: String(size),
    body: Object.fromEntries(POINTS.map(([point, first, grade]) => [point, scale(first + grade * size)])),
    finished:
      tables === 'chart'
        ? {}
        : Object.fromEntries(
            POINTS.map(([point, first, grade, ease]) => [point, scale(first + grade * size + ease)]),
          ),
  }));
}

/** A body by its place on the size scale at each point, up to two and a half sizes round the middle. */
const places = fc.array(fc.double({ min: -2.5, max: 2.5, noNaN: true }), { minLength: 6, maxLength: 6 });
const tables = fc.constantFrom('chart' as const, 'both' as const);
const kinds = fc.record({
  kind: fc.constantFrom('dress' as const, 'shirt' as const, 'coat' as const, 'cape' as const),
  silhouette: fc.constantFrom('close' as const, 'fitted' as const, 'loose' as const),
});

function bodyAt(shares: readonly number[], plus = 0): Partial<Record<PointId, number>> {
  return Object.fromEntries(
    POINTS.map(([point, first, grade], index) => [point, first + grade * (6 + plus + (shares[index] ?? 0))]),
  );
}

const positions = (input: FitInput) => planFit(input).zones.map(({ size }) => size.position);

describe('laws of the plan', () => {
  it('in an evenly graded woven a body plus one grade step everywhere plans one size up', () => {
    fc.assert(
      fc.property(kinds, tables, places, (garment, published, shares) => {
        const sizes = pattern(published);
        const before = positions(fitInput(garment, sizes, bodyAt(shares)));
        const after = positions(fitInput(garment, sizes, bodyAt(shares, 1)));
        expect(after).toEqual(before.map((position) => position + 1));
      }),
      RUNS,
    );
  });

  it('is the same whether lengths came in centimetres or in inches', () => {
    fc.assert(
      fc.property(kinds, tables, places, (garment, published, shares) => {
        // Through inches and back: every length is off by some units of its last binary place.
        const throughInches = (mm: number) => (mm / 25.4 / 3) * 3 * 25.4;
        const body = bodyAt(shares);
        const again = Object.fromEntries(
          Object.entries(body).map(([point, mm]) => [point, throughInches(mm)]),
        );
        const plain = planFit(fitInput(garment, pattern(published), body));
        const other = planFit(fitInput(garment, pattern(published, throughInches), again));
        expect(labels(other)).toEqual(labels(plain));
      }),
      RUNS,
    );
  });

  it('does not ask in which order points and tables are written, nor write to its input', () => {
    const turned = <T extends object>(record: T) => Object.fromEntries(Object.entries(record).reverse()) as T;
    fc.assert(
      fc.property(kinds, tables, places, (garment, published, shares) => {
        const input = deepFreeze(fitInput(garment, pattern(published), bodyAt(shares)));
        const sizes = input.sizes.map((row) => ({
          ...row,
          body: turned(row.body),
          finished: turned(row.finished),
        }));
        expect(planFit({ ...input, sizes, body: turned(input.body) })).toEqual(planFit(input));
      }),
      RUNS,
    );
  });

  it('a point added that is as drafted at the plan’s size leaves the plan as it was', () => {
    fc.assert(
      fc.property(kinds, tables, places, fc.nat(5), (garment, published, shares, which) => {
        const sizes = pattern(published);
        const added = POINTS[which]?.[0] ?? 'hip';
        const without = Object.fromEntries(
          Object.entries(bodyAt(shares)).filter(([point]) => point !== added),
        );
        const plan = planFit(fitInput(garment, sizes, without));
        const at = Object.fromEntries(plan.zones.map(({ zone, size }) => [zone, size.position]));
        const results = evaluateAt(fitInput(garment, sizes, bodyAt(shares)), at);
        const chart = results.find(({ point }) => point === added)?.chartMm;
        // A cape has no sleeve to hold an upper arm against.
        fc.pre(typeof chart === 'number');
        const input = fitInput(garment, sizes, { ...without, [added]: chart });
        expect(labels(planFit(input))).toEqual(labels(plan));
      }),
      RUNS,
    );
  });

  it('the chest rules the shoulder: neck and upper arm, however far off, move nothing but neck and sleeve', () => {
    const far = fc.double({ min: -6, max: 6, noNaN: true });
    fc.assert(
      fc.property(tables, places, far, far, (published, shares, neck, arm) => {
        const sizes = pattern(published);
        const garment = { kind: 'shirt', silhouette: 'fitted' } as const;
        const { neck: _neck, upperArm: _arm, ...trunk } = bodyAt(shares);
        const whole = { ...trunk, neck: 330 + 10 * (6 + neck), upperArm: 260 + 12 * (6 + arm) };
        const { neck: _n, sleeve: _s, ...planned } = labels(planFit(fitInput(garment, sizes, whole)));
        expect(labels(planFit(fitInput(garment, sizes, trunk)))).toMatchObject(planned);
      }),
      RUNS,
    );
  });

  it('where one point chooses, more of it never plans a smaller size, and the nearest size is chosen', () => {
    const hip = fc.double({ min: 800, max: 1400, noNaN: true });
    fc.assert(
      fc.property(tables, hip, hip, (published, a, b) => {
        const sizes = pattern(published);
        const sizeFor = (mm: number) =>
          positions(fitInput({ kind: 'trousers' }, sizes, { hip: mm }))[0] ?? NaN;
        expect(sizeFor(Math.max(a, b))).toBeGreaterThanOrEqual(sizeFor(Math.min(a, b)));
        const nearest = Math.min(COUNT - 1, Math.max(0, (a - 840) / 40));
        expect(Math.abs(sizeFor(a) - nearest)).toBeLessThanOrEqual(0.5 + 1e-6);
      }),
      RUNS,
    );
  });

  it('the cost of the plan is the least among its options, and no held size makes it less', () => {
    fc.assert(
      fc.property(kinds, tables, places, fc.nat(COUNT - 1), (garment, published, shares, held) => {
        const input = fitInput(garment, pattern(published), bodyAt(shares));
        const [best, ...rest] = planFit(input).options.map(({ cost }) => cost);
        for (const cost of rest) expect(cost).toBeGreaterThanOrEqual((best ?? NaN) - 0.01);
        const [round] = planFit({ ...input, held: { bust: held } }).options;
        expect(round?.cost).toBeGreaterThanOrEqual((best ?? NaN) - 0.01);
      }),
      RUNS,
    );
  });
});
