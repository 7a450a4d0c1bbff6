import { describe, expect, it } from 'vitest';
import { printMeasurement, textForForm, typedOtherwise } from '../../../../src/people/print-measurement.ts';

const inches = { typed: '37 1/2', unit: 'in', mm: 952.5 } as const;

describe('a measurement in words', () => {
  it('reads in the unit it was typed in', () => {
    expect(printMeasurement(inches)).toBe('37 1/2 in');
    expect(printMeasurement({ typed: '98,5 cm', unit: 'cm', mm: 985 })).toBe('98.5 cm');
  });

  it.each(['104', '104.0', '104 cm', '104.0 cm', '104cm'])('does not repeat %s beside 104.0 cm', (text) => {
    expect(typedOtherwise({ typed: text, unit: 'cm', mm: 1040 })).toBeNull();
  });

  it('shows what was typed where it reads otherwise', () => {
    expect(typedOtherwise({ typed: '98,5 cm', unit: 'cm', mm: 985 })).toBe('98,5 cm');
    expect(typedOtherwise({ typed: '37.5', unit: 'in', mm: 952.5 })).toBe('37.5');
  });

  it('begins a form as it was typed, with its unit where the form assumes another', () => {
    expect(textForForm(inches, 'in')).toBe('37 1/2');
    expect(textForForm(inches, 'cm')).toBe('37 1/2 in');
    expect(textForForm({ typed: '95.2', unit: 'cm', mm: 952 }, 'mm')).toBe('95.2 cm');
  });
});
