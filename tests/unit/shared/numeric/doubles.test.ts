import { describe, expect, it } from 'vitest';
import { doubles } from '../../../../shared/numeric/doubles.ts';

describe('doubles', () => {
  it('is an array of the length asked for, that keeps what is written', () => {
    const numbers = doubles(3);
    expect(numbers).toHaveLength(3);
    numbers[0] = 1;
    numbers[2] = NaN;
    expect(numbers[0]).toBe(1);
    expect(numbers[2]).toBeNaN();
    expect(doubles(0)).toEqual([]);
  });
});
