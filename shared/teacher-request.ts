import { z } from 'zod';

/** Whether a request to become a teacher waits, or what became of it. */
export const TEACHER_REQUEST_STATES = ['pending', 'accepted', 'declined'] as const;

/** What somebody writes who asks to become a teacher: one sentence of 10 to 500 characters; anything else is refused. */
export const teacherRequestInputSchema = z.strictObject({
  sentence: z
    .string()
    .trim()
    .min(10, 'Say in a sentence what you teach: at least 10 characters.')
    .max(500, 'One sentence is enough: at most 500 characters.'),
});
/** Somebody's own request to become a teacher, and what became of it; moments are ISO 8601 in UTC. */
export const teacherRequestSchema = z.object({
  id: z.uuid(),
  sentence: z.string(),
  state: z.enum(TEACHER_REQUEST_STATES),
  createdAt: z.string(),
  answeredAt: z.string().nullable(),
});
/** Somebody's own request to become a teacher. */
export type TeacherRequest = z.infer<typeof teacherRequestSchema>;
