import { shortPointName } from '../../shared/points/catalogue.ts';
import { printLength, printLengthWithUnit, type LengthUnit } from '../../shared/units.ts';
import { SectionHeading } from '../ui/page-heading.tsx';
import { roomSpan, type PointLines } from './point-lines.ts';

interface DraftedRoomProps {
  lines: readonly PointLines[];
  sizes: readonly string[];
  unit: LengthUnit;
}

interface Span {
  least: number;
  most: number;
}

/** The room the draft gives at every point that stands in both tables: from the body's line to the cloth's. */
export function DraftedRoom({ lines, sizes, unit }: DraftedRoomProps) {
  const rows = lines.flatMap(({ point, room }) => {
    const span = room === null ? null : roomSpan(room);
    return room === null || span === null ? [] : [{ point, room, span }];
  });
  if (rows.length === 0) return null;
  const from = Math.min(0, ...rows.map(({ span }) => span.least));
  const to = Math.max(1, ...rows.map(({ span }) => span.most));
  const varies = rows.some(({ span }) => span.most - span.least > 1);
  return (
    <section aria-labelledby="room" className="mt-10">
      <SectionHeading id="room">The room the draft gives</SectionHeading>
      <p className="mt-1 max-w-[42rem] text-note text-ink-2">
        Drafted ease: the sewn garment less the body it is drafted for. The solid line is the body, the dashed
        line the cloth; the lengths are to one scale.
        {varies && ' Where it differs between sizes, the cloth stands at the least and at the most.'}
      </p>
      <ul className="mt-3 max-w-[64rem] border-t border-rule">
        {rows.map(({ point, room, span }) => (
          <li
            key={point}
            className="grid grid-cols-[1fr_auto] items-center gap-x-6 border-b border-rule py-1.5 md:grid-cols-[12rem_1fr_17rem] md:py-0"
          >
            <span className="font-semibold">{shortPointName(point)}</span>
            <RoomBar span={span} from={from} to={to} />
            <span className="text-right md:text-left">{sayRoom(room, span, sizes, unit)}</span>
          </li>
        ))}
      </ul>
    </section>
  );
}

function RoomBar({ span, from, to }: { span: Span; from: number; to: number }) {
  // A little air at either end keeps the outermost line whole.
  const at = (mm: number) => `${(2 + ((mm - from) / (to - from)) * 96).toFixed(2)}%`;
  const width = (Math.abs(span.least) / (to - from)) * 96;
  return (
    <svg
      aria-hidden="true"
      className="order-last col-span-full h-7 w-full md:order-none md:col-span-1 md:h-12"
      strokeWidth="2.5"
    >
      <rect
        x={at(Math.min(0, span.least))}
        y="22%"
        width={`${width.toFixed(2)}%`}
        height="56%"
        className="fill-woad-tint"
      />
      <line x1={at(0)} x2={at(0)} y1="0" y2="100%" className="stroke-ink" />
      {span.most - span.least > 1 && (
        <line
          x1={at(span.most)}
          x2={at(span.most)}
          y1="22%"
          y2="78%"
          strokeDasharray="4 3"
          strokeWidth="1.5"
          className="stroke-woad"
        />
      )}
      <line
        x1={at(span.least)}
        x2={at(span.least)}
        y1="10%"
        y2="90%"
        strokeDasharray="5 3"
        className="stroke-woad"
      />
    </svg>
  );
}

function sayRoom(
  room: readonly (number | null)[],
  { least, most }: Span,
  sizes: readonly string[],
  unit: LengthUnit,
): string {
  // What prints the same is the same to a reader.
  if (printLength(least, unit) === printLength(most, unit)) return printLengthWithUnit(least, unit);
  const sizeAt = (mm: number) => sizes[room.indexOf(mm)] ?? '';
  return `${printLength(least, unit)} in ${sizeAt(least)} to ${printLengthWithUnit(most, unit)} in ${sizeAt(most)}`;
}
