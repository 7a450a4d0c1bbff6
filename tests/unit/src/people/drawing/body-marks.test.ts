import { describe, expect, it } from 'vitest';
import { MEASURING_ORDER } from '../../../../../shared/points/catalogue.ts';
import { BODY_MARKS } from '../../../../../src/people/drawing/body-marks.ts';
import { SHEET } from '../../../../../src/people/drawing/body-outline.ts';

describe('the figure', () => {
  it.each(MEASURING_ORDER.map((point) => [point]))(
    'shows where the tape goes for %s, on the sheet',
    (point) => {
      const mark = BODY_MARKS[point];
      if (!mark) throw new Error('There is no mark.');
      const places = mark.kind === 'loop' ? [mark.at] : mark.through;
      expect(places.length).toBeGreaterThan(0);
      for (const [x, y] of places) {
        expect(x >= 0 && x <= SHEET.width && y >= 0 && y <= SHEET.height).toBe(true);
      }
    },
  );

  it('marks a left point and its right one as mirror images', () => {
    const { upperArmLeft, upperArmRight } = BODY_MARKS;
    if (upperArmLeft?.kind !== 'loop' || upperArmRight?.kind !== 'loop') throw new Error('They are loops.');
    expect(upperArmLeft.at[0] + upperArmRight.at[0]).toBe(SHEET.width);
    expect(upperArmLeft.at[1]).toBe(upperArmRight.at[1]);
  });
});
