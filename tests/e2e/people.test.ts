import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { MEASURING_ORDER } from '../../shared/points/catalogue.ts';
import { expectAccessible } from '../support/accessible.ts';
import { DESK, PHONE, visitor } from '../support/browser.ts';

const visit = visitor();

const heading = (page: Page, name: string) => page.getByRole('heading', { level: 1, name, exact: true });
const field = (page: Page, point: string) => page.getByLabel(point, { exact: true });
const reading = async (page: Page, point: string) => {
  const ids = (await field(page, point).getAttribute('aria-describedby')) ?? '';
  const id = ids.split(' ').find((part) => part.endsWith('-reading'));
  return page.locator(`[id="${id ?? ''}"]`).innerText();
};
const button = (page: Page, name: string) => page.getByRole('button', { name, exact: true });

/** Somebody new, with one person just added and the measuring page open. */
async function measuring(person: { word?: 'Bust' | 'Chest' } = {}, viewport = PHONE): Promise<Page> {
  const page = await visit.open('/people/new', { as: 'newMember', viewport });
  await page.getByLabel('Name').fill('Ines');
  await page.getByLabel(person.word ?? 'Bust', { exact: true }).check();
  await button(page, 'Add and measure').click();
  await heading(page, 'Measure Ines').waitFor();
  return page;
}

async function saveSet(page: Page, typed: Record<string, string>) {
  for (const [point, text] of Object.entries(typed)) await field(page, point).fill(text);
  await button(page, 'Save the set').click();
  await page.getByRole('heading', { name: 'Every time measured' }).waitFor();
}

describe('people', () => {
  it('teaches the first step where nobody is yet, and finds people by name', async () => {
    const page = await visit.open('/people', { as: 'newMember', viewport: PHONE });
    await page.getByRole('heading', { name: 'Begin with whoever the next garment is for' }).waitFor();
    await expectAccessible(page);
    for (const name of ['Ines', 'Noor']) {
      await page.goto('/people/new');
      await page.getByLabel('Name').fill(name);
      await button(page, 'Add and measure').click();
      await heading(page, `Measure ${name}`).waitFor();
    }
    await page.goto('/people');
    await page.getByText('2 people').waitFor();
    await page.getByLabel('Find by name').fill('noo');
    await page.getByText('1 person with “noo” in the name').waitFor();
    expect(new URL(page.url()).search).toBe('?q=noo');
    await page.getByLabel('Find by name').fill('nobody at all');
    await page.getByText('Nobody with “nobody at all” in the name').waitFor();
    await button(page, 'Clear').click();
    await page.getByText('2 people').waitFor();
  });

  it('asks for a name, and keeps everything else that was written', async () => {
    const page = await visit.open('/people/new', { as: 'newMember' });
    await page.getByLabel('Notes').fill('Likes room at the shoulder.');
    await button(page, 'Add and measure').click();
    await page.getByRole('alert').waitFor();
    await expectAccessible(page);
    await page.getByRole('alert').getByRole('link').click();
    await page.keyboard.type('Ines');
    await button(page, 'Add and measure').click();
    await heading(page, 'Measure Ines').waitFor();
    await page.getByRole('main').getByRole('link', { name: 'Ines', exact: true }).click();
    await page.getByText('Likes room at the shoulder.').waitFor();
  });

  it('says what goes before a person is deleted; Escape keeps them', async () => {
    const page = await measuring();
    await saveSet(page, { 'Waist girth': '84' });
    await button(page, 'Delete Ines').click();
    const dialog = page.getByRole('alertdialog', { name: 'Delete Ines?' });
    await dialog.waitFor();
    expect(await dialog.innerText()).toContain('the one measurement set and every plan saved from them');
    await expectAccessible(page);
    await page.keyboard.press('Escape');
    await dialog.waitFor({ state: 'detached' });
    await button(page, 'Delete Ines').click();
    await button(page, 'Delete for good').click();
    await page.getByRole('heading', { name: 'Begin with whoever the next garment is for' }).waitFor();
  });
});

