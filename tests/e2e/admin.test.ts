import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { accountSchema } from '../../shared/account-answers.ts';
import { expectAccessible } from '../support/accessible.ts';
import { DESK, PHONE, visitor } from '../support/browser.ts';

const visit = visitor();
const PAGES = ['people', 'requests', 'mail', 'log', 'health', 'reference'] as const;

const heading = (page: Page, name: string) => page.getByRole('heading', { level: 1, name, exact: true });
const button = (page: Page, name: string) => page.getByRole('button', { name, exact: true });

/** A new member, and their address. */
async function newMember(): Promise<{ page: Page; email: string }> {
  const page = await visit.open('/account', { as: 'newMember' });
  const { email } = accountSchema.parse(await (await page.request.get('/api/account')).json());
  return { page, email };
}

describe('the pages of the administration', () => {
  it.each(PAGES)('%s: one heading, accessible at both widths, nothing runs off it', async (name) => {
    for (const viewport of [DESK, PHONE]) {
      const page = await visit.open(`/admin/${name}`, { as: 'admin', viewport });
      await page.getByRole('navigation', { name: 'Administration' }).waitFor();
      expect(await page.locator('h1').count()).toBe(1);
      await page.waitForLoadState('networkidle');
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(overflow).toBeLessThanOrEqual(0);
      await expectAccessible(page);
    }
  });

  it.each(PAGES)('%s is not there for a member or a teacher; nobody signed in is asked to', async (name) => {
    for (const as of ['newMember', 'teacher'] as const) {
      const page = await visit.open(`/admin/${name}`, { as });
      await heading(page, 'There is nothing here').waitFor();
      expect(await page.getByRole('link', { name: 'Admin', exact: true }).count()).toBe(0);
    }
    const page = await visit.open(`/admin/${name}`);
    await heading(page, 'Sign in').waitFor();
  });

  it('are reached from the header, and from one to another', async () => {
    const page = await visit.open('/people', { as: 'admin' });
    await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Admin' }).click();
    await heading(page, 'Accounts').waitFor();
    await page
      .getByRole('navigation', { name: 'Administration' })
      .getByRole('link', { name: 'health' })
      .click();
    await heading(page, 'Health').waitFor();
  });
});

describe('accounts and roles', () => {
  it('finds by words and role, in the address; a role is changed only after asking, and the log says so', async () => {
    const { page: theirs, email } = await newMember();
    const page = await visit.open('/admin/people', { as: 'admin' });
    await page.getByLabel('Find by name or e-mail address').fill(email);
    await page.getByText('1 account,').waitFor();
    expect(new URL(page.url()).searchParams.get('q')).toBe(email);
    const role = page.getByLabel('Role of Robin');
    await role.selectOption('teacher');
    const dialog = page.getByRole('alertdialog', { name: 'Make Robin a teacher?' });
    await dialog.waitFor();
    await expectAccessible(page);
    await page.keyboard.press('Escape');
    await dialog.waitFor({ state: 'detached' });
    expect(await role.inputValue()).toBe('member');

    await role.selectOption('teacher');
    await button(page, 'Make a teacher').click();
    await dialog.waitFor({ state: 'detached' });
    await expect.poll(() => role.inputValue()).toBe('teacher');
    await theirs.reload();
    await theirs.getByText('You are a teacher here.').waitFor();

    await page.getByLabel('Role', { exact: true }).selectOption('member');
    await page.getByText('No account has these words and this role.').waitFor();
    expect(new URL(page.url()).searchParams.get('role')).toBe('member');
    await page.goto('/admin/log');
    await page.getByText('made Robin a teacher; before, a member.').first().waitFor();
  });

  it('tells why the last administrator stays one', async () => {
    const page = await visit.open('/admin/people?role=admin', { as: 'admin' });
    await page.getByText('1 account,').waitFor();
    await page.getByLabel(/^Role of/).selectOption('member');
    await button(page, 'Make a member').click();
    const alert = page.getByRole('alertdialog').getByRole('alert');
    await alert.waitFor();
    expect(await alert.innerText()).toContain('the only administrator');
  });
});

