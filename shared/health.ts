import { z } from 'zod';

/** Whether this instance works: its version and whether its database answers. */
export const healthSchema = z.object({
  status: z.enum(['ok', 'degraded']),
  version: z.string(),
  database: z.enum(['answers', 'silent']),
});
