import { useRef, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { staleEditSchema } from '../../../shared/patterns/edits.schema.ts';
import type { PatternRevision } from '../../../shared/patterns/patterns.schema.ts';
import { tableOf, typedOf } from '../../../shared/patterns/tables-as-typed.ts';
import type { TypedTable } from '../../../shared/patterns/typed-cells.ts';
import { ProblemError } from '../../api/problem-error.ts';
import { paths } from '../../paths.ts';
import { AlertDialog } from '../../ui/alert-dialog.tsx';
import { Button } from '../../ui/button.tsx';
import { AFTER_SAVING, LeaveGuard } from '../../ui/leave-guard.tsx';
import { ButtonLink } from '../../ui/link.tsx';
import { Notice } from '../../ui/notice.tsx';
import { useSaveTable } from '../queries.ts';
import { typedTable, type EditedTable } from './edited-table.ts';
import type { History } from './history.ts';
import { forgetEdit } from './kept-edit.ts';
import { SaveTrouble } from './save-trouble.tsx';
import { sendable } from './sendable.ts';
import { StaleEdit } from './stale-edit.tsx';
import { TableEditor } from './table-editor.tsx';
import { useTableEdit } from './use-table-edit.ts';

/** One edit from the revision it begins from; `turn` counts those of a visit. */
export interface Session {
  base: PatternRevision;
  history: History;
  /** The newer revision, where one was saved since. */
  theirs: PatternRevision | null;
  /** Taken up again from this tab. */
  isKept: boolean;
  said: string;
  turn: number;
}

interface EditSessionProps {
  session: Session;
  onStale: (theirs: PatternRevision) => void;
  onLayOver: (yours: EditedTable, theirs: PatternRevision) => void;
  onStartAgain: (revision: PatternRevision) => void;
}

/** The tables of one pattern being edited, and what becomes of the edit. */
export function EditSession({ session, onStale, onLayOver, onStartAgain }: EditSessionProps) {
  const { base, theirs } = session;
  const { patternId } = base;
  const navigate = useNavigate();
  const save = useSaveTable(patternId);
  const [baseTable] = useState<TypedTable>(() => typedOf(base.table));
  const editing = useTableEdit({
    name: patternId,
    basedOn: base.id,
    base: baseTable,
    history: session.history,
    said: session.said,
  });
  const trouble = useRef<HTMLDivElement>(null);
  const keep = async () => {
    editing.ask();
    const table = sendable(typedTable(editing.table));
    if (editing.errors.length > 0 || table === null) {
      trouble.current?.focus();
      return;
    }
    try {
      await save.mutateAsync({ basedOn: base.id, ...table });
    } catch (error) {
      const stale = error instanceof ProblemError ? staleEditSchema.safeParse(error.problem) : null;
      if (stale?.success) onStale(stale.data.versions.theirs);
      return;
    }
    forgetEdit(patternId);
    await navigate(paths.pattern(patternId), { state: AFTER_SAVING });
  };
  return (
    <>
      <LeaveGuard isUnsaved={editing.isChanged}>
        <p>
          What you typed is not saved. It stays in this tab until you close it, and is here when you come
          back.
        </p>
      </LeaveGuard>
      {session.isKept && theirs === null && <KeptNotice base={base} onStartAgain={onStartAgain} />}
      {theirs && (
        <StaleEdit
          base={base}
          yours={tableOf(typedTable(editing.table), editing.reading, base.table)}
          theirs={theirs}
          onLayOver={() => onLayOver(editing.table, theirs)}
          onLetGo={() => onStartAgain(theirs)}
        />
      )}
      <TableEditor editing={editing} />
      <div
        ref={trouble}
        tabIndex={-1}
        role="group"
        aria-label="Saving"
        className="mt-10 border-t border-rule pt-5"
      >
        <SaveTrouble editing={editing} error={theirs ? null : save.error} />
        <div className="flex flex-wrap items-center gap-x-7 gap-y-3">
          <Button kind="primary" pending={save.isPending} onClick={() => void keep()}>
            {save.isPending ? 'Saving' : `Save as revision ${(theirs ?? base).number + 1}`}
          </Button>
          <ButtonLink kind="quiet" to={paths.pattern(patternId)}>
            Leave it
          </ButtonLink>
          <span className="text-note text-ink-2">
            {editing.isChanged ? 'Not saved yet; kept in this tab.' : 'Nothing is changed yet.'}
          </span>
        </div>
      </div>
    </>
  );
}

function KeptNotice({
  base,
  onStartAgain,
}: {
  base: PatternRevision;
  onStartAgain: (revision: PatternRevision) => void;
}) {
  const [isAsking, setAsking] = useState(false);
  return (
    <Notice className="mt-6 max-w-[44rem]">
      <p>What you had typed and not saved is back.</p>
      <Button kind="quiet" onClick={() => setAsking(true)}>
        Begin again from revision {base.number}
      </Button>
      <AlertDialog
        isOpen={isAsking}
        title="Let what you typed go?"
        confirm="Let it go"
        onConfirm={() => onStartAgain(base)}
        onCancel={() => setAsking(false)}
      >
        <p>You begin again from revision {base.number} as it was saved. It cannot be undone.</p>
      </AlertDialog>
    </Notice>
  );
}
