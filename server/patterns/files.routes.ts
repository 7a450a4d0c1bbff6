import { Router } from 'express';
import type { FileStore } from '../files/file-store.ts';
import type { RouteDeps } from '../http/deps.ts';
import { parseId } from '../http/parse.ts';
import { found, notFound } from '../http/problem.ts';
import { cleanFileName } from './file-name.ts';
import { findFile } from './files.store.ts';
import { canUsePattern } from './patterns.policy.ts';

const THING = 'file';

/** Gives an uploaded file back as it came: always to be saved, never to be shown or run. */
export function fileRoutes({ db, files, requireUser }: RouteDeps & { files: FileStore }): Router {
  const router = Router();
  router.get('/api/files/:id', async (request, reply) => {
    const user = await requireUser(request);
    const file = found(await findFile(db, parseId(request, THING)), THING);
    if (!canUsePattern(user, file)) throw notFound(THING);
    const bytes = await files.get(file.id);
    reply
      .attachment(cleanFileName(file.name))
      .set('content-type', 'application/octet-stream')
      .set('x-content-type-options', 'nosniff')
      .send(bytes);
  });
  return router;
}
