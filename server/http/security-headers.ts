import { randomBytes } from 'node:crypto';
import type { RequestHandler, Response } from 'express';
import helmet from 'helmet';

/** The nonce of this answer: the only inline style that the page may bring is the component library's own. */
export function nonceOf(response: Response): string {
  return String(response.locals['nonce']);
}

/**
 * No script but our own files, no inline script at all, no framing, no foreign resource. `secure` says that people
 * come over https; only then may the browser be told to insist on it.
 */
export function securityHeaders(secure: boolean): RequestHandler[] {
  const own = ["'self'"];
  const none = ["'none'"];
  return [
    (_request, response, next) => {
      response.locals['nonce'] = randomBytes(16).toString('base64url');
      next();
    },
    helmet({
      contentSecurityPolicy: {
        useDefaults: false,
        directives: {
          defaultSrc: own,
          scriptSrc: own,
          scriptSrcAttr: none,
          styleSrc: [...own, (_request, response) => `'nonce-${nonceOf(response as Response)}'`],
          imgSrc: [...own, 'data:', 'blob:'],
          fontSrc: own,
          connectSrc: own,
          objectSrc: none,
          baseUri: none,
          formAction: own,
          frameAncestors: none,
          ...(secure ? { upgradeInsecureRequests: [] } : {}),
        },
      },
      strictTransportSecurity: secure,
      referrerPolicy: { policy: 'same-origin' },
    }),
  ];
}
