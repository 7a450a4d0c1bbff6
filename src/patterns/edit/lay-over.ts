import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import { pairSizes } from '../../../shared/patterns/pair-sizes.ts';
import type { PatternTable } from '../../../shared/patterns/patterns.schema.ts';
import { isBlank, readCell } from '../../../shared/patterns/read-cell.ts';
import type { TypedColumn } from '../../../shared/patterns/typed-cells.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import type { EditedTable } from './edited-table.ts';

/** One size on up to three sides, by its place in each; −1 where it is not. */
interface Strand {
  base: number;
  yours: number;
  theirs: number;
}

/**
 * Lays what you changed since `base` over the newer table: your cells, sizes, points and units where you touched them, theirs
 * everywhere else. What they removed and you changed comes back: nothing you typed is lost.
 */
export function layOver(base: PatternTable, yours: EditedTable, theirs: PatternTable): EditedTable {
  const strands = strandsOf(base, yours, theirs).filter((strand) => isKept(strand, base, yours));
  const sizes = strands.map(({ base: from, yours: mine, theirs: other }) => {
    const [own, old, newer] = [yours.sizes[mine]?.name, base.sizes[from], theirs.sizes[other] ?? null];
    const name = own !== undefined && own !== old ? own : (newer ?? own ?? '');
    return { name, was: newer };
  });
  const columns = (role: TableRole) => layColumns(base[role], yours[role], theirs[role], strands);
  return { sizes, chart: columns('chart'), finished: columns('finished') };
}

function strandsOf(base: PatternTable, yours: EditedTable, theirs: PatternTable): Strand[] {
  const pairs = pairSizes(base, theirs);
  const baseOfYours = yours.sizes.map(({ was }) => (was === null ? -1 : base.sizes.indexOf(was)));
  const theirsOf = (from: number) => pairs.find((pair) => pair.from === from)?.to ?? -1;
  const mine = yours.sizes.map((size, at): Strand => {
    const from = baseOfYours[at] ?? -1;
    // A size that both sides added under one name is one size.
    const theirOwn = theirs.sizes.findIndex(
      (name, place) => name === size.name && !pairs.some((pair) => pair.to === place),
    );
    return { base: from, yours: at, theirs: from === -1 ? theirOwn : theirsOf(from) };
  });
  const other = theirs.sizes.map((_, place): Strand => {
    const known = mine.find((strand) => strand.theirs === place);
    return known ?? { base: pairs.find((pair) => pair.to === place)?.from ?? -1, yours: -1, theirs: place };
  });
  const isReordered = baseOfYours
    .filter((at) => at !== -1)
    .some((at, place, all) => place > 0 && at < (all[place - 1] ?? -1));
  return isReordered ? weave(mine, other) : weave(other, mine);
}

/** The first list's order, with what only the second has put after whatever stands before it there. */
function weave<T>(first: readonly T[], second: readonly T[]): T[] {
  const woven = [...first];
  second.forEach((item, at) => {
    if (woven.includes(item)) return;
    const before = second[at - 1];
    woven.splice(before === undefined ? 0 : woven.indexOf(before) + 1, 0, item);
  });
  return woven;
}

function isKept({ base: from, yours: mine, theirs: other }: Strand, base: PatternTable, yours: EditedTable) {
  if (from === -1) return true;
  // You removed it, or they did and you had not touched it.
  if (mine === -1) return false;
  return other !== -1 || isTouched(from, mine, base, yours);
}

function isTouched(from: number, mine: number, base: PatternTable, yours: EditedTable): boolean {
  if (base.sizes[from] !== yours.sizes[mine]?.name) return true;
  return (['chart', 'finished'] as const).some((role) =>
    yours[role].some(({ point, typed }) => {
      const known: readonly TypedColumn[] = base[role];
      const before = known.find((column) => column.point === point);
      return (typed[mine] ?? '') !== (before?.typed[from] ?? '');
    }),
  );
}

function layColumns(
  base: readonly TypedColumn[],
  yours: readonly TypedColumn[],
  theirs: readonly TypedColumn[],
  strands: readonly Strand[],
): TypedColumn[] {
  const points = weave(
    theirs.map(({ point }) => point),
    yours.map(({ point }) => point),
  );
  const lineless = yours.filter(({ point }) => point === null);
  const laid = points.flatMap((point) => {
    const of = (columns: readonly TypedColumn[]) => columns.find((column) => column.point === point);
    const [from, mine, other] = [of(base), of(yours), of(theirs)];
    if (point === null || (from && !mine)) return [];
    if (from && mine && !other && JSON.stringify(from.typed) === JSON.stringify(mine.typed)) return [];
    return [layColumn(from, mine, other, strands)].flatMap((column) => (column ? [column] : []));
  });
  const cells = ({ typed }: TypedColumn) => strands.map(({ yours: at }) => typed[at] ?? '');
  return [...laid, ...lineless.map((column) => ({ ...column, typed: cells(column) }))];
}

function layColumn(
  from: TypedColumn | undefined,
  mine: TypedColumn | undefined,
  other: TypedColumn | undefined,
  strands: readonly Strand[],
): TypedColumn | null {
  const shown = mine ?? other;
  if (!shown) return null;
  const unit = mine && mine.unit !== from?.unit ? mine.unit : (other ?? shown).unit;
  const typed = strands.map((strand) => {
    const own = mine?.typed[strand.yours];
    const old = from?.typed[strand.base] ?? '';
    const newer = other?.typed[strand.theirs];
    if (mine && own !== undefined && own !== old) return inUnit(own, mine.unit, unit);
    if (newer === undefined) return mine && own !== undefined ? inUnit(own, mine.unit, unit) : '';
    // A text nobody touched is read in whatever unit its line now has; one that they changed keeps the one they meant.
    return newer === old ? newer : inUnit(newer, other?.unit ?? unit, unit);
  });
  return { point: shown.point, unit, typed };
}

/** A text that comes into a line of another unit says its own. */
function inUnit(text: string, own: LengthUnit, unit: LengthUnit): string {
  if (own === unit || isBlank(text)) return text;
  const read = readCell(text, own, 'chart');
  return read.kind === 'length' && !read.unitWritten ? `${text} ${own}` : text;
}
