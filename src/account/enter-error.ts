import { ProblemError } from '../api/problem-error.ts';
import { failureWords } from '../ui/use-server-errors.ts';

const TOO_MANY = 'There were too many attempts from here. Wait a minute, then try again.';

/** Why signing in failed. Whether the address or the password was wrong is not told: that would tell who has an account. */
export function signInWords(error: unknown): string {
  const status = error instanceof ProblemError ? error.status : null;
  if (status === 401)
    return 'This e-mail address and password do not belong together. Check both and try again.';
  if (status === 429) return TOO_MANY;
  return failureWords(error);
}

/** Why signing up failed. */
export function signUpWords(error: unknown): string {
  const status = error instanceof ProblemError ? error.status : null;
  if (status === 429) return TOO_MANY;
  if (status === 422 || status === 409) {
    return 'There is an account with this e-mail address already. Sign in instead, or use another address.';
  }
  return failureWords(error);
}
