import { describe, expect, it } from 'vitest';
import { bodyPosition, bodyPositions } from '../../../../shared/fit/body-position.ts';
import type { SizeRow } from '../../../../shared/fit/fit.schema.ts';
import { caseSizes, fitInput, inches } from '../../../support/fit-tables.ts';

const DRESS = { kind: 'dress', silhouette: 'fitted' } as const;
const CHART = caseSizes(['bust', 'waist', 'hip']);
const bustAt = (bust: number, sizes: SizeRow[] = CHART, preference = 0) =>
  bodyPosition(fitInput(DRESS, sizes, inches({ bust }), { preferenceMm: { bust: preference } }), 'bust');

describe('bodyPosition', () => {
  it('is the size on whose row the body lies, first, middle and last', () => {
    expect(bustAt(34)).toBeCloseTo(0, 9);
    expect(bustAt(38)).toBeCloseTo(2, 9);
    expect(bustAt(44)).toBeCloseTo(5, 9);
  });

  it('lies between sizes, and beyond the ends by the end step', () => {
    expect(bustAt(37)).toBeCloseTo(1.5, 9);
    expect(bustAt(33)).toBeCloseTo(-0.5, 9);
    expect(bustAt(47)).toBeCloseTo(6.5, 9);
  });

  it('counts the person’s liking', () => {
    expect(bustAt(36, CHART, 25.4)).toBeCloseTo(1.5, 9);
  });

  it('reaches half a size to each side of a range', () => {
    const sizes = [860, 920, 980].map((low, size) => ({
      label: `s${size}`,
      body: { bust: { low, high: low + 60 } },
      finished: {},
    }));
    const at = (bust: number) => bodyPosition(fitInput(DRESS, sizes, { bust }), 'bust');
    expect(at(890)).toBeCloseTo(0, 9);
    expect(at(920)).toBeCloseTo(0.5, 9);
    expect(at(965)).toBeCloseTo(1.25, 9);
    expect(at(1055)).toBeCloseTo(2.75, 9);
  });

  it('goes by the middles of ranges that overlap', () => {
    const sizes = [860, 900].map((low, size) => ({
      label: `s${size}`,
      body: { bust: { low, high: low + 60 } },
      finished: {},
    }));
    expect(bodyPosition(fitInput(DRESS, sizes, { bust: 910 }), 'bust')).toBeCloseTo(0.5, 9);
  });

  it('goes by the target ease where only finished measurements are known', () => {
    const sizes = [36, 38, 40].map((bust, size) => ({
      label: `s${size}`,
      body: {},
      finished: inches({ bust: bust + 3.5 }),
    }));
    expect(bustAt(38, sizes)).toBeCloseTo(1, 9);
  });

  it('with one size is the deviation in usual steps', () => {
    const sizes = [{ label: 'one', body: { bust: 900 }, finished: {} }];
    expect(bodyPosition(fitInput(DRESS, sizes, { bust: 925 }), 'bust')).toBeCloseTo(0.5, 9);
  });

  it('is unknown where the point says nothing of sizes', () => {
    const input = fitInput(DRESS, CHART, inches({ bust: 36 }));
    expect(bodyPosition(input, 'waist')).toBeNull();
    expect(bodyPosition(input, 'knee')).toBeNull();
    const falling = [...CHART].reverse();
    expect(bustAt(36, falling)).toBeNull();
    expect(bodyPosition({ ...input, fabric: { structure: 'knit' } }, 'bust')).toBeNull();
  });
});

describe('bodyPositions', () => {
  it('gives every point that says something at once', () => {
    const found = bodyPositions(fitInput(DRESS, CHART, inches({ bust: 34, hip: 40 })));
    expect(Object.keys(found)).toEqual(['bust', 'hip']);
    expect(found.hip).toBeCloseTo(2, 9);
  });
});
