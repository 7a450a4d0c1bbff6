import { z } from 'zod';
import { accessTokenSchema, newTokenSchema, tokenInputSchema } from '../../shared/tokens/tokens.schema.ts';
import type { NounDescription } from '../http/describe.ts';

export const tokenListSchema = z.object({ items: z.array(accessTokenSchema) });

export const tokensApi: NounDescription = {
  noun: 'Access tokens',
  schemas: { TokenInput: tokenInputSchema, AccessToken: accessTokenSchema, NewToken: newTokenSchema },
  routes: {
    'GET /api/tokens': {
      summary: 'List your tokens, the latest made first; none is shown again',
      who: 'member',
      scope: null,
      answers: { 200: tokenListSchema },
    },
    'POST /api/tokens': {
      summary: 'Make a token; this answer is the only one that shows it',
      who: 'member',
      scope: null,
      body: tokenInputSchema,
      answers: { 201: newTokenSchema },
      problems: ['conflict'],
    },
    'DELETE /api/tokens/:id': {
      summary: 'Withdraw a token; it is refused from then on',
      who: 'member',
      scope: null,
      answers: { 204: 'nothing' },
    },
  },
};
