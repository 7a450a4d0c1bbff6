import { asc, eq } from 'drizzle-orm';
import type { Db } from '../../server/db/client.ts';
import type { Letter } from '../../server/mail/letter.ts';
import { outbox } from '../../server/mail/mail.table.ts';

/** The mail written to an address and not sent yet, the first first. */
export async function mailTo(db: Db, to: string): Promise<{ kind: string; letter: Letter }[]> {
  const rows = await db.select().from(outbox).where(eq(outbox.to, to)).orderBy(asc(outbox.id));
  return rows.flatMap(({ kind, payload }) => (payload === null ? [] : [{ kind, letter: payload }]));
}

/** The token of the link in the last mail of a kind to an address. */
export async function tokenIn(db: Db, to: string, kind: string): Promise<string> {
  const mail = (await mailTo(db, to)).filter((one) => one.kind === kind).at(-1);
  const token = new URL(mail?.letter.link?.url ?? 'http://none').searchParams.get('token');
  if (token === null) throw new Error(`No mail of the kind ${kind} with a link went to ${to}.`);
  return token;
}
