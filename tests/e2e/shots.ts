// `npm run shots [name …]`: every page with the demo's data at two widths and in both colour schemes, into shots/.
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { accountOf, DESK, launchBrowser, newVisit, PHONE, signIn, watchPage } from '../support/browser.ts';
import { ROOT } from '../support/launcher.ts';
import { everyPage, type DrawnPage } from '../support/pages.ts';
import { startServedApp, type ServedApp } from '../support/served-app.ts';

const FOLDER = join(ROOT, 'shots');
const wanted = process.argv.slice(2);
const faults: string[] = [];

async function main(): Promise<number> {
  mkdirSync(FOLDER, { recursive: true });
  // Directly, so that the mailbox is there to be drawn.
  const app = await startServedApp({ isDirect: true });
  const browser = await launchBrowser();
  try {
    await drawAll(browser, app);
  } finally {
    await browser.close();
    await app.stop();
  }
  for (const fault of faults) console.error(fault);
  return faults.length === 0 ? 0 : 1;
}

async function drawAll(browser: Browser, app: ServedApp): Promise<void> {
  const pages = await findPages(browser, app);
  const chosen = wanted.length === 0 ? pages : pages.filter(({ name }) => wanted.includes(name));
  if (chosen.length === 0)
    throw new Error(`There is no such page. The pages: ${pages.map(({ name }) => name).join(', ')}`);
  for (const viewport of [PHONE, DESK]) {
    for (const colorScheme of ['light', 'dark'] as const) {
      const visit = () => newVisit(browser, app.url, { viewport, colorScheme, isDirect: true });
      const contexts = { nobody: await visit(), member: await visit(), admin: await visit() };
      for (const role of ['member', 'admin'] as const) {
        await signIn(contexts[role], app.url, accountOf(app.signIns, role));
      }
      for (const drawn of chosen) {
        const page = await contexts[drawn.as ?? 'nobody'].newPage();
        watchPage(page, faults);
        await draw(page, drawn, `${drawn.name}-${String(viewport.width)}-${colorScheme}.png`);
        await page.close();
      }
      for (const context of Object.values(contexts)) await context.close();
    }
  }
}

async function findPages(browser: Browser, app: ServedApp): Promise<DrawnPage[]> {
  const context = await newVisit(browser, app.url, { isDirect: true });
  await signIn(context, app.url, accountOf(app.signIns, 'member'));
  const pages = await everyPage(context.request, app.url);
  await context.close();
  return pages;
}

async function draw(page: Page, { name, path }: DrawnPage, file: string): Promise<void> {
  const began = performance.now();
  await page.goto(path, { waitUntil: 'networkidle' });
  await page.locator('h1').first().waitFor();
  await page.evaluate(() => document.fonts.ready);
  await page.screenshot({ path: join(FOLDER, file), fullPage: true, animations: 'disabled' });
  console.log(`${name.padEnd(18)}${file.padEnd(36)}${(performance.now() - began).toFixed(0)} ms`);
}

process.exit(await main());
