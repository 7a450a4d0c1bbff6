import type { FocusEvent, KeyboardEvent, MouseEvent } from 'react';
import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import type { PointId } from '../../../shared/points/point-ids.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { pointName } from '../../../shared/points/catalogue.ts';
import { STICKY_CORNER, WideTable } from '../../ui/wide-table.tsx';
import { UNIT_WORDS } from '../unit-words.ts';
import { CellField } from './cell-field.tsx';
import { changeLine, type Place } from './edited-table.ts';
import { cellId, sayPlace, type FindingNote } from './finding-notes.ts';
import { GridCell } from './grid-cell.tsx';
import { LineHead } from './line-head.tsx';
import { sayReading } from './say-reading.ts';
import type { Clipboard } from './use-clipboard.ts';
import type { Grid } from './use-grid.ts';
import type { TableEditing } from './use-table-edit.ts';

interface TableGridProps {
  editing: TableEditing;
  role: TableRole;
  grid: Grid;
  clipboard: Clipboard;
  marks: ReadonlyMap<string, readonly FindingNote[]>;
  /** What the lengths that were read are printed in. */
  shownIn: LengthUnit;
}

/** One of the two tables to be written on: points down, sizes across, every cell reached by keyboard. */
export function TableGrid({ editing, role, grid, clipboard, marks, shownIn }: TableGridProps) {
  const { table, act } = editing;
  const isHere = (place: Place) => place.line === grid.at.line && place.size === grid.at.size;
  const used = table[role].map(({ point }) => point);
  const choosePoint = (line: number, point: PointId) =>
    act(`Line ${line + 1} is ${pointName(point)}.`, (now) => changeLine(now, role, line, { point }));
  const chooseUnit = (line: number, unit: LengthUnit) =>
    act(`${sayPlace(table, role, { line, size: -1 })} in ${UNIT_WORDS[unit]}.`, (now) =>
      changeLine(now, role, line, { unit }),
    );
  const cell = (place: Place, text: string, under: string) => {
    const id = cellId(role, place);
    const isAtHand = isHere(place);
    const isWritten = isAtHand && grid.draft !== null;
    return (
      <GridCell
        key={place.size}
        id={id}
        line={place.line}
        size={place.size}
        text={text}
        under={under}
        notes={marks.get(id)}
        isAtHand={isAtHand}
        isMarked={grid.isMarked(place)}
      >
        {isWritten ? (
          <CellField grid={grid} label={sayPlace(table, role, place)} isName={place.line < 0} />
        ) : undefined}
      </GridCell>
    );
  };
  return (
    <WideTable
      role="grid"
      aria-multiselectable="true"
      label={
        role === 'chart' ? 'The size chart, to be written on' : 'The finished measurements, to be written on'
      }
      isTall={table[role].length > 10}
      {...handlers(grid, clipboard)}
    >
      <thead>
        <tr>
          <th scope="col" className={`${STICKY_CORNER} py-2 pr-2 text-small font-normal text-ink-2`}>
            Point
          </th>
          {table.sizes.map(({ name }, size) => cell({ line: -1, size }, name, ''))}
        </tr>
      </thead>
      <tbody>
        {table[role].map(({ point, unit, typed }, line) => (
          <tr key={line}>
            <LineHead
              role={role}
              line={line}
              point={point}
              unit={unit}
              used={used}
              notes={marks.get(cellId(role, { line, size: -1 }))}
              isAtHand={isHere({ line, size: -1 })}
              onPoint={choosePoint}
              onUnit={chooseUnit}
            />
            {table.sizes.map((_, size) => {
              const place = { line, size };
              const text = (isHere(place) ? grid.draft : null) ?? typed[size] ?? '';
              const under = sayReading(text, unit, role, shownIn) ?? 'not read';
              return cell(place, text, under);
            })}
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}

/** One set of handlers for the whole table: a cell says by its data where it is. */
function handlers(grid: Grid, clipboard: Clipboard) {
  const isChooser = (target: EventTarget) => target instanceof HTMLSelectElement;
  return {
    onKeyDown(event: KeyboardEvent) {
      if (!isChooser(event.target)) grid.onKey(event);
      else if (event.key === 'Escape') grid.moveTo(grid.at);
    },
    onFocus(event: FocusEvent) {
      const place = placeOf(event.target);
      if (place && (place.line !== grid.at.line || place.size !== grid.at.size)) grid.mark(null, place);
    },
    onMouseDown(event: MouseEvent) {
      const place = placeOf(event.target);
      if (!place || !event.shiftKey || place.size < 0) return;
      event.preventDefault();
      grid.moveTo(place, true);
    },
    onMouseOver(event: MouseEvent) {
      const place = placeOf(event.target);
      if (place && place.size >= 0 && event.buttons === 1 && grid.draft === null) grid.moveTo(place, true);
    },
    onClick(event: MouseEvent) {
      const place = placeOf(event.target);
      const isTouch = event.nativeEvent instanceof PointerEvent && event.nativeEvent.pointerType === 'touch';
      // A touch brings no keyboard until there is a field: it begins to write at once.
      if (place && place.size >= 0 && isTouch && grid.draft === null && !isLink(event.target)) {
        grid.edit(null, place);
      }
    },
    onDoubleClick(event: MouseEvent) {
      const place = placeOf(event.target);
      if (place && place.size >= 0 && grid.draft === null) grid.edit(null, place);
    },
    onCopy: (event: React.ClipboardEvent) => clipboard.onCopy(event),
    onCut: (event: React.ClipboardEvent) => clipboard.onCopy(event, true),
    onPaste: clipboard.onPaste,
  };
}

const isLink = (target: EventTarget) => target instanceof Element && target.closest('a') !== null;

function placeOf(target: EventTarget): Place | null {
  const cell = target instanceof Element ? target.closest<HTMLElement>('[data-line]') : null;
  if (!cell) return null;
  return { line: Number(cell.dataset['line']), size: Number(cell.dataset['size']) };
}
