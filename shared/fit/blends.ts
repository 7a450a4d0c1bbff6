import type { PointId } from '../points/point-ids.ts';
import type { FitPoint } from './fit-garment.ts';
import type { Blend, FitInput, SizeRow } from './fit.schema.ts';
import { levelDistance } from './levels.ts';
import { sizeChoice } from './point-results.ts';
import type { ReckonedPoint, Reckoning } from './reckoning.ts';

/**
 * Every crossing from one size to another as it is cut, from shoulder to hem: the change in girth against staying in
 * the first size, shared over the seam edges, over the length between the levels. None where all zones
 * are alike; a crossing is left out where the pattern gives no point on either side of it.
 */
export function blendsOf(
  input: FitInput,
  reckoning: Reckoning,
  places: readonly number[],
  governing: readonly (ReckonedPoint | null)[],
): Blend[] {
  const { parents } = reckoning.garment;
  const blends: Blend[] = [];
  for (let zone = 1; zone < places.length; zone++) {
    const parent = parents[zone] ?? 0;
    if (places[zone] === places[parent]) continue;
    const blend = blendAt(input, reckoning, places, governing, parent, zone);
    if (blend) blends.push(blend);
  }
  return blends;
}

function blendAt(
  input: FitInput,
  reckoning: Reckoning,
  places: readonly number[],
  governing: readonly (ReckonedPoint | null)[],
  parent: number,
  zone: number,
): Blend | null {
  const { rows } = reckoning;
  const { zones, points } = reckoning.garment;
  const fromZone = zones[parent];
  const toZone = zones[zone];
  const from = places[parent] ?? 0;
  const to = places[zone] ?? 0;
  // Told at the level that is reached; where nothing is known there, by the grade of the level that is left.
  const candidates: (FitPoint | undefined)[] = [
    governing[zone]?.spec,
    ...points.filter((point) => point.zoneAt === zone),
    governing[parent]?.spec,
    ...points.filter((point) => point.zoneAt === parent),
  ];
  for (const spec of candidates) {
    if (!spec || !fromZone || !toZone) continue;
    const changeMm = changeBetween(input, spec.point, rows[from], rows[to]);
    if (changeMm === null) continue;
    const edges = input.garment.seamEdges?.[spec.point] ?? spec.edges;
    const perEdgeMm = changeMm / edges;
    const over = levelDistance(input, rows[from], fromZone, toZone);
    return {
      fromZone,
      toZone,
      from: sizeChoice(reckoning, from),
      to: sizeChoice(reckoning, to),
      point: spec.point,
      changeMm,
      edges,
      perEdgeMm,
      overMm: over?.mm ?? null,
      overIsAssumed: over?.isAssumed ?? false,
      angleDegrees: over && (Math.atan2(Math.abs(perEdgeMm), over.mm) * 180) / Math.PI,
    };
  }
  return null;
}

/** By how much the garment changes at a point between two sizes, in mm: as sewn, else as charted; null where unknown. */
function changeBetween(
  input: FitInput,
  point: PointId,
  before: SizeRow | undefined,
  after: SizeRow | undefined,
): number | null {
  const sewnBefore = before?.finished[point];
  const sewnAfter = after?.finished[point];
  if (sewnBefore !== undefined && sewnAfter !== undefined) return sewnAfter - sewnBefore;
  const bodyPoint = input.garment.compareAs?.[point] ?? point;
  const bodyBefore = middle(before?.body[bodyPoint]);
  const bodyAfter = middle(after?.body[bodyPoint]);
  return bodyBefore === null || bodyAfter === null ? null : bodyAfter - bodyBefore;
}

function middle(value: number | { low: number; high: number } | undefined): number | null {
  if (value === undefined) return null;
  return typeof value === 'number' ? value : (value.low + value.high) / 2;
}
