import type { SayContext } from '../../../shared/fit/say-words.ts';
import { easeX } from './ease-bar.tsx';
import { easeTicks, type EaseDomain } from './ease-scale.ts';
import type { InstrumentLayout } from './layout.ts';
import { placeLabels, textWidth } from './place-labels.ts';
import type { PathGeometry } from './size-window.ts';

interface InstrumentHeadProps {
  layout: InstrumentLayout;
  geometry: PathGeometry;
  domain: EaseDomain;
  context: SayContext;
  /** The sizes the path runs through. */
  used: ReadonlySet<number>;
}

/** The names over the columns: the sizes in sight, and the axis of the ease. */
export function InstrumentHead({ layout, geometry, domain, context, used }: InstrumentHeadProps) {
  const { headHeight: height, bars, path } = layout;
  return (
    <div
      aria-hidden="true"
      className="sticky top-0 z-2 border-b border-ink bg-paper text-small text-ink-2 print:static"
      style={{ height }}
    >
      {layout.isWide && <span className="absolute bottom-2 left-0">Point, body</span>}
      <SizeLabels geometry={geometry} left={path.left} height={height} sizes={context.sizes} used={used} />
      <EaseAxis domain={domain} left={bars.left} width={bars.width} height={height} context={context} />
      {layout.isWide && (
        <div
          className="absolute inset-x-0 bottom-2 grid text-right"
          style={{ gridTemplateColumns: layout.columns }}
        >
          <span className="col-start-4">ease, {context.unit}</span>
          <span>leeway, {context.unit}</span>
        </div>
      )}
    </div>
  );
}

interface SizeLabelsProps {
  geometry: PathGeometry;
  left: number;
  height: number;
  sizes: readonly string[];
  used: ReadonlySet<number>;
}

function SizeLabels({ geometry, left, height, sizes, used }: SizeLabelsProps) {
  const { start, count } = geometry.window;
  const shown = Array.from({ length: count }, (_, index) => start + index);
  const placed = placeLabels(
    shown.map((position) => ({
      key: String(position),
      x: geometry.toX(position),
      width: textWidth(sizes[position] ?? '', 14),
      rank: used.has(position) ? 0 : position === 0 || position === sizes.length - 1 ? 1 : 2,
    })),
    [],
    { from: -8, to: geometry.width + 8 },
  );
  return (
    <svg width={geometry.width} height={height} className="absolute top-0 overflow-visible" style={{ left }}>
      {shown.map(
        (position) =>
          placed.has(String(position)) && (
            <text
              key={position}
              x={geometry.toX(position)}
              y={height - 11}
              textAnchor="middle"
              fontSize="14"
              fontWeight={used.has(position) ? 700 : 500}
              fill={used.has(position) ? 'var(--ink)' : 'var(--ink-2)'}
            >
              {sizes[position]}
            </text>
          ),
      )}
    </svg>
  );
}

interface EaseAxisProps {
  domain: EaseDomain;
  left: number;
  width: number;
  height: number;
  context: SayContext;
}

function EaseAxis({ domain, left, width, height, context }: EaseAxisProps) {
  const ticks = easeTicks(domain, width, context.unit, 48);
  const zero = easeX(0, domain, width);
  const placed = placeLabels(
    ticks.map(({ mm, label }) => ({
      key: label,
      x: easeX(mm, domain, width),
      width: textWidth(label, 13),
      rank: 1,
    })),
    [{ from: zero - 15, to: zero + 15 }],
    { from: -6, to: width + 6 },
  );
  return (
    <svg
      width={width}
      height={height}
      className="absolute top-0 overflow-visible"
      style={{ left }}
      fontSize="13"
    >
      <text x={zero} y={height - 14} textAnchor="middle" fontWeight="600" fill="var(--ink)">
        body
      </text>
      {ticks.map(({ mm, label }) => {
        const x = easeX(mm, domain, width);
        return (
          <g key={label}>
            <line x1={x} x2={x} y1={height - 7} y2={height} stroke="var(--ink-2)" />
            {placed.has(label) && (
              <text x={x} y={height - 14} textAnchor="middle" fill="var(--ink-2)">
                {label}
              </text>
            )}
          </g>
        );
      })}
    </svg>
  );
}
