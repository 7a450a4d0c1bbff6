import { Router } from 'express';
import { makePlan } from '../../shared/plans/make-plan.ts';
import { refuseOptions } from '../../shared/plans/not-reckoned.ts';
import { fitAnswerSchema, fitRequestSchema } from '../../shared/plans/plans.schema.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { reckon } from '../http/misuse.ts';
import { parseBody } from '../http/parse.ts';
import { refuseIfAny } from '../http/problem.ts';
import { loadPlanGround } from './fit.store.ts';

export function fitRoutes({ db, requireUser }: RouteDeps): Router {
  const router = Router();
  router.post('/api/fit', async (request, reply) => {
    const user = await requireUser(request);
    const asked = parseBody(fitRequestSchema, request);
    const ground = await loadPlanGround(db, user.id, asked);
    refuseIfAny(refuseOptions(asked.options, ground.pattern, ground.table));
    reply.json(
      answer(
        fitAnswerSchema,
        reckon('/options', () => makePlan(ground)),
      ),
    );
  });
  return router;
}
