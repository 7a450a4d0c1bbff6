import { and, count, desc, eq, like, or } from 'drizzle-orm';
import type {
  FitAnswer,
  SavedPlan,
  SavedPlanInput,
  SavedPlanSummary,
} from '../../shared/plans/plans.schema.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { containing } from '../db/like.ts';
import { rowsOf, type ListQuery } from '../http/paging.ts';
import { pattern, patternRevision } from '../patterns/patterns.table.ts';
import { measurementSet, person } from '../people/people.table.ts';
import { savedPlan } from './plans.table.ts';

const summary = {
  id: savedPlan.id,
  name: savedPlan.name,
  createdAt: savedPlan.createdAt,
  engine: savedPlan.engine,
  personId: person.id,
  personName: person.name,
  measurementSetId: savedPlan.measurementSetId,
  takenOn: measurementSet.takenOn,
  patternId: pattern.id,
  patternTitle: pattern.title,
  revisionId: savedPlan.revisionId,
  revisionNumber: patternRevision.number,
  status: savedPlan.status,
  zones: savedPlan.zones,
};

const whole = {
  ...summary,
  ownerId: savedPlan.ownerId,
  options: savedPlan.options,
  input: savedPlan.input,
  plan: savedPlan.result,
};

/** A saved plan and whose it is. */
export interface OwnedPlan extends SavedPlan {
  ownerId: string;
}

const withWrittenTime = <T extends { createdAt: Date }>(row: T) => ({
  ...row,
  createdAt: row.createdAt.toISOString(),
});

/** Somebody's plans, the latest saved first; `q` is looked for in their names, people and patterns. */
export async function listPlans(
  db: Db,
  ownerId: string,
  query: ListQuery,
): Promise<{ plans: SavedPlanSummary[]; total: number }> {
  const text = containing(query.q);
  const wanted = and(
    eq(savedPlan.ownerId, ownerId),
    query.q === ''
      ? undefined
      : or(like(savedPlan.name, text), like(person.name, text), like(pattern.title, text)),
  );
  const { limit, offset } = rowsOf(query);
  const rows = await db
    .select(summary)
    .from(savedPlan)
    .innerJoin(measurementSet, eq(measurementSet.id, savedPlan.measurementSetId))
    .innerJoin(person, eq(person.id, measurementSet.personId))
    .innerJoin(patternRevision, eq(patternRevision.id, savedPlan.revisionId))
    .innerJoin(pattern, eq(pattern.id, patternRevision.patternId))
    .where(wanted)
    .orderBy(desc(savedPlan.createdAt), desc(savedPlan.id))
    .limit(limit)
    .offset(offset);
  const [counted] = await db
    .select({ total: count() })
    .from(savedPlan)
    .innerJoin(measurementSet, eq(measurementSet.id, savedPlan.measurementSetId))
    .innerJoin(person, eq(person.id, measurementSet.personId))
    .innerJoin(patternRevision, eq(patternRevision.id, savedPlan.revisionId))
    .innerJoin(pattern, eq(pattern.id, patternRevision.patternId))
    .where(wanted);
  return { plans: rows.map(withWrittenTime), total: counted?.total ?? 0 };
}

export async function findPlan(db: Db, id: string): Promise<OwnedPlan | null> {
  const [row] = await db
    .select(whole)
    .from(savedPlan)
    .innerJoin(measurementSet, eq(measurementSet.id, savedPlan.measurementSetId))
    .innerJoin(person, eq(person.id, measurementSet.personId))
    .innerJoin(patternRevision, eq(patternRevision.id, savedPlan.revisionId))
    .innerJoin(pattern, eq(pattern.id, patternRevision.patternId))
    .where(eq(savedPlan.id, id));
  return row === undefined ? null : withWrittenTime(row);
}

/** Keeps what was asked beside what was answered. */
export async function createPlan(
  db: Db,
  ownerId: string,
  asked: SavedPlanInput,
  answered: FitAnswer,
): Promise<string> {
  const id = newId();
  const now = new Date();
  await db.insert(savedPlan).values({
    ...asked,
    id,
    ownerId,
    engine: answered.engine,
    input: answered.input,
    result: answered.plan,
    status: answered.plan.status,
    zones: answered.plan.zones,
    createdAt: now,
    updatedAt: now,
  });
  return id;
}

export async function renamePlan(db: Db, id: string, name: string): Promise<void> {
  await db.update(savedPlan).set({ name, updatedAt: new Date() }).where(eq(savedPlan.id, id));
}

export async function deletePlan(db: Db, id: string): Promise<void> {
  await db.delete(savedPlan).where(eq(savedPlan.id, id));
}
