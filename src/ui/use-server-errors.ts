import { useState } from 'react';
import type { FieldErrors, FieldValues, Path, UseFormReturn } from 'react-hook-form';
import { ProblemError } from '../api/problem-error.ts';
import type { FormErrorItem } from './form-errors.tsx';

/** `/typed/hip` → `typed.hip`; `~1` and `~0` are `/` and `~` (RFC 6901). */
function pointerToName(pointer: string): string {
  return pointer
    .split('/')
    .slice(1)
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'))
    .join('.');
}

/** What a failure that belongs to no field has to say. */
export function failureWords(error: unknown): string {
  if (!(error instanceof ProblemError))
    return 'Something went wrong on our side. What you typed is still here.';
  if (error.status === 401) return 'Your session has ended. Sign in in another tab, then send this again.';
  const { title, detail, requestId } = error.problem;
  const words = detail ?? `${title}.`;
  return error.status >= 500 && requestId !== undefined
    ? `${words} (Found in the log under ${requestId}.)`
    : words;
}

/**
 * Puts what the server refuses where it belongs: on the fields its pointers name, and the rest in the form's
 * summary. The form keeps everything that was typed.
 */
export function useServerErrors<Values extends FieldValues>(
  form: Pick<UseFormReturn<Values>, 'setError'>,
  fields: readonly Path<Values>[],
  words: (error: unknown) => string = failureWords,
) {
  const [rest, setRest] = useState<string[]>([]);
  const place = (error: unknown) => {
    const problems = error instanceof ProblemError ? error.fields : [];
    const left: string[] = [];
    for (const { pointer, detail } of problems) {
      const name = fields.find((field) => field === pointerToName(pointer));
      if (name === undefined) left.push(detail);
      else form.setError(name, { type: 'server', message: detail });
    }
    setRest(problems.length === 0 ? [words(error)] : left);
  };
  return { rest, place, clear: () => setRest([]) };
}

/** The summary's lines: what fields say, in the order the form shows them, then what belongs to none. */
export function summaryOf<Values extends FieldValues>(
  errors: FieldErrors<Values>,
  fields: readonly { name: Path<Values>; label: string; id?: string }[],
  rest: readonly string[],
): FormErrorItem[] {
  const items: FormErrorItem[] = [];
  for (const { name, label, id } of fields) {
    const message = messageAt(errors, name);
    if (message !== undefined) items.push({ message, label, fieldId: id ?? name });
  }
  return [...items, ...rest.map((message) => ({ message }))];
}

/** The message of one field, or undefined. */
export function messageAt(errors: object, name: string): string | undefined {
  let at: unknown = errors;
  for (const part of name.split('.')) {
    if (typeof at !== 'object' || at === null) return undefined;
    at = (at as Record<string, unknown>)[part];
  }
  const message = typeof at === 'object' && at !== null && 'message' in at ? at.message : undefined;
  return typeof message === 'string' ? message : undefined;
}
