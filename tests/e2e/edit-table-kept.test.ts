import { describe, expect, it } from 'vitest';
import { expectAccessible } from '../support/accessible.ts';
import { DESK, PHONE, visitor } from '../support/browser.ts';
import {
  cell,
  openTable,
  paste,
  press,
  saveElsewhere,
  textOf,
  touch,
  wholeOf,
} from '../support/table-page.ts';

const visit = visitor();

describe('a stale save', () => {
  it('shows both versions and what differs, lays one’s changes over the newer, and loses nothing', async () => {
    const { page, patternId } = await openTable(visit);
    await cell(page, 'chart', 0, 0).focus();
    await page.keyboard.type('83');
    await press(page, 'Tab', 'Tab');
    await page.keyboard.type('91.5');
    await press(page, 'Enter');
    await saveElsewhere(page, visit, patternId);
    await page.getByRole('button', { name: 'Save as revision 2' }).click();
    await page.getByRole('heading', { name: 'Revision 2 was saved meanwhile' }).waitFor();
    await page.getByText(/3 cells differ\./).waitFor();
    await page.getByRole('row', { name: /Bust girth.*14 93 cm 91.5 cm by both/ }).waitFor();
    await page.getByRole('row', { name: /Bust girth.*10 84 cm 83 cm by you/ }).waitFor();
    await page.getByRole('row', { name: /Waist girth.*10 65 cm 64 cm in revision 2/ }).waitFor();
    await page.getByRole('region', { name: 'Revision 2, as typed' }).waitFor();
    await page.getByRole('region', { name: 'Yours, as typed' }).waitFor();
    await expectAccessible(page);
    await page.setViewportSize(PHONE);
    expect(
      await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth),
    ).toBeLessThanOrEqual(0);
    await expectAccessible(page);
    await page.setViewportSize(DESK);

    // A reload in between keeps what was typed and still knows that it is stale.
    page.on('dialog', (dialog) => void dialog.accept());
    await page.reload();
    await page.getByRole('heading', { name: 'Revision 2 was saved meanwhile' }).waitFor();
    expect(await textOf(page, 'chart', 0, 0)).toBe('83');
    await page.getByRole('button', { name: 'Lay my changes over revision 2' }).click();
    await page.getByText('Your changes laid over revision 2.').waitFor();
    await page.getByRole('button', { name: 'Save as revision 3' }).click();
    await page.getByText('Revision 3, shown here').waitFor();
    const { table } = (await wholeOf(page, visit, patternId)).revision;
    expect(table.chart[0]?.typed).toEqual(['83', '88', '91.5']);
    expect(table.chart[1]?.typed).toEqual(['65', '68', '72']);
  });

  it('is left as it is, or let go after being asked', async () => {
    const { page, patternId } = await openTable(visit);
    await cell(page, 'chart', 0, 0).focus();
    await page.keyboard.type('83');
    await press(page, 'Enter');
    await saveElsewhere(page, visit, patternId);
    await page.getByRole('button', { name: 'Save as revision 2' }).click();
    await page.getByRole('button', { name: 'Let mine go' }).click();
    await page.getByRole('alertdialog').getByRole('button', { name: 'Let it go' }).click();
    await page.getByText(/You write on revision 2/).waitFor();
    expect(await textOf(page, 'chart', 0, 0)).toBe('84');
    expect((await wholeOf(page, visit, patternId)).latestRevisionNumber).toBe(2);
  });
});

describe('what is typed and not saved', () => {
  it('is back after a reload, a cell half written too, and is asked about on leaving', async () => {
    const { page } = await openTable(visit);
    await cell(page, 'chart', 0, 0).focus();
    await page.keyboard.type('83');
    await press(page, 'Tab');
    await page.keyboard.type('87');
    page.on('dialog', (dialog) => void dialog.accept());
    await page.reload();
    await page.getByText('What you had typed and not saved is back.').waitFor();
    expect([await textOf(page, 'chart', 0, 0), await textOf(page, 'chart', 0, 1)]).toEqual(['83', '87']);
    await page.getByRole('link', { name: 'Leave it' }).click();
    const dialog = page.getByRole('alertdialog', { name: 'Leave before saving?' });
    await dialog.getByRole('button', { name: 'Stay here' }).click();
    expect(await textOf(page, 'chart', 0, 0)).toBe('83');
    await page.getByRole('button', { name: 'Begin again from revision 1' }).click();
    await page.getByRole('button', { name: 'Let it go' }).click();
    await expect.poll(() => textOf(page, 'chart', 0, 0)).toBe('84');
  });
});

describe('a pattern without a file', () => {
  it('is typed in: details, sizes and cells, with what is missing said at its place', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    await page.getByRole('link', { name: 'Type one in' }).click();
    await page.getByRole('heading', { level: 1, name: 'Type a pattern in' }).waitFor();
    await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
    await expectAccessible(page);
    await page.getByRole('button', { name: 'Save the pattern' }).click();
    await page.getByText('Write the name of this size, such as 12 or M.').first().waitFor();
    await page.getByRole('link', { name: /Title: Write the title/ }).waitFor();
    await page.getByLabel('Title').fill('Gantry skirt');
    await page.getByLabel('Kind of garment').selectOption('skirt');
    await page.getByLabel('Woven cloth').check();
    await page.getByLabel('Fitted', { exact: true }).check();
    await cell(page, 'chart', 0, 0).focus();
    await paste(page, '\tS\tM\tL\tXL\nWaist\t66\t72\t78\t84\nHip\t92\t98\t104\t110');
    await page.getByText('8 cells pasted in, by the names').waitFor();
    await page.getByRole('button', { name: 'Remove: Bust girth' }).first().click();
    await page.getByRole('button', { name: 'Save the pattern' }).click();
    await page.getByRole('heading', { level: 1, name: 'Gantry skirt' }).waitFor();
    await page.getByRole('button', { name: 'Copy this pattern' }).click();
    await page.getByRole('heading', { level: 1, name: 'Gantry skirt (copy)' }).waitFor();
  });
});

describe('on the phone', () => {
  it('a touch on a cell begins to write, and the page does not scroll sideways', async () => {
    const { page, patternId } = await openTable(visit, { viewport: PHONE });
    await saveElsewhere(page, visit, patternId);
    for (const path of ['table', 'compare']) {
      await page.goto(`/patterns/${patternId}/${path}`);
      await page.locator('h1').waitFor();
      expect(
        await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth),
      ).toBeLessThanOrEqual(0);
      await expectAccessible(page);
    }
    await page.goto(`/patterns/${patternId}/table`);
    await cell(page, 'chart', 0, 0).scrollIntoViewIfNeeded();
    await touch(page, 'chart-line-0-size-0');
    await page.getByLabel('Bust girth, size 10').fill('85');
    await press(page, 'Enter');
    expect(await textOf(page, 'chart', 0, 0)).toBe('85');
  });
});
