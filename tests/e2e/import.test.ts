import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { expectAccessible } from '../support/accessible.ts';
import { PHONE, visitor } from '../support/browser.ts';
import {
  CHART_MENDED,
  CHART_WITH_SLIPS,
  csvFile,
  FINISHED,
  importPattern,
} from '../support/pattern-files.ts';

const visit = visitor();

const saved = (page: Page) => page.getByText('Saved', { exact: true }).waitFor();
const chartField = (page: Page) => page.getByLabel(/^Size chart:/);
const finishedField = (page: Page) => page.getByLabel(/^Finished measurements:/);
const chartTable = (page: Page) => page.getByRole('region', { name: 'The size chart as understood' });
const keepButton = (page: Page) => page.getByRole('button', { name: 'Keep this pattern' });
const focusedId = (page: Page) => page.evaluate(() => document.activeElement?.id ?? '');

async function fillDetails(page: Page) {
  await page.getByLabel('Title').fill('Ferry dress');
  await page.getByLabel('Maker').fill('Slipway');
  await page.getByLabel('Kind of garment').selectOption('Dress');
  await page.getByRole('radio', { name: 'Fitted', exact: true }).check();
  await page.getByRole('radio', { name: 'Woven cloth' }).check();
  await page.getByLabel('Notes').focus();
  await saved(page);
}

