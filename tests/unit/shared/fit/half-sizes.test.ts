import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodyPositions } from '../../../../shared/fit/body-position.ts';
import { GARMENT_KINDS, SILHOUETTES } from '../../../../shared/fit/fit-words.ts';
import type { FitInput, SizeRow } from '../../../../shared/fit/fit.schema.ts';
import { garmentPoints, joinLimits } from '../../../../shared/fit/garments.ts';
import { easeProfile, evaluateAt, planFit } from '../../../../shared/fit/plan-fit.ts';
import type { PointId } from '../../../../shared/points/point-ids.ts';
import { bodyOf, caseSizes, fitInput, inches, labels, withEase } from '../../../support/fit-tables.ts';

const DRESS = { kind: 'dress', silhouette: 'fitted' } as const;
const POINTS = ['bust', 'waist', 'hip'] as const;
// Sizes 12, 14, 16 … at bust 34, 36, 38 … in (the pattern of the fitter's cases).
const SIZES = caseSizes(POINTS, { bust: 3, waist: 1.5, hip: 3 });
const BETWEEN = { cutBetweenLines: true } as const;
const positions = (input: FitInput) =>
  Object.fromEntries(planFit(input).zones.map(({ zone, size }) => [zone, size.position]));

/** Three places on the size scale, evenly drawn to a hundredth of a size. */
const placesBetween = (min: number, max: number) =>
  fc
    .array(fc.integer({ min: min * 100, max: max * 100 }), { minLength: 3, maxLength: 3 })
    .map((all) => all.map((n) => n / 100));

/** The body half-way between a size and the next. */
function bodyBetween(smaller: SizeRow | undefined, larger: SizeRow | undefined): FitInput['body'] {
  const [a, b] = [bodyOf(smaller ?? SIZES[0]!), bodyOf(larger ?? SIZES[0]!)];
  return Object.fromEntries(
    Object.entries(a).map(([point, mm]) => [point, (mm + (b[point as PointId] ?? NaN)) / 2]),
  );
}

describe('cut between the lines', () => {
  const MIDWAY = bodyBetween(SIZES[2], SIZES[3]);

  it.each<[where: string, input: FitInput]>([
    ['first', { ...BETWEEN, ...fitInput(DRESS, SIZES, MIDWAY) }],
    [
      'in the middle',
      { garment: DRESS, fabric: { structure: 'woven' }, ...BETWEEN, sizes: SIZES, body: MIDWAY },
    ],
    ['last', fitInput(DRESS, SIZES, MIDWAY, BETWEEN)],
  ])('is heard wherever it is written: %s', (_where, input) => {
    const plan = planFit(input);
    expect(new Set(plan.zones.map(({ size }) => size.position))).toEqual(new Set([2.5]));
    expect(plan.zones[0]?.size).toEqual({
      label: '16–18',
      position: 2.5,
      between: { smaller: '16', larger: '18' },
    });
    expect(planFit({ ...input, cutBetweenLines: false }).zones[0]?.size).toEqual({
      label: '18',
      position: 3,
    });
  });

  it.each([0, 2, 4])(
    'is planned between the first two sizes, in the middle and between the last two: %d',
    (at) => {
      const plan = planFit(fitInput(DRESS, SIZES, bodyBetween(SIZES[at], SIZES[at + 1]), BETWEEN));
      expect(new Set(plan.zones.map(({ size }) => size.position))).toEqual(new Set([at + 0.5]));
      expect(plan.options[0]?.cost).toBe(0);
    },
  );

  it('gives a body half-way between two rows everywhere the half, at no deviation, in every kind and silhouette', () => {
    const stray: string[] = [];
    let judged = 0;
    for (const kind of GARMENT_KINDS) {
      for (const silhouette of SILHOUETTES) {
        const points = [...new Set(garmentPoints(kind, silhouette).map(({ point }) => point))];
        const row = (size: number): SizeRow => ({
          label: `S${size}`,
          body: Object.fromEntries(
            points.map((point, index) => [point, 300 + 40 * index + (20 + index) * size]),
          ),
          finished: {},
        });
        const chart = [0, 1, 2, 3].map(row);
        const plan = planFit(
          fitInput(
            { kind, silhouette },
            withEase(chart, () => 120),
            bodyBetween(chart[1], chart[2]),
            BETWEEN,
          ),
        );
        judged += plan.points.length;
        for (const { point, size, deviationMm, verdict } of plan.points) {
          if (size.position !== 1.5 || deviationMm !== 0 || verdict !== 'asDrafted')
            stray.push(`${kind} ${silhouette} ${point}: ${size.label}, ${String(deviationMm)}, ${verdict}`);
        }
      }
    }
    expect(stray).toEqual([]);
    expect(judged).toBeGreaterThan(500);
  });

  it('never goes beyond the first size or the last, however far the body does', () => {
    const small = planFit(fitInput(DRESS, SIZES, inches({ bust: 30, waist: 22, hip: 32 }), BETWEEN));
    const large = planFit(fitInput(DRESS, SIZES, inches({ bust: 50, waist: 42, hip: 52 }), BETWEEN));
    expect(new Set(small.zones.map(({ size }) => size.position))).toEqual(new Set([0]));
    expect(new Set(large.zones.map(({ size }) => size.position))).toEqual(new Set([5]));
    expect([small.status, large.status]).toEqual(['outOfRange', 'outOfRange']);
    const whole = planFit(fitInput(DRESS, SIZES, inches({ bust: 50, waist: 42, hip: 52 })));
    expect(large.cautions).toEqual(whole.cautions);
  });

  it('has nothing between in a pattern of one size', () => {
    const input = fitInput(DRESS, SIZES.slice(2, 3), inches({ bust: 39, waist: 31, hip: 41 }));
    expect(planFit({ ...input, ...BETWEEN })).toEqual(planFit(input));
  });
});

