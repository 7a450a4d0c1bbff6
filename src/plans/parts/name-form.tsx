import { useState } from 'react';
import { ProblemError } from '../../api/problem-error.ts';
import { Button } from '../../ui/button.tsx';
import { TextField } from '../../ui/field.tsx';
import { failureWords } from '../../ui/use-server-errors.ts';

interface NameFormProps {
  label: string;
  name: string;
  confirm: string;
  cancel: string;
  isPending: boolean;
  error: Error | null;
  onName: (name: string) => void;
  onCancel: () => void;
}

/** One line for a name, opened in place. What the server refuses stands under it. */
export function NameForm({
  label,
  name,
  confirm,
  cancel,
  isPending,
  error,
  onName,
  onCancel,
}: NameFormProps) {
  const [typed, setTyped] = useState(name);
  const [isMissing, setMissing] = useState(false);
  return (
    <form
      className="w-full max-w-[34rem]"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        if (isPending) return;
        if (typed.trim() === '') setMissing(true);
        else onName(typed.trim());
      }}
      onKeyDown={(event) => {
        if (event.key === 'Escape') onCancel();
      }}
    >
      <TextField
        label={label}
        autoFocus
        autoComplete="off"
        maxLength={120}
        value={typed}
        onFocus={(event) => event.target.select()}
        onChange={(event) => {
          setTyped(event.target.value);
          setMissing(false);
        }}
        error={isMissing ? 'Give the plan a name.' : error ? refusalWords(error) : undefined}
      />
      <div className="mt-4 flex flex-wrap gap-3">
        <Button kind="primary" type="submit" pending={isPending}>
          {confirm}
        </Button>
        <Button onClick={onCancel}>{cancel}</Button>
      </div>
    </form>
  );
}

function refusalWords(error: Error): string {
  if (error instanceof ProblemError && error.fields.length > 0) {
    return error.fields.map((field) => field.detail).join(' ');
  }
  return failureWords(error);
}
