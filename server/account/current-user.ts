import { fromNodeHeaders } from 'better-auth/node';
import type { Request } from 'express';
import { meSchema, ROLES } from '../../shared/me.ts';
import type { Auth } from '../auth.ts';
import type { Db } from '../db/client.ts';
import { answer } from '../http/answer.ts';
import { bearerOf } from '../http/bearer.ts';
import type { RouteDeps, User } from '../http/deps.ts';
import type { RouteDescription, RouteTable } from '../http/describe.ts';
import { Problem } from '../http/problem.ts';
import { recogniseToken } from '../tokens/tokens.store.ts';

interface Recognising {
  auth: Auth;
  db: Db;
  /** What each route asks of whoever uses it: a route that is not in it takes no token. */
  routes: RouteTable;
}

/** Who asks, from the session cookie or the access token, and whether the route at hand is theirs to use. */
export function recognise({ auth, db, routes }: Recognising): Pick<RouteDeps, 'currentUser' | 'requireUser'> {
  async function currentUser(request: Request): Promise<User | null> {
    const token = bearerOf(request);
    if (token !== null) return userOfToken(db, token, routeOf(routes, request), request);
    return userOfSession(auth, request);
  }
  async function requireUser(request: Request): Promise<User> {
    const user = await currentUser(request);
    if (user === null) throw new Problem('signedOut', { detail: 'Sign in to see and change what is yours.' });
    const least = routeOf(routes, request)?.who ?? 'anyone';
    if (least !== 'anyone' && ROLES.indexOf(user.role) < ROLES.indexOf(least)) {
      throw new Problem('forbidden', { detail: `Only ${NAMES[least]} may do this.` });
    }
    return user;
  }
  return { currentUser, requireUser };
}

const NAMES = { member: 'somebody with an account', teacher: 'a teacher', admin: 'an administrator' };

/** The description of the route that is answering. */
function routeOf(routes: RouteTable, request: Request): RouteDescription | undefined {
  const { path } = (request.route ?? {}) as { path?: unknown };
  const method = request.method === 'HEAD' ? 'GET' : request.method;
  return typeof path === 'string' ? routes.get(`${method} ${path}`) : undefined;
}

async function userOfSession(auth: Auth, request: Request): Promise<User | null> {
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

async function userOfToken(
  db: Db,
  token: string,
  route: RouteDescription | undefined,
  request: Request,
): Promise<User> {
  const known = await recogniseToken(db, token);
  if (known === null) {
    request.res?.set('www-authenticate', 'Bearer error="invalid_token"');
    throw new Problem('signedOut', { detail: 'This token is not known here, was withdrawn or has expired.' });
  }
  const scope = route?.scope ?? null;
  if (scope === null) {
    throw new Problem('outsideScope', {
      detail: 'This is open to a signed-in browser only, not to a token.',
    });
  }
  if (!known.scopes.includes(scope)) {
    request.res?.set('www-authenticate', `Bearer error="insufficient_scope", scope="${scope}"`);
    throw new Problem('outsideScope', { detail: `The token needs the scope ${scope}.` });
  }
  return known.user;
}
