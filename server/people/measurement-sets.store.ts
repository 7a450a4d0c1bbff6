import { and, count, desc, eq } from 'drizzle-orm';
import type { MeasurementSet } from '../../shared/people/people.schema.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { ERRNO, errnoOf } from '../db/errors.ts';
import type { PageQuery } from '../../shared/paging.ts';
import { rowsOf } from '../http/paging.ts';
import { measurementSet, person } from './people.table.ts';

type NewSet = Omit<MeasurementSet, 'id' | 'createdAt'>;
type Row = typeof measurementSet.$inferSelect;

const toSet = (row: Row): MeasurementSet => ({ ...row, createdAt: row.createdAt.toISOString() });

/** A person's sets, the latest taken first, and how many there are in all. */
export async function listMeasurementSets(
  db: Db,
  personId: string,
  query: PageQuery,
): Promise<{ sets: MeasurementSet[]; total: number }> {
  const { limit, offset } = rowsOf(query);
  const theirs = eq(measurementSet.personId, personId);
  const rows = await db
    .select()
    .from(measurementSet)
    .where(theirs)
    .orderBy(desc(measurementSet.takenOn), desc(measurementSet.id))
    .limit(limit)
    .offset(offset);
  const [counted] = await db.select({ total: count() }).from(measurementSet).where(theirs);
  return { sets: rows.map(toSet), total: counted?.total ?? 0 };
}

/** A set with whose it is. */
export async function findMeasurementSet(
  db: Db,
  id: string,
): Promise<{ set: MeasurementSet; ownerId: string } | null> {
  const [row] = await db
    .select({ set: measurementSet, ownerId: person.ownerId })
    .from(measurementSet)
    .innerJoin(person, eq(person.id, measurementSet.personId))
    .where(eq(measurementSet.id, id));
  return row === undefined ? null : { set: toSet(row.set), ownerId: row.ownerId };
}

/** Whether the set is one of that person's. */
export async function isSetOf(db: Db, setId: string, personId: string): Promise<boolean> {
  const rows = await db
    .select({ id: measurementSet.id })
    .from(measurementSet)
    .where(and(eq(measurementSet.id, setId), eq(measurementSet.personId, personId)));
  return rows.length > 0;
}

export async function createMeasurementSet(db: Db, input: NewSet): Promise<MeasurementSet> {
  const row = { ...input, id: newId(), createdAt: new Date() };
  await db.insert(measurementSet).values(row);
  return toSet(row);
}

/** Deletes a set, or answers `inUse` while a saved plan refers to it. */
export async function deleteMeasurementSet(db: Db, id: string): Promise<'deleted' | 'inUse'> {
  try {
    await db.delete(measurementSet).where(eq(measurementSet.id, id));
    return 'deleted';
  } catch (error) {
    if (errnoOf(error) === ERRNO.stillReferred) return 'inUse';
    throw error;
  }
}
