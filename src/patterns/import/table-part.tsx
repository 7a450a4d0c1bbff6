import { memo, useMemo } from 'react';
import type { ImportTable, TableRole } from '../../../shared/patterns/imports.schema.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { Notice } from '../../ui/notice.tsx';
import { SentenceSelect } from '../../ui/sentence-select.tsx';
import { failureWords } from '../../ui/use-server-errors.ts';
import { TABLE_MEANINGS } from '../example-tables.tsx';
import { UNIT_OPTIONS } from '../unit-words.ts';
import { useCorrections } from './corrections.ts';
import { NoteList } from './note-list.tsx';
import { noteIssues, sayTotals } from './notes.ts';
import { PreviewTable } from './preview-table.tsx';
import { TableFile } from './table-file.tsx';

interface TablePartProps {
  draftId: string;
  role: TableRole;
  name: string;
  table: ImportTable | null;
  shownIn: LengthUnit;
  onShowIn: (unit: LengthUnit) => void;
}

/**
 * One of the two tables: what it is, its file, and how it was understood. Drawn anew only when its table is read anew:
 * it may have twelve thousand cells, and the details are typed above it.
 */
export const TablePart = memo(function TablePart(props: TablePartProps) {
  const { draftId, role, name, table, shownIn, onShowIn } = props;
  return (
    <>
      <p className="mb-5 max-w-[40rem] text-ink-2">{TABLE_MEANINGS[role]}</p>
      <TableFile draftId={draftId} role={role} name={name} table={table} />
      {/* A new file is read anew: what was chosen for the one before is not taken over by the page. */}
      {table && (
        <Understood
          key={table.file.id}
          draftId={draftId}
          role={role}
          table={table}
          shownIn={shownIn}
          onShowIn={onShowIn}
        />
      )}
    </>
  );
});

const UNIT_FROM_WORDS: Record<ImportTable['unitFrom'], string> = {
  chosen: 'as you chose',
  heading: 'as the headings say',
  cells: 'as its cells say',
  'size of the numbers': 'judging by the size of the numbers',
};
const DELIMITER_WORDS: Record<string, string> = { ',': 'commas', ';': 'semicolons', '\t': 'tabs' };

type UnderstoodProps = Omit<TablePartProps, 'name' | 'table'> & { table: ImportTable };

function Understood({ draftId, role, table, shownIn, onShowIn }: UnderstoodProps) {
  const corrections = useCorrections(draftId, role, table);
  const notes = useMemo(() => noteIssues(table, role), [table, role]);
  const hasTable = table.columns.length > 0;
  return (
    <div className="mt-7">
      {hasTable && (
        <>
          <p role="status" className="text-lead">
            <strong className="font-semibold">{sayTotals(table, notes)}</strong>
            {corrections.isReading && ' Reading it again.'}
          </p>
          <p className="mt-1 max-w-[52rem] text-lead text-ink-2">
            Read in{' '}
            <SentenceSelect
              label="Unit of this table"
              value={corrections.unit}
              options={UNIT_OPTIONS}
              onChange={(unit) => corrections.chooseUnit(unit)}
            />
            , {UNIT_FROM_WORDS[table.unitFrom]}; cells set apart by{' '}
            {DELIMITER_WORDS[table.delimiter] ?? table.delimiter}
            {table.decimalComma ? ', decimals after a comma' : ''}. Understood lengths are shown in{' '}
            <SentenceSelect
              label="Unit for showing what was understood"
              value={shownIn}
              options={UNIT_OPTIONS}
              onChange={onShowIn}
            />
            .
          </p>
        </>
      )}
      {corrections.error && (
        <div role="alert" className="mt-4">
          <Notice kind="error">
            <p>{failureWords(corrections.error)} The table below is as it was before.</p>
          </Notice>
        </div>
      )}
      <NoteList
        notes={notes}
        label={`What to look at in ${role === 'chart' ? 'the size chart' : 'the finished measurements'}`}
      />
      {notes.some(({ issue }) => issue.severity === 'error') && hasTable && (
        <p className="mt-3 max-w-[42rem] text-note text-ink-2">
          Mend a cell in the file and choose the file again, or leave its column out in the heading. Nothing
          else you entered changes.
        </p>
      )}
      {hasTable && (
        <div className="mt-6">
          <PreviewTable role={role} table={table} notes={notes} shownIn={shownIn} corrections={corrections} />
        </div>
      )}
    </div>
  );
}
