import type { NewPattern, TableEdit } from '../../shared/patterns/edits.schema.ts';
import type { Pattern, PatternTable } from '../../shared/patterns/patterns.schema.ts';
import { shorten } from '../../shared/patterns/quote.ts';
import { isSameTyping, tableOf, typedOf } from '../../shared/patterns/tables-as-typed.ts';
import type { TypedTable } from '../../shared/patterns/typed-cells.ts';
import { readTypedTable } from '../../shared/patterns/typed-table.ts';
import type { FieldProblem } from '../../shared/problem.ts';
import type { Db } from '../db/client.ts';
import { inTransaction } from '../db/transaction.ts';
import { found, invalid, Problem, refuseIfAny } from '../http/problem.ts';
import { addRevision, createPattern, findWholePattern, holdLatestRevision } from './patterns.store.ts';
import { findRevision, type OwnedRevision } from './revisions.store.ts';

/** The most field problems that one refusal lists. */
const LISTED_MAX = 200;
const TITLE_MAX = 120;
const COPY_WORD = ' (copy)';
/** What is typed or copied was read from no file. */
const NO_FILES = { chartFileId: null, finishedFileId: null };

/**
 * Writes an edit as the pattern's next revision. A table that is the latest one already writes nothing: a save that is sent
 * again because its answer was lost is answered, not refused. Of two saves that began from one revision, one wins.
 */
export async function editTable(
  db: Db,
  patternId: string,
  { basedOn, ...typed }: TableEdit,
): Promise<{ revisionId: string; isNew: boolean }> {
  refuseIfAny(faultsOf(typed));
  return inTransaction(db, async (tx) => {
    const latest = found(await holdLatestRevision(tx, patternId), 'pattern');
    if (isSameTyping(typed, typedOf(latest.table))) return { revisionId: latest.id, isNew: false };
    const base = basedOn === latest.id ? latest : await findRevision(tx, basedOn);
    if (base?.patternId !== patternId) {
      const detail = 'This is no revision of this pattern: send the id of the revision the edit began from.';
      throw invalid([{ pointer: '/basedOn', detail }]);
    }
    const table = tableOf(typed, readTypedTable(typed), base.table);
    if (base.id !== latest.id) throw stale(base, latest, table);
    const revisionId = await addRevision(tx, patternId, {}, table, NO_FILES);
    return { revisionId, isNew: true };
  });
}

/** Makes a pattern of details and tables as typed: whole or not at all. */
export async function typePattern(
  db: Db,
  ownerId: string,
  { details, ...typed }: NewPattern,
): Promise<string> {
  refuseIfAny(faultsOf(typed));
  const table = tableOf(typed, readTypedTable(typed), null);
  return inTransaction(db, async (tx) => {
    const { patternId } = await createPattern(tx, ownerId, details, table, NO_FILES);
    return patternId;
  });
}

/** Makes another pattern with the same details and the latest tables; files stay with the one they were brought for. */
export async function copyPattern(db: Db, ownerId: string, patternId: string): Promise<string> {
  return inTransaction(db, async (tx) => {
    const pattern: Pattern = found(await findWholePattern(tx, patternId), 'pattern');
    const { maker, number, kind, silhouette, structure, cloth, worn, seamEdges, compareAs, notes } = pattern;
    const title = `${shorten(pattern.title, TITLE_MAX - COPY_WORD.length)}${COPY_WORD}`;
    const details = { maker, number, kind, silhouette, structure, cloth, worn, seamEdges, compareAs, notes };
    const made = await createPattern(tx, ownerId, { title, ...details }, pattern.revision.table, NO_FILES);
    return made.patternId;
  });
}

/** What is wrong with a typed table, at its places. */
function faultsOf(typed: TypedTable): FieldProblem[] {
  const uneven = (['chart', 'finished'] as const).flatMap((role) =>
    typed[role].flatMap((column, at) => {
      const [cells, sizes] = [column.typed.length, typed.sizes.length];
      if (cells === sizes) return [];
      const detail = `There are ${cells} cells and ${sizes} sizes: send a cell for every size, an empty text where there is none.`;
      return [{ pointer: `/${role}/${at}/typed`, detail }];
    }),
  );
  const faults = readTypedTable(typed)
    .findings.filter(({ severity }) => severity === 'error')
    .map(({ pointer, words }) => ({ pointer, detail: words }));
  return [...uneven, ...faults].slice(0, LISTED_MAX);
}

function stale(base: OwnedRevision, latest: OwnedRevision, yours: PatternTable): Problem {
  const { ownerId: _owner, title: _title, ...theirs } = latest;
  return new Problem('conflict', {
    detail: `Revision ${latest.number} was saved after revision ${base.number}, from which this edit began. Nothing was written: both are here to be compared.`,
    extension: { versions: { yours, theirs } },
  });
}
