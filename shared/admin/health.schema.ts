import { z } from 'zod';

/** How the instance is doing, as its administrator sees it; sizes in bytes, moments ISO 8601 in UTC. */
export const adminHealthSchema = z.object({
  version: z.string(),
  /** This process; another one behind the same address has its own. */
  startedAt: z.string(),
  uptimeSeconds: z.number().nonnegative(),
  database: z.object({
    version: z.string(),
    migrationsApplied: z.int(),
    migrationsKnown: z.int(),
  }),
  /** The disk on which the data folder lies. */
  disk: z.object({ freeBytes: z.number(), totalBytes: z.number() }),
  mail: z.object({ waiting: z.int(), failed: z.int() }),
});
/** How the instance is doing, as its administrator sees it. */
export type AdminHealth = z.infer<typeof adminHealthSchema>;
