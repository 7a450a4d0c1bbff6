import { describe, expect, it } from 'vitest';
import { beginEdit, writeAt, type EditedTable } from '../../../../../src/patterns/edit/edited-table.ts';
import { intentOf, writingIntentOf } from '../../../../../src/patterns/edit/grid-intent.ts';
import { clampPlace, placeAfterTab } from '../../../../../src/patterns/edit/grid-keys.ts';
import { beginHistory, redo, stepOn, undo } from '../../../../../src/patterns/edit/history.ts';
import { pasteBlock, sayPasted } from '../../../../../src/patterns/edit/paste-block.ts';
import { readBlock, turned, writeBlock } from '../../../../../src/patterns/edit/text-block.ts';

const extent = { lines: 3, sizes: 4 };
const key = (name: string, more: object = {}) => ({
  key: name,
  shiftKey: false,
  ctrlKey: false,
  metaKey: false,
  altKey: false,
  ...more,
});
const place = (line: number, size: number) => ({ line, size });
const goes = (name: string, from: [number, number], more: object = {}) => {
  const intent = intentOf(key(name, more), place(...from), extent, false);
  return intent?.do === 'move' ? [intent.to.line, intent.to.size] : intent;
};

describe('keys while nothing is written', () => {
  it('arrows go a step and stay at the edge, past the corner', () => {
    expect(goes('ArrowRight', [0, 3])).toEqual([0, 3]);
    expect(goes('ArrowUp', [0, 2])).toEqual([-1, 2]);
    expect(goes('ArrowLeft', [0, 0])).toEqual([0, -1]);
    expect(goes('ArrowUp', [0, -1])).toEqual([0, -1]);
    expect(goes('ArrowLeft', [-1, 0])).toEqual([-1, 0]);
  });

  it('with Ctrl they go to the edge of the cells; Home and End along the line', () => {
    expect(goes('ArrowDown', [0, 2], { ctrlKey: true })).toEqual([2, 2]);
    expect(goes('ArrowLeft', [1, 3], { ctrlKey: true })).toEqual([1, 0]);
    expect(goes('Home', [1, 3])).toEqual([1, 0]);
    expect(goes('End', [1, 0], { ctrlKey: true })).toEqual([2, 3]);
  });

  it('Tab goes on line by line and leaves at the end', () => {
    expect(placeAfterTab(place(0, 3), false, extent)).toEqual(place(1, 0));
    expect(placeAfterTab(place(1, 0), true, extent)).toEqual(place(0, 3));
    expect(placeAfterTab(place(1, -1), false, extent)).toEqual(place(1, 0));
    expect(placeAfterTab(place(1, -1), true, extent)).toEqual(place(0, 3));
    expect(placeAfterTab(place(2, 3), false, extent)).toBeNull();
    expect(placeAfterTab(place(-1, 0), true, extent)).toBeNull();
    expect(intentOf(key('Tab'), place(0, 0), extent, true)).toBeNull();
  });

  it('a sign writes, a shortcut and an empty key do not', () => {
    expect(goes('8', [0, 0])).toEqual({ do: 'edit', text: '8' });
    expect(goes('½', [0, 0])).toEqual({ do: 'edit', text: '½' });
    expect(goes('c', [0, 0], { ctrlKey: true })).toBeNull();
    expect(goes('Shift', [0, 0])).toBeNull();
    expect(goes('8', [0, -1])).toBeNull();
  });

  it('Shift marks a block among the cells only', () => {
    expect(intentOf(key('ArrowRight', { shiftKey: true }), place(0, 0), extent, false)).toMatchObject({
      isExtending: true,
    });
    expect(intentOf(key('ArrowUp', { shiftKey: true }), place(0, 0), extent, false)).toMatchObject({
      isExtending: false,
    });
  });

  it('a place outside is brought to the nearest there is, never the corner', () => {
    expect(clampPlace(place(9, 9), extent)).toEqual(place(2, 3));
    expect(clampPlace(place(-1, -1), extent)).toEqual(place(-1, 0));
    expect(clampPlace(place(-1, 2), { lines: 2, sizes: 0 })).toEqual(place(0, -1));
  });
});

