import { describe, expect, it } from 'vitest';
import { saysTheSame } from '../../../../src/fit/same-plan.ts';

describe('whether two answers say the same', () => {
  it('looks past the order of keys and a key that is undefined', () => {
    expect(saysTheSame({ a: 1, b: [2, 3] }, { b: [2, 3], a: 1, c: undefined })).toBe(true);
  });

  it('looks past the last bits in which two engines differ', () => {
    expect(saysTheSame({ angleDegrees: 12.345678901234567 }, { angleDegrees: 12.345678901234569 })).toBe(true);
    expect(saysTheSame([-0], [0])).toBe(true);
  });

  it('sees another size, another length of list, a missing amount and a hundredth of a millimetre', () => {
    expect(saysTheSame({ label: '12' }, { label: '14' })).toBe(false);
    expect(saysTheSame([1, 2], [1])).toBe(false);
    expect(saysTheSame({ easeMm: 10 }, { easeMm: null })).toBe(false);
    expect(saysTheSame({ easeMm: 10 }, { easeMm: 10.01 })).toBe(false);
  });
});
