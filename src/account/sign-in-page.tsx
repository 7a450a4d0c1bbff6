import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { useLocation } from 'react-router-dom';
import { signInSchema } from '../../shared/account.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { TextField } from '../ui/field.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { TextLink } from '../ui/link.tsx';
import { summaryOf } from '../ui/use-server-errors.ts';
import { enterWords } from './enter-error.ts';
import { EnterPage, skipWhenSignedIn } from './enter-page.tsx';
import { PasswordField } from './password-field.tsx';
import { useEnter } from './use-enter.ts';

export const loader = skipWhenSignedIn;

const FIELDS = [
  { name: 'email', label: 'E-mail address' },
  { name: 'password', label: 'Password' },
] as const;

export function Component() {
  const { search } = useLocation();
  const enter = useEnter<{ email: string; password: string }>('/api/auth/sign-in/email');
  const form = useForm({
    resolver: zodResolver(signInSchema),
    defaultValues: { email: '', password: '' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  return (
    <EnterPage
      title="Sign in"
      lead={
        <>
          New here? <TextLink to={{ pathname: paths.signUp, search }}>Make an account</TextLink>
        </>
      }
    >
      <form
        noValidate
        className="space-y-6"
        onSubmit={(event) => void form.handleSubmit((values) => enter.mutate(values))(event)}
      >
        <FormErrors
          items={summaryOf(errors, FIELDS, enter.isError ? [enterWords(enter.error)] : [])}
          attempt={submitCount + enter.failureCount}
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
          autoComplete="current-password"
          error={errors.password?.message}
        />
        <Button type="submit" kind="primary" pending={enter.isPending}>
          {enter.isPending ? 'Signing in' : 'Sign in'}
        </Button>
      </form>
    </EnterPage>
  );
}
