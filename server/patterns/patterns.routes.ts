import { Router, type Request } from 'express';
import { pageOf, pageQuerySchema } from '../../shared/paging.ts';
import {
  patternInputSchema,
  patternRevisionSchema,
  patternSchema,
  patternSummarySchema,
} from '../../shared/patterns/patterns.schema.ts';
import type { FileStore } from '../files/file-store.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { toPage } from '../http/paging.ts';
import { parseId, parsePatch, parseQuery } from '../http/parse.ts';
import { found, notFound, Problem } from '../http/problem.ts';
import { patternQuerySchema } from './patterns.api.ts';
import { canUsePattern } from './patterns.policy.ts';
import {
  deletePattern,
  findPattern,
  findWholePattern,
  listPatterns,
  updatePattern,
} from './patterns.store.ts';
import { removeBytes } from '../files/remove-bytes.ts';
import { listRevisions } from './revisions.store.ts';

const THING = 'pattern';

export function patternRoutes({ db, files, log, requireUser }: RouteDeps & { files: FileStore }): Router {
  const router = Router();

  async function own(request: Request) {
    const user = await requireUser(request);
    const pattern = found(await findPattern(db, parseId(request, THING)), THING);
    if (!canUsePattern(user, pattern)) throw notFound(THING);
    return pattern;
  }
  const whole = async (id: string) => answer(patternSchema, found(await findWholePattern(db, id), THING));

  router.get('/api/patterns', async (request, reply) => {
    const user = await requireUser(request);
    const query = parseQuery(patternQuerySchema, request);
    const { patterns, total } = await listPatterns(db, user.id, query);
    reply.json(answer(pageOf(patternSummarySchema), toPage(patterns, total, query)));
  });

  router.get('/api/patterns/:id', async (request, reply) => {
    const { id } = await own(request);
    reply.json(await whole(id));
  });

  router.patch('/api/patterns/:id', async (request, reply) => {
    const { id } = await own(request);
    await updatePattern(db, id, parsePatch(patternInputSchema, request));
    reply.json(await whole(id));
  });

  router.delete('/api/patterns/:id', async (request, reply) => {
    const { id } = await own(request);
    const unused = await deletePattern(db, id);
    if (unused === null) {
      throw new Problem('conflict', {
        detail: 'Saved plans refer to this pattern: delete those plans first.',
      });
    }
    await removeBytes(files, log, unused);
    reply.status(204).end();
  });

  router.get('/api/patterns/:id/revisions', async (request, reply) => {
    const { id } = await own(request);
    const query = parseQuery(pageQuerySchema, request);
    const { revisions, total } = await listRevisions(db, id, query);
    reply.json(answer(pageOf(patternRevisionSchema), toPage(revisions, total, query)));
  });
  return router;
}
