import { and, count, desc, eq, isNull, lt, or } from 'drizzle-orm';
import { TOKENS_MAX, type AccessToken, type TokenScope } from '../../shared/tokens/tokens.schema.ts';
import { user } from '../account/account.table.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { inTransaction } from '../db/transaction.ts';
import { hashOf } from './make-token.ts';
import { accessToken } from './tokens.table.ts';

/** Writing the moment of every use down would make each reading a writing. */
const USE_NOTED_EVERY_MS = 60_000;

const shown = {
  id: accessToken.id,
  name: accessToken.name,
  prefix: accessToken.prefix,
  scopes: accessToken.scopes,
  createdAt: accessToken.createdAt,
  lastUsedAt: accessToken.lastUsedAt,
  expiresAt: accessToken.expiresAt,
};

interface ShownRow extends Omit<AccessToken, 'createdAt' | 'lastUsedAt' | 'expiresAt'> {
  createdAt: Date;
  lastUsedAt: Date | null;
  expiresAt: Date | null;
}

const toToken = (row: ShownRow): AccessToken => ({
  ...row,
  createdAt: row.createdAt.toISOString(),
  lastUsedAt: row.lastUsedAt?.toISOString() ?? null,
  expiresAt: row.expiresAt?.toISOString() ?? null,
});

/** Somebody's tokens, the latest made first. */
export async function listTokens(db: Db, userId: string): Promise<AccessToken[]> {
  const rows = await db
    .select(shown)
    .from(accessToken)
    .where(eq(accessToken.userId, userId))
    .orderBy(desc(accessToken.id));
  return rows.map(toToken);
}

interface NewToken {
  name: string;
  scopes: TokenScope[];
  expiresAt: Date | null;
  prefix: string;
  hash: string;
}

/** Keeps a token, or answers null where the account has as many as it may. */
export async function createToken(db: Db, userId: string, made: NewToken): Promise<AccessToken | null> {
  return inTransaction(db, async (tx) => {
    // Two requests at once would each count before the other has written.
    await tx.select({ id: user.id }).from(user).where(eq(user.id, userId)).for('update');
    const [kept] = await tx
      .select({ total: count() })
      .from(accessToken)
      .where(eq(accessToken.userId, userId));
    if ((kept?.total ?? 0) >= TOKENS_MAX) return null;
    const { hash, ...row } = { ...made, id: newId(), createdAt: new Date(), lastUsedAt: null };
    await tx.insert(accessToken).values({ ...row, hash, userId });
    return toToken(row);
  });
}

/** Withdraws a token of somebody's; false where they have none such. */
export async function deleteToken(db: Db, userId: string, id: string): Promise<boolean> {
  const [result] = await db
    .delete(accessToken)
    .where(and(eq(accessToken.id, id), eq(accessToken.userId, userId)));
  return result.affectedRows > 0;
}

/** Whose the token is and what it may do; null where it is unknown, withdrawn or has expired. Notes its use. */
export async function recogniseToken(db: Db, token: string) {
  const [row] = await db
    .select({
      id: accessToken.id,
      scopes: accessToken.scopes,
      lastUsedAt: accessToken.lastUsedAt,
      expiresAt: accessToken.expiresAt,
      user: { id: user.id, name: user.name, email: user.email, role: user.role },
    })
    .from(accessToken)
    .innerJoin(user, eq(user.id, accessToken.userId))
    .where(eq(accessToken.hash, hashOf(token)));
  const now = new Date();
  if (row === undefined || (row.expiresAt !== null && row.expiresAt <= now)) return null;
  await noteUse(db, row, now);
  return { user: row.user, scopes: row.scopes };
}

async function noteUse(db: Db, token: { id: string; lastUsedAt: Date | null }, now: Date): Promise<void> {
  const due = new Date(now.getTime() - USE_NOTED_EVERY_MS);
  if (token.lastUsedAt !== null && token.lastUsedAt > due) return;
  await db
    .update(accessToken)
    .set({ lastUsedAt: now })
    .where(
      and(
        eq(accessToken.id, token.id),
        // Asked again in the statement: of many requests at once only the first writes.
        or(isNull(accessToken.lastUsedAt), lt(accessToken.lastUsedAt, due)),
      ),
    );
}
