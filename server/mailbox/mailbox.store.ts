import { count, desc, eq, inArray } from 'drizzle-orm';
import type { MailboxEntry, MailboxMessage } from '../../shared/mailbox.ts';
import type { PageQuery } from '../../shared/paging.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { rowsOf } from '../http/paging.ts';
import { mailboxMessage } from './mailbox.table.ts';

/** How many mails the mailbox keeps; the oldest go. */
const KEPT = 500;

/** Keeps a mail, once for each of whom it is to. */
export async function keepMessage(
  db: Db,
  message: Omit<MailboxMessage, 'id' | 'receivedAt' | 'to'>,
  to: readonly string[],
): Promise<void> {
  const receivedAt = new Date();
  for (const address of to) {
    await db.insert(mailboxMessage).values({ ...message, to: address, id: newId(), receivedAt });
  }
  const old = await db
    .select({ id: mailboxMessage.id })
    .from(mailboxMessage)
    .orderBy(desc(mailboxMessage.receivedAt), desc(mailboxMessage.id))
    .limit(100)
    .offset(KEPT);
  if (old.length === 0) return;
  const ids = old.map(({ id }) => id);
  await db.delete(mailboxMessage).where(inArray(mailboxMessage.id, ids));
}

/** The mailbox, the latest received first, and how many there are. */
export async function listMessages(
  db: Db,
  query: PageQuery,
): Promise<{ messages: MailboxEntry[]; total: number }> {
  const { limit, offset } = rowsOf(query);
  const { id, to, subject, receivedAt } = mailboxMessage;
  const rows = await db
    .select({ id, to, subject, receivedAt })
    .from(mailboxMessage)
    .orderBy(desc(receivedAt), desc(id))
    .limit(limit)
    .offset(offset);
  const [counted] = await db.select({ total: count() }).from(mailboxMessage);
  const messages = rows.map((row) => ({ ...row, receivedAt: row.receivedAt.toISOString() }));
  return { messages, total: counted?.total ?? 0 };
}

export async function findMessage(db: Db, id: string): Promise<MailboxMessage | null> {
  const [row] = await db.select().from(mailboxMessage).where(eq(mailboxMessage.id, id));
  return row === undefined ? null : { ...row, receivedAt: row.receivedAt.toISOString() };
}
