import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { requestPasswordResetSchema } from '../../shared/account.ts';
import { doneSchema } from '../../shared/account-answers.ts';
import { request } from '../api/request.ts';
import { MailboxHint } from '../mailbox/parts/mailbox-hint.tsx';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { TextField } from '../ui/field.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { TextLink } from '../ui/link.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { enterWords } from './enter-error.ts';
import { EnterPage } from './enter-page.tsx';

/** Asks for a link by which a new password is chosen. */
export function Component() {
  const ask = useMutation({
    mutationFn: (body: { email: string }) =>
      request('/api/auth/request-password-reset', doneSchema, { method: 'POST', body }),
  });
  const form = useForm({
    resolver: zodResolver(requestPasswordResetSchema),
    defaultValues: { email: '' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const server = useServerErrors(form, ['email'], enterWords);
  const send = form.handleSubmit((values) => {
    server.clear();
    ask.mutate(values, { onError: server.place });
  });
  if (ask.isSuccess) return <Sent email={ask.variables.email} onAgain={ask.reset} />;
  return (
    <EnterPage
      title="Forgotten the password?"
      lead={
        <p>
          We send you a link by which you choose a new one. It has come back to you?{' '}
          <TextLink to={paths.signIn}>Sign in</TextLink>
        </p>
      }
    >
      <form noValidate className="space-y-6" onSubmit={(event) => void send(event)}>
        <FormErrors
          items={summaryOf(errors, [{ name: 'email', label: 'E-mail address' }], server.rest)}
          attempt={submitCount + ask.failureCount}
        />
        <TextField
          {...form.register('email')}
          id="email"
          label="E-mail address"
          hint="The one you sign in with."
          type="email"
          inputMode="email"
          autoComplete="username"
          autoCapitalize="none"
          error={errors.email?.message}
        />
        <Button type="submit" kind="primary" pending={ask.isPending}>
          {ask.isPending ? 'Sending' : 'Send the link'}
        </Button>
      </form>
    </EnterPage>
  );
}

function Sent({ email, onAgain }: { email: string; onAgain: () => void }) {
  return (
    <EnterPage
      title="Look into your mail"
      isLaterStep
      lead={
        <p className="break-words">
          If there is an account with {email}, a link is on its way to it. It works once, for an hour.
        </p>
      }
    >
      <p className="mb-7">
        <MailboxHint />
      </p>
      <Button kind="quiet" onClick={onAgain}>
        Nothing came: send it again
      </Button>
    </EnterPage>
  );
}
