import { mailboxEntrySchema, mailboxMessageSchema } from '../../shared/mailbox.ts';
import { pageOf, pageQuerySchema } from '../../shared/paging.ts';
import type { NounDescription } from '../http/describe.ts';

export const mailboxApi: NounDescription = {
  noun: 'Mailbox',
  schemas: { MailboxMessage: mailboxMessageSchema },
  routes: {
    'GET /api/mailbox': {
      summary:
        'List the mail that the local mailbox has received; only where nobody but this machine reaches it',
      who: 'anyone',
      scope: null,
      query: pageQuerySchema,
      answers: { 200: pageOf(mailboxEntrySchema) },
      problems: ['notFound'],
    },
    'GET /api/mailbox/:id': {
      summary: 'Read a mail of the local mailbox',
      who: 'anyone',
      scope: null,
      answers: { 200: mailboxMessageSchema },
    },
  },
};
