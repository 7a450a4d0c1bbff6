import { describe, expect, it } from 'vitest';
import { keepMeaning, takeAsNew } from '../../../../src/people/change-unit.ts';
import { NOTHING_TYPED } from '../../../../src/people/measure-values.ts';

const typed = { ...NOTHING_TYPED, waist: ' 84 ', hip: '44 in', bust: 'about 90' };

describe('changing the unit of a measuring form', () => {
  it('writes the unit before behind every number that had none', () => {
    expect(keepMeaning(typed, 'cm').typed.waist).toBe('84 cm');
  });

  it('leaves a number that has its unit, a text that is none, and an empty field', () => {
    const { typed: next, marked } = keepMeaning(typed, 'cm');
    expect(next.hip).toBe('44 in');
    expect(next.bust).toBe('about 90');
    expect(next.neck).toBe('');
    expect(marked).toEqual(['waist']);
  });

  it('takes its marks away where the numbers were meant in the new unit all along', () => {
    const { typed: next, marked } = keepMeaning(typed, 'cm');
    expect(takeAsNew(next, marked, 'cm')).toEqual({ ...typed, waist: '84' });
  });

  it('leaves a field that was written anew since', () => {
    const { typed: next, marked } = keepMeaning(typed, 'cm');
    expect(takeAsNew({ ...next, waist: '33 1/2' }, marked, 'cm').waist).toBe('33 1/2');
  });

  it('changes nothing of what it was given', () => {
    const given = Object.freeze({ ...typed });
    keepMeaning(given, 'cm');
    expect(given).toEqual(typed);
  });
});