describe('a half step', () => {
  it('costs its join 0.6 and a fifth of the square of half a size', () => {
    const body = { ...bodyOf(SIZES[1]!), hip: bodyBetween(SIZES[1], SIZES[2]).hip! };
    const plan = planFit(fitInput(DRESS, SIZES, body, BETWEEN));
    expect(labels(plan)).toMatchObject({ bust: '14', waist: '14', hip: '14–16' });
    expect(plan.options[0]?.cost).toBeCloseTo(0.6 + 0.2 * 0.25, 12);
  });

  it('is left where half a size off costs less than a line more', () => {
    // A fitted point a quarter size from a line costs (0.25 / 0.5)² = 0.25 or less: no join is worth it.
    const quarter = (bodyOf(SIZES[1]!).hip! * 3 + bodyOf(SIZES[2]!).hip!) / 4;
    const plan = planFit(fitInput(DRESS, SIZES, { ...bodyOf(SIZES[1]!), hip: quarter }, BETWEEN));
    expect(plan.options.map(({ kind }) => kind)[0]).toBe('oneSize');
  });

  it('counts as half against the limits of the joins, which stay in sizes', () => {
    const limits = joinLimits('dress');
    fc.assert(
      fc.property(placesBetween(0, 5), (at) => {
        const body = inches({ bust: 34 + 2 * at[0]!, waist: 26 + 2 * at[1]!, hip: 36 + 2 * at[2]! });
        const planned = positions(fitInput(DRESS, SIZES, body, BETWEEN));
        for (const { from, to, limit } of limits) {
          expect(Math.abs((planned[from] ?? 0) - (planned[to] ?? 0))).toBeLessThanOrEqual(limit);
        }
      }),
      { numRuns: 300, seed: 1898 },
    );
    const inverted = inches({ bust: 42, waist: 27, hip: 36 });
    const planned = positions(fitInput(DRESS, SIZES, inverted, { ...BETWEEN, held: { waist: 1.5 } }));
    expect(planned['bust']).toBe(3.5);
  });

  it('is as drafted up to half a whole size, by the distance between the two sizes it lies between', () => {
    // Chart only, so nothing but the step counts: 20 mm below the middle size, 60 mm above it.
    const sizes = [900, 920, 980].map((bust, at): SizeRow => ({
      label: `S${at}`,
      body: { bust },
      finished: {},
    }));
    const verdictAt = (bust: number, position: number) =>
      evaluateAt(fitInput(DRESS, sizes, { bust }, BETWEEN), { bust: position })[0]?.verdict;
    expect([verdictAt(979, 1.5), verdictAt(981, 1.5)]).toEqual(['asDrafted', 'closer']);
    expect([verdictAt(921, 1.5), verdictAt(919, 1.5)]).toEqual(['asDrafted', 'looser']);
    expect([verdictAt(919, 0.5), verdictAt(921, 0.5)]).toEqual(['asDrafted', 'closer']);
  });

  it('beside a whole size of another grade still leaves the nearer to win', () => {
    const sizes = [900, 920, 980].map((bust, at): SizeRow => ({
      label: `S${at}`,
      body: { bust },
      finished: {},
    }));
    const at = (bust: number) => positions(fitInput(DRESS, sizes, { bust }, BETWEEN))['bust'];
    expect([904, 906, 914, 916, 934, 936, 964, 966].map(at)).toEqual([0, 0.5, 0.5, 1, 1, 1.5, 1.5, 2]);
  });
});

