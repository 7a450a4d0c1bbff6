import { and, asc, count, eq, inArray, like, sql } from 'drizzle-orm';
import type { Person, PersonInput } from '../../shared/people/people.schema.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { containing } from '../db/like.ts';
import { inTransaction } from '../db/transaction.ts';
import { rowsOf, type ListQuery } from '../http/paging.ts';
import { savedPlan } from '../plans/plans.table.ts';
import { measurementSet, person } from './people.table.ts';

/** A person and whose they are. */
export interface OwnedPerson extends Person {
  ownerId: string;
}

// Written by hand: Drizzle would drop the tables' names inside these, and each must look at its own row.
const sets = sql`FROM measurement_set s WHERE s.person_id = person.id`;
const newest = sql`ORDER BY s.taken_on DESC, s.id DESC LIMIT 1`;

const columns = {
  id: person.id,
  ownerId: person.ownerId,
  name: person.name,
  stage: person.stage,
  chestWord: person.chestWord,
  unit: person.unit,
  notes: person.notes,
  createdAt: person.createdAt,
  updatedAt: person.updatedAt,
  latestSetId: sql<string | null>`(SELECT s.id ${sets} ${newest})`,
  latestTakenOn: sql<string | null>`(SELECT CAST(s.taken_on AS CHAR) ${sets} ${newest})`,
  setCount: sql<number>`(SELECT COUNT(*) ${sets})`.mapWith(Number),
};

type Row = Omit<OwnedPerson, 'createdAt' | 'updatedAt'> & { createdAt: Date; updatedAt: Date };

const toPerson = (row: Row): OwnedPerson => ({
  ...row,
  createdAt: row.createdAt.toISOString(),
  updatedAt: row.updatedAt.toISOString(),
});

/** Somebody's people by name, and how many there are in all. */
export async function listPeople(
  db: Db,
  ownerId: string,
  query: ListQuery,
): Promise<{ people: OwnedPerson[]; total: number }> {
  const theirs = and(
    eq(person.ownerId, ownerId),
    query.q === '' ? undefined : like(person.name, containing(query.q)),
  );
  const { limit, offset } = rowsOf(query);
  const rows = await db
    .select(columns)
    .from(person)
    .where(theirs)
    .orderBy(asc(person.name), asc(person.id))
    .limit(limit)
    .offset(offset);
  const [counted] = await db.select({ total: count() }).from(person).where(theirs);
  return { people: rows.map(toPerson), total: counted?.total ?? 0 };
}

export async function findPerson(db: Db, id: string): Promise<OwnedPerson | null> {
  const [row] = await db.select(columns).from(person).where(eq(person.id, id));
  return row === undefined ? null : toPerson(row);
}

export async function createPerson(db: Db, ownerId: string, input: PersonInput): Promise<string> {
  const id = newId();
  const now = new Date();
  await db.insert(person).values({ ...input, id, ownerId, createdAt: now, updatedAt: now });
  return id;
}

/** Changes what is given; nothing given changes nothing, the time of the last change included. */
export async function updatePerson(db: Db, id: string, changes: Partial<PersonInput>): Promise<void> {
  if (Object.keys(changes).length === 0) return;
  await db
    .update(person)
    .set({ ...changes, updatedAt: new Date() })
    .where(eq(person.id, id));
}

/** Deletes a person with their measurements and the plans made from these. */
export async function deletePerson(db: Db, id: string): Promise<void> {
  await inTransaction(db, async (tx) => {
    // Holding the person keeps a new set out; the foreign keys keep out a plan that is saved meanwhile.
    await tx.select({ id: person.id }).from(person).where(eq(person.id, id)).for('update');
    const theirSets = tx
      .select({ id: measurementSet.id })
      .from(measurementSet)
      .where(eq(measurementSet.personId, id));
    await tx.delete(savedPlan).where(inArray(savedPlan.measurementSetId, theirSets));
    await tx.delete(measurementSet).where(eq(measurementSet.personId, id));
    await tx.delete(person).where(eq(person.id, id));
  });
}
