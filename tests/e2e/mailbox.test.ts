import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { expectAccessible } from '../support/accessible.ts';
import {
  DESK,
  launchBrowser,
  NEW_PASSWORD,
  newVisit,
  PHONE,
  visitor,
  watchPage,
} from '../support/browser.ts';
import { startServedApp, type ServedApp } from '../support/served-app.ts';

const heading = (page: Page, name: string) => page.getByRole('heading', { level: 1, name, exact: true });
const newEmail = () => `sewist-${Math.random().toString(36).slice(2)}@example.org`;

async function askForNewPassword(page: Page, email: string) {
  await page.getByLabel('E-mail address', { exact: true }).fill(email);
  await page.getByRole('button', { name: 'Send the link' }).click();
  await heading(page, 'Look into your mail').waitFor();
}

describe('the mailbox of this machine', () => {
  let app: ServedApp;
  let browser: Browser;
  let context: BrowserContext;
  const faults: string[] = [];

  beforeAll(async () => {
    app = await startServedApp({ isDirect: true });
    browser = await launchBrowser();
  });
  afterAll(async () => {
    await browser.close();
    await app.stop();
  });
  afterEach(async () => {
    await context.close();
    expect(faults.splice(0), 'the browser reported').toEqual([]);
  });

  async function open(path: string, viewport = DESK): Promise<Page> {
    context = await newVisit(browser, app.url, { isDirect: true, viewport });
    const page = await context.newPage();
    watchPage(page, faults);
    await page.goto(path);
    return page;
  }

  it('says so while there is none, and shows what comes by itself', async () => {
    const page = await open('/mailbox', PHONE);
    await page.getByRole('heading', { name: 'No mail yet' }).waitFor();
    await expectAccessible(page);
    const { email } = app.signIns[0]!;
    await fetch(`${app.url}/api/auth/request-password-reset`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', origin: app.url },
      body: JSON.stringify({ email }),
    });
    await page.getByRole('listitem').filter({ hasText: email }).waitFor();
    await page.getByText('1 mail, the newest first').waitFor();
    await expectAccessible(page);
  });

  it('is offered where an account is made, and the link in its mail leads on', async () => {
    const page = await open('/sign-up', PHONE);
    const email = newEmail();
    await page.getByLabel('Name', { exact: true }).fill('Ida');
    await page.getByLabel('E-mail address', { exact: true }).fill(email);
    await page.getByLabel('Password', { exact: true }).fill(NEW_PASSWORD);
    await page.getByRole('button', { name: 'Make the account' }).click();
    await heading(page, 'You are in').waitFor();
    await page.getByRole('link', { name: 'the mailbox here' }).click();
    await heading(page, 'The mailbox here').waitFor();
    await page.getByRole('listitem').filter({ hasText: email }).getByRole('link').click();
    await heading(page, 'Confirm your e-mail address').waitFor();
    // What came by mail is drawn as text only.
    expect(await page.locator('iframe').count()).toBe(0);
    await expectAccessible(page);
    const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    expect(overflow).toBeLessThanOrEqual(0);
    await page
      .getByRole('main')
      .getByRole('link', { name: /confirm-address/ })
      .click();
    await page.getByRole('button', { name: 'Confirm the address' }).click();
    await heading(page, 'Your address is confirmed').waitFor();
  });

  it('is offered where a new password is asked for', async () => {
    const page = await open('/forgotten-password');
    await askForNewPassword(page, newEmail());
    await page.getByRole('link', { name: 'the mailbox here' }).waitFor();
  });

  it('has nothing at the address of a mail that there is not', async () => {
    const page = await open('/mailbox/0190a000-0000-7000-8000-000000000001');
    await heading(page, 'There is nothing here').waitFor();
  });
});

describe('an instance whose mail goes out', () => {
  const visit = visitor();

  it('has no mailbox, and offers none', async () => {
    const page = await visit.open('/mailbox');
    await heading(page, 'There is nothing here').waitFor();
    await page.goto('/forgotten-password');
    await askForNewPassword(page, newEmail());
    await page.waitForLoadState('networkidle');
    expect(await page.getByRole('link', { name: 'the mailbox here' }).count()).toBe(0);
  });
});
