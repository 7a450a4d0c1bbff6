import type { ImportIssue } from '../../../shared/patterns/imports.schema.ts';

/** Where an issue stands: counted from 1 as in the file; null for the whole row, column or file. */
interface Place {
  row?: number | null;
  column?: number | null;
}

/** What stops the import until it is mended. */
export function errorAt(place: Place, code: string, words: string): ImportIssue {
  return { severity: 'error', code, row: place.row ?? null, column: place.column ?? null, words };
}

/** What a person should look at. */
export function cautionAt(place: Place, code: string, words: string): ImportIssue {
  return { ...errorAt(place, code, words), severity: 'caution' };
}
