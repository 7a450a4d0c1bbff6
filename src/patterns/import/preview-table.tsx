import { memo, useMemo } from 'react';
import type { ImportColumn, ImportTable, TableRole } from '../../../shared/patterns/imports.schema.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { STICKY_CORNER, STICKY_HEAD, STICKY_SIDE, WideTable } from '../../ui/wide-table.tsx';
import { printMeasured } from '../unit-words.ts';
import type { useCorrections } from './corrections.ts';
import { NoteMarks, noteEdge } from './note-mark.tsx';
import { byTarget, placeIds, type Note } from './notes.ts';
import { PointChooser } from './point-chooser.tsx';

type Corrections = ReturnType<typeof useCorrections>;

interface PreviewTableProps {
  role: TableRole;
  table: ImportTable;
  notes: readonly Note[];
  /** What the understood lengths are printed in. */
  shownIn: LengthUnit;
  corrections: Corrections;
}

/** A table as it was understood, cell by cell: what was typed, and under it what it was taken for. */
export function PreviewTable({ role, table, notes, shownIn, corrections }: PreviewTableProps) {
  const marks = useMemo(() => byTarget(notes), [notes]);
  const sizeColumn = table.columns.find((column) => column.role === 'size');
  const columns = table.columns.filter((column) => column !== sizeColumn);
  return (
    <WideTable
      isTall
      label={role === 'chart' ? 'The size chart as understood' : 'The finished measurements as understood'}
    >
      <thead>
        <tr>
          <SizeHeading role={role} column={sizeColumn} marks={marks} />
          {columns.map((column) => (
            <ColumnHeading
              key={column.column}
              role={role}
              column={column}
              tableUnit={table.unit}
              notes={marks.get(placeIds.heading(role, column.column))}
              corrections={corrections}
            />
          ))}
        </tr>
      </thead>
      <tbody>
        {table.rows.map((row) => (
          <PreviewRow
            key={row.row}
            role={role}
            row={row}
            sizeColumn={sizeColumn?.column ?? null}
            columns={table.columns}
            marks={marks}
            shownIn={shownIn}
          />
        ))}
      </tbody>
    </WideTable>
  );
}

type Marks = ReadonlyMap<string, readonly Note[]>;

interface SizeHeadingProps {
  role: TableRole;
  column: ImportColumn | undefined;
  marks: Marks;
}

function SizeHeading({ role, column, marks }: SizeHeadingProps) {
  const id = column ? placeIds.heading(role, column.column) : undefined;
  const notes = id === undefined ? undefined : marks.get(id);
  return (
    <th
      id={id}
      tabIndex={-1}
      scope="col"
      className={`${STICKY_CORNER} ${noteEdge(notes)} pr-6 pb-2 font-normal`}
    >
      <span className="block text-small text-ink-2">{column?.heading ?? 'no column of sizes'}</span>
      <span className="font-semibold">Size</span>
      <span className="block">
        <NoteMarks notes={notes} />
      </span>
    </th>
  );
}

const SURENESS_WORDS: Record<ImportColumn['sureness'], string> = {
  chosen: 'as you chose',
  exact: 'surely',
  likely: 'likely: look',
  none: 'not recognised',
};

interface ColumnHeadingProps {
  role: TableRole;
  column: ImportColumn;
  tableUnit: LengthUnit;
  notes: readonly Note[] | undefined;
  corrections: Corrections;
}

function ColumnHeading({ role, column, tableUnit, notes, corrections }: ColumnHeadingProps) {
  const id = placeIds.heading(role, column.column);
  const point = corrections.pointOf(column.column, column.point);
  const heading = column.heading === '' ? 'no heading' : column.heading;
  return (
    <th scope="col" className={`${STICKY_HEAD} ${noteEdge(notes)} px-3 pb-2 font-normal`}>
      <span className="block max-w-56 text-small break-words text-ink-2">
        {column.column}. {heading}
      </span>
      <PointChooser
        id={id}
        label={`What column ${column.column}, ${heading}, is`}
        describedBy={`${id}-sure`}
        point={point}
        onChoose={(next) => corrections.choosePoint(column.column, next)}
      />
      <span id={`${id}-sure`} className="block text-small text-ink-2">
        {SURENESS_WORDS[column.sureness]}
        {column.role === 'point' && column.unit !== tableUnit && `, in ${column.unit}`}
      </span>
      <NoteMarks notes={notes} />
    </th>
  );
}

interface PreviewRowProps {
  role: TableRole;
  row: ImportTable['rows'][number];
  sizeColumn: number | null;
  columns: readonly ImportColumn[];
  marks: Marks;
  shownIn: LengthUnit;
}

const PreviewRow = memo(function PreviewRow(props: PreviewRowProps) {
  const { role, row, sizeColumn, columns, marks, shownIn } = props;
  const rowId = placeIds.row(role, row.row);
  const labelId = sizeColumn === null ? undefined : placeIds.cell(role, row.row, sizeColumn);
  const rowNotes = [
    ...(marks.get(rowId) ?? []),
    ...(labelId === undefined ? [] : (marks.get(labelId) ?? [])),
  ];
  const notes = rowNotes.length === 0 ? undefined : rowNotes;
  return (
    <tr>
      <th
        id={rowId}
        tabIndex={-1}
        scope="row"
        className={`${STICKY_SIDE} ${noteEdge(notes)} border-b border-rule py-1.5 pr-6 align-top font-semibold`}
      >
        <span id={labelId} tabIndex={-1} className="block">
          {row.label === '' ? 'no name' : row.label}
        </span>
        <NoteMarks notes={notes} />
      </th>
      {columns.map((column, at) =>
        column.column === sizeColumn ? null : (
          <PreviewCell
            key={column.column}
            id={placeIds.cell(role, row.row, column.column)}
            cell={row.cells[at]}
            isLeftOut={column.role !== 'point'}
            notes={marks.get(placeIds.cell(role, row.row, column.column))}
            shownIn={shownIn}
          />
        ),
      )}
    </tr>
  );
});

interface PreviewCellProps {
  id: string;
  cell: ImportTable['rows'][number]['cells'][number] | undefined;
  isLeftOut: boolean;
  notes: readonly Note[] | undefined;
  shownIn: LengthUnit;
}

function PreviewCell({ id, cell, isLeftOut, notes, shownIn }: PreviewCellProps) {
  const typed = cell?.typed ?? '';
  const mm = cell?.mm ?? null;
  return (
    <td
      id={id}
      tabIndex={notes ? -1 : undefined}
      className={`${noteEdge(notes)} border-b border-rule px-3 py-1.5 align-top`}
    >
      <span className={`block max-w-56 break-words ${isLeftOut ? 'text-ink-2' : ''}`}>
        {typed === '' ? <span className="text-small text-ink-2">empty</span> : typed}
      </span>
      {mm !== null && (
        <span className="length block text-small text-ink-2">
          {printMeasured(mm, shownIn)} {shownIn}
        </span>
      )}
      <NoteMarks notes={notes} />
    </td>
  );
}
