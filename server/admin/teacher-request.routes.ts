import { Router } from 'express';
import { teacherRequestInputSchema, teacherRequestSchema } from '../../shared/teacher-request.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { parseBody } from '../http/parse.ts';
import { askToTeach, withdrawTeacherRequest } from './teacher-requests.store.ts';

/** Asking to become a teacher, and taking it back. */
export function teacherRequestRoutes({ db, requireUser }: RouteDeps): Router {
  const router = Router();
  const path = '/api/account/teacher-request';

  router.post(path, async (request, reply) => {
    const user = await requireUser(request);
    const { sentence } = parseBody(teacherRequestInputSchema, request);
    reply.status(201).json(answer(teacherRequestSchema, await askToTeach(db, user.id, sentence)));
  });

  router.delete(path, async (request, reply) => {
    const user = await requireUser(request);
    await withdrawTeacherRequest(db, user.id);
    reply.status(204).end();
  });
  return router;
}