describe('measuring', () => {
  it('reads every way of writing a length while it is typed, and keeps it as typed', async () => {
    const page = await measuring();
    const ways: [string, string, string][] = [
      ['Waist girth', '84', '= 84.0 cm / 33 1/16 in'],
      ['Upper bust girth', '36 3/8 in', '= 92.4 cm / 36 3/8 in'],
      ['Bust girth', '98,5 cm', '= 98.5 cm / 38 3/4 in'],
      ['Hip girth', '44⅜"', '= 112.7 cm / 44 3/8 in'],
    ];
    for (const [point, text, read] of ways) {
      await field(page, point).fill(text);
      expect(await reading(page, point)).toBe(read);
    }
    await button(page, 'Save the set').click();
    await page.getByRole('heading', { name: 'Every time measured' }).waitFor();
    const table = await page.getByRole('table').innerText();
    for (const shown of ['84.0 cm', '36 3/8 in', '98.5 cm', '98,5 cm', '44⅜"'])
      expect(table).toContain(shown);
  });

  it('uses the person’s word', async () => {
    const page = await measuring({ word: 'Chest' });
    expect(await field(page, 'Chest girth').count()).toBe(1);
    expect(await field(page, 'Bust girth').count()).toBe(0);
  });

  it('offers every point of the body, each with how it is taken', async () => {
    const page = await measuring({}, DESK);
    expect(await page.getByRole('button', { name: /^How to take it: /, includeHidden: true }).count()).toBe(
      MEASURING_ORDER.length,
    );
    await page.locator('summary', { hasText: 'Leg' }).press('Enter');
    await button(page, 'How to take it: Knee girth').press('Enter');
    await page.getByText('Pass the tape round over the middle of the knee cap.').first().waitFor();
    await page.getByText('Also called knee circumference').waitFor();
    await expectAccessible(page);
  });

  it('says at its field what is wrong with a length, and loses nothing to a failure or a reload', async () => {
    const page = await measuring();
    await field(page, 'Waist girth').fill('1,050');
    await field(page, 'Hip girth').fill('-112');
    await button(page, 'Save the set').click();
    await page.getByRole('alert').waitFor();
    expect(await page.getByRole('alert').innerText()).toContain('2 things to put right');
    expect(await page.locator('[id="typed.waist-error"]').innerText()).toContain('write one of those');
    await expectAccessible(page);
    await page
      .getByRole('alert')
      .getByRole('link', { name: /^Hip girth/ })
      .click();
    expect(await field(page, 'Hip girth').evaluate((input) => input === document.activeElement)).toBe(true);

    await page.reload();
    await page.getByText('What you typed here before, and did not save, is back.').waitFor();
    expect(await field(page, 'Waist girth').inputValue()).toBe('1,050');
    await field(page, 'Waist girth').fill('105');
    await field(page, 'Hip girth').fill('112');
    await page.route('**/measurement-sets', (route) => route.abort());
    await button(page, 'Save the set').click();
    await page.getByText('The server cannot be reached just now.').waitFor();
    expect(await field(page, 'Waist girth').inputValue()).toBe('105');
    await page.unroute('**/measurement-sets');
    await button(page, 'Save the set').click();
    await page.getByRole('heading', { name: 'Every time measured' }).waitFor();
    const faults = visit.takeFaults();
    expect(faults).toHaveLength(1);
    expect(faults[0]).toContain('net::ERR_FAILED');
  });

  it('opens the part of the page that a wrong length is folded away in', async () => {
    const page = await measuring();
    const arm = page.locator('summary', { hasText: 'Arm' });
    await arm.click();
    await field(page, 'Upper arm girth').fill('thick');
    await arm.click();
    await button(page, 'Save the set').click();
    await page
      .getByRole('alert')
      .getByRole('link', { name: /^Upper arm girth/ })
      .click();
    expect(await field(page, 'Upper arm girth').isVisible()).toBe(true);
  });

  it('shows at its field what the server refuses', async () => {
    const page = await measuring();
    await field(page, 'Waist girth').fill('84');
    await page.route('**/measurement-sets', (route) =>
      route.fulfill({
        status: 422,
        contentType: 'application/problem+json',
        body: JSON.stringify({
          type: '/problems/invalid',
          title: 'Some of what was sent cannot be used',
          status: 422,
          errors: [
            { pointer: '/typed/waist', detail: 'Said of the waist.' },
            { pointer: '/startedFromId', detail: 'Said of no field.' },
          ],
        }),
      }),
    );
    await button(page, 'Save the set').click();
    await page.getByRole('alert').waitFor();
    expect(await page.locator('[id="typed.waist-error"]').innerText()).toBe('Said of the waist.');
    expect(await page.getByRole('alert').innerText()).toContain('Said of no field.');
  });

  it('warns before what was typed is left, and has it again on coming back', async () => {
    const page = await measuring();
    await field(page, 'Waist girth').fill('84');
    await page.getByRole('link', { name: 'Patterns' }).click();
    const dialog = page.getByRole('alertdialog', { name: 'Leave before saving?' });
    await dialog.waitFor();
    await button(page, 'Stay here').click();
    await dialog.waitFor({ state: 'detached' });
    await page.getByRole('link', { name: 'Patterns' }).click();
    await button(page, 'Leave').click();
    await heading(page, 'Patterns').waitFor();
    await page.goBack();
    await heading(page, 'Measure Ines').waitFor();
    expect(await field(page, 'Waist girth').inputValue()).toBe('84');
    await button(page, 'Throw it away and begin again').click();
    expect(await field(page, 'Waist girth').inputValue()).toBe('');
  });

  it('begins from the last set, shows the difference, and compares the two', async () => {
    const page = await measuring();
    await saveSet(page, { 'Waist girth': '84', 'Hip girth': '44 in' });
    await page.getByRole('link', { name: 'Measure again' }).click();
    await heading(page, 'Measure Ines').waitFor();
    expect(await field(page, 'Hip girth').inputValue()).toBe('44 in');
    await field(page, 'Waist girth').fill('85.5');
    expect(await reading(page, 'Waist girth')).toContain('last 84.0 cm, now +1.5 cm');
    expect(await reading(page, 'Hip girth')).toContain('last 44 in, the same');
    await saveSet(page, {});
    await page.getByRole('list').last().getByRole('link').first().click();
    await page.getByText('Beside it what was measured').waitFor();
    const waist = page.getByRole('row', { name: /Waist girth/ });
    expect(await waist.innerText()).toMatch(/85\.5 cm\s+84\.0 cm\s+\+1\.5/);
    await expectAccessible(page);
  });

  it('keeps the meaning of what was written when the unit changes, unless told otherwise', async () => {
    const page = await measuring();
    await field(page, 'Waist girth').fill('33');
    await page.getByLabel('Unit of numbers without one').selectOption('in');
    expect(await field(page, 'Waist girth').inputValue()).toBe('33 cm');
    await button(page, 'They were inches all along').click();
    expect(await field(page, 'Waist girth').inputValue()).toBe('33');
    expect(await reading(page, 'Waist girth')).toBe('= 83.8 cm / 33 in');
  });

  it('refuses an empty set in words', async () => {
    const page = await measuring();
    await button(page, 'Save the set').click();
    await page.getByText('Write at least one measurement.').waitFor();
  });

  it('deletes one set and keeps the others', async () => {
    const page = await measuring();
    await saveSet(page, { 'Waist girth': '84' });
    await page.getByRole('link', { name: 'Measure again' }).click();
    await saveSet(page, { 'Waist girth': '90' });
    await page.getByRole('list').last().getByRole('link').first().click();
    await page.getByText('Beside it what was measured').waitFor();
    await button(page, 'Delete this set').click();
    await button(page, 'Delete for good').click();
    await heading(page, 'Ines').waitFor();
    await page.getByRole('cell', { name: '84.0 cm' }).waitFor();
    expect(await page.getByRole('table').innerText()).not.toContain('90.0');
  });
});
