import { describe, expect, it } from 'vitest';
import { expectAccessible } from '../support/accessible.ts';
import { PHONE, visitor } from '../support/browser.ts';
import { importPattern } from '../support/pattern-files.ts';

const visit = visitor();

describe('the list of patterns', () => {
  it('teaches, while it is empty, what the two tables are and how a file of one looks', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    await page.getByRole('heading', { name: 'The size chart: the body' }).waitFor();
    await page.getByRole('heading', { name: 'Finished measurements: the cloth' }).waitFor();
    await page.getByText('Size,Bust (cm),Waist,Hip').waitFor();
    await expectAccessible(page);
    await page.getByRole('link', { name: 'Add a pattern' }).click();
    await page.getByRole('heading', { level: 1, name: 'Add a pattern' }).waitFor();
  });

  it('is searched and narrowed to a kind in the address, and the back button undoes it', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    await importPattern(page, visit.baseURL);
    await importPattern(page, visit.baseURL, { title: 'Mooring skirt', kind: 'skirt' });
    await page.goto('/patterns');
    const list = page.getByRole('list', { name: 'Patterns' });
    await list.waitFor();
    await expect.poll(() => list.getByRole('listitem').count()).toBe(2);
    await expectAccessible(page);
    await page.getByLabel('Kind of garment').selectOption('skirt');
    await page.waitForURL(/kind=skirt/);
    await page.getByText('1 pattern,').waitFor();
    expect(await list.getByRole('listitem').innerText()).toMatch(
      /Mooring skirt[^]*3 sizes, 10 to 14[^]*Size chart and finished measurements/,
    );
    await page.goBack();
    await page.getByText('2 patterns,').waitFor();
    await page.getByLabel('Find by title, maker or number').fill('mooring');
    await page.waitForURL(/q=mooring/);
    await page.getByText('1 pattern,').waitFor();
    await page.getByLabel('Find by title, maker or number').fill('harbour');
    await page.getByText('None of your patterns has these words').waitFor();
    await expectAccessible(page);
    await page.getByRole('link', { name: 'Show all patterns' }).click();
    await page.getByText('2 patterns,').waitFor();
  });
});

