import { describe, expect, it } from 'vitest';
import type { PatternTable } from '../../../../shared/patterns/patterns.schema.ts';
import { linesOf, roomSpan } from '../../../../src/patterns/point-lines.ts';

const head = { unit: 'mm', heading: 'x', typed: ['', '', ''] } as const;
const table: PatternTable = {
  sizes: ['S', 'M', 'L'],
  chart: [
    { ...head, typed: [], point: 'hip', mm: [900, null, 1000] },
    { ...head, typed: [], point: 'bust', mm: [{ low: 800, high: 840 }, { low: 840, high: 880 }, 900] },
  ],
  finished: [
    { ...head, typed: [], point: 'bust', mm: [900, 930, 960] },
    { ...head, typed: [], point: 'hip', mm: [980, 1030, 1075] },
    { ...head, typed: [], point: 'garmentLength', mm: [700, 710, 720] },
  ],
};

describe('a pattern’s points', () => {
  it('run from head to foot whatever the order of the columns', () => {
    expect(linesOf(table).map(({ point }) => point)).toEqual(['bust', 'hip', 'garmentLength']);
  });

  it('have the room between cloth and body, held against the middle of a range', () => {
    expect(linesOf(table)[0]?.room).toEqual([80, 70, 60]);
  });

  it('have no room where a size stands in one table only, nor where a point does', () => {
    expect(linesOf(table)[1]?.room).toEqual([80, null, 75]);
    expect(linesOf(table)[2]?.room).toBeNull();
  });
});

describe('the span of the room over the sizes', () => {
  it('is the least and the most that is known, below nought too', () => {
    expect(roomSpan([80, null, -20])).toEqual({ least: -20, most: 80 });
  });
  it('is nothing where no size is known', () => {
    expect(roomSpan([null, null])).toBeNull();
    expect(roomSpan([])).toBeNull();
  });
});
