import type { TableDifference } from '../../shared/patterns/comparison.schema.ts';
import type { PatternTable } from '../../shared/patterns/patterns.schema.ts';
import { shortPointName } from '../../shared/points/catalogue.ts';
import { STICKY_HEAD, STICKY_SIDE, WideTable } from '../ui/wide-table.tsx';
import { linesOf } from './point-lines.ts';

interface VersionTableProps {
  title: string;
  table: PatternTable;
  difference: TableDifference;
  /** Which side of the difference this is. */
  side: 'from' | 'to';
}

/** One of two versions, as typed; the cells in which they differ lie on woad tint, and are said to differ. */
export function VersionTable({ title, table, difference, side }: VersionTableProps) {
  const places = new Set(difference.cells.map(({ role, point, size }) => `${role} ${point} ${size[side]}`));
  const only = new Set(side === 'from' ? difference.sizes.removed : difference.sizes.added);
  const rows = linesOf(table).flatMap(({ point, chart, finished }) => [
    ...(chart ? [{ role: 'chart' as const, word: 'body', point, column: chart }] : []),
    ...(finished ? [{ role: 'finished' as const, word: 'cloth', point, column: finished }] : []),
  ]);
  return (
    <div className="min-w-0">
      <h3 className="mb-2 font-semibold">{title}</h3>
      <WideTable label={`${title}, as typed`}>
        <thead>
          <tr>
            <th
              scope="col"
              className={`${STICKY_HEAD} pr-3 pb-1 text-left text-small font-normal text-ink-2`}
            >
              Point
            </th>
            {table.sizes.map((size) => (
              <th
                key={size}
                scope="col"
                className={`${STICKY_HEAD} px-2 pb-1 text-right font-semibold whitespace-nowrap`}
              >
                {size === '' ? 'no name' : size}
                {only.has(size) && <span className="block text-small font-normal">only here</span>}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ role, word, point, column }) => (
            <tr key={`${role} ${point}`}>
              <th
                scope="row"
                className={`${STICKY_SIDE} border-b border-rule py-1.5 pr-3 text-note font-medium whitespace-nowrap`}
              >
                {shortPointName(point)}{' '}
                <span
                  className={`text-small font-normal text-ink-2 border-b-2 ${role === 'chart' ? 'border-ink' : 'border-dashed border-woad'}`}
                >
                  {word}
                </span>{' '}
                <span className="text-small font-normal text-ink-2">{column.unit}</span>
              </th>
              {table.sizes.map((size, at) => {
                const differs = places.has(`${role} ${point} ${size}`);
                const typed = column.typed[at] ?? '';
                return (
                  <td
                    key={size}
                    className={`relative border-b border-rule px-2 py-1.5 text-right whitespace-nowrap ${differs ? 'bg-woad-tint font-semibold' : ''}`}
                  >
                    {typed === '' ? '–' : typed}
                    {differs && <span className="sr-only">, differs</span>}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </WideTable>
    </div>
  );
}