describe('an import', () => {
  it('is a draft on the server from its first letter: a reload and another page show it again', async () => {
    const page = await visit.open('/imports/new', { as: 'newMember' });
    await page.waitForURL(/\/imports\/[0-9a-f-]{36}$/);
    await page.getByLabel('Title').fill('Ferry dress');
    await page.getByText('Not saved yet').waitFor();
    await saved(page);
    await page.reload();
    expect(await page.getByLabel('Title').inputValue()).toBe('Ferry dress');
    const address = page.url();
    await page.getByRole('link', { name: 'Patterns' }).first().click();
    await page.getByRole('heading', { name: 'Carry on where you left' }).waitFor();
    await page.getByRole('link', { name: 'Ferry dress' }).click();
    await page.waitForURL(address);
    expect(await page.getByLabel('Title').inputValue()).toBe('Ferry dress');
  });

  it('shows a table cell by cell, is mended by choosing and by replacing, and is kept whole', async () => {
    const page = await visit.open('/imports/new', { as: 'newMember' });
    await fillDetails(page);
    await chartField(page).setInputFiles(csvFile('ferry-chart.csv', CHART_WITH_SLIPS));
    const table = chartTable(page);
    await table.waitFor();
    await page.getByText('3 sizes, 3 points; 1 error to mend and 1 place to look at.').waitFor();
    await expectAccessible(page);

    // An issue leads to its cell, and the cell back to the issue; a heading's leads to its chooser.
    await page.getByRole('link', { name: 'row 3, column 3' }).click();
    expect(await focusedId(page)).toBe('chart-row-3-column-3');
    await table.getByRole('link', { name: 'Error 1' }).click();
    expect(await focusedId(page)).toBe('chart-note-1');
    await page.getByRole('link', { name: 'row 1, column 5' }).click();
    expect(await focusedId(page)).toBe('chart-column-5');

    // Nothing is kept while something stands in the way: the way leads there instead.
    await keepButton(page).click();
    await page.getByRole('link', { name: /^One error in the size chart:/ }).click();
    expect(await focusedId(page)).toBe('chart-note-1');
    expect(page.url()).toMatch(/\/imports\//);

    // Mended by choosing: the unknown column is told, and then the unit.
    await table.getByLabel(/^What column 5, Rib line/).selectOption('Underbust girth');
    await page.getByText('3 sizes, 4 points; 1 error to mend.').waitFor();
    await table.getByText('as you chose').waitFor();
    // Mended by replacing: what was chosen for the headings stays.
    await chartField(page).setInputFiles(csvFile('ferry-chart-2.csv', CHART_MENDED));
    await page.getByText('3 sizes, 4 points; all of it was understood.').waitFor();
    expect(await table.getByLabel(/^What column 5, Rib line/).inputValue()).toBe('underbust');

    await finishedField(page).setInputFiles(csvFile('ferry-finished.csv', FINISHED));
    await page.getByText(/judging by the size of the numbers/).waitFor();
    await page
      .getByText(/Ready: 3 sizes, 10 to 14, with the size chart and the finished measurements/)
      .waitFor();
    await expectAccessible(page);
    await keepButton(page).click();

    await page.getByRole('heading', { level: 1, name: 'Ferry dress' }).waitFor();
    const room = page.getByRole('region', { name: 'Body, cloth and room at every size' });
    expect(await room.locator('tbody').first().getByRole('row').last().innerText()).toMatch(
      /8\.0\s+8\.0\s+8\.0/,
    );
    // The draft is gone with it.
    await page.getByRole('link', { name: 'Patterns' }).first().click();
    await page.getByRole('list', { name: 'Patterns' }).waitFor();
    expect(await page.getByText('Carry on where you left').count()).toBe(0);
  });

  it('reads the unit a person chooses, and says in the cells what each number then is', async () => {
    const page = await visit.open('/imports/new', { as: 'newMember' });
    await chartField(page).setInputFiles(
      csvFile('inches.csv', 'Size,Bust,Waist\n10,33,25\n12,34 1/2,26 1/2\n'),
    );
    const table = chartTable(page);
    const cell = table.locator('#chart-row-2-column-2');
    await table.waitFor();
    expect(await cell.innerText()).toMatch(/83\.8 cm/);
    await page.getByLabel('Unit for showing what was understood').first().selectOption('mm');
    expect(await cell.innerText()).toMatch(/838 mm/);
    await page.getByLabel('Unit of this table').selectOption('cm');
    await page
      .getByText(/as you chose/)
      .first()
      .waitFor();
    expect(await cell.innerText()).toMatch(/330 mm/);
  });

  it('keeps what was typed where it cannot be saved, says so, and saves it later', async () => {
    const page = await visit.open('/imports/new', { as: 'newMember' });
    await page.getByLabel('Title').waitFor();
    const address = page.url();
    await page.route('**/api/imports/**', (route) =>
      route.request().method() === 'PATCH' ? route.abort() : route.continue(),
    );
    await page.getByLabel('Title').fill('Ferry dress');
    await page.getByLabel('Maker').focus();
    await page.getByText('Not saved', { exact: true }).waitFor();
    expect(await page.getByLabel('Title').inputValue()).toBe('Ferry dress');
    await expectAccessible(page);
    await page.unroute('**/api/imports/**');
    await page.goto(address);
    expect(await page.getByLabel('Title').inputValue()).toBe('Ferry dress');
    await saved(page);
    await page.evaluate(() => sessionStorage.clear());
    await page.reload();
    expect(await page.getByLabel('Title').inputValue()).toBe('Ferry dress');
    expect(visit.takeFaults().every((fault) => fault.includes('ERR_FAILED'))).toBe(true);
  });

  it('keeps a field that is not right as it was typed, and everything else beside it', async () => {
    const page = await visit.open('/imports/new', { as: 'newMember' });
    await page.getByLabel('At the hip').fill('many');
    await page.getByLabel('Maker').fill('Slipway');
    await page.getByLabel('Title').focus();
    await page.getByText('Write a whole number from 1 to 24, such as 4.', { exact: true }).waitFor();
    await saved(page);
    await page.reload();
    expect(await page.getByLabel('At the hip').inputValue()).toBe('many');
    expect(await page.getByLabel('Maker').inputValue()).toBe('Slipway');
  });

  it('refuses what is no table where it was brought, and leaves the table that is there', async () => {
    const page = await visit.open('/imports/new', { as: 'newMember' });
    await chartField(page).setInputFiles(csvFile('chart.csv', CHART_MENDED));
    await chartTable(page).waitFor();
    const refused: [string, Buffer, RegExp][] = [
      ['empty.csv', Buffer.from(''), /empty/],
      ['picture.csv', Buffer.from([0x89, 0x50, 0x4e, 0x47, 1, 2, 3]), /picture/],
      ['large.csv', Buffer.alloc(6_000_000, 'a'), /larger than 5 MB/],
    ];
    for (const [name, buffer, words] of refused) {
      await chartField(page).setInputFiles({ name, mimeType: 'text/csv', buffer });
      await page.getByRole('alert').getByText(words).waitFor();
      expect(await chartField(page).getAttribute('aria-invalid')).toBe('true');
      expect(await page.getByRole('link', { name: /^chart\.csv/ }).count()).toBe(1);
    }
    await expectAccessible(page);
  });

  it('says what the server refuses when it is kept, and keeps nothing of it', async () => {
    const page = await visit.open('/imports/new', { as: 'newMember' });
    await fillDetails(page);
    await chartField(page).setInputFiles(csvFile('chart.csv', CHART_MENDED));
    await page.getByText(/^Ready:/).waitFor();
    await page.route('**/commit', (route) =>
      route.fulfill({
        status: 422,
        contentType: 'application/problem+json',
        body: JSON.stringify({
          type: '/problems/invalid',
          title: 'Some of what was sent cannot be used',
          status: 422,
          errors: [{ pointer: '/chart', detail: 'Row 2, column 3: changed meanwhile.' }],
        }),
      }),
    );
    await keepButton(page).click();
    await page.getByRole('alert').getByText('Row 2, column 3: changed meanwhile.').waitFor();
    expect(await page.getByLabel('Title').inputValue()).toBe('Ferry dress');
  });

  it('marks every field that is missing when it is to be kept, and leads to the first', async () => {
    const page = await visit.open('/imports/new', { as: 'newMember' });
    await keepButton(page).click();
    await page.getByText('5 things still stand in the way').waitFor();
    await page.getByRole('link', { name: /^Title:/ }).click();
    expect(await focusedId(page)).toBe('title');
    expect(await page.getByLabel('Title').getAttribute('aria-invalid')).toBe('true');
    await page.getByRole('link', { name: /Bring a size chart/ }).click();
    expect(await focusedId(page)).toBe('chart-file');
  });

  it('is discarded after asking, and leaves nothing behind', async () => {
    const page = await visit.open('/imports/new', { as: 'newMember' });
    await page.getByLabel('Title').fill('Ferry dress');
    await saved(page);
    const address = page.url();
    await page.getByRole('button', { name: 'Discard it' }).click();
    const dialog = page.getByRole('alertdialog');
    await dialog.waitFor();
    await expectAccessible(page);
    await page.keyboard.press('Escape');
    await dialog.waitFor({ state: 'detached' });
    await page.getByRole('button', { name: 'Discard it' }).click();
    await dialog.getByRole('button', { name: 'Discard it' }).click();
    await page.waitForURL(/\/patterns$/);
    await page.goto(address);
    await page.getByRole('heading', { name: 'There is nothing here' }).waitFor();
  });

  it('brings new tables for a pattern that is there: its next revision, the one before stays', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    const { patternId, revisionId } = await importPattern(page, visit.baseURL);
    await page.goto(`/patterns/${patternId}`);
    await page.getByRole('link', { name: 'Bring in new tables' }).click();
    await page.getByRole('heading', { level: 1, name: 'New tables for Ferry dress' }).waitFor();
    await finishedField(page).setInputFiles(csvFile('roomier.csv', FINISHED.replace('100;77', '101;78')));
    await page.getByText(/^Ready: 3 sizes, 10 to 14, with the finished measurements/).waitFor();
    await page.getByRole('button', { name: 'Keep these tables' }).click();
    await page.getByText('Revision 2, shown here').waitFor();
    await page.getByRole('link', { name: 'Revision 1', exact: true }).click();
    await page.waitForURL(new RegExp(`${revisionId}$`));
    await page.getByText('These tables were replaced since.').waitFor();
    await expectAccessible(page);
    await page.getByRole('link', { name: /See the latest, revision 2/ }).click();
    await page.waitForURL(new RegExp(`/patterns/${patternId}$`));
  });

  it('fits the phone: only the table scrolls sideways, in its own region and by keyboard', async () => {
    const page = await visit.open('/imports/new', { as: 'newMember', viewport: PHONE });
    await chartField(page).setInputFiles(csvFile('chart.csv', CHART_WITH_SLIPS));
    const table = chartTable(page);
    await table.waitFor();
    expect(
      await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth),
    ).toBeLessThanOrEqual(0);
    await table.focus();
    await page.keyboard.press('ArrowRight');
    await page.waitForFunction(() => (document.activeElement?.scrollLeft ?? 0) > 0);
    // The sizes stay in sight beside what is scrolled.
    const size = await table.getByRole('rowheader', { name: '10' }).boundingBox();
    expect(size?.x ?? -1).toBeGreaterThanOrEqual(0);
    await expectAccessible(page);
  });
});

describe('what was brought in', () => {
  it('can be taken away as it came, and as a table that reads in again', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    const { patternId } = await importPattern(page, visit.baseURL);
    await page.goto(`/patterns/${patternId}`);
    const download = async (name: RegExp) => {
      const started = page.waitForEvent('download');
      await page.getByRole('link', { name }).first().click();
      return readFile(await (await started).path(), 'utf8');
    };
    expect(await download(/^chart\.csv/)).toBe(CHART_MENDED);
    const exported = await download(/^As CSV/);
    expect(exported).toMatch(/10,84,64,90/);
  });
});
