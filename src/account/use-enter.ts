import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useCallback } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { doneSchema, signedInAnswerSchema } from '../../shared/account-answers.ts';
import { meSchema } from '../../shared/me.ts';
import { ProblemError } from '../api/problem-error.ts';
import { request } from '../api/request.ts';
import type { CodeKind } from './code-form.tsx';
import { nextAddress } from './next-address.ts';
import { meQuery } from './queries.ts';

interface Credentials {
  email: string;
  password: string;
}

/** Whether somebody is in now, or a code is asked for first. */
async function signIn(body: Credentials): Promise<'in' | 'code'> {
  const answer = await request('/api/auth/sign-in/email', signedInAnswerSchema, { method: 'POST', body });
  return 'user' in answer ? 'in' : 'code';
}

/** Reads who has just signed in, and forgets what was read for whoever was here before. */
function useArrive() {
  const client = useQueryClient();
  return useCallback(async () => {
    client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== meQuery.queryKey[0] });
    client.setQueryData(meQuery.queryKey, await request('/api/me', meSchema));
  }, [client]);
}

/** Goes where somebody wanted to go before they had to sign in. */
export function useGoOn() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  return () => navigate(nextAddress(search, window.location.origin), { replace: true });
}

/** Signs in; the next page is loaded for somebody known. Where a code is asked for first, `data` says so. */
export function useSignIn() {
  const arrive = useArrive();
  const goOn = useGoOn();
  return useMutation({
    mutationFn: signIn,
    onSuccess: async (outcome) => {
      if (outcome === 'code') return;
      await arrive();
      await goOn();
    },
  });
}

const CODE_PATHS: Record<CodeKind, string> = {
  totp: '/api/auth/two-factor/verify-totp',
  recovery: '/api/auth/two-factor/verify-backup-code',
};

/** The second step of signing in. */
export function useSendCode(kind: CodeKind) {
  const arrive = useArrive();
  const goOn = useGoOn();
  return useMutation({
    mutationFn: (body: { code: string }) => request(CODE_PATHS[kind], doneSchema, { method: 'POST', body }),
    onSuccess: async () => {
      await arrive();
      await goOn();
    },
  });
}

/**
 * Makes an account and signs in to it. Whether the address had one already is not told: then the password may not be
 * the account's, nobody is signed in, and the mail says how to go on.
 */
export function useSignUp() {
  const arrive = useArrive();
  return useMutation({
    mutationFn: async (body: Credentials & { name: string }): Promise<'in' | 'mailed'> => {
      await request('/api/auth/sign-up/email', doneSchema, { method: 'POST', body });
      try {
        if ((await signIn({ email: body.email, password: body.password })) === 'code') return 'mailed';
      } catch (error) {
        if (error instanceof ProblemError && error.status === 401) return 'mailed';
        throw error;
      }
      await arrive();
      return 'in';
    },
  });
}
