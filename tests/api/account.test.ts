import { getAuthTables } from 'better-auth/db';
import { getTableColumns, getTableName } from 'drizzle-orm';
import { getTableConfig, type MySqlColumn } from 'drizzle-orm/mysql-core';
import { eq, sql } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import * as tables from '../../server/account/account.table.ts';
import { PASSWORD, testApp, type Agent, type TestApp } from '../support/app.ts';
import { mailTo } from '../support/outbox.ts';

let test: TestApp;
beforeAll(async () => {
  test = await testApp();
});

const DONE = { status: true };

const signIn = (agent: Agent, email: string, password = PASSWORD) =>
  agent.post('/api/auth/sign-in/email').send({ email, password });

const someone = (email: string) => ({ name: 'Ada', email, password: PASSWORD });

describe('signing up, in and out', () => {
  it('signs up, is then known to another request, signs out and is forgotten', async () => {
    const agent = test.anonymous();
    await agent.post('/api/auth/sign-up/email').send(someone('ada@example.org')).expect(200, DONE);
    await agent.get('/api/me').expect(200, { user: null });
    await signIn(agent, 'ada@example.org').expect(200);
    const me = await agent.get('/api/me').expect(200);
    expect(me.body).toEqual({
      user: { id: expect.any(String), name: 'Ada', email: 'ada@example.org', role: 'member' },
    });
    await agent.post('/api/auth/sign-out').send({}).expect(200);
    await agent.get('/api/me').expect(200, { user: null });
  });

  it('makes the old cookie worthless at sign-out', async () => {
    const agent = test.anonymous();
    await agent.post('/api/auth/sign-up/email').send(someone('old@example.org'));
    const signedIn = await signIn(agent, 'old@example.org');
    const cookie = String(signedIn.headers['set-cookie']).split(';')[0] ?? '';
    await agent.post('/api/auth/sign-out').expect(200);
    const answer = await test.anonymous().get('/api/me').set('Cookie', cookie);
    expect(answer.body).toEqual({ user: null });
  });

  it('keeps the cookie from scripts and from other sites', async () => {
    await test.anonymous().post('/api/auth/sign-up/email').send(someone('c@example.org'));
    const answer = await signIn(test.anonymous(), 'c@example.org');
    expect(String(answer.headers['set-cookie'])).toMatch(/HttpOnly/i);
    expect(String(answer.headers['set-cookie'])).toMatch(/SameSite=Lax/i);
  });

  it('signs in with another capitalisation of the address', async () => {
    await test.anonymous().post('/api/auth/sign-up/email').send(someone('Grace@Example.org')).expect(200);
    const agent = test.anonymous();
    const credentials = { email: 'grace@example.ORG', password: PASSWORD };
    await agent.post('/api/auth/sign-in/email').send(credentials).expect(200);
    const me = await agent.get('/api/me');
    expect(me.body).toMatchObject({ user: { email: 'grace@example.org' } });
  });

  it('answers 401 in words to a wrong password and to an unknown address, the same for both', async () => {
    await test.anonymous().post('/api/auth/sign-up/email').send(someone('w@example.org')).expect(200);
    const wrong = await test
      .anonymous()
      .post('/api/auth/sign-in/email')
      .send({ email: 'w@example.org', password: 'another password' })
      .expect(401)
      .expect('content-type', /application\/problem\+json/);
    const unknown = await test
      .anonymous()
      .post('/api/auth/sign-in/email')
      .send({ email: 'nobody@example.org', password: 'another password' })
      .expect(401);
    expect(wrong.body.detail).toBe('This address and this password do not belong together.');
    expect({ ...unknown.body, requestId: '' }).toEqual({ ...wrong.body, requestId: '' });
  });

  it('points at every field at fault', async () => {
    const answer = await test
      .anonymous()
      .post('/api/auth/sign-up/email')
      .send({ name: ' ', email: 'nowhere', password: 'short' })
      .expect(422);
    const pointers = (answer.body.errors as { pointer: string }[]).map((error) => error.pointer);
    expect(pointers).toEqual(['/name', '/email', '/password']);
  });

  it('answers the same where there is an account already, changes nothing about it, and tells its owner', async () => {
    const first = await test.anonymous().post('/api/auth/sign-up/email').send(someone('twice@example.org'));
    const again = await test
      .anonymous()
      .post('/api/auth/sign-up/email')
      .send({ name: 'Eve', email: 'TWICE@example.org', password: 'quite another one' });
    expect([again.status, again.body, again.headers['set-cookie']]).toEqual([200, DONE, undefined]);
    expect([first.status, first.body, first.headers['set-cookie']]).toEqual([200, DONE, undefined]);
    await signIn(test.anonymous(), 'twice@example.org').expect(200);
    await signIn(test.anonymous(), 'twice@example.org', 'quite another one').expect(401);
    const mail = await mailTo(test.db, 'twice@example.org');
    expect(mail.map(({ kind }) => kind)).toEqual(['confirm-address', 'account-there']);
    expect(mail[1]?.letter.greets).toBe('Ada');
  });

  it('makes one account of two sign-ups at once', async () => {
    const [one, two] = await Promise.all([
      test.anonymous().post('/api/auth/sign-up/email').send(someone('both@example.org')),
      test.anonymous().post('/api/auth/sign-up/email').send(someone('both@example.org')),
    ]);
    expect([one.status, two.status, one.body, two.body]).toEqual([200, 200, DONE, DONE]);
    // The library writes down that the database refused the second.
    test.takeErrors();
    const rows = await test.db.select().from(tables.user).where(eq(tables.user.email, 'both@example.org'));
    expect(rows).toHaveLength(1);
  });

  it('makes no account where its mail cannot be written', async () => {
    await test.db.execute(sql`RENAME TABLE outbox TO outbox_away`);
    await test.anonymous().post('/api/auth/sign-up/email').send(someone('half@example.org')).expect(500);
    await test.db.execute(sql`RENAME TABLE outbox_away TO outbox`);
    expect(test.takeErrors()).not.toEqual([]);
    const rows = await test.db.select().from(tables.user).where(eq(tables.user.email, 'half@example.org'));
    expect(rows).toEqual([]);
  });

  it('gives nobody a role by asking for it', async () => {
    const agent = test.anonymous();
    await agent
      .post('/api/auth/sign-up/email')
      .send({ ...someone('boss@example.org'), role: 'admin' })
      .expect(200);
    await signIn(agent, 'boss@example.org').expect(200);
    const me = await agent.get('/api/me');
    expect(me.body).toMatchObject({ user: { role: 'member' } });
  });

  it('refuses a sign-in that another site asks for, and one without an origin', async () => {
    for (const origin of ['https://elsewhere.example', 'null', '']) {
      const answer = await test
        .anonymous()
        .post('/api/auth/sign-in/email')
        .set('Origin', origin)
        .send({ email: 'ada@example.org', password: PASSWORD });
      expect([origin, answer.status]).toEqual([origin, 403]);
      expect(answer.body.type).toBe('/problems/foreignOrigin');
    }
  });

  it('has none of the addresses of the library that the product does not use', async () => {
    const { agent } = await test.signedIn();
    await agent.post('/api/auth/update-user').send({ name: 'x' }).expect(404);
    await agent.get('/api/auth/verify-email?token=x').expect(404);
    await agent.get('/api/auth/reset-password/x?callbackURL=/').expect(404);
    await agent.get('/api/auth/list-sessions').expect(404);
    await agent.post('/api/auth/delete-user').send({ password: PASSWORD }).expect(404);
    await agent.post('/api/auth/two-factor/get-totp-uri').send({ password: PASSWORD }).expect(404);
    await agent.post('/api/auth/two-factor/send-otp').send({}).expect(404);
  });

  it('answers 400 to a body that is not JSON and 415 to a form', async () => {
    const agent = test.anonymous();
    await agent.post('/api/auth/sign-in/email').type('json').send('{"email":').expect(400);
    await agent.post('/api/auth/sign-in/email').type('form').send('email=a').expect(415);
  });
});

