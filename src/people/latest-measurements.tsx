import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { Measurement, Person } from '../../shared/people/people.schema.ts';
import { howToTake, MEASURING_ORDER, pointName } from '../../shared/points/catalogue.ts';
import type { PointId } from '../../shared/points/point-ids.ts';
import { printDay } from '../ui/day.ts';
import { Length } from '../ui/length.tsx';
import { SectionHeading } from '../ui/page-heading.tsx';
import { Table, Td, Th } from '../ui/table.tsx';
import { BodyFigure } from './drawing/body-figure.tsx';
import { printMeasurement, typedOtherwise } from './print-measurement.ts';
import { measurementSetQuery } from './queries.ts';
import { takenByWords } from './set-list.tsx';

/** What was measured last: each value, as typed where that differs, and how the point is taken; the tape on the figure. */
export function LatestMeasurements({ person, setId }: { person: Person; setId: string }) {
  const { data: set } = useSuspenseQuery(measurementSetQuery(setId));
  const [active, setActive] = useState<PointId | null>(null);
  const points = MEASURING_ORDER.filter((point) => set.values[point] !== undefined);
  return (
    <section
      aria-labelledby="latest"
      className="mt-9 grid items-start gap-x-14 gap-y-8 lg:grid-cols-[minmax(0,44rem)_minmax(0,1fr)]"
    >
      <div>
        <SectionHeading id="latest">Measured {printDay(set.takenOn)}</SectionHeading>
        <p className="mt-1 mb-4 text-note text-ink-2">
          {points.length === 1 ? '1 point' : `${points.length} points`}, {takenByWords(set.takenBy)}
        </p>
        <Table label={`Measurements of ${printDay(set.takenOn)}`}>
          <thead>
            <tr>
              <Th>Point</Th>
              <Th number>Measured</Th>
            </tr>
          </thead>
          <tbody>
            {points.map((point) => (
              <PointRow
                key={point}
                point={point}
                chestWord={person.chestWord}
                measurement={set.values[point]}
                onEnter={() => setActive(point)}
                onLeave={() => setActive(null)}
              />
            ))}
          </tbody>
        </Table>
        {set.notes !== '' && <p className="mt-4 whitespace-pre-line text-ink-2">{set.notes}</p>}
      </div>
      <div className="sticky top-8 hidden justify-center gap-10 lg:flex print:hidden">
        <BodyFigure view="front" known={points} active={active} className="h-[26rem]" />
        <BodyFigure view="back" known={points} active={active} className="h-[26rem]" />
      </div>
    </section>
  );
}

interface PointRowProps {
  point: PointId;
  chestWord: Person['chestWord'];
  measurement: Measurement | undefined;
  onEnter: () => void;
  onLeave: () => void;
}

function PointRow({ point, chestWord, measurement, onEnter, onLeave }: PointRowProps) {
  if (!measurement) return null;
  const typed = typedOtherwise(measurement);
  return (
    <tr onPointerEnter={onEnter} onPointerLeave={onLeave} onFocus={onEnter} onBlur={onLeave}>
      <th scope="row" className="border-b border-rule py-2 pr-6 align-baseline font-normal">
        <span className="font-semibold">{pointName(point, chestWord)}</span>
        <details className="text-note text-ink-2">
          <summary className="inline-flex min-h-8 items-center underline decoration-dashed decoration-1 underline-offset-4 hover:text-woad">
            How to take it
          </summary>
          <p className="max-w-[34rem] pb-2">{howToTake(point, chestWord)}</p>
        </details>
      </th>
      <Td number className="py-2">
        <span className="text-lead font-semibold">
          <Length text={printMeasurement(measurement)} />
        </span>
        {typed !== null && (
          <span className="block text-small text-ink-2">
            typed <Length text={typed} />
          </span>
        )}
      </Td>
    </tr>
  );
}
