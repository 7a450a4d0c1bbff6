import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { expectAccessible } from '../support/accessible.ts';
import { PHONE, visitor } from '../support/browser.ts';

const visit = visitor();
const PASSWORD = 'a quiet tape measure';
const newEmail = () => `sewist-${Math.random().toString(36).slice(2)}@example.org`;

const heading = (page: Page, name: string) => page.getByRole('heading', { level: 1, name, exact: true });
const fill = async (page: Page, fields: Record<string, string>) => {
  for (const [label, value] of Object.entries(fields))
    await page.getByLabel(label, { exact: true }).fill(value);
};
const focused = (page: Page) => page.evaluate(() => document.activeElement?.textContent ?? '');

describe('an account', () => {
  it('is made, left and entered again, and comes back to the page that asked for it', async () => {
    const page = await visit.open('/plans?page=1');
    await heading(page, 'Sign in').waitFor();
    await page.getByRole('main').getByRole('link', { name: 'Make an account' }).click();
    await heading(page, 'Make an account').waitFor();
    const email = newEmail();
    await fill(page, { Name: 'Ida Sørensen', 'E-mail address': email, Password: PASSWORD });
    await page.getByRole('button', { name: 'Make the account' }).click();
    await page.getByRole('button', { name: 'Go on' }).click();
    await heading(page, 'Plans').waitFor();
    expect(new URL(page.url()).search).toBe('?page=1');
    expect(await page.getByRole('banner').innerText()).toContain('Ida Sørensen');

    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.getByRole('banner').getByRole('link', { name: 'Sign in' }).waitFor();
    await page.goto('/people');
    await heading(page, 'Sign in').waitFor();
    await fill(page, { 'E-mail address': email, Password: PASSWORD });
    await page.getByRole('button', { name: 'Sign in' }).click();
    await heading(page, 'People').waitFor();
    await page.goto('/sign-in');
    await heading(page, 'People').waitFor();
  });

  it('says what is wrong with an empty form, at its top and at each field, and keeps what was typed', async () => {
    const page = await visit.open('/sign-up', { viewport: PHONE });
    await fill(page, { Name: 'Ida', Password: 'short' });
    await page.getByRole('button', { name: 'Make the account' }).click();
    const summary = page.getByRole('alert');
    await summary.waitFor();
    expect(await focused(page)).toContain('2 things to put right');
    expect(await page.getByLabel('Name').inputValue()).toBe('Ida');
    await expectAccessible(page);
    await summary.getByRole('link', { name: /^Password/ }).click();
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('password');
  });

  it('does not tell whether the address or the password was wrong', async () => {
    const page = await visit.open('/sign-in');
    await fill(page, { 'E-mail address': newEmail(), Password: PASSWORD });
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.getByRole('alert').waitFor();
    expect(await page.getByRole('alert').innerText()).toContain('do not belong together');
    expect(await page.getByLabel('Password', { exact: true }).inputValue()).toBe(PASSWORD);
  });

  it('shows the password while it is asked to', async () => {
    const page = await visit.open('/sign-in');
    const password = page.getByLabel('Password', { exact: true });
    await password.fill(PASSWORD);
    const show = page.getByRole('button', { name: 'Show the password' });
    await show.press('Enter');
    expect(await password.getAttribute('type')).toBe('text');
    await show.press('Enter');
    expect(await password.getAttribute('type')).toBe('password');
  });

  it('never goes on to another site', async () => {
    const page = await visit.open('/sign-in?next=//example.org/', { as: 'newMember' });
    await heading(page, 'People').waitFor();
    expect(page.url().startsWith(visit.baseURL)).toBe(true);
  });
});

describe('the frame of every page', () => {
  it('leads by keyboard past itself to the page', async () => {
    const page = await visit.open('/people', { as: 'newMember' });
    await heading(page, 'People').waitFor();
    await page.keyboard.press('Tab');
    expect(await focused(page)).toBe('Skip to the page');
    await page.keyboard.press('Enter');
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('main');
  });

  it('puts the focus on the heading of the page gone to, and names it in the title', async () => {
    const page = await visit.open('/people', { as: 'newMember' });
    await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Patterns' }).click();
    await heading(page, 'Patterns').waitFor();
    expect(await focused(page)).toBe('Patterns');
    expect(await page.title()).toBe('Patterns · Leeway');
  });

  it('says that there is nothing at an unknown address, or for an unknown person', async () => {
    const page = await visit.open('/nothing-here', { as: 'newMember' });
    await heading(page, 'There is nothing here').waitFor();
    await page.goto('/people/0190a000-0000-7000-8000-000000000001');
    await heading(page, 'There is nothing here').waitFor();
  });

  it('says so where the server cannot be reached, and tries again', async () => {
    const page = await visit.open('/people', { as: 'newMember' });
    await heading(page, 'People').waitFor();
    await page.route('**/api/people**', (route) => route.abort());
    await page.getByRole('link', { name: 'Patterns' }).click();
    await heading(page, 'Patterns').waitFor();
    await page.goto('/people');
    await heading(page, 'The server cannot be reached').waitFor();
    await expectAccessible(page);
    await page.unroute('**/api/people**');
    await page.getByRole('button', { name: 'Try again' }).click();
    await heading(page, 'People').waitFor();
    const faults = visit.takeFaults();
    expect(faults.length).toBeGreaterThan(0);
    expect(faults.filter((fault) => !fault.includes('net::ERR_FAILED'))).toEqual([]);
  });

  it('gives the number under which a failure is found in the log', async () => {
    const page = await visit.open('/patterns', { as: 'newMember' });
    await heading(page, 'Patterns').waitFor();
    await page.route('**/api/people**', (route) =>
      route.fulfill({
        status: 500,
        contentType: 'application/problem+json',
        body: JSON.stringify({
          type: '/problems/failed',
          title: 'Something went wrong on our side',
          status: 500,
          requestId: 'req-42',
        }),
      }),
    );
    await page.goto('/people');
    await heading(page, 'Something went wrong on our side').waitFor();
    expect(await page.getByRole('main').innerText()).toContain('req-42');
    expect(visit.takeFaults().length).toBeGreaterThan(0);
  });
});
