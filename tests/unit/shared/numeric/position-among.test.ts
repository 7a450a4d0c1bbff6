import { describe, expect, it } from 'vitest';
import { positionAmong } from '../../../../shared/numeric/position-among.ts';
import { deepFreeze } from '../../../support/fit-tables.ts';

const knots = (...values: number[]) => deepFreeze(values.map((value, position) => ({ value, position })));

describe('positionAmong', () => {
  it('is the knot’s own position on a knot, first, middle and last', () => {
    expect(positionAmong(knots(10, 20, 40), 10)).toBe(0);
    expect(positionAmong(knots(10, 20, 40), 20)).toBe(1);
    expect(positionAmong(knots(10, 20, 40), 40)).toBe(2);
  });

  it('runs straight between knots, also unevenly spaced ones', () => {
    expect(positionAmong(knots(10, 20, 40), 15)).toBe(0.5);
    expect(positionAmong(knots(10, 20, 40), 25)).toBe(1.25);
  });

  it('draws the first and the last stretch on beyond the ends', () => {
    expect(positionAmong(knots(10, 20, 40), 5)).toBe(-0.5);
    expect(positionAmong(knots(10, 20, 40), 50)).toBe(2.5);
  });

  it('passes over a flat end to the next stretch with a slope', () => {
    expect(positionAmong(knots(10, 10, 20), 5)).toBe(-1);
    expect(positionAmong(knots(10, 20, 20), 30)).toBe(4);
  });

  it('is the middle of knots that share the value', () => {
    expect(positionAmong(knots(10, 20, 20, 20, 30), 20)).toBe(2);
  });

  it('has no answer for one value, falling values, no knots or no number', () => {
    expect(positionAmong(knots(10), 10)).toBeNull();
    expect(positionAmong(knots(10, 10), 10)).toBeNull();
    expect(positionAmong(knots(10, 30, 20), 15)).toBeNull();
    expect(positionAmong(knots(), 10)).toBeNull();
    expect(positionAmong(knots(10, NaN, 20), 15)).toBeNull();
    expect(positionAmong(knots(10, 20), NaN)).toBeNull();
  });
});
