import type { PointResult } from '../../../shared/fit/fit.schema.ts';
import { sayNode } from '../../../shared/fit/say-plan.ts';
import { capital, sayPoint, sayZone, sayVerdict, type SayContext } from '../../../shared/fit/say-words.ts';
import { printLength, printLengthWithUnit } from '../../../shared/units.ts';
import { Length } from '../../ui/length.tsx';
import { EaseBar } from './ease-bar.tsx';
import type { EaseDomain } from './ease-scale.ts';
import type { Ground } from './fitting.ts';
import type { InstrumentLayout, RowPlace } from './layout.ts';
import type { FitRow } from './row-order.ts';
import { SizeNode } from './size-node.tsx';
import type { PathGeometry } from './size-window.ts';

export interface RowProps {
  row: FitRow;
  place: RowPlace;
  layout: InstrumentLayout;
  geometry: PathGeometry;
  ground: Ground;
  domain: EaseDomain;
  fillId: string;
  isHeld: boolean;
  isReadOnly: boolean;
  onMove: (position: number) => void;
  onRelease: () => void;
  onDragging: (isDragging: boolean) => void;
}

/** One line of the instrument: the name, the zone's node, the room and its numbers. */
export function InstrumentRow(props: RowProps) {
  const { row, place, layout, ground, isHeld } = props;
  const name = row.result
    ? capital(sayPoint(row.result.point, ground.context.chestWord))
    : capital(sayZone(row.zone, ground.context.chestWord));
  return (
    <li
      className="absolute inset-x-0 border-b border-rule"
      style={{ top: place.top, height: place.height }}
      data-zone={row.zone}
      data-held={isHeld || undefined}
    >
      <PathHand {...props} />
      {layout.isWide ? <WideCells {...props} name={name} /> : <NarrowCells {...props} name={name} />}
    </li>
  );
}

/** The row's stretch of the path: a click on a size takes it, the node is dragged. */
function PathHand(props: RowProps) {
  const { row, place, layout, geometry, ground, isHeld, isReadOnly, onMove } = props;
  const { context } = ground;
  return (
    <>
      {!isReadOnly && (
        <div
          className="absolute inset-y-0 cursor-pointer touch-pan-y"
          style={{ left: layout.path.left, width: layout.path.width }}
          onClick={(event) => {
            const at = geometry.toPosition(event.clientX - event.currentTarget.getBoundingClientRect().left);
            if (at !== row.position) onMove(at);
          }}
        />
      )}
      <SizeNode
        label={`Size at the ${sayZone(row.zone, context.chestWord)}`}
        valueText={sayNode({ ...row, isHeld }, context)}
        sizeLabel={row.size.label}
        position={row.position}
        sizeCount={context.sizes.length}
        geometry={geometry}
        left={layout.path.left}
        middle={place.height / 2}
        isHeld={isHeld}
        isHandle={row.hasNode}
        isReadOnly={isReadOnly}
        onMove={onMove}
        onRelease={props.onRelease}
        onDragging={props.onDragging}
      />
    </>
  );
}

type CellProps = RowProps & { name: string };

function WideCells(props: CellProps) {
  const { row, layout, ground, place, name } = props;
  const { context } = ground;
  return (
    <div
      className="pointer-events-none grid h-full items-center"
      style={{ gridTemplateColumns: layout.columns }}
    >
      <div className="min-w-0 pr-2">
        <p className="truncate leading-snug font-semibold">{name}</p>
        <p className="flex flex-wrap items-center gap-x-2 text-note leading-snug text-ink-2">
          <BodyValue result={row.result} context={context} />
          <HeldWord {...props} />
        </p>
      </div>
      <span />
      <BarCell {...props} height={place.height} />
      {row.result && <Figures result={row.result} context={context} />}
    </div>
  );
}

function NarrowCells(props: CellProps) {
  const { row, layout, ground, name } = props;
  const { context } = ground;
  const { result } = row;
  return (
    <div className="pointer-events-none grid h-full" style={{ gridTemplateColumns: layout.columns }}>
      <div className="relative">
        <HeldTag {...props} />
      </div>
      <div className="min-w-0 py-2">
        <p className="flex items-baseline justify-between gap-x-2 leading-6">
          <span className="truncate font-semibold">{name}</span>
          {result && (
            <span className="shrink-0 text-note text-ink-2">
              <Length text={printLength(result.bodyMm, context.unit)} />
            </span>
          )}
        </p>
        {result && <BarCell {...props} height={result.easeMm === null ? 72 : 48} />}
        {result && <NarrowFigures result={result} context={context} />}
        <p
          className={`truncate text-small ${
            result ? (result.verdict === 'belowFloor' ? 'font-semibold text-madder' : '') : 'text-ink-2'
          }`}
        >
          {result ? sayVerdict(result) : sayFollows(row, context)}
        </p>
      </div>
    </div>
  );
}

