import type { PointResult } from '../../../shared/fit/fit.schema.ts';
import type { EaseDomain } from './ease-scale.ts';
import { fillOf } from './fills.tsx';
import { placeLabels, textWidth } from './place-labels.ts';

interface EaseBarProps {
  result: PointResult;
  /** This point's ease in every size, by position. */
  ladder: readonly (number | null)[];
  sizes: readonly string[];
  domain: EaseDomain;
  width: number;
  height: number;
  fillId: string;
}

const TICK_FONT = 12;
/** Two hundred sizes would make a bar of ticks: nearer than this, one is left out. */
const LEAST_APART_PX = 4;

/** The room at one point: body 0, floor, drafted ease, the cloth at the chosen size, and the other sizes faintly. */
export function EaseBar({ result, ladder, sizes, domain, width, height, fillId }: EaseBarProps) {
  const toX = (mm: number) => easeX(mm, domain, width);
  const { easeMm, floorMm, draftedEaseMm, verdict } = result;
  if (easeMm === null) return null;
  const band = { top: height * 0.26, height: height * 0.34 };
  const foot = band.top + band.height;
  const from = toX(floorMm ?? 0);
  const cloth = toX(easeMm);
  const stroke = verdict === 'belowFloor' ? 'var(--madder)' : 'var(--woad)';
  return (
    <svg aria-hidden="true" width={width} height={height} className="absolute inset-0 overflow-visible">
      <rect
        x={Math.min(from, cloth)}
        width={Math.abs(cloth - from)}
        y={band.top}
        height={band.height}
        fill={fillOf(verdict, fillId)}
        {...(verdict === 'unknown' && { stroke: 'var(--woad)', strokeOpacity: 0.55 })}
      />
      {floorMm !== null && (
        <line x1={from} x2={from} y1={band.top - 4} y2={foot + 4} stroke="var(--ink-2)" strokeWidth="1.5" />
      )}
      {draftedEaseMm !== null && <Triangle x={toX(draftedEaseMm)} y={band.top - 3} />}
      <line
        x1={cloth}
        x2={cloth}
        y1={band.top - 5}
        y2={foot + 5}
        stroke={stroke}
        strokeWidth="3"
        strokeDasharray="5 3"
      />
      <OtherSizes
        ladder={ladder}
        sizes={sizes}
        chosen={result.size.position}
        toX={toX}
        width={width}
        top={foot + 1}
        taken={[0, floorMm, easeMm].flatMap((mm) => (mm === null ? [] : [toX(mm)]))}
      />
    </svg>
  );
}

/** Where an ease lies across the bars' column. */
export function easeX(mm: number, domain: EaseDomain, width: number): number {
  return ((mm - domain.low) / (domain.high - domain.low)) * width;
}

export function Triangle({ x, y }: { x: number; y: number }) {
  return (
    <path
      d={`M${x - 5} ${y - 8}H${x + 5}L${x} ${y}Z`}
      fill="var(--paper)"
      stroke="var(--ink-2)"
      strokeWidth="1.5"
    />
  );
}

interface OtherSizesProps {
  ladder: readonly (number | null)[];
  sizes: readonly string[];
  chosen: number;
  toX: (mm: number) => number;
  width: number;
  top: number;
  /** Where the body, the floor and the cloth stand: no label may touch them. */
  taken: readonly number[];
}

function OtherSizes({ ladder, sizes, chosen, toX, width, top, taken }: OtherSizesProps) {
  const ticks: { position: number; x: number; label: string }[] = [];
  ladder.forEach((mm, position) => {
    if (mm === null || position === chosen) return;
    const x = toX(mm);
    const isCrowded = Math.abs(x - (ticks.at(-1)?.x ?? -Infinity)) < LEAST_APART_PX;
    if (x >= 0 && x <= width && !isCrowded) ticks.push({ position, x, label: sizes[position] ?? '' });
  });
  const placed = labelsPlaced(ticks, chosen, taken, width);
  return (
    <g>
      {ticks.map(({ position, x, label }) => (
        <g key={position}>
          <line x1={x} x2={x} y1={top} y2={top + 6} stroke="var(--ink-2)" strokeOpacity="0.75" />
          {placed.has(String(position)) && (
            <text x={x} y={top + 18} textAnchor="middle" fontSize={TICK_FONT} fill="var(--ink-2)">
              {label}
            </text>
          )}
        </g>
      ))}
    </g>
  );
}

function labelsPlaced(
  ticks: readonly { position: number; x: number; label: string }[],
  chosen: number,
  taken: readonly number[],
  width: number,
): Set<string> {
  const wanted = ticks.map(({ position, x, label }) => ({
    key: String(position),
    x,
    width: textWidth(label, TICK_FONT),
    rank: Math.abs(position - chosen),
  }));
  const marks = taken.map((x) => ({ from: x - 2, to: x + 2 }));
  return placeLabels(wanted, marks, { from: 0, to: width }, 8);
}
