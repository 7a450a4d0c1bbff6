import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { accountSchema } from '../../shared/account-answers.ts';
import { expectAccessible } from '../support/accessible.ts';
import { NEW_PASSWORD, PHONE, visitor } from '../support/browser.ts';
import { mailTo, pathIn } from '../support/received-mail.ts';

const visit = visitor();
const ANOTHER_PASSWORD = 'another quiet tape';

const heading = (page: Page, name: string) => page.getByRole('heading', { level: 1, name, exact: true });
const button = (page: Page, name: string) => page.getByRole('button', { name, exact: true });
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });
const main = (page: Page) => page.getByRole('main');
const newEmail = () => `sewist-${Math.random().toString(36).slice(2)}@example.org`;

describe('making an account', () => {
  it('says that mail was sent, and the link in it confirms the address on a press', async () => {
    const page = await visit.open('/sign-up?next=/plans', { viewport: PHONE });
    const email = newEmail();
    await field(page, 'Name').fill('Ida');
    await field(page, 'E-mail address').fill(email);
    await field(page, 'Password').fill(NEW_PASSWORD);
    await button(page, 'Make the account').click();
    await heading(page, 'You are in').waitFor();
    expect(await page.evaluate(() => document.activeElement?.textContent)).toBe('You are in');
    expect(await main(page).innerText()).toContain(email);
    await expectAccessible(page);
    await button(page, 'Go on').click();
    await heading(page, 'Plans').waitFor();

    await page.goto('/account');
    await page.getByText('which is not confirmed yet').waitFor();
    await page.goto(pathIn(await mailTo(email, 'Confirm your e-mail address')));
    await heading(page, 'Confirm your e-mail address').waitFor();
    await expectAccessible(page);
    await button(page, 'Confirm the address').click();
    await heading(page, 'Your address is confirmed').waitFor();
    await page.getByRole('link', { name: 'To your account' }).click();
    await page.getByText('which is confirmed').waitFor();
  });

  it('says the same to whoever gives an address that has an account, and nobody is let in', async () => {
    const { email } = visit.signIns[0]!;
    const page = await visit.open('/sign-up');
    await field(page, 'Name').fill('Ida');
    await field(page, 'E-mail address').fill(email);
    await field(page, 'Password').fill(NEW_PASSWORD);
    await button(page, 'Make the account').click();
    await heading(page, 'Look into your mail').waitFor();
    expect(await main(page).innerText()).not.toContain('already');
    await page.goto('/people');
    await heading(page, 'Sign in').waitFor();
  });

  it('says in words that a link has no token or one that works no longer', async () => {
    const page = await visit.open('/confirm-address?token=no-such-token');
    await button(page, 'Confirm the address').click();
    await heading(page, 'The address is not confirmed').waitFor();
    expect((await page.getByRole('alert').innerText()).length).toBeGreaterThan(20);
    await expectAccessible(page);
    await page.goto('/confirm-address');
    await page.getByText('The link is not whole').waitFor();
  });
});

describe('a forgotten password', () => {
  it('is replaced by the link that was mailed; the link works once', async () => {
    const page = await visit.open('/people', { as: 'newMember' });
    const { email } = accountSchema.parse(await (await page.request.get('/api/account')).json());
    await button(page, 'Sign out').click();
    await page.getByRole('banner').getByRole('link', { name: 'Sign in' }).click();
    await page.getByRole('link', { name: 'Forgotten the password?' }).click();
    await heading(page, 'Forgotten the password?').waitFor();
    await expectAccessible(page);
    await field(page, 'E-mail address').fill(email);
    await button(page, 'Send the link').click();
    await heading(page, 'Look into your mail').waitFor();

    const path = pathIn(await mailTo(email, 'Choose a new password'));
    await page.goto(path);
    await heading(page, 'Choose a new password').waitFor();
    await field(page, 'New password').fill('short');
    await button(page, 'Use this password').click();
    await page.getByRole('alert').waitFor();
    await expectAccessible(page);
    await field(page, 'New password').fill(ANOTHER_PASSWORD);
    await button(page, 'Use this password').click();
    await heading(page, 'The new password works').waitFor();
    await page.goto('/sign-in');
    await field(page, 'E-mail address').fill(email);
    await field(page, 'Password').fill(ANOTHER_PASSWORD);
    await button(page, 'Sign in').click();
    await heading(page, 'People').waitFor();

    await page.goto(path);
    await field(page, 'New password').fill(NEW_PASSWORD);
    await button(page, 'Use this password').click();
    await heading(page, 'This link works no longer').waitFor();
    await expectAccessible(page);
    await page.getByRole('link', { name: 'Send another link' }).click();
    await heading(page, 'Forgotten the password?').waitFor();
  });

  it('is answered the same for an address that nobody has', async () => {
    const page = await visit.open('/forgotten-password', { viewport: PHONE });
    await field(page, 'E-mail address').fill(newEmail());
    await button(page, 'Send the link').click();
    await heading(page, 'Look into your mail').waitFor();
    await page.getByText(/If there is an account with/).waitFor();
  });
});
