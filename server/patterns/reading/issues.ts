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

/** A text short enough to stand in a sentence. */
export function quote(text: string): string {
  return `“${shorten(text, 32)}”`;
}

/** A text cut to the characters that may be kept of it. */
export function shorten(text: string, most: number): string {
  return text.length > most ? `${text.slice(0, most - 1)}…` : text;
}

/** “a, b and c”. */
export function listed(words: readonly string[], join: 'and' | 'or' = 'and'): string {
  const last = words.at(-1) ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} ${join} ${last}`;
}
