import type { Account } from '../../shared/account-answers.ts';

/** What of an account can be changed in its sentence. */
export const CHANGES = ['name', 'email', 'password', 'second-factor'] as const;
export type Change = (typeof CHANGES)[number];

/** Reads what an address asks to be opened; nonsense opens nothing. */
export const readChange = (search: URLSearchParams): Change | null =>
  CHANGES.find((change) => change === search.get('change')) ?? null;

interface AccountSentenceProps {
  account: Account;
  open: Change | null;
  onOpen: (change: Change) => void;
}

/** The account as one says it; every word with the dashed line opens what changes it. */
export function AccountSentence({ account, open, onOpen }: AccountSentenceProps) {
  const word = (change: Change, text: string, what: string) => (
    <button
      type="button"
      id={`word-${change}`}
      aria-expanded={open === change}
      aria-controls={open === change ? `change-${change}` : undefined}
      onClick={() => onOpen(change)}
      className="inline max-w-full text-left font-semibold break-words text-ink hover:text-woad"
    >
      <span className="sr-only">Change {what}: </span>
      <span className={`changeable ${open === change ? 'border-solid' : ''}`}>{text}</span>
    </button>
  );
  const { name, email, emailVerified, twoFactorEnabled } = account;
  return (
    <p className="mt-5 max-w-[46rem] text-section leading-[1.75] text-ink-2">
      You are {word('name', name, 'your name')}, reached at {word('email', email, 'your e-mail address')}
      {emailVerified ? ', which is confirmed' : ', which is not confirmed yet'}. You sign in with{' '}
      {word('password', 'a password', 'your password')} and{' '}
      {word(
        'second-factor',
        twoFactorEnabled ? 'a code from your phone' : 'nothing besides',
        'your second factor',
      )}
      .
    </p>
  );
}
