import type { FieldProblem } from '../../shared/problem.ts';
import { Problem } from '../http/problem.ts';

/** The sign-in library's codes, where they belong to a field of the form. */
const FIELDS: Record<string, FieldProblem> = {
  USER_ALREADY_EXISTS: {
    pointer: '/email',
    detail: 'There is an account with this address already: sign in instead.',
  },
  USER_ALREADY_EXISTS_USE_ANOTHER_EMAIL: {
    pointer: '/email',
    detail: 'There is an account with this address already: sign in instead.',
  },
  INVALID_EMAIL: { pointer: '/email', detail: 'Write an e-mail address, such as name@example.org.' },
  PASSWORD_TOO_SHORT: { pointer: '/password', detail: 'Use a longer password.' },
  PASSWORD_TOO_LONG: { pointer: '/password', detail: 'Use a shorter password.' },
};

/** The sign-in library's refusal in our own form. */
export function fromAuth(status: number, code: string | undefined, retryAfter: string | null): Problem {
  const field = code === undefined ? undefined : FIELDS[code];
  if (field !== undefined) return new Problem('invalid', { errors: [field] });
  if (code === 'INVALID_EMAIL_OR_PASSWORD') {
    return new Problem('signedOut', { detail: 'This address and this password do not belong together.' });
  }
  switch (status) {
    case 400:
      return new Problem('malformed');
    case 401:
      return new Problem('signedOut');
    case 403:
      return new Problem('foreignOrigin');
    case 404:
      return new Problem('notFound', { detail: 'There is nothing at this address.' });
    case 429:
      return new Problem('tooMany', { detail: `Try again in ${retryAfter ?? '60'} seconds.` });
    default:
      return new Problem('failed', { detail: 'Signing in does not work just now. Try again in a moment.' });
  }
}
