import type { ImportDraft, ImportIssue, TableRole } from '../../shared/patterns/imports.schema.ts';
import { patternInputSchema } from '../../shared/patterns/patterns.schema.ts';
import type { FieldProblem } from '../../shared/problem.ts';
import type { Db } from '../db/client.ts';
import { inTransaction } from '../db/transaction.ts';
import type { FileStore } from '../files/file-store.ts';
import { parse } from '../http/parse.ts';
import { found, refuseIfAny } from '../http/problem.ts';
import { deleteDraft, holdDraft } from './imports.store.ts';
import { addRevision, createPattern } from './patterns.store.ts';
import { readDraft } from './read-draft.ts';
import { buildTable } from './reading/build-table.ts';
import { missingDetails } from './reading/check-draft.ts';

/** The most field problems that one refusal lists. */
const LISTED_MAX = 50;

/**
 * Makes a pattern, or a pattern's next revision, of a draft: whole or not at all. The draft is held while it is read for the
 * last time, so of two commits one finds it and the other finds it gone. The files pass to the revision.
 */
export async function commitImport(
  db: Db,
  files: FileStore,
  draftId: string,
): Promise<{ patternId: string; revisionId: string }> {
  return inTransaction(db, async (tx) => {
    const kept = found(await holdDraft(tx, draftId), 'import');
    const draft = await readDraft(files, kept);
    refuseIfAny(obstacles(draft));
    const table = buildTable(draft.chart, draft.finished);
    const sources = {
      chartFileId: kept.chart.file?.id ?? null,
      finishedFileId: kept.finished.file?.id ?? null,
    };
    await deleteDraft(tx, draftId);
    if (kept.patternId === null) {
      const input = parse(patternInputSchema, draft.details);
      return createPattern(tx, kept.ownerId, input, table, sources);
    }
    const revisionId = await addRevision(tx, kept.patternId, kept.written, table, sources);
    return { patternId: kept.patternId, revisionId };
  });
}

/** What stands in the way, at the part of the draft where it stands. */
function obstacles(draft: ImportDraft): FieldProblem[] {
  const details = missingDetails(draft.details).map(({ field, words }) => ({
    pointer: `/details/${field}`,
    detail: words,
  }));
  const whole = draft.issues
    .filter((issue) => issue.severity === 'error' && !issue.code.endsWith('Missing'))
    .map((issue) => ({ pointer: issue.code === 'noTable' ? '/chart' : '/finished', detail: issue.words }));
  const tables = (['chart', 'finished'] as const).flatMap((role) => inTable(draft[role]?.issues ?? [], role));
  return [...details, ...whole, ...tables].slice(0, LISTED_MAX);
}

function inTable(issues: readonly ImportIssue[], role: TableRole): FieldProblem[] {
  return issues
    .filter((issue) => issue.severity === 'error')
    .map(({ row, column, words }) => {
      const at = [row === null ? '' : `Row ${row}`, column === null ? '' : `column ${column}`]
        .filter(Boolean)
        .join(', ');
      return { pointer: `/${role}`, detail: at === '' ? words : `${at}: ${words}` };
    });
}
