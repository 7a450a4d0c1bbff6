import { asc, count, desc, eq } from 'drizzle-orm';
import type { AdminTeacherRequest, AdminTeacherRequestsQuery } from '../../shared/admin/people.schema.ts';
import type { TeacherRequest } from '../../shared/teacher-request.ts';
import { user } from '../account/account.table.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { inTransaction } from '../db/transaction.ts';
import { rowsOf } from '../http/paging.ts';
import { found, notFound, Problem } from '../http/problem.ts';
import { teacherRequest } from './admin.table.ts';
import { logAct } from './log.store.ts';
import { lockRole, setRole } from './roles.store.ts';

const THING = 'request';

const toRequest = (row: typeof teacherRequest.$inferSelect): TeacherRequest => ({
  id: row.id,
  sentence: row.sentence,
  state: row.state,
  createdAt: row.createdAt.toISOString(),
  answeredAt: row.answeredAt?.toISOString() ?? null,
});

/** Somebody's own request, waiting or answered; null where they never asked or withdrew it. */
export async function findTeacherRequest(db: Db, userId: string): Promise<TeacherRequest | null> {
  const [row] = await db.select().from(teacherRequest).where(eq(teacherRequest.userId, userId));
  return row === undefined ? null : toRequest(row);
}

/** Asks; an answered request makes room for the new one. 409 where one waits or they need not ask. */
export async function askToTeach(db: Db, userId: string, sentence: string): Promise<TeacherRequest> {
  return inTransaction(db, async (tx) => {
    // Holding the account keeps two requests of the same person apart.
    const role = await lockRole(tx, userId);
    if (role !== 'member') {
      throw new Problem('conflict', { detail: 'You can open classes already: there is nothing to ask for.' });
    }
    const before = await findTeacherRequest(tx, userId);
    if (before?.state === 'pending') {
      throw new Problem('conflict', { detail: 'Your request waits for an answer already.' });
    }
    await tx.delete(teacherRequest).where(eq(teacherRequest.userId, userId));
    const row = {
      id: newId(),
      userId,
      sentence,
      state: 'pending' as const,
      createdAt: new Date(),
      answeredAt: null,
    };
    await tx.insert(teacherRequest).values(row);
    return toRequest(row);
  });
}

/** Withdraws the request that waits; 404 where none does. */
export async function withdrawTeacherRequest(db: Db, userId: string): Promise<void> {
  await inTransaction(db, async (tx) => {
    await lockRole(tx, userId);
    const request = await findTeacherRequest(tx, userId);
    if (request?.state !== 'pending') throw notFound(THING);
    await tx.delete(teacherRequest).where(eq(teacherRequest.userId, userId));
  });
}

const person = { id: user.id, name: user.name, email: user.email };

/** The requests in one state, those that wait longest first, the answered ones latest first. */
export async function listTeacherRequests(
  db: Db,
  query: AdminTeacherRequestsQuery,
): Promise<{ requests: AdminTeacherRequest[]; total: number }> {
  const where = eq(teacherRequest.state, query.state);
  const { limit, offset } = rowsOf(query);
  const rows = await db
    .select({ request: teacherRequest, person })
    .from(teacherRequest)
    .innerJoin(user, eq(user.id, teacherRequest.userId))
    .where(where)
    .orderBy(query.state === 'pending' ? asc(teacherRequest.id) : desc(teacherRequest.id))
    .limit(limit)
    .offset(offset);
  const [counted] = await db.select({ total: count() }).from(teacherRequest).where(where);
  const requests = rows.map((row) => ({ ...toRequest(row.request), person: row.person }));
  return { requests, total: counted?.total ?? 0 };
}

export async function findAnyTeacherRequest(db: Db, id: string): Promise<AdminTeacherRequest | null> {
  const [row] = await db
    .select({ request: teacherRequest, person })
    .from(teacherRequest)
    .innerJoin(user, eq(user.id, teacherRequest.userId))
    .where(eq(teacherRequest.id, id));
  return row === undefined ? null : { ...toRequest(row.request), person: row.person };
}

/**
 * Accepts or declines, writes it into the log, and lets `tell` put the message into the same transaction. The same
 * answer again changes nothing; the other one is 409.
 */
export async function answerTeacherRequest(
  db: Db,
  { actorId, id, accept }: { actorId: string; id: string; accept: boolean },
  tell: (tx: Db, request: AdminTeacherRequest) => Promise<void>,
): Promise<AdminTeacherRequest> {
  const state = accept ? 'accepted' : 'declined';
  await inTransaction(db, async (tx) => {
    const request = found(await findAnyTeacherRequest(tx, id), THING);
    // The account first, as everywhere: then two answers at once wait for each other.
    const role = await lockRole(tx, request.person.id);
    const [now] = await tx.select().from(teacherRequest).where(eq(teacherRequest.id, id)).for('update');
    if (now === undefined) throw notFound(THING);
    if (now.state === state) return;
    if (now.state !== 'pending') {
      throw new Problem('conflict', { detail: `This request was ${now.state} already.` });
    }
    await tx.update(teacherRequest).set({ state, answeredAt: new Date() }).where(eq(teacherRequest.id, id));
    if (accept && role === 'member') await setRole(tx, request.person.id, 'teacher');
    const action = accept ? 'teacherRequestAccepted' : 'teacherRequestDeclined';
    await logAct(tx, { actorId, action, subjectId: request.person.id });
    await tell(tx, request);
  });
  return found(await findAnyTeacherRequest(db, id), THING);
}
