import { describe, expect, it } from 'vitest';
import { expectAccessible } from '../support/accessible.ts';
import { visitor } from '../support/browser.ts';
import { atHand, cell, openTable, paste, press, textOf, wholeOf } from '../support/table-page.ts';

const visit = visitor();

describe('editing the tables by keyboard', () => {
  it('moves, writes, restores and saves a new revision without a mouse', async () => {
    const { page, patternId } = await openTable(visit);
    await cell(page, 'chart', 0, 0).focus();
    await press(page, 'ArrowRight', 'ArrowDown');
    expect(await atHand(page)).toBe('chart-line-1-size-1');
    await press(page, 'Control+ArrowRight', 'Control+ArrowUp');
    expect(await atHand(page)).toBe('chart-line-0-size-2');
    await press(page, 'Home', 'ArrowUp');
    expect(await atHand(page)).toBe('chart-line--1-size-0');
    await press(page, 'End', 'ArrowDown', 'Control+Home');
    expect(await atHand(page)).toBe('chart-line-0-size-0');

    // Typing replaces, F2 goes on with what is there, Escape gives it back.
    await page.keyboard.type('33 1/8 in');
    expect(await cell(page, 'chart', 0, 0).innerText()).toContain('84.1 cm');
    await press(page, 'Tab');
    expect(await atHand(page)).toBe('chart-line-0-size-1');
    await press(page, 'F2');
    await page.keyboard.type('.5');
    await press(page, 'Enter');
    expect(await textOf(page, 'chart', 0, 1)).toBe('88.5');
    expect(await atHand(page)).toBe('chart-line-1-size-1');
    await page.keyboard.type('999');
    await press(page, 'Escape');
    expect(await textOf(page, 'chart', 1, 1)).toBe('68');
    expect(await atHand(page)).toBe('chart-line-1-size-1');

    // The point's own cell opens its choosers; Escape comes back.
    await press(page, 'Home', 'ArrowLeft', 'Enter');
    expect(await page.evaluate(() => document.activeElement?.getAttribute('aria-label'))).toBe(
      'Point of line 2',
    );
    await press(page, 'Escape');
    expect(await atHand(page)).toBe('chart-line-1-size--1');

    // Escape and then Tab leaves: nobody is kept in the table.
    await press(page, 'ArrowRight', 'Escape', 'Tab');
    expect(await page.evaluate(() => document.activeElement?.closest('[role=grid]') === null)).toBe(true);
    await expectAccessible(page);

    await page.getByRole('button', { name: 'Save as revision 2' }).press('Enter');
    await page.getByText('Revision 2, shown here').waitFor();
    const { revision } = await wholeOf(page, visit, patternId);
    expect(revision.table.chart[0]?.typed).toEqual(['33 1/8 in', '88.5', '92']);
    expect(revision.table.chart[0]?.mm[0]).toBe(841.375);
    await page.getByRole('link', { name: 'See what changed between revisions' }).click();
    await page.getByText('2 cells differ.').waitFor();
    await page.getByRole('row', { name: /Bust girth.*12 88 cm 88.5 cm/ }).waitFor();
    await expectAccessible(page);
  });

  it('undoes and does again, by keys and by buttons, and says what', async () => {
    const { page } = await openTable(visit);
    await cell(page, 'chart', 0, 0).focus();
    await page.keyboard.type('80');
    await press(page, 'Enter');
    await page.keyboard.type('60');
    await press(page, 'Enter', 'Control+z');
    expect(await textOf(page, 'chart', 1, 0)).toBe('64');
    await page.getByText('Undone: 60 at Waist girth, size 10.').waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    expect(await textOf(page, 'chart', 0, 0)).toBe('84');
    await page.getByText('Nothing is changed yet.').waitFor();
    await press(page, 'Control+Shift+z');
    expect(await textOf(page, 'chart', 0, 0)).toBe('80');
    await page.getByRole('button', { name: 'Redo' }).click();
    expect(await textOf(page, 'chart', 1, 0)).toBe('60');
  });

  it('says every error at its cell and in a list, and saves nothing until they are mended', async () => {
    const { page, patternId } = await openTable(visit);
    await cell(page, 'chart', 0, 1).focus();
    await page.keyboard.type('wide');
    await press(page, 'Enter', 'ArrowDown');
    await page.keyboard.type('80');
    await press(page, 'Enter');
    const list = page.getByRole('list', { name: 'What to look at in the tables' });
    expect(await list.getByRole('listitem').count()).toBe(2);
    await list.getByText('“wide” is not a length: write it like 95.2.').waitFor();
    await list.getByText(/less than at size “10” before/).waitFor();
    await expectAccessible(page);
    await page.getByRole('button', { name: 'Save as revision 2' }).click();
    await page.getByRole('alert').getByText('One error is to be mended').waitFor();
    await list.getByRole('link', { name: 'Bust girth, size 12' }).click();
    expect(await atHand(page)).toBe('chart-line-0-size-1');
    expect((await wholeOf(page, visit, patternId)).latestRevisionNumber).toBe(1);
    await page.keyboard.type('88.4');
    await press(page, 'Enter');
    await page.getByRole('button', { name: 'Save as revision 2' }).click();
    await page.getByText('Revision 2, shown here').waitFor();
  });
});

