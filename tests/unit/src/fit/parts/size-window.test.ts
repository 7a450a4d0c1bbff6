import { describe, expect, it } from 'vitest';
import { pathGeometry, wholeRange, windowRound } from '../../../../../src/fit/parts/size-window.ts';

describe('windowRound', () => {
  it('shows every size where all have room', () => {
    expect(windowRound({ path: [2, 3], sizeCount: 5, room: 8 })).toEqual({ start: 0, count: 5 });
  });

  it('stands round the path where there are more sizes than room', () => {
    expect(windowRound({ path: [10, 11], sizeCount: 20, room: 6 })).toEqual({ start: 8, count: 6 });
  });

  it('keeps within the first and the last size', () => {
    expect(windowRound({ path: [0], sizeCount: 20, room: 6 })).toEqual({ start: 0, count: 6 });
    expect(windowRound({ path: [19], sizeCount: 20, room: 6 })).toEqual({ start: 14, count: 6 });
  });

  it('grows to hold a path that is wider than the room', () => {
    expect(windowRound({ path: [4, 12], sizeCount: 20, room: 6 })).toEqual({ start: 4, count: 9 });
  });

  it('stays where it is while the path keeps a size away from its edges', () => {
    const before = { start: 4, count: 6 };
    expect(windowRound({ path: [5, 8], sizeCount: 20, room: 6 }, before)).toEqual(before);
  });

  it('moves no further than the path asks for', () => {
    expect(windowRound({ path: [9], sizeCount: 20, room: 6 }, { start: 4, count: 6 })).toEqual({
      start: 5,
      count: 6,
    });
    expect(windowRound({ path: [4], sizeCount: 20, room: 6 }, { start: 4, count: 6 })).toEqual({
      start: 3,
      count: 6,
    });
  });

  it('works for one size and for two hundred', () => {
    expect(windowRound({ path: [0], sizeCount: 1, room: 6 })).toEqual({ start: 0, count: 1 });
    expect(windowRound({ path: [199, 150], sizeCount: 200, room: 8 })).toEqual({ start: 150, count: 50 });
    expect(wholeRange(200)).toEqual({ start: 0, count: 200 });
  });
});

describe('pathGeometry', () => {
  const geometry = pathGeometry({ start: 4, count: 5 }, 220, 10);

  it('gives every size the middle of its column', () => {
    expect(geometry.column).toBe(40);
    expect(geometry.toX(4)).toBe(30);
    expect(geometry.toX(8)).toBe(190);
  });

  it('finds the size nearest to a point, never outside the window', () => {
    expect(geometry.toPosition(30)).toBe(4);
    expect(geometry.toPosition(51)).toBe(5);
    expect(geometry.toPosition(-100)).toBe(4);
    expect(geometry.toPosition(999)).toBe(8);
  });

  it('stops half-way between two sizes as well where it is cut there', () => {
    const halves = pathGeometry({ start: 4, count: 5 }, 220, 10, 2);
    expect([geometry.stop, halves.stop]).toEqual([1, 0.5]);
    expect(halves.toPosition(30)).toBe(4);
    expect(halves.toPosition(48)).toBe(4.5);
    expect(halves.toPosition(62)).toBe(5);
    expect(halves.toPosition(-100)).toBe(4);
    expect(halves.toPosition(999)).toBe(8);
  });

  it('says on which side a place lies outside the drawing', () => {
    expect(geometry.toXWithin(2)).toEqual({ x: 8, isBeyond: -1 });
    expect(geometry.toXWithin(12)).toEqual({ x: 212, isBeyond: 1 });
    expect(geometry.toXWithin(6.5)).toEqual({ x: 130, isBeyond: 0 });
  });
});
