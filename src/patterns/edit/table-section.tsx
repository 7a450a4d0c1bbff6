import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { Button } from '../../ui/button.tsx';
import { TABLE_MEANINGS } from '../example-tables.tsx';
import { AtHand } from './at-hand.tsx';
import { addLine } from './edited-table.ts';
import type { FindingNote } from './finding-notes.ts';
import { TableGrid } from './table-grid.tsx';
import { useClipboard } from './use-clipboard.ts';
import { useGrid } from './use-grid.ts';
import type { TableEditing } from './use-table-edit.ts';

interface TableSectionProps {
  editing: TableEditing;
  role: TableRole;
  marks: ReadonlyMap<string, readonly FindingNote[]>;
  shownIn: LengthUnit;
}

const TITLES: Record<TableRole, string> = {
  chart: 'The size chart: the body',
  finished: 'Finished measurements: the cloth',
};
const EDGE: Record<TableRole, string> = {
  chart: 'border-t-2 border-ink',
  finished: 'border-t-2 border-dashed border-woad',
};

/** One of the two tables: under the body's line or the cloth's. */
export function TableSection({ editing, role, marks, shownIn }: TableSectionProps) {
  const grid = useGrid(editing, role);
  const clipboard = useClipboard(editing, role, grid);
  const isEmpty = editing.table[role].length === 0;
  return (
    <section aria-labelledby={`${role}-title`} className={`mt-10 pt-4 ${EDGE[role]}`}>
      <h2 id={`${role}-title`} className="text-section font-semibold">
        {TITLES[role]}
      </h2>
      {isEmpty ? (
        <>
          <p className="mt-1 max-w-[40rem] text-ink-2">
            {TABLE_MEANINGS[role]} This pattern has none so far.
          </p>
          <Button
            kind="quiet"
            onClick={() => {
              editing.act('A point added: choose which.', (now) => addLine(now, role, null));
              grid.moveTo({ line: 0, size: -1 });
            }}
          >
            Add a point to {role === 'chart' ? 'the size chart' : 'the finished measurements'}
          </Button>
        </>
      ) : (
        <div className="mt-3">
          <TableGrid
            editing={editing}
            role={role}
            grid={grid}
            clipboard={clipboard}
            marks={marks}
            shownIn={shownIn}
          />
          {clipboard.turn && (
            <p className="mt-2">
              <Button
                kind="quiet"
                onClick={() => {
                  clipboard.turn?.();
                  grid.moveTo(grid.at);
                }}
              >
                Lay what was pasted in the other way round
              </Button>
            </p>
          )}
          <AtHand editing={editing} role={role} grid={grid} marks={marks} shownIn={shownIn} />
        </div>
      )}
    </section>
  );
}
