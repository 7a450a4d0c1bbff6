import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { changeEmailSchema } from '../../shared/account.ts';
import { Button } from '../ui/button.tsx';
import { TextField } from '../ui/field.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { useChangeEmail } from './account-queries.ts';
import { PasswordField } from './password-field.tsx';

const FIELDS = [
  { name: 'newEmail', label: 'New e-mail address' },
  { name: 'password', label: 'Your password' },
] as const;
const NAMES = FIELDS.map(({ name }) => name);

export function ChangeEmail({ onDone }: { onDone: (words: string) => void }) {
  const change = useChangeEmail();
  const form = useForm({
    resolver: zodResolver(changeEmailSchema),
    defaultValues: { newEmail: '', password: '' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const server = useServerErrors(form, NAMES);
  const send = form.handleSubmit((values) => {
    server.clear();
    change.mutate(values, {
      onSuccess: () =>
        onDone(
          `We have written to ${values.newEmail}. The address changes once you open the link in that mail; until then the old one stays.`,
        ),
      onError: server.place,
    });
  });
  return (
    <form noValidate className="space-y-5" onSubmit={(event) => void send(event)}>
      <FormErrors
        items={summaryOf(errors, FIELDS, server.rest)}
        attempt={submitCount + change.failureCount}
      />
      <TextField
        {...form.register('newEmail')}
        id="newEmail"
        label="New e-mail address"
        hint="We write to it first: a mistyped address cannot lock you out."
        type="email"
        inputMode="email"
        autoComplete="email"
        autoCapitalize="none"
        error={errors.newEmail?.message}
      />
      <PasswordField
        {...form.register('password')}
        id="password"
        label="Your password"
        autoComplete="current-password"
        error={errors.password?.message}
      />
      <Button type="submit" kind="primary" pending={change.isPending}>
        Write to the new address
      </Button>
    </form>
  );
}
