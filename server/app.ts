import express, { type Express, type RequestHandler } from 'express';
import type { Logger } from 'pino';
import { accountRoutes } from './account/account.routes.ts';
import { addressRoutes } from './account/addresses.routes.ts';
import { archiveRoutes } from './account/archive.routes.ts';
import { authRoutes } from './account/auth.routes.ts';
import { codeRoutes } from './account/codes.routes.ts';
import { recognise } from './account/current-user.ts';
import { accountLimits } from './account/limits.ts';
import { passwordRoutes } from './account/passwords.routes.ts';
import { secondFactorRoutes } from './account/second-factor.routes.ts';
import { sessionRoutes } from './account/sessions.routes.ts';
import { adminMailRoutes } from './admin/admin-mail.routes.ts';
import { adminPeopleRoutes } from './admin/admin-people.routes.ts';
import { instanceRoutes } from './admin/instance.routes.ts';
import { teacherRequestRoutes } from './admin/teacher-request.routes.ts';
import type { Auth } from './auth.ts';
import type { Config } from './config.ts';
import type { Db, PoolUse } from './db/client.ts';
import { describedNouns } from './described-routes.ts';
import { createFileStore } from './files/file-store.ts';
import { fitRoutes } from './fit/fit.routes.ts';
import { healthRoutes } from './health/health.routes.ts';
import { judgedByTokenAlone } from './http/bearer.ts';
import type { RouteDeps } from './http/deps.ts';
import { tableOfRoutes } from './http/describe.ts';
import { handleErrors, noSuchAddress } from './http/errors.ts';
import { logRequests } from './http/log-requests.ts';
import { createMetrics } from './http/metrics.ts';
import { checkOrigin } from './http/origin.ts';
import { securityHeaders } from './http/security-headers.ts';
import { serveClient } from './http/serve-client.ts';
import { mailboxRoutes } from './mailbox/mailbox.routes.ts';
import { openapiRoutes } from './openapi/openapi.routes.ts';
import { editRoutes } from './patterns/edits.routes.ts';
import { fileRoutes } from './patterns/files.routes.ts';
import { importTableRoutes } from './patterns/import-tables.routes.ts';
import { importRoutes } from './patterns/imports.routes.ts';
import { patternRoutes } from './patterns/patterns.routes.ts';
import { writeCsv } from './patterns/reading/write-csv.ts';
import { revisionRoutes } from './patterns/revisions.routes.ts';
import { measurementSetRoutes } from './people/measurement-sets.routes.ts';
import { peopleRoutes } from './people/people.routes.ts';
import { planRoutes } from './plans/plans.routes.ts';
import { tokenRoutes } from './tokens/tokens.routes.ts';

interface AppOptions {
  db: Db;
  auth: Auth;
  log: Logger;
  config: Pick<
    Config,
    'appUrl' | 'dataFolder' | 'filesFolder' | 'hasMailbox' | 'mailFrom' | 'origins' | 'trustProxy'
  >;
  /** Where the built browser code lies, or what serves it while it is being written; nothing: the API alone. */
  client?: { folder: string } | { middleware: RequestHandler };
  /** What the pool of `db` is doing; nothing: the metrics leave it out. */
  poolUse?: () => PoolUse;
}

/** The whole server but for listening: every test has its own. */
export function createApp({ db, auth, log, config, client, poolUse }: AppOptions): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', config.trustProxy);
  app.set('query parser', 'simple');
  // Of answers that nobody may keep, a fingerprint is reckoned for nothing. (Files have theirs from their dates.)
  app.set('etag', false);
  const metrics = createMetrics();
  app.use(metrics.count, logRequests(log));
  const isBeingWritten = client !== undefined && 'middleware' in client;
  // The development server injects inline scripts of its own.
  if (!isBeingWritten) app.use(securityHeaders(config.appUrl.startsWith('https:')));

  app.use('/api', neverKept, judgedByTokenAlone, checkOrigin(config.origins));
  const routes = tableOfRoutes(describedNouns);
  const deps: RouteDeps = { db, log, ...recognise({ auth, db, routes }) };
  app.use(healthRoutes(deps), openapiRoutes({ auth, nouns: describedNouns }));
  const files = createFileStore(config.filesFolder);
  const accounts = { ...deps, auth, config, files, limits: accountLimits(db, auth) };
  app.use(authRoutes(accounts), addressRoutes(accounts), passwordRoutes(accounts));
  app.use(secondFactorRoutes(accounts), codeRoutes(accounts));
  app.use(
    accountRoutes(accounts),
    sessionRoutes(accounts),
    archiveRoutes({ ...accounts, writeTable: writeCsv }),
  );
  app.use(mailboxRoutes({ db, isOpen: config.hasMailbox }));
  app.use('/api', express.json({ limit: '1mb' }));
  app.use(peopleRoutes(deps), measurementSetRoutes(deps), fitRoutes(deps), planRoutes(deps));
  app.use(tokenRoutes(deps));
  const { appUrl, dataFolder, mailFrom } = config;
  app.use(
    adminPeopleRoutes({ ...deps, appUrl, mailFrom }),
    teacherRequestRoutes(deps),
    adminMailRoutes(deps),
  );
  app.use(instanceRoutes({ ...deps, dataFolder, metrics, poolUse: poolUse ?? null }));
  const keeping = { ...deps, files };
  app.use(patternRoutes(keeping), revisionRoutes(deps), editRoutes(deps), fileRoutes(keeping));
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
