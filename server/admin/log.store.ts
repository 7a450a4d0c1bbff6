import { count, desc, eq } from 'drizzle-orm';
import { alias } from 'drizzle-orm/mysql-core';
import type { AdminAct, AdminActDetail, AdminAction } from '../../shared/admin/log.schema.ts';
import type { PageQuery } from '../../shared/paging.ts';
import { user } from '../account/account.table.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { rowsOf } from '../http/paging.ts';
import { adminAct } from './admin.table.ts';

interface NewAct {
  /** Null: the command line. */
  actorId: string | null;
  action: AdminAction;
  subjectId?: string | null;
  detail?: AdminActDetail;
}

/** Writes an act down; `tx` is the transaction that does it, so that neither is without the other. */
export async function logAct(tx: Db, { actorId, action, subjectId, detail }: NewAct): Promise<void> {
  await tx.insert(adminAct).values({
    id: newId(),
    at: new Date(),
    actorId,
    through: actorId === null ? 'command' : 'page',
    action,
    subjectId: subjectId ?? null,
    detail: detail ?? {},
  });
}

const actor = alias(user, 'actor');
const subject = alias(user, 'subject');

/** The acts, the latest first, and how many there are in all. */
export async function listActs(db: Db, query: PageQuery): Promise<{ acts: AdminAct[]; total: number }> {
  const { limit, offset } = rowsOf(query);
  const rows = await db
    .select({
      act: adminAct,
      by: { id: actor.id, name: actor.name },
      on: { id: subject.id, name: subject.name },
    })
    .from(adminAct)
    .leftJoin(actor, eq(actor.id, adminAct.actorId))
    .leftJoin(subject, eq(subject.id, adminAct.subjectId))
    .orderBy(desc(adminAct.id))
    .limit(limit)
    .offset(offset);
  const [counted] = await db.select({ total: count() }).from(adminAct);
  const acts = rows.map(({ act, by, on }) => ({ ...act, at: act.at.toISOString(), by, on }));
  return { acts, total: counted?.total ?? 0 };
}
