import type { FitRow } from './row-order.ts';

/** Where everything of the instrument stands, in px. */
export interface InstrumentLayout {
  isWide: boolean;
  width: number;
  headHeight: number;
  /** The size path's column. */
  path: { left: number; width: number; edge: number };
  /** The ease bars' column. */
  bars: { left: number; width: number };
  /** A grid for each row on a wide screen. */
  columns: string;
  rows: RowPlace[];
  height: number;
}

/** One row's place; `heading` is the height of the line over it, where a branch begins. */
export interface RowPlace {
  top: number;
  height: number;
  heading: number;
  /** Where the path runs through it. */
  middle: number;
}

/** Narrower than this, name and numbers stand beside the path in one column. */
const WIDE_FROM = 860;
const NODE_ROOM = 44;
const BRANCH_HEADING = 44;

/** Lays the rows out for a width; `sizeCount` sizes are in the window. */
export function layOut(rows: readonly FitRow[], width: number, room: number): InstrumentLayout {
  return width >= WIDE_FROM ? layOutWide(rows, width, room) : layOutNarrow(rows, width);
}

/** How many sizes have room beside one another. */
export function roomForSizes(width: number): number {
  if (width < WIDE_FROM) return Math.max(4, Math.floor((narrowPathWidth(width) - 16) / 29));
  return Math.max(5, Math.floor((width * 0.29) / NODE_ROOM));
}

function layOutWide(rows: readonly FitRow[], width: number, room: number): InstrumentLayout {
  const name = width >= 1100 ? 196 : 152;
  const figures = width >= 1100 ? [84, 84, 176] : [68, 68, 128];
  const path = { left: name, width: room * NODE_ROOM + 2 * 14, edge: 14 };
  const gap = 36;
  const barsLeft = path.left + path.width + gap;
  const barsWidth = Math.max(160, width - barsLeft - figures.reduce((sum, each) => sum + each, 0));
  const places = stack(rows, (row) => (row.result ? 68 : 52));
  return {
    isWide: true,
    width,
    headHeight: 44,
    path,
    bars: { left: barsLeft, width: barsWidth },
    columns: `${name}px ${path.width + gap}px ${barsWidth}px ${figures.map((each) => `${each}px`).join(' ')}`,
    ...places,
  };
}

function layOutNarrow(rows: readonly FitRow[], width: number): InstrumentLayout {
  const pathWidth = narrowPathWidth(width);
  const gap = 14;
  const places = stack(rows, (row) => (row.result ? 132 : 64));
  return {
    isWide: false,
    width,
    headHeight: 40,
    path: { left: 0, width: pathWidth, edge: 8 },
    bars: { left: pathWidth + gap, width: Math.max(100, width - pathWidth - gap) },
    columns: `${pathWidth + gap}px minmax(0, 1fr)`,
    ...places,
  };
}

function narrowPathWidth(width: number): number {
  return Math.round(Math.min(340, Math.max(124, width * 0.46)));
}

function stack(
  rows: readonly FitRow[],
  heightOf: (row: FitRow) => number,
): { rows: RowPlace[]; height: number } {
  let top = 0;
  const places = rows.map((row, index) => {
    const heading =
      row.zone === 'sleeve' && rows[index - 1]?.zone !== 'sleeve' && index > 0 ? BRANCH_HEADING : 0;
    const height = heightOf(row);
    const place = { top: top + heading, height, heading, middle: top + heading + height / 2 };
    top += heading + height;
    return place;
  });
  return { rows: places, height: top };
}
