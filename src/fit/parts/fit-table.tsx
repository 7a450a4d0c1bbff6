import type { FitPlan, Measured } from '../../../shared/fit/fit.schema.ts';
import { capital, sayPoint, sayZone, sayVerdict, type SayContext } from '../../../shared/fit/say-words.ts';
import { printLength } from '../../../shared/units.ts';
import { Length } from '../../ui/length.tsx';
import { RowHead, Table, Td, Th } from '../../ui/table.tsx';
import { rowsInOrder, type FitRow } from './row-order.ts';
import type { Held } from './fitting.ts';

/** The instrument's numbers as a table: the same rows in the same order. */
export function FitTable({ plan, held, context }: { plan: FitPlan; held: Held; context: SayContext }) {
  return (
    <Table label={`Every point at its size, lengths in ${context.unit}`} className="text-note">
      <thead>
        <tr>
          <Th>Point</Th>
          <Th>Zone</Th>
          <Th>Size</Th>
          <Th number>Body</Th>
          <Th number>Drafted for</Th>
          <Th number>Finished</Th>
          <Th number>Ease</Th>
          <Th number>Drafted ease</Th>
          <Th number>Wearing ease</Th>
          <Th number>Leeway</Th>
          <Th>In words</Th>
        </tr>
      </thead>
      <tbody>
        {rowsInOrder(plan).map((row) => (
          <Row key={row.key} row={row} isHeld={held[row.zone] !== undefined} context={context} />
        ))}
      </tbody>
    </Table>
  );
}

function Row({ row, isHeld, context }: { row: FitRow; isHeld: boolean; context: SayContext }) {
  const { result } = row;
  const zone = sayZone(row.zone, context.chestWord);
  const size = `${row.size.label}${isHeld ? ', held' : ''}`;
  if (!result) {
    return (
      <tr>
        <RowHead>{capital(zone)}</RowHead>
        <Td>{zone}</Td>
        <Td>{size}</Td>
        <Td colSpan={8} className="text-ink-2">
          nothing to compare; follows{' '}
          {row.follows === null ? 'its neighbour' : `the ${sayZone(row.follows, context.chestWord)}`}
        </Td>
      </tr>
    );
  }
  const print = (mm: number | null) => (
    <Td number>
      <Length text={mm === null ? '–' : printLength(mm, context.unit)} />
    </Td>
  );
  return (
    <tr>
      <RowHead className="whitespace-nowrap">{capital(sayPoint(result.point, context.chestWord))}</RowHead>
      <Td>{zone}</Td>
      <Td>{size}</Td>
      {print(result.bodyMm)}
      <Td number>
        <Length text={printMeasured(result.chartMm, context)} />
      </Td>
      {print(result.finishedMm)}
      {print(result.easeMm)}
      {print(result.draftedEaseMm)}
      {print(result.floorMm)}
      {print(result.leewayMm)}
      <Td className={result.verdict === 'belowFloor' ? 'font-semibold text-madder' : ''}>
        {sayVerdict(result)}
      </Td>
    </tr>
  );
}

function printMeasured(value: Measured | null, { unit }: SayContext): string {
  if (value === null) return '–';
  if (typeof value === 'number') return printLength(value, unit);
  return `${printLength(value.low, unit)}–${printLength(value.high, unit)}`;
}
