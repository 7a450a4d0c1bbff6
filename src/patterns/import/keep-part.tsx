import { useRef, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { ImportDraft } from '../../../shared/patterns/imports.schema.ts';
import { listWords } from '../../../shared/fit/say-words.ts';
import { ProblemError } from '../../api/problem-error.ts';
import { paths } from '../../paths.ts';
import { AlertDialog } from '../../ui/alert-dialog.tsx';
import { Button } from '../../ui/button.tsx';
import { JumpLink } from '../../ui/jump-link.tsx';
import { Notice } from '../../ui/notice.tsx';
import { failureWords } from '../../ui/use-server-errors.ts';
import { saySizes } from '../pattern-words.ts';
import { useCommitImport, useDiscardImport } from '../queries.ts';
import { TABLE_NAMES } from '../table-names.ts';
import type { Obstacle } from './obstacles.ts';

interface KeepPartProps {
  draft: ImportDraft;
  obstacles: readonly Obstacle[];
  save: () => Promise<boolean>;
  /** Marks the fields that are still missing. */
  onRefused: () => void;
  onEnd: () => void;
}

/** The end of an import: whole or not at all, or discarded. The button always answers: with the pattern or with what is missing. */
export function KeepPart({ draft, obstacles, save, onRefused, onEnd }: KeepPartProps) {
  const navigate = useNavigate();
  const commit = useCommitImport(draft.id);
  const list = useRef<HTMLDivElement>(null);
  const [isSaving, setSaving] = useState(false);
  const word = draft.patternId === null ? 'Keep this pattern' : 'Keep these tables';
  const keep = async () => {
    if (obstacles.length > 0) {
      onRefused();
      list.current?.focus();
      return;
    }
    setSaving(true);
    const isSaved = await save();
    setSaving(false);
    if (!isSaved) return;
    commit.mutate(undefined, {
      onSuccess: ({ patternId }) => {
        onEnd();
        void navigate(paths.pattern(patternId), { replace: true });
      },
    });
  };
  return (
    <>
      <div ref={list} tabIndex={-1} role="group" aria-label="What still stands in the way">
        {obstacles.length > 0 ? (
          <Obstacles obstacles={obstacles} />
        ) : (
          <p className="max-w-[42rem] text-lead">{sayReady(draft)}</p>
        )}
      </div>
      {commit.isError && (
        <div role="alert" className="mt-5">
          <Notice kind="error" word="Not kept">
            {sayCommitError(commit.error).map((words) => (
              <p key={words}>{words}</p>
            ))}
          </Notice>
        </div>
      )}
      <div className="mt-6 flex flex-wrap items-center gap-x-7 gap-y-3">
        <Button kind="primary" pending={isSaving || commit.isPending} onClick={() => void keep()}>
          {commit.isPending ? 'Keeping it' : word}
        </Button>
        <Discard draft={draft} onEnd={onEnd} />
      </div>
    </>
  );
}

function Obstacles({ obstacles }: { obstacles: readonly Obstacle[] }) {
  return (
    <div className="max-w-[42rem] border-l-4 border-dashed border-ink pl-4">
      <p className="font-semibold">
        {obstacles.length === 1
          ? 'One thing still stands in the way'
          : `${obstacles.length} things still stand in the way`}
      </p>
      <ul className="mt-1">
        {obstacles.map(({ words, targetId }) => (
          <li key={words} className="py-1">
            {targetId === null ? words : <JumpLink to={targetId}>{words}</JumpLink>}
          </li>
        ))}
      </ul>
    </div>
  );
}

/** What will be kept, so that one knows before one does it. */
function sayReady({ chart, finished }: ImportDraft): string {
  const tables = (['chart', 'finished'] as const).filter(
    (role) => (role === 'chart' ? chart : finished) !== null,
  );
  const sizes = ((chart ?? finished)?.rows ?? []).map((row) => row.label);
  return `Ready: ${saySizes(sizes)}, with ${listWords(tables.map((role) => TABLE_NAMES[role]))}. All of it is kept together.`;
}

function sayCommitError(error: unknown): string[] {
  const words = error instanceof ProblemError ? error.fields.map(({ detail }) => detail) : [];
  return words.length > 0 ? [...new Set(words)] : [failureWords(error)];
}

function Discard({ draft, onEnd }: { draft: ImportDraft; onEnd: () => void }) {
  const navigate = useNavigate();
  const discard = useDiscardImport();
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <Button kind="quiet" onClick={() => setOpen(true)}>
        Discard it
      </Button>
      <AlertDialog
        isOpen={isOpen}
        title="Discard what was brought in here?"
        confirm="Discard it"
        pending={discard.isPending}
        error={discard.isError ? failureWords(discard.error) : undefined}
        onConfirm={() =>
          discard.mutate(draft.id, {
            onSuccess: () => {
              onEnd();
              void navigate(draft.patternId === null ? paths.patterns : paths.pattern(draft.patternId), {
                replace: true,
              });
            },
          })
        }
        onCancel={() => {
          setOpen(false);
          discard.reset();
        }}
      >
        <p>
          The details written here and the files uploaded here go.
          {draft.patternId !== null && ' The pattern stays as it was.'} It cannot be undone.
        </p>
      </AlertDialog>
    </>
  );
}
