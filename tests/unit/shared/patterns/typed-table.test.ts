import { describe, expect, it } from 'vitest';
import type { TypedColumn } from '../../../../shared/patterns/typed-cells.ts';
import { readTypedTable } from '../../../../shared/patterns/typed-table.ts';

const bust = (typed: string[], more: Partial<TypedColumn> = {}): TypedColumn => ({
  point: 'bust',
  unit: 'in',
  typed,
  ...more,
});
const read = (chart: TypedColumn[], sizes = ['10', '12'], finished: TypedColumn[] = []) =>
  readTypedTable({ sizes, chart, finished });
const errors = (reading: ReturnType<typeof read>) =>
  reading.findings.filter(({ severity }) => severity === 'error').map(({ pointer }) => pointer);
const cautions = (reading: ReturnType<typeof read>) =>
  reading.findings.filter(({ severity }) => severity === 'caution').map(({ pointer }) => pointer);

describe('reading tables as typed', () => {
  it('reads fractions, other units and ranges of the size chart as a file’s cells are read', () => {
    const reading = read([bust(['37 3/8', '95,5 cm', '36-38', '–'])], ['1', '2', '3', '4']);
    expect(reading.chart).toEqual([[949.325, 955, { low: 914.4, high: 965.2 }, null]]);
  });

  it('says what is no length at its cell, and answers null there', () => {
    const reading = read([bust(['thirty', '38'])]);
    expect(reading.chart).toEqual([[null, 965.2]]);
    expect(errors(reading)).toEqual(['/chart/0/typed/0']);
  });

  it('refuses a range in the finished measurements only', () => {
    expect(errors(read([], ['10', '12'], [bust(['36-38', '40'])]))).toEqual(['/finished/0/typed/0']);
  });

  it('a value that falls is a caution, past empty cells too; an equal one is none', () => {
    expect(cautions(read([bust(['36', '', '35.5', '35.5'])], ['1', '2', '3', '4']))).toEqual([
      '/chart/0/typed/2',
    ]);
  });

  it('a cell in another unit than its line is a caution', () => {
    expect(cautions(read([bust(['90 cm', '36'])]))).toEqual(['/chart/0/typed/0']);
  });

  it('what is only not written yet is told apart from what is wrong', () => {
    const { findings } = read([bust(['', 'x'], { point: null })], ['', '12']);
    expect(findings.map(({ pointer, isMissing }) => [pointer, isMissing])).toEqual([
      ['/sizes/0', true],
      ['/chart/0/point', true],
      ['/sizes/0', true],
      ['/chart/0/typed/1', false],
    ]);
  });

  it('sizes of one name, written large or small, are one too many; a long name is refused', () => {
    expect(errors(read([bust(['36', '38', '40'])], ['m', 'M', 'x'.repeat(41)]))).toEqual([
      '/sizes/1',
      '/sizes/2',
    ]);
  });

  it('a garment’s point in a size chart is a caution', () => {
    expect(cautions(read([bust(['60', '61'], { point: 'hemGirth' })]))).toEqual(['/chart/0/point']);
  });

  it('an empty table answers what is missing and does not throw', () => {
    expect(errors(read([], []))).toEqual(['/sizes', '/chart']);
    expect(errors(read([bust([])], ['10']))).toEqual(['/chart/0/point', '/sizes/0']);
  });
});
