import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { paths } from '../../src/paths.ts';
import { expectAccessible } from '../support/accessible.ts';
import { PHONE, visitor, type VisitOptions } from '../support/browser.ts';

const visit = visitor();
const peopleSchema = z.object({
  items: z.array(z.object({ id: z.string(), name: z.string(), latestSetId: z.string() })),
});
const patternsSchema = z.object({
  items: z.array(z.object({ title: z.string(), latestRevisionId: z.string() })),
});
const setsSchema = z.object({ items: z.array(z.object({ id: z.string() })) });
const idSchema = z.object({ id: z.string() });

const answer = (page: Page) => page.getByRole('heading', { level: 1 });
const slider = (page: Page, zone: string) => page.getByRole('slider', { name: `Size at the ${zone}` });
const confirmed = (page: Page) => page.getByText(/^Confirmed by the server/);

/** The demo's Tilde in the demo's dress of fourteen sizes. */
async function openDress(options: VisitOptions & { hold?: string; cut?: string } = {}): Promise<Page> {
  const page = await visit.open(paths.people, { as: 'member', ...options });
  const people = peopleSchema.parse(await (await page.request.get('/api/people')).json());
  const patterns = patternsSchema.parse(await (await page.request.get('/api/patterns')).json());
  const search = new URLSearchParams({
    set: people.items.find(({ name }) => name === 'Tilde')!.latestSetId,
    revision: patterns.items.find(({ title }) => title === 'Sluice dress')!.latestRevisionId,
    ...(options.hold && { hold: options.hold }),
    ...(options.cut && { cut: options.cut }),
  });
  await page.goto(`${paths.fit}?${search.toString()}`);
  await slider(page, 'hip').waitFor();
  return page;
}

