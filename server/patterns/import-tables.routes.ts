import { Router, type Request } from 'express';
import type { FileStore } from '../files/file-store.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { found } from '../http/problem.ts';
import { commitImport } from './commit-import.ts';
import { committedSchema, tableRoleSchema } from './imports.api.ts';
import { dropTable, keepTable } from './keep-table.ts';
import { ownDrafts } from './own-draft.ts';
import { uploadedTable } from './upload-table.ts';

/** What is brought to a draft and what becomes of it: its tables, and the commit. */
export function importTableRoutes(deps: RouteDeps & { files: FileStore }): Router {
  const router = Router();
  const { own, read } = ownDrafts(deps);
  function roleOf(request: Request) {
    return found(tableRoleSchema.safeParse(request.params['role']).data, 'table');
  }

  router.put('/api/imports/:id/tables/:role', async (request, reply) => {
    const draft = await own(request);
    const role = roleOf(request);
    await keepTable(deps, draft, role, await uploadedTable(request, reply));
    reply.json(await read(draft.id));
  });

  router.delete('/api/imports/:id/tables/:role', async (request, reply) => {
    const { id } = await own(request);
    await dropTable(deps, id, roleOf(request));
    reply.json(await read(id));
  });

  router.post('/api/imports/:id/commit', async (request, reply) => {
    const { id } = await own(request);
    reply.status(201).json(answer(committedSchema, await commitImport(deps.db, deps.files, id)));
  });
  return router;
}
