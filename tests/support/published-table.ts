import { readFileSync } from 'node:fs';
import { buildTable } from '../../server/patterns/reading/build-table.ts';
import { readTable } from '../../server/patterns/reading/read-table.ts';
import type { PatternTable } from '../../shared/patterns/patterns.schema.ts';

/** A published size chart from fixtures/standards, read as an uploaded file is; anything not understood is an error. */
export function readPublishedTable(fixture: string): PatternTable {
  const bytes = readFileSync(new URL(`../../fixtures/standards/${fixture}`, import.meta.url));
  const file = { id: '00000000-0000-7000-8000-000000000000', name: fixture, bytes: bytes.byteLength };
  const read = readTable(bytes, file, 'chart', { unit: null, points: {} });
  const errors = read.issues.filter((issue) => issue.severity === 'error');
  if (errors.length > 0) throw new Error(`${fixture}: ${errors.map((issue) => issue.words).join(' ')}`);
  return buildTable(read, null);
}
