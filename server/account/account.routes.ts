import express, { Router } from 'express';
import { accountChangeSchema, passwordAgainSchema } from '../../shared/account.ts';
import { accountSchema, type Account } from '../../shared/account-answers.ts';
import { meSchema } from '../../shared/me.ts';
import { findTeacherRequest } from '../admin/teacher-requests.store.ts';
import { removeBytes } from '../files/remove-bytes.ts';
import type { FileStore } from '../files/file-store.ts';
import { answer } from '../http/answer.ts';
import { parseBody, parsePatch } from '../http/parse.ts';
import { found } from '../http/problem.ts';
import { findAccount, renameAccount } from './account.store.ts';
import { ask, setCookies } from './ask.ts';
import type { AuthRouteDeps } from './auth-deps.ts';
import { deleteAccount } from './deletion.store.ts';
import { demandPassword } from './password-of.ts';

const THING = 'account';

/** Somebody's own account: what it is, and its end. */
export function accountRoutes(deps: AuthRouteDeps & { files: FileStore }): Router {
  const { db, auth, files, limits, log, requireUser } = deps;
  const router = Router();
  const sent = express.json({ limit: '16kb' });

  router.get('/api/me', async (request, reply) => {
    reply.json(answer(meSchema, { user: await deps.currentUser(request) }));
  });

  router.get('/api/account', async (request, reply) => {
    const user = await requireUser(request);
    reply.json(answer(accountSchema, await read(user.id)));
  });

  router.patch('/api/account', sent, async (request, reply) => {
    const user = await requireUser(request);
    const { name } = parsePatch(accountChangeSchema, request);
    if (name !== undefined) await renameAccount(db, user.id, name);
    reply.json(answer(accountSchema, await read(user.id)));
  });

  router.delete('/api/account', sent, async (request, reply) => {
    const user = await requireUser(request);
    const { password } = parseBody(passwordAgainSchema, request);
    await limits.passwordAgain(request, user.id, () => demandPassword(auth, user.id, password));
    const left = await deleteAccount(db, user.id);
    await removeBytes(files, log, left);
    setCookies(reply, await ask(auth, request, { method: 'POST', path: '/sign-out', body: {} }));
    reply.status(204).end();
  });

  async function read(userId: string): Promise<Account> {
    const account = found(await findAccount(db, userId), THING);
    return {
      ...account,
      recoveryCodesLeft: account.twoFactorEnabled ? await codesLeft(userId) : null,
      teacherRequest: await findTeacherRequest(db, userId),
    };
  }

  /** The codes are encrypted; only the library can count them. */
  async function codesLeft(userId: string): Promise<number> {
    const { backupCodes } = await auth.api.viewBackupCodes({ body: { userId } });
    return backupCodes.length;
  }
  return router;
}
