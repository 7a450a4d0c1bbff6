import { and, asc, count, eq, like, or, sql } from 'drizzle-orm';
import type { AdminPeopleQuery, AdminPerson } from '../../shared/admin/people.schema.ts';
import type { Role } from '../../shared/me.ts';
import { user } from '../account/account.table.ts';
import type { Db } from '../db/client.ts';
import { containing } from '../db/like.ts';
import { inTransaction } from '../db/transaction.ts';
import { rowsOf } from '../http/paging.ts';
import { found, Problem } from '../http/problem.ts';
import { logAct } from './log.store.ts';

const THING = 'account';

// Named one by one: nothing that an account keeps can slip in.
const columns = {
  id: user.id,
  name: user.name,
  email: user.email,
  role: user.role,
  emailVerified: user.emailVerified,
  createdAt: user.createdAt,
  // Written by hand: Drizzle would drop the table's name inside it, and it must look at its own row.
  asksToTeach: sql<boolean>`EXISTS (SELECT 1 FROM teacher_request r
    WHERE r.user_id = user.id AND r.state = 'pending')`.mapWith(Boolean),
};

type Row = Omit<AdminPerson, 'createdAt'> & { createdAt: Date };
const toPerson = (row: Row): AdminPerson => ({ ...row, createdAt: row.createdAt.toISOString() });

/** The accounts by name, and how many there are in all. */
export async function listAccounts(
  db: Db,
  query: AdminPeopleQuery,
): Promise<{ people: AdminPerson[]; total: number }> {
  const wanted = query.q === '' ? undefined : containing(query.q);
  const where = and(
    wanted === undefined ? undefined : or(like(user.name, wanted), like(user.email, wanted.toLowerCase())),
    query.role === undefined ? undefined : eq(user.role, query.role),
  );
  const { limit, offset } = rowsOf(query);
  const rows = await db
    .select(columns)
    .from(user)
    .where(where)
    .orderBy(asc(user.name), asc(user.id))
    .limit(limit)
    .offset(offset);
  const [counted] = await db.select({ total: count() }).from(user).where(where);
  return { people: rows.map(toPerson), total: counted?.total ?? 0 };
}

export async function findAccount(db: Db, id: string): Promise<AdminPerson | null> {
  const [row] = await db.select(columns).from(user).where(eq(user.id, id));
  return row === undefined ? null : toPerson(row);
}

/** Gives somebody a role and writes it into the log; the role they have already changes nothing. */
export async function changeRole(db: Db, actorId: string, id: string, to: Role): Promise<AdminPerson> {
  await inTransaction(db, async (tx) => {
    const from = await lockRole(tx, id);
    if (from === to) return;
    if (from === 'admin') await refuseLastAdministrator(tx, id);
    await setRole(tx, id, to);
    await logAct(tx, { actorId, action: 'roleChanged', subjectId: id, detail: { from, to } });
  });
  return found(await findAccount(db, id), THING);
}

/** Makes the account with this address an administrator, as the command line may. */
export async function makeAdministrator(db: Db, email: string): Promise<'made' | 'already' | 'unknown'> {
  return inTransaction(db, async (tx) => {
    const [row] = await tx
      .select({ id: user.id, role: user.role })
      .from(user)
      .where(eq(user.email, email.trim().toLowerCase()))
      .for('update');
    if (row === undefined) return 'unknown';
    if (row.role === 'admin') return 'already';
    await setRole(tx, row.id, 'admin');
    const detail = { from: row.role, to: 'admin' };
    await logAct(tx, { actorId: null, action: 'administratorMade', subjectId: row.id, detail });
    return 'made';
  });
}

/** Somebody's role, held until the transaction ends; 404 where there is no such account. */
export async function lockRole(tx: Db, id: string): Promise<Role> {
  const [row] = await tx.select({ role: user.role }).from(user).where(eq(user.id, id)).for('update');
  return found(row, THING).role;
}

export async function setRole(tx: Db, id: string, role: Role): Promise<void> {
  await tx.update(user).set({ role, updatedAt: new Date() }).where(eq(user.id, id));
}

/**
 * 409 where `id` is the only administrator: somebody must be able to answer requests. Touches every administrator's
 * row, since two that step down at once on two nodes of a cluster collide only where both write the same row.
 */
async function refuseLastAdministrator(tx: Db, id: string): Promise<void> {
  await tx.update(user).set({ updatedAt: new Date() }).where(eq(user.role, 'admin'));
  const administrators = await tx
    .select({ id: user.id })
    .from(user)
    .where(eq(user.role, 'admin'))
    .for('update');
  if (administrators.some((one) => one.id === id) && administrators.length === 1) {
    throw new Problem('conflict', {
      detail: 'This is the only administrator: make somebody else one first.',
    });
  }
}
