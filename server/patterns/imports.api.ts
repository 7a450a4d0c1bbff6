import { z } from 'zod';
import { pageOf, pageQuerySchema } from '../../shared/paging.ts';
import {
  draftDetailsSchema,
  importDraftSchema,
  importDraftSummarySchema,
  importIssueSchema,
  importPatchSchema,
  importTableSchema,
  TABLE_ROLES,
} from '../../shared/patterns/imports.schema.ts';
import type { NounDescription } from '../http/describe.ts';

export const startSchema = z.object({
  patternId: z.uuid().optional(),
  details: draftDetailsSchema.optional(),
});
export const tableRoleSchema = z.enum(TABLE_ROLES);
export const committedSchema = z.object({ patternId: z.uuid(), revisionId: z.uuid() });

/** The field of the form in which a table's file comes. */
export const FILE_FIELD = 'file';

const reading = { who: 'member', scope: 'patterns:read' } as const;
const writing = { who: 'member', scope: 'patterns:write' } as const;

export const importsApi: NounDescription = {
  noun: 'Imports',
  schemas: {
    ImportDraft: importDraftSchema,
    ImportTable: importTableSchema,
    ImportIssue: importIssueSchema,
    ImportPatch: importPatchSchema,
    Committed: committedSchema,
  },
  routes: {
    'GET /api/imports': {
      ...reading,
      summary: 'List your imports that are not committed yet',
      query: pageQuerySchema,
      answers: { 200: pageOf(importDraftSummarySchema) },
    },
    'POST /api/imports': {
      ...writing,
      summary: 'Begin an import of a new pattern, or of new tables for one of yours',
      body: startSchema,
      answers: { 201: importDraftSchema },
      problems: ['notFound'],
    },
    'GET /api/imports/:id': {
      ...reading,
      summary: 'Read an import: both tables as understood, and what still stands in the way',
      answers: { 200: importDraftSchema },
    },
    'PATCH /api/imports/:id': {
      ...writing,
      summary: 'Change an import’s details or correct how a table is read; what is not sent stays',
      body: importPatchSchema,
      answers: { 200: importDraftSchema },
    },
    'DELETE /api/imports/:id': {
      ...writing,
      summary: 'Discard an import with its files',
      answers: { 204: 'nothing' },
    },
    'PUT /api/imports/:id/tables/:role': {
      ...writing,
      summary: 'Bring the file of one table: CSV or tab-separated text, at most 5 MB',
      params: { role: tableRoleSchema },
      body: { fileField: FILE_FIELD },
      answers: { 200: importDraftSchema },
    },
    'DELETE /api/imports/:id/tables/:role': {
      ...writing,
      summary: 'Take one table out of an import',
      params: { role: tableRoleSchema },
      answers: { 200: importDraftSchema },
    },
    'POST /api/imports/:id/commit': {
      ...writing,
      summary: 'Make the import a pattern or a new revision: whole, or not at all',
      answers: { 201: committedSchema },
      problems: ['conflict', 'invalid'],
    },
  },
};
