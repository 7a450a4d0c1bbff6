import { z } from 'zod';

/** What a personal access token may be allowed: to read or to write one kind of record; writing does not include reading. */
export const TOKEN_SCOPES = [
  'people:read',
  'people:write',
  'patterns:read',
  'patterns:write',
  'plans:read',
  'plans:write',
] as const;
/** One thing that a token may be allowed. */
export type TokenScope = (typeof TOKEN_SCOPES)[number];

/** The most tokens that one account may have at a time. */
export const TOKENS_MAX = 50;

/** What somebody writes to make a token: a name of up to 80 characters, at least one scope, and when it ends (null: never). */
export const tokenInputSchema = z.object({
  name: z.string().trim().min(1, 'Write what the token is for: it is how you will know it.').max(80),
  scopes: z
    .array(z.enum(TOKEN_SCOPES))
    .min(1, 'Choose at least one thing the token may do.')
    .max(TOKEN_SCOPES.length)
    .refine((scopes) => new Set(scopes).size === scopes.length, 'Name each scope once.'),
  expiresAt: z.iso.datetime({ offset: true }).nullable().default(null),
});
export type TokenInput = z.infer<typeof tokenInputSchema>;

/** A token in the list: `prefix` is how it begins, the rest is never shown again. `lastUsedAt` is true to the minute. */
export const accessTokenSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  prefix: z.string(),
  scopes: z.array(z.enum(TOKEN_SCOPES)),
  createdAt: z.string(),
  lastUsedAt: z.string().nullable(),
  expiresAt: z.string().nullable(),
});
export type AccessToken = z.infer<typeof accessTokenSchema>;

/** The answer to making one: the only time that the whole token is told. */
export const newTokenSchema = accessTokenSchema.extend({ token: z.string() });
export type NewToken = z.infer<typeof newTokenSchema>;
