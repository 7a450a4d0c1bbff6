import { useId, useMemo, useRef, useState } from 'react';
import type { FitPlan } from '../../../shared/fit/fit.schema.ts';
import type { ZoneId } from '../../../shared/fit/fit-words.ts';
import { easeX } from './ease-bar.tsx';
import { easeDomain, widen, type EaseDomain } from './ease-scale.ts';
import { Fills } from './fills.tsx';
import { domainValues, type Ground, type Held } from './fitting.ts';
import { InstrumentHead } from './instrument-head.tsx';
import { InstrumentRow } from './instrument-row.tsx';
import { layOut, roomForSizes, type InstrumentLayout } from './layout.ts';
import { rowsInOrder, type FitRow } from './row-order.ts';
import { SizePath } from './size-path.tsx';
import { pathGeometry, wholeRange, windowRound, type SizeWindow } from './size-window.ts';
import { useWidth } from './use-width.ts';

interface InstrumentProps {
  ground: Ground;
  plan: FitPlan;
  held: Held;
  /** Left out where nothing can be changed: a saved plan stays as it was. */
  onHold?: (zone: ZoneId, position: number) => void;
  onRelease?: (zone: ZoneId) => void;
}

/** The instrument: one row a point from neck to hem, the sizes and the plan's path left, the room it leaves right. */
export function Instrument({ ground, plan, held, onHold, onRelease }: InstrumentProps) {
  const box = useRef<HTMLDivElement>(null);
  const width = useWidth(box, 1200);
  const fillId = useId();
  const [showsAll, setShowsAll] = useState(false);
  const [isDragging, setDragging] = useState(false);
  const { sizes } = ground.context;
  const rows = useMemo(() => rowsInOrder(plan, ground.plan.zones), [plan, ground.plan]);
  const room = Math.min(sizes.length, roomForSizes(width));
  const layout = useMemo(() => layOut(rows, width, room), [rows, width, room]);
  const window = useSizeWindow(rows, { sizeCount: sizes.length, room, spare: isDragging ? 0 : 1 }, showsAll);
  const geometry = pathGeometry(window, layout.path.width, layout.path.edge, ground.perSize);
  const domain = useWideningDomain(ground, plan, Object.keys(held).length > 0);
  // Between two lines both are wanted: one measures from them.
  const used = new Set(rows.flatMap(({ position }) => [Math.floor(position), Math.ceil(position)]));
  return (
    <div ref={box} className="relative">
      <Fills id={fillId} />
      <SizesInSight window={window} sizes={sizes} room={room} showsAll={showsAll} onShowAll={setShowsAll} />
      <InstrumentHead
        layout={layout}
        geometry={geometry}
        domain={domain}
        context={ground.context}
        used={used}
      />
      <div className="relative" style={{ height: layout.height }}>
        <SizePath rows={rows} layout={layout} geometry={geometry} ground={ground} />
        <BranchHeading rows={rows} layout={layout} />
        <ol className="contents">
          {rows.map((row, index) => {
            const place = layout.rows[index];
            if (!place) return null;
            return (
              <InstrumentRow
                key={row.key}
                row={row}
                place={place}
                layout={layout}
                geometry={geometry}
                ground={ground}
                domain={domain}
                fillId={fillId}
                isHeld={held[row.zone] !== undefined}
                isReadOnly={!onHold}
                onMove={(position) => onHold?.(row.zone, position)}
                onRelease={() => onRelease?.(row.zone)}
                onDragging={setDragging}
              />
            );
          })}
        </ol>
        <BodyLine layout={layout} domain={domain} rows={rows} />
      </div>
    </div>
  );
}

/** The window follows the path and otherwise stays where it is, so that nothing slips away under a finger. */
function useSizeWindow(
  rows: readonly FitRow[],
  wanted: { sizeCount: number; room: number; spare: number },
  showsAll: boolean,
): SizeWindow {
  const [before, setBefore] = useState<SizeWindow | null>(null);
  if (showsAll) return wholeRange(wanted.sizeCount);
  const next = windowRound({ path: rows.map((row) => row.position), ...wanted }, before);
  if (before?.start !== next.start || before.count !== next.count) setBefore(next);
  return next;
}

/** The axis grows where a held size needs more room, and does not shrink while one is held: the marks would all move. */
function useWideningDomain(ground: Ground, plan: FitPlan, isHeld: boolean): EaseDomain {
  const [kept, setKept] = useState({ ground, domain: ground.domain });
  const base = isHeld && kept.ground === ground ? kept.domain : ground.domain;
  const needed = widen(base, easeDomain(domainValues(plan)));
  if (kept.ground !== ground || needed.low !== kept.domain.low || needed.high !== kept.domain.high) {
    setKept({ ground, domain: needed });
  }
  return needed;
}

interface SizesInSightProps {
  window: SizeWindow;
  sizes: readonly string[];
  room: number;
  showsAll: boolean;
  onShowAll: (showsAll: boolean) => void;
}

/** Says which sizes are drawn where not all have room, and the way to the rest. */
function SizesInSight({ window, sizes, room, showsAll, onShowAll }: SizesInSightProps) {
  if (sizes.length <= room) return null;
  const first = sizes[window.start] ?? '';
  const last = sizes[window.start + window.count - 1] ?? '';
  return (
    <p className="flex min-h-11 flex-wrap items-center gap-x-3 text-note text-ink-2 print:hidden">
      {showsAll
        ? `All ${sizes.length} sizes are drawn.`
        : `Sizes ${first} to ${last} of ${sizes[0] ?? ''} to ${sizes.at(-1) ?? ''}.`}
      <button type="button" className="min-h-11 font-semibold text-woad" onClick={() => onShowAll(!showsAll)}>
        <span className="changeable leading-tight">
          {showsAll ? 'Only those round the plan' : 'Draw all of them'}
        </span>
      </button>
    </p>
  );
}

/** The body: one solid line through every row. */
function BodyLine({
  layout,
  domain,
  rows,
}: {
  layout: InstrumentLayout;
  domain: EaseDomain;
  rows: readonly FitRow[];
}) {
  const x = easeX(0, domain, layout.bars.width);
  return (
    <svg
      aria-hidden="true"
      width={layout.bars.width}
      height={layout.height}
      className="pointer-events-none absolute top-0"
      style={{ left: layout.bars.left }}
    >
      {rows.map((row, index) => {
        const place = layout.rows[index];
        if (!place || !row.result || row.result.easeMm === null) return null;
        const [from, to] = layout.isWide
          ? [place.top, place.top + place.height]
          : [place.top + 32, place.top + 80];
        return <line key={row.key} x1={x} x2={x} y1={from} y2={to} stroke="var(--ink)" strokeWidth="2.5" />;
      })}
    </svg>
  );
}

/** Where the sleeve begins: it is sewn to the shoulder and cut from its own piece. */
function BranchHeading({ rows, layout }: { rows: readonly FitRow[]; layout: InstrumentLayout }) {
  const index = rows.findIndex((row, at) => row.zone === 'sleeve' && (layout.rows[at]?.heading ?? 0) > 0);
  const place = layout.rows[index];
  if (!place) return null;
  return (
    <p
      className="absolute inset-x-0 flex items-end border-b border-rule pb-1.5 text-note text-ink-2"
      style={{ top: place.top - place.heading, height: place.heading }}
    >
      <span style={{ paddingLeft: layout.isWide ? 0 : layout.bars.left }}>
        {layout.isWide ? 'The sleeve, from the shoulder' : 'The sleeve'}
      </span>
    </p>
  );
}
