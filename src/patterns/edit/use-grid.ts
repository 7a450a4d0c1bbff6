import { useEffect, useRef, useState, type KeyboardEvent } from 'react';
import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import { textAt, type Place } from './edited-table.ts';
import { cellId } from './finding-notes.ts';
import { intentOf, placesBetween, writingIntentOf } from './grid-intent.ts';
import { clampPlace } from './grid-keys.ts';
import { clearCells, writeCell } from './cell-acts.ts';
import type { TableEditing } from './use-table-edit.ts';

/** Where the hand is in one table and what is marked. The table may become smaller under the hand. */
function useHand(role: TableRole, extent: { lines: number; sizes: number }, isWriting: boolean) {
  const [hand, setHand] = useState<Place>({ line: 0, size: 0 });
  const [anchor, setAnchor] = useState<Place | null>(null);
  const wantsFocus = useRef(false);
  const at = clampPlace(hand, extent);
  const from = clampPlace(anchor ?? at, extent);
  useEffect(() => {
    if (!wantsFocus.current || isWriting) return;
    wantsFocus.current = false;
    document.getElementById(cellId(role, at))?.focus();
  });
  return {
    at,
    marked: placesBetween(from, at),
    isMarked: ({ line, size }: Place) =>
      isBetween(line, from.line, at.line) && isBetween(size, from.size, at.size),
    /** To another cell; the block from where it was marked stays or grows where it is extended. */
    moveTo: (place: Place, isExtending = false) => {
      wantsFocus.current = true;
      setAnchor(isExtending ? (anchor ?? at) : null);
      setHand(place);
    },
    mark: (from: Place | null, to: Place = at) => {
      setAnchor(from);
      setHand(to);
    },
    /** After whatever was written the cell itself has the focus again. */
    takeFocus: () => {
      wantsFocus.current = true;
    },
  };
}

const isBetween = (at: number, a: number, b: number) => at >= Math.min(a, b) && at <= Math.max(a, b);

/** The keyboard and the hand in one table, and what is being written there. */
export function useGrid(editing: TableEditing, role: TableRole) {
  const { table, typing, say } = editing;
  const extent = { lines: table[role].length, sizes: table.sizes.length };
  const [draft, setDraft] = useState<string | null>(null);
  const [isLeaving, setLeaving] = useState(false);
  const { at, marked, isMarked, moveTo, mark, takeFocus } = useHand(role, extent, draft !== null);
  const change = (text: string) => {
    setDraft(text);
    typing(role, at, text);
  };
  const edit = (text: string | null, place: Place = at) => {
    mark(null, place);
    if (place.size < 0) document.querySelector<HTMLElement>(`#${cellId(role, place)} select`)?.focus();
    else if (text === null) setDraft(textAt(table, role, place));
    else change(text);
  };
  const finish = () => {
    setDraft(null);
    if (draft !== null) writeCell(editing, role, at, draft);
  };
  const onWritingKey = (event: KeyboardEvent) => {
    const intent = event.nativeEvent.isComposing ? null : writingIntentOf(event, at, extent);
    event.stopPropagation();
    if (intent === null) return;
    if (intent.do === 'keep') finish();
    else {
      setDraft(null);
      typing(role, at, textAt(table, role, at));
    }
    if (intent.do === 'keep' && intent.to === null) return;
    event.preventDefault();
    if (intent.do === 'keep' && intent.to !== null) moveTo(intent.to);
    else takeFocus();
  };
  const onKey = (event: KeyboardEvent) => {
    const intent = intentOf(event, at, extent, isLeaving);
    if (intent === null) return;
    event.preventDefault();
    setLeaving(intent.do === 'let go');
    if (intent.do === 'move') moveTo(intent.to, intent.isExtending);
    else if (intent.do === 'edit') edit(intent.text);
    else if (intent.do === 'clear') clearCells(editing, role, marked);
    else if (intent.do === 'let go') {
      mark(null);
      say('The next Tab leaves the table.');
    } else mark({ line: 0, size: 0 }, { line: extent.lines - 1, size: extent.sizes - 1 });
  };
  return { at, marked, isMarked, draft, moveTo, mark, edit, change, finish, takeFocus, onKey, onWritingKey };
}

export type Grid = ReturnType<typeof useGrid>;
