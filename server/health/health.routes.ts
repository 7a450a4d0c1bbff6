import { Router } from 'express';
import about from '../../package.json' with { type: 'json' };
import { healthSchema } from '../../shared/health.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { doesDatabaseAnswer } from './health.store.ts';

export function healthRoutes({ db }: RouteDeps): Router {
  const router = Router();
  router.get('/api/health', async (_request, reply) => {
    const isUp = await doesDatabaseAnswer(db);
    reply.status(isUp ? 200 : 503).json(
      answer(healthSchema, {
        status: isUp ? 'ok' : 'degraded',
        version: about.version,
        database: isUp ? 'answers' : 'silent',
      }),
    );
  });
  return router;
}
