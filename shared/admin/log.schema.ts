import { z } from 'zod';

/** What an administrator can do that is written into the log. */
export const ADMIN_ACTIONS = [
  'administratorMade',
  'roleChanged',
  'teacherRequestAccepted',
  'teacherRequestDeclined',
  'mailRetried',
] as const;
/** What an administrator can do that is written into the log. */
export type AdminAction = (typeof ADMIN_ACTIONS)[number];

/** What more there is to say of an act: the role before and after, or which message. Never a measurement. */
export const adminActDetailSchema = z.object({
  from: z.string().optional(),
  to: z.string().optional(),
  mailId: z.uuid().optional(),
});
/** What more there is to say of an act. */
export type AdminActDetail = z.infer<typeof adminActDetailSchema>;

const whoSchema = z.object({ id: z.uuid(), name: z.string() }).nullable();

/**
 * One act: who, what, on whom, when. `by` and `on` are null where there is nobody (the command line, a message) or the
 * account was deleted since.
 */
export const adminActSchema = z.object({
  id: z.uuid(),
  at: z.string(),
  by: whoSchema,
  through: z.enum(['page', 'command']),
  action: z.enum(ADMIN_ACTIONS),
  on: whoSchema,
  detail: adminActDetailSchema,
});
/** One act: who, what, on whom, when. */
export type AdminAct = z.infer<typeof adminActSchema>;
