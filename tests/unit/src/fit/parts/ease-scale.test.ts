import { describe, expect, it } from 'vitest';
import { easeDomain, easeTicks, widen } from '../../../../../src/fit/parts/ease-scale.ts';

describe('easeDomain', () => {
  it('holds every value and the body', () => {
    const { low, high } = easeDomain([305, -40, null, 20]);
    expect(low).toBeLessThan(-40);
    expect(high).toBeGreaterThan(305);
  });

  it('has a least span, so that small values stay small', () => {
    const { low, high } = easeDomain([]);
    expect(low).toBeLessThan(0);
    expect(high).toBeGreaterThan(60);
  });

  it('leaves out what is not a number', () => {
    expect(easeDomain([Number.NaN, Number.POSITIVE_INFINITY])).toEqual(easeDomain([]));
  });
});

describe('widen', () => {
  it('takes the further end of each', () => {
    expect(widen({ low: -5, high: 10 }, { low: -8, high: 9 })).toEqual({ low: -8, high: 10 });
  });
});

describe('easeTicks', () => {
  it('stands at round centimetres, signed, without the body’s own zero', () => {
    expect(easeTicks({ low: -60, high: 110 }, 340, 'cm').map((tick) => tick.label)).toEqual([
      '−5',
      '+5',
      '+10',
    ]);
  });

  it('stands at round inches', () => {
    const ticks = easeTicks({ low: -30, high: 110 }, 280, 'in', 40);
    expect(ticks.map((tick) => tick.label)).toEqual(['−1', '+1', '+2', '+3', '+4']);
    expect(ticks[1]?.mm).toBeCloseTo(25.4, 10);
  });

  it('keeps ticks apart however narrow the axis', () => {
    const ticks = easeTicks({ low: -20, high: 400 }, 120, 'cm');
    const px = (mm: number) => (mm / 420) * 120;
    for (const [index, tick] of ticks.entries()) {
      const next = ticks[index + 1];
      if (next) expect(px(next.mm - tick.mm)).toBeGreaterThanOrEqual(28);
    }
  });
});
