import { pageOf, pageQuerySchema } from '../../shared/paging.ts';
import {
  patternInputSchema,
  patternRevisionSchema,
  patternSchema,
  patternSummarySchema,
  patternTableSchema,
  storedFileSchema,
} from '../../shared/patterns/patterns.schema.ts';
import type { NounDescription, RouteDescription } from '../http/describe.ts';
import { listQuerySchema } from '../http/paging.ts';

export const patternQuerySchema = listQuerySchema.extend({ kind: patternInputSchema.shape.kind.optional() });

const reading = { who: 'member', scope: 'patterns:read' } as const;
const writing = { who: 'member', scope: 'patterns:write' } as const;

const csv = (table: string): RouteDescription => ({
  ...reading,
  summary: `Take a revision’s ${table} away as CSV; it comes in again to the same numbers`,
  answers: { 200: { mediaType: 'text/csv' } },
});

export const patternsApi: NounDescription = {
  noun: 'Patterns and revisions',
  schemas: {
    PatternInput: patternInputSchema,
    Pattern: patternSchema,
    PatternSummary: patternSummarySchema,
    PatternRevision: patternRevisionSchema,
    PatternTable: patternTableSchema,
    StoredFile: storedFileSchema,
  },
  routes: {
    'GET /api/patterns': {
      ...reading,
      summary: 'List your patterns',
      query: patternQuerySchema,
      answers: { 200: pageOf(patternSummarySchema) },
    },
    'GET /api/patterns/:id': {
      ...reading,
      summary: 'Read a pattern with its latest tables',
      answers: { 200: patternSchema },
    },
    'PATCH /api/patterns/:id': {
      ...writing,
      summary: 'Change what is written of a pattern beside its tables; what is not sent stays',
      body: patternInputSchema.partial(),
      answers: { 200: patternSchema },
    },
    'DELETE /api/patterns/:id': {
      ...writing,
      summary: 'Delete a pattern that no saved plan refers to, with its revisions and files',
      answers: { 204: 'nothing' },
      problems: ['conflict'],
    },
    'GET /api/patterns/:id/revisions': {
      ...reading,
      summary: 'List a pattern’s revisions, the latest first',
      query: pageQuerySchema,
      answers: { 200: pageOf(patternRevisionSchema) },
    },
    'GET /api/pattern-revisions/:id': {
      ...reading,
      summary: 'Read a revision; it never changes',
      answers: { 200: patternRevisionSchema },
    },
    'GET /api/pattern-revisions/:id/chart.csv': csv('size chart'),
    'GET /api/pattern-revisions/:id/finished.csv': csv('finished measurements'),
    'GET /api/files/:id': {
      ...reading,
      summary: 'Take an uploaded file away as it came',
      answers: { 200: { mediaType: 'application/octet-stream' } },
    },
  },
};
