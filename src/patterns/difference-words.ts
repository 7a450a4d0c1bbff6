import { listWords } from '../../shared/fit/say-words.ts';
import type { TableDifference } from '../../shared/patterns/comparison.schema.ts';
import { pointName } from '../../shared/points/catalogue.ts';
import { TABLE_NAMES } from './table-names.ts';
import { UNIT_WORDS } from './unit-words.ts';

/** What differs beside the cells, a sentence each. */
export function sayShape({ sizes, columns, isColumnsReordered }: TableDifference): string[] {
  const { added, removed, renamed, isReordered } = sizes;
  const names = (list: readonly string[]) => `${list.length === 1 ? 'size' : 'sizes'} ${listWords(list)}`;
  return [
    ...(added.length > 0 ? [`With ${names(added)}.`] : []),
    ...(removed.length > 0 ? [`Without ${names(removed)}.`] : []),
    ...renamed.map(({ from, to }) => `Size ${from} is called ${to}.`),
    ...(isReordered ? ['The sizes stand in another order.'] : []),
    ...columns.map(({ role, point, change, from, to }) => {
      const name = `${pointName(point)} in ${TABLE_NAMES[role]}`;
      if (change === 'unit' && from && to)
        return `${name} is in ${UNIT_WORDS[to]}, no longer in ${UNIT_WORDS[from]}.`;
      return change === 'added' ? `With ${lower(name)}.` : `Without ${lower(name)}.`;
    }),
    ...(isColumnsReordered ? ['The points stand in another order.'] : []),
  ];
}

/** “3 cells differ, and the sizes or points do.” */
export function sayDifference(difference: TableDifference): string {
  if (difference.isSame) return 'Nothing differs: the tables are the same.';
  const cells = difference.cells.length;
  const shape = sayShape(difference).length;
  const parts = [
    ...(cells > 0 ? [cells === 1 ? 'one cell' : `${cells} cells`] : []),
    ...(shape > 0
      ? [shape === 1 ? 'one thing about sizes or points' : `${shape} things about sizes or points`]
      : []),
  ];
  return `${listWords(parts)} ${cells + shape === 1 ? 'differs' : 'differ'}.`.replace(/^./, (first) =>
    first.toUpperCase(),
  );
}

const lower = (name: string) => name.charAt(0).toLowerCase() + name.slice(1);
