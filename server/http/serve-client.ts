import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import express, { Router, type RequestHandler } from 'express';
import { precompressed } from './precompressed.ts';
import { nonceOf } from './security-headers.ts';

/**
 * Serves the built browser code. Files under `assets/` carry a hash in their name and never change; every other
 * address that a browser opens as a page gets the one page, which finds its way by itself.
 */
export function serveClient(folder: string): Router {
  const router = Router();
  const page = readFileSync(join(folder, 'index.html'), 'utf8');
  router.use('/assets', precompressed(join(folder, 'assets'), '1y'), noSuchFile);
  router.use(express.static(folder, { index: false, redirect: false, maxAge: '1h' }));
  router.get('/{*path}', (request, response, next) => {
    if (request.accepts('html') === false || hasExtension(request.path)) {
      next();
      return;
    }
    // The page carries a nonce of its own each time, so it must not be kept.
    response
      .set('cache-control', 'no-store')
      .type('html')
      .send(withNonce(page, nonceOf(response)));
  });
  return router;
}

const noSuchFile: RequestHandler = (_request, response) => {
  response.status(404).type('text/plain').send('There is no such file.');
};

const hasExtension = (path: string): boolean => /\.[a-z0-9]{2,5}$/i.test(path);

/** The component library reads its nonce from this element. */
function withNonce(page: string, nonce: string): string {
  return page.replace('</head>', `<meta property="csp-nonce" nonce="${nonce}"></head>`);
}
