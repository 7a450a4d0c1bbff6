import { fromNodeHeaders } from 'better-auth/node';
import type { Request } from 'express';
import { meSchema } from '../../shared/me.ts';
import type { Auth } from '../auth.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps, User } from '../http/deps.ts';
import { Problem } from '../http/problem.ts';

/** Who asks, from the session cookie. */
export function recognise(auth: Auth): Pick<RouteDeps, 'currentUser' | 'requireUser'> {
  async function currentUser(request: Request): Promise<User | null> {
    if (request.get('cookie') === undefined) return null;
    const { headers, response } = await auth.api.getSession({
      headers: fromNodeHeaders(request.headers),
      returnHeaders: true,
    });
    // A session in use is lengthened now and then, and the cookie must live as long as the row.
    for (const cookie of headers.getSetCookie()) request.res?.append('set-cookie', cookie);
    if (response === null) return null;
    const { id, name, email, role } = response.user;
    return answer(meSchema, { user: { id, name, email, role: role as User['role'] } }).user;
  }
  async function requireUser(request: Request): Promise<User> {
    const user = await currentUser(request);
    if (user === null) throw new Problem('signedOut', { detail: 'Sign in to see and change what is yours.' });
    return user;
  }
  return { currentUser, requireUser };
}
