import type { ImportDraft, ImportTable, TableRole } from '../../shared/patterns/imports.schema.ts';
import type { FileStore } from '../files/file-store.ts';
import type { KeptDraft } from './imports.store.ts';
import { checkDraft, isReady } from './reading/check-draft.ts';
import { readTable } from './reading/read-table.ts';

/** A draft as it now reads: both tables anew from the kept files, and what still stands in the way. */
export async function readDraft(files: FileStore, draft: KeptDraft): Promise<ImportDraft> {
  const chart = await readKept(files, draft, 'chart');
  const finished = await readKept(files, draft, 'finished');
  const issues = checkDraft(draft.details, chart, finished);
  const { id, patternId, createdAt, updatedAt, details } = draft;
  const ready = isReady(issues, [chart, finished]);
  return { id, patternId, createdAt, updatedAt, details, chart, finished, issues, ready };
}

/** One table of a draft, or null where no file was brought for it. */
export async function readKept(
  files: FileStore,
  draft: KeptDraft,
  role: TableRole,
): Promise<ImportTable | null> {
  const { file, corrections } = draft[role];
  return file ? readTable(await files.get(file.id), file, role, corrections) : null;
}
