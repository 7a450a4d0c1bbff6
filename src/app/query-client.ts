import { QueryClient } from '@tanstack/react-query';
import { ProblemError } from '../api/problem-error.ts';

/** What the server has refused stays refused; only a missing or failing server is worth asking again. */
function isWorthRetrying(failures: number, error: unknown): boolean {
  if (!(error instanceof ProblemError)) return false;
  return failures < 2 && (error.status === 0 || error.status >= 500);
}

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      // Offline is a failure that is shown, not a wait without end.
      queries: { staleTime: 30_000, retry: isWorthRetrying, retryDelay: 400, networkMode: 'always' },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}
