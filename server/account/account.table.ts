import { bigint, boolean, index, int, mysqlEnum, mysqlTable, text, varchar } from 'drizzle-orm/mysql-core';
import { ROLES } from '../../shared/me.ts';
import { exactText, moment, uuid } from '../db/columns.ts';

/** The tables of the sign-in library; a test holds them against what it asks for. Property names are its own. */
export const user = mysqlTable('user', {
  id: uuid().primaryKey(),
  name: varchar({ length: 255 }).notNull(),
  // Addresses are kept in lower case; byte by byte, so that é and e are two people.
  email: exactText({ length: 255 }).notNull().unique(),
  emailVerified: boolean('email_verified').notNull().default(false),
  image: text(),
  createdAt: moment('created_at').notNull(),
  updatedAt: moment('updated_at').notNull(),
  role: mysqlEnum(ROLES).notNull().default('member'),
  twoFactorEnabled: boolean('two_factor_enabled').default(false),
});

export const session = mysqlTable(
  'session',
  {
    id: uuid().primaryKey(),
    expiresAt: moment('expires_at').notNull(),
    token: exactText({ length: 255 }).notNull().unique(),
    createdAt: moment('created_at').notNull(),
    updatedAt: moment('updated_at').notNull(),
    ipAddress: varchar('ip_address', { length: 64 }),
    userAgent: text('user_agent'),
    userId: uuid('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
  },
  (table) => [index('session_user').on(table.userId)],
);

export const account = mysqlTable(
  'account',
  {
    id: uuid().primaryKey(),
    accountId: exactText('account_id', { length: 255 }).notNull(),
    providerId: exactText('provider_id', { length: 255 }).notNull(),
    userId: uuid('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    accessToken: text('access_token'),
    refreshToken: text('refresh_token'),
    idToken: text('id_token'),
    accessTokenExpiresAt: moment('access_token_expires_at'),
    refreshTokenExpiresAt: moment('refresh_token_expires_at'),
    scope: text(),
    password: text(),
    createdAt: moment('created_at').notNull(),
    updatedAt: moment('updated_at').notNull(),
  },
  (table) => [index('account_user').on(table.userId)],
);

export const verification = mysqlTable(
  'verification',
  {
    id: uuid().primaryKey(),
    identifier: exactText({ length: 255 }).notNull(),
    value: text().notNull(),
    expiresAt: moment('expires_at').notNull(),
    createdAt: moment('created_at').notNull(),
    updatedAt: moment('updated_at').notNull(),
  },
  (table) => [index('verification_identifier').on(table.identifier)],
);

export const rateLimit = mysqlTable(
  'rate_limit',
  {
    id: uuid().primaryKey(),
    key: exactText({ length: 512 }).notNull().unique(),
    count: int().notNull(),
    // When the count began.
    lastRequest: bigint('last_request', { mode: 'number' }).notNull(),
  },
  (table) => [index('rate_limit_last_request').on(table.lastRequest)],
);

/** A second factor: the authenticator's key and the recovery codes, both encrypted with the instance's secret. */
export const twoFactor = mysqlTable(
  'two_factor',
  {
    id: uuid().primaryKey(),
    secret: exactText({ length: 512 }).notNull(),
    backupCodes: exactText('backup_codes', { length: 4096 }).notNull(),
    userId: uuid('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    verified: boolean().default(true),
    failedVerificationCount: int('failed_verification_count').default(0),
    lockedUntil: moment('locked_until'),
  },
  (table) => [index('two_factor_user').on(table.userId)],
);

/**
 * What works once and was used: codes of an authenticator within their window, and links that carry their own proof. Kept by
 * its hash until it would have run out anyway. Ours, not the sign-in library's.
 */
export const spentToken = mysqlTable(
  'spent_token',
  {
    hash: exactText({ length: 64 }).primaryKey(),
    userId: uuid('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    expiresAt: moment('expires_at').notNull(),
  },
  (table) => [index('spent_token_user').on(table.userId), index('spent_token_expires').on(table.expiresAt)],
);
