import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { useSearchParams } from 'react-router-dom';
import { PASSWORD_MIN, resetPasswordSchema } from '../../shared/account.ts';
import { doneSchema } from '../../shared/account-answers.ts';
import { ProblemError } from '../api/problem-error.ts';
import { request } from '../api/request.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { ButtonLink } from '../ui/link.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { enterWords, linkWords } from './enter-error.ts';
import { EnterPage } from './enter-page.tsx';
import { PasswordField } from './password-field.tsx';
import { meQuery } from './queries.ts';

const isOfToken = (error: unknown) =>
  error instanceof ProblemError && error.fields.some(({ pointer }) => pointer === '/token');

/** A new password, by the link that was mailed. */
export function Component() {
  const [search] = useSearchParams();
  const client = useQueryClient();
  const token = search.get('token') ?? '';
  const change = useMutation({
    mutationFn: (body: { token: string; newPassword: string }) =>
      request('/api/auth/reset-password', doneSchema, { method: 'POST', body }),
    // Every session has ended, this browser's among them.
    onSuccess: () => client.setQueryData(meQuery.queryKey, { user: null }),
  });
  const form = useForm({
    resolver: zodResolver(resetPasswordSchema),
    defaultValues: { token, newPassword: '' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const server = useServerErrors(form, ['newPassword'], enterWords);
  const send = form.handleSubmit((values) => {
    server.clear();
    change.mutate(values, { onError: server.place });
  });
  if (change.isSuccess) return <Changed />;
  if (token.trim() === '') return <LinkEnded words="The link is not whole: open it from the mail again." />;
  if (isOfToken(change.error)) return <LinkEnded words={linkWords(change.error)} />;
  return (
    <EnterPage
      title="Choose a new password"
      lead={<p>Every place where you are signed in will be signed out.</p>}
    >
      <form noValidate className="space-y-6" onSubmit={(event) => void send(event)}>
        <FormErrors
          items={summaryOf(errors, [{ name: 'newPassword', label: 'New password' }], server.rest)}
          attempt={submitCount + change.failureCount}
        />
        <PasswordField
          {...form.register('newPassword')}
          id="newPassword"
          label="New password"
          hint={`At least ${PASSWORD_MIN} characters; a few words in a row are easy to remember.`}
          autoComplete="new-password"
          error={errors.newPassword?.message}
        />
        <Button type="submit" kind="primary" pending={change.isPending}>
          {change.isPending ? 'Changing it' : 'Use this password'}
        </Button>
      </form>
    </EnterPage>
  );
}

function Changed() {
  return (
    <EnterPage title="The new password works" isLaterStep lead={<p>Sign in with it.</p>}>
      <ButtonLink kind="primary" to={paths.signIn}>
        Sign in
      </ButtonLink>
    </EnterPage>
  );
}

function LinkEnded({ words }: { words: string }) {
  return (
    <EnterPage title="This link works no longer" isLaterStep lead={<p role="alert">{words}</p>}>
      <ButtonLink kind="primary" to={paths.forgottenPassword}>
        Send another link
      </ButtonLink>
    </EnterPage>
  );
}
