import type { Config } from '../config.ts';
import { mustSucceed } from '../db/ambient.ts';
import type { Db } from '../db/client.ts';
import type { Letter } from '../mail/letter.ts';
import { writeMail } from '../mail/outbox.store.ts';
import { claimsOf } from './link-claims.ts';
import {
  accountThere,
  confirmAddress,
  confirmNewAddress,
  passwordChanged,
  resetPassword,
} from './letters.ts';
import { CONFIRM_HOURS, RESET_HOURS } from './letters.ts';
import { addressKey, forgetCount } from './limits.store.ts';
import { forgetLinks } from './spent.store.ts';

export const CONFIRM_SECONDS = CONFIRM_HOURS * 3600;
export const RESET_SECONDS = RESET_HOURS * 3600;

interface Owner {
  id: string;
  name: string;
  email: string;
}

/**
 * What the sign-in library calls when something is to be mailed: a row in the outbox. It swallows what goes wrong here, and
 * an account without its mail would be half a thing: so the transaction around is made to fail.
 */
export function accountMail(db: Db, { mailFrom, appUrl }: Pick<Config, 'mailFrom' | 'appUrl'>) {
  const write = (owner: Owner, kind: string, letter: Letter, usefulSeconds?: number) =>
    mustSucceed(() =>
      writeMail(db, mailFrom, {
        to: owner.email,
        userId: owner.id,
        kind,
        letter,
        ...(usefulSeconds === undefined ? {} : { usefulUntil: new Date(Date.now() + usefulSeconds * 1000) }),
      }),
    );
  const about = ({ name }: Owner) => ({ name, appUrl });
  return {
    /** For the first address of an account and for another one: the token says which. */
    sendConfirm: ({ user, token }: { user: Owner; token: string }): Promise<void> => {
      const isNew = claimsOf(token)?.updateTo !== undefined;
      const letter = isNew ? confirmNewAddress(about(user), token) : confirmAddress(about(user), token);
      return write(user, isNew ? 'confirm-new-address' : 'confirm-address', letter, CONFIRM_SECONDS);
    },
    sendReset: ({ user, token }: { user: Owner; token: string }): Promise<void> =>
      write(user, 'reset-password', resetPassword(about(user), token), RESET_SECONDS),
    sendAccountThere: ({ user }: { user: Owner }): Promise<void> =>
      write(user, 'account-there', accountThere(about(user))),
    afterReset: async ({ user }: { user: Owner }): Promise<void> => {
      await mustSucceed(() => forgetLinks(db, user.id));
      // Whoever has a new password is let in by it at once, however many wrong ones came before.
      await mustSucceed(() => forgetCount(db, addressKey('sign-in', user.email)));
      await write(user, 'password-changed', passwordChanged(about(user)));
    },
  };
}
