import { Router } from 'express';
import { adminMailQuerySchema, adminMailSchema } from '../../shared/admin/mail.schema.ts';
import { pageOf } from '../../shared/paging.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { toPage } from '../http/paging.ts';
import { parseId, parseQuery } from '../http/parse.ts';
import { listMail } from '../mail/outbox.store.ts';
import { requireAdmin } from './admin.policy.ts';
import { retryAndLog, toAdminMail } from './mail.store.ts';

/** Mail that waits, went out or was given up; never what it says. */
export function adminMailRoutes({ db, requireUser }: RouteDeps): Router {
  const router = Router();

  router.get('/api/admin/mail', async (request, reply) => {
    requireAdmin(await requireUser(request));
    const { state, ...query } = parseQuery(adminMailQuerySchema, request);
    const { mail, total } = await listMail(db, state, query);
    reply.json(answer(pageOf(adminMailSchema), toPage(mail.map(toAdminMail), total, query)));
  });

  router.post('/api/admin/mail/:id/retry', async (request, reply) => {
    const admin = requireAdmin(await requireUser(request));
    reply.json(answer(adminMailSchema, await retryAndLog(db, admin.id, parseId(request, 'mail'))));
  });
  return router;
}
