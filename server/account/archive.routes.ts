import { pipeline } from 'node:stream/promises';
import { Router } from 'express';
import type { FileStore } from '../files/file-store.ts';
import { writeArchive } from './archive.ts';
import type { WriteTable } from './archive-patterns.ts';
import { withBelongings } from './archive.store.ts';
import type { AuthRouteDeps } from './auth-deps.ts';

interface ArchiveDeps extends AuthRouteDeps {
  files: FileStore;
  writeTable: WriteTable;
}

/** Everything of somebody's in one archive. */
export function archiveRoutes({ db, files, limits, requireUser, writeTable }: ArchiveDeps): Router {
  const router = Router();
  // By POST: it is work, and no link on another page may bring it about.
  router.post('/api/account/export', async (request, reply) => {
    const user = await requireUser(request);
    await limits.archive(request, user.id);
    const { stream, bytes } = await withBelongings(db, user.id, (all) =>
      writeArchive(all, files, writeTable),
    );
    reply
      .attachment(`leeway-${new Date().toISOString().slice(0, 10)}.zip`)
      .set('content-type', 'application/zip')
      .set('content-length', String(bytes));
    await pipeline(stream, reply);
  });
  return router;
}
