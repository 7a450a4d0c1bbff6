import { describe, expect, it } from 'vitest';
import { tableOf, typedOf } from '../../../../../shared/patterns/tables-as-typed.ts';
import type { TypedTable } from '../../../../../shared/patterns/typed-cells.ts';
import { readTypedTable } from '../../../../../shared/patterns/typed-table.ts';
import {
  addLine,
  addSize,
  beginEdit,
  changeLine,
  moveSize,
  removeLine,
  removeSize,
  typedTable,
  writeAt,
  type EditedTable,
} from '../../../../../src/patterns/edit/edited-table.ts';
import { layOver } from '../../../../../src/patterns/edit/lay-over.ts';

const table = (typed: TypedTable) => tableOf(typed, readTypedTable(typed), null);
const BASE = table({
  sizes: ['10', '12', '14'],
  chart: [
    { point: 'bust', unit: 'cm', typed: ['84', '88', '92'] },
    { point: 'waist', unit: 'cm', typed: ['64', '68', '72'] },
  ],
  finished: [],
});
const start = () => beginEdit(typedOf(BASE));
const put = (from: EditedTable, line: number, size: number, text: string) =>
  writeAt(from, 'chart', [{ place: { line, size }, text }]);
const saved = (edited: EditedTable) => table(typedTable(edited));
const laid = (yours: EditedTable, theirs: EditedTable) => {
  const { sizes, chart } = typedTable(layOver(BASE, yours, saved(theirs)));
  return { sizes, chart: chart.map(({ point, unit, typed }) => [point, unit, ...typed]) };
};

describe('laying one’s changes over a newer table', () => {
  it('keeps both sides’ cells, and yours where both changed one', () => {
    const yours = put(put(start(), 0, 0, '83'), 1, 2, '73');
    const theirs = put(put(start(), 0, 0, '85'), 1, 1, '69');
    expect(laid(yours, theirs).chart).toEqual([
      ['bust', 'cm', '83', '88', '92'],
      ['waist', 'cm', '64', '69', '73'],
    ]);
  });

  it('nothing changed on one side answers the other', () => {
    const edited = put(addSize(removeLine(start(), 'chart', 1), 1, '11'), 0, 1, '86');
    const { sizes, chart } = typedTable(edited);
    const whole = { sizes, chart: chart.map(({ point, unit, typed }) => [point, unit, ...typed]) };
    expect(laid(edited, start())).toEqual(whole);
    expect(laid(start(), edited)).toEqual(whole);
  });

  it('sizes that either added stand where they stood, and those that either removed are gone', () => {
    const yours = put(addSize(start(), 0, '8'), 0, 0, '80');
    const theirs = put(put(addSize(removeSize(start(), 1), 2, '16'), 0, 2, '96'), 1, 2, '76');
    expect(laid(yours, theirs)).toEqual({
      sizes: ['8', '10', '14', '16'],
      chart: [
        ['bust', 'cm', '80', '84', '92', '96'],
        ['waist', 'cm', '', '64', '72', '76'],
      ],
    });
  });

  it('a size they removed and you changed comes back with what you typed', () => {
    expect(laid(put(start(), 0, 1, '87.5'), removeSize(start(), 1))).toEqual({
      sizes: ['10', '12', '14'],
      chart: [
        ['bust', 'cm', '84', '87.5', '92'],
        ['waist', 'cm', '64', '68', '72'],
      ],
    });
  });

  it('a line they removed and you changed comes back, one you left alone does not', () => {
    const theirs = removeLine(start(), 'chart', 1);
    expect(laid(put(start(), 1, 0, '63'), theirs).chart).toContainEqual(['waist', 'cm', '63', '68', '72']);
    expect(laid(put(start(), 0, 0, '83'), theirs).chart).toEqual([['bust', 'cm', '83', '88', '92']]);
  });

  it('a size renamed by them keeps your cells, and one renamed by you your name', () => {
    const rename = (at: number, name: string) =>
      writeAt(start(), 'chart', [{ place: { line: -1, size: at }, text: name }]);
    expect(laid(put(start(), 0, 1, '89'), rename(1, 'M'))).toMatchObject({ sizes: ['10', 'M', '14'] });
    expect(laid(rename(2, 'L'), put(start(), 0, 0, '83')).sizes).toEqual(['10', '12', 'L']);
    expect(laid(rename(2, 'L'), rename(2, 'XL')).sizes).toEqual(['10', '12', 'L']);
  });

  it('where one changed a line’s unit, cells the other wrote keep the unit they were meant in', () => {
    const inches = changeLine(start(), 'chart', 0, { unit: 'in' });
    expect(laid(put(start(), 0, 0, '83'), inches).chart[0]).toEqual(['bust', 'in', '83 cm', '88', '92']);
    expect(laid(inches, put(start(), 0, 0, '83')).chart[0]).toEqual(['bust', 'in', '83 cm', '88', '92']);
  });

  it('your order of sizes wins where you changed it', () => {
    expect(laid(moveSize(start(), 0, 2), put(start(), 0, 0, '83'))).toEqual({
      sizes: ['12', '14', '10'],
      chart: [
        ['bust', 'cm', '88', '92', '83'],
        ['waist', 'cm', '68', '72', '64'],
      ],
    });
  });

  it('a size that both added under one name is one size', () => {
    const added = (text: string) => put(addSize(start(), 3, '16'), 0, 3, text);
    expect(laid(added('95'), added('96'))).toMatchObject({ sizes: ['10', '12', '14', '16'] });
    expect(laid(added('95'), added('96')).chart[0]).toEqual(['bust', 'cm', '84', '88', '92', '95']);
  });

  it('a line without a point yet is kept', () => {
    const yours = put(addLine(start(), 'chart', null), 2, 1, '30');
    expect(laid(yours, put(start(), 0, 0, '83')).chart).toContainEqual([null, 'cm', '', '30', '']);
  });
});
