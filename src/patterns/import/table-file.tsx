import { useState } from 'react';
import {
  IMPORT_BYTES_MAX,
  type ImportTable,
  type TableRole,
} from '../../../shared/patterns/imports.schema.ts';
import { POINTS_MAX, SIZES_MAX } from '../../../shared/fit/fit.schema.ts';
import { ProblemError } from '../../api/problem-error.ts';
import { Button } from '../../ui/button.tsx';
import { FileDrop } from '../../ui/file-drop.tsx';
import { Notice } from '../../ui/notice.tsx';
import { failureWords } from '../../ui/use-server-errors.ts';
import { ExampleTable } from '../example-tables.tsx';
import { FileLink } from '../file-link.tsx';
import { useRemoveTable, useUploadTable } from '../queries.ts';

export const dropId = (role: TableRole) => `${role}-file`;

const ALLOWED = `A CSV file: a heading row of points, then a row for each size. At most 5 MB, ${SIZES_MAX} sizes and ${POINTS_MAX} points.`;
const TOO_LARGE =
  'This file is larger than 5 MB. A table of 200 sizes is far smaller: bring the table alone.';

interface TableFileProps {
  draftId: string;
  role: TableRole;
  name: string;
  table: ImportTable | null;
}

/** Where a table's file is brought in, replaced and taken out. What is refused says so here and changes nothing. */
export function TableFile({ draftId, role, name, table }: TableFileProps) {
  const upload = useUploadTable(draftId);
  const remove = useRemoveTable(draftId);
  const [tooLarge, setTooLarge] = useState(false);
  const take = (file: File) => {
    remove.reset();
    setTooLarge(file.size > IMPORT_BYTES_MAX);
    if (file.size > IMPORT_BYTES_MAX) upload.reset();
    else upload.mutate({ role, file });
  };
  const error = tooLarge ? TOO_LARGE : upload.isError ? sayUploadError(upload.error) : undefined;
  const drop = (
    <FileDrop
      id={dropId(role)}
      label={name}
      choose={table ? 'Choose another file' : 'Choose a file'}
      hint={ALLOWED}
      accept=".csv,.tsv,.txt,text/csv,text/tab-separated-values,text/plain"
      pending={upload.isPending}
      error={error}
      onFile={take}
    />
  );
  if (!table) {
    return (
      <div className="grid items-start gap-x-12 gap-y-6 lg:grid-cols-[minmax(0,30rem)_auto] lg:justify-start">
        {drop}
        <ExampleTable role={role} />
      </div>
    );
  }
  return (
    <div className="max-w-[44rem]">
      <div className="mb-3 flex flex-wrap items-center gap-x-6">
        <FileLink file={table.file} />
        <Button kind="quiet" pending={remove.isPending} onClick={() => remove.mutate(role)}>
          {remove.isPending ? 'Taking it out' : 'Take this table out'}
        </Button>
      </div>
      {remove.isError && (
        <div role="alert" className="mb-3">
          <Notice kind="error">{failureWords(remove.error)}</Notice>
        </div>
      )}
      {drop}
    </div>
  );
}

function sayUploadError(error: unknown): string {
  if (!(error instanceof ProblemError)) return failureWords(error);
  if (error.status === 413) return TOO_LARGE;
  const [first] = error.fields;
  return first?.detail ?? failureWords(error);
}
