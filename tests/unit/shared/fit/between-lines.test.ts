import { describe, expect, it } from 'vitest';
import { labelBetween, latticeRows, placesPerSize } from '../../../../shared/fit/between-lines.ts';
import type { SizeRow } from '../../../../shared/fit/fit.schema.ts';
import { deepFreeze } from '../../../support/fit-tables.ts';

const row = (label: string, body: SizeRow['body'], finished: SizeRow['finished'] = {}): SizeRow => ({
  label,
  body,
  finished,
});

describe('placesPerSize', () => {
  it('is one, and two only where it is cut between the lines', () => {
    expect([{}, { cutBetweenLines: false }, { cutBetweenLines: true }].map(placesPerSize)).toEqual([1, 1, 2]);
  });
});

describe('latticeRows', () => {
  const SIZES = deepFreeze([
    row('S', { bust: 800, hip: { low: 860, high: 900 }, waist: 600 }, { bust: 860, hip: 960 }),
    row('M', { bust: 840, hip: { low: 900, high: 950 }, waist: { low: 640, high: 660 } }, { bust: 903 }),
    row('L', { bust: 890, hip: 980 }, { bust: 960, hip: 1040 }),
  ]);
  const [, first, , last] = latticeRows(SIZES, 2);

  it('is the very sizes where nothing is cut between them', () => {
    expect(latticeRows(SIZES, 1)).toBe(SIZES);
  });

  it('puts one row between every two sizes and none before the first or behind the last', () => {
    expect(latticeRows(SIZES, 2).map(({ label }) => label)).toEqual(['S', 'S–M', 'M', 'M–L', 'L']);
    expect(latticeRows(SIZES, 2).filter((_, place) => place % 2 === 0)).toEqual(SIZES);
    expect(latticeRows(SIZES.slice(0, 1), 2)).toEqual(SIZES.slice(0, 1));
    expect(latticeRows([], 2)).toEqual([]);
  });

  it('takes the mean of both tables', () => {
    expect(first?.body.bust).toBe(820);
    expect(first?.finished.bust).toBe(881.5);
    expect(last?.body.bust).toBe(865);
    expect(last?.finished.bust).toBe(931.5);
  });

  it('takes it end by end of ranges, a single number being both ends', () => {
    expect(first?.body.hip).toEqual({ low: 880, high: 925 });
    expect(first?.body.waist).toEqual({ low: 620, high: 630 });
    expect(last?.body.hip).toEqual({ low: 940, high: 965 });
  });

  it('leaves out what one of the two has not', () => {
    expect(first?.finished).not.toHaveProperty('hip');
    expect(last?.finished).not.toHaveProperty('hip');
    expect(last?.body).not.toHaveProperty('waist');
  });
});

describe('labelBetween', () => {
  it('is both labels', () => {
    expect(labelBetween('16', '18')).toBe('16–18');
  });
});
