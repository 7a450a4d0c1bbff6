import express, { Router, type Request } from 'express';
import { passwordAgainSchema } from '../../shared/account.ts';
import { doneSchema, recoveryCodesSchema, secondFactorSetupSchema } from '../../shared/account-answers.ts';
import type { Db } from '../db/client.ts';
import { answer } from '../http/answer.ts';
import { parseBody } from '../http/parse.ts';
import { found, Problem } from '../http/problem.ts';
import { findAccount } from './account.store.ts';
import { ask, inAuthTransaction, setCookies, type Answered } from './ask.ts';
import type { AuthRouteDeps } from './auth-deps.ts';
import { recoveryCodesMade, secondFactorSwitched } from './letters.ts';
import { mailToOwner } from './mail-to-owner.ts';

const DONE = { status: true } as const;

/** The second factor switched on and off, and its recovery codes made anew: each by the password. */
export function secondFactorRoutes(deps: AuthRouteDeps): Router {
  const { db, auth, limits, config } = deps;
  const router = Router();
  const sent = express.json({ limit: '16kb' });

  router.post('/api/auth/two-factor/enable', sent, async (request, reply) => {
    const user = await deps.requireUser(request);
    const body = parseBody(passwordAgainSchema, request);
    const { emailVerified } = found(await findAccount(db, user.id), 'account');
    if (!emailVerified) {
      // Whoever made the account with somebody else's address could otherwise keep the owner out for good.
      throw new Problem('conflict', { detail: 'Confirm your e-mail address first: a link is in your mail.' });
    }
    const answered = await withPassword(request, user.id, '/two-factor/enable', body);
    reply.json(answer(secondFactorSetupSchema, secondFactorSetupSchema.parse(answered.body)));
  });

  router.post('/api/auth/two-factor/generate-backup-codes', sent, async (request, reply) => {
    const user = await deps.requireUser(request);
    const body = parseBody(passwordAgainSchema, request);
    const path = '/two-factor/generate-backup-codes';
    const answered = await withPassword(request, user.id, path, body, (tx) =>
      mailToOwner(tx, config, user.id, 'recovery-codes', recoveryCodesMade),
    );
    reply.json(answer(recoveryCodesSchema, recoveryCodesSchema.parse(answered.body)));
  });

  router.post('/api/auth/two-factor/disable', sent, async (request, reply) => {
    const user = await deps.requireUser(request);
    const body = parseBody(passwordAgainSchema, request);
    const answered = await withPassword(request, user.id, '/two-factor/disable', body, (tx) =>
      mailToOwner(tx, config, user.id, 'second-factor-off', (about) => secondFactorSwitched(about, false)),
    );
    setCookies(reply, answered);
    reply.json(answer(doneSchema, DONE));
  });

  /** The library refuses a wrong password itself; what follows a right one joins its transaction. */
  function withPassword(
    request: Request,
    userId: string,
    path: string,
    body: { password: string },
    then?: (tx: Db) => Promise<void>,
  ): Promise<Answered> {
    return limits.passwordAgain(request, userId, () =>
      inAuthTransaction(db, async (tx) => {
        const answered = await ask(auth, request, { method: 'POST', path, body });
        await then?.(tx);
        return answered;
      }),
    );
  }
  return router;
}
