import type { Ground } from './fitting.ts';
import type { InstrumentLayout } from './layout.ts';
import { pathLines } from './path-lines.ts';
import type { FitRow } from './row-order.ts';
import type { PathGeometry } from './size-window.ts';

interface SizePathProps {
  rows: readonly FitRow[];
  layout: InstrumentLayout;
  geometry: PathGeometry;
  ground: Ground;
}

/** The drawing under the nodes: the sizes' lines, the body's own place among them, and the path of the plan. */
export function SizePath({ rows, layout, geometry, ground }: SizePathProps) {
  const { start, count } = geometry.window;
  const lines = pathLines(rows, layout.rows, geometry);
  const sizes = Array.from({ length: count }, (_, index) => start + index);
  return (
    <svg
      aria-hidden="true"
      width={geometry.width}
      height={layout.height}
      className="pointer-events-none absolute top-0"
      style={{ left: layout.path.left }}
      fill="none"
    >
      {geometry.column >= 5 &&
        sizes.map((position) => (
          <line
            key={position}
            x1={geometry.toX(position)}
            x2={geometry.toX(position)}
            y1={0}
            y2={layout.height}
            stroke="var(--rule)"
          />
        ))}
      {geometry.stop < 1 &&
        geometry.column >= 16 &&
        sizes
          .slice(1)
          .map((position) => (
            <line
              key={position}
              x1={geometry.toX(position - 0.5)}
              x2={geometry.toX(position - 0.5)}
              y1={2}
              y2={layout.height}
              stroke="var(--rule)"
              strokeDasharray="2 6"
            />
          ))}
      <g stroke="var(--woad)">
        <path d={lines.neck} strokeWidth="2" strokeDasharray="2 4" />
        <path d={lines.sleeve} strokeWidth="2" strokeDasharray="2 4" />
        <path d={lines.trunk} strokeWidth="2.5" strokeDasharray="8 5" />
      </g>
      {rows.map((row, index) => (
        <BodyTick key={row.key} row={row} layout={layout} index={index} geometry={geometry} ground={ground} />
      ))}
    </svg>
  );
}

/** Where the body itself stands; beyond the ends of what is drawn, a tick at the edge with a line running out. */
function BodyTick({
  row,
  layout,
  index,
  geometry,
  ground,
}: Omit<SizePathProps, 'rows'> & { row: FitRow; index: number }) {
  const place = layout.rows[index];
  const at = row.result ? ground.bodyAt[row.result.point] : undefined;
  if (!place || at === undefined) return null;
  const { x, isBeyond } = geometry.toXWithin(at);
  const reach = layout.isWide ? 23 : 25;
  return (
    <g stroke="var(--ink)" strokeWidth="3">
      <line x1={x} x2={x} y1={place.middle - reach} y2={place.middle + reach} />
      {isBeyond !== 0 && (
        <line x1={x} x2={x + isBeyond * 8} y1={place.middle} y2={place.middle} strokeWidth="2" />
      )}
    </g>
  );
}