describe('a tie', () => {
  it('between a size and a half is the size’s: its line is printed', () => {
    const at = (share: number) => {
      const [a, b] = [bodyOf(SIZES[1]!), bodyOf(SIZES[2]!)];
      const body = Object.fromEntries(
        POINTS.map((point) => [point, a[point]! + share * (b[point]! - a[point]!)]),
      );
      return new Set(Object.values(positions(fitInput(DRESS, SIZES, body, BETWEEN))));
    };
    expect(at(0.25)).toEqual(new Set([1]));
    expect(at(0.26)).toEqual(new Set([1.5]));
    expect(at(0.74)).toEqual(new Set([1.5]));
    expect(at(0.75)).toEqual(new Set([2]));
  });

  it('of ranges is the size’s whose range the body is in, and on a shared end the larger’s', () => {
    const sizes = [800, 840, 880, 920].map((low, at): SizeRow => ({
      label: `S${at}`,
      body: { bust: { low, high: low + 40 } },
      finished: {},
    }));
    const plan = (bust: number) => planFit(fitInput(DRESS, sizes, { bust }, BETWEEN));
    const at = (bust: number) => plan(bust).zones.find(({ zone }) => zone === 'bust')?.size.position;
    expect([801, 820, 839, 841, 879, 959].map(at)).toEqual([0, 0, 0, 1, 1, 3]);
    expect([840, 880, 920].map(at)).toEqual([1, 2, 3]);
    expect(plan(880).reasons).toContainEqual({ code: 'tieToLarger', zone: 'bust', point: 'bust' });
  });
});

describe('half sizes beside whole ones', () => {
  it('never cost more than whole sizes alone, and are chosen', () => {
    let halves = 0;
    const kinds = fc.constantFrom(DRESS, { kind: 'trousers' } as const, { kind: 'skirt' } as const);
    const places = placesBetween(-1, 6);
    fc.assert(
      fc.property(kinds, places, fc.boolean(), (garment, [bust = 0, waist = 0, hip = 0], isChart) => {
        const body = inches({ bust: 34 + 2 * bust, waist: 26 + 2 * waist, hip: 36 + 2 * hip });
        const input = fitInput(garment, isChart ? caseSizes(POINTS) : SIZES, body);
        const between = planFit({ ...input, ...BETWEEN });
        const cost = (plan: typeof between) => plan.options[0]?.cost ?? NaN;
        expect(cost(between)).toBeLessThanOrEqual(cost(planFit(input)) + 1e-9);
        if (between.zones.some(({ size }) => size.between)) halves++;
      }),
      { numRuns: 500, seed: 1604 },
    );
    expect(halves).toBeGreaterThan(200);
  });

  it('change nothing in where the body stands, nor in the ease of every whole size', () => {
    const input = fitInput(DRESS, SIZES, inches({ bust: 35, waist: 29, hip: 41 }));
    expect(bodyPositions({ ...input, ...BETWEEN })).toEqual(bodyPositions(input));
    expect(easeProfile({ ...input, ...BETWEEN })).toEqual(easeProfile(input));
  });

  it('let a point abstain that falls or is not given everywhere, as before', () => {
    const sizes = SIZES.map((row, at) => ({
      ...row,
      body: { ...row.body, neck: 400 - at, ...(at !== 2 && { upperBust: 800 + 40 * at }) },
    }));
    const body = { ...inches({ bust: 35, waist: 27, hip: 37 }), neck: 390, upperBust: 830 };
    const input = fitInput(DRESS, sizes, body);
    const codes = (more: Partial<FitInput>) =>
      planFit({ ...input, ...more }).cautions.map(({ code }) => code);
    expect(codes(BETWEEN)).toEqual(expect.arrayContaining(['chartFalls', 'givenAtSomeSizes']));
    expect(codes({})).toEqual(expect.arrayContaining(['chartFalls', 'givenAtSomeSizes']));
  });
});

