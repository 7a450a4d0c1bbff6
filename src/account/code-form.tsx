import { zodResolver } from '@hookform/resolvers/zod';
import type { UseMutationResult } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { recoveryCodeSchema, totpSchema } from '../../shared/account.ts';
import { Button } from '../ui/button.tsx';
import { TextField } from '../ui/field.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';

/** An authenticator's six digits, or a recovery code in their place. */
export type CodeKind = 'totp' | 'recovery';

const KINDS = {
  totp: {
    schema: totpSchema,
    label: 'Six digits',
    hint: 'What your authenticator shows for Leeway now.',
    input: { inputMode: 'numeric', autoComplete: 'one-time-code' },
  },
  recovery: {
    schema: recoveryCodeSchema,
    label: 'Recovery code',
    hint: 'One of the ten you kept, such as aB3dE-fG5hI. Each works once.',
    input: { inputMode: 'text', autoComplete: 'off' },
  },
} as const;

interface CodeFormProps<Output> {
  kind: CodeKind;
  submit: string;
  mutation: UseMutationResult<Output, Error, { code: string }>;
  onDone?: () => void;
  words?: (error: unknown) => string;
}

/** One code and the button that sends it. */
export function CodeForm<Output>({ kind, submit, mutation, onDone, words }: CodeFormProps<Output>) {
  const { schema, label, hint, input } = KINDS[kind];
  const form = useForm({
    resolver: zodResolver(schema),
    defaultValues: { code: '' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const server = useServerErrors(form, ['code'], words);
  const send = form.handleSubmit((values) => {
    server.clear();
    mutation.mutate(values, { ...(onDone ? { onSuccess: onDone } : {}), onError: server.place });
  });
  return (
    <form noValidate className="space-y-5" onSubmit={(event) => void send(event)}>
      <FormErrors
        items={summaryOf(errors, [{ name: 'code', label }], server.rest)}
        attempt={submitCount + mutation.failureCount}
      />
      <TextField
        {...form.register('code')}
        {...input}
        id="code"
        label={label}
        hint={hint}
        autoCapitalize="none"
        spellCheck={false}
        maxLength={20}
        className="max-w-64 text-section tracking-[0.12em]"
        error={errors.code?.message}
      />
      <Button type="submit" kind="primary" pending={mutation.isPending}>
        {submit}
      </Button>
    </form>
  );
}
