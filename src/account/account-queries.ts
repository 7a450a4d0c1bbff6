import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import {
  accountSchema,
  accountSessionsSchema,
  doneSchema,
  recoveryCodesSchema,
  secondFactorSetupSchema,
} from '../../shared/account-answers.ts';
import { teacherRequestSchema } from '../../shared/teacher-request.ts';
import { request, requestFile, requestNothing } from '../api/request.ts';
import { todayHere } from '../ui/day.ts';
import { saveFile } from '../ui/save-file.ts';
import { meQuery } from './queries.ts';

/** The account of whoever is signed in. Apart from `queries.ts`, which every page carries. */
export const accountQuery = queryOptions({
  queryKey: ['account', 'own'],
  queryFn: ({ signal }) => request('/api/account', accountSchema, { signal }),
});

export const sessionsQuery = queryOptions({
  queryKey: ['account', 'sessions'],
  queryFn: ({ signal }) => request('/api/account/sessions', accountSessionsSchema, { signal }),
});

/** What changes the account makes everything read of it stale, the name in the frame of the page too. */
function useAccountMutation<Input, Output>(act: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: act,
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: ['account'] }),
        client.invalidateQueries({ queryKey: meQuery.queryKey }),
      ]);
    },
  });
}

const post = (path: string, body: unknown) => request(path, doneSchema, { method: 'POST', body });

export const useChangeName = () =>
  useAccountMutation((body: { name: string }) =>
    request('/api/account', accountSchema, { method: 'PATCH', body }),
  );

export const useChangeEmail = () =>
  useAccountMutation((body: { newEmail: string; password: string }) => post('/api/auth/change-email', body));

export const useSendConfirmation = () =>
  useAccountMutation(() => post('/api/auth/send-verification-email', {}));

export const useChangePassword = () =>
  useAccountMutation((body: { currentPassword: string; newPassword: string }) =>
    post('/api/auth/change-password', body),
  );

/** Makes the key and the codes; nothing is asked for at sign-in until a code has been tried. */
export const useBeginSecondFactor = () =>
  useMutation({
    mutationFn: (body: { password: string }) =>
      request('/api/auth/two-factor/enable', secondFactorSetupSchema, { method: 'POST', body }),
  });

/** The first code of the authenticator: from now on one is asked for. */
export const useFinishSecondFactor = () =>
  useAccountMutation((body: { code: string }) => post('/api/auth/two-factor/verify-totp', body));

export const useEndSecondFactor = () =>
  useAccountMutation((body: { password: string }) => post('/api/auth/two-factor/disable', body));

export const useNewRecoveryCodes = () =>
  useAccountMutation((body: { password: string }) =>
    request('/api/auth/two-factor/generate-backup-codes', recoveryCodesSchema, { method: 'POST', body }),
  );

export const useEndSession = () =>
  useAccountMutation((sessionId: string) =>
    requestNothing(`/api/account/sessions/${sessionId}`, { method: 'DELETE' }),
  );

export const useEndOtherSessions = () =>
  useAccountMutation(() => requestNothing('/api/account/sessions', { method: 'DELETE' }));

export const useAskToTeach = () =>
  useAccountMutation((body: { sentence: string }) =>
    request('/api/account/teacher-request', teacherRequestSchema, { method: 'POST', body }),
  );

export const useWithdrawAsking = () =>
  useAccountMutation(() => requestNothing('/api/account/teacher-request', { method: 'DELETE' }));

/** Has the archive made, and saves it. */
export const useTakeEverythingAway = () =>
  useMutation({
    mutationFn: async () => {
      const { bytes, name } = await requestFile('/api/account/export', { method: 'POST', body: {} });
      saveFile(bytes, name ?? `leeway-${todayHere()}.zip`);
      return { name, bytes: bytes.size };
    },
  });

export const useDeleteAccount = () =>
  useMutation({
    mutationFn: (body: { password: string }) => requestNothing('/api/account', { method: 'DELETE', body }),
  });
