/** Which sizes the path shows: `count` of them from position `start`. */
export interface SizeWindow {
  start: number;
  count: number;
}

interface Wanted {
  /** The sizes the plan uses, by position. */
  path: readonly number[];
  sizeCount: number;
  /** How many sizes have room. */
  room: number;
  /** How many sizes the path keeps away from the window's edges, where there are more: 1 unless said. */
  spare?: number;
}

/**
 * The sizes to show round a path. The window before is kept while the path stays `spare` sizes away from its edges, and is
 * moved no further than needed: what one is pointing at should not slip away. It grows where a path is wider.
 */
export function windowRound(
  { path, sizeCount, room, spare: wished = 1 }: Wanted,
  before: SizeWindow | null = null,
): SizeWindow {
  const low = Math.max(0, Math.floor(Math.min(...path, sizeCount - 1)));
  const high = Math.min(sizeCount - 1, Math.ceil(Math.max(...path, 0)));
  const span = high - low + 1;
  const count = Math.min(sizeCount, Math.max(room, span, 1));
  const last = sizeCount - count;
  const centred = Math.round((low + high) / 2 - (count - 1) / 2);
  if (before?.count !== count) return { start: within(centred, 0, last), count };
  const spare = Math.min(wished, Math.floor((count - span) / 2));
  const start = within(before.start, high + spare - count + 1, low - spare);
  return { start: within(start, 0, last), count };
}

/** Every size at once. */
export function wholeRange(sizeCount: number): SizeWindow {
  return { start: 0, count: Math.max(1, sizeCount) };
}

/** How near the drawing's edge anything stands, in px: a stub between says that it lies further out. */
const EDGE_PX = 8;

/** Where sizes stand across a path of some width. */
export interface PathGeometry {
  width: number;
  column: number;
  /** How far it is from one place for a size to the next: a whole size, or half of one. */
  stop: number;
  window: SizeWindow;
  /** The x of a size's line. */
  toX: (position: number) => number;
  /** As `toX`, kept inside the drawing: `isBeyond` where the place itself lies outside it. */
  toXWithin: (position: number) => { x: number; isBeyond: -1 | 0 | 1 };
  /** The nearest place to an x, in the window. */
  toPosition: (x: number) => number;
}

/** Lays a window's sizes out over `width`, with room at both edges for a body beyond the first or last size. */
export function pathGeometry(
  window: SizeWindow,
  width: number,
  edge: number,
  perSize: 1 | 2 = 1,
): PathGeometry {
  const column = (width - 2 * edge) / window.count;
  const toX = (position: number) => edge + (position - window.start + 0.5) * column;
  return {
    width,
    column,
    stop: 1 / perSize,
    window,
    toX,
    toXWithin: (position) => {
      const x = toX(position);
      if (x < EDGE_PX) return { x: EDGE_PX, isBeyond: -1 };
      if (x > width - EDGE_PX) return { x: width - EDGE_PX, isBeyond: 1 };
      return { x, isBeyond: 0 };
    },
    toPosition: (x) =>
      within(
        Math.round(((x - edge) / column - 0.5) * perSize) / perSize + window.start,
        window.start,
        window.start + window.count - 1,
      ),
  };
}

function within(value: number, low: number, high: number): number {
  return Math.max(low, Math.min(high, value));
}
