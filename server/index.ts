import { createServer, type RequestListener, type Server } from 'node:http';
import { join } from 'node:path';
import type { RequestHandler } from 'express';
import { pino, type Logger } from 'pino';
import { createApp } from './app.ts';
import { createAuth } from './auth.ts';
import { ConfigError, type Config } from './config.ts';
import { createDatabase } from './db/client.ts';
import { migrate } from './db/migrate.ts';
import { isDemoAccountKnown } from './demo/demo-accounts.ts';
import { keptSignIns, type DemoSignIn } from './demo/kept-sign-ins.ts';
import { seedDemo, type SeedDeps } from './demo/seed.ts';
import { createFileStore } from './files/file-store.ts';
import { finisher } from './http/finish.ts';
import { startMail } from './start-mail.ts';

export { ConfigError, readConfig } from './config.ts';

const PATIENCE_MS = 15_000;

interface ServeOptions {
  /** The project's folder. */
  root: string;
  /** Vite in the same process instead of the built client. */
  isDevelopment: boolean;
  /** How long a request may still take once the server was told to end. */
  patienceMs?: number;
  log?: Logger;
}

export interface Served {
  url: string;
  /** The demo's accounts; none where other people can reach this instance. */
  signIns: DemoSignIn[];
  /** Finishes the requests and the mail under way, then closes the database's connections. */
  stop: () => Promise<void>;
}

/** Migrates and listens; whoever calls it has parsed the configuration. Throws `ConfigError`. */
export async function serve(config: Config, options: ServeOptions): Promise<Served> {
  const { root, isDevelopment, patienceMs = PATIENCE_MS, log = pino({ base: null }) } = options;
  const database = createDatabase(config.databaseUrl);
  try {
    await migrate(database);
    const { db } = database;
    const auth = createAuth({ db, config, log });
    const signIns = config.isDemo ? await demoSignIns(config, { db, auth, log }) : [];
    let app: RequestListener | null = null;
    const server = createServer((request, response) => app?.(request, response));
    const finish = finisher(server, patienceMs);
    const development = isDevelopment ? await startVite(root, server) : null;
    const client = development ?? { folder: join(root, 'dist/client') };
    app = createApp({ db, auth, log, config, client, poolUse: database.poolUse });
    await listen(server, config);
    const mail = await startMail(config, { db, log });
    return {
      url: config.appUrl,
      signIns,
      async stop() {
        await development?.close();
        await finish();
        await mail.stop();
        await database.close();
      },
    };
  } catch (error) {
    await database.close();
    throw error;
  }
}

function demoSignIns(config: Config, deps: Omit<SeedDeps, 'files'>): Promise<DemoSignIn[]> {
  const files = createFileStore(config.filesFolder);
  return keptSignIns(
    config.dataFolder,
    (signIn) => isDemoAccountKnown(deps.auth, signIn),
    () => seedDemo({ ...deps, files }),
  );
}

function listen(server: Server, { host, port }: Config): Promise<void> {
  return new Promise((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) => {
      reject(new ConfigError(sayListenError(error, host, port)));
    });
    server.listen(port, host, resolve);
  });
}

function sayListenError(error: NodeJS.ErrnoException, host: string, port: number): string {
  if (error.code === 'EADDRINUSE') return `PORT ${port} is taken by another program: set PORT to a free one.`;
  if (error.code === 'EACCES')
    return `PORT ${port} may not be used by this user: set PORT to one above 1023.`;
  return `HOST ${host} cannot be listened on (${error.code ?? error.message}).`;
}

async function startVite(root: string, server: Server) {
  const { createServer: createVite } = await import('vite');
  const vite = await createVite({
    root,
    appType: 'spa',
    clearScreen: false,
    server: { middlewareMode: true, ws: { server } },
  });
  return { middleware: vite.middlewares as RequestHandler, close: () => vite.close() };
}