function BodyValue({ result, context }: { result: PointResult | null; context: SayContext }) {
  if (!result) return <span>nothing to compare</span>;
  return <Length text={printLengthWithUnit(result.bodyMm, context.unit)} />;
}

/** On the phone the word hangs under the node: beside the numbers there is no room for it. */
function HeldTag(props: RowProps) {
  const { row, place, layout, geometry } = props;
  const half = 24;
  const { x } = geometry.toXWithin(row.position);
  const left = Math.max(0, Math.min(layout.path.width - 2 * half, x - half));
  return (
    <div
      className="absolute flex w-12 justify-center text-center text-small [&_button]:flex-col [&_button]:my-0 [&_button]:gap-0 [&_button]:bg-paper"
      style={{ left, top: place.height / 2 + 18 }}
    >
      <HeldWord {...props} />
    </div>
  );
}

/** What is held says so in a word, and lets go at once. */
function HeldWord({ row, ground, isHeld, isReadOnly, onRelease }: RowProps) {
  if (!isHeld || !row.hasNode) return null;
  if (isReadOnly) return <span className="font-semibold text-woad">held</span>;
  return (
    <button
      type="button"
      className="pointer-events-auto relative z-1 -my-1 inline-flex min-h-7 items-center gap-1.5 font-semibold text-woad"
      onClick={onRelease}
    >
      held<span className="sr-only"> at the {sayZone(row.zone, ground.context.chestWord)}</span>
      <span className="changeable leading-none">let go</span>
    </button>
  );
}

function BarCell({ row, ground, domain, layout, height, fillId }: RowProps & { height: number }) {
  const { result } = row;
  const { context } = ground;
  const box = 'relative flex items-center';
  if (!result) {
    return <div className={`${box} text-note text-ink-2`}>{sayFollows(row, context)}</div>;
  }
  if (result.easeMm === null) {
    return (
      <div className={`${box} text-note text-ink-2`} style={{ height }}>
        <span className={layout.isWide ? 'bg-paper pr-3' : 'text-small leading-tight'}>
          ease not published{sayDeviation(result, context)}
        </span>
      </div>
    );
  }
  return (
    <div className={box} style={{ height }}>
      <EaseBar
        result={result}
        ladder={ground.ladders.get(result.point) ?? []}
        sizes={context.sizes}
        domain={domain}
        width={layout.bars.width}
        height={height}
        fillId={fillId}
      />
    </div>
  );
}

function sayFollows({ follows }: FitRow, { chestWord }: SayContext): string {
  return follows === null ? 'follows its neighbour' : `follows the ${sayZone(follows, chestWord)}`;
}

/** Where only the chart is known, what can still be said: how far this body is from the one the size is drafted for. */
function sayDeviation({ deviationMm, size }: PointResult, { unit }: SayContext): string {
  if (deviationMm === null) return '';
  if (Math.abs(deviationMm) < 0.5) return `; exactly the body ${size.label} is drafted for`;
  const more = deviationMm > 0 ? 'more' : 'less';
  return `; ${printLengthWithUnit(Math.abs(deviationMm), unit)} ${more} than ${size.label} is drafted for`;
}

function Figures({ result, context }: { result: PointResult; context: SayContext }) {
  const isShort = result.verdict === 'belowFloor';
  const figure = 'text-right text-lead';
  return (
    <>
      <span className={`${figure} font-semibold ${isShort ? 'text-madder' : ''}`}>
        <Figure mm={result.easeMm} context={context} word="ease" />
      </span>
      <span className={`${figure} ${isShort ? 'text-madder' : 'text-ink-2'}`}>
        <Figure mm={result.leewayMm} context={context} word="leeway" />
      </span>
      <span className={`pl-7 leading-snug ${isShort ? 'font-semibold text-madder' : ''}`}>
        {sayVerdict(result)}
      </span>
    </>
  );
}

function NarrowFigures({ result, context }: { result: PointResult; context: SayContext }) {
  const isShort = result.verdict === 'belowFloor';
  if (result.easeMm === null) return null;
  return (
    <p className={`h-6 truncate text-note leading-6 ${isShort ? 'text-madder' : ''}`}>
      <b className="font-semibold">
        <Length text={printLength(result.easeMm, context.unit)} />
      </b>{' '}
      ease
      {result.leewayMm !== null && (
        <>
          , <Length text={printLength(result.leewayMm, context.unit)} /> leeway
        </>
      )}
    </p>
  );
}

function Figure({ mm, context, word }: { mm: number | null; context: SayContext; word: string }) {
  if (mm === null)
    return (
      <span className="text-note text-ink-2">
        –<span className="sr-only"> no {word} known</span>
      </span>
    );
  return (
    <>
      <span className="sr-only">{word} </span>
      <Length text={printLength(mm, context.unit)} />
    </>
  );
}
