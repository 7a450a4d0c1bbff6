import { invalid, Problem } from '../http/problem.ts';

/** What a form calls the fields that the sign-in library means. */
export interface FieldNames {
  password?: string;
  newPassword?: string;
}

interface Refusal {
  status: number;
  code: string | undefined;
  retryAfter: string | null;
  fields?: FieldNames;
}

const WRONG_PASSWORD = 'This is not the password of this account.';
const DEAD_LINK =
  'This link was used already, has run out, or is not whole. Ask for another, and open the latest mail.';

/** The sign-in library's refusal in our own form. */
export function fromAuth(refusal: Refusal): Problem {
  return fromCode(refusal) ?? fromStatus(refusal);
}

/** What each of its codes says, where it says more than its status. */
function fromCode({ code, fields = {} }: Refusal): Problem | null {
  const at = (pointer: string, detail: string) => invalid([{ pointer, detail }]);
  switch (code) {
    case 'INVALID_EMAIL':
      return at('/email', 'Write an e-mail address, such as name@example.org.');
    case 'PASSWORD_TOO_SHORT':
      return at(`/${fields.newPassword ?? 'password'}`, 'Use a longer password.');
    case 'PASSWORD_TOO_LONG':
      return at(`/${fields.newPassword ?? 'password'}`, 'Use a shorter password.');
    case 'INVALID_PASSWORD':
      return at(`/${fields.password ?? 'password'}`, WRONG_PASSWORD);
    case 'INVALID_EMAIL_OR_PASSWORD':
      return new Problem('signedOut', { detail: 'This address and this password do not belong together.' });
    case 'INVALID_TOKEN':
    case 'TOKEN_EXPIRED':
    case 'USER_NOT_FOUND':
      return at('/token', DEAD_LINK);
    case 'EMAIL_ALREADY_VERIFIED':
      return new Problem('conflict', { detail: 'This address is confirmed already.' });
    default:
      return fromSecondFactor(code);
  }
}

function fromSecondFactor(code: string | undefined): Problem | null {
  const at = (detail: string) => invalid([{ pointer: '/code', detail }]);
  switch (code) {
    case 'INVALID_CODE':
      return at('This code is not the one your authenticator shows now.');
    case 'INVALID_BACKUP_CODE':
      return at('This is none of your recovery codes, or it was used before.');
    case 'INVALID_TWO_FACTOR_COOKIE':
    case 'TOO_MANY_ATTEMPTS_REQUEST_NEW_CODE':
      return new Problem('signedOut', { detail: 'Begin again with your address and your password.' });
    case 'ACCOUNT_TEMPORARILY_LOCKED':
      return new Problem('tooMany', {
        detail: 'Too many codes were wrong. Try again in a quarter of an hour.',
      });
    case 'TOTP_ALREADY_ENABLED':
      return new Problem('conflict', { detail: 'Your second factor is on already.' });
    case 'TOTP_NOT_ENABLED':
    case 'TWO_FACTOR_NOT_ENABLED':
    case 'BACKUP_CODES_NOT_ENABLED':
      return new Problem('conflict', { detail: 'Your second factor is not on.' });
    default:
      return null;
  }
}

function fromStatus({ status, retryAfter }: Refusal): Problem {
  switch (status) {
    case 400:
      return new Problem('malformed');
    case 401:
      return new Problem('signedOut');
    case 403:
      return new Problem('foreignOrigin');
    case 404:
      return new Problem('notFound', { detail: 'There is nothing at this address.' });
    case 409:
      return new Problem('conflict', { detail: 'Another request was quicker. Try again.' });
    case 429:
      return tooMany(retryAfter ?? '60');
    default:
      return new Problem('failed', { detail: 'Signing in does not work just now. Try again in a moment.' });
  }
}

/** 429 with how long to wait. */
export function tooMany(seconds: string): Problem {
  return new Problem('tooMany', { detail: `Try again in ${seconds} seconds.` });
}

/** 422 for a link that works no more. */
export const deadLink = (): Problem => invalid([{ pointer: '/token', detail: DEAD_LINK }]);
