import type { Place } from './edited-table.ts';

/** How far a table reaches: its lines and sizes. */
export interface Extent {
  lines: number;
  sizes: number;
}

export interface KeyPress {
  key: string;
  shiftKey: boolean;
  ctrlKey: boolean;
  metaKey: boolean;
  altKey: boolean;
}

/** The nearest place there is: lines from −1 (the names of the sizes), sizes from −1 (the point itself); never the corner. */
export function clampPlace({ line, size }: Place, { lines, sizes }: Extent): Place {
  const at = {
    line: Math.max(-1, Math.min(line, lines - 1)),
    size: Math.max(-1, Math.min(size, sizes - 1)),
  };
  if (at.line !== -1 || at.size !== -1) return at;
  return lines > 0 && size !== -1 ? { line: 0, size: -1 } : sizes > 0 ? { line: -1, size: 0 } : at;
}

const ARROWS: Record<string, [number, number]> = {
  ArrowUp: [-1, 0],
  ArrowDown: [1, 0],
  ArrowLeft: [0, -1],
  ArrowRight: [0, 1],
};

/** Where a key leads from a place: a step, with Ctrl to the edge; Home and End along the line. Null: not a key that moves. */
export function placeAfterKey(press: KeyPress, from: Place, extent: Extent): Place | null {
  if (press.altKey) return null;
  const isFar = press.ctrlKey || press.metaKey;
  const arrow = ARROWS[press.key];
  const last = { line: extent.lines - 1, size: extent.sizes - 1 };
  if (arrow) {
    const [down, right] = arrow;
    if (!isFar) return stepFrom(from, down, right, extent);
    const edge = (at: number, by: number, end: number) => (by === 0 ? at : by < 0 ? Math.min(0, at) : end);
    return { line: edge(from.line, down, last.line), size: edge(from.size, right, last.size) };
  }
  if (press.key === 'Home') return clampPlace({ line: isFar ? 0 : from.line, size: 0 }, extent);
  if (press.key === 'End')
    return clampPlace({ line: isFar ? last.line : from.line, size: last.size }, extent);
  return null;
}

function stepFrom(from: Place, down: number, right: number, extent: Extent): Place {
  const to = { line: from.line + down, size: from.size + right };
  const isInside = to.line >= -1 && to.size >= -1 && to.line < extent.lines && to.size < extent.sizes;
  const isCorner = to.line === -1 && to.size === -1;
  return isInside && !isCorner ? to : from;
}

/**
 * The next cell for Tab, line by line from the names of the sizes on, past the points' own cells; null where the table
 * ends and Tab leaves it.
 */
export function placeAfterTab(from: Place, isBack: boolean, extent: Extent): Place | null {
  const width = extent.sizes;
  const first = (from.line + 1) * width;
  const order = isBack ? first + Math.max(0, from.size) - 1 : first + from.size + 1;
  if (width === 0 || order < 0 || order >= (extent.lines + 1) * width) return null;
  return { line: Math.floor(order / width) - 1, size: order % width };
}

/** A key that writes: one sign, without Ctrl, Alt or Meta. */
export function isWriting(press: KeyPress): boolean {
  return /^.$/u.test(press.key) && !press.ctrlKey && !press.metaKey && !press.altKey;
}
