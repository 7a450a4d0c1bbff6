import type { Config } from '../config.ts';
import type { Db } from '../db/client.ts';
import { found } from '../http/problem.ts';
import type { Letter } from '../mail/letter.ts';
import { writeMail } from '../mail/outbox.store.ts';
import { findAccount } from './account.store.ts';

/** Tells the owner of an account what was done with it, in the transaction in which it is done. */
export async function mailToOwner(
  tx: Db,
  { appUrl, mailFrom }: Pick<Config, 'appUrl' | 'mailFrom'>,
  userId: string,
  kind: string,
  say: (about: { name: string; appUrl: string }) => Letter,
): Promise<void> {
  const { email, name } = found(await findAccount(tx, userId), 'account');
  await writeMail(tx, mailFrom, { to: email, userId, kind, letter: say({ name, appUrl }) });
}
