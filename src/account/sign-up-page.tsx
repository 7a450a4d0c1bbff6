import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { useLocation } from 'react-router-dom';
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
import { useEnter } from './use-enter.ts';

export const loader = skipWhenSignedIn;

const FIELDS = [
  { name: 'name', label: 'Name' },
  { name: 'email', label: 'E-mail address' },
  { name: 'password', label: 'Password' },
] as const;
const NAMES = FIELDS.map(({ name }) => name);

export function Component() {
  const { search } = useLocation();
  const enter = useEnter<{ name: string; email: string; password: string }>('/api/auth/sign-up/email');
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
  return (
    <EnterPage
      title="Make an account"
      lead={
        <>
          You have one? <TextLink to={{ pathname: paths.signIn, search }}>Sign in</TextLink>. Measurements are
          private: they are shown to nobody but you.
        </>
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
