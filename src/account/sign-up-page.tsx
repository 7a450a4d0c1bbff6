import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { useLocation } from 'react-router-dom';
import { MailboxHint } from '../mailbox/parts/mailbox-hint.tsx';
import { PASSWORD_MIN, signUpSchema } from '../../shared/account.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { TextField } from '../ui/field.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { TextLink } from '../ui/link.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { enterWords } from './enter-error.ts';
import { EnterPage, skipWhenSignedIn } from './enter-page.tsx';
import { PasswordField } from './password-field.tsx';
import { useGoOn, useSignUp } from './use-enter.ts';

export const loader = skipWhenSignedIn;

const FIELDS = [
  { name: 'name', label: 'Name' },
  { name: 'email', label: 'E-mail address' },
  { name: 'password', label: 'Password' },
] as const;
const NAMES = FIELDS.map(({ name }) => name);

export function Component() {
  const { search } = useLocation();
  const enter = useSignUp();
  const form = useForm({
    resolver: zodResolver(signUpSchema),
    defaultValues: { name: '', email: '', password: '' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const server = useServerErrors(form, NAMES, enterWords);
  const submit = form.handleSubmit((values) => {
    server.clear();
    enter.mutate(values, { onError: server.place });
  });
  if (enter.isSuccess) return <MailSent email={enter.variables.email} isIn={enter.data === 'in'} />;
  return (
    <EnterPage
      title="Make an account"
      lead={
        <p>
          You have one? <TextLink to={{ pathname: paths.signIn, search }}>Sign in</TextLink>. Measurements are
          private: they are shown to nobody but you.
        </p>
      }
    >
      <form noValidate className="space-y-6" onSubmit={(event) => void submit(event)}>
        <FormErrors
          items={summaryOf(errors, FIELDS, server.rest)}
          attempt={submitCount + enter.failureCount}
        />
        <TextField
          {...form.register('name')}
          id="name"
          label="Name"
          hint="What we should call you."
          autoComplete="name"
          error={errors.name?.message}
        />
        <TextField
          {...form.register('email')}
          id="email"
          label="E-mail address"
          type="email"
          inputMode="email"
          autoComplete="username"
          autoCapitalize="none"
          error={errors.email?.message}
        />
        <PasswordField
          {...form.register('password')}
          id="password"
          hint={`At least ${PASSWORD_MIN} characters; a few words in a row are easy to remember.`}
          autoComplete="new-password"
          error={errors.password?.message}
        />
        <Button type="submit" kind="primary" pending={enter.isPending}>
          {enter.isPending ? 'Making the account' : 'Make the account'}
        </Button>
      </form>
    </EnterPage>
  );
}

/** The account is made; what is left to do is in the mail. */
function MailSent({ email, isIn }: { email: string; isIn: boolean }) {
  const goOn = useGoOn();
  return (
    <EnterPage
      title={isIn ? 'You are in' : 'Look into your mail'}
      isLaterStep
      lead={
        isIn ? (
          <p className="break-words">
            We have also written to {email}. Open the link in that mail within a day, so that we can reach you
            when you need a new password.
          </p>
        ) : (
          <p className="break-words">We have sent a mail to {email}. It says how to go on.</p>
        )
      }
    >
      <p className="mb-7">
        <MailboxHint />
      </p>
      {isIn ? (
        <Button kind="primary" onClick={() => void goOn()}>
          Go on
        </Button>
      ) : (
        <TextLink to={paths.signIn}>To signing in</TextLink>
      )}
    </EnterPage>
  );
}
