import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { Button } from '../../ui/button.tsx';
import {
  addLine,
  addSize,
  moveLine,
  moveSize,
  removeLine,
  removeSize,
  textAt,
  type EditedTable,
} from './edited-table.ts';
import { cellId, sayLine, saySize, type FindingNote } from './finding-notes.ts';
import { sayReading } from './say-reading.ts';
import type { Grid } from './use-grid.ts';
import type { TableEditing } from './use-table-edit.ts';

interface AtHandProps {
  editing: TableEditing;
  role: TableRole;
  grid: Grid;
  marks: ReadonlyMap<string, readonly FindingNote[]>;
  shownIn: LengthUnit;
}

/** Where the hand is, in a sentence, what stands there, and what can be done with its size and its point. */
export function AtHand({ editing, role, grid, marks, shownIn }: AtHandProps) {
  const { table, act } = editing;
  const { line, size } = grid.at;
  const sizeName = saySize(table, size);
  const lineName = sayLine(table, role, line);
  const change = (words: string, to: (now: EditedTable) => EditedTable, place = grid.at) => {
    act(words, to);
    grid.moveTo(place);
  };
  const notes = marks.get(cellId(role, grid.at)) ?? [];
  return (
    <div className="mt-3 text-note">
      <p className="min-h-6 max-w-[52rem]">
        <Where editing={editing} role={role} grid={grid} shownIn={shownIn} />
      </p>
      {notes.map((note) => (
        <p key={note.id} className={note.severity === 'error' ? 'font-medium text-madder' : ''}>
          {note.words}
        </p>
      ))}
      <div className="mt-2 flex flex-wrap gap-x-10 gap-y-1">
        {size >= 0 && (
          <Group name={capital(sizeName)}>
            <Act
              does="move left"
              to={sizeName}
              isOff={size === 0}
              onClick={() =>
                change(`${capital(sizeName)} moved left.`, (now) => moveSize(now, size, size - 1), {
                  line,
                  size: size - 1,
                })
              }
            />
            <Act
              does="move right"
              to={sizeName}
              isOff={size === table.sizes.length - 1}
              onClick={() =>
                change(`${capital(sizeName)} moved right.`, (now) => moveSize(now, size, size + 1), {
                  line,
                  size: size + 1,
                })
              }
            />
            <Act
              does="remove"
              to={sizeName}
              isOff={table.sizes.length === 1}
              onClick={() => change(`${capital(sizeName)} removed.`, (now) => removeSize(now, size))}
            />
          </Group>
        )}
        {line >= 0 && (
          <Group name={capital(lineName)}>
            <Act
              does="move up"
              to={lineName}
              isOff={line === 0}
              onClick={() =>
                change(`${capital(lineName)} moved up.`, (now) => moveLine(now, role, line, line - 1), {
                  line: line - 1,
                  size,
                })
              }
            />
            <Act
              does="move down"
              to={lineName}
              isOff={line === table[role].length - 1}
              onClick={() =>
                change(`${capital(lineName)} moved down.`, (now) => moveLine(now, role, line, line + 1), {
                  line: line + 1,
                  size,
                })
              }
            />
            <Act
              does="remove"
              to={lineName}
              onClick={() => change(`${capital(lineName)} removed.`, (now) => removeLine(now, role, line))}
            />
          </Group>
        )}
        <Group name="Add">
          <Act
            does={size < 0 ? 'a size' : `a size after ${sizeName.replace(/^size /, '')}`}
            to=""
            onClick={() =>
              change('A size added.', (now) => addSize(now, size < 0 ? now.sizes.length : size + 1), {
                line: -1,
                size: size < 0 ? table.sizes.length : size + 1,
              })
            }
          />
          <Act
            does="a point"
            to=""
            onClick={() =>
              change('A point added: choose which.', (now) => addLine(now, role, null), {
                line: table[role].length,
                size: -1,
              })
            }
          />
        </Group>
      </div>
    </div>
  );
}

function Where({ editing, role, grid, shownIn }: Omit<AtHandProps, 'marks'>) {
  const { table } = editing;
  const { line, size } = grid.at;
  if (grid.marked.length > 1) return <>{grid.marked.length} cells are marked, to copy, cut or empty.</>;
  const lineName = <strong className="font-semibold">{capital(sayLine(table, role, line))}</strong>;
  if (size < 0) return <>{lineName}: Enter opens the choice of point and unit.</>;
  const sizeName = <strong className="font-semibold">{saySize(table, size)}</strong>;
  if (line < 0) return <>The name of {sizeName}, in both tables.</>;
  const text = grid.draft ?? textAt(table, role, grid.at);
  const read = sayReading(text, table[role][line]?.unit ?? 'cm', role, shownIn);
  return (
    <>
      {lineName} at {sizeName}:{' '}
      {text === ''
        ? 'nothing is written.'
        : read === null
          ? `${text} is not read.`
          : `${text} is read as ${read === '' ? 'empty' : read}.`}
    </>
  );
}

function Group({ name, children }: { name: string; children: React.ReactNode }) {
  return (
    <div role="group" aria-label={name} className="flex flex-wrap items-center gap-x-4">
      <span aria-hidden="true" className="text-ink-2">
        {name}:
      </span>
      {children}
    </div>
  );
}

function Act({
  does,
  to,
  isOff = false,
  onClick,
}: {
  does: string;
  to: string;
  isOff?: boolean;
  onClick: () => void;
}) {
  return (
    <Button
      kind="quiet"
      disabled={isOff}
      aria-label={to === '' ? `Add ${does}` : `${capital(does)}: ${to}`}
      onClick={onClick}
    >
      {does}
    </Button>
  );
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);
