import { ProblemError } from '../api/problem-error.ts';
import { failureWords } from '../ui/use-server-errors.ts';

/**
 * Why signing in or up failed, where no field is to blame. Whether the address or the password was wrong is not told:
 * that would tell who has an account.
 */
export function enterWords(error: unknown): string {
  if (!(error instanceof ProblemError)) return failureWords(error);
  if (error.status === 401) {
    return 'This e-mail address and password do not belong together. Check both and try again.';
  }
  if (error.status === 429)
    return `There were too many attempts from here. ${error.problem.detail ?? ''}`.trim();
  return failureWords(error);
}
