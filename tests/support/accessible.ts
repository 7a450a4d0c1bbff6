import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';

const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];
/** What may differ between the schemes. */
const OF_COLOUR = ['color-contrast', 'link-in-text-block'];

/** What an automatic check finds against WCAG 2.2 AA, in both colour schemes: nothing. */
export async function expectAccessible(page: Page): Promise<void> {
  const viewport = page.viewportSize();
  // A window as tall as the page, so that what sticks to its edge covers nothing but where it really stands.
  const height = await page.evaluate(() => document.documentElement.scrollHeight);
  if (viewport) await page.setViewportSize({ ...viewport, height: Math.max(viewport.height, height) });
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme });
    await page.evaluate(untilDrawn);
    const axe = new AxeBuilder({ page });
    const { violations } = await (
      colorScheme === 'light' ? axe.withTags(RULES) : axe.withRules(OF_COLOUR)
    ).analyze();
    const found = violations.map(({ id, help, nodes }) => ({
      id,
      help,
      at: nodes.map((node) => `${node.target.join(' ')}: ${node.failureSummary ?? ''}`),
    }));
    expect(found, `${page.url()} in ${colorScheme}`).toEqual([]);
  }
  if (viewport) await page.setViewportSize(viewport);
}

/** In the page: until it is drawn in the new scheme and no colour is on its way from one to the other. */
async function untilDrawn(): Promise<void> {
  const nextFrame = () =>
    new Promise((resolve) => {
      requestAnimationFrame(resolve);
    });
  await nextFrame();
  await nextFrame();
  const passing = document
    .getAnimations()
    .filter((animation) => animation.effect?.getComputedTiming().endTime !== Infinity);
  await Promise.allSettled(passing.map((animation) => animation.finished));
}
