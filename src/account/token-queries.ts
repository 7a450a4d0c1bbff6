import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { accessTokenSchema, newTokenSchema, type TokenInput } from '../../shared/tokens/tokens.schema.ts';
import { request, requestNothing } from '../api/request.ts';

export const tokensQuery = queryOptions({
  queryKey: ['tokens'],
  queryFn: ({ signal }) =>
    request('/api/tokens', z.object({ items: z.array(accessTokenSchema) }), { signal }),
});

function useTokenMutation<Input, Output>(act: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: act,
    onSuccess: () => client.invalidateQueries({ queryKey: tokensQuery.queryKey }),
  });
}

export const useMakeToken = () =>
  useTokenMutation((body: TokenInput) => request('/api/tokens', newTokenSchema, { method: 'POST', body }));

export const useWithdrawToken = () =>
  useTokenMutation((tokenId: string) => requestNothing(`/api/tokens/${tokenId}`, { method: 'DELETE' }));
