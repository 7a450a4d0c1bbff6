import { index, mysqlEnum, mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import { ADMIN_ACTIONS, type AdminActDetail } from '../../shared/admin/log.schema.ts';
import { TEACHER_REQUEST_STATES } from '../../shared/teacher-request.ts';
import { user } from '../account/account.table.ts';
import { json, moment, uuid } from '../db/columns.ts';

/** A request to become a teacher: one a person, the latest. */
export const teacherRequest = mysqlTable(
  'teacher_request',
  {
    id: uuid().primaryKey(),
    userId: uuid('user_id')
      .notNull()
      .unique()
      .references(() => user.id, { onDelete: 'cascade' }),
    sentence: varchar({ length: 500 }).notNull(),
    state: mysqlEnum(TEACHER_REQUEST_STATES).notNull(),
    createdAt: moment('created_at').notNull(),
    answeredAt: moment('answered_at'),
  },
  (table) => [index('teacher_request_state').on(table.state, table.id)],
);

/** What administrators did. An account's deletion is real: its place in the log becomes empty, the act stays. */
export const adminAct = mysqlTable('admin_act', {
  id: uuid().primaryKey(),
  at: moment().notNull(),
  actorId: uuid('actor_id').references(() => user.id, { onDelete: 'set null' }),
  through: mysqlEnum(['page', 'command']).notNull(),
  action: mysqlEnum(ADMIN_ACTIONS).notNull(),
  subjectId: uuid('subject_id').references(() => user.id, { onDelete: 'set null' }),
  detail: json<AdminActDetail>('detail').notNull(),
});
