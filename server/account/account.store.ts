import { eq } from 'drizzle-orm';
import type { Account } from '../../shared/account-answers.ts';
import type { Db } from '../db/client.ts';
import { user } from './account.table.ts';

/** An account but for what others keep of it. */
export type KeptAccount = Omit<Account, 'recoveryCodesLeft' | 'teacherRequest'>;

const columns = {
  id: user.id,
  name: user.name,
  email: user.email,
  role: user.role,
  emailVerified: user.emailVerified,
  twoFactorEnabled: user.twoFactorEnabled,
  createdAt: user.createdAt,
};

export async function findAccount(db: Db, id: string): Promise<KeptAccount | null> {
  const [row] = await db.select(columns).from(user).where(eq(user.id, id));
  if (row === undefined) return null;
  return {
    ...row,
    twoFactorEnabled: row.twoFactorEnabled === true,
    createdAt: row.createdAt.toISOString(),
  };
}

export async function isAddressTaken(db: Db, email: string): Promise<boolean> {
  const rows = await db.select({ id: user.id }).from(user).where(eq(user.email, email.toLowerCase()));
  return rows.length > 0;
}

export async function renameAccount(db: Db, id: string, name: string): Promise<void> {
  await db.update(user).set({ name, updatedAt: new Date() }).where(eq(user.id, id));
}

/** An address that was confirmed by a link that only it has received. */
export async function confirmAddressOf(tx: Db, id: string): Promise<void> {
  await tx.update(user).set({ emailVerified: true, updatedAt: new Date() }).where(eq(user.id, id));
}