describe('requests to teach', () => {
  it('are answered after asking, and the person sees the answer', async () => {
    const { page: theirs, email } = await newMember();
    await theirs.getByLabel('What you teach').fill(`Shirts for beginners, ${email}`);
    await theirs.getByRole('button', { name: 'Ask to become a teacher' }).click();
    await theirs.getByText(/^You asked on/).waitFor();

    const page = await visit.open('/admin/requests', { as: 'admin', viewport: PHONE });
    const row = page.getByRole('listitem').filter({ hasText: email });
    await row.waitFor();
    await row.getByRole('button', { name: 'Make Robin a teacher' }).click();
    await page.getByRole('alertdialog').waitFor();
    await expectAccessible(page);
    await button(page, 'Make a teacher').click();
    await row.waitFor({ state: 'detached' });
    await page.getByLabel('State').selectOption('accepted');
    await row.waitFor();
    expect(new URL(page.url()).search).toBe('?state=accepted');
    await theirs.reload();
    await theirs.getByText('You are a teacher here.').waitFor();
  });
});

describe('mail', () => {
  it('is listed by state, to whom and about what, never what it says', async () => {
    const { email } = await newMember();
    const page = await visit.open('/admin/mail?state=sent', { as: 'admin' });
    const row = page.getByRole('row').filter({ hasText: email });
    await expect
      .poll(
        async () => {
          await page.reload();
          return row.count();
        },
        { timeout: 20_000 },
      )
      .toBe(1);
    expect(await row.innerText()).toContain('Confirm an address');
    expect(await page.content()).not.toContain('token=');
  });

  it('that was given up is sent on its way again', async () => {
    const page = await visit.open('/people', { as: 'admin' });
    const mail = {
      id: '0190a000-0000-7000-8000-000000000001',
      to: 'ines@example.org',
      kind: 'reset-password',
      state: 'failed',
      attempts: 9,
      nextAt: '2026-10-12T10:00:00.000Z',
      createdAt: '2026-10-11T10:00:00.000Z',
      sentAt: null,
      lastError: 'ECONNREFUSED',
    };
    const json = (body: unknown) => ({ contentType: 'application/json', body: JSON.stringify(body) });
    let failed = [mail];
    await page.route('**/api/admin/mail?*', (route) =>
      route.fulfill(json({ items: failed, page: 1, pageSize: 50, total: failed.length })),
    );
    await page.route('**/api/admin/mail/*/retry', (route) => {
      failed = [];
      return route.fulfill(json({ ...mail, state: 'waiting' }));
    });
    await page.goto('/admin/mail?state=failed');
    await page.getByRole('cell', { name: /The mail server did not answer \(ECONNREFUSED\)/ }).waitFor();
    await expectAccessible(page);
    await button(page, 'Send again to ines@example.org: Choose a new password').click();
    await page.getByText('The mail to ines@example.org is on its way again.').waitFor();
    await page.getByText('None was given up.').waitFor();
  });
});

describe('health and reference', () => {
  it('tells the version, the database, the disk and the mail', async () => {
    const page = await visit.open('/admin/health', { as: 'admin' });
    await heading(page, 'Health').waitFor();
    const facts = await page.getByRole('main').innerText();
    expect(facts).toContain('MariaDB');
    expect(facts).toMatch(/(\d+) of \1 migrations applied/);
    expect(facts).toMatch(/[\d.]+ [GTM]B free of [\d.]+ [GT]B/);
    await button(page, 'Look again').click();
    await button(page, 'Look again').waitFor();
  });

  it('shows the ease of one garment at a time, with the source of each figure', async () => {
    const page = await visit.open('/admin/reference', { as: 'admin' });
    await page.getByLabel('Garment').selectOption('skirt');
    await expect.poll(() => new URL(page.url()).search).toBe('?kind=skirt');
    const table = page.getByRole('table', { name: /Ease that wearing takes/ });
    await expect.poll(() => table.innerText()).toContain('Waist girth');
    expect(await table.innerText()).not.toContain('Upper arm');
    expect(await table.getByText('published').count()).toBeGreaterThan(0);
  });
});
