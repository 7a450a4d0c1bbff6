import { char, index, int, mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import { user } from '../account/account.table.ts';
import { moment, uuid } from '../db/columns.ts';

/** A file kept as it was uploaded; the bytes lie in the file store under this id. */
export const storedFile = mysqlTable(
  'stored_file',
  {
    id: uuid().primaryKey(),
    ownerId: uuid('owner_id')
      .notNull()
      .references(() => user.id),
    name: varchar({ length: 255 }).notNull(),
    bytes: int().notNull(),
    sha256: char({ length: 64 }).notNull(),
    mediaType: varchar('media_type', { length: 120 }).notNull(),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [index('stored_file_owner').on(table.ownerId, table.id)],
);