describe('the fit view', () => {
  it('answers in a sentence that the server confirms', async () => {
    const page = await openDress();
    expect(await answer(page).innerText()).toMatch(/^Cut .+\.$/);
    expect(await page.title()).toMatch(/^Cut .+ · Leeway$/);
    await confirmed(page).waitFor();
    await expectAccessible(page);
  });

  it('stays accessible on the phone while a size is held and the table is open', async () => {
    const page = await openDress({ viewport: PHONE, hold: 'hip:20' });
    await page.getByText('The same as a table').click();
    await page.getByRole('table').waitFor();
    await expectAccessible(page);
  });

  it('says the same in its table', async () => {
    const page = await openDress();
    const said = (await slider(page, 'bust').getAttribute('aria-valuetext')) ?? '';
    const [, size, ease] = /^(\S+), bust: ease (\S+) cm/.exec(said) ?? [];
    await page.getByText('The same as a table').click();
    const cells = await page.getByRole('row', { name: /^Bust/ }).getByRole('cell').allInnerTexts();
    expect(cells[1]).toBe(size);
    expect(cells).toContain(ease);
  });

  it('keeps what is held in the address, through a reload, and lets go by keyboard', async () => {
    const page = await openDress();
    const before = await answer(page).innerText();
    const hip = slider(page, 'hip');
    await hip.focus();
    await page.keyboard.press('ArrowRight');
    const held = await answer(page).innerText();
    expect(held).not.toBe(before);
    await page.waitForURL(/hold=hip%3A\d+/);
    await confirmed(page).waitFor();
    await page.reload();
    await slider(page, 'hip').waitFor();
    expect(await answer(page).innerText()).toBe(held);
    await slider(page, 'hip').focus();
    await page.keyboard.press('Delete');
    expect(await answer(page).innerText()).toBe(before);
    await page.waitForURL((url) => !url.searchParams.has('hold'));
  });

  it('drags a size by pointer, marks it as held with a word, and goes back to the plan', async () => {
    const page = await openDress();
    const before = await answer(page).innerText();
    const bust = slider(page, 'bust');
    await bust.scrollIntoViewIfNeeded();
    const was = Number(await bust.getAttribute('aria-valuenow'));
    const box = (await bust.boundingBox())!;
    const x = box.x + box.width / 2;
    const y = box.y + box.height / 2;
    await page.mouse.move(x, y);
    await page.mouse.down();
    await page.mouse.move(x + 88, y, { steps: 8 });
    await page.mouse.up();
    expect(Number(await bust.getAttribute('aria-valuenow'))).toBe(was + 2);
    expect(await page.getByRole('button', { name: 'held at the bust' }).count()).toBe(1);
    expect(await answer(page).innerText()).not.toBe(before);
    await page.getByRole('button', { name: 'Back to the plan' }).click();
    expect(await answer(page).innerText()).toBe(before);
    expect(await page.getByRole('button', { name: 'held at the bust' }).count()).toBe(0);
  });

  it('takes another way to cut it with one click', async () => {
    const page = await openDress();
    await page.getByRole('button', { name: /^Cut it this way: \S+ throughout/ }).click();
    expect(await answer(page).innerText()).toMatch(/^Cut \S+ throughout\.$/);
  });

  it('draws the ease over all sizes when somebody comes near it', async () => {
    const page = await openDress();
    expect(await page.locator('.recharts-surface').count()).toBe(0);
    await page.getByRole('heading', { name: /^Ease in every size/ }).scrollIntoViewIfNeeded();
    await page.locator('.recharts-surface').first().waitFor();
    expect(await page.getByText(/ease runs from .+ at size 6 to .+ at size 32/).count()).toBe(1);
  });

  it('saves the plan under a name and opens it exactly as it was', async () => {
    const page = await openDress({ hold: 'hip:20' });
    const said = await answer(page).innerText();
    await page.getByRole('button', { name: 'Save this plan' }).click();
    const name = page.getByLabel('Name of the plan');
    await name.fill(' ');
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    expect(await page.getByText('Give the plan a name.').count()).toBe(1);
    const called = `Spring dress ${Math.random().toString(36).slice(2, 8)}`;
    await name.fill(called);
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    await page.getByRole('link', { name: `Open ${called}` }).click();
    await page.getByRole('heading', { level: 1, name: called }).waitFor();
    expect(await page.getByRole('heading', { level: 2 }).first().innerText()).toBe(said);
    expect(await page.getByRole('slider').count()).toBe(0);
    await expectAccessible(page);

    await page.goto(`${paths.plans}?q=${encodeURIComponent(called)}`);
    await page.getByRole('link', { name: called }).click();
    await page.getByRole('button', { name: 'Rename' }).click();
    await page.getByLabel('Name of the plan').fill(`${called}, second`);
    await page.getByRole('button', { name: 'Rename' }).click();
    await page.getByRole('heading', { level: 1, name: `${called}, second` }).waitFor();
    await page.getByRole('button', { name: 'Delete' }).click();
    await page.getByRole('button', { name: 'Delete the plan' }).click();
    await page.waitForURL(`**${paths.plans}`);
    expect(await page.getByRole('link', { name: called }).count()).toBe(0);
  });

  it('says on a saved plan that somebody has been measured since, and offers to plan anew', async () => {
    const page = await openDress();
    const now = new URL(page.url()).searchParams;
    const people = peopleSchema.parse(await (await page.request.get('/api/people')).json());
    const tilde = people.items.find(({ name }) => name === 'Tilde')!;
    const sets = setsSchema.parse(
      await (await page.request.get(`/api/people/${tilde.id}/measurement-sets`)).json(),
    );
    const earlier = sets.items.find(({ id }) => id !== tilde.latestSetId)!;
    const saved = await page.request.post('/api/plans', {
      headers: { origin: visit.baseURL },
      data: {
        name: 'As in April',
        measurementSetId: earlier.id,
        revisionId: now.get('revision'),
        options: {},
      },
    });
    await page.goto(paths.plan(idSchema.parse(await saved.json()).id));
    await page.getByText(/^Tilde has been measured since, on 7 November 2026\./).waitFor();
    await page.getByRole('link', { name: 'Plan it anew' }).click();
    await slider(page, 'hip').waitFor();
    expect(new URL(page.url()).searchParams.get('set')).toBe(tilde.latestSetId);
  });
});

