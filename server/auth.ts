import { betterAuth } from 'better-auth';
import { drizzleAdapter } from 'better-auth/adapters/drizzle';
import type { Logger } from 'pino';
import { PASSWORD_MIN } from '../shared/account.ts';
import { account, rateLimit, session, user, verification } from './account/account.table.ts';
import type { Config } from './config.ts';
import type { Db } from './db/client.ts';
import { newId } from './db/columns.ts';

/** The header in which our own server tells the sign-in library the address; whatever came in it is overwritten. */
export const ADDRESS_HEADER = 'x-leeway-address';

interface AuthOptions {
  db: Db;
  config: Pick<Config, 'secret' | 'appUrl' | 'origins'>;
  log: Logger;
  /** Off only where a test signs in many people at once. */
  limits?: boolean;
}

/** Sign-up, sign-in, sign-out and sessions, all kept in the database so that any process may answer. */
export function createAuth({ db, config, log, limits = true }: AuthOptions) {
  return betterAuth({
    appName: 'Leeway',
    baseURL: config.appUrl,
    basePath: '/api/auth',
    secret: config.secret,
    trustedOrigins: config.origins,
    database: drizzleAdapter(db, {
      provider: 'mysql',
      schema: { user, session, account, verification, rateLimit },
      transaction: true,
    }),
    emailAndPassword: { enabled: true, minPasswordLength: PASSWORD_MIN, maxPasswordLength: 128 },
    user: {
      additionalFields: {
        // Never taken from what a browser sends.
        role: { type: 'string', required: true, defaultValue: 'member', input: false },
      },
    },
    session: { expiresIn: 30 * 24 * 3600, updateAge: 24 * 3600 },
    rateLimit: {
      enabled: limits,
      storage: 'database',
      window: 10,
      max: 100,
      // A class of thirty behind one address signs in within the same minute.
      customRules: {
        '/sign-in/email': { window: 60, max: 40 },
        '/sign-up/email': { window: 60, max: 40 },
      },
    },
    advanced: {
      database: { generateId: () => newId() },
      ipAddress: { ipAddressHeaders: [ADDRESS_HEADER] },
      useSecureCookies: config.appUrl.startsWith('https:'),
      defaultCookieAttributes: { httpOnly: true, sameSite: 'lax' },
      // The library drops its checks when NODE_ENV is test; ours are tested too.
      disableOriginCheck: false,
      disableCSRFCheck: false,
    },
    telemetry: { enabled: false },
    logger: {
      level: 'warn',
      // Its details hold queries with their values.
      log: (level, message) => log[level === 'error' ? 'error' : 'warn']({ from: 'sign-in' }, message),
    },
  });
}

export type Auth = ReturnType<typeof createAuth>;
