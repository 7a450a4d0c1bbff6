import { Router, type Request } from 'express';
import { mailboxEntrySchema, mailboxMessageSchema } from '../../shared/mailbox.ts';
import { pageOf, pageQuerySchema } from '../../shared/paging.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { toPage } from '../http/paging.ts';
import { parseId, parseQuery } from '../http/parse.ts';
import { found, Problem } from '../http/problem.ts';
import { mayReadMailbox } from './mailbox.policy.ts';
import { findMessage, listMessages } from './mailbox.store.ts';

const THING = 'mail';
const PROXIES = ['forwarded', 'x-forwarded-for', 'x-forwarded-host', 'x-real-ip', 'via'];

/** The mailbox of an instance that nobody else reaches; anywhere else there is nothing at these addresses. */
export function mailboxRoutes({ db, isOpen }: Pick<RouteDeps, 'db'> & { isOpen: boolean }): Router {
  const router = Router();

  function refuseStrangers(request: Request): void {
    const way = { hostname: hostOf(request), forwarded: PROXIES.map((name) => request.get(name)) };
    if (!isOpen || !mayReadMailbox(way)) {
      throw new Problem('notFound', { detail: 'There is nothing at this address.' });
    }
  }

  router.get('/api/mailbox', async (request, reply) => {
    refuseStrangers(request);
    const query = parseQuery(pageQuerySchema, request);
    const { messages, total } = await listMessages(db, query);
    reply.json(answer(pageOf(mailboxEntrySchema), toPage(messages, total, query)));
  });

  router.get('/api/mailbox/:id', async (request, reply) => {
    refuseStrangers(request);
    reply.json(answer(mailboxMessageSchema, found(await findMessage(db, parseId(request, THING)), THING)));
  });
  return router;
}

/** The header itself, whatever a proxy is trusted to say of it. */
const hostOf = (request: Request): string | undefined => request.get('host')?.replace(/:\d+$/, '');
