import { index, mediumtext, mysqlTable, text, varchar } from 'drizzle-orm/mysql-core';
import { exactText, moment, uuid } from '../db/columns.ts';

/** What the local mailbox has received: on this machine alone, where no mail server is named. */
export const mailboxMessage = mysqlTable(
  'mailbox_message',
  {
    id: uuid().primaryKey(),
    from: varchar({ length: 320 }).notNull(),
    to: exactText({ length: 320 }).notNull(),
    subject: text().notNull(),
    messageId: exactText('message_id', { length: 255 }).notNull(),
    text: mediumtext().notNull(),
    html: mediumtext().notNull(),
    receivedAt: moment('received_at').notNull(),
  },
  (table) => [
    index('mailbox_message_received').on(table.receivedAt, table.id),
    index('mailbox_message_to').on(table.to),
  ],
);
