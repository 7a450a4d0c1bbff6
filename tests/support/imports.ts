import { readdirSync } from 'node:fs';
import { expect } from 'vitest';
import { importDraftSchema, type ImportDraft, type TableRole } from '../../shared/patterns/imports.schema.ts';
import { patternSchema, type Pattern } from '../../shared/patterns/patterns.schema.ts';
import { storedFile } from '../../server/patterns/files.table.ts';
import type { SignedIn, TestApp } from './app.ts';

export const NOWHERE = '0190d5f2-0000-7000-8000-000000000000';
export const DETAILS = { title: 'Harbour dress', kind: 'dress', silhouette: 'fitted', structure: 'woven' };
export const CHART =
  'Size,Bust (in),Waist (in),Hip (in)\n10,32 1/2,25,35\n12,34,26 1/2,36 3/8\n14,36,28,38\n';
export const FINISHED =
  'Size,Finished bust (in),Finished hip (in)\n10,35,38\n12,36 1/2,39 1/2\n14,38 1/2,41\n';

export const pointersOf = (body: { errors: { pointer: string }[] }) =>
  body.errors.map((error) => error.pointer);

export async function start(by: SignedIn, body: object = {}): Promise<ImportDraft> {
  return importDraftSchema.parse((await by.agent.post('/api/imports').send(body).expect(201)).body);
}

export async function draftOf(by: SignedIn, id: string): Promise<ImportDraft> {
  return importDraftSchema.parse((await by.agent.get(`/api/imports/${id}`).expect(200)).body);
}

/** Sends a file; the answer is the caller's to judge. */
export const send = (
  by: Pick<SignedIn, 'agent'>,
  id: string,
  role: string,
  content: string | Buffer,
  name = 'table.csv',
) => by.agent.put(`/api/imports/${id}/tables/${role}`).attach('file', Buffer.from(content), name);

export async function upload(
  by: SignedIn,
  id: string,
  role: TableRole,
  content: string | Buffer,
  name?: string,
): Promise<ImportDraft> {
  return importDraftSchema.parse((await send(by, id, role, content, name).expect(200)).body);
}

/** A pattern the way a person brings one: a draft with both tables, committed. */
export async function bring(
  by: SignedIn,
  details: object = {},
  chart = CHART,
  finished = FINISHED,
): Promise<Pattern> {
  const { id } = await start(by, { details: { ...DETAILS, ...details } });
  if (chart !== '') await upload(by, id, 'chart', chart, 'chart.csv');
  if (finished !== '') await upload(by, id, 'finished', finished, 'finished.csv');
  const committed = await by.agent.post(`/api/imports/${id}/commit`).expect(201);
  const { patternId } = committed.body as { patternId: string };
  return patternSchema.parse((await by.agent.get(`/api/patterns/${patternId}`).expect(200)).body);
}

/** The ids of all files whose bytes are kept. */
export function bytesKept(test: TestApp): string[] {
  const names = readdirSync(test.config.filesFolder, { recursive: true, withFileTypes: true });
  const files = names.filter((entry) => entry.isFile()).map((entry) => entry.name);
  expect(files.filter((name) => name.endsWith('.part'))).toEqual([]);
  return files.sort();
}

/** Every file row has its bytes, and no bytes are without a row. */
export async function expectNothingLost(test: TestApp): Promise<void> {
  const rows = await test.db.select({ id: storedFile.id }).from(storedFile);
  expect(bytesKept(test)).toEqual(rows.map((row) => row.id).sort());
}
