import express, { type Express, type RequestHandler } from 'express';
import type { Logger } from 'pino';
import { accountRoutes } from './account/account.routes.ts';
import { recognise } from './account/current-user.ts';
import type { Auth } from './auth.ts';
import type { Config } from './config.ts';
import type { Db } from './db/client.ts';
import { createFileStore } from './files/file-store.ts';
import { fitRoutes } from './fit/fit.routes.ts';
import { healthRoutes } from './health/health.routes.ts';
import type { RouteDeps } from './http/deps.ts';
import { handleErrors, noSuchAddress } from './http/errors.ts';
import { logRequests } from './http/log-requests.ts';
import { checkOrigin } from './http/origin.ts';
import { securityHeaders } from './http/security-headers.ts';
import { serveClient } from './http/serve-client.ts';
import { fileRoutes } from './patterns/files.routes.ts';
import { importTableRoutes } from './patterns/import-tables.routes.ts';
import { importRoutes } from './patterns/imports.routes.ts';
import { patternRoutes } from './patterns/patterns.routes.ts';
import { revisionRoutes } from './patterns/revisions.routes.ts';
import { measurementSetRoutes } from './people/measurement-sets.routes.ts';
import { peopleRoutes } from './people/people.routes.ts';
import { planRoutes } from './plans/plans.routes.ts';

interface AppOptions {
  db: Db;
  auth: Auth;
  log: Logger;
  config: Pick<Config, 'appUrl' | 'filesFolder' | 'origins' | 'trustProxy'>;
  /** Where the built browser code lies, or what serves it while it is being written; nothing: the API alone. */
  client?: { folder: string } | { middleware: RequestHandler };
}

/** The whole server but for listening: every test has its own. */
export function createApp({ db, auth, log, config, client }: AppOptions): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', config.trustProxy);
  app.set('query parser', 'simple');
  app.use(logRequests(log));
  const isBeingWritten = client !== undefined && 'middleware' in client;
  // The development server injects inline scripts of its own.
  if (!isBeingWritten) app.use(securityHeaders(config.appUrl.startsWith('https:')));

  app.use('/api', neverKept, checkOrigin(config.origins));
  const deps: RouteDeps = { db, log, ...recognise(auth) };
  app.use(healthRoutes(deps), accountRoutes({ ...deps, auth }));
  app.use('/api', express.json({ limit: '1mb' }));
  app.use(peopleRoutes(deps), measurementSetRoutes(deps), fitRoutes(deps), planRoutes(deps));
  const keeping = { ...deps, files: createFileStore(config.filesFolder) };
  app.use(patternRoutes(keeping), revisionRoutes(deps), fileRoutes(keeping));
  app.use(importRoutes(keeping), importTableRoutes(keeping));
  app.use('/api', noSuchAddress);

  if (isBeingWritten) app.use(client.middleware);
  else if (client !== undefined) app.use(serveClient(client.folder));
  app.use(noSuchAddress);
  app.use(handleErrors(log));
  return app;
}

/** Answers are a person's own: no proxy and no browser keeps them. */
const neverKept: RequestHandler = (_request, response, next) => {
  response.set('cache-control', 'no-store');
  next();
};
