import { memo } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { PatternTable } from '../../shared/patterns/patterns.schema.ts';
import { shortPointName } from '../../shared/points/catalogue.ts';
import { printLength, type LengthUnit } from '../../shared/units.ts';
import { SectionHeading } from '../ui/page-heading.tsx';
import { SentenceSelect } from '../ui/sentence-select.tsx';
import { STICKY_CORNER, STICKY_HEAD, STICKY_SIDE, WideTable } from '../ui/wide-table.tsx';
import { DraftedRoom } from './drafted-room.tsx';
import { linesOf, type PointLines } from './point-lines.ts';
import { printMeasured, UNIT_OPTIONS } from './unit-words.ts';

/** How the lengths are shown: in a unit, or cell by cell as they were typed. */
type Shown = LengthUnit | 'typed';
const SHOWN_OPTIONS = [
  ...UNIT_OPTIONS,
  { value: 'typed' as const, label: 'the drafter’s own writing', inList: 'As typed' },
];

/** A pattern's two tables as one: points down, sizes across, at each point the body, the cloth and the room between. */
export function RevisionTables({ table }: { table: PatternTable }) {
  const [search, setSearch] = useSearchParams();
  const lines = linesOf(table);
  const own = (lines[0]?.chart ?? lines[0]?.finished)?.unit ?? 'cm';
  const shown = SHOWN_OPTIONS.find(({ value }) => value === search.get('shown'))?.value ?? own;
  const unit = shown === 'typed' ? own : shown;
  return (
    <>
      <DraftedRoom lines={lines} sizes={table.sizes} unit={unit} />
      <section aria-labelledby="tables" className="mt-12">
        <SectionHeading id="tables">Every size</SectionHeading>
        <p className="mt-1 mb-4 text-lead text-ink-2">
          Lengths in{' '}
          <SentenceSelect
            label="How lengths are shown"
            value={shown}
            options={SHOWN_OPTIONS}
            onChange={(next) => {
              setSearch(
                (current) => {
                  const asked = new URLSearchParams(current);
                  asked.set('shown', next);
                  return asked;
                },
                { replace: true, preventScrollReset: true },
              );
            }}
          />
        </p>
        <WideTable label="Body, cloth and room at every size" isTall={lines.length > 12}>
          <thead>
            <tr>
              <th
                scope="col"
                className={`${STICKY_CORNER} w-24 min-w-24 py-2 pr-3 text-small font-normal text-ink-2`}
              >
                Point
              </th>
              <th
                scope="col"
                className={`${STICKY_HEAD} left-[7.25rem] z-2 w-20 min-w-20 py-2 pr-3 text-small font-normal text-ink-2 md:left-24`}
              >
                <span className="sr-only">Body, cloth or room</span>
              </th>
              {table.sizes.map((size) => (
                <th
                  key={size}
                  scope="col"
                  className={`${STICKY_HEAD} px-3 py-2 text-right font-semibold whitespace-nowrap`}
                >
                  {size}
                </th>
              ))}
            </tr>
          </thead>
          {lines.map((line) => (
            <PointRows key={line.point} line={line} shown={shown} unit={unit} sizes={table.sizes} />
          ))}
        </WideTable>
      </section>
    </>
  );
}

interface PointRowsProps {
  line: PointLines;
  shown: Shown;
  unit: LengthUnit;
  sizes: readonly string[];
}

const PointRows = memo(function PointRows({ line, shown, unit, sizes }: PointRowsProps) {
  const { point, chart, finished, room } = line;
  const name = shortPointName(point);
  const isTyped = shown === 'typed';
  const rows = [
    ...(chart
      ? [
          {
            word: 'body',
            note: isTyped ? chart.unit : '',
            cells: sizes.map((_, at) =>
              isTyped ? (chart.typed[at] ?? '') : printCell(chart.mm[at] ?? null, unit),
            ),
          },
        ]
      : []),
    ...(finished
      ? [
          {
            word: 'cloth',
            note: isTyped ? finished.unit : '',
            cells: sizes.map((_, at) =>
              isTyped ? (finished.typed[at] ?? '') : printCell(finished.mm[at] ?? null, unit),
            ),
          },
        ]
      : []),
    ...(room
      ? [
          {
            word: 'room',
            note: isTyped ? unit : '',
            cells: room.map((mm) => (mm === null ? '' : printLength(mm, unit))),
          },
        ]
      : []),
  ];
  return (
    <tbody>
      {rows.map(({ word, note, cells }, index) => {
        const edge = index === rows.length - 1 ? 'border-b border-rule py-1' : 'py-0.5';
        const fill = word === 'room' ? 'text-ink' : '';
        return (
          <tr key={word}>
            {index === 0 && (
              <th
                scope="rowgroup"
                rowSpan={rows.length}
                className={`${STICKY_SIDE} z-1 border-b border-rule py-2 pr-3 align-top leading-tight font-semibold`}
              >
                {name}
              </th>
            )}
            <th
              scope="row"
              className={`sticky left-[7.25rem] z-1 bg-paper pr-3 text-small font-normal text-ink-2 md:left-24 ${edge} ${index === 0 ? 'pt-2' : ''}`}
            >
              <LineWord word={word} />
              {note !== '' && `, ${note}`}
            </th>
            {cells.map((cell, at) => (
              <td
                key={at}
                className={`px-3 text-right ${edge} ${index === 0 ? 'pt-2' : ''} ${fill} ${word === 'room' ? 'bg-woad-tint' : ''}`}
              >
                <span className="length">{cell === '' ? '–' : cell}</span>
              </td>
            ))}
          </tr>
        );
      })}
    </tbody>
  );
});

const LINE_LOOK: Record<string, string> = {
  body: 'border-b-2 border-ink',
  cloth: 'border-b-2 border-dashed border-woad',
  room: 'bg-woad-tint px-1 text-ink',
};

/** The word with the line that stands for it everywhere. */
function LineWord({ word }: { word: string }) {
  return <span className={LINE_LOOK[word]}>{word}</span>;
}

const printCell = (mm: Parameters<typeof printMeasured>[0] | null, unit: LengthUnit) =>
  mm === null ? '' : printMeasured(mm, unit);
