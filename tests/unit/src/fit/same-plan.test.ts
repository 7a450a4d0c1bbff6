import { describe, expect, it } from 'vitest';
import { saysTheSame } from '../../../../src/fit/same-plan.ts';

describe('saysTheSame', () => {
  it('does not mind the order of keys, nor a key left out for an undefined one', () => {
    expect(saysTheSame({ a: 1, b: [{ c: null }] }, { b: [{ c: null }], a: 1, d: undefined })).toBe(true);
  });

  it('does not mind the last bits of a number, which differ between one engine and another', () => {
    expect(saysTheSame({ a: 4.6 }, { a: 4.6 + 1e-13 })).toBe(true);
  });

  it('minds a length, a number and the order of a list', () => {
    expect(saysTheSame([1, 2], [1])).toBe(false);
    expect(saysTheSame([1, 2], [2, 1])).toBe(false);
    expect(saysTheSame({ a: 1 }, { a: 1.01 })).toBe(false);
    expect(saysTheSame({ a: null }, { a: 0 })).toBe(false);
    expect(saysTheSame({ a: [] }, { a: {} })).toBe(false);
  });
});
