import { useMemo, useState, type KeyboardEvent } from 'react';
import type { LengthUnit } from '../../../shared/units.ts';
import { Button } from '../../ui/button.tsx';
import { SentenceSelect } from '../../ui/sentence-select.tsx';
import { UNIT_OPTIONS } from '../unit-words.ts';
import { FindingList } from './finding-list.tsx';
import { notesByCell } from './finding-notes.ts';
import { TableSection } from './table-section.tsx';
import type { TableEditing } from './use-table-edit.ts';

/** Both tables to be written on, undo and redo, and what stands at their cells. */
export function TableEditor({ editing }: { editing: TableEditing }) {
  const [shownIn, showIn] = useState<LengthUnit>('cm');
  const marks = useMemo(() => notesByCell(editing.notes), [editing.notes]);
  const onKeyDown = (event: KeyboardEvent) => {
    const isField = event.target instanceof HTMLInputElement || event.target instanceof HTMLTextAreaElement;
    if (isField || !(event.ctrlKey || event.metaKey) || event.altKey) return;
    const key = event.key.toLowerCase();
    if (key === 'z' && !event.shiftKey) editing.undo();
    else if ((key === 'z' && event.shiftKey) || key === 'y') editing.redo();
    else return;
    event.preventDefault();
  };
  return (
    <div onKeyDown={onKeyDown}>
      <p className="mt-8 max-w-[52rem] text-lead text-ink-2">
        Under each cell stands how it is read, in{' '}
        <SentenceSelect
          label="Unit for showing how cells are read"
          value={shownIn}
          options={UNIT_OPTIONS}
          onChange={showIn}
        />
        .
      </p>
      <details className="mt-1 max-w-[52rem] text-note text-ink-2">
        <summary className="inline-block py-1">
          <span className="changeable">How to write, paste and leave with the keyboard</span>
        </summary>
        <p className="mt-1">
          Arrows, Tab, Home and End move; with Ctrl they go to the edge. Enter, F2 or just typing writes,
          Escape gives back what was there. Shift with an arrow marks a block; Ctrl+C, Ctrl+X and Ctrl+V copy,
          cut and paste it, also from and to a spreadsheet. Ctrl+Z undoes, Ctrl+Shift+Z does it again. Escape
          and then Tab leaves the table.
        </p>
      </details>
      <div className="sticky top-0 z-4 mt-2 flex flex-wrap items-center gap-x-6 border-b border-rule bg-paper">
        <Button kind="quiet" onClick={editing.undo}>
          Undo
        </Button>
        <Button kind="quiet" onClick={editing.redo}>
          Redo
        </Button>
        <p role="status" className="min-w-0 text-note text-ink-2">
          {editing.said}
        </p>
      </div>
      <TableSection editing={editing} role="chart" marks={marks} shownIn={shownIn} />
      <TableSection editing={editing} role="finished" marks={marks} shownIn={shownIn} />
      {editing.notes.length > 0 && (
        <section aria-labelledby="findings" className="mt-10">
          <h2 id="findings" tabIndex={-1} className="text-lead font-semibold">
            What to look at
          </h2>
          <FindingList notes={editing.notes} />
        </section>
      )}
    </div>
  );
}
