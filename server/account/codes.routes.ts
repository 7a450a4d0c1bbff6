import express, { Router, type Request } from 'express';
import { z } from 'zod';
import { recoveryCodeSchema, totpSchema } from '../../shared/account.ts';
import { doneSchema } from '../../shared/account-answers.ts';
import type { Db } from '../db/client.ts';
import { answer } from '../http/answer.ts';
import { parseBody } from '../http/parse.ts';
import { invalid } from '../http/problem.ts';
import { findAccount } from './account.store.ts';
import { ask, inAuthTransaction, setCookies, type Answered } from './ask.ts';
import type { AuthRouteDeps } from './auth-deps.ts';
import { secondFactorSwitched } from './letters.ts';
import { mailToOwner } from './mail-to-owner.ts';
import { spend } from './spent.store.ts';

const DONE = { status: true } as const;
const userIdSchema = z.object({ user: z.object({ id: z.uuid() }) });

/** A code fits for 90 seconds: its own thirty, and the thirty before and after for clocks that differ. */
const CODE_FITS_MS = 120_000;

/** The codes of a second factor: an authenticator's, and recovery codes for when it is lost. */
export function codeRoutes(deps: AuthRouteDeps): Router {
  const { db, auth, limits, config } = deps;
  const router = Router();
  const sent = express.json({ limit: '16kb' });

  router.post('/api/auth/two-factor/verify-totp', sent, async (request, reply) => {
    const { code } = parseBody(totpSchema, request);
    const answered = await guardCode(request, () =>
      inAuthTransaction(db, (tx) => verifyTotp(tx, request, code)),
    );
    setCookies(reply, answered);
    reply.json(answer(doneSchema, DONE));
  });

  router.post('/api/auth/two-factor/verify-backup-code', sent, async (request, reply) => {
    const body = parseBody(recoveryCodeSchema, request);
    const answered = await guardCode(request, () =>
      inAuthTransaction(db, () =>
        ask(auth, request, { method: 'POST', path: '/two-factor/verify-backup-code', body }),
      ),
    );
    setCookies(reply, answered);
    reply.json(answer(doneSchema, DONE));
  });

  /** At sign-in the library counts wrong codes, by challenge and by account; for whoever is signed in, we do. */
  async function guardCode(request: Request, work: () => Promise<Answered>): Promise<Answered> {
    const user = await deps.currentUser(request);
    return user === null ? work() : limits.code(request, user.id, work);
  }

  async function verifyTotp(tx: Db, request: Request, code: string): Promise<Answered> {
    const wasOn = await isOn(tx, request);
    const answered = await ask(auth, request, {
      method: 'POST',
      path: '/two-factor/verify-totp',
      body: { code },
    });
    const { user } = userIdSchema.parse(answered.body);
    // Thrown here, the session that was just made is undone with all the rest.
    if (!(await spend(tx, user.id, code, new Date(Date.now() + CODE_FITS_MS)))) {
      const detail = 'This code was used already. Wait for the next one, at most half a minute.';
      throw invalid([{ pointer: '/code', detail }]);
    }
    if (wasOn === false) {
      const say = (about: { name: string; appUrl: string }) => secondFactorSwitched(about, true);
      await mailToOwner(tx, config, user.id, 'second-factor-on', say);
    }
    return answered;
  }

  /** Of whoever is signed in; null at sign-in. */
  async function isOn(tx: Db, request: Request): Promise<boolean | null> {
    const user = await deps.currentUser(request);
    return user && ((await findAccount(tx, user.id))?.twoFactorEnabled ?? null);
  }
  return router;
}
