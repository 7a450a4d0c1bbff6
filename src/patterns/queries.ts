import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import type { GarmentKind } from '../../shared/fit/fit-words.ts';
import { pageOf } from '../../shared/paging.ts';
import { comparisonSchema } from '../../shared/patterns/comparison.schema.ts';
import type { NewPattern, TableEdit } from '../../shared/patterns/edits.schema.ts';
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

export const patternsQuery = (page = 1, q = '', kind: GarmentKind | null = null) =>
  queryOptions({
    queryKey: ['patterns', 'list', { page, q, kind }],
    queryFn: ({ signal }) => {
      const asked = { page: String(page), ...(q ? { q } : {}), ...(kind ? { kind } : {}) };
      return request(`/api/patterns?${new URLSearchParams(asked).toString()}`, pageOf(patternSummarySchema), {
        signal,
      });
    },
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

export const comparisonQuery = (fromId: string, toId: string) =>
  queryOptions({
    queryKey: ['patterns', 'comparison', fromId, toId],
    queryFn: ({ signal }) =>
      request(`/api/pattern-revisions/${fromId}/compare?with=${toId}`, comparisonSchema, { signal }),
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

/**
 * Every change of a draft answers the draft as it now reads: no second request is needed. Changes of one draft are sent
 * one after the other (`scope`), so that the answer of an earlier one never stands over a later one's.
 */
function useDraftMutation<Input>(draftId: string, act: (input: Input) => Promise<ImportDraft>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: act,
    scope: { id: `import ${draftId}` },
    onMutate: () => client.cancelQueries({ queryKey: draftQuery(draftId).queryKey }),
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

export const useSaveTable = (patternId: string) =>
  usePatternMutation((body: TableEdit) =>
    request(`/api/patterns/${patternId}/revisions`, patternRevisionSchema, { method: 'POST', body }),
  );

export const useTypePattern = () =>
  usePatternMutation((body: NewPattern) => request('/api/patterns', patternSchema, { method: 'POST', body }));

export const useCopyPattern = (patternId: string) =>
  usePatternMutation(() => request(`/api/patterns/${patternId}/copy`, patternSchema, { method: 'POST' }));

/** What shows the pattern stands until the page is left: asking for it again would find nothing. */
export function useDeletePattern() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (patternId: string) => requestNothing(`/api/patterns/${patternId}`, { method: 'DELETE' }),
    onSuccess: () => {
      client.removeQueries({ queryKey: ['patterns', 'list'] });
      // Its unfinished imports and its saved plans went with it.
      client.removeQueries({ queryKey: ['imports'] });
      client.removeQueries({ queryKey: ['plans'] });
    },
  });
}

/** Asked for by a loader: a draft is on the server before its page is drawn. */
export const startImport = (body: { patternId?: string; details?: DraftDetails }) =>
  request('/api/imports', importDraftSchema, { method: 'POST', body });

export const useChangeImport = (draftId: string) =>
  useDraftMutation(draftId, (body: ImportPatch) =>
    request(`/api/imports/${draftId}`, importDraftSchema, { method: 'PATCH', body }),
  );

export const useUploadTable = (draftId: string) =>
  useDraftMutation(draftId, ({ role, file }: { role: TableRole; file: File }) => {
    const body = new FormData();
    body.append('file', file);
    return request(`/api/imports/${draftId}/tables/${role}`, importDraftSchema, { method: 'PUT', body });
  });

export const useRemoveTable = (draftId: string) =>
  useDraftMutation(draftId, (role: TableRole) =>
    request(`/api/imports/${draftId}/tables/${role}`, importDraftSchema, { method: 'DELETE' }),
  );

/** The draft itself stays in the cache until its page is left: asking for it again would find nothing. */
export function useCommitImport(draftId: string) {
  const client = useQueryClient();
  const answer = z.object({ patternId: z.uuid(), revisionId: z.uuid() });
  return useMutation({
    scope: { id: `import ${draftId}` },
    mutationFn: () => request(`/api/imports/${draftId}/commit`, answer, { method: 'POST' }),
    onSuccess: () => {
      client.removeQueries({ queryKey: ['imports', 'list'] });
      client.removeQueries({ queryKey: ['patterns'] });
    },
  });
}

export function useDiscardImport() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (draftId: string) => requestNothing(`/api/imports/${draftId}`, { method: 'DELETE' }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['imports', 'list'] }),
  });
}
