import type { Measured } from '../../shared/fit/fit.schema.ts';
import type { ChartColumn, FinishedColumn, PatternTable } from '../../shared/patterns/patterns.schema.ts';
import { POINT_IDS, type PointId } from '../../shared/points/point-ids.ts';

/** A point of a pattern down all its sizes: the body, the cloth, and the room that the draft gives between them. */
export interface PointLines {
  point: PointId;
  chart: ChartColumn | null;
  finished: FinishedColumn | null;
  /** Drafted ease in mm by size; null where the point does not stand in both tables. */
  room: (number | null)[] | null;
}

/** A pattern's points from head to foot. */
export function linesOf(table: PatternTable): PointLines[] {
  return POINT_IDS.flatMap((point) => {
    const chart = table.chart.find((column) => column.point === point) ?? null;
    const finished = table.finished.find((column) => column.point === point) ?? null;
    if (!chart && !finished) return [];
    return [{ point, chart, finished, room: chart && finished ? roomOf(chart, finished) : null }];
  });
}

function roomOf(chart: ChartColumn, finished: FinishedColumn): (number | null)[] {
  return chart.mm.map((body, at) => {
    const cloth = finished.mm[at] ?? null;
    return body === null || cloth === null ? null : cloth - middleOf(body);
  });
}

/** Where the chart gives a range of bodies the drafted ease is held against its middle. */
const middleOf = (mm: Measured): number => (typeof mm === 'number' ? mm : (mm.low + mm.high) / 2);

/** The least and the most room over the sizes, in mm; null where it is known at none. */
export function roomSpan(room: readonly (number | null)[]): { least: number; most: number } | null {
  const known = room.filter((mm) => mm !== null);
  return known.length === 0 ? null : { least: Math.min(...known), most: Math.max(...known) };
}
