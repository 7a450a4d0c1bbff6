import express, { Router } from 'express';
import { signInSchema, signUpSchema } from '../../shared/account.ts';
import { doneSchema, signedInAnswerSchema } from '../../shared/account-answers.ts';
import { answer } from '../http/answer.ts';
import { parseBody } from '../http/parse.ts';
import { isAddressTaken } from './account.store.ts';
import { ask, inAuthTransaction, setCookies } from './ask.ts';
import type { AuthRouteDeps } from './auth-deps.ts';

const DONE = { status: true } as const;

/**
 * The sign-in library answers under /api/auth, through a few addresses only: what is sent is parsed with the form's own
 * schema, and what it refuses is told in the same form as every other refusal.
 */
export function authRoutes({ db, auth, limits }: AuthRouteDeps): Router {
  const router = Router();
  const sent = express.json({ limit: '16kb' });

  router.post('/api/auth/sign-up/email', sent, async (request, reply) => {
    const body = parseBody(signUpSchema, request);
    await limits.mailTo(request, body.email);
    const signUp = () =>
      inAuthTransaction(db, () => ask(auth, request, { method: 'POST', path: '/sign-up/email', body }));
    await signUp().catch(async (error: unknown) => {
      // Of two at once the slower finds the address taken when it writes: asked again, it is told what it may know.
      if (!(await isAddressTaken(db, body.email))) throw error;
      await signUp();
    });
    // The same for an address that has an account already: its owner is told by mail.
    reply.json(answer(doneSchema, DONE));
  });

  router.post('/api/auth/sign-in/email', sent, async (request, reply) => {
    const body = parseBody(signInSchema, request);
    const answered = await limits.signIn(request, body.email, () =>
      ask(auth, request, { method: 'POST', path: '/sign-in/email', body }),
    );
    setCookies(reply, answered);
    reply.json(answer(signedInAnswerSchema, signedInAnswerSchema.parse(answered.body)));
  });

  router.post('/api/auth/sign-out', sent, async (request, reply) => {
    setCookies(reply, await ask(auth, request, { method: 'POST', path: '/sign-out', body: {} }));
    reply.json({ success: true });
  });

  router.get('/api/auth/get-session', async (request, reply) => {
    const answered = await ask(auth, request, { method: 'GET', path: '/get-session' });
    setCookies(reply, answered);
    reply.json(answered.body);
  });
  return router;
}
