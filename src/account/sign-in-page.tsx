import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
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
import { CodeStep } from './code-step.tsx';
import { useSignIn } from './use-enter.ts';

export const loader = skipWhenSignedIn;

const FIELDS = [
  { name: 'email', label: 'E-mail address' },
  { name: 'password', label: 'Password' },
] as const;

export function Component() {
  const [isCodeAsked, setCodeAsked] = useState(false);
  if (isCodeAsked) return <CodeStep onStartOver={() => setCodeAsked(false)} />;
  return <PasswordStep onCode={() => setCodeAsked(true)} />;
}

function PasswordStep({ onCode }: { onCode: () => void }) {
  const { search } = useLocation();
  const enter = useSignIn();
  const form = useForm({
    resolver: zodResolver(signInSchema),
    defaultValues: { email: '', password: '' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const send = form.handleSubmit((values) =>
    enter.mutate(values, {
      onSuccess: (outcome) => {
        if (outcome === 'code') onCode();
      },
    }),
  );
  return (
    <EnterPage
      title="Sign in"
      lead={
        <p>
          New here? <TextLink to={{ pathname: paths.signUp, search }}>Make an account</TextLink>
        </p>
      }
    >
      <form noValidate className="space-y-6" onSubmit={(event) => void send(event)}>
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
        <div className="flex flex-wrap items-center gap-x-7 gap-y-3">
          <Button type="submit" kind="primary" pending={enter.isPending}>
            {enter.isPending ? 'Signing in' : 'Sign in'}
          </Button>
          <TextLink to={paths.forgottenPassword}>Forgotten the password?</TextLink>
        </div>
      </form>
    </EnterPage>
  );
}
