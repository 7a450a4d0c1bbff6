import { createHash, randomBytes } from 'node:crypto';

const BEGINNING = 'leeway_';
const SHOWN = BEGINNING.length + 6;

/** A fresh token of 256 random bits; `prefix` is enough to know it by and nothing to guess it from. */
export function makeToken(): { token: string; prefix: string; hash: string } {
  const token = `${BEGINNING}${randomBytes(32).toString('base64url')}`;
  return { token, prefix: token.slice(0, SHOWN), hash: hashOf(token) };
}

/** What is kept of a token. A plain hash does: nobody can try out 2²⁵⁶ of them, as they could a password. */
export const hashOf = (token: string): string => createHash('sha256').update(token).digest('hex');
