import { index, int, mysqlEnum, mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import { user } from '../account/account.table.ts';
import { exactText, json, moment, uuid } from '../db/columns.ts';
import type { Letter } from './letter.ts';

/** Where a mail stands: `failed` is given up, the others go on by themselves. */
export const MAIL_STATES = ['waiting', 'sending', 'sent', 'failed'] as const;

/**
 * Mail to be sent, written in the same transaction as what it tells of. What it says is emptied once it is sent, since a
 * link in it opens an account.
 */
export const outbox = mysqlTable(
  'outbox',
  {
    id: uuid().primaryKey(),
    to: exactText({ length: 320 }).notNull(),
    userId: uuid('user_id').references(() => user.id, { onDelete: 'cascade' }),
    kind: varchar({ length: 40 }).notNull(),
    payload: json<Letter>('payload'),
    state: mysqlEnum(MAIL_STATES).notNull(),
    attempts: int().notNull(),
    nextAt: moment('next_at').notNull(),
    leaseUntil: moment('lease_until'),
    // Of whoever holds the lease: a sender that was too slow finds another's here.
    leaseToken: uuid('lease_token'),
    usefulUntil: moment('useful_until'),
    messageId: exactText('message_id', { length: 255 }).notNull().unique(),
    createdAt: moment('created_at').notNull(),
    sentAt: moment('sent_at'),
    lastError: varchar('last_error', { length: 200 }),
  },
  (table) => [
    index('outbox_next').on(table.state, table.nextAt),
    index('outbox_user').on(table.userId),
    index('outbox_to').on(table.to),
  ],
);
