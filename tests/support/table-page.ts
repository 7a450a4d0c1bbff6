import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { patternSchema, type Pattern } from '../../shared/patterns/patterns.schema.ts';
import { typedOf } from '../../shared/patterns/tables-as-typed.ts';
import type { VisitOptions, Visitor } from './browser.ts';
import { importPattern } from './pattern-files.ts';

type Role = 'chart' | 'finished';

/** The page on which a new member writes on the tables of an imported pattern. */
export async function openTable(
  visit: Visitor,
  options: VisitOptions = {},
): Promise<{ page: Page; patternId: string }> {
  const page = await visit.open('/patterns', { as: 'newMember', ...options });
  await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
  const { patternId } = await importPattern(page, visit.baseURL);
  await page.goto(`/patterns/${patternId}/table`);
  await page.getByRole('grid').first().waitFor();
  return { page, patternId };
}

export const cell = (page: Page, role: Role, line: number, size: number) =>
  page.locator(`#${role}-line-${String(line)}-size-${String(size)}`);

/** What is typed in a cell, without what stands under it. */
export const textOf = async (page: Page, role: Role, line: number, size: number) =>
  ((await cell(page, role, line, size).innerText()).split('\n')[0] ?? '').trim();

/** The id of what has the focus. */
export const atHand = (page: Page) => page.evaluate(() => document.activeElement?.id ?? '');

export async function press(page: Page, ...keys: string[]): Promise<void> {
  for (const key of keys) await page.keyboard.press(key);
}

export async function paste(page: Page, text: string): Promise<void> {
  await page.evaluate((value) => navigator.clipboard.writeText(value), text);
  await press(page, 'Control+v');
}

export const wholeOf = async (page: Page, visit: Visitor, patternId: string): Promise<Pattern> =>
  patternSchema.parse(
    await (await page.context().request.get(`${visit.baseURL}/api/patterns/${patternId}`)).json(),
  );

/** A newer revision, saved past the page: the bust of size 14 and the waist of size 10 changed. */
export async function saveElsewhere(page: Page, visit: Visitor, patternId: string): Promise<void> {
  const { revision } = await wholeOf(page, visit, patternId);
  const { sizes, chart, finished } = typedOf(revision.table);
  const edited = chart.map((column) => ({
    ...column,
    typed: column.typed.map((text, at) =>
      column.point === 'bust' && at === 2 ? '93' : column.point === 'waist' && at === 0 ? '65' : text,
    ),
  }));
  const response = await page.context().request.post(`${visit.baseURL}/api/patterns/${patternId}/revisions`, {
    headers: { origin: visit.baseURL },
    data: { basedOn: revision.id, sizes, chart: edited, finished },
  });
  expect(response.status()).toBe(201);
}

/** A touch as a finger makes it: a mouse's click says another pointer. */
export async function touch(page: Page, id: string): Promise<void> {
  const box = await page.locator(`#${id}`).boundingBox();
  if (!box) throw new Error(`${id} is not in sight`);
  const session = await page.context().newCDPSession(page);
  const point = { x: box.x + box.width / 2, y: box.y + box.height / 2 };
  await session.send('Emulation.setTouchEmulationEnabled', { enabled: true });
  await session.send('Input.dispatchTouchEvent', { type: 'touchStart', touchPoints: [point] });
  await session.send('Input.dispatchTouchEvent', { type: 'touchEnd', touchPoints: [] });
}
