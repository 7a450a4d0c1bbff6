import { Router } from 'express';
import about from '../../package.json' with { type: 'json' };
import type { Auth } from '../auth.ts';
import type { NounDescription } from '../http/describe.ts';
import { describeInterface } from './document.ts';

/** The description is the same for everybody and never changes while the server runs: it is written once. */
export function openapiRoutes({ auth, nouns }: { auth: Auth; nouns: readonly NounDescription[] }): Router {
  const router = Router();
  let text: string | null = null;
  router.get('/api/openapi.json', async (_request, reply) => {
    const { authCookies } = await auth.$context;
    const cookie = authCookies.sessionToken.name;
    text ??= JSON.stringify(describeInterface(nouns, { version: about.version, cookie }));
    reply.type('application/json').send(text);
  });
  return router;
}
