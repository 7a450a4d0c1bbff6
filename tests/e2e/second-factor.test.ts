import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { accountSchema, secondFactorSetupSchema } from '../../shared/account-answers.ts';
import { expectAccessible } from '../support/accessible.ts';
import { DESK, NEW_PASSWORD, PHONE, visitor } from '../support/browser.ts';
import { confirmAddress } from '../support/received-mail.ts';
import { codeOf } from '../support/totp.ts';

const visit = visitor();

const heading = (page: Page, name: string) => page.getByRole('heading', { level: 1, name, exact: true });
const button = (page: Page, name: string) => page.getByRole('button', { name, exact: true });
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });

interface Set {
  page: Page;
  email: string;
  totpURI: string;
  codes: string[];
}

/** Somebody new whose address is confirmed, with the part for the second factor open. */
async function begin(viewport = DESK): Promise<{ page: Page; email: string }> {
  const page = await visit.open('/account', { as: 'newMember', viewport });
  const { email } = accountSchema.parse(await (await page.request.get('/api/account')).json());
  await confirmAddress(visit.baseURL, email);
  await page.goto('/account?change=second-factor');
  await button(page, 'Begin').waitFor();
  return { page, email };
}

/** As a person sets it up: what the authenticator is given is read off the answer that the page draws. */
async function setUp(viewport = DESK): Promise<Set> {
  const { page, email } = await begin(viewport);
  await field(page, 'Your password').fill(NEW_PASSWORD);
  const [response] = await Promise.all([
    page.waitForResponse('**/two-factor/enable'),
    button(page, 'Begin').click(),
  ]);
  const { totpURI, backupCodes } = secondFactorSetupSchema.parse(await response.json());
  await field(page, 'Six digits').fill(codeOf(totpURI, -1));
  await button(page, 'Turn it on').click();
  await page.getByRole('group', { name: 'Your recovery codes' }).waitFor();
  return { page, email, totpURI, codes: backupCodes };
}

async function signOutAndIn(page: Page, email: string) {
  await button(page, 'Sign out').click();
  await page.getByRole('banner').getByRole('link', { name: 'Sign in' }).waitFor();
  await page.goto('/sign-in?next=/plans');
  await field(page, 'E-mail address').fill(email);
  await field(page, 'Password').fill(NEW_PASSWORD);
  await button(page, 'Sign in').click();
  await heading(page, 'Now the code').waitFor();
}

describe('setting up a second factor', () => {
  it('is refused in words until the address is confirmed', async () => {
    const page = await visit.open('/account?change=second-factor', { as: 'newMember', viewport: PHONE });
    await page.getByText('First confirm your e-mail address').waitFor();
    expect(await button(page, 'Begin').count()).toBe(0);
  });

  it('asks for the password, shows the key drawn and written, and is on only after a code', async () => {
    const { page } = await begin(PHONE);
    await field(page, 'Your password').fill('not this one at all');
    await button(page, 'Begin').click();
    await page.locator('#password-error').waitFor();
    await field(page, 'Your password').fill(NEW_PASSWORD);
    const [response] = await Promise.all([
      page.waitForResponse('**/two-factor/enable'),
      button(page, 'Begin').click(),
    ]);
    const { totpURI } = secondFactorSetupSchema.parse(await response.json());
    await page.getByRole('img', { name: /square code/ }).waitFor();
    const key = new URL(totpURI).searchParams.get('secret') ?? '';
    const written = (await page.getByRole('main').innerText()).replace(/\s/g, '');
    expect(key.length).toBeGreaterThan(15);
    expect(written).toContain(key);
    await expectAccessible(page);
    const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    expect(overflow).toBeLessThanOrEqual(0);

    const wrong = codeOf(totpURI) === '000000' ? '111111' : '000000';
    await field(page, 'Six digits').fill(wrong);
    await button(page, 'Turn it on').click();
    await page.locator('#code-error').waitFor();
    await page.goto('/account');
    await page.getByText('nothing besides').waitFor();
  });

  it('ends with ten recovery codes, to be saved as a file, and says that it is on', async () => {
    const { page, codes } = await setUp();
    const shown = await page.getByRole('group', { name: 'Your recovery codes' }).innerText();
    expect(shown.trim().split(/\s+/)).toEqual(codes);
    expect(codes).toHaveLength(10);
    await expectAccessible(page);
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      button(page, 'Save as a file').click(),
    ]);
    expect(download.suggestedFilename()).toBe('leeway-recovery-codes.txt');
    await button(page, 'I have kept them').click();
    await page.getByText('The second factor is on.').waitFor();
    await page.getByText('a code from your phone').waitFor();
    await page.reload();
    await page.getByText('a code from your phone').waitFor();
    expect(await page.getByRole('main').innerText()).not.toContain(codes[0]!);
  });
});

describe('signing in with a second factor', () => {
  it('asks for the code after the password, and goes on to the page that was asked for', async () => {
    const { page, email, totpURI } = await setUp(PHONE);
    await signOutAndIn(page, email);
    expect(await page.evaluate(() => document.activeElement?.textContent)).toBe('Now the code');
    await expectAccessible(page);
    await field(page, 'Six digits').fill('12');
    await button(page, 'Sign in').click();
    await page.locator('#code-error').waitFor();
    await field(page, 'Six digits').fill(codeOf(totpURI));
    await button(page, 'Sign in').click();
    await heading(page, 'Plans').waitFor();
  });

  it('takes each recovery code once in place of the phone', async () => {
    const { page, email, codes } = await setUp();
    await signOutAndIn(page, email);
    await button(page, 'Use a recovery code').click();
    await heading(page, 'A recovery code').waitFor();
    await expectAccessible(page);
    await field(page, 'Recovery code').fill(codes[0]!);
    await button(page, 'Sign in').click();
    await heading(page, 'Plans').waitFor();

    await signOutAndIn(page, email);
    await button(page, 'Use a recovery code').click();
    await field(page, 'Recovery code').fill(codes[0]!);
    await button(page, 'Sign in').click();
    await page.getByRole('alert').waitFor();
    await field(page, 'Recovery code').fill(codes[1]!);
    await button(page, 'Sign in').click();
    await heading(page, 'Plans').waitFor();
    await page.goto('/account?change=second-factor');
    await page.getByText('You have 8 recovery codes left.').waitFor();
    await expectAccessible(page);
  });
});

describe('a second factor that is on', () => {
  it('gets new recovery codes, and is turned off, each with the password', async () => {
    const { page, codes } = await setUp();
    await button(page, 'I have kept them').click();
    await page.getByText('The second factor is on.').waitFor();
    await page.goto('/account?change=second-factor');
    await button(page, 'Make new recovery codes').click();
    await field(page, 'Your password').fill(NEW_PASSWORD);
    await button(page, 'Make new recovery codes').click();
    const shown = page.getByRole('group', { name: 'Your recovery codes' });
    await shown.waitFor();
    expect(await shown.innerText()).not.toContain(codes[0]!);
    await button(page, 'I have kept them').click();
    await page.getByText('You have new recovery codes.').waitFor();

    await page.goto('/account?change=second-factor');
    await button(page, 'Turn it off').click();
    await field(page, 'Your password').fill(NEW_PASSWORD);
    await button(page, 'Turn it off').click();
    await page.getByText('The second factor is off').waitFor();
    await page.getByText('nothing besides').waitFor();
  });
});
