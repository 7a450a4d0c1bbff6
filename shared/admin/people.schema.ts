import { z } from 'zod';
import { ROLES } from '../me.ts';
import { pageQuerySchema } from '../paging.ts';
import { TEACHER_REQUEST_STATES, teacherRequestSchema } from '../teacher-request.ts';

/** Which accounts are listed: a page, `q` in the name or the address, and one role or all. */
export const adminPeopleQuerySchema = pageQuerySchema.extend({
  q: z.string().trim().max(100).default(''),
  role: z.enum(ROLES).optional(),
});
/** Which accounts are listed. */
export type AdminPeopleQuery = z.infer<typeof adminPeopleQuerySchema>;

/** An account as an administrator sees it: who it is and what it may do, and nothing that it keeps. */
export const adminPersonSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  role: z.enum(ROLES),
  emailVerified: z.boolean(),
  createdAt: z.string(),
  /** Whether a request to become a teacher waits for an answer. */
  asksToTeach: z.boolean(),
});
/** An account as an administrator sees it. */
export type AdminPerson = z.infer<typeof adminPersonSchema>;

/** The one thing an administrator may change of an account; anything else sent is refused. */
export const roleChangeSchema = z.strictObject({ role: z.enum(ROLES) });

/** Which requests to become a teacher are listed: those that wait, unless another state is asked for. */
export const adminTeacherRequestsQuerySchema = pageQuerySchema.extend({
  state: z.enum(TEACHER_REQUEST_STATES).default('pending'),
});
/** Which requests to become a teacher are listed. */
export type AdminTeacherRequestsQuery = z.infer<typeof adminTeacherRequestsQuerySchema>;

/** A request to become a teacher with who asks. */
export const adminTeacherRequestSchema = teacherRequestSchema.extend({
  person: z.object({ id: z.uuid(), name: z.string(), email: z.string() }),
});
/** A request to become a teacher with who asks. */
export type AdminTeacherRequest = z.infer<typeof adminTeacherRequestSchema>;

/** An administrator's answer to a request; anything else sent is refused. */
export const teacherAnswerSchema = z.strictObject({ accept: z.boolean() });
