import { z } from 'zod';

const claimsSchema = z.object({
  email: z.string(),
  updateTo: z.string().optional(),
  userId: z.uuid(),
  exp: z.number(),
});

/** What a link to confirm an address says of itself; null where it is none of ours. */
export type LinkClaims = z.infer<typeof claimsSchema>;

/** Reads a token without checking who signed it: only ever believed where the sign-in library has checked it. */
export function claimsOf(token: string): LinkClaims | null {
  try {
    const body = Buffer.from(token.split('.')[1] ?? '', 'base64url').toString('utf8');
    return claimsSchema.parse(JSON.parse(body));
  } catch {
    return null;
  }
}