describe('the fit view, cut between the lines', () => {
  it('is a word of the setting, stands in the address, and is confirmed by the server', async () => {
    const page = await openDress();
    expect(await answer(page).innerText()).not.toContain('halfway');
    await page.getByLabel('Cutting lines').selectOption('between');
    await page.waitForURL(/cut=between/);
    await page.getByRole('heading', { level: 1, name: /halfway between \d+ and \d+/ }).waitFor();
    const said = await answer(page).innerText();
    await confirmed(page).waitFor();
    await expectAccessible(page);
    await page.reload();
    await slider(page, 'hip').waitFor();
    expect(await answer(page).innerText()).toBe(said);
    await page.getByLabel('Cutting lines').selectOption('along');
    await page.waitForURL((url) => !url.searchParams.has('cut'));
    await page.getByRole('heading', { level: 1, name: /^Cut (?!.*halfway)/ }).waitFor();
  });

  it('stops at half sizes by key and by pointer, keeps them in the address, and says them in the table', async () => {
    const page = await openDress({ cut: 'between', hold: 'hip:18' });
    const hip = slider(page, 'hip');
    const was = Number(await hip.getAttribute('aria-valuenow'));
    await hip.focus();
    await page.keyboard.press('ArrowRight');
    expect(Number(await hip.getAttribute('aria-valuenow'))).toBe(was + 0.5);
    expect(await hip.getAttribute('aria-valuetext')).toMatch(/^halfway between 18 and 20, hip: .*, held$/);
    expect(await page.getByText('You hold the hip halfway between 18 and 20.').count()).toBe(1);
    await page.waitForURL((url) => url.searchParams.get('hold') === 'hip:18–20');
    await confirmed(page).waitFor();
    await page.reload();
    await hip.waitFor();
    expect(Number(await hip.getAttribute('aria-valuenow'))).toBe(was + 0.5);

    await hip.scrollIntoViewIfNeeded();
    const box = (await hip.boundingBox())!;
    const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
    await page.mouse.move(x, y);
    await page.mouse.down();
    await page.mouse.move(x - 44, y, { steps: 8 });
    await page.mouse.up();
    expect(Number(await hip.getAttribute('aria-valuenow'))).toBe(was - 0.5);
    await page.getByText('The same as a table').click();
    const cells = await page.getByRole('row', { name: /^Hip/ }).getByRole('cell').allInnerTexts();
    expect(cells[1]).toBe('16–18, held');
    expect(await page.getByText(/^Draw the lines? .*halfway between 16 and 18/).count()).toBe(1);
  });

  it('stays accessible on the phone, and draws the ease with a place between two sizes', async () => {
    const page = await openDress({ viewport: PHONE, cut: 'between', hold: 'hip:18–20' });
    await page.getByRole('heading', { name: /^Ease in every size/ }).scrollIntoViewIfNeeded();
    await page.getByLabel('Point', { exact: true }).selectOption('hip');
    await page.locator('.recharts-label', { hasText: '18–20' }).waitFor();
    await expectAccessible(page);
  });

  it('holds nothing between the lines where it is cut along them', async () => {
    const page = await openDress({ hold: 'hip:18–20' });
    expect(await page.getByText(/^You hold/).count()).toBe(0);
    expect(await answer(page).innerText()).not.toContain('halfway');
  });

  it('is kept by a saved plan, and said in the list of plans', async () => {
    const page = await openDress({ cut: 'between', hold: 'hip:18–20' });
    const said = await answer(page).innerText();
    expect(said).toContain('halfway between 18 and 20');
    const search = new URL(page.url()).searchParams;
    const saved = await page.request.post('/api/plans', {
      headers: { origin: visit.baseURL },
      data: {
        name: 'Between the lines',
        measurementSetId: search.get('set'),
        revisionId: search.get('revision'),
        options: { cutBetweenLines: true, held: { hip: 6.5 } },
      },
    });
    const { id } = idSchema.parse(await saved.json());
    await page.goto(paths.plan(id));
    await page.getByText('also between the lines').waitFor();
    expect(await page.getByRole('heading', { level: 2 }).first().innerText()).toBe(said);
    await page.goto(`${paths.plans}?q=Between`);
    await page
      .getByText(/halfway between 18 and 20/)
      .first()
      .waitFor();
  });
});

describe('the fit view of a new account', () => {
  it('begins with a person, then a pattern, and refuses a knit in words', async () => {
    const page = await visit.open(paths.fit, { as: 'newMember' });
    await page.getByRole('heading', { name: 'Begin with whoever it is for' }).waitFor();
    const send = async (path: string, data: unknown) => {
      const response = await page.request.post(path, { headers: { origin: visit.baseURL }, data });
      expect(response.ok(), path).toBe(true);
      return response.json() as Promise<unknown>;
    };
    const person = idSchema.parse(
      await send('/api/people', { name: 'Ines', stage: 'adult', chestWord: 'bust', unit: 'cm' }),
    );
    await page.reload();
    await page.getByRole('heading', { name: 'Then the pattern' }).waitFor();
    await expectAccessible(page);

    await send(`/api/people/${person.id}/measurement-sets`, {
      takenOn: '2026-10-12',
      takenBy: 'self',
      unit: 'cm',
      typed: { bust: '92', waist: '74' },
    });
    const details = { title: 'Tight top', kind: 'knitTop', silhouette: 'close', structure: 'knit' };
    const draft = idSchema.parse(await send('/api/imports', { details }));
    const upload = await page.request.put(`/api/imports/${draft.id}/tables/chart`, {
      headers: { origin: visit.baseURL },
      multipart: {
        file: {
          name: 'top.csv',
          mimeType: 'text/csv',
          buffer: Buffer.from('Size,Bust (cm)\nS,88\nM,92\nL,96\n'),
        },
      },
    });
    expect(upload.ok()).toBe(true);
    await send(`/api/imports/${draft.id}/commit`, {});
    await page.reload();
    await page.getByRole('link', { name: 'Ines' }).click();
    await page.waitForURL(/set=/);
    await page.getByRole('link', { name: 'Tight top' }).click();
    await page.getByRole('heading', { level: 1, name: /drafted for a knit/ }).waitFor();
    expect(await page.getByRole('slider').count()).toBe(0);
    await expectAccessible(page);
  });
});
