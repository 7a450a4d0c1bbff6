import { useCallback, useEffect, useMemo, useReducer, useState } from 'react';
import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import { isSameTyping } from '../../../shared/patterns/tables-as-typed.ts';
import type { TypedTable } from '../../../shared/patterns/typed-cells.ts';
import { readTypedTable } from '../../../shared/patterns/typed-table.ts';
import { typedTable, writeAt, type EditedTable, type Place } from './edited-table.ts';
import { noteFindings } from './finding-notes.ts';
import { redo, stepOn, undo, type History } from './history.ts';
import { forgetEdit, keepEdit } from './kept-edit.ts';

type Action =
  | { do: 'step'; change: (table: EditedTable) => EditedTable; words: string }
  | { do: 'undo' }
  | { do: 'redo' };

function reduce(history: History, action: Action): History {
  if (action.do === 'undo') return undo(history);
  if (action.do === 'redo') return redo(history);
  return stepOn(history, action.change(history.present.table), action.words);
}

interface Start {
  /** What the edit is kept under in this tab. */
  name: string;
  basedOn: string | null;
  /** The tables as they were before anything was typed. */
  base: TypedTable;
  history: History;
  /** What is said at the beginning. */
  said?: string;
}

/** A table being edited: its history, how it reads, what stands at its cells, and that nothing typed is lost with the tab. */
export function useTableEdit({ name, basedOn, base, history: start, said: first = '' }: Start) {
  const [history, dispatch] = useReducer(reduce, start);
  const [said, say] = useState(first);
  const { table } = history.present;
  const isChanged = useMemo(() => !isSameTyping(typedTable(table), base), [table, base]);
  useEffect(() => {
    if (isChanged) keepEdit(name, { basedOn, table });
    else forgetEdit(name);
  }, [name, basedOn, table, isChanged]);
  const act = useCallback((words: string, change: (table: EditedTable) => EditedTable) => {
    dispatch({ do: 'step', change, words });
    say(words);
  }, []);
  const canUndo = history.past.length > 0;
  const canRedo = history.future.length > 0;
  return {
    table,
    ...useReading(table),
    isChanged,
    act,
    /** Keeps a cell that is still being written. */
    typing: (role: TableRole, place: Place, text: string) =>
      keepEdit(name, { basedOn, table: writeAt(table, role, [{ place, text }]) }),
    said,
    say,
    undo: () => {
      dispatch({ do: 'undo' });
      say(canUndo ? `Undone: ${history.present.words}` : 'There is nothing to undo.');
    },
    redo: () => {
      dispatch({ do: 'redo' });
      say(canRedo ? `Done again: ${history.future[0]?.words ?? ''}` : 'There is nothing to do again.');
    },
  };
}

/** How a table reads; what is only not written yet is said once somebody tries to save, not while they write. */
function useReading(table: EditedTable) {
  const [isAsked, setAsked] = useState(false);
  const reading = useMemo(() => readTypedTable(typedTable(table)), [table]);
  const errors = useMemo(() => reading.findings.filter(({ severity }) => severity === 'error'), [reading]);
  const notes = useMemo(() => {
    const told = reading.findings.filter(({ isMissing }) => isAsked || !isMissing);
    return noteFindings(told, table);
  }, [reading, table, isAsked]);
  return {
    reading,
    errors,
    notes,
    isAsked,
    /** Says everything that is missing from now on. */
    ask: () => setAsked(true),
  };
}

export type TableEditing = ReturnType<typeof useTableEdit>;
