import { z } from 'zod';
import { pageQuerySchema } from '../paging.ts';

/** Where a mail stands: `failed` is given up, `waiting` and `sending` go on by themselves. */
export const MAIL_STATES_LISTED = ['waiting', 'sending', 'failed', 'sent'] as const;

/** Which mail is listed: what waits, unless another state is asked for. */
export const adminMailQuerySchema = pageQuerySchema.extend({
  state: z.enum(MAIL_STATES_LISTED).default('waiting'),
});

/** A mail as its administrator sees it: to whom, of what kind and how far it came, never what it says. */
export const adminMailSchema = z.object({
  id: z.uuid(),
  to: z.string(),
  kind: z.string(),
  state: z.enum(MAIL_STATES_LISTED),
  attempts: z.int(),
  nextAt: z.string(),
  createdAt: z.string(),
  sentAt: z.string().nullable(),
  /** A code, never a server's sentence: that would name people. */
  lastError: z.string().nullable(),
});
/** A mail as its administrator sees it. */
export type AdminMail = z.infer<typeof adminMailSchema>;
