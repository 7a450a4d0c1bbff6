import { Router, type Request } from 'express';
import { compareTables } from '../../shared/patterns/compare-tables.ts';
import { comparisonSchema } from '../../shared/patterns/comparison.schema.ts';
import { newPatternSchema, tableEditSchema } from '../../shared/patterns/edits.schema.ts';
import { patternRevisionSchema, patternSchema } from '../../shared/patterns/patterns.schema.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { parseBody, parseId, parseQuery } from '../http/parse.ts';
import { found, notFound } from '../http/problem.ts';
import { copyPattern, editTable, typePattern } from './edit-table.ts';
import { compareQuerySchema } from './edits.api.ts';
import { canUsePattern } from './patterns.policy.ts';
import { findPattern, findWholePattern } from './patterns.store.ts';
import { findRevision } from './revisions.store.ts';

const THING = 'pattern';
const REVISION = 'pattern revision';

/** Tables written by hand: a pattern without a file, an edit as a new revision, a copy, and what differs between two. */
export function editRoutes({ db, requireUser }: RouteDeps): Router {
  const router = Router();

  async function own(request: Request) {
    const user = await requireUser(request);
    const pattern = found(await findPattern(db, parseId(request, THING)), THING);
    if (!canUsePattern(user, pattern)) throw notFound(THING);
    return pattern;
  }
  const whole = async (id: string) => answer(patternSchema, found(await findWholePattern(db, id), THING));

  router.post('/api/patterns', async (request, reply) => {
    const user = await requireUser(request);
    const id = await typePattern(db, user.id, parseBody(newPatternSchema, request));
    reply.status(201).json(await whole(id));
  });

  router.post('/api/patterns/:id/revisions', async (request, reply) => {
    const { id } = await own(request);
    const { revisionId, isNew } = await editTable(db, id, parseBody(tableEditSchema, request));
    const revision = found(await findRevision(db, revisionId), REVISION);
    reply.status(isNew ? 201 : 200).json(answer(patternRevisionSchema, revision));
  });

  router.post('/api/patterns/:id/copy', async (request, reply) => {
    const { id, ownerId } = await own(request);
    reply.status(201).json(await whole(await copyPattern(db, ownerId, id)));
  });

  router.get('/api/pattern-revisions/:id/compare', async (request, reply) => {
    const user = await requireUser(request);
    const from = found(await findRevision(db, parseId(request, REVISION)), REVISION);
    if (!canUsePattern(user, from)) throw notFound(REVISION);
    const to = found(await findRevision(db, parseQuery(compareQuerySchema, request).with), REVISION);
    if (!canUsePattern(user, to)) throw notFound(REVISION);
    reply.json(answer(comparisonSchema, { from, to, difference: compareTables(from.table, to.table) }));
  });
  return router;
}
