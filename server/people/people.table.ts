import { date, index, mysqlEnum, mysqlTable, text, varchar } from 'drizzle-orm/mysql-core';
import type { MeasurementSet } from '../../shared/people/people.schema.ts';
import { LENGTH_UNITS } from '../../shared/units.ts';
import { user } from '../account/account.table.ts';
import { json, moment, uuid } from '../db/columns.ts';

/** Somebody an account sews for. */
export const person = mysqlTable(
  'person',
  {
    id: uuid().primaryKey(),
    ownerId: uuid('owner_id')
      .notNull()
      .references(() => user.id),
    name: varchar({ length: 80 }).notNull(),
    stage: mysqlEnum(['adult', 'child']).notNull(),
    chestWord: mysqlEnum('chest_word', ['bust', 'chest']).notNull(),
    unit: mysqlEnum(LENGTH_UNITS).notNull(),
    notes: text().notNull(),
    createdAt: moment('created_at').notNull(),
    updatedAt: moment('updated_at').notNull(),
  },
  (table) => [index('person_owner').on(table.ownerId, table.name, table.id)],
);

/** One measuring of a person. Never changed: a new measuring is a new set. */
export const measurementSet = mysqlTable(
  'measurement_set',
  {
    id: uuid().primaryKey(),
    personId: uuid('person_id')
      .notNull()
      .references(() => person.id),
    takenOn: date('taken_on', { mode: 'string' }).notNull(),
    takenBy: mysqlEnum('taken_by', ['self', 'another']).notNull(),
    unit: mysqlEnum(LENGTH_UNITS).notNull(),
    notes: text().notNull(),
    // Where the values were copied from; no foreign key, since that set may be deleted and this one stays true.
    startedFromId: uuid('started_from_id'),
    values: json<MeasurementSet['values']>('values').notNull(),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [index('measurement_set_person').on(table.personId, table.takenOn, table.id)],
);
