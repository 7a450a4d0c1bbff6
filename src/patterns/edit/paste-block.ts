import { POINTS_MAX, SIZES_MAX } from '../../../shared/fit/fit.schema.ts';
import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import { readCell } from '../../../shared/patterns/read-cell.ts';
import { matchHeading } from '../../../shared/points/headings.ts';
import type { PointId } from '../../../shared/points/point-ids.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { addLine, addSize, changeLine, writeAt, type EditedTable, type Place } from './edited-table.ts';
import { turned, type Block } from './text-block.ts';

/** What became of a block that was pasted in. */
export interface Pasted {
  table: EditedTable;
  cells: number;
  sizesAdded: number;
  pointsAdded: number;
  /** The block was a whole table with its headings: they were read, and nothing depends on where it was pasted. */
  hasHeadings: boolean;
  /** It did not all fit: a pattern may have no more sizes or points. */
  isCut: boolean;
}

/**
 * Lays a block over the table. One that has the names of its points in its first line or column is read by its headings,
 * whichever way it lies; any other goes where the hand is, to the right and down, and the table grows to hold it.
 */
export function pasteBlock(table: EditedTable, role: TableRole, at: Place, block: Block): Pasted {
  const headed = withHeadings(block, role);
  return headed ? pasteHeaded(table, role, headed) : pastePlain(table, role, at, block);
}

interface Headed {
  sizes: string[];
  lines: { point: PointId; unit: LengthUnit | null; cells: string[] }[];
}

function withHeadings(block: Block, role: TableRole): Headed | null {
  const across = readHeaded(turned(block), role);
  const down = readHeaded(block, role);
  if (!across || (down && down.lines.length >= across.lines.length)) return down;
  return across;
}

/** Points down the first column, sizes along the first line; null where that is not how the block lies. */
function readHeaded(block: Block, role: TableRole): Headed | null {
  const [head = [], ...rest] = block;
  const sizes = head.slice(1);
  if (sizes.length === 0 || sizes.every((name) => name === '')) return null;
  const lines = rest.flatMap(([heading = '', ...cells]) => {
    const { point, unit } = matchHeading(heading, role);
    return point === null ? [] : [{ point, unit, cells }];
  });
  return lines.length === 0 || lines.length * 2 < rest.length ? null : { sizes, lines };
}

function pasteHeaded(before: EditedTable, role: TableRole, { sizes, lines }: Headed): Pasted {
  let table = before;
  const places = sizes.map((name) => {
    const known = table.sizes.findIndex((size) => size.name.toLowerCase() === name.toLowerCase());
    if (known !== -1) return known;
    const unnamed = table.sizes.findIndex((size, at) => size.name === '' && isEmptySize(table, at));
    if (unnamed === -1) table = addSize(table, table.sizes.length, name);
    else table = writeAt(table, role, [{ place: { line: -1, size: unnamed }, text: name }]);
    return unnamed === -1 ? table.sizes.length - 1 : unnamed;
  });
  let cells = 0;
  for (const { point, unit, cells: texts } of lines) {
    let line = table[role].findIndex((column) => column.point === point);
    if (line === -1 && table[role].length < POINTS_MAX) {
      table = addLine(table, role, point);
      line = table[role].length - 1;
      const written = unit ?? unitOf(texts);
      if (written) table = changeLine(table, role, line, { unit: written });
    } else if (unit) table = changeLine(table, role, line, { unit });
    const put = texts
      .slice(0, places.length)
      .map((text, at) => ({ place: { line, size: places[at] ?? -1 }, text }));
    cells += put.length;
    table = writeAt(table, role, put);
  }
  return { ...count(before, table, role), cells, hasHeadings: true, isCut: false };
}

const isEmptySize = (table: EditedTable, at: number) =>
  [...table.chart, ...table.finished].every(({ typed }) => (typed[at] ?? '') === '');

/** Fractions finer than a half are an inch's, and so are inch marks: a new line that is pasted in takes that unit. */
function unitOf(texts: readonly string[]): LengthUnit | null {
  for (const text of texts) {
    const read = readCell(text, 'in', 'chart');
    if (read.kind !== 'length') continue;
    if (read.unitWritten) return read.unit;
    if (/[¼¾⅛⅜⅝⅞]|\d\s*[/⁄]\s*(?:4|8|16|32)\b/.test(text)) return 'in';
  }
  return null;
}

function pastePlain(before: EditedTable, role: TableRole, at: Place, block: Block): Pasted {
  const start = { line: at.line, size: Math.max(0, at.size) };
  const width = Math.max(0, ...block.map((line) => line.length));
  let table = before;
  while (table.sizes.length < Math.min(SIZES_MAX, start.size + width)) {
    table = addSize(table, table.sizes.length);
  }
  while (table[role].length < Math.min(POINTS_MAX, start.line + block.length)) {
    table = addLine(table, role, null);
  }
  const texts = block.flatMap((line, down) =>
    line.map((text, right) => ({ place: { line: start.line + down, size: start.size + right }, text })),
  );
  const inside = texts.filter(
    ({ place }) => place.line < table[role].length && place.size < table.sizes.length,
  );
  return {
    ...count(before, writeAt(table, role, inside), role),
    cells: inside.length,
    hasHeadings: false,
    isCut: inside.length < texts.length,
  };
}

function count(before: EditedTable, table: EditedTable, role: TableRole) {
  return {
    table,
    sizesAdded: table.sizes.length - before.sizes.length,
    pointsAdded: table[role].length - before[role].length,
  };
}

/** What was done, in a sentence. */
export function sayPasted({ cells, sizesAdded, pointsAdded, hasHeadings, isCut }: Pasted): string {
  const many = (count: number, one: string, more: string) => `${count} ${count === 1 ? one : more}`;
  const grown = [
    ...(sizesAdded > 0 ? [many(sizesAdded, 'size', 'sizes')] : []),
    ...(pointsAdded > 0 ? [many(pointsAdded, 'point', 'points')] : []),
  ];
  const how = hasHeadings ? ', by the names of their points and sizes' : '';
  const added = grown.length > 0 ? ` ${grown.join(' and ')} added.` : '';
  const cut = isCut ? ' The rest did not fit: a pattern may have no more sizes or points.' : '';
  return `${many(cells, 'cell', 'cells')} pasted in${how}.${added}${cut}`;
}
