import type { MeasurementSet, Person } from '../../shared/people/people.schema.ts';
import { MEASURING_ORDER, pointName } from '../../shared/points/catalogue.ts';
import { printLength } from '../../shared/units.ts';
import { printDay } from '../ui/day.ts';
import { Length } from '../ui/length.tsx';
import { RowHead, Table, Td, Th } from '../ui/table.tsx';
import { printMeasurement, typedOtherwise } from './print-measurement.ts';

interface CompareTableProps {
  set: MeasurementSet;
  before: MeasurementSet | null;
  chestWord: Person['chestWord'];
}

/** Every value of a set, beside those of the one before and what has changed since. */
export function CompareTable({ set, before, chestWord }: CompareTableProps) {
  const points = MEASURING_ORDER.filter((point) => set.values[point] ?? before?.values[point]);
  return (
    <Table label={`Measurements of ${printDay(set.takenOn)}`}>
      <thead>
        <tr>
          <Th>Point</Th>
          <Th number>{printDay(set.takenOn)}</Th>
          {before && <Th number>{printDay(before.takenOn)}</Th>}
          {before && <Th number>Since then</Th>}
        </tr>
      </thead>
      <tbody>
        {points.map((point) => {
          const now = set.values[point];
          const then = before?.values[point];
          const typed = now ? typedOtherwise(now) : null;
          return (
            <tr key={point}>
              <RowHead className="min-w-24">{pointName(point, chestWord)}</RowHead>
              <Td number>
                {now ? (
                  <span className="font-semibold">
                    <Length text={printMeasurement(now)} />
                  </span>
                ) : (
                  <NotTaken />
                )}
                {typed !== null && (
                  <span className="block text-small text-ink-2">
                    typed <Length text={typed} />
                  </span>
                )}
              </Td>
              {before && (
                <Td number className="text-ink-2">
                  {then ? <Length text={printMeasurement(then)} /> : <NotTaken />}
                </Td>
              )}
              {before && (
                <Td number>
                  {now && then && <Length text={printLength(now.mm - then.mm, now.unit, { signed: true })} />}
                </Td>
              )}
            </tr>
          );
        })}
      </tbody>
    </Table>
  );
}

function NotTaken() {
  return <span className="text-small text-ink-2">not taken</span>;
}
