import { Router, type Request } from 'express';
import { pageOf, pageQuerySchema } from '../../shared/paging.ts';
import { importDraftSummarySchema, importPatchSchema } from '../../shared/patterns/imports.schema.ts';
import type { FileStore } from '../files/file-store.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { toPage } from '../http/paging.ts';
import { parseBody, parseQuery } from '../http/parse.ts';
import { found, notFound } from '../http/problem.ts';
import { changeDraft } from './change-draft.ts';
import { startSchema } from './imports.api.ts';
import { createDraft, listDrafts } from './imports.store.ts';
import { discardDraft } from './keep-table.ts';
import { ownDrafts } from './own-draft.ts';
import { canUsePattern } from './patterns.policy.ts';
import { findPattern } from './patterns.store.ts';

export function importRoutes(deps: RouteDeps & { files: FileStore }): Router {
  const { db, requireUser } = deps;
  const router = Router();

  const { own, read } = ownDrafts(deps);

  router.get('/api/imports', async (request, reply) => {
    const user = await requireUser(request);
    const query = parseQuery(pageQuerySchema, request);
    const { drafts, total } = await listDrafts(db, user.id, query);
    reply.json(answer(pageOf(importDraftSummarySchema), toPage(drafts, total, query)));
  });

  router.post('/api/imports', async (request, reply) => {
    const user = await requireUser(request);
    const { patternId = null, details = {} } = parseBody(startSchema, request);
    if (patternId !== null) {
      const pattern = found(await findPattern(db, patternId), 'pattern');
      if (!canUsePattern(user, pattern)) throw notFound('pattern');
    }
    const id = await createDraft(db, user.id, {
      patternId,
      details,
    });
    reply.status(201).json(await read(id));
  });

  router.get('/api/imports/:id', async (request, reply) => {
    const { id } = await own(request);
    reply.json(await read(id));
  });

  router.patch('/api/imports/:id', async (request, reply) => {
    const { id } = await own(request);
    const { details = {}, chart, finished } = parseBody(importPatchSchema, request);
    await changeDraft(db, id, {
      details,
      chart: onlySent(chart, sentAt(request, 'chart')),
      finished: onlySent(finished, sentAt(request, 'finished')),
    });
    reply.json(await read(id));
  });

  router.delete('/api/imports/:id', async (request, reply) => {
    const { id } = await own(request);
    await discardDraft(deps, id);
    reply.status(204).end();
  });
  return router;
}

const sentAt = (request: Request, key: string): unknown => (request.body as Record<string, unknown>)[key];

/** The parsed keys that were sent: a schema's default fills in the rest, and would quietly empty what is kept. */
function onlySent<T extends object>(parsed: T | undefined, sent: unknown): Partial<T> {
  const entries = Object.entries(parsed ?? {}).filter(([key]) => Object.hasOwn(Object(sent) as object, key));
  return Object.fromEntries(entries) as Partial<T>;
}
