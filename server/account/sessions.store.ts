import { and, desc, eq, gt, ne } from 'drizzle-orm';
import type { AccountSession } from '../../shared/account-answers.ts';
import type { Db } from '../db/client.ts';
import { session } from './account.table.ts';

/** Where somebody is signed in, the last used first. The sign-in library's own list wants a session of today. */
export async function listSessions(db: Db, userId: string, currentId: string): Promise<AccountSession[]> {
  const rows = await db
    .select({
      id: session.id,
      createdAt: session.createdAt,
      lastUsedAt: session.updatedAt,
      expiresAt: session.expiresAt,
      userAgent: session.userAgent,
      ipAddress: session.ipAddress,
    })
    .from(session)
    .where(and(eq(session.userId, userId), gt(session.expiresAt, new Date())))
    .orderBy(desc(session.updatedAt), desc(session.id));
  return rows.map((row) => ({
    ...row,
    createdAt: row.createdAt.toISOString(),
    lastUsedAt: row.lastUsedAt.toISOString(),
    expiresAt: row.expiresAt.toISOString(),
    userAgent: row.userAgent === '' ? null : row.userAgent,
    ipAddress: row.ipAddress === '' ? null : row.ipAddress,
    isCurrent: row.id === currentId,
  }));
}

/** Ends one of somebody's sessions; false where it is none of theirs. */
export async function endSession(db: Db, userId: string, id: string): Promise<boolean> {
  const [done] = await db.delete(session).where(and(eq(session.userId, userId), eq(session.id, id)));
  return done.affectedRows === 1;
}

/** Ends all of somebody's sessions but one. */
export async function endOtherSessions(db: Db, userId: string, keptId: string): Promise<void> {
  await db.delete(session).where(and(eq(session.userId, userId), ne(session.id, keptId)));
}
