import type { Request } from 'express';
import type { Auth } from '../auth.ts';
import type { Db } from '../db/client.ts';
import { tooMany } from './auth-problem.ts';
import { addressKey, countOne, forgetCount, type LimitRule } from './limits.store.ts';

/** Wrong passwords for one account, from wherever they come: a right one begins the count anew. */
const PASSWORDS: LimitRule = { window: 900, max: 20 };
/** Mail to one address that somebody can bring about without being its owner. */
const MAILS: LimitRule = { window: 3600, max: 6 };
/** Codes that a signed-in person may get wrong. */
const CODES: LimitRule = { window: 900, max: 20 };
/** Archives of everything. */
const ARCHIVES: LimitRule = { window: 3600, max: 10 };

/** Limits that no address of a network gets round, counted in the database; the library counts by network address. */
export function accountLimits(db: Db, auth: Auth) {
  const isOn = auth.options.rateLimit.enabled;

  async function take(request: Request, key: string, rule: LimitRule): Promise<void> {
    if (!isOn) return;
    const { allowed, retryAfter } = await countOne(db, key, rule);
    if (allowed) return;
    const seconds = String(retryAfter ?? rule.window);
    request.res?.set('retry-after', seconds);
    throw tooMany(seconds);
  }

  /** Counts first, then asks: of a thousand at once no more get through than may. What succeeds was no guess. */
  async function guarded<T>(
    request: Request,
    key: string,
    rule: LimitRule,
    work: () => Promise<T>,
  ): Promise<T> {
    await take(request, key, rule);
    const result = await work();
    if (isOn) await forgetCount(db, key);
    return result;
  }

  return {
    /** Signing in with an address, known or not. */
    signIn: <T>(request: Request, email: string, work: () => Promise<T>) =>
      guarded(request, addressKey('sign-in', email), PASSWORDS, work),
    /** The password asked for again from whoever is signed in. */
    passwordAgain: <T>(request: Request, userId: string, work: () => Promise<T>) =>
      guarded(request, `password|${userId}`, PASSWORDS, work),
    /** A code from whoever is signed in. */
    code: <T>(request: Request, userId: string, work: () => Promise<T>) =>
      guarded(request, `code|${userId}`, CODES, work),
    /** A mail to an address, known or not. */
    mailTo: (request: Request, email: string) => take(request, addressKey('mail', email), MAILS),
    archive: (request: Request, userId: string) => take(request, `archive|${userId}`, ARCHIVES),
  };
}

export type AccountLimits = ReturnType<typeof accountLimits>;
