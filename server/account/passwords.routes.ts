import express, { Router, type Request } from 'express';
import { z } from 'zod';
import {
  changePasswordSchema,
  requestPasswordResetSchema,
  resetPasswordSchema,
} from '../../shared/account.ts';
import { doneSchema } from '../../shared/account-answers.ts';
import { answer } from '../http/answer.ts';
import { parseBody } from '../http/parse.ts';
import { ask, inAuthTransaction, setCookies } from './ask.ts';
import type { AuthRouteDeps } from './auth-deps.ts';
import { passwordChanged } from './letters.ts';
import { mailToOwner } from './mail-to-owner.ts';
import { forgetLinks } from './spent.store.ts';

const DONE = { status: true } as const;
const userIdSchema = z.object({ user: z.object({ id: z.uuid() }) });

/** Another password: by the one in use, or by a link that was mailed. */
export function passwordRoutes(deps: AuthRouteDeps): Router {
  const { db, auth, limits } = deps;
  const router = Router();
  const sent = express.json({ limit: '16kb' });

  router.post('/api/auth/request-password-reset', sent, async (request, reply) => {
    const body = parseBody(requestPasswordResetSchema, request);
    await limits.mailTo(request, body.email);
    await inAuthTransaction(db, () =>
      ask(auth, request, { method: 'POST', path: '/request-password-reset', body }),
    );
    reply.json(answer(doneSchema, DONE));
  });

  router.post('/api/auth/reset-password', sent, async (request, reply) => {
    const body = parseBody(resetPasswordSchema, request);
    await inAuthTransaction(db, () =>
      ask(auth, request, {
        method: 'POST',
        path: '/reset-password',
        body,
        withoutSession: true,
        fields: { newPassword: 'newPassword' },
      }),
    );
    reply.json(answer(doneSchema, DONE));
  });

  router.post('/api/auth/change-password', sent, async (request, reply) => {
    const user = await deps.requireUser(request);
    const body = parseBody(changePasswordSchema, request);
    const answered = await limits.passwordAgain(request, user.id, () => changePassword(request, body));
    setCookies(reply, answered);
    reply.json(answer(doneSchema, DONE));
  });

  function changePassword(request: Request, body: z.infer<typeof changePasswordSchema>) {
    return inAuthTransaction(db, async (tx) => {
      const answered = await ask(auth, request, {
        method: 'POST',
        path: '/change-password',
        body: { ...body, revokeOtherSessions: true },
        fields: { password: 'currentPassword', newPassword: 'newPassword' },
      });
      const { user } = userIdSchema.parse(answered.body);
      await forgetLinks(tx, user.id);
      await mailToOwner(tx, deps.config, user.id, 'password-changed', passwordChanged);
      return answered;
    });
  }
  return router;
}
