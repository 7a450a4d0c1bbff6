import type { Place } from './edited-table.ts';
import { isWriting, placeAfterKey, placeAfterTab, type Extent, type KeyPress } from './grid-keys.ts';

/** What a key asks for while nothing is being written. */
export type Intent =
  | { do: 'move'; to: Place; isExtending: boolean }
  | { do: 'let go' }
  | { do: 'edit'; text: string | null }
  | { do: 'clear' }
  | { do: 'mark all' };

/** Null: the key is the page's own, Tab at the table's end or after Escape among them. */
export function intentOf(press: KeyPress, at: Place, extent: Extent, isLeaving: boolean): Intent | null {
  if (press.key === 'Tab') {
    const to = isLeaving ? null : placeAfterTab(at, press.shiftKey, extent);
    return to && { do: 'move', to, isExtending: false };
  }
  const to = placeAfterKey(press, at, extent);
  if (to) {
    const isInside = (place: Place) => place.line >= 0 && place.size >= 0;
    return { do: 'move', to, isExtending: press.shiftKey && isInside(at) && isInside(to) };
  }
  switch (press.key) {
    case 'Escape':
      return { do: 'let go' };
    case 'Enter':
    case 'F2':
      return { do: 'edit', text: null };
    case 'Delete':
    case 'Backspace':
      return { do: 'clear' };
    case 'a':
      if (press.ctrlKey || press.metaKey) return { do: 'mark all' };
  }
  return isWriting(press) && press.key !== ' ' && at.size >= 0 ? { do: 'edit', text: press.key } : null;
}

/** What a key asks for while a cell is being written: to keep it and go on (nowhere: Tab leaves), or to have it as it was. */
export type WritingIntent = { do: 'keep'; to: Place | null } | { do: 'restore' };

/** Null: the key is the text's own. */
export function writingIntentOf(press: KeyPress, at: Place, extent: Extent): WritingIntent | null {
  if (press.key === 'Escape') return { do: 'restore' };
  if (press.key === 'Tab') return { do: 'keep', to: placeAfterTab(at, press.shiftKey, extent) };
  const up = press.key === 'ArrowUp' || (press.key === 'Enter' && press.shiftKey);
  const down = press.key === 'ArrowDown' || (press.key === 'Enter' && !press.shiftKey);
  if (!up && !down) return null;
  const plain = { shiftKey: false, ctrlKey: false, metaKey: false, altKey: false };
  const to = placeAfterKey({ ...plain, key: up ? 'ArrowUp' : 'ArrowDown' }, at, extent);
  return { do: 'keep', to: to ?? at };
}

/** Every place of the block between two corners, line by line. */
export function placesBetween(a: Place, b: Place): Place[] {
  const span = (from: number, to: number) =>
    Array.from({ length: Math.abs(to - from) + 1 }, (_, at) => Math.min(from, to) + at);
  return span(a.line, b.line).flatMap((line) => span(a.size, b.size).map((size) => ({ line, size })));
}
