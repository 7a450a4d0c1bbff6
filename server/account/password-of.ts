import type { Auth } from '../auth.ts';
import { invalid } from '../http/problem.ts';

/** Returns where the password is that of the account; 422 at `/password` where it is not. */
export async function demandPassword(auth: Auth, userId: string, password: string): Promise<void> {
  const { internalAdapter, password: hasher } = await auth.$context;
  const hash = (await internalAdapter.findCredentialAccount(userId))?.password;
  const isRight = typeof hash === 'string' && (await hasher.verify({ hash, password }));
  if (!isRight)
    throw invalid([{ pointer: '/password', detail: 'This is not the password of this account.' }]);
}
