import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { pageOf } from '../../shared/paging.ts';
import {
  measurementSetSchema,
  personSchema,
  type MeasurementSetInput,
  type PersonInput,
} from '../../shared/people/people.schema.ts';
import { request, requestNothing } from '../api/request.ts';

export const peopleQuery = (page = 1, q = '') =>
  queryOptions({
    queryKey: ['people', 'list', { page, q }],
    queryFn: ({ signal }) =>
      request(
        `/api/people?${new URLSearchParams({ page: String(page), ...(q ? { q } : {}) }).toString()}`,
        pageOf(personSchema),
        { signal },
      ),
  });

export const personQuery = (personId: string) =>
  queryOptions({
    queryKey: ['people', 'one', personId],
    queryFn: ({ signal }) => request(`/api/people/${personId}`, personSchema, { signal }),
  });

export const measurementSetsQuery = (personId: string, page = 1) =>
  queryOptions({
    queryKey: ['people', 'sets', personId, { page }],
    queryFn: ({ signal }) =>
      request(`/api/people/${personId}/measurement-sets?page=${page}`, pageOf(measurementSetSchema), {
        signal,
      }),
  });

export const measurementSetQuery = (setId: string) =>
  queryOptions({
    queryKey: ['people', 'set', setId],
    queryFn: ({ signal }) => request(`/api/measurement-sets/${setId}`, measurementSetSchema, { signal }),
  });

/** Everything that changes people makes every list of them stale. */
function usePeopleMutation<Input, Output>(act: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: act,
    onSuccess: () => client.invalidateQueries({ queryKey: ['people'] }),
  });
}

export const useCreatePerson = () =>
  usePeopleMutation((body: PersonInput) => request('/api/people', personSchema, { method: 'POST', body }));

export const useUpdatePerson = (personId: string) =>
  usePeopleMutation((body: Partial<PersonInput>) =>
    request(`/api/people/${personId}`, personSchema, { method: 'PATCH', body }),
  );

export const useDeletePerson = () =>
  usePeopleMutation((personId: string) => requestNothing(`/api/people/${personId}`, { method: 'DELETE' }));

export const useTakeMeasurements = (personId: string) =>
  usePeopleMutation((body: MeasurementSetInput) =>
    request(`/api/people/${personId}/measurement-sets`, measurementSetSchema, { method: 'POST', body }),
  );

export const useDeleteMeasurementSet = () =>
  usePeopleMutation((setId: string) =>
    requestNothing(`/api/measurement-sets/${setId}`, { method: 'DELETE' }),
  );
