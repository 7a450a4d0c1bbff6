import { index, mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import type { TokenScope } from '../../shared/tokens/tokens.schema.ts';
import { user } from '../account/account.table.ts';
import { exactText, json, moment, uuid } from '../db/columns.ts';

/** Personal access tokens. Of the token itself only its SHA-256 is kept: whoever reads this table can use none. */
export const accessToken = mysqlTable(
  'access_token',
  {
    id: uuid().primaryKey(),
    userId: uuid('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    name: varchar({ length: 80 }).notNull(),
    hash: exactText({ length: 64 }).notNull().unique(),
    prefix: exactText({ length: 20 }).notNull(),
    scopes: json<TokenScope[]>().notNull(),
    createdAt: moment('created_at').notNull(),
    lastUsedAt: moment('last_used_at'),
    expiresAt: moment('expires_at'),
  },
  (table) => [index('access_token_user').on(table.userId)],
);
