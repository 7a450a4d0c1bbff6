import { beforeAll, describe, expect, it } from 'vitest';
import { expectAccessible } from '../support/accessible.ts';
import { accountOf, DESK, launchBrowser, newVisit, PHONE, signIn, visitor } from '../support/browser.ts';
import { everyPage, pageNames, type DrawnPage } from '../support/pages.ts';

const visit = visitor();
let pages: DrawnPage[] = [];

beforeAll(async () => {
  const browser = await launchBrowser();
  const context = await newVisit(browser, visit.baseURL);
  await signIn(context, visit.baseURL, accountOf(visit.signIns, 'member'));
  pages = await everyPage(context.request, visit.baseURL);
  await browser.close();
});

describe('every page', () => {
  it('is in the list that the pictures and these checks are made from', () => {
    expect(pages.map(({ name }) => name)).toEqual(expect.arrayContaining(pageNames()));
  });

  it.each([...pageNames(), 'not-found'])(
    '%s: one heading, no fault in the console, accessible, no sideways scrolling',
    async (name) => {
      const drawn = pages.find((page) => page.name === name);
      if (!drawn) throw new Error(`${name} was not found`);
      const page = await visit.open(drawn.path, drawn.as === null ? {} : { as: drawn.as });
      await page.locator('h1').waitFor();
      await page.waitForLoadState('networkidle');
      expect(await page.title()).toMatch(/Leeway/);
      expect(await page.locator('main').count()).toBe(1);
      for (const viewport of [DESK, PHONE]) {
        await page.setViewportSize(viewport);
        const overflow = () => page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
        // What is drawn to the window's width is drawn anew a moment after it changed.
        await expect
          .poll(overflow, { message: `${name} at ${String(viewport.width)} px`, timeout: 10_000 })
          .toBeLessThanOrEqual(0);
        await expectAccessible(page);
      }
    },
  );
});
