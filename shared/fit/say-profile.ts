import { printLengthWithUnit } from '../units.ts';
import type { SayContext } from './say-words.ts';
import { sayPoint } from './say-words.ts';
import type { PointId } from '../points/point-ids.ts';

/**
 * What a drawing of one point's ease over all sizes shows, as sentences. `easesMm` is in grade order, null where a
 * size gives none; `floorMm` is the wearing ease. Nothing published says so.
 */
export function sayProfile(
  point: PointId,
  easesMm: readonly (number | null)[],
  floorMm: number | null,
  context: SayContext,
): string {
  const known = easesMm.flatMap((mm, position) =>
    mm === null ? [] : [{ mm, label: context.sizes[position] ?? '' }],
  );
  const first = known[0];
  const last = known.at(-1);
  const name = sayPoint(point, context.chestWord);
  if (!first || !last) return `The ease at the ${name} is not published in any size.`;
  const print = (mm: number) => printLengthWithUnit(mm, context.unit);
  const range =
    known.length === 1
      ? `At the ${name}, size ${first.label} leaves ${print(first.mm)} of ease.`
      : `At the ${name}, ease runs from ${print(first.mm)} at size ${first.label} to ${print(last.mm)} at size ${last.label}.`;
  if (floorMm === null) return range;
  const enough = known.find((size) => size.mm >= floorMm);
  const words = `wearing ease (${print(floorMm)})`;
  return enough
    ? `${range} ${enough.label} is the first size with ${words}.`
    : `${range} No size leaves ${words}.`;
}
