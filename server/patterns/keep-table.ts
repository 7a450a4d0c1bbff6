import type { ImportCorrections, ImportTable, TableRole } from '../../shared/patterns/imports.schema.ts';
import type { RouteDeps } from '../http/deps.ts';
import { newId } from '../db/columns.ts';
import { inTransaction } from '../db/transaction.ts';
import type { FileStore } from '../files/file-store.ts';
import { found, invalid, Problem } from '../http/problem.ts';
import { deleteFiles, insertFile } from './files.store.ts';
import { deleteDraft, holdDraft, setDraftFile, type KeptDraft } from './imports.store.ts';
import { readKept } from './read-draft.ts';
import { readTable, refusalOf } from './reading/read-table.ts';
import { removeBytes } from '../files/remove-bytes.ts';
import type { UploadedTable } from './upload-table.ts';

type Deps = Pick<RouteDeps, 'db' | 'log'> & { files: FileStore };

/**
 * Puts an uploaded file in a table's place. A file that is no table is refused and the one before stays. Bytes are kept
 * before the row that names them and removed after it is gone, so no row ever names bytes that are not there.
 */
export async function keepTable(
  { db, files, log }: Deps,
  draft: KeptDraft,
  role: TableRole,
  upload: UploadedTable,
): Promise<void> {
  const file = { id: newId(), name: upload.name, bytes: upload.content.length };
  const table = readTable(upload.content, file, role, { unit: null, points: {} });
  refuse(table);
  await files.put(file.id, upload.content);
  try {
    const before = await inTransaction(db, async (tx) => {
      const held = found(await holdDraft(tx, draft.id), 'import');
      await insertFile(tx, { ...file, ownerId: held.ownerId }, upload.content, upload.mediaType);
      await setDraftFile(tx, held.id, role, file.id, await keptCorrections(files, held, role, table));
      const old = held[role].file?.id;
      await deleteFiles(tx, old === undefined ? [] : [old]);
      return old === undefined ? [] : [old];
    });
    await removeBytes(files, log, before);
  } catch (error) {
    await removeBytes(files, log, [file.id]);
    throw error;
  }
}

/** Takes the file out of a table's place; nothing where there is none. */
export async function dropTable({ db, files, log }: Deps, draftId: string, role: TableRole): Promise<void> {
  const before = await inTransaction(db, async (tx) => {
    const held = found(await holdDraft(tx, draftId), 'import');
    const old = held[role].file;
    if (old === null) return [];
    await setDraftFile(tx, held.id, role, null);
    await deleteFiles(tx, [old.id]);
    return [old.id];
  });
  await removeBytes(files, log, before);
}

/** Deletes a draft with its files. */
export async function discardDraft({ db, files, log }: Deps, draftId: string): Promise<void> {
  const unused = await inTransaction(db, async (tx) => {
    const held = found(await holdDraft(tx, draftId), 'import');
    const ids = [held.chart.file, held.finished.file].flatMap((file) => (file ? [file.id] : []));
    await deleteDraft(tx, held.id);
    await deleteFiles(tx, ids);
    return ids;
  });
  await removeBytes(files, log, unused);
}

function refuse(table: ImportTable): void {
  const refusal = refusalOf(table);
  if (refusal === null) return;
  if (refusal.code === 'fileTooLarge') throw new Problem('tooLarge', { detail: refusal.words });
  const at = refusal.row === null ? '' : `Row ${refusal.row}: `;
  throw invalid([{ pointer: '/file', detail: `${at}${refusal.words}` }]);
}

/** A file mended and brought again keeps what was chosen for its columns, where its headings are still the same. */
async function keptCorrections(
  files: FileStore,
  draft: KeptDraft,
  role: TableRole,
  table: ImportTable,
): Promise<ImportCorrections | undefined> {
  const before = await readKept(files, draft, role);
  const headings = (read: ImportTable) => JSON.stringify(read.columns.map((column) => column.heading));
  return before && headings(before) === headings(table) ? draft[role].corrections : undefined;
}
