import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { changePasswordSchema, PASSWORD_MIN } from '../../shared/account.ts';
import { Button } from '../ui/button.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { useChangePassword } from './account-queries.ts';
import { PasswordField } from './password-field.tsx';

const FIELDS = [
  { name: 'currentPassword', label: 'Password until now' },
  { name: 'newPassword', label: 'New password' },
] as const;
const NAMES = FIELDS.map(({ name }) => name);

export function ChangePassword({ email, onDone }: { email: string; onDone: (words: string) => void }) {
  const change = useChangePassword();
  const form = useForm({
    resolver: zodResolver(changePasswordSchema),
    defaultValues: { currentPassword: '', newPassword: '' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const server = useServerErrors(form, NAMES);
  const send = form.handleSubmit((values) => {
    server.clear();
    change.mutate(values, {
      onSuccess: () => onDone('The password is changed, and every other place is signed out.'),
      onError: server.place,
    });
  });
  return (
    <form noValidate className="space-y-5" onSubmit={(event) => void send(event)}>
      <FormErrors
        items={summaryOf(errors, FIELDS, server.rest)}
        attempt={submitCount + change.failureCount}
      />
      {/* So that a password manager knows whose password this is. */}
      <input type="text" name="username" autoComplete="username" value={email} readOnly hidden />
      <PasswordField
        {...form.register('currentPassword')}
        id="currentPassword"
        label="Password until now"
        autoComplete="current-password"
        error={errors.currentPassword?.message}
      />
      <PasswordField
        {...form.register('newPassword')}
        id="newPassword"
        label="New password"
        hint={`At least ${PASSWORD_MIN} characters; a few words in a row are easy to remember.`}
        autoComplete="new-password"
        error={errors.newPassword?.message}
      />
      <p className="text-note text-ink-2">Everywhere else you are signed out; here you stay.</p>
      <Button type="submit" kind="primary" pending={change.isPending}>
        Change the password
      </Button>
    </form>
  );
}
