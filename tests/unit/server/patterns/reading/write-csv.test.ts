import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import type { PatternTable } from '../../../../../shared/patterns/patterns.schema.ts';
import { buildTable } from '../../../../../server/patterns/reading/build-table.ts';
import { guardText, unguardText } from '../../../../../shared/patterns/guard.ts';
import { writeCsv } from '../../../../../server/patterns/reading/write-csv.ts';
import { places, read } from './reading.ts';

const FOLDER = join(import.meta.dirname, '../../../../../fixtures/imports');
const FILES = [
  'chart-inch-fractions.csv',
  'chart-decimal-comma.csv',
  'chart-ranges.tsv',
  'chart-inch-ranges.csv',
  'chart-millimetres.csv',
  'chart-mixed-units.csv',
  'chart-windows-1252.csv',
  'chart-quoted.csv',
  'chart-formulas.csv',
];

describe('a table written as CSV', () => {
  it.each(FILES)('%s comes back in with the same sizes, cells as typed and lengths', (name) => {
    const table = buildTable(read(new Uint8Array(readFileSync(join(FOLDER, name)))), null);
    const again = read(writeCsv(table, 'chart'));
    expect(places(again, 'error')).toEqual([]);
    const without = ({ sizes, chart }: PatternTable) => ({
      sizes,
      columns: chart.map(({ point, unit, mm, typed }) => ({ point, unit, mm, typed })),
    });
    expect(without(buildTable(again, null))).toEqual(without(table));
  });

  it('states the unit in each heading, and a name that is known where the file’s was not', () => {
    const table = buildTable(
      read('Size,Bust,Foo\n1,36,39\n2,38,41\n', 'chart', { points: { 3: 'hip' } }),
      null,
    );
    expect(writeCsv(table, 'chart')).toBe('\uFEFFSize,Bust (in),Hip girth (in)\r\n1,36,39\r\n2,38,41\r\n');
  });

  it('a column that was chosen against its heading keeps its point and unit', () => {
    const first = read('Size,Sleeve length (cm)\n1,24\n', 'chart', {
      unit: 'in',
      points: { 2: 'sleeveLength' },
    });
    const csv = writeCsv(buildTable(first, null), 'chart');
    expect(csv).toContain('sleeveLength (in)');
    expect(read(csv).rows[0]?.cells[1]?.mm).toBe(609.6);
  });

  it('guards what a spreadsheet would run, in sizes and headings', () => {
    const table: PatternTable = {
      sizes: ['=1+1', '-12', '@x', "'=2"],
      chart: [
        {
          point: 'bust',
          heading: '+Bust (cm)',
          unit: 'cm',
          mm: [900, 910, 920, 930],
          typed: ['90', '91', '-', '93'],
        },
      ],
      finished: [],
    };
    const csv = writeCsv(table, 'chart');
    for (const line of csv.replace('\uFEFF', '').split('\r\n')) {
      for (const cell of line.split(',')) expect(cell).not.toMatch(/^[=+\-@]/);
    }
    expect(read(csv).rows.map((row) => row.label)).toEqual(table.sizes);
  });
});

describe('guarding a text', () => {
  it.each(['=1+1', '+cmd', '-12', '@x', "'=1", "''=1", '\tx', '＝1'])('%s comes back as it was', (text) => {
    expect(guardText(text)).toBe(`'${text}`);
    expect(unguardText(guardText(text))).toBe(text);
  });

  it.each(['12', 'M', "12 'tall'", '', "O'Neil"])('%s needs no guard', (text) => {
    expect(guardText(text)).toBe(text);
    expect(unguardText(text)).toBe(text);
  });
});
