import { Router } from 'express';
import { newTokenSchema, TOKENS_MAX, tokenInputSchema } from '../../shared/tokens/tokens.schema.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { parseBody, parseId } from '../http/parse.ts';
import { invalid, notFound, Problem } from '../http/problem.ts';
import { makeToken } from './make-token.ts';
import { tokenListSchema } from './tokens.api.ts';
import { createToken, deleteToken, listTokens } from './tokens.store.ts';

const THING = 'token';

export function tokenRoutes({ db, requireUser }: RouteDeps): Router {
  const router = Router();

  router.get('/api/tokens', async (request, reply) => {
    const user = await requireUser(request);
    reply.json(answer(tokenListSchema, { items: await listTokens(db, user.id) }));
  });

  router.post('/api/tokens', async (request, reply) => {
    const user = await requireUser(request);
    const { name, scopes, expiresAt } = parseBody(tokenInputSchema, request);
    const { token, prefix, hash } = makeToken();
    const kept = await createToken(db, user.id, { name, scopes, expiresAt: toEnd(expiresAt), prefix, hash });
    if (kept === null) {
      const detail = `An account may have ${TOKENS_MAX} tokens: withdraw one that is no longer used.`;
      throw new Problem('conflict', { detail });
    }
    reply.status(201).json(answer(newTokenSchema, { ...kept, token }));
  });

  router.delete('/api/tokens/:id', async (request, reply) => {
    const user = await requireUser(request);
    if (!(await deleteToken(db, user.id, parseId(request, THING)))) throw notFound(THING);
    reply.status(204).end();
  });
  return router;
}

/** MariaDB's DATETIME ends with the year 9999, and a token that has ended already would be a slip. */
function toEnd(text: string | null): Date | null {
  if (text === null) return null;
  const end = new Date(text);
  if (end <= new Date() || end.getUTCFullYear() > 2200) {
    throw invalid([
      { pointer: '/expiresAt', detail: 'Give a moment that is still to come, or none at all.' },
    ]);
  }
  return end;
}
