import { describe, expect, it } from 'vitest';
import { smoothPath } from '../../../../../src/people/drawing/smooth-path.ts';

describe('a smooth line', () => {
  it('runs through every place it is given', () => {
    const path = smoothPath([
      [0, 0],
      [10, 5],
      [20, 0],
    ]);
    expect(path.startsWith('M0 0C')).toBe(true);
    expect(path).toContain('10 5');
    expect(path.endsWith('20 0')).toBe(true);
  });

  it('is straight between two places', () => {
    expect(
      smoothPath([
        [0, 0],
        [6, 0],
      ]),
    ).toBe('M0 0C1 0 5 0 6 0');
  });
});
