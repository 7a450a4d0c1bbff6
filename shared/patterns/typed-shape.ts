import { POINTS_MAX, SIZES_MAX } from '../fit/fit.schema.ts';
import { isGarmentPoint, pointName } from '../points/catalogue.ts';
import type { TableRole } from './imports.schema.ts';
import { quote } from './quote.ts';
import { isBlank } from './read-cell.ts';
import type { TableFinding, TypedTable } from './typed-cells.ts';

/** The most characters a size's name may have. */
const LABEL_MAX = 40;
const ROLES = ['chart', 'finished'] as const;
const IN_TABLE: Record<TableRole, string> = { chart: 'size chart', finished: 'finished measurements' };

/** What is missing or double among the sizes and points of a typed table; its cells are not read here. Never throws. */
export function checkShape(table: TypedTable): TableFinding[] {
  return [
    ...sayWhole(table),
    ...saySizes(table),
    ...ROLES.flatMap((role) => [...sayPoints(table, role), ...sayEmptySizes(table, role)]),
  ];
}

function error(pointer: string, words: string, isMissing = false): TableFinding {
  return { severity: 'error', pointer, words, isMissing };
}

function sayWhole({ sizes, chart, finished }: TypedTable): TableFinding[] {
  const findings: TableFinding[] = [];
  if (sizes.length === 0) findings.push(error('/sizes', 'A pattern has at least one size: add one.', true));
  if (sizes.length > SIZES_MAX) {
    findings.push(error('/sizes', `A pattern may have ${SIZES_MAX} sizes: leave some out.`));
  }
  if (chart.length + finished.length === 0) {
    const words = 'Add a point to the size chart or to the finished measurements: one of the two is enough.';
    findings.push(error('/chart', words, true));
  }
  const over = ROLES.filter((role) => ({ chart, finished })[role].length > POINTS_MAX);
  return [
    ...findings,
    ...over.map((role) => error(`/${role}`, `A table may have ${POINTS_MAX} points: leave some out.`)),
  ];
}

function saySizes({ sizes }: TypedTable): TableFinding[] {
  const first = new Map<string, number>();
  return sizes.flatMap((size, at) => {
    const pointer = `/sizes/${at}`;
    if (size === '') return [error(pointer, 'Write the name of this size, such as 12 or M.', true)];
    if (size.length > LABEL_MAX) {
      return [error(pointer, `The name of a size may have ${LABEL_MAX} characters: shorten it.`)];
    }
    const before = first.get(size.toLowerCase());
    first.set(size.toLowerCase(), before ?? at);
    if (before === undefined) return [];
    const words = `There is a size ${quote(sizes[before] ?? '')} already: give each size a name of its own.`;
    return [error(pointer, words)];
  });
}

function sayPoints(table: TypedTable, role: TableRole): TableFinding[] {
  return table[role].flatMap(({ point, typed }, at) => {
    const pointer = `/${role}/${at}/point`;
    const findings: TableFinding[] = [];
    if (point === null) findings.push(error(pointer, 'Choose which point this line is, or remove it.', true));
    else if (table[role].findIndex((other) => other.point === point) < at) {
      const words = `${pointName(point)} has a line already: choose another point, or remove one of the two.`;
      findings.push(error(pointer, words));
    } else if (role === 'chart' && isGarmentPoint(point)) {
      const words = `Only a garment has ${pointName(point).toLowerCase()}: in a size chart it says nothing of the body.`;
      findings.push({ severity: 'caution', pointer, words, isMissing: false });
    }
    if (table.sizes.every((_, place) => isBlank(typed[place] ?? ''))) {
      const name = point === null ? 'This line' : pointName(point);
      const words = `${name} has no measurement at any size: write one, or remove the line.`;
      findings.push(error(pointer, words, true));
    }
    return findings;
  });
}

/** As a file's reading does: every size has a measurement in each table there is, so that the table can leave and come back. */
function sayEmptySizes(table: TypedTable, role: TableRole): TableFinding[] {
  const columns = table[role];
  if (columns.length === 0) return [];
  return table.sizes.flatMap((size, at) => {
    if (!columns.every(({ typed }) => isBlank(typed[at] ?? ''))) return [];
    const name = size === '' ? 'This size' : `Size ${quote(size)}`;
    const words = `${name} has no measurement in the ${IN_TABLE[role]}: write one, or remove the size.`;
    return [error(`/sizes/${at}`, words, true)];
  });
}
