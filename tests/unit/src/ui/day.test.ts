import { describe, expect, it } from 'vitest';
import { printDay, todayHere } from '../../../../src/ui/day.ts';

describe('a day in words', () => {
  it('is written out, whatever the zone of the reader', () => {
    expect(printDay('2026-10-12')).toBe('12 October 2026');
    expect(printDay('2026-01-01')).toBe('1 January 2026');
  });

  it('leaves what is no day as it is', () => {
    expect(printDay('soon')).toBe('soon');
  });

  it('is today by the clock on the wall, not by the one in Greenwich', () => {
    expect(todayHere(new Date(2026, 0, 5, 0, 30))).toBe('2026-01-05');
    expect(todayHere(new Date(2026, 11, 31, 23, 30))).toBe('2026-12-31');
  });
});
