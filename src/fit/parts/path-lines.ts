import type { PathGeometry } from './size-window.ts';
import type { RowPlace } from './layout.ts';
import type { FitRow } from './row-order.ts';

interface Stop {
  x: number;
  y: number;
  top: number;
  bottom: number;
}

/** The lines of the size path, as SVG paths: the trunk from shoulder to hem, and a line for each branch. */
export function pathLines(rows: readonly FitRow[], places: readonly RowPlace[], geometry: PathGeometry) {
  const stops = rows.map((row, index) => stopOf(row, places[index], geometry));
  const of = (keep: (row: FitRow) => boolean) => stops.filter((_, index) => rows[index] && keep(rows[index]));
  const trunk = of((row) => !row.isBranch);
  const neck = of((row) => row.zone === 'neck');
  const sleeve = of((row) => row.zone === 'sleeve');
  const shoulder = of((row) => row.zone === 'shoulder');
  return {
    trunk: run(trunk, true),
    neck: join(run(neck, false), neck.at(-1), shoulder[0]),
    sleeve: sleeveBranch(sleeve, shoulder.at(-1), geometry),
  };
}

function stopOf(row: FitRow, place: RowPlace | undefined, geometry: PathGeometry): Stop {
  const { top, height, middle } = place ?? { top: 0, height: 0, middle: 0 };
  const x = geometry.toXWithin(row.position).x;
  return { x, y: middle, top, bottom: top + height };
}

/** A line down through stops: straight in each row, easing from size to size between them, as on the tissue. */
function run(stops: readonly Stop[], hasEnds: boolean): string {
  const first = stops[0];
  const last = stops.at(-1);
  if (!first || !last) return '';
  const parts = [hasEnds ? `M${first.x} ${first.top + 8} L${first.x} ${first.y}` : `M${first.x} ${first.y}`];
  stops.forEach((stop, index) => {
    const before = stops[index - 1];
    if (before) parts.push(curve(before, stop));
  });
  if (hasEnds) parts.push(`L${last.x} ${last.bottom - 8}`);
  return parts.join(' ');
}

function curve(from: Stop, to: Stop): string {
  if (from.x === to.x) return `L${to.x} ${to.y}`;
  const bend = (to.y - from.y) * 0.5;
  return `C${from.x} ${from.y + bend} ${to.x} ${to.y - bend} ${to.x} ${to.y}`;
}

function join(line: string, from: Stop | undefined, to: Stop | undefined): string {
  if (!from || !to) return '';
  return `${line} ${curve(from, to)}`;
}

/** The sleeve leaves the shoulder sideways, runs down beside the sizes and comes in again to its own row. */
function sleeveBranch(sleeve: readonly Stop[], shoulder: Stop | undefined, geometry: PathGeometry): string {
  const first = sleeve[0];
  if (!first || !shoulder) return '';
  const lane = geometry.width - 1.5;
  const turn = 16;
  return [
    `M${shoulder.x} ${shoulder.y}`,
    `L${lane - turn} ${shoulder.y}`,
    `Q${lane} ${shoulder.y} ${lane} ${shoulder.y + turn}`,
    `L${lane} ${first.y - turn}`,
    `Q${lane} ${first.y} ${lane - turn} ${first.y}`,
    `L${first.x} ${first.y}`,
    run(sleeve, false).replace(/^M[^LC]*/, ''),
  ].join(' ');
}
