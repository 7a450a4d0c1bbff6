import { readFileSync } from 'node:fs';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { accountSchema } from '../../shared/account-answers.ts';
import { expectAccessible } from '../support/accessible.ts';
import { DESK, NEW_PASSWORD, PHONE, visitor } from '../support/browser.ts';
import { mailTo, pathIn } from '../support/received-mail.ts';

const visit = visitor();
const ANOTHER_PASSWORD = 'another quiet tape';

const heading = (page: Page, name: string) => page.getByRole('heading', { level: 1, name, exact: true });
const button = (page: Page, name: string) => page.getByRole('button', { name, exact: true });
const word = (page: Page, what: string) => page.getByRole('button', { name: new RegExp(`^Change ${what}:`) });
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });
const newEmail = () => `sewist-${Math.random().toString(36).slice(2)}@example.org`;

/** Somebody new on their account's page. */
async function accountPage(viewport = DESK): Promise<{ page: Page; email: string }> {
  const page = await visit.open('/account', { as: 'newMember', viewport });
  await heading(page, 'Your account').waitFor();
  const { email } = accountSchema.parse(await (await page.request.get('/api/account')).json());
  return { page, email };
}

async function signInOnPage(page: Page, email: string, password: string) {
  await page.goto('/sign-in');
  await field(page, 'E-mail address').fill(email);
  await field(page, 'Password').fill(password);
  await button(page, 'Sign in').click();
}

describe('the account as a sentence', () => {
  it('opens by keyboard what changes a word, and tells in the header too', async () => {
    const { page } = await accountPage();
    await word(page, 'your name').press('Enter');
    expect(new URL(page.url()).search).toBe('?change=name');
    await field(page, 'Name').fill(' ');
    await button(page, 'Change the name').click();
    await page.getByRole('alert').waitFor();
    await expectAccessible(page);
    await field(page, 'Name').fill('Robin Ash');
    await field(page, 'Name').press('Enter');
    await page.getByText('From now on we call you Robin Ash.').waitFor();
    await page.getByRole('banner').getByText('Robin Ash').waitFor();
    expect(await word(page, 'your name').evaluate((one) => one === document.activeElement)).toBe(true);
    expect(new URL(page.url()).search).toBe('');
    await page.reload();
    await word(page, 'your name').getByText('Robin Ash').waitFor();
  });

  it('changes the address only once the mail to the new one is answered', async () => {
    const { page, email } = await accountPage(PHONE);
    const next = newEmail();
    await word(page, 'your e-mail address').click();
    await field(page, 'New e-mail address').fill(next);
    await field(page, 'Your password').fill('not this one at all');
    await button(page, 'Write to the new address').click();
    await page.locator('#password-error').waitFor();
    await expectAccessible(page);
    await field(page, 'Your password').fill(NEW_PASSWORD);
    await button(page, 'Write to the new address').click();
    await page.getByText(`We have written to ${next}`).waitFor();
    await word(page, 'your e-mail address').getByText(email).waitFor();

    await page.goto(pathIn(await mailTo(next, 'Confirm your new e-mail address')));
    await button(page, 'Confirm the address').click();
    await page.getByRole('link', { name: 'To your account' }).click();
    await word(page, 'your e-mail address').getByText(next).waitFor();
  });

  it('changes the password, which signs out every other place', async () => {
    const { page, email } = await accountPage();
    const other = await visit.open('/sign-in');
    await signInOnPage(other, email, NEW_PASSWORD);
    await heading(other, 'People').waitFor();

    await word(page, 'your password').click();
    await field(page, 'Password until now').fill('not this one at all');
    await field(page, 'New password').fill(ANOTHER_PASSWORD);
    await button(page, 'Change the password').click();
    await page.locator('#currentPassword-error').waitFor();
    await field(page, 'Password until now').fill(NEW_PASSWORD);
    await button(page, 'Change the password').click();
    await page.getByText('The password is changed').waitFor();
    await page.getByText('Nowhere else.').waitFor();

    await other.goto('/plans');
    await heading(other, 'Sign in').waitFor();
    await signInOnPage(other, email, ANOTHER_PASSWORD);
    await heading(other, 'People').waitFor();
  });
});

describe('where somebody is signed in', () => {
  it('is told in plain words, this one marked, and another is signed out from here', async () => {
    const { page, email } = await accountPage();
    const other = await visit.open('/sign-in');
    await signInOnPage(other, email, NEW_PASSWORD);
    await heading(other, 'People').waitFor();
    await page.reload();
    const list = page.locator('section[aria-labelledby="sessions"] li');
    await expect.poll(() => list.count()).toBe(2);
    expect(await list.first().innerText()).toContain('Chrome on Linux, this one');
    await page.getByRole('button', { name: /^Sign out Chrome on Linux, last used/ }).click();
    await expect.poll(() => list.count()).toBe(1);
    await other.goto('/plans');
    await heading(other, 'Sign in').waitFor();
  });

  it('ends everywhere else at once, after asking', async () => {
    const { page, email } = await accountPage();
    for (let count = 0; count < 2; count += 1) {
      const other = await visit.open('/sign-in');
      await signInOnPage(other, email, NEW_PASSWORD);
      await heading(other, 'People').waitFor();
    }
    await page.reload();
    await button(page, 'Sign out everywhere else').click();
    const dialog = page.getByRole('alertdialog');
    await dialog.waitFor();
    await expectAccessible(page);
    await dialog.getByRole('button', { name: 'Sign out everywhere else' }).click();
    await page.getByText('Nowhere else.').waitFor();
  });
});

