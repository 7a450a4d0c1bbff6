import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { expectAccessible } from '../support/accessible.ts';
import { DESK, PHONE, visitor } from '../support/browser.ts';

const visit = visitor();
const heading = (page: Page, name: string) => page.getByRole('heading', { level: 1, name, exact: true });

describe('the page of the interface', () => {
  it('shows every route of the description, each under its noun', async () => {
    const page = await visit.open('/interface');
    await heading(page, 'The interface for scripts').waitFor();
    const description = (await (await fetch(`${visit.baseURL}/api/openapi.json`)).json()) as {
      paths: Record<string, Record<string, { operationId: string; tags: string[] }>>;
    };
    const operations = Object.values(description.paths).flatMap((item) => Object.values(item));
    expect(operations.length).toBeGreaterThan(20);
    for (const { operationId, tags } of operations) {
      const section = page.locator('section').filter({ has: page.locator(`[id="${operationId}"]`) });
      expect(await section.locator('h2').innerText(), operationId).toBe(tags[0]);
    }
  });

  it.each([DESK, PHONE])(
    'opens a route: who may, the scope, what is sent, and curl ($width px)',
    async (viewport) => {
      const page = await visit.open('/interface#postPeople', { viewport });
      const route = page.locator('details').filter({ has: page.locator('#postPeople') });
      await route.getByText('people:write').waitFor();
      const text = await route.innerText();
      expect(text).toContain('Whoever has an account');
      expect(text).toContain(`curl -X POST '${visit.baseURL}/api/people'`);
      expect(text).toContain('Bearer $LEEWAY_TOKEN');
      await expectAccessible(page);
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(overflow).toBeLessThanOrEqual(0);
      await route.getByRole('link', { name: 'PersonInput' }).first().click();
      await page
        .locator('details[open]')
        .filter({ has: page.locator('#shape-PersonInput') })
        .waitFor();
    },
  );

  it('finds routes by their words, in the address', async () => {
    const page = await visit.open('/interface');
    await page.getByLabel('Find a route').fill('measurement-sets delete');
    await expect.poll(() => page.locator('section summary[id^="delete"]').count()).toBe(1);
    expect(new URL(page.url()).searchParams.get('q')).toBe('measurement-sets delete');
    await page.getByLabel('Find a route').fill('no such words');
    await page.getByText('No route has these words.').waitFor();
  });
});