describe('pasting and copying a block', () => {
  it('lays it where the hand is, grows the table, and says so; the other way round on demand', async () => {
    const { page } = await openTable(visit);
    await cell(page, 'chart', 1, 1).focus();
    await paste(page, '70\t74\t78\n92\t96\t100\n45\t46\t47\n');
    await page.getByText('9 cells pasted in. 1 size and 1 point added.').waitFor();
    expect(await textOf(page, 'chart', 1, 3)).toBe('78');
    expect(await textOf(page, 'chart', 3, 1)).toBe('45');
    await expectAccessible(page);
    await page.getByRole('button', { name: 'Lay what was pasted in the other way round' }).click();
    expect(await textOf(page, 'chart', 1, 2)).toBe('92');
    await press(page, 'Control+z', 'Control+z');
    expect(await textOf(page, 'chart', 1, 1)).toBe('68');
  });

  it('reads a whole table by its headings, whichever way it lies', async () => {
    const { page, patternId } = await openTable(visit);
    await cell(page, 'finished', 0, 0).focus();
    await paste(
      page,
      'Size\tBust (in)\tUpper arm (in)\n10\t36 1/2\t12\n12\t38\t12 1/2\n14\t39 5/8\t13\n16\t41\t14',
    );
    await page
      .getByText(/8 cells pasted in, by the names of their points and sizes\. 1 size and 1 point added/)
      .waitFor();
    await page.getByRole('button', { name: /Save as/ }).click();
    // Size 16 has no measurement in the chart yet.
    await page.getByText('Size “16” has no measurement in the size chart').first().waitFor();
    await cell(page, 'chart', 0, 3).focus();
    await page.keyboard.type('96');
    await press(page, 'Enter');
    await page.getByRole('button', { name: /Save as/ }).click();
    await page.getByText('Revision 2, shown here').waitFor();
    const { table } = (await wholeOf(page, visit, patternId)).revision;
    expect(table.sizes).toEqual(['10', '12', '14', '16']);
    const bust = table.finished.find(({ point }) => point === 'bust');
    expect([bust?.unit, bust?.mm]).toEqual(['in', [927.1, 965.2, 1006.475, 1041.4]]);
    expect(table.finished.find(({ point }) => point === 'upperArm')?.mm[3]).toBe(355.6);
  });

  it('copies a block that is marked as tabs and lines, and empties one', async () => {
    const { page } = await openTable(visit);
    await cell(page, 'chart', 0, 0).focus();
    await press(page, 'Shift+ArrowRight', 'Shift+ArrowDown', 'Control+c');
    await page.getByText('4 cells copied.').waitFor();
    expect(await page.evaluate(() => navigator.clipboard.readText())).toBe('84\t88\n64\t68');
    expect(
      await page
        .getByRole('grid', { name: /size chart/ })
        .getByRole('gridcell', { selected: true })
        .count(),
    ).toBe(4);
    await press(page, 'Delete');
    expect(await textOf(page, 'chart', 1, 0)).toBe('');
    await press(page, 'Control+z');
    expect(await textOf(page, 'chart', 1, 0)).toBe('64');
  });
});

describe('sizes and points', () => {
  it('are added, moved, renamed and removed, each point used once', async () => {
    const { page, patternId } = await openTable(visit);
    await cell(page, 'chart', 0, 2).focus();
    await page.getByRole('button', { name: 'Add a size after 14' }).first().click();
    expect(await atHand(page)).toBe('chart-line--1-size-3');
    await page.keyboard.type('16');
    await press(page, 'Enter');
    await page.keyboard.type('96');
    await press(page, 'Enter');
    await cell(page, 'finished', 0, 3).focus();
    await page.keyboard.type('104');
    await press(page, 'Enter');
    await cell(page, 'chart', 2, 0).focus();
    await page.getByRole('button', { name: 'Remove: Hip girth' }).first().click();
    await page.getByRole('button', { name: 'Move up: Waist girth' }).first().click();
    await page.getByRole('button', { name: 'Add a point' }).first().click();
    const chooser = page.getByLabel('Point of line 3').first();
    expect(await chooser.locator('option', { hasText: /^Waist girth$/ }).count()).toBe(0);
    await chooser.selectOption('upperArm');
    await cell(page, 'chart', 2, 0).focus();
    await page.keyboard.type('28');
    await press(page, 'Enter');
    await page.getByRole('button', { name: /Save as/ }).click();
    await page.getByText('Revision 2, shown here').waitFor();
    const { table } = (await wholeOf(page, visit, patternId)).revision;
    expect(table.sizes).toEqual(['10', '12', '14', '16']);
    expect(table.chart.map(({ point }) => point)).toEqual(['waist', 'bust', 'upperArm']);
  });
});