describe('tokens for scripts', () => {
  it('are made with what they may do, told once, work, and stop when withdrawn', async () => {
    const { page } = await accountPage(PHONE);
    await button(page, 'Make a token').click();
    await button(page, 'Make the token').click();
    await page.getByText('2 things to put right').waitFor();
    await expectAccessible(page);
    await field(page, 'What it is for').fill('Spreadsheet');
    await page.getByLabel('Read people').check();
    await page.getByLabel('How long it works').selectOption('30');
    await button(page, 'Make the token').click();
    const told = page.getByRole('group', { name: 'The token' });
    await told.waitFor();
    const token = (await told.innerText()).trim();
    await expectAccessible(page);
    const ask = (path: string) =>
      fetch(visit.baseURL + path, { headers: { authorization: `Bearer ${token}` } }).then(
        ({ status }) => status,
      );
    expect(await ask('/api/people')).toBe(200);
    expect(await ask('/api/patterns')).toBe(403);

    await page.reload();
    await page.getByText('Reads people.').waitFor();
    expect(await page.locator('body').innerText()).not.toContain(token);
    await button(page, 'Withdraw Spreadsheet').click();
    await button(page, 'Withdraw it').click();
    await page.getByText('You have made none.').waitFor();
    expect(await ask('/api/people')).toBe(401);
  });
});

describe('asking to teach', () => {
  it('wants a sentence, waits, and can be taken back', async () => {
    const { page } = await accountPage();
    await field(page, 'What you teach').fill('Sewing');
    await button(page, 'Ask to become a teacher').click();
    await page.getByRole('alert').waitFor();
    await field(page, 'What you teach').fill('A class of eight on shirts, at the library.');
    await button(page, 'Ask to become a teacher').click();
    await page.getByText(/^You asked on/).waitFor();
    await page.reload();
    await page.getByText('A class of eight on shirts, at the library.').waitFor();
    await button(page, 'Take the request back').click();
    await button(page, 'Ask to become a teacher').waitFor();
  });
});

describe('leaving', () => {
  it('takes everything away as one archive', async () => {
    const { page } = await accountPage();
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      button(page, 'Take everything away').click(),
    ]);
    expect(download.suggestedFilename()).toMatch(/^leeway-\d{4}-\d\d-\d\d\.zip$/);
    // Every archive of this kind begins with these four bytes (PKWARE APPNOTE 4.3.7).
    expect(
      readFileSync(await download.path())
        .subarray(0, 4)
        .toString('latin1'),
    ).toBe('PK\u0003\u0004');
    await page.getByText(/^Saved as leeway-/).waitFor();
  });

  it('says what goes, asks for the password, and then there is no account any more', async () => {
    const { page, email } = await accountPage(PHONE);
    await button(page, 'Delete the account').click();
    const dialog = page.getByRole('alertdialog', { name: 'Delete the account for good?' });
    await dialog.waitFor();
    expect(await dialog.innerText()).toContain('everything measured of them');
    await expectAccessible(page);
    await page.keyboard.press('Escape');
    await dialog.waitFor({ state: 'detached' });

    await button(page, 'Delete the account').click();
    await field(page, 'Your password').fill('not this one at all');
    await button(page, 'Delete everything').click();
    await page.locator('#delete-password-error').waitFor();
    await field(page, 'Your password').fill(NEW_PASSWORD);
    await button(page, 'Delete everything').click();
    await page.getByRole('banner').getByRole('link', { name: 'Sign in' }).waitFor();
    await signInOnPage(page, email, NEW_PASSWORD);
    await page.getByRole('alert').waitFor();
    expect(await page.getByRole('alert').innerText()).toContain('do not belong together');
  });
});

describe('the page of the account', () => {
  it.each(['', '?change=name', '?change=email', '?change=password', '?change=second-factor'])(
    'is accessible with %s open, and nothing runs off it',
    async (query) => {
      const { page } = await accountPage(PHONE);
      await page.goto(`/account${query}`);
      await heading(page, 'Your account').waitFor();
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(overflow).toBeLessThanOrEqual(0);
      await expectAccessible(page);
    },
  );

  it('says so where its parts cannot be reached, and keeps what was typed', async () => {
    const { page } = await accountPage();
    await word(page, 'your name').click();
    await field(page, 'Name').fill('Robin Ash');
    await page.route('**/api/account', (route) => route.abort());
    await button(page, 'Change the name').click();
    await page.getByText('The server cannot be reached just now.').waitFor();
    expect(await field(page, 'Name').inputValue()).toBe('Robin Ash');
    expect(visit.takeFaults().every((fault) => fault.includes('net::ERR_FAILED'))).toBe(true);
  });
});
