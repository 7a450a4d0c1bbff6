import { eq } from 'drizzle-orm';
import type { PlanGround } from '../../shared/plans/make-plan.ts';
import type { FitRequest } from '../../shared/plans/plans.schema.ts';
import type { Db } from '../db/client.ts';
import { found } from '../http/problem.ts';
import { pattern, patternRevision } from '../patterns/patterns.table.ts';
import { measurementSet, person } from '../people/people.table.ts';

/** What the plan follows from, from somebody's own set and own pattern; 404 where either is not theirs. */
export async function loadPlanGround(db: Db, ownerId: string, asked: FitRequest): Promise<PlanGround> {
  const [set] = await db
    .select({ ownerId: person.ownerId, values: measurementSet.values, takenBy: measurementSet.takenBy })
    .from(measurementSet)
    .innerJoin(person, eq(person.id, measurementSet.personId))
    .where(eq(measurementSet.id, asked.measurementSetId));
  const { values, takenBy } = ownedBy(ownerId, set, 'measurement set');
  const [row] = await db
    .select({ ownerId: pattern.ownerId, table: patternRevision.table, pattern })
    .from(patternRevision)
    .innerJoin(pattern, eq(pattern.id, patternRevision.patternId))
    .where(eq(patternRevision.id, asked.revisionId));
  const revision = ownedBy(ownerId, row, 'pattern revision');
  return { values, takenBy, pattern: revision.pattern, table: revision.table, options: asked.options };
}

function ownedBy<T extends { ownerId: string }>(ownerId: string, row: T | undefined, thing: string): T {
  return found(row?.ownerId === ownerId ? row : null, thing);
}
