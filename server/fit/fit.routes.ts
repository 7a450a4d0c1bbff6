import { Router } from 'express';
import { makePlan } from '../../shared/plans/make-plan.ts';
import { refuseOptions } from '../../shared/plans/not-reckoned.ts';
import { fitRequestSchema, type FitAnswer } from '../../shared/plans/plans.schema.ts';
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
    // Reckoned, not read from a table: there is no column here that could leak, and copying the plan through its
    // schema costs as much as the plan. The tests hold every answer against the schema instead.
    const reckoned: FitAnswer = reckon('/options', () => makePlan(ground));
    reply.json(reckoned);
  });
  return router;
}
