import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { pageOf } from '../../shared/paging.ts';
import {
  fitAnswerSchema,
  savedPlanSchema,
  savedPlanSummarySchema,
  type FitRequest,
  type SavedPlanInput,
} from '../../shared/plans/plans.schema.ts';
import { request, requestNothing } from '../api/request.ts';

/** The server's own plan: the browser's is only instant. */
export const fitQuery = (body: FitRequest) =>
  queryOptions({
    queryKey: ['fit', body],
    queryFn: ({ signal }) => request('/api/fit', fitAnswerSchema, { method: 'POST', body, signal }),
    staleTime: 60_000,
  });

export const plansQuery = (page = 1, q = '') =>
  queryOptions({
    queryKey: ['plans', 'list', { page, q }],
    queryFn: ({ signal }) =>
      request(
        `/api/plans?${new URLSearchParams({ page: String(page), ...(q ? { q } : {}) }).toString()}`,
        pageOf(savedPlanSummarySchema),
        { signal },
      ),
  });

export const planQuery = (planId: string) =>
  queryOptions({
    queryKey: ['plans', 'one', planId],
    queryFn: ({ signal }) => request(`/api/plans/${planId}`, savedPlanSchema, { signal }),
  });

function usePlanMutation<Input, Output>(act: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({ mutationFn: act, onSuccess: () => client.invalidateQueries({ queryKey: ['plans'] }) });
}

export const useSavePlan = () =>
  usePlanMutation((body: SavedPlanInput) => request('/api/plans', savedPlanSchema, { method: 'POST', body }));

export const useRenamePlan = (planId: string) =>
  usePlanMutation((body: { name: string }) =>
    request(`/api/plans/${planId}`, savedPlanSchema, { method: 'PATCH', body }),
  );

export const useDeletePlan = () =>
  usePlanMutation((planId: string) => requestNothing(`/api/plans/${planId}`, { method: 'DELETE' }));
