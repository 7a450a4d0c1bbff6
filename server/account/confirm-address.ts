import type { Request } from 'express';
import type { Db } from '../db/client.ts';
import { invalid } from '../http/problem.ts';
import { writeMail } from '../mail/outbox.store.ts';
import { confirmAddressOf, findAccount, isAddressTaken } from './account.store.ts';
import { ask } from './ask.ts';
import type { AuthRouteDeps } from './auth-deps.ts';
import { deadLink } from './auth-problem.ts';
import { addressChanged } from './letters.ts';
import { claimsOf, type LinkClaims } from './link-claims.ts';
import { forgetLinks, spend } from './spent.store.ts';

/**
 * Confirms the address that a link was mailed to, and answers it. The link is spent and, where the address is a new one, the
 * old one told, all in the same transaction.
 */
export async function confirmAddress(
  tx: Db,
  { auth, config }: Pick<AuthRouteDeps, 'auth' | 'config'>,
  request: Request,
  token: string,
): Promise<string> {
  const claims = claimsOf(token);
  const before = claims && (await findAccount(tx, claims.userId));
  if (!claims || !before) throw deadLink();
  if (claims.updateTo !== undefined && before.email === claims.email) {
    if (await isAddressTaken(tx, claims.updateTo)) {
      throw invalid([{ pointer: '/token', detail: 'By now this address belongs to another account.' }]);
    }
  }
  const path = `/verify-email?token=${encodeURIComponent(token)}`;
  await ask(auth, request, { method: 'GET', path, withoutSession: true });
  // From here on the library has checked what the token claims.
  if (!(await spend(tx, claims.userId, token, new Date(claims.exp * 1000)))) throw deadLink();
  if (claims.updateTo !== undefined) await afterChange(tx, config, claims, before.name);
  return claims.updateTo ?? claims.email;
}

async function afterChange(
  tx: Db,
  { appUrl, mailFrom }: AuthRouteDeps['config'],
  { userId, email }: LinkClaims,
  name: string,
): Promise<void> {
  // The link reached the new address, so that one is confirmed whatever the old one was.
  await confirmAddressOf(tx, userId);
  await forgetLinks(tx, userId);
  const letter = addressChanged({ name, appUrl });
  await writeMail(tx, mailFrom, { to: email, userId, kind: 'address-changed', letter });
}