describe('held and evaluated half sizes', () => {
  const OWN = bodyOf(SIZES[2]!);

  it.each([
    ['neck', 0.5],
    ['bust', 2.5],
    ['hem', 4.5],
  ] as const)('are held at the %s, at %d', (zone, position) => {
    const plan = planFit(fitInput(DRESS, SIZES, OWN, { ...BETWEEN, held: { [zone]: position } }));
    expect(plan.zones.find((found) => found.zone === zone)?.size.position).toBe(position);
    expect(plan.reasons).toContainEqual({ code: 'held', zone });
  });

  it('are evaluated half-way between their neighbours', () => {
    const at = (position: number) =>
      evaluateAt(fitInput(DRESS, SIZES, OWN, BETWEEN), { bust: position }).find(
        ({ point }) => point === 'bust',
      );
    const [before, half, after] = [at(1), at(1.5), at(2)];
    for (const field of ['chartMm', 'finishedMm', 'easeMm', 'draftedEaseMm', 'deviationMm'] as const) {
      expect(half?.[field], field).toBeCloseTo((Number(before?.[field]) + Number(after?.[field])) / 2, 9);
    }
    expect(half?.size).toEqual({ label: '14–16', position: 1.5, between: { smaller: '14', larger: '16' } });
    expect(at(0)?.size).toEqual({ label: '12', position: 0 });
  });

  it.each<[string, number, Partial<FitInput>]>([
    ['a half where it is cut along the lines', 1.5, {}],
    ['a quarter', 1.25, BETWEEN],
    ['a half beyond the last size', 5.5, BETWEEN],
    ['a half before the first', -0.5, BETWEEN],
  ])('throw a RangeError that names the zone: %s', (_what, position, more) => {
    const input = fitInput(DRESS, SIZES, OWN, more);
    for (const call of [
      () => planFit({ ...input, held: { bust: 1, hip: position } }),
      () => evaluateAt(input, { bust: 1, hip: position }),
    ]) {
      expect(call).toThrow(RangeError);
      expect(call).toThrow('.hip');
    }
  });

  it('blend from half to half by what the garment changes between them', () => {
    const held = { bust: 1.5, waist: 2, hip: 2.5 };
    const { blends } = planFit(fitInput(DRESS, SIZES, OWN, { ...BETWEEN, held }));
    const [upper, lower] = blends.filter(({ fromZone }) => fromZone === 'bust' || fromZone === 'waist');
    expect(upper).toMatchObject({
      from: { label: '14–16', between: { smaller: '14', larger: '16' } },
      to: { label: '16', position: 2 },
    });
    expect(lower?.to.label).toBe('16–18');
    // An inch at waist and hip, over four edges.
    expect(upper?.changeMm).toBeCloseTo(25.4, 9);
    expect(lower?.changeMm).toBeCloseTo(25.4, 9);
    expect(lower?.perEdgeMm).toBeCloseTo(25.4 / 4, 9);
  });

  it('pass or do not pass by the opening half-way between', () => {
    const openings = [560, 580, 600, 620, 640, 660];
    const sizes = SIZES.map((row, at) => ({
      ...row,
      finished: { ...row.finished, neckOpening: openings[at]! },
    }));
    const input = fitInput({ ...DRESS, pullOn: true }, sizes, { ...OWN, head: 595 }, BETWEEN);
    const short = (position: number) =>
      planFit({ ...input, held: { neck: position } }).cautions.find(({ code }) => code === 'doesNotPass')
        ?.amountMm;
    expect([short(1), short(1.5), short(2)]).toEqual([15, 5, undefined]);
  });
});
