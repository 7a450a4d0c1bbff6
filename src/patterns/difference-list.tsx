import type { ReactNode } from 'react';
import type { CellDifference, TableDifference } from '../../shared/patterns/comparison.schema.ts';
import { pointName } from '../../shared/points/catalogue.ts';
import { RowHead, Table, Td, Th } from '../ui/table.tsx';
import { sayShape } from './difference-words.ts';
import { printMeasured } from './unit-words.ts';

interface DifferenceListProps {
  difference: TableDifference;
  /** What each side is called at the head of its column. */
  names: { from: string; to: string };
  /** A further column: what is to be said of a cell. */
  about?: { title: string; say: (cell: CellDifference) => ReactNode };
}

const LINE_WORDS = { chart: 'body', finished: 'cloth' } as const;

/** What differs between two tables: sizes and points in sentences, then each cell with both values. */
export function DifferenceList({ difference, names, about }: DifferenceListProps) {
  const shape = sayShape(difference);
  return (
    <>
      {shape.length > 0 && (
        <ul className="mt-3 max-w-[44rem] border-t border-rule">
          {shape.map((words) => (
            <li key={words} className="border-b border-rule py-2">
              {words}
            </li>
          ))}
        </ul>
      )}
      {difference.cells.length > 0 && (
        <div className="mt-4 max-w-[56rem]">
          <Table label="Cells that differ">
            <thead>
              <tr>
                <Th>Point</Th>
                <Th>Size</Th>
                <Th number>{names.from}</Th>
                <Th number>{names.to}</Th>
                {about && <Th className="hidden md:table-cell">{about.title}</Th>}
              </tr>
            </thead>
            <tbody>
              {difference.cells.map((cell) => (
                <tr key={`${cell.role} ${cell.point} ${cell.size.to}`}>
                  <RowHead>
                    {pointName(cell.point)}
                    <span className="block text-small font-normal text-ink-2">
                      <span
                        className={
                          cell.role === 'chart'
                            ? 'border-b-2 border-ink'
                            : 'border-b-2 border-dashed border-woad'
                        }
                      >
                        {LINE_WORDS[cell.role]}
                      </span>
                    </span>
                    {about && (
                      <span className="block text-small font-normal md:hidden">{about.say(cell)}</span>
                    )}
                  </RowHead>
                  <Td>{cell.size.to}</Td>
                  <Side side={cell.from} />
                  <Side side={cell.to} note={cell.isSameLength ? 'the same length' : undefined} />
                  {about && <Td className="hidden md:table-cell">{about.say(cell)}</Td>}
                </tr>
              ))}
            </tbody>
          </Table>
        </div>
      )}
    </>
  );
}

function Side({ side, note }: { side: CellDifference['from']; note?: string | undefined }) {
  const { typed, unit, mm } = side;
  return (
    <Td number>
      {typed === '' ? <span className="text-small text-ink-2">empty</span> : `${typed} ${unit}`}
      <span className="block text-small text-ink-2">
        {note ?? (mm !== null && unit !== 'cm' ? `${printMeasured(mm, 'cm')} cm` : '')}
      </span>
    </Td>
  );
}
