import { isDeepStrictEqual } from 'node:util';
import type { DraftDetails, ImportCorrections } from '../../shared/patterns/imports.schema.ts';
import type { Db } from '../db/client.ts';
import { inTransaction } from '../db/transaction.ts';
import { found } from '../http/problem.ts';
import { holdDraft, updateDraft } from './imports.store.ts';

/** A change to a draft: only what was sent, whatever the schema would fill in. */
export interface DraftChange {
  details: Partial<DraftDetails>;
  chart: Partial<ImportCorrections>;
  finished: Partial<ImportCorrections>;
}

/** Lays a change over a draft, key by key; where nothing is different nothing is written, the time of the last change included. */
export async function changeDraft(db: Db, id: string, change: DraftChange): Promise<void> {
  await inTransaction(db, async (tx) => {
    const draft = found(await holdDraft(tx, id), 'import');
    const isSame = isDeepStrictEqual({ ...draft.details, ...change.details }, draft.details);
    const chart = { ...draft.chart.corrections, ...change.chart };
    const finished = { ...draft.finished.corrections, ...change.finished };
    const changed = {
      ...(isSame ? {} : { details: { ...draft.written, ...change.details } }),
      ...(isDeepStrictEqual(chart, draft.chart.corrections) ? {} : { chart }),
      ...(isDeepStrictEqual(finished, draft.finished.corrections) ? {} : { finished }),
    };
    if (Object.keys(changed).length > 0) await updateDraft(tx, id, changed);
  });
}
