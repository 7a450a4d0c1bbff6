import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { mailboxEntrySchema, mailboxMessageSchema } from '../../shared/mailbox.ts';
import { pageOf } from '../../shared/paging.ts';
import { request } from '../api/request.ts';
import { ProblemError } from '../api/problem-error.ts';

/** The mail that this machine's own mailbox has received; where there is none the server answers 404. */
export const mailboxQuery = (page = 1) =>
  queryOptions({
    queryKey: ['mailbox', 'list', { page }],
    queryFn: ({ signal }) => request(`/api/mailbox?page=${page}`, pageOf(mailboxEntrySchema), { signal }),
    placeholderData: keepPreviousData,
    staleTime: 0,
  });

export const messageQuery = (mailId: string) =>
  queryOptions({
    queryKey: ['mailbox', 'one', mailId],
    queryFn: ({ signal }) => request(`/api/mailbox/${mailId}`, mailboxMessageSchema, { signal }),
  });

/** Whether mail stays on this machine, in a mailbox that a page shows. */
export const hasMailboxQuery = queryOptions({
  queryKey: ['mailbox', 'exists'],
  queryFn: async ({ signal }) => {
    try {
      await request('/api/mailbox?pageSize=1', pageOf(mailboxEntrySchema), { signal });
      return true;
    } catch (error) {
      if (error instanceof ProblemError && error.status === 404) return false;
      throw error;
    }
  },
  staleTime: Infinity,
});
