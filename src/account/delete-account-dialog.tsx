import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { passwordAgainSchema } from '../../shared/account.ts';
import { paths } from '../paths.ts';
import { AlertDialog } from '../ui/alert-dialog.tsx';
import { useServerErrors } from '../ui/use-server-errors.ts';
import { useDeleteAccount } from './account-queries.ts';
import { PasswordField } from './password-field.tsx';

/** Says what goes, and asks for the password. */
export function DeleteAccountDialog({ onCancel }: { onCancel: () => void }) {
  const remove = useDeleteAccount();
  const form = useForm({
    resolver: zodResolver(passwordAgainSchema),
    defaultValues: { password: '' },
  });
  const server = useServerErrors(form, ['password']);
  const send = form.handleSubmit((values) => {
    server.clear();
    remove.mutate(values, {
      // As on signing out: what the tab kept goes too, and by loading anew what is in memory.
      onSuccess: () => {
        sessionStorage.clear();
        window.location.assign(paths.home);
      },
      onError: (error) => {
        server.place(error);
        form.setFocus('password');
      },
    });
  });
  return (
    <AlertDialog
      isOpen
      title="Delete the account for good?"
      cancel="Keep it"
      confirm={remove.isPending ? 'Deleting' : 'Delete everything'}
      pending={remove.isPending}
      error={server.rest.length > 0 ? server.rest.join(' ') : undefined}
      onCancel={onCancel}
      onConfirm={() => void send()}
    >
      <p>With it go, at once and for good:</p>
      <ul className="list-disc space-y-1 pl-5">
        <li>all people and everything measured of them,</li>
        <li>all patterns, with every revision and every uploaded file,</li>
        <li>all plans,</li>
        <li>your name, your address, your sessions and tokens.</li>
      </ul>
      <p>Take everything away first if you may want it again.</p>
      <form noValidate onSubmit={(event) => void send(event)}>
        <PasswordField
          {...form.register('password')}
          id="delete-password"
          label="Your password"
          autoComplete="current-password"
          error={form.formState.errors.password?.message}
        />
      </form>
    </AlertDialog>
  );
}
