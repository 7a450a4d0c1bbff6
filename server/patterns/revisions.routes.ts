import { Router, type Request } from 'express';
import { TABLE_ROLES, type TableRole } from '../../shared/patterns/imports.schema.ts';
import { patternRevisionSchema } from '../../shared/patterns/patterns.schema.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { parseId } from '../http/parse.ts';
import { found, notFound, Problem } from '../http/problem.ts';
import { cleanFileName } from './file-name.ts';
import { canUsePattern } from './patterns.policy.ts';
import { writeCsv } from './reading/write-csv.ts';
import { findRevision } from './revisions.store.ts';

const THING = 'pattern revision';
const NAMES: Record<TableRole, string> = { chart: 'size chart', finished: 'finished measurements' };

/** A revision never changes: it is read, and written out as CSV. */
export function revisionRoutes({ db, requireUser }: RouteDeps): Router {
  const router = Router();

  async function own(request: Request) {
    const user = await requireUser(request);
    const revision = found(await findRevision(db, parseId(request, THING)), THING);
    if (!canUsePattern(user, revision)) throw notFound(THING);
    return revision;
  }

  router.get('/api/pattern-revisions/:id', async (request, reply) => {
    reply.json(answer(patternRevisionSchema, await own(request)));
  });

  for (const role of TABLE_ROLES) {
    router.get(`/api/pattern-revisions/:id/${role}.csv`, async (request, reply) => {
      const { table, title, number } = await own(request);
      if (table[role].length === 0) {
        throw new Problem('notFound', { detail: `This revision has no ${NAMES[role]}.` });
      }
      reply
        .attachment(cleanFileName(`${title.replace(/[\\/]/g, '-')}, ${NAMES[role]}, revision ${number}.csv`))
        .set('content-type', 'text/csv; charset=utf-8')
        .send(writeCsv(table, role));
    });
  }
  return router;
}
