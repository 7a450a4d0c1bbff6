import { describe, expect, it } from 'vitest';
import { placeLabels } from '../../../../../src/fit/parts/place-labels.ts';

const line = { from: 0, to: 200 };
const label = (key: string, x: number, rank: number) => ({ key, x, width: 14, rank });

describe('placeLabels', () => {
  it('keeps clear of marks that are already there', () => {
    const placed = placeLabels([label('14', 50, 0), label('16', 90, 1)], [{ from: 48, to: 52 }], line);
    expect([...placed]).toEqual(['16']);
  });

  it('gives room to the lower rank where two labels would touch', () => {
    expect([...placeLabels([label('far', 60, 2), label('near', 65, 1)], [], line)]).toEqual(['near']);
  });

  it('never lets two placed labels touch', () => {
    const wanted = Array.from({ length: 60 }, (_, index) => label(String(index), index * 3.4, index));
    const xs = wanted.filter((each) => placeLabels(wanted, [], line).has(each.key)).map((each) => each.x);
    expect(xs.length).toBeGreaterThan(5);
    for (const [index, x] of xs.entries()) {
      const next = xs[index + 1];
      if (next !== undefined) expect(next - x).toBeGreaterThanOrEqual(18);
    }
  });

  it('leaves out what would hang over the ends', () => {
    expect(placeLabels([label('a', 3, 0), label('b', 198, 0)], [], line).size).toBe(0);
  });
});
