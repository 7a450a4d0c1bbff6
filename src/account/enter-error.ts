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

/** Why a code did not let somebody in, where it is not the code itself. */
export function codeWords(error: unknown): string {
  if (!(error instanceof ProblemError)) return failureWords(error);
  if (error.status === 401)
    return 'Too much time has passed, or too many codes were tried. Begin again with the password.';
  if (error.status === 429) return `There were too many wrong codes. ${error.problem.detail ?? ''}`.trim();
  return failureWords(error);
}

/** Why a link of a mail did not work: what the server says of its token, or of the rest. */
export function linkWords(error: unknown): string {
  const token = error instanceof ProblemError && error.fields.find(({ pointer }) => pointer === '/token');
  return token ? token.detail : failureWords(error);
}
