import { useState, type ClipboardEvent } from 'react';
import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import { clearCells } from './cell-acts.ts';
import { textAt, writeAt, type EditedTable, type Place } from './edited-table.ts';
import { pasteBlock, sayPasted } from './paste-block.ts';
import { readBlock, turned, writeBlock, type Block } from './text-block.ts';
import type { Grid } from './use-grid.ts';
import type { TableEditing } from './use-table-edit.ts';

/** A block pasted in without headings could lie the other way: what is needed to turn it. */
interface Turnable {
  before: EditedTable;
  after: EditedTable;
  at: Place;
  block: Block;
}

/** Copy, cut and paste of a block of cells, as text with tabs and line ends, which every program with tables takes and gives. */
export function useClipboard(editing: TableEditing, role: TableRole, grid: Grid) {
  const { table, act, say } = editing;
  const [turnable, setTurnable] = useState<Turnable | null>(null);

  const onCopy = (event: ClipboardEvent, isCut = false) => {
    if (grid.draft !== null || grid.at.size < 0) return;
    const lines = [...new Set(grid.marked.map(({ line }) => line))];
    const block = lines.map((line) =>
      grid.marked.filter((place) => place.line === line).map((place) => textAt(table, role, place)),
    );
    event.clipboardData.setData('text/plain', writeBlock(block));
    event.preventDefault();
    const count = grid.marked.length;
    if (isCut) clearCells(editing, role, grid.marked);
    say(`${count === 1 ? 'One cell' : `${count} cells`} ${isCut ? 'cut' : 'copied'}.`);
  };

  const lay = (from: EditedTable, at: Place, block: Block) => {
    const pasted = pasteBlock(from, role, at, block);
    act(sayPasted(pasted), () => pasted.table);
    const isBlock = block.length > 1 || (block[0] ?? []).length > 1;
    setTurnable(isBlock && !pasted.hasHeadings ? { before: from, after: pasted.table, at, block } : null);
  };

  const onPaste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text/plain');
    if (grid.draft !== null && !/[\t\r\n]/.test(text.trim())) return;
    const block = readBlock(text);
    event.preventDefault();
    const [[only = ''] = []] = block;
    grid.finish();
    const isOne = block.length === 1 && block[0]?.length === 1;
    if (block.length === 0) say('There is no text to paste in.');
    else if (isOne && grid.at.size >= 0) {
      const texts = grid.marked.map((place) => ({ place, text: only }));
      const words = `${only} pasted into ${texts.length === 1 ? 'one cell' : `${texts.length} cells`}.`;
      act(words, (current) => writeAt(current, role, texts));
    } else lay(table, grid.marked[0] ?? grid.at, block);
  };

  return {
    onCopy,
    onPaste,
    /** Lays the block that was pasted in last the other way; null where there is none, or the table went on since. */
    turn: turnable?.after === table ? () => lay(turnable.before, turnable.at, turned(turnable.block)) : null,
  };
}

export type Clipboard = ReturnType<typeof useClipboard>;
