import express, { Router } from 'express';
import { changeEmailSchema, verifyEmailSchema } from '../../shared/account.ts';
import { confirmedAddressSchema, doneSchema } from '../../shared/account-answers.ts';
import { answer } from '../http/answer.ts';
import { parseBody } from '../http/parse.ts';
import { invalid } from '../http/problem.ts';
import { ask, inAuthTransaction } from './ask.ts';
import type { AuthRouteDeps } from './auth-deps.ts';
import { confirmAddress } from './confirm-address.ts';
import { demandPassword } from './password-of.ts';

const DONE = { status: true } as const;

/** Confirming an address and changing it: both by a link that was mailed there. */
export function addressRoutes(deps: AuthRouteDeps): Router {
  const { db, auth, limits } = deps;
  const router = Router();
  const sent = express.json({ limit: '16kb' });

  router.post('/api/auth/send-verification-email', sent, async (request, reply) => {
    const { email } = await deps.requireUser(request);
    await limits.mailTo(request, email);
    await inAuthTransaction(db, () =>
      ask(auth, request, { method: 'POST', path: '/send-verification-email', body: { email } }),
    );
    reply.json(answer(doneSchema, DONE));
  });

  // By POST from a page of ours, since programs that look at mail open every link in it.
  router.post('/api/auth/verify-email', sent, async (request, reply) => {
    const { token } = parseBody(verifyEmailSchema, request);
    const email = await inAuthTransaction(db, (tx) => confirmAddress(tx, deps, request, token));
    reply.json(answer(confirmedAddressSchema, { status: true, email }));
  });

  router.post('/api/auth/change-email', sent, async (request, reply) => {
    const user = await deps.requireUser(request);
    const { newEmail, password } = parseBody(changeEmailSchema, request);
    if (newEmail.toLowerCase() === user.email) {
      throw invalid([{ pointer: '/newEmail', detail: 'This is the address of your account already.' }]);
    }
    await limits.passwordAgain(request, user.id, () => demandPassword(auth, user.id, password));
    await limits.mailTo(request, newEmail);
    await inAuthTransaction(db, () =>
      ask(auth, request, { method: 'POST', path: '/change-email', body: { newEmail } }),
    );
    reply.json(answer(doneSchema, DONE));
  });
  return router;
}
