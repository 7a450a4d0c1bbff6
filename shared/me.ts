import * as z from 'zod/mini';

/** What somebody may do on this instance. */
export const ROLES = ['member', 'teacher', 'admin'] as const;
/** What somebody may do on this instance. */
export type Role = (typeof ROLES)[number];

/**
 * Who is signed in, or nobody. Written with zod's small form, since every page reads it and the front page is to stay
 * light; anything else than such an answer is refused.
 */
export const meSchema = z.object({
  user: z.nullable(z.object({ id: z.uuid(), name: z.string(), email: z.email(), role: z.enum(ROLES) })),
});
/** Who is signed in, or nobody. */
export type Me = z.infer<typeof meSchema>;
