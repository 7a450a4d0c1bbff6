import { readFileSync } from 'node:fs';
import Papa from 'papaparse';

/** The rows of a fixture under fixtures/, by heading, as text. */
export function readFixtureRows(fixture: string): Record<string, string>[] {
  const text = readFileSync(new URL(`../../fixtures/${fixture}`, import.meta.url), 'utf8');
  return Papa.parse<Record<string, string>>(text.trim(), { header: true }).data;
}