describe('a pattern', () => {
  it('shows body, cloth and the room between at every size, in the unit one asks for, and as typed', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    const { patternId, revisionId } = await importPattern(page, visit.baseURL);
    await page.goto(`/patterns/${patternId}`);
    const rows = page.getByRole('region', { name: 'Body, cloth and room at every size' });
    const waist = async (line: string) =>
      (
        await rows
          .locator('tbody', { hasText: 'Waist' })
          .getByRole('row')
          .filter({ hasText: line })
          .innerText()
      )
        .split(/\s+/)
        .slice(-3);
    expect(await waist('body')).toEqual(['64.0', '68.0', '72.0']);
    expect(await waist('cloth')).toEqual(['69.0', '73.0', '77.0']);
    expect(await waist('room')).toEqual(['5.0', '5.0', '5.0']);
    await expectAccessible(page);
    await page.getByLabel('How lengths are shown').selectOption('typed');
    await rows.getByText('body, cm').first().waitFor();
    expect(page.url()).toMatch(/shown=typed/);
    expect(await waist('body')).toEqual(['64', '68', '72']);
    await page.getByLabel('How lengths are shown').selectOption('in');
    await rows.getByText('3 1/8').first().waitFor();
    expect(page.url()).toMatch(/shown=in/);
    expect(await rows.locator('tbody', { hasText: 'Bust' }).getByRole('row').last().innerText()).toMatch(
      /3 1\/8/,
    );
    const plan = page.getByRole('link', { name: 'Plan with this pattern' });
    expect(await plan.getAttribute('href')).toBe(`/fit?revision=${revisionId}`);
  });

  it('says what is missing in a form at its head and at its field, and saves what was changed', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    const { patternId } = await importPattern(page, visit.baseURL, { seamEdges: { bust: 6, upperArm: 2 } });
    await page.goto(`/patterns/${patternId}/edit`);
    await page.getByLabel('Title').fill('');
    await page.getByLabel('At the hip').fill('0');
    await page.getByRole('button', { name: 'Save' }).click();
    const summary = page.getByRole('alert').filter({ hasText: '2 things to put right' });
    await summary.waitFor();
    expect(await summary.evaluate((box) => box === document.activeElement)).toBe(true);
    await expectAccessible(page);
    await summary.getByRole('link', { name: /Title/ }).click();
    await page.keyboard.type('Ferry dress, long');
    await page.getByLabel('At the hip').fill('8');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByRole('heading', { level: 1, name: 'Ferry dress, long' }).waitFor();
    // What the form does not ask for is not lost.
    await page
      .getByText('Seam edges: 6 at the bust; 4 at the waist; 8 at the hip; 2 at the upper arm.')
      .waitFor();
  });

  it('puts what only the server refuses at its field, and keeps what was typed', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    const { patternId } = await importPattern(page, visit.baseURL);
    await page.goto(`/patterns/${patternId}/edit`);
    await page.route(`**/api/patterns/${patternId}`, (route) =>
      route.request().method() === 'PATCH'
        ? route.fulfill({
            status: 422,
            contentType: 'application/problem+json',
            body: JSON.stringify({
              type: '/problems/invalid',
              title: 'Some of what was sent cannot be used',
              status: 422,
              errors: [{ pointer: '/number', detail: 'Another pattern has this number.' }],
            }),
          })
        : route.continue(),
    );
    await page.getByLabel('Number').fill('S 5');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByRole('link', { name: 'Number: Another pattern has this number.' }).click();
    expect(await page.getByLabel('Number').getAttribute('aria-invalid')).toBe('true');
    expect(await page.getByLabel('Number').inputValue()).toBe('S 5');
  });

  it('shows the rest of itself where its revisions cannot be read, and reads them when asked again', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    const { patternId } = await importPattern(page, visit.baseURL);
    await page.route('**/revisions?*', (route) =>
      route.fulfill({
        status: 409,
        contentType: 'application/problem+json',
        body: JSON.stringify({
          type: '/problems/conflict',
          title: 'This cannot be done as things stand',
          status: 409,
        }),
      }),
    );
    await page.goto(`/patterns/${patternId}`);
    await page.getByRole('alert').getByText('This cannot be done as things stand.').waitFor();
    await page.getByRole('region', { name: 'Body, cloth and room at every size' }).waitFor();
    await page.unroute('**/revisions?*');
    await page.getByRole('button', { name: 'Try again' }).click();
    await page.getByText('Revision 1, shown here').waitFor();
  });

  it('is deleted after saying what goes with it', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    const { patternId } = await importPattern(page, visit.baseURL);
    await page.goto(`/patterns/${patternId}`);
    await page.getByRole('button', { name: 'Delete this pattern' }).click();
    const dialog = page.getByRole('alertdialog', { name: 'Delete Ferry dress?' });
    await dialog.getByText(/every plan saved with it/).waitFor();
    await expectAccessible(page);
    await dialog.getByRole('button', { name: 'Delete for good' }).click();
    await page.getByRole('heading', { name: 'Bring in your first pattern' }).waitFor();
    await page.goto(`/patterns/${patternId}`);
    await page.getByRole('heading', { name: 'There is nothing here' }).waitFor();
  });

  it('answers another person as if it did not exist', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    const { patternId, revisionId } = await importPattern(page, visit.baseURL);
    for (const path of [`/patterns/${patternId}`, `/patterns/${patternId}/edit`]) {
      const other = await visit.open(path, { as: 'newMember' });
      await other.getByRole('heading', { name: 'There is nothing here' }).waitFor();
    }
    const other = await visit.open(`/patterns/${patternId}/revisions/${revisionId}`, { as: 'newMember' });
    await other.getByRole('heading', { name: 'There is nothing here' }).waitFor();
  });

  it('fits the phone: its sizes scroll beside its points, the page does not', async () => {
    const page = await visit.open('/patterns', { as: 'newMember', viewport: PHONE });
    const { patternId } = await importPattern(page, visit.baseURL);
    for (const path of ['', '/edit']) {
      await page.goto(`/patterns/${patternId}${path}`);
      await page.locator('h1').waitFor();
      expect(
        await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth),
      ).toBeLessThanOrEqual(0);
      await expectAccessible(page);
    }
  });
});
