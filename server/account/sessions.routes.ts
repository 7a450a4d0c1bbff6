import { fromNodeHeaders } from 'better-auth/node';
import { Router, type Request } from 'express';
import { accountSessionsSchema } from '../../shared/account-answers.ts';
import { answer } from '../http/answer.ts';
import { parseId } from '../http/parse.ts';
import { notFound } from '../http/problem.ts';
import type { AuthRouteDeps } from './auth-deps.ts';
import { endOtherSessions, endSession, listSessions } from './sessions.store.ts';

const SESSION = 'session';

/** Where somebody is signed in, and ending it. */
export function sessionRoutes({ db, auth, requireUser }: AuthRouteDeps): Router {
  const router = Router();

  router.get('/api/account/sessions', async (request, reply) => {
    const user = await requireUser(request);
    const items = await listSessions(db, user.id, await currentSession(request));
    reply.json(answer(accountSessionsSchema, { items }));
  });

  router.delete('/api/account/sessions/:id', async (request, reply) => {
    const user = await requireUser(request);
    if (!(await endSession(db, user.id, parseId(request, SESSION)))) throw notFound(SESSION);
    reply.status(204).end();
  });

  router.delete('/api/account/sessions', async (request, reply) => {
    const user = await requireUser(request);
    await endOtherSessions(db, user.id, await currentSession(request));
    reply.status(204).end();
  });

  async function currentSession(request: Request): Promise<string> {
    const found = await auth.api.getSession({ headers: fromNodeHeaders(request.headers) });
    return found?.session.id ?? '';
  }
  return router;
}
