import type { EditedTable } from './edited-table.ts';

/** A table at one time, and what was done to get there, as it stands after “Undo”. */
interface Step {
  table: EditedTable;
  words: string;
}

/** What an edit has been through: steps behind, where it stands, steps ahead that were undone. */
export interface History {
  past: readonly Step[];
  present: Step;
  future: readonly Step[];
}

/** The most steps that are kept to go back over. */
const STEPS_MAX = 200;

export function beginHistory(table: EditedTable): History {
  return { past: [], present: { table, words: '' }, future: [] };
}

/** A step on; the same table is no step. */
export function stepOn(history: History, table: EditedTable, words: string): History {
  if (table === history.present.table || isAlike(table, history.present.table)) return history;
  return {
    past: [...history.past, history.present].slice(-STEPS_MAX),
    present: { table, words },
    future: [],
  };
}

export function undo(history: History): History {
  const before = history.past.at(-1);
  if (!before) return history;
  return {
    past: history.past.slice(0, -1),
    present: before,
    future: [history.present, ...history.future],
  };
}

export function redo(history: History): History {
  const [next, ...future] = history.future;
  if (!next) return history;
  return { past: [...history.past, history.present], present: next, future };
}

function isAlike(a: EditedTable, b: EditedTable): boolean {
  return a.sizes === b.sizes && a.chart === b.chart && a.finished === b.finished;
}
