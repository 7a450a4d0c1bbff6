import {
  newPatternSchema,
  staleEditSchema,
  tableEditSchema,
  typedTableSchema,
} from '../../shared/patterns/edits.schema.ts';
import { z } from 'zod';
import { comparisonSchema } from '../../shared/patterns/comparison.schema.ts';
import { patternRevisionSchema, patternSchema } from '../../shared/patterns/patterns.schema.ts';
import type { NounDescription } from '../http/describe.ts';

export const compareQuerySchema = z.object({ with: z.uuid() });

const reading = { who: 'member', scope: 'patterns:read' } as const;
const writing = { who: 'member', scope: 'patterns:write' } as const;

export const editsApi: NounDescription = {
  noun: 'Editing by hand',
  schemas: {
    TypedTable: typedTableSchema,
    TableEdit: tableEditSchema,
    NewPattern: newPatternSchema,
    StaleEdit: staleEditSchema,
    Comparison: comparisonSchema,
  },
  routes: {
    'POST /api/patterns': {
      ...writing,
      summary: 'Type a pattern in without a file: its details and both tables as typed',
      body: newPatternSchema,
      answers: { 201: patternSchema },
    },
    'POST /api/patterns/:id/revisions': {
      ...writing,
      summary:
        'Save edited tables as the next revision; 200 where nothing differs from the latest, 409 with both versions (StaleEdit) where a newer one was saved since',
      body: tableEditSchema,
      answers: { 200: patternRevisionSchema, 201: patternRevisionSchema },
      problems: ['conflict'],
      extensions: { conflict: staleEditSchema.partial() },
    },
    'POST /api/patterns/:id/copy': {
      ...writing,
      summary: 'Copy a pattern with its latest tables; the files stay with the original',
      answers: { 201: patternSchema },
    },
    'GET /api/pattern-revisions/:id/compare': {
      ...reading,
      summary: 'Say what differs between a revision and another of yours, cell by cell',
      query: compareQuerySchema,
      answers: { 200: comparisonSchema },
    },
  },
};
