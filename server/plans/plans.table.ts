import { index, mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import type { FitInput, FitPlan } from '../../shared/fit/fit.schema.ts';
import type { PlanOptions } from '../../shared/plans/plans.schema.ts';
import { user } from '../account/account.table.ts';
import { json, moment, uuid } from '../db/columns.ts';
import { patternRevision } from '../patterns/patterns.table.ts';
import { measurementSet } from '../people/people.table.ts';

/**
 * A plan as it was when it was saved. Input and result are kept, since a pattern's kind and silhouette may be
 * edited and the engine may learn; only the name ever changes. `status` and `zones` repeat the result for lists.
 */
export const savedPlan = mysqlTable(
  'saved_plan',
  {
    id: uuid().primaryKey(),
    ownerId: uuid('owner_id')
      .notNull()
      .references(() => user.id),
    name: varchar({ length: 120 }).notNull(),
    measurementSetId: uuid('measurement_set_id')
      .notNull()
      .references(() => measurementSet.id),
    revisionId: uuid('revision_id')
      .notNull()
      .references(() => patternRevision.id),
    options: json<PlanOptions>('options').notNull(),
    engine: varchar({ length: 40 }).notNull(),
    input: json<FitInput>('input').notNull(),
    result: json<FitPlan>('result').notNull(),
    status: varchar({ length: 20 }).$type<FitPlan['status']>().notNull(),
    zones: json<FitPlan['zones']>('zones').notNull(),
    createdAt: moment('created_at').notNull(),
    updatedAt: moment('updated_at').notNull(),
  },
  (table) => [index('saved_plan_owner').on(table.ownerId, table.createdAt, table.id)],
);
