import { gzipSync } from 'node:zlib';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { expectAccessible } from '../support/accessible.ts';
import { PHONE, visitor } from '../support/browser.ts';

const visit = visitor();

const answer = (page: Page) => page.getByRole('heading', { level: 2 }).first();
const slider = (page: Page, zone: string) => page.getByRole('slider', { name: `Size at the ${zone}` });

describe('the front page', () => {
  it('is a working plan without an account, accessible in both schemes', async () => {
    const page = await visit.open('/');
    await slider(page, 'hip').waitFor();
    expect(await page.getByRole('heading', { level: 1 }).innerText()).toBe('Know the room before you cut');
    expect(await answer(page).innerText()).toMatch(/^Cut .+\.$/);
    await expectAccessible(page);
  });

  it('answers for another person and another pattern', async () => {
    const page = await visit.open('/');
    const before = await answer(page).innerText();
    await page.getByLabel('Pattern').selectOption({ label: 'Lockkeeper shirt' });
    expect(await answer(page).innerText()).not.toBe(before);
    await page.getByLabel('Person').selectOption({ label: 'Noor' });
    // Noor measures in inches, and so does everything on the page.
    expect(await page.getByText('ease, in', { exact: true }).count()).toBe(1);
    expect(await page.getByLabel('Silhouette').inputValue()).toBe('semiFitted');
  });

  it('moves a size by keyboard and lets go of it with one click', async () => {
    const page = await visit.open('/');
    const before = await answer(page).innerText();
    const hip = slider(page, 'hip');
    await hip.focus();
    await page.keyboard.press('End');
    expect(await hip.getAttribute('aria-valuetext')).toMatch(
      /^32, hip: ease .+ cm, looser than drafted, held$/,
    );
    expect(await page.evaluate(() => document.activeElement?.getAttribute('aria-label'))).toBe(
      'Size at the hip',
    );
    expect(await answer(page).innerText()).toContain('32 from the hip down');
    await page.getByRole('button', { name: 'Back to the plan' }).click();
    expect(await answer(page).innerText()).toBe(before);
  });

  it('cuts between the lines where it is told to', async () => {
    const page = await visit.open('/');
    const before = await answer(page).innerText();
    const hip = slider(page, 'hip');
    await page.getByLabel('Cutting lines').selectOption('between');
    expect(await answer(page).innerText()).toMatch(/halfway between \d+ and \d+/);
    await hip.focus();
    await page.keyboard.press('Home');
    await page.keyboard.press('ArrowRight');
    expect(await hip.getAttribute('aria-valuetext')).toMatch(/^halfway between 6 and 8, hip: .*, held$/);
    await page.keyboard.press('End');
    expect(await hip.getAttribute('aria-valuenow')).toBe('13');
    await page.getByLabel('Cutting lines').selectOption('along');
    expect(await answer(page).innerText()).toBe(before);
  });

  it('holds fourteen sizes on a phone without scrolling sideways, with targets of 44 px', async () => {
    const page = await visit.open('/', { viewport: PHONE });
    await slider(page, 'hip').waitFor();
    const overflow = () => page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    expect(await overflow()).toBeLessThanOrEqual(0);
    for (const node of await page.getByRole('slider').all()) {
      const box = await node.boundingBox();
      expect(box?.width).toBeGreaterThanOrEqual(44);
      expect(box?.height).toBeGreaterThanOrEqual(44);
    }
    await page.getByRole('button', { name: 'Draw all of them' }).click();
    expect(await page.getByText('All 14 sizes are drawn.').count()).toBe(1);
    expect(await overflow()).toBeLessThanOrEqual(0);
  });

  it('never lets the path cross a name on the phone', async () => {
    const page = await visit.open('/', { viewport: PHONE });
    await slider(page, 'hip').waitFor();
    const rightmost = await page
      .getByRole('slider')
      .evaluateAll((nodes) => Math.max(...nodes.map((node) => node.getBoundingClientRect().right)));
    for (const name of ['Bust', 'Waist', 'Hip']) {
      const box = await page.getByText(name, { exact: true }).first().boundingBox();
      expect(box?.x).toBeGreaterThanOrEqual(rightmost - 22);
    }
  });

  it('asks for no more than 170 kB of script, gzipped, and for no chart library', async () => {
    const page = await visit.open('/');
    await slider(page, 'hip').waitFor();
    await page.waitForLoadState('networkidle');
    const addresses = await page.evaluate(() =>
      performance
        .getEntriesByType('resource')
        .map((entry) => entry.name)
        .filter((name) => name.endsWith('.js')),
    );
    expect(addresses.length).toBeGreaterThan(0);
    let bytes = 0;
    for (const address of addresses) {
      const body = await (await page.request.get(address)).body();
      expect(body.includes('recharts'), address).toBe(false);
      bytes += gzipSync(body).length;
    }
    expect(bytes).toBeLessThanOrEqual(170_000);
  });

  it('shows whoever is signed in the way to their own', async () => {
    const page = await visit.open('/', { as: 'newMember' });
    await page.getByRole('link', { name: 'Plan a garment' }).click();
    await page.getByRole('heading', { name: 'Begin with whoever it is for' }).waitFor();
    expect(await page.getByRole('link', { name: 'Add a person' }).getAttribute('href')).toBe('/people/new');
  });
});
