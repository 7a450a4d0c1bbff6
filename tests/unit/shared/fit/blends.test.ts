import { describe, expect, it } from 'vitest';
import type { FitInput, SizeRow } from '../../../../shared/fit/fit.schema.ts';
import { planFit } from '../../../../shared/fit/plan-fit.ts';
import { caseSizes, fitInput, INCH, inches } from '../../../support/fit-tables.ts';

const DRESS = { kind: 'dress', silhouette: 'fitted' } as const;
const POINTS = ['bust', 'waist', 'hip'] as const;
const PEAR = inches({ bust: 34, waist: 28, hip: 40 });
const blendsOf = (input: FitInput) => planFit(input).blends;

describe('a blend as it is cut', () => {
  it('says from which size at which level to which at the next, by how much, per edge, over what length and at what angle', () => {
    const [upper, lower] = blendsOf(fitInput(DRESS, caseSizes(POINTS), PEAR));
    expect(upper).toMatchObject({
      fromZone: 'bust',
      toZone: 'waist',
      from: { label: '12', position: 0 },
      to: { label: '14', position: 1 },
      point: 'waist',
      edges: 4,
      overIsAssumed: true,
    });
    expect(upper?.changeMm).toBeCloseTo(1.5 * INCH, 9);
    expect(upper?.perEdgeMm).toBeCloseTo((1.5 * INCH) / 4, 9);
    expect(lower).toMatchObject({ fromZone: 'waist', toZone: 'hip', point: 'hip' });
    // Eight inches from waist to hip: Carlson, EC 742, Oregon State Univ. Extension, 1969.
    expect(lower?.overMm).toBeCloseTo(8 * INCH, 9);
    expect(lower?.angleDegrees).toBeCloseTo((Math.atan(0.5 / 8) * 180) / Math.PI, 9);
  });

  it('is narrower where the size goes down', () => {
    const body = inches({ bust: 40, waist: 28, hip: 38 });
    const [upper] = blendsOf(fitInput(DRESS, caseSizes(POINTS), body));
    expect(upper?.changeMm).toBeLessThan(0);
    expect(upper?.perEdgeMm).toBeLessThan(0);
    expect(upper?.angleDegrees).toBeGreaterThan(0);
  });

  it('takes the change from the sewn garment where it is known', () => {
    const sizes = caseSizes(POINTS, { bust: 3, waist: 1.5, hip: 3 }).map((row, size) => ({
      ...row,
      finished: { ...row.finished, waist: 700 + 44 * size },
    }));
    expect(blendsOf(fitInput(DRESS, sizes, PEAR))[0]?.changeMm).toBeCloseTo(44, 9);
  });

  it('shares it over the edges that the pattern states, at the first and at the last level', () => {
    const garment = { ...DRESS, seamEdges: { waist: 8, hip: 6 } };
    expect(blendsOf(fitInput(garment, caseSizes(POINTS), PEAR)).map(({ edges }) => edges)).toEqual([8, 6]);
  });

  it('runs over the chart’s own lengths, else the person’s, else a usual one that is marked', () => {
    const withLengths = (lengths: SizeRow['body']) =>
      caseSizes(POINTS).map((row) => ({ ...row, body: { ...row.body, ...lengths } }));
    const over = (sizes: SizeRow[], body: FitInput['body']) =>
      blendsOf(fitInput(DRESS, sizes, { ...PEAR, ...body })).map(({ overMm, overIsAssumed }) => [
        Math.round((overMm ?? 0) * 10) / 10,
        overIsAssumed,
      ]);
    const chart = { backWaistLength: 410, scyeDepth: 190, waistToHip: { low: 205, high: 215 } };
    const own = { backWaistLength: 430, scyeDepth: 200, waistToHip: 222 };
    expect(over(withLengths(chart), own)).toEqual([
      [169.2, false],
      [210, false],
    ]);
    expect(over(caseSizes(POINTS), own)).toEqual([
      [179.2, false],
      [222, false],
    ]);
    expect(over(caseSizes(POINTS), { backWaistLength: 430 })).toEqual([
      [149.2, true],
      [203.2, true],
    ]);
    expect(over(caseSizes(POINTS), { backWaistLength: 200, scyeDepth: 200 })[0]).toEqual([149.2, true]);
  });

  it('round a neckline or armhole has no length and no angle', () => {
    const sizes = caseSizes(POINTS).map((row, size) => ({
      ...row,
      body: { ...row.body, upperArm: 290 + 14 * size },
    }));
    const [blend] = blendsOf(fitInput(DRESS, sizes, inches({ bust: 36 }), { held: { sleeve: 2, bust: 1 } }));
    expect(blend).toMatchObject({ fromZone: 'shoulder', toZone: 'sleeve', overMm: null, angleDegrees: null });
    expect(blend).toMatchObject({ point: 'upperArm', changeMm: 14, edges: 2, perEdgeMm: 7 });
  });

  it('where nothing is known on either side is not told', () => {
    const input = fitInput(DRESS, caseSizes(POINTS), inches({ bust: 36 }), { held: { sleeve: 2, bust: 1 } });
    expect(blendsOf(input)).toEqual([]);
  });

  it('to a level of which nothing is known is told by the grade of the level it leaves', () => {
    const [blend] = blendsOf(fitInput(DRESS, caseSizes(POINTS), PEAR, { held: { hem: 4 } })).slice(-1);
    expect(blend).toMatchObject({ fromZone: 'hip', toZone: 'hem', point: 'hip' });
    expect(blend?.changeMm).toBeCloseTo(4 * INCH, 9);
  });
});

describe('what to watch when cutting', () => {
  const codes = (input: FitInput) => planFit(input).cautions.map(({ code, zone }) => `${code} ${zone ?? ''}`);

  it('steep above 15 degrees', () => {
    const sizes = [800, 1020].map((waist, size) => ({
      label: `s${size}`,
      body: { bust: 900 + size, waist },
      finished: {},
    }));
    const held = { bust: 0, waist: 1 };
    const body = { bust: 900, waist: 1020 };
    expect(codes(fitInput(DRESS, sizes, body, { held }))).toContain('steep waist');
    const gentle = { ...DRESS, seamEdges: { waist: 12 } };
    expect(codes(fitInput(gentle, sizes, body, { held }))).not.toContain('steep waist');
  });

  it('slight under 6 mm an edge: it may be left', () => {
    const sizes = (grade: number) =>
      [0, 1].map((size) => ({
        label: `s${size}`,
        body: { bust: 900, waist: 700 + grade * size },
        finished: {},
      }));
    const held = { bust: 0, waist: 1 };
    const body = { bust: 900, waist: 720 };
    expect(codes(fitInput(DRESS, sizes(23.9), body, { held }))).toContain('slight waist');
    expect(codes(fitInput(DRESS, sizes(24), body, { held }))).not.toContain('slight waist');
  });

  it('between hip and thigh the whole crotch curve stays in one size', () => {
    const sizes = caseSizes(['waist', 'hip']).map((row, size) => ({
      ...row,
      body: { ...row.body, thigh: 540 + 30 * size },
    }));
    const body = { ...inches({ waist: 28, hip: 38 }), thigh: 630 };
    expect(codes(fitInput({ kind: 'trousers' }, sizes, body))).toContain('crotchCurve thigh');
  });
});
