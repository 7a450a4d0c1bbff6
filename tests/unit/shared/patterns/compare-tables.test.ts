import { describe, expect, it } from 'vitest';
import { compareTables } from '../../../../shared/patterns/compare-tables.ts';
import type { PatternTable } from '../../../../shared/patterns/patterns.schema.ts';
import { tableOf } from '../../../../shared/patterns/tables-as-typed.ts';
import type { TypedTable } from '../../../../shared/patterns/typed-cells.ts';
import { readTypedTable } from '../../../../shared/patterns/typed-table.ts';

const table = (typed: TypedTable): PatternTable => tableOf(typed, readTypedTable(typed), null);
const CM = {
  sizes: ['10', '12', '14'],
  chart: [
    { point: 'bust' as const, unit: 'cm' as const, typed: ['84', '88', '92'] },
    { point: 'waist' as const, unit: 'cm' as const, typed: ['64', '68', '72'] },
  ],
  finished: [{ point: 'bust' as const, unit: 'cm' as const, typed: ['92', '96', '100'] }],
};
const BASE = table(CM);
const same = { isSame: true, columns: [], cells: [], isColumnsReordered: false };

describe('comparing two tables', () => {
  it('a table with itself, and two empty ones, differ in nothing', () => {
    expect(compareTables(BASE, structuredClone(BASE))).toMatchObject(same);
    const nothing = { sizes: [], chart: [], finished: [] };
    expect(compareTables(nothing, nothing)).toMatchObject(same);
  });

  it('headings do not count: they are the file’s', () => {
    const other = structuredClone(BASE);
    other.chart[0]!.heading = 'Bust (cm)';
    expect(compareTables(BASE, other).isSame).toBe(true);
  });

  it('a cell that differs has both values, as typed and in mm', () => {
    const to = table({ ...CM, finished: [{ ...CM.finished[0]!, typed: ['92', '', '100'] }] });
    expect(compareTables(BASE, to).cells).toEqual([
      {
        role: 'finished',
        point: 'bust',
        size: { from: '12', to: '12' },
        from: { typed: '96', unit: 'cm', mm: 960 },
        to: { typed: '', unit: 'cm', mm: null },
        isSameLength: false,
      },
    ]);
  });

  it('a cell written otherwise is told, and told to be the same length; a range is compared as one', () => {
    const chart = [{ ...CM.chart[0]!, typed: ['84.0', '86-90', '92'] }, CM.chart[1]!];
    const { cells, isSame } = compareTables(BASE, table({ ...CM, chart }));
    expect(isSame).toBe(false);
    expect(cells.map(({ isSameLength, to }) => [isSameLength, to.mm])).toEqual([
      [true, 840],
      [false, { low: 860, high: 900 }],
    ]);
  });

  it('a size renamed is one size, with the cell that changed in it', () => {
    const chart = [CM.chart[0]!, { ...CM.chart[1]!, typed: ['64', '68.5', '72'] }];
    const { sizes, cells } = compareTables(BASE, table({ ...CM, sizes: ['10', 'M', '14'], chart }));
    expect(sizes).toEqual({
      added: [],
      removed: [],
      renamed: [{ from: '12', to: 'M' }],
      isReordered: false,
    });
    expect(cells.map(({ size, to }) => [size, to.typed])).toEqual([[{ from: '12', to: 'M' }, '68.5']]);
  });

  it('a size put in place of another, with other lengths, is one removed and one added', () => {
    const typed = ['84', '200', '92'];
    const to = table({
      sizes: ['10', 'M', '14'],
      chart: CM.chart.map((column) => ({ ...column, typed })),
      finished: [{ ...CM.finished[0]!, typed }],
    });
    expect(compareTables(BASE, to).sizes).toMatchObject({ added: ['M'], removed: ['12'], renamed: [] });
  });

  it('sizes and points that only changed places are told, and no cell', () => {
    const turned = (typed: readonly string[]) => [typed[1]!, typed[0]!, typed[2]!];
    const to = table({
      sizes: turned(CM.sizes),
      chart: CM.chart.map((column) => ({ ...column, typed: turned(column.typed) })).toReversed(),
      finished: CM.finished.map((column) => ({ ...column, typed: turned(column.typed) })),
    });
    const difference = compareTables(BASE, to);
    expect(difference.cells).toEqual([]);
    expect([difference.sizes.isReordered, difference.isColumnsReordered, difference.isSame]).toEqual([
      true,
      true,
      false,
    ]);
  });

  it('columns added, removed and in another unit', () => {
    const hip = { point: 'hip' as const, unit: 'in' as const, typed: ['35', '36', '37'] };
    const to = table({ ...CM, chart: [{ ...CM.chart[0]!, unit: 'in' }, hip] });
    const { columns, cells } = compareTables(BASE, to);
    expect(columns.map(({ point, change, from, to: unit }) => [point, change, from, unit])).toEqual([
      ['waist', 'removed', 'cm', null],
      ['bust', 'unit', 'cm', 'in'],
      ['hip', 'added', null, 'in'],
    ]);
    expect(cells).toHaveLength(3);
  });

  it('leaves what it is given as it was', () => {
    const frozen = structuredClone(BASE);
    compareTables(BASE, table({ ...CM, sizes: ['10', 'M', '14'] }));
    expect(BASE).toEqual(frozen);
  });
});
