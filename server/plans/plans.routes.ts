import { Router, type Request } from 'express';
import { pageOf } from '../../shared/paging.ts';
import { makePlan } from '../../shared/plans/make-plan.ts';
import { refuseOptions } from '../../shared/plans/not-reckoned.ts';
import {
  savedPlanInputSchema,
  savedPlanSchema,
  savedPlanSummarySchema,
} from '../../shared/plans/plans.schema.ts';
import { loadPlanGround } from '../fit/fit.store.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { reckon } from '../http/misuse.ts';
import { listQuerySchema, toPage } from '../http/paging.ts';
import { parseBody, parseId, parsePatch, parseQuery } from '../http/parse.ts';
import { found, notFound, refuseIfAny } from '../http/problem.ts';
import { renameSchema } from './plans.api.ts';
import { canUsePlan } from './plans.policy.ts';
import { createPlan, deletePlan, findPlan, listPlans, renamePlan } from './plans.store.ts';

const THING = 'plan';

export function planRoutes({ db, requireUser }: RouteDeps): Router {
  const router = Router();

  async function own(request: Request) {
    const user = await requireUser(request);
    const plan = found(await findPlan(db, parseId(request, THING)), THING);
    if (!canUsePlan(user, plan)) throw notFound(THING);
    return plan;
  }

  router.get('/api/plans', async (request, reply) => {
    const user = await requireUser(request);
    const query = parseQuery(listQuerySchema, request);
    const { plans, total } = await listPlans(db, user.id, query);
    reply.json(answer(pageOf(savedPlanSummarySchema), toPage(plans, total, query)));
  });

  router.post('/api/plans', async (request, reply) => {
    const user = await requireUser(request);
    const asked = parseBody(savedPlanInputSchema, request);
    const ground = await loadPlanGround(db, user.id, asked);
    refuseIfAny(refuseOptions(asked.options, ground.pattern, ground.table));
    const answered = reckon('/options', () => makePlan(ground));
    const id = await createPlan(db, user.id, asked, answered);
    reply.status(201).json(answer(savedPlanSchema, found(await findPlan(db, id), THING)));
  });

  router.get('/api/plans/:id', async (request, reply) => {
    reply.json(answer(savedPlanSchema, await own(request)));
  });

  router.patch('/api/plans/:id', async (request, reply) => {
    const plan = await own(request);
    const { name = plan.name } = parsePatch(renameSchema, request);
    if (name !== plan.name) await renamePlan(db, plan.id, name);
    reply.json(answer(savedPlanSchema, { ...plan, name }));
  });

  router.delete('/api/plans/:id', async (request, reply) => {
    const plan = await own(request);
    await deletePlan(db, plan.id);
    reply.status(204).end();
  });
  return router;
}