describe('sessions', () => {
  it('ends one that has run out', async () => {
    const { agent, user } = await test.signedIn();
    await agent.get('/api/me').expect(({ body }) => expect(body.user.id).toBe(user.id));
    await test.db
      .update(tables.session)
      .set({ expiresAt: new Date(Date.now() - 1000) })
      .where(eq(tables.session.userId, user.id));
    await agent.get('/api/me').expect(200, { user: null });
  });

  it('lengthens one in use, row and cookie', async () => {
    const { agent, user } = await test.signedIn();
    const soon = new Date(Date.now() + 20 * 24 * 3_600_000);
    await test.db.update(tables.session).set({ expiresAt: soon }).where(eq(tables.session.userId, user.id));
    const answer = await agent.get('/api/me').expect(200);
    expect(String(answer.headers['set-cookie'])).toContain('session_token');
    const [row] = await test.db.select().from(tables.session).where(eq(tables.session.userId, user.id));
    expect(row?.expiresAt.getTime()).toBeGreaterThan(soon.getTime());
  });

  it('does not take a forged cookie', async () => {
    const answer = await test
      .anonymous()
      .get('/api/me')
      .set('Cookie', 'better-auth.session_token=abc.def')
      .expect(200);
    expect(answer.body).toEqual({ user: null });
  });
});

describe('the tables of the sign-in library', () => {
  const byName: Record<string, Parameters<typeof getTableConfig>[0]> = {
    user: tables.user,
    session: tables.session,
    account: tables.account,
    verification: tables.verification,
    rateLimit: tables.rateLimit,
    twoFactor: tables.twoFactor,
  };

  it('are those it asks for', () => {
    const asked = getAuthTables(test.auth.options);
    expect(Object.keys(asked).sort()).toEqual(Object.keys(byName).sort());
    for (const [name, { fields }] of Object.entries(asked)) {
      const table = byName[name]!;
      const columns = getTableColumns(table) as Record<string, MySqlColumn>;
      expect([name, Object.keys(columns).sort()]).toEqual([name, ['id', ...Object.keys(fields)].sort()]);
      for (const [field, wanted] of Object.entries(fields)) {
        const column = columns[field]!;
        const place = `${getTableName(table)}.${field}`;
        expect([place, column.notNull]).toEqual([place, wanted.required !== false]);
        expect([place, column.isUnique]).toEqual([place, wanted.unique === true]);
        const dataType = { date: 'date', number: 'number', boolean: 'boolean' }[String(wanted.type)];
        if (dataType !== undefined) expect([place, column.dataType]).toEqual([place, dataType]);
        if (wanted.references) {
          const keys = getTableConfig(table).foreignKeys.map((key) => key.reference());
          const key = keys.find((one) => one.columns[0]?.name === column.name);
          expect([place, key && getTableName(key.foreignTable)]).toEqual([place, wanted.references.model]);
        }
      }
    }
  });
});
