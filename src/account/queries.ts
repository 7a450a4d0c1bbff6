import { queryOptions } from '@tanstack/react-query';
import { request } from '../api/request.ts';
import { meSchema } from '../../shared/me.ts';

/** Who is signed in, or nobody. */
export const meQuery = queryOptions({
  queryKey: ['me'],
  queryFn: ({ signal }) => request('/api/me', meSchema, { signal }),
  staleTime: 60_000,
});
