import { useMutation } from '@tanstack/react-query';
import { requestNothing } from '../api/request.ts';
import { paths } from '../paths.ts';

/**
 * Ends the session. Measurements are private, so everything read or typed in it goes too: what a tab kept, and, by
 * loading the front page anew, what is in memory.
 */
export function useSignOut() {
  return useMutation({
    mutationFn: () => requestNothing('/api/auth/sign-out', { method: 'POST', body: {} }),
    onSuccess: () => {
      sessionStorage.clear();
      window.location.assign(paths.home);
    },
  });
}
