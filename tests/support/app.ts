import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { eq } from 'drizzle-orm';
import type { Express } from 'express';
import { pino } from 'pino';
import supertest from 'supertest';
import { afterAll, afterEach, expect } from 'vitest';
import { z } from 'zod';
import type { Role } from '../../shared/me.ts';
import { user as userTable } from '../../server/account/account.table.ts';
import { createApp } from '../../server/app.ts';
import { createAuth, type Auth } from '../../server/auth.ts';
import type { Config } from '../../server/config.ts';
import type { Db } from '../../server/db/client.ts';
import { testDatabase } from './database.ts';

/** Where the tests' own pages would come from. */
export const ORIGIN = 'http://127.0.0.1:3000';
export const PASSWORD = 'a quiet tape measure';

export type Agent = ReturnType<typeof supertest.agent>;

export interface SignedIn {
  /** Keeps the session's cookie and sends our own origin with every request. */
  agent: Agent;
  user: { id: string; name: string; email: string; role: Role };
}

export interface TestApp {
  app: Express;
  db: Db;
  auth: Auth;
  config: Config;
  /** Nobody: an agent without a session. */
  anonymous: () => Agent;
  signedIn: (options?: { role?: Role; name?: string; isVerified?: boolean }) => Promise<SignedIn>;
  /** What the server wrote down as failed since the last call; a test that leaves any behind fails. */
  takeErrors: () => unknown[];
}

/** The whole server on this worker's own empty database. Call it in `beforeAll`. */
export async function testApp(
  options: { limits?: boolean; config?: Partial<Config>; client?: { folder: string } } = {},
): Promise<TestApp> {
  const { db, url, poolUse } = await testDatabase();
  const config = { ...testConfig(url), ...options.config };
  const { log, takeErrors } = listeningLog();
  const auth = createAuth({ db, config, log, limits: options.limits ?? false });
  const app = createApp({
    db,
    auth,
    log,
    config,
    poolUse,
    ...(options.client ? { client: options.client } : {}),
  });
  afterEach(() => expect(takeErrors(), 'the server failed').toEqual([]));
  return {
    app,
    db,
    auth,
    config,
    anonymous: () => agentOf(app),
    signedIn: signerIn(app, db, auth),
    takeErrors,
  };
}

function testConfig(databaseUrl: string): Config {
  const dataFolder = mkdtempSync(join(tmpdir(), 'leeway-api-'));
  afterAll(() => rmSync(dataFolder, { recursive: true, force: true }));
  return {
    port: 3000,
    host: '127.0.0.1',
    dataFolder,
    filesFolder: join(dataFolder, 'files'),
    databaseUrl,
    secret: 'a secret that only tests use, long enough',
    appUrl: ORIGIN,
    origins: [ORIGIN, 'http://localhost:3000'],
    smtpUrl: null,
    mailFrom: 'Leeway <leeway@127.0.0.1>',
    trustProxy: 0,
    isDemo: false,
    hasMailbox: false,
  };
}

function agentOf(app: Express, cookie?: string): Agent {
  const agent = supertest.agent(app);
  agent.set('Origin', ORIGIN);
  if (cookie !== undefined) agent.set('Cookie', cookie);
  return agent;
}

/** Makes accounts without a request and without mail, so that a file of tests spends no time on limits. */
function signerIn(app: Express, db: Db, auth: Auth): TestApp['signedIn'] {
  let count = 0;
  let hashed: Promise<string> | null = null;
  return async ({ role = 'member', name, isVerified = false } = {}) => {
    count += 1;
    const email = `person-${String(count)}-${Math.random().toString(36).slice(2, 8)}@example.org`;
    const { internalAdapter, password } = await auth.$context;
    hashed ??= password.hash(PASSWORD);
    const made = await internalAdapter.createUser(
      { name: name ?? `Person ${String(count)}`, email, emailVerified: isVerified },
      { method: 'email-password' },
    );
    const credential = { providerId: 'credential', accountId: made.id, password: await hashed };
    await internalAdapter.linkAccount({ userId: made.id, ...credential });
    if (role !== 'member') await db.update(userTable).set({ role }).where(eq(userTable.id, made.id));
    const response = await auth.api.signInEmail({ body: { email, password: PASSWORD }, asResponse: true });
    const { user } = signedUpSchema.parse(await response.json());
    const cookie = response.headers
      .getSetCookie()
      .map((text) => text.split(';')[0] ?? '')
      .join('; ');
    return { agent: agentOf(app, cookie), user: { ...user, role } };
  };
}

const signedUpSchema = z.object({ user: z.object({ id: z.uuid(), name: z.string(), email: z.email() }) });

function listeningLog() {
  let errors: unknown[] = [];
  const log = pino({ level: 'error' }, { write: (line: string) => void errors.push(JSON.parse(line)) });
  const takeErrors = () => {
    const taken = errors;
    errors = [];
    return taken;
  };
  return { log, takeErrors };
}
