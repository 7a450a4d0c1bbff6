import { z } from 'zod';

/** A mail in the local mailbox, as the list shows it; the moment is ISO 8601 in UTC. */
export const mailboxEntrySchema = z.object({
  id: z.uuid(),
  to: z.string(),
  subject: z.string(),
  receivedAt: z.string(),
});
/** A mail in the local mailbox, as the list shows it. */
export type MailboxEntry = z.infer<typeof mailboxEntrySchema>;

/** A mail in the local mailbox, whole. */
export const mailboxMessageSchema = mailboxEntrySchema.extend({
  from: z.string(),
  messageId: z.string(),
  text: z.string(),
  html: z.string(),
});
/** A mail in the local mailbox, whole. */
export type MailboxMessage = z.infer<typeof mailboxMessageSchema>;
