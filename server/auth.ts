import { betterAuth } from 'better-auth';
import { drizzleAdapter } from 'better-auth/adapters/drizzle';
import { twoFactor as twoFactorPlugin } from 'better-auth/plugins/two-factor';
import type { Logger } from 'pino';
import { PASSWORD_MIN } from '../shared/account.ts';
import { account, rateLimit, session, twoFactor, user, verification } from './account/account.table.ts';
import { accountMail, CONFIRM_SECONDS, RESET_SECONDS } from './account/account-mail.ts';
import { countOne } from './account/limits.store.ts';
import type { Config } from './config.ts';
import { ambientDb } from './db/ambient.ts';
import type { Db } from './db/client.ts';
import { newId } from './db/columns.ts';

/** The header in which our own server tells the sign-in library the address; whatever came in it is overwritten. */
export const ADDRESS_HEADER = 'x-leeway-address';

interface AuthOptions {
  db: Db;
  config: Pick<Config, 'secret' | 'appUrl' | 'origins' | 'mailFrom'>;
  log: Logger;
  /** Off only where a test signs in many people at once. */
  limits?: boolean;
}

// A class of thirty behind one address signs in within the same minute.
const CLASS_AT_ONCE = { window: 60, max: 40 };
const FEW_AT_ONCE = { window: 60, max: 20 };

/** How often from one address of a network. */
const LIMITS = {
  '/sign-in/email': CLASS_AT_ONCE,
  '/sign-up/email': CLASS_AT_ONCE,
  '/two-factor/*': CLASS_AT_ONCE,
  '/verify-email': CLASS_AT_ONCE,
  '/reset-password': CLASS_AT_ONCE,
  '/request-password-reset': FEW_AT_ONCE,
  '/send-verification-email': FEW_AT_ONCE,
  '/change-password': FEW_AT_ONCE,
  '/change-email': FEW_AT_ONCE,
};

/** Accounts, sessions and second factors, all kept in the database so that any process may answer. */
export function createAuth({ db, config, log, limits = true }: AuthOptions) {
  const ambient = ambientDb(db);
  const mail = accountMail(ambient, config);
  return betterAuth({
    appName: 'Leeway',
    baseURL: config.appUrl,
    basePath: '/api/auth',
    secret: config.secret,
    trustedOrigins: config.origins,
    database: drizzleAdapter(ambient, {
      provider: 'mysql',
      schema: { user, session, account, verification, rateLimit, twoFactor },
      transaction: true,
    }),
    emailAndPassword: passwordsWith(mail),
    emailVerification: {
      sendOnSignUp: true,
      expiresIn: CONFIRM_SECONDS,
      sendVerificationEmail: mail.sendConfirm,
    },
    user: {
      additionalFields: {
        // Never taken from what a browser sends.
        role: { type: 'string', required: true, defaultValue: 'member', input: false },
      },
      changeEmail: { enabled: true },
    },
    session: { expiresIn: 30 * 24 * 3600, updateAge: 24 * 3600 },
    // Of a link that opens an account the database keeps no more than is needed to know it again.
    verification: { storeIdentifier: 'hashed' },
    plugins: [
      twoFactorPlugin({
        issuer: 'Leeway',
        accountLockout: { enabled: true, maxFailedAttempts: 10, durationSeconds: 900 },
      }),
    ],
    rateLimit: {
      enabled: limits,
      storage: 'database',
      customStorage: { consume: (key, rule) => countOne(db, key, rule) },
      window: 10,
      max: 100,
      customRules: LIMITS,
    },
    advanced: advancedOf(config),
    telemetry: { enabled: false },
    logger: {
      level: 'warn',
      // Its details hold queries with their values.
      log: (level, message) => log[level === 'error' ? 'error' : 'warn']({ from: 'sign-in' }, message),
    },
  });
}

export type Auth = ReturnType<typeof createAuth>;

function advancedOf({ appUrl }: Pick<Config, 'appUrl'>) {
  return {
    database: { generateId: () => newId() },
    ipAddress: { ipAddressHeaders: [ADDRESS_HEADER] },
    useSecureCookies: appUrl.startsWith('https:'),
    defaultCookieAttributes: { httpOnly: true, sameSite: 'lax' as const },
    // The library drops its checks when NODE_ENV is test; ours are tested too.
    disableOriginCheck: false,
    disableCSRFCheck: false,
  };
}

function passwordsWith(mail: ReturnType<typeof accountMail>) {
  return {
    enabled: true,
    // Signing up tells nobody whether there was an account already; who made one signs in with its password.
    autoSignIn: false,
    minPasswordLength: PASSWORD_MIN,
    maxPasswordLength: 128,
    resetPasswordTokenExpiresIn: RESET_SECONDS,
    revokeSessionsOnPasswordReset: true,
    sendResetPassword: mail.sendReset,
    onPasswordReset: mail.afterReset,
    onExistingUserSignUp: mail.sendAccountThere,
  };
}
