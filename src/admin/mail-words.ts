import type { AdminMail } from '../../shared/admin/mail.schema.ts';
import { printMoment } from '../ui/moment.ts';

const KINDS = new Map([
  ['confirm-address', 'Confirm an address'],
  ['confirm-new-address', 'Confirm another address'],
  ['address-changed', 'The address was changed'],
  ['reset-password', 'Choose a new password'],
  ['password-changed', 'The password was changed'],
  ['account-there', 'There is an account already'],
  ['second-factor-on', 'The second factor is on'],
  ['second-factor-off', 'The second factor is off'],
  ['recovery-codes', 'New recovery codes'],
  ['teacher-accepted', 'A request to teach was accepted'],
  ['teacher-declined', 'A request to teach was declined'],
]);

/** What a mail is about; a kind that this page does not know yet is shown as it is kept. */
export const sayMailKind = (kind: string): string => KINDS.get(kind) ?? kind.replaceAll('-', ' ');

/** What became of a mail, or when it is tried next. */
export function sayMailState({ state, attempts, nextAt, sentAt }: AdminMail): string {
  const tried = attempts === 0 ? 'not tried yet' : attempts === 1 ? 'tried once' : `tried ${attempts} times`;
  if (state === 'sent') return sentAt === null ? 'Sent' : `Sent ${printMoment(sentAt)}`;
  if (state === 'sending') return `Being sent, ${tried}`;
  if (state === 'failed') return `Given up, ${tried}`;
  return `Next try ${printMoment(nextAt)}, ${tried}`;
}

const CODES: readonly [RegExp, string][] = [
  [/^ECONNREFUSED|^ECONNECTION|^ESOCKET/, 'The mail server did not answer'],
  [/^ETIMEDOUT/, 'The mail server took too long'],
  [/^EDNS|^ENOTFOUND/, 'The mail server’s name was not found'],
  [/^EAUTH/, 'The mail server refused our sign-in'],
  [/^EENVELOPE/, 'The mail server refused the address'],
  [/^EMESSAGE/, 'The mail server refused the message'],
  [/^ETLS/, 'The connection could not be encrypted'],
];

/** Why the last try failed, in words with the code beside them. */
export function sayMailError(code: string): string {
  const words = CODES.find(([pattern]) => pattern.test(code))?.[1];
  return words === undefined ? code : `${words} (${code})`;
}