describe('keys while a cell is written', () => {
  it('Escape restores, Enter and Tab keep and go on, letters are the text’s own', () => {
    expect(writingIntentOf(key('Escape'), place(0, 0), extent)).toEqual({ do: 'restore' });
    expect(writingIntentOf(key('Enter'), place(0, 0), extent)).toEqual({ do: 'keep', to: place(1, 0) });
    expect(writingIntentOf(key('Enter', { shiftKey: true }), place(1, 0), extent)).toEqual({
      do: 'keep',
      to: place(0, 0),
    });
    expect(writingIntentOf(key('Enter'), place(2, 0), extent)).toEqual({ do: 'keep', to: place(2, 0) });
    expect(writingIntentOf(key('Tab'), place(2, 3), extent)).toEqual({ do: 'keep', to: null });
    expect(writingIntentOf(key('ArrowLeft'), place(0, 0), extent)).toBeNull();
    expect(writingIntentOf(key('Home'), place(0, 0), extent)).toBeNull();
  });
});

const START: EditedTable = beginEdit({
  sizes: ['10', '12'],
  chart: [{ point: 'bust', unit: 'cm', typed: ['84', '88'] }],
  finished: [],
});

describe('history', () => {
  it('goes back and forth, and a step that changes nothing is none', () => {
    const one = writeAt(START, 'chart', [{ place: place(0, 0), text: '83' }]);
    const history = stepOn(beginHistory(START), one, '83 at Bust.');
    expect(stepOn(history, writeAt(one, 'chart', [{ place: place(0, 0), text: ' 83 ' }]), 'x')).toBe(history);
    expect(undo(history).present.table).toBe(START);
    expect(redo(undo(history)).present).toEqual({ table: one, words: '83 at Bust.' });
    expect(undo(undo(history)).present.table).toBe(START);
    expect(redo(history)).toBe(history);
    const other = stepOn(undo(history), writeAt(START, 'chart', [{ place: place(0, 1), text: '89' }]), '89');
    expect(other.future).toEqual([]);
  });
});

describe('blocks of cells as text', () => {
  it('are cut at tabs and line ends of every kind, marks undone', () => {
    expect(readBlock('1\t2\r\n3\t4\r\n')).toEqual([
      ['1', '2'],
      ['3', '4'],
    ]);
    expect(readBlock('"37 3/8"""\t37"\n"two\nlines"\t')).toEqual([
      ['37 3/8"', '37"'],
      ['two lines', ''],
    ]);
    expect(readBlock('')).toEqual([]);
    expect(readBlock('\n\n')).toEqual([]);
    expect(readBlock('5')).toEqual([['5']]);
  });

  it('come back as they were', () => {
    const block = [
      ['37 3/8"', '"x', ''],
      ['', 'a', 'b'],
    ];
    expect(readBlock(writeBlock(block))).toEqual(block);
    expect(turned([['1', '2'], ['3']])).toEqual([
      ['1', '3'],
      ['2', ''],
    ]);
  });
});

describe('pasting a block in', () => {
  const paste = (text: string, at = place(0, 0)) => pasteBlock(START, 'chart', at, readBlock(text));

  it('goes where the hand is and grows the table both ways', () => {
    const pasted = paste('1\t2\t3\n4\t5\t6', place(0, 1));
    expect(pasted.table.chart.map(({ point, typed }) => [point, ...typed])).toEqual([
      ['bust', '84', '1', '2', '3'],
      [null, '', '4', '5', '6'],
    ]);
    expect(sayPasted(pasted)).toBe('6 cells pasted in. 2 sizes and 1 point added.');
    expect(START.chart[0]?.typed).toEqual(['84', '88']);
  });

  it.each([
    ['points down', 'Size\t12\t14\nWaist (in)\t26 1/2\t28\nBust\t89\t93'],
    ['sizes down', 'Size\tWaist (in)\tBust\n12\t26 1/2\t89\n14\t28\t93'],
  ])('reads a whole table by its headings: %s', (_name, text) => {
    const { table, ...counts } = paste(text);
    expect(table.sizes.map(({ name }) => name)).toEqual(['10', '12', '14']);
    expect(table.chart.map(({ point, unit, typed }) => [point, unit, ...typed])).toEqual([
      ['bust', 'cm', '84', '89', '93'],
      ['waist', 'in', '', '26 1/2', '28'],
    ]);
    expect(counts).toEqual({ cells: 4, sizesAdded: 1, pointsAdded: 1, hasHeadings: true, isCut: false });
  });

  it('stops where a pattern may have no more, and says so', () => {
    const pasted = paste(Array.from({ length: 230 }, () => '1').join('\t'));
    expect(pasted.table.sizes).toHaveLength(200);
    expect(sayPasted(pasted)).toMatch(/The rest did not fit/);
  });
});
