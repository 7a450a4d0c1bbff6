import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pino } from 'pino';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { isLoopback, readConfig } from '../../server/config.ts';
import { startMail, type Mail } from '../../server/start-mail.ts';
import { ORIGIN, PASSWORD, testApp, type TestApp } from '../support/app.ts';
import { until } from '../support/smtp.ts';

let test: TestApp;
let mail: Mail;
const NEAR = new URL(ORIGIN).host;
beforeAll(async () => {
  test = await testApp({ config: { hasMailbox: true } });
  mail = await startMail({ ...test.config }, { db: test.db, log: pino({ level: 'silent' }) });
});
afterAll(() => mail.stop());

const list = () => test.anonymous().get('/api/mailbox').set('Host', NEAR);

describe('the local mailbox', () => {
  it('receives by SMTP what the outbox sends, whole, with a link that works', async () => {
    const signUp = { name: 'Zoë Größer', email: 'zoe@example.org', password: PASSWORD };
    await test.anonymous().post('/api/auth/sign-up/email').send(signUp).expect(200);
    await until(async () => (await list()).body.total === 1, 'the mail came');
    const { body } = await list().expect(200);
    expect(body.items).toEqual([
      {
        id: expect.any(String),
        to: 'zoe@example.org',
        subject: 'Confirm your e-mail address',
        receivedAt: expect.any(String),
      },
    ]);
    const message = await test
      .anonymous()
      .get(`/api/mailbox/${body.items[0].id}`)
      .set('Host', NEAR)
      .expect(200);
    expect(message.body.text).toContain('Hello Zoë Größer,');
    expect(message.body.html).toContain('Hello Zoë Größer,');
    expect(message.body.messageId).toMatch(/^<[0-9a-f-]{36}@127\.0\.0\.1>$/);
    expect(message.body.from).toContain('leeway@127.0.0.1');
    const link = /http:\S+confirm-address\?token=\S+/.exec(message.body.text)?.[0] ?? '';
    expect(message.body.html).toContain(link.replaceAll('&', '&amp;'));
    const token = new URL(link).searchParams.get('token');
    await test.anonymous().post('/api/auth/verify-email').send({ token }).expect(200);
  });

  it('is read on this machine only: by no other name, and through no proxy', async () => {
    await list().set('Host', 'localhost:3000').expect(200);
    await list().set('Host', '[::1]:3000').expect(200);
    for (const host of ['leeway.example.org', '127.0.0.1.example.org', '10.0.0.7:3000']) {
      await list().set('Host', host).expect(404);
    }
    for (const header of ['X-Forwarded-For', 'Forwarded', 'X-Real-IP', 'Via', 'X-Forwarded-Host']) {
      await list().set(header, '127.0.0.1').expect(404);
    }
  });

  it('answers 404 for a mail that is not there, and 422 for a page that cannot be', async () => {
    await test.anonymous().get(`/api/mailbox/${crypto.randomUUID()}`).set('Host', NEAR).expect(404);
    await test.anonymous().get('/api/mailbox/abc').set('Host', NEAR).expect(404);
    await list().query({ page: 0 }).expect(422);
  });
});

describe('where there is a mailbox', () => {
  const folder = mkdtempSync(join(tmpdir(), 'leeway-config-'));
  afterAll(() => rmSync(folder, { recursive: true, force: true }));
  const has = (environment: Record<string, string>) =>
    readConfig({ LEEWAY_DATA: folder, ...environment }, 'mysql://a@127.0.0.1/b').hasMailbox;

  it('is on a machine of one’s own without a mail server, and nowhere else', () => {
    expect(has({})).toBe(true);
    expect(has({ HOST: 'localhost' })).toBe(true);
    expect(has({ HOST: '::1' })).toBe(true);
    expect(has({ HOST: '0.0.0.0' })).toBe(false);
    expect(has({ SMTP_URL: 'smtp://mail.example.org' })).toBe(false);
    expect(has({ DATABASE_URL: 'mysql://a:b@db.example.org/c' })).toBe(false);
    expect(has({ APP_URL: 'https://leeway.example.org' })).toBe(false);
    expect(has({ TRUST_PROXY: '1' })).toBe(false);
    expect(isLoopback('127.0.0.1.example.org')).toBe(false);
  });
});

describe('an instance without a mailbox', () => {
  it('has nothing at its addresses', async () => {
    const other = await testApp({ config: { hasMailbox: false } });
    await other.anonymous().get('/api/mailbox').set('Host', NEAR).expect(404);
    await other.anonymous().get(`/api/mailbox/${crypto.randomUUID()}`).set('Host', NEAR).expect(404);
  });
});
