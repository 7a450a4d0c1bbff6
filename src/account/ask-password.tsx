import { zodResolver } from '@hookform/resolvers/zod';
import type { UseMutationResult } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { passwordAgainSchema } from '../../shared/account.ts';
import { Button } from '../ui/button.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { PasswordField } from './password-field.tsx';

const FIELDS = [{ name: 'password', label: 'Your password' }] as const;

interface AskPasswordProps<Output> {
  submit: string;
  mutation: UseMutationResult<Output, Error, { password: string }>;
  onDone: (output: Output) => void;
}

/** The password asked for again before something weighty. */
export function AskPassword<Output>({ submit, mutation, onDone }: AskPasswordProps<Output>) {
  const form = useForm({
    resolver: zodResolver(passwordAgainSchema),
    defaultValues: { password: '' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const server = useServerErrors(form, ['password']);
  const send = form.handleSubmit((values) => {
    server.clear();
    mutation.mutate(values, { onSuccess: onDone, onError: server.place });
  });
  return (
    <form noValidate className="space-y-5" onSubmit={(event) => void send(event)}>
      <FormErrors
        items={summaryOf(errors, FIELDS, server.rest)}
        attempt={submitCount + mutation.failureCount}
      />
      <PasswordField
        {...form.register('password')}
        id="password"
        label="Your password"
        autoComplete="current-password"
        error={errors.password?.message}
      />
      <Button type="submit" kind="primary" pending={mutation.isPending}>
        {submit}
      </Button>
    </form>
  );
}
