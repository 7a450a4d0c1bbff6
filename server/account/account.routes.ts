import { fromNodeHeaders } from 'better-auth/node';
import express, { Router, type Request, type Response as Reply } from 'express';
import { z } from 'zod';
import { signInSchema, signUpSchema } from '../../shared/account.ts';
import { meSchema } from '../../shared/me.ts';
import { ADDRESS_HEADER, type Auth } from '../auth.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { parseBody } from '../http/parse.ts';
import { fromAuth } from './auth-problem.ts';

const nothingSchema = z.object({}).default({});
const refusalSchema = z.object({ code: z.string().optional() });

/**
 * The sign-in library answers under /api/auth, through three addresses only: what is sent is parsed with the
 * form's own schema, and what it refuses is told in the same form as every other refusal.
 */
export function accountRoutes({ auth, currentUser }: RouteDeps & { auth: Auth }): Router {
  const router = Router();
  const sent = express.json({ limit: '16kb' });
  router.post('/api/auth/sign-up/email', sent, async (request, reply) => {
    await ask(auth, request, reply, parseBody(signUpSchema, request));
  });
  router.post('/api/auth/sign-in/email', sent, async (request, reply) => {
    await ask(auth, request, reply, parseBody(signInSchema, request));
  });
  router.post('/api/auth/sign-out', sent, async (request, reply) => {
    await ask(auth, request, reply, nothingSchema.parse(request.body));
  });
  router.get('/api/auth/get-session', async (request, reply) => {
    await ask(auth, request, reply);
  });
  router.get('/api/me', async (request, reply) => {
    reply.json(answer(meSchema, { user: await currentUser(request) }));
  });
  return router;
}

async function ask(auth: Auth, request: Request, reply: Reply, body?: object): Promise<void> {
  const headers = fromNodeHeaders(request.headers);
  for (const name of ['content-length', 'transfer-encoding', 'content-encoding']) headers.delete(name);
  headers.set(ADDRESS_HEADER, request.ip ?? '');
  const options = body === undefined ? {} : { body: JSON.stringify(body) };
  if (body !== undefined) headers.set('content-type', 'application/json');
  const url = new URL(request.originalUrl, auth.options.baseURL);
  const response = await auth.handler(
    new globalThis.Request(url, { method: request.method, headers, ...options }),
  );
  const text = await response.text();
  const retryAfter = response.headers.get('x-retry-after');
  if (retryAfter !== null) reply.set('retry-after', retryAfter);
  if (!response.ok) throw fromAuth(response.status, codeOf(text), retryAfter);
  for (const cookie of response.headers.getSetCookie()) reply.append('set-cookie', cookie);
  reply.status(response.status).type('application/json').send(text);
}

function codeOf(text: string): string | undefined {
  try {
    return refusalSchema.parse(JSON.parse(text)).code;
  } catch {
    return undefined;
  }
}
