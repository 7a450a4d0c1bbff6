import type { AdminMail } from '../../shared/admin/mail.schema.ts';
import type { Db } from '../db/client.ts';
import { inTransaction } from '../db/transaction.ts';
import { found, Problem } from '../http/problem.ts';
import { findMail, retryMail, type ListedMail } from '../mail/outbox.store.ts';
import { logAct } from './log.store.ts';

const THING = 'mail';

export const toAdminMail = (mail: ListedMail): AdminMail => ({
  ...mail,
  nextAt: mail.nextAt.toISOString(),
  createdAt: mail.createdAt.toISOString(),
  sentAt: mail.sentAt?.toISOString() ?? null,
});

/** Sends a mail on its way again and writes it into the log; what is about to go anyway is left alone. */
export async function retryAndLog(db: Db, actorId: string, id: string): Promise<AdminMail> {
  await inTransaction(db, async (tx) => {
    const mail = found(await findMail(tx, id), THING);
    if (mail.state === 'sending' || (mail.state === 'waiting' && mail.nextAt.getTime() <= Date.now())) return;
    if (!(await retryMail(tx, id))) {
      throw new Problem('conflict', { detail: 'This mail has gone out already.' });
    }
    await logAct(tx, { actorId, action: 'mailRetried', detail: { mailId: id } });
  });
  return toAdminMail(found(await findMail(db, id), THING));
}
