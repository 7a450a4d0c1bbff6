import type { Request, RequestHandler } from 'express';

/** The token that a request carries in `Authorization: Bearer …`; null where it carries none. */
export function bearerOf(request: Request): string | null {
  const [said, token = ''] = /^bearer(?:\s+(.*))?$/i.exec(request.get('authorization') ?? '') ?? [];
  return said === undefined ? null : token;
}

/**
 * A request that carries a token is judged by the token alone: were the session's cookie looked at beside it, any
 * made-up token would open the door that the check of `Origin` keeps shut.
 */
export const judgedByTokenAlone: RequestHandler = (request, _response, next) => {
  if (bearerOf(request) !== null) delete request.headers.cookie;
  next();
};
