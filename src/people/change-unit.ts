import { POINT_IDS, type PointId } from '../../shared/points/point-ids.ts';
import { parseLength, type LengthUnit } from '../../shared/units.ts';

type Typed = Record<PointId, string>;

/**
 * When the unit of a form changes, what was written before keeps its meaning: its own unit is written behind it.
 * Answers the texts and which points were so marked.
 */
export function keepMeaning(typed: Typed, before: LengthUnit): { typed: Typed; marked: PointId[] } {
  const next = { ...typed };
  const marked: PointId[] = [];
  for (const point of POINT_IDS) {
    const read = parseLength(typed[point], before);
    if (!read.ok || read.unitWritten) continue;
    next[point] = `${typed[point].trim()} ${before}`;
    marked.push(point);
  }
  return { typed: next, marked };
}

/** Takes the marks away again: the numbers were meant in the new unit all along. */
export function takeAsNew(typed: Typed, marked: readonly PointId[], before: LengthUnit): Typed {
  const next = { ...typed };
  for (const point of marked) {
    const end = ` ${before}`;
    if (next[point].endsWith(end)) next[point] = next[point].slice(0, -end.length);
  }
  return next;
}
