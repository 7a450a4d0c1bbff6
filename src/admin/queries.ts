import { keepPreviousData, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { adminHealthSchema } from '../../shared/admin/health.schema.ts';
import { adminActSchema } from '../../shared/admin/log.schema.ts';
import { adminMailSchema, type MAIL_STATES_LISTED } from '../../shared/admin/mail.schema.ts';
import { adminPersonSchema, adminTeacherRequestSchema } from '../../shared/admin/people.schema.ts';
import { adminReferenceSchema } from '../../shared/admin/reference.schema.ts';
import type { Role } from '../../shared/me.ts';
import { pageOf } from '../../shared/paging.ts';
import type { TEACHER_REQUEST_STATES } from '../../shared/teacher-request.ts';
import { request } from '../api/request.ts';
import { meQuery } from '../account/queries.ts';

export type MailState = (typeof MAIL_STATES_LISTED)[number];
export type RequestState = (typeof TEACHER_REQUEST_STATES)[number];

/** One page of one of the administration's lists; the page before stays in sight until it is there. */
function list<T extends z.ZodType>(noun: string, item: T, asked: Record<string, string | number | null>) {
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(asked)) {
    if (value !== null && value !== '') query.set(name, String(value));
  }
  return queryOptions({
    queryKey: ['admin', noun, asked],
    queryFn: ({ signal }) => request(`/api/admin/${noun}?${query.toString()}`, pageOf(item), { signal }),
    placeholderData: keepPreviousData,
    staleTime: 0,
  });
}

export const adminPeopleQuery = (page: number, q: string, role: Role | null) =>
  list('people', adminPersonSchema, { page, q, role });

export const adminRequestsQuery = (page: number, state: RequestState) =>
  list('teacher-requests', adminTeacherRequestSchema, { page, state });

export const adminMailQuery = (page: number, state: MailState) =>
  list('mail', adminMailSchema, { page, state });

export const adminLogQuery = (page: number) => list('log', adminActSchema, { page });

export const adminHealthQuery = queryOptions({
  queryKey: ['admin', 'health'],
  queryFn: ({ signal }) => request('/api/admin/health', adminHealthSchema, { signal }),
  staleTime: 0,
});

export const adminReferenceQuery = queryOptions({
  queryKey: ['admin', 'reference'],
  queryFn: ({ signal }) => request('/api/admin/reference', adminReferenceSchema, { signal }),
  staleTime: Infinity,
});

/** Whatever an administrator does makes every list of theirs stale, the log among them; and their own role may be it. */
function useAdminMutation<Input, Output>(act: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: act,
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: ['admin'] }),
        client.invalidateQueries({ queryKey: meQuery.queryKey }),
      ]);
    },
  });
}

export const useChangeRole = () =>
  useAdminMutation(({ id, role }: { id: string; role: Role }) =>
    request(`/api/admin/people/${id}`, adminPersonSchema, { method: 'PATCH', body: { role } }),
  );

export const useAnswerRequest = () =>
  useAdminMutation(({ id, accept }: { id: string; accept: boolean }) =>
    request(`/api/admin/teacher-requests/${id}/answer`, adminTeacherRequestSchema, {
      method: 'POST',
      body: { accept },
    }),
  );

export const useRetryMail = () =>
  useAdminMutation((mailId: string) =>
    request(`/api/admin/mail/${mailId}/retry`, adminMailSchema, { method: 'POST' }),
  );
