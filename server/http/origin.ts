import type { RequestHandler } from 'express';
import { bearerOf } from './bearer.ts';
import { Problem } from './problem.ts';

const READING = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses a change that a page of another site asks for. Browsers put `Origin` on every request that changes
 * something and no page can forge it; a request without one is not from our own pages either. A token needs none:
 * no browser adds one by itself, and no other site's page may send one here. Signing in is always our pages' own.
 */
export function checkOrigin(trusted: readonly string[]): RequestHandler {
  const ours = new Set(trusted);
  return (request, _response, next) => {
    const isByToken = bearerOf(request) !== null && !/^\/api\/auth\//i.test(request.originalUrl);
    const origin = request.get('origin');
    if (READING.has(request.method) || isByToken || (origin !== undefined && ours.has(origin))) {
      next();
      return;
    }
    throw new Problem('foreignOrigin', {
      detail: `Changes are accepted from ${trusted.join(' and ')} only. Open Leeway at one of these addresses.`,
    });
  };
}
