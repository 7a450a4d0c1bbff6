import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { pageOf } from '../../shared/paging.ts';
import {
  importDraftSchema,
  importDraftSummarySchema,
  type DraftDetails,
  type ImportDraft,
  type ImportPatch,
  type TableRole,
} from '../../shared/patterns/imports.schema.ts';
import {
  patternRevisionSchema,
  patternSchema,
  patternSummarySchema,
  type PatternInput,
} from '../../shared/patterns/patterns.schema.ts';
import { request, requestNothing } from '../api/request.ts';

export const patternsQuery = (page = 1, q = '') =>
  queryOptions({
    queryKey: ['patterns', 'list', { page, q }],
    queryFn: ({ signal }) =>
      request(
        `/api/patterns?${new URLSearchParams({ page: String(page), ...(q ? { q } : {}) }).toString()}`,
        pageOf(patternSummarySchema),
        { signal },
      ),
  });

export const patternQuery = (patternId: string) =>
  queryOptions({
    queryKey: ['patterns', 'one', patternId],
    queryFn: ({ signal }) => request(`/api/patterns/${patternId}`, patternSchema, { signal }),
  });

export const revisionsQuery = (patternId: string, page = 1) =>
  queryOptions({
    queryKey: ['patterns', 'revisions', patternId, { page }],
    queryFn: ({ signal }) =>
      request(`/api/patterns/${patternId}/revisions?page=${page}`, pageOf(patternRevisionSchema), { signal }),
  });

export const revisionQuery = (revisionId: string) =>
  queryOptions({
    queryKey: ['patterns', 'revision', revisionId],
    queryFn: ({ signal }) =>
      request(`/api/pattern-revisions/${revisionId}`, patternRevisionSchema, { signal }),
  });

export const draftsQuery = (page = 1) =>
  queryOptions({
    queryKey: ['imports', 'list', { page }],
    queryFn: ({ signal }) =>
      request(`/api/imports?page=${page}`, pageOf(importDraftSummarySchema), { signal }),
  });

export const draftQuery = (draftId: string) =>
  queryOptions({
    queryKey: ['imports', 'one', draftId],
    queryFn: ({ signal }) => request(`/api/imports/${draftId}`, importDraftSchema, { signal }),
  });

function usePatternMutation<Input, Output>(act: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: act,
    onSuccess: () => client.invalidateQueries({ queryKey: ['patterns'] }),
  });
}

/** Every change of a draft answers the draft as it now reads: no second request is needed. */
function useDraftMutation<Input>(act: (input: Input) => Promise<ImportDraft>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: act,
    onSuccess: (draft) => {
      client.setQueryData(draftQuery(draft.id).queryKey, draft);
      return client.invalidateQueries({ queryKey: ['imports', 'list'] });
    },
  });
}

export const useUpdatePattern = (patternId: string) =>
  usePatternMutation((body: Partial<PatternInput>) =>
    request(`/api/patterns/${patternId}`, patternSchema, { method: 'PATCH', body }),
  );

export const useDeletePattern = () =>
  usePatternMutation((patternId: string) =>
    requestNothing(`/api/patterns/${patternId}`, { method: 'DELETE' }),
  );

export const useStartImport = () =>
  useDraftMutation((body: { patternId?: string; details?: DraftDetails }) =>
    request('/api/imports', importDraftSchema, { method: 'POST', body }),
  );

export const useChangeImport = (draftId: string) =>
  useDraftMutation((body: ImportPatch) =>
    request(`/api/imports/${draftId}`, importDraftSchema, { method: 'PATCH', body }),
  );

export const useUploadTable = (draftId: string) =>
  useDraftMutation(({ role, file }: { role: TableRole; file: File }) => {
    const body = new FormData();
    body.append('file', file);
    return request(`/api/imports/${draftId}/tables/${role}`, importDraftSchema, { method: 'PUT', body });
  });

export const useRemoveTable = (draftId: string) =>
  useDraftMutation((role: TableRole) =>
    request(`/api/imports/${draftId}/tables/${role}`, importDraftSchema, { method: 'DELETE' }),
  );

export const useCommitImport = (draftId: string) =>
  usePatternMutation(() =>
    request(`/api/imports/${draftId}/commit`, z.object({ patternId: z.uuid(), revisionId: z.uuid() }), {
      method: 'POST',
    }),
  );

export function useDiscardImport() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (draftId: string) => requestNothing(`/api/imports/${draftId}`, { method: 'DELETE' }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['imports'] }),
  });
}
