import type { PatternTable } from './patterns.schema.ts';

/** A size that two tables have in common, by its place in each. */
export interface SizePair {
  from: number;
  to: number;
}

/**
 * Which sizes of two tables are the same one, in the order of the first: those with the same name, then, among the rest, those
 * of which more than half the cells are alike: they were renamed. Empty tables have none in common.
 */
export function pairSizes(from: PatternTable, to: PatternTable): SizePair[] {
  const pairs: SizePair[] = from.sizes
    .map((size, at) => ({ from: at, to: to.sizes.indexOf(size) }))
    .filter((pair) => pair.to !== -1);
  const taken = new Set(pairs.map((pair) => pair.to));
  from.sizes.forEach((_, at) => {
    if (pairs.some((pair) => pair.from === at)) return;
    const [best] = to.sizes
      .map((_size, place) => ({ place, share: taken.has(place) ? 0 : shareAlike(from, at, to, place) }))
      .filter(({ share }) => share > 0.5)
      .sort((a, b) => b.share - a.share);
    if (!best) return;
    taken.add(best.place);
    pairs.push({ from: at, to: best.place });
  });
  return pairs.sort((a, b) => a.from - b.from);
}

/** The share of the cells written on either side, at points in both tables, that hold the same length. */
function shareAlike(from: PatternTable, at: number, to: PatternTable, place: number): number {
  let alike = 0;
  let written = 0;
  for (const role of ['chart', 'finished'] as const) {
    for (const column of from[role]) {
      const other = to[role].find(({ point }) => point === column.point);
      const [before, after] = [column.mm[at] ?? null, other?.mm[place] ?? null];
      if (!other || (before === null && after === null)) continue;
      written += 1;
      if (JSON.stringify(before) === JSON.stringify(after)) alike += 1;
    }
  }
  return written === 0 ? 0 : alike / written;
}
