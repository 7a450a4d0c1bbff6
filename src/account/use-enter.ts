import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { request, requestNothing } from '../api/request.ts';
import { meSchema } from '../../shared/me.ts';
import { nextAddress } from './next-address.ts';
import { meQuery } from './queries.ts';

/** Signs in or up, then reads who that is before going on: the next page is loaded for somebody known. */
export function useEnter<Input>(path: '/api/auth/sign-in/email' | '/api/auth/sign-up/email') {
  const client = useQueryClient();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  return useMutation({
    mutationFn: (body: Input) => requestNothing(path, { method: 'POST', body }),
    onSuccess: async () => {
      client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== meQuery.queryKey[0] });
      client.setQueryData(meQuery.queryKey, await request('/api/me', meSchema));
      await navigate(nextAddress(search, window.location.origin), { replace: true });
    },
  });
}
