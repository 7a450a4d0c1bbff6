import { Router } from 'express';
import { adminActSchema } from '../../shared/admin/log.schema.ts';
import {
  adminPeopleQuerySchema,
  adminPersonSchema,
  adminTeacherRequestSchema,
  adminTeacherRequestsQuerySchema,
  roleChangeSchema,
  teacherAnswerSchema,
} from '../../shared/admin/people.schema.ts';
import { pageOf, pageQuerySchema } from '../../shared/paging.ts';
import type { Config } from '../config.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { toPage } from '../http/paging.ts';
import { parseBody, parseId, parseQuery } from '../http/parse.ts';
import { requireAdmin } from './admin.policy.ts';
import { listActs } from './log.store.ts';
import { changeRole, listAccounts } from './roles.store.ts';
import { answerTeacherRequest, listTeacherRequests } from './teacher-requests.store.ts';
import { tellerOfAnswers } from './tell-of-answer.ts';

type AdminPeopleDeps = RouteDeps & Pick<Config, 'mailFrom' | 'appUrl'>;

/** Who is here and what they may do; never what they keep. */
export function adminPeopleRoutes({ db, requireUser, mailFrom, appUrl }: AdminPeopleDeps): Router {
  const router = Router();
  const tell = tellerOfAnswers({ mailFrom, appUrl });

  router.get('/api/admin/people', async (request, reply) => {
    requireAdmin(await requireUser(request));
    const query = parseQuery(adminPeopleQuerySchema, request);
    const { people, total } = await listAccounts(db, query);
    reply.json(answer(pageOf(adminPersonSchema), toPage(people, total, query)));
  });

  router.patch('/api/admin/people/:id', async (request, reply) => {
    const admin = requireAdmin(await requireUser(request));
    const id = parseId(request, 'account');
    const { role } = parseBody(roleChangeSchema, request);
    reply.json(answer(adminPersonSchema, await changeRole(db, admin.id, id, role)));
  });

  router.get('/api/admin/teacher-requests', async (request, reply) => {
    requireAdmin(await requireUser(request));
    const query = parseQuery(adminTeacherRequestsQuerySchema, request);
    const { requests, total } = await listTeacherRequests(db, query);
    reply.json(answer(pageOf(adminTeacherRequestSchema), toPage(requests, total, query)));
  });

  router.post('/api/admin/teacher-requests/:id/answer', async (request, reply) => {
    const admin = requireAdmin(await requireUser(request));
    const id = parseId(request, 'request');
    const { accept } = parseBody(teacherAnswerSchema, request);
    const asked = { actorId: admin.id, id, accept };
    const answered = await answerTeacherRequest(db, asked, (tx, { person }) => tell(tx, person, accept));
    reply.json(answer(adminTeacherRequestSchema, answered));
  });

  router.get('/api/admin/log', async (request, reply) => {
    requireAdmin(await requireUser(request));
    const query = parseQuery(pageQuerySchema, request);
    const { acts, total } = await listActs(db, query);
    reply.json(answer(pageOf(adminActSchema), toPage(acts, total, query)));
  });
  return router;
}
