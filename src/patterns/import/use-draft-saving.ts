import { useCallback, useEffect, useRef, useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import type { DraftDetails, ImportDraft } from '../../../shared/patterns/imports.schema.ts';
import { ProblemError } from '../../api/problem-error.ts';
import { failureWords } from '../../ui/use-server-errors.ts';
import { DETAILS_FIELDS, savableDetails, type DetailsValues, type KeptDetails } from '../details-values.ts';
import { useChangeImport } from '../queries.ts';
import { forgetTyping, keepTyping } from './kept-typing.ts';

const BREATH_MS = 700;

export type SavingState = { is: 'saved' | 'waiting' | 'saving' } | { is: 'failed'; words: string };

type Form = UseFormReturn<DetailsValues, unknown, DraftDetails>;

/**
 * Saves the details as they are written: after a breath, and when a field is left. What cannot be saved stays in the
 * form and in this tab. `isUnsaved`: the form begins with something that the server has not seen.
 */
export function useDraftSaving(draft: ImportDraft, form: Form, kept: KeptDetails, isUnsaved: boolean) {
  const { mutateAsync } = useChangeImport(draft.id);
  const [state, setState] = useState<SavingState>({ is: isUnsaved ? 'waiting' : 'saved' });
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const work = useRef({ isDirty: isUnsaved, isOver: false, running: Promise.resolve(true) });

  /** Saves what is not saved yet; true where nothing is left unsaved. */
  const save = useCallback(async (): Promise<boolean> => {
    clearTimeout(timer.current);
    const { current } = work;
    await current.running;
    if (current.isOver) return true;
    if (!current.isDirty) return current.running;
    current.isDirty = false;
    setState({ is: 'saving' });
    const { details, isAll } = savableDetails(form.getValues(), kept);
    current.running = mutateAsync({ details }).then(
      () => {
        // A field that is not right yet is typed and not saved: it is still kept here.
        if (!current.isDirty && isAll) forgetTyping(draft.id);
        setState({ is: current.isDirty ? 'waiting' : 'saved' });
        return true;
      },
      (error: unknown) => {
        current.isDirty = true;
        placeOnFields(form, error);
        setState({ is: 'failed', words: failureWords(error) });
        return false;
      },
    );
    return current.running;
  }, [draft.id, form, kept, mutateAsync]);

  const typed = useCallback(() => {
    work.current.isDirty = true;
    keepTyping(draft.id, form.getValues());
    setState((before) => (before.is === 'failed' ? before : { is: 'waiting' }));
    clearTimeout(timer.current);
    timer.current = setTimeout(() => void save(), BREATH_MS);
  }, [draft.id, form, save]);

  useEffect(() => form.subscribe({ formState: { values: true }, callback: typed }), [form, typed]);
  useEffect(() => {
    if (isUnsaved) void save();
    // Leaving the page saves what is still waiting; the draft is on the server, not on the page.
    return () => void save();
  }, [isUnsaved, save]);

  /** The draft is gone: nothing more is sent. */
  const end = useCallback(() => {
    work.current.isOver = true;
    clearTimeout(timer.current);
    forgetTyping(draft.id);
  }, [draft.id]);
  return { state, save, end };
}

function placeOnFields(form: Form, error: unknown) {
  if (!(error instanceof ProblemError)) return;
  for (const { pointer, detail } of error.fields) {
    const name = pointer.split('/').slice(2).join('.');
    const field = DETAILS_FIELDS.find((known) => known.name === name);
    if (field) form.setError(field.name, { type: 'server', message: detail });
  }
}
