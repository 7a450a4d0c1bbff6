import { queryOptions } from '@tanstack/react-query';
import { request } from '../api/request.ts';
import { documentSchema } from './document.schema.ts';

/** The server's own description of what can be asked of it; it changes with the version only. */
export const interfaceQuery = queryOptions({
  queryKey: ['interface'],
  queryFn: ({ signal }) => request('/api/openapi.json', documentSchema, { signal }),
  staleTime: Infinity,
});
