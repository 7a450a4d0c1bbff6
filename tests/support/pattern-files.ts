import type { Page } from 'playwright-core';
import { z } from 'zod';

/** A chart with a cell that is no length and a heading that names no point; the rest is right. */
export const CHART_WITH_SLIPS = [
  'Size,Bust (cm),Waist (cm),Hip (cm),Rib line (cm)',
  '10,84,64,90,72',
  '12,88,six,94,76',
  '14,92,72,98,80',
].join('\n');

/** The same with the cell mended. */
export const CHART_MENDED = CHART_WITH_SLIPS.replace('six', '68');

/** Eight centimetres of room at the bust, five at the waist, six at the hip; no unit is written. */
export const FINISHED = ['Size;Bust;Waist;Hip', '10;92;69;96', '12;96;73;100', '14;100;77;104'].join('\n');

export const csvFile = (name: string, text: string) => ({
  name,
  mimeType: 'text/csv',
  buffer: Buffer.from(text),
});

const one = z.object({ id: z.uuid() });
const committed = z.object({ patternId: z.uuid(), revisionId: z.uuid() });

export const DETAILS = {
  title: 'Ferry dress',
  maker: 'Slipway',
  number: 'S 4',
  kind: 'dress',
  silhouette: 'fitted',
  structure: 'woven',
};

/** Imports a pattern for whoever is signed in on the page, past the screens. */
export async function importPattern(
  page: Page,
  baseURL: string,
  details: Partial<typeof DETAILS> & { seamEdges?: Record<string, number> } = {},
): Promise<z.output<typeof committed>> {
  const { request } = page.context();
  const headers = { origin: baseURL };
  const read = async <T extends z.ZodType>(
    response: Awaited<ReturnType<typeof request.get>>,
    schema: T,
  ): Promise<z.output<T>> => {
    if (!response.ok()) throw new Error(`${response.url()}: ${await response.text()}`);
    return schema.parse(await response.json());
  };
  const data = { details: { ...DETAILS, ...details } };
  const { id } = await read(await request.post(`${baseURL}/api/imports`, { headers, data }), one);
  for (const [role, text] of [
    ['chart', CHART_MENDED],
    ['finished', FINISHED],
  ] as const) {
    const multipart = { file: csvFile(`${role}.csv`, text) };
    await read(await request.put(`${baseURL}/api/imports/${id}/tables/${role}`, { headers, multipart }), one);
  }
  return read(await request.post(`${baseURL}/api/imports/${id}/commit`, { headers }), committed);
}
