import { describe, expect, it } from 'vitest';
import { readMeasurement, readMeasurements } from '../../../../shared/people/read-measurements.ts';

describe('reading a measurement', () => {
  it('keeps the text as typed, the unit it was in and its length in mm', () => {
    expect(readMeasurement('hip', ' 37 3/8 ', 'in')).toEqual({ typed: '37 3/8', unit: 'in', mm: 949.325 });
    expect(readMeasurement('hip', '37.375 in', 'cm')).toEqual({
      typed: '37.375 in',
      unit: 'in',
      mm: 949.325,
    });
  });

  it('answers null to an empty text', () => {
    expect(readMeasurement('hip', '', 'cm')).toBeNull();
    expect(readMeasurement('hip', '   ', 'cm')).toBeNull();
    expect(readMeasurement('hemGirth', '', 'cm')).toBeNull();
  });

  it('takes 5 mm and 4 m and nothing beyond, in every unit', () => {
    expect(readMeasurement('hip', '5', 'mm')).toMatchObject({ mm: 5 });
    expect(readMeasurement('hip', '400', 'cm')).toMatchObject({ mm: 4000 });
    expect(readMeasurement('hip', '4.9', 'mm')).toBe(
      'Write at least 5 mm, or leave this empty if it was not measured.',
    );
    expect(readMeasurement('hip', '400.1', 'cm')).toBe(
      'Write at most 400.0 cm: is it perhaps in another unit?',
    );
    expect(readMeasurement('hip', '158 in', 'cm')).toBe(
      'Write at most 157 1/2 in: is it perhaps in another unit?',
    );
  });

  it('refuses a point that only a garment has, in words', () => {
    expect(readMeasurement('hemGirth', '120', 'cm')).toMatch(/^Leave this empty: .* measured on a garment/);
  });
});

describe('reading a set', () => {
  it('answers all values and all errors, in the order of the catalogue', () => {
    const typed = { hip: 'x', bust: '92', neck: '', waist: '-3' };
    const { values, errors } = readMeasurements(typed, 'cm');
    expect(values).toEqual({ bust: { typed: '92', unit: 'cm', mm: 920 } });
    expect(errors.map(({ point }) => point)).toEqual(['waist', 'hip']);
  });

  it('answers nothing to nothing', () => {
    expect(readMeasurements({}, 'cm')).toEqual({ values: {}, errors: [] });
  });
});
