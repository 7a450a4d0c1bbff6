import { createHmac } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { accountSessionsSchema } from '../../shared/account-answers.ts';
import { session, user as userTable, verification } from '../../server/account/account.table.ts';
import { PASSWORD, testApp, type Agent, type TestApp } from '../support/app.ts';
import { pointersOf } from '../support/imports.ts';
import { mailTo, tokenIn } from '../support/outbox.ts';

let test: TestApp;
beforeAll(async () => {
  test = await testApp();
});

const DONE = { status: true };
const NEW = 'another quiet measure';
let count = 0;
const fresh = () => `link-${String((count += 1))}@example.org`;
const post = (agent: Agent, path: string, body: object) => agent.post(`/api/auth/${path}`).send(body);
const signIn = (email: string, password: string) =>
  post(test.anonymous(), 'sign-in/email', { email, password });
const account = async (agent: Agent) => (await agent.get('/api/account').expect(200)).body;
const sessions = async (agent: Agent) =>
  accountSessionsSchema.parse((await agent.get('/api/account/sessions').expect(200)).body).items;

async function signedUp(): Promise<{ agent: Agent; email: string }> {
  const email = fresh();
  await post(test.anonymous(), 'sign-up/email', { name: 'Ada', email, password: PASSWORD }).expect(200);
  const agent = test.anonymous();
  await post(agent, 'sign-in/email', { email, password: PASSWORD }).expect(200);
  return { agent, email };
}

/** The same token with another signature, or with other claims under the old one. */
function forged(token: string, claims?: object): string {
  const [head, body, signature] = token.split('.') as [string, string, string];
  if (!claims) return [head, body, signature.split('').reverse().join('')].join('.');
  const old = JSON.parse(Buffer.from(body, 'base64url').toString()) as object;
  return [head, Buffer.from(JSON.stringify({ ...old, ...claims })).toString('base64url'), signature].join(
    '.',
  );
}

/** The same token with other claims, signed with the instance's own secret (RFC 7515, HS256). */
function signed(token: string, claims: object): string {
  const unsigned = forged(token, claims).split('.').slice(0, 2).join('.');
  return `${unsigned}.${createHmac('sha256', test.config.secret).update(unsigned).digest('base64url')}`;
}

const isDead = (answer: { status: number; body: { errors?: { pointer: string }[] } }) =>
  expect([answer.status, answer.body.errors?.map(({ pointer }) => pointer)]).toEqual([422, ['/token']]);

describe('confirming an address', () => {
  it('is done by the link that was mailed at sign-up, from any browser', async () => {
    const { agent, email } = await signedUp();
    expect(await account(agent)).toMatchObject({ email, emailVerified: false });
    const token = await tokenIn(test.db, email, 'confirm-address');
    const answer = await post(test.anonymous(), 'verify-email', { token }).expect(200);
    expect(answer.body).toEqual({ status: true, email });
    expect(answer.headers['set-cookie']).toBeUndefined();
    expect(await account(agent)).toMatchObject({ emailVerified: true });
  });

  it('refuses a link that was used, and one of two at once', async () => {
    const { email } = await signedUp();
    const token = await tokenIn(test.db, email, 'confirm-address');
    const both = await Promise.all([1, 2].map(() => post(test.anonymous(), 'verify-email', { token })));
    expect(both.map(({ status }) => status).sort()).toEqual([200, 422]);
    isDead(await post(test.anonymous(), 'verify-email', { token }));
  });

  it('refuses a link that has run out, was changed, or is none', async () => {
    const { agent, email } = await signedUp();
    const other = await signedUp();
    const token = await tokenIn(test.db, email, 'confirm-address');
    const late = signed(token, { exp: Math.floor(Date.now() / 1000) - 1 });
    expect(signed(token, {})).toBe(token);
    for (const bad of [late, forged(token), forged(token, { email: other.email }), 'abc', 'a.b.c']) {
      isDead(await post(test.anonymous(), 'verify-email', { token: bad }));
    }
    await post(test.anonymous(), 'verify-email', {}).expect(422);
    expect(await account(agent)).toMatchObject({ emailVerified: false });
  });

  it('mails the link once more when asked, until it is confirmed', async () => {
    const { agent, email } = await signedUp();
    await post(agent, 'send-verification-email', {}).expect(200, DONE);
    expect(await mailTo(test.db, email)).toHaveLength(2);
    const token = await tokenIn(test.db, email, 'confirm-address');
    await post(test.anonymous(), 'verify-email', { token }).expect(200);
    await post(agent, 'send-verification-email', {}).expect(409);
    await post(test.anonymous(), 'send-verification-email', {}).expect(401);
  });

  it('is not brought about from another site', async () => {
    const { email } = await signedUp();
    const token = await tokenIn(test.db, email, 'confirm-address');
    await post(test.anonymous(), 'verify-email', { token })
      .set('Origin', 'https://elsewhere.example')
      .expect(403);
    await post(test.anonymous(), 'verify-email', { token }).expect(200);
  });
});

describe('a new password by mail', () => {
  it('lets in with it, ends every session, and tells the owner', async () => {
    const { agent, email } = await signedUp();
    await post(test.anonymous(), 'request-password-reset', { email }).expect(200, DONE);
    const token = await tokenIn(test.db, email, 'reset-password');
    await post(test.anonymous(), 'reset-password', { token, newPassword: NEW }).expect(200, DONE);
    expect((await agent.get('/api/me')).body).toEqual({ user: null });
    await signIn(email, PASSWORD).expect(401);
    await signIn(email, NEW).expect(200);
    expect((await mailTo(test.db, email)).at(-1)?.kind).toBe('password-changed');
  });

  it('answers the same for an address that nobody has, and mails nothing there', async () => {
    const email = fresh();
    await post(test.anonymous(), 'request-password-reset', { email }).expect(200, DONE);
    expect(await mailTo(test.db, email)).toEqual([]);
  });

  it('works once, and of two at once for one', async () => {
    const { email } = await signedUp();
    await post(test.anonymous(), 'request-password-reset', { email });
    const token = await tokenIn(test.db, email, 'reset-password');
    const both = await Promise.all(
      ['first new password', 'second new password'].map((newPassword) =>
        post(test.anonymous(), 'reset-password', { token, newPassword }),
      ),
    );
    expect(both.map(({ status }) => status).sort()).toEqual([200, 422]);
    isDead(await post(test.anonymous(), 'reset-password', { token, newPassword: NEW }));
    await signIn(email, NEW).expect(401);
  });

  it('refuses a link that has run out, an invented one, and a password that is too short', async () => {
    const { email } = await signedUp();
    await post(test.anonymous(), 'request-password-reset', { email });
    const token = await tokenIn(test.db, email, 'reset-password');
    const short = await post(test.anonymous(), 'reset-password', { token, newPassword: 'short' }).expect(422);
    expect(short.body.errors[0].pointer).toBe('/newPassword');
    await test.db.update(verification).set({ expiresAt: new Date(Date.now() - 1000) });
    isDead(await post(test.anonymous(), 'reset-password', { token, newPassword: NEW }));
    isDead(await post(test.anonymous(), 'reset-password', { token: 'invented', newPassword: NEW }));
    await signIn(email, PASSWORD).expect(200);
  });

  it('makes worthless the links that were asked for before', async () => {
    const { email } = await signedUp();
    await post(test.anonymous(), 'request-password-reset', { email });
    const older = await tokenIn(test.db, email, 'reset-password');
    await post(test.anonymous(), 'request-password-reset', { email });
    const newer = await tokenIn(test.db, email, 'reset-password');
    expect(newer).not.toBe(older);
    await post(test.anonymous(), 'reset-password', { token: newer, newPassword: NEW }).expect(200);
    isDead(await post(test.anonymous(), 'reset-password', { token: older, newPassword: PASSWORD }));
  });

  it('keeps no link in the database by which an account could be opened', async () => {
    const { email } = await signedUp();
    await post(test.anonymous(), 'request-password-reset', { email });
    const token = await tokenIn(test.db, email, 'reset-password');
    expect(JSON.stringify(await test.db.select().from(verification))).not.toContain(token);
  });
});

describe('another address', () => {
  it('is used once it is confirmed there; the old one is told', async () => {
    const { agent, email } = await signedUp();
    const newEmail = fresh();
    await post(agent, 'change-email', { newEmail, password: PASSWORD }).expect(200, DONE);
    expect(await account(agent)).toMatchObject({ email });
    const token = await tokenIn(test.db, newEmail, 'confirm-new-address');
    const answer = await post(test.anonymous(), 'verify-email', { token }).expect(200);
    expect(answer.body).toEqual({ status: true, email: newEmail });
    expect(await account(agent)).toMatchObject({ email: newEmail, emailVerified: true });
    await signIn(email, PASSWORD).expect(401);
    await signIn(newEmail, PASSWORD).expect(200);
    expect((await mailTo(test.db, email)).at(-1)?.kind).toBe('address-changed');
  });

  it('asks for the password, and for an address that is another', async () => {
    const { agent, email } = await signedUp();
    const wrong = await post(agent, 'change-email', { newEmail: fresh(), password: 'not this one' }).expect(
      422,
    );
    expect(wrong.body.errors[0].pointer).toBe('/password');
    const same = await post(agent, 'change-email', {
      newEmail: email.toUpperCase(),
      password: PASSWORD,
    }).expect(422);
    expect(same.body.errors[0].pointer).toBe('/newEmail');
    await post(test.anonymous(), 'change-email', { newEmail: fresh(), password: PASSWORD }).expect(401);
  });

  it('answers the same where somebody has the address, and changes nothing', async () => {
    const { agent, email } = await signedUp();
    const other = await signedUp();
    await post(agent, 'change-email', { newEmail: other.email, password: PASSWORD }).expect(200, DONE);
    expect((await mailTo(test.db, other.email)).map(({ kind }) => kind)).toEqual(['confirm-address']);
    expect(await account(agent)).toMatchObject({ email });
  });

  it('is refused where somebody else has taken it before it was confirmed', async () => {
    const { agent, email } = await signedUp();
    const newEmail = fresh();
    await post(agent, 'change-email', { newEmail, password: PASSWORD }).expect(200);
    const token = await tokenIn(test.db, newEmail, 'confirm-new-address');
    await post(test.anonymous(), 'sign-up/email', {
      name: 'Eve',
      email: newEmail,
      password: PASSWORD,
    }).expect(200);
    isDead(await post(test.anonymous(), 'verify-email', { token }));
    expect(await account(agent)).toMatchObject({ email });
  });

  it('cannot be brought back later by the same link', async () => {
    const { agent, email } = await signedUp();
    const newEmail = fresh();
    await post(agent, 'change-email', { newEmail, password: PASSWORD });
    const there = await tokenIn(test.db, newEmail, 'confirm-new-address');
    await post(test.anonymous(), 'verify-email', { token: there }).expect(200);
    await post(agent, 'change-email', { newEmail: email, password: PASSWORD });
    const back = await tokenIn(test.db, email, 'confirm-new-address');
    await post(test.anonymous(), 'verify-email', { token: back }).expect(200);
    isDead(await post(test.anonymous(), 'verify-email', { token: there }));
    expect(await account(agent)).toMatchObject({ email });
  });

  it('makes worthless a link for a new password that went to the old one', async () => {
    const { agent, email } = await signedUp();
    await post(test.anonymous(), 'request-password-reset', { email });
    const reset = await tokenIn(test.db, email, 'reset-password');
    const newEmail = fresh();
    await post(agent, 'change-email', { newEmail, password: PASSWORD });
    const token = await tokenIn(test.db, newEmail, 'confirm-new-address');
    await post(test.anonymous(), 'verify-email', { token }).expect(200);
    isDead(await post(test.anonymous(), 'reset-password', { token: reset, newPassword: NEW }));
  });
});

describe('another password', () => {
  it('takes the one in use, and ends every other session', async () => {
    const { agent, email } = await signedUp();
    const other = test.anonymous();
    await post(other, 'sign-in/email', { email, password: PASSWORD }).expect(200);
    const wrong = await post(agent, 'change-password', { currentPassword: 'no', newPassword: NEW }).expect(
      422,
    );
    expect(wrong.body.errors[0].pointer).toBe('/currentPassword');
    await post(agent, 'change-password', { currentPassword: PASSWORD, newPassword: NEW }).expect(200, DONE);
    expect(await account(agent)).toMatchObject({ email });
    expect((await other.get('/api/me')).body).toEqual({ user: null });
    await signIn(email, PASSWORD).expect(401);
    await signIn(email, NEW).expect(200);
    expect((await mailTo(test.db, email)).at(-1)?.kind).toBe('password-changed');
  });

  it('is not set from another site, nor signed out', async () => {
    const { agent } = await signedUp();
    const body = { currentPassword: PASSWORD, newPassword: NEW };
    await post(agent, 'change-password', body).set('Origin', 'https://elsewhere.example').expect(403);
    await post(test.anonymous(), 'change-password', body).expect(401);
  });
});

describe('sessions', () => {
  it('are listed, this one marked, without the tokens that would open them', async () => {
    const { agent, email } = await signedUp();
    const other = test.anonymous();
    await post(other, 'sign-in/email', { email, password: PASSWORD })
      .set('User-Agent', 'A phone')
      .expect(200);
    const { body } = await agent.get('/api/account/sessions').expect(200);
    const items = await sessions(agent);
    expect(items).toHaveLength(2);
    expect(items.filter(({ isCurrent }) => isCurrent)).toHaveLength(1);
    expect(items.map(({ userAgent }) => userAgent)).toContain('A phone');
    const [row] = await test.db.select({ token: session.token }).from(session);
    expect(JSON.stringify(body)).not.toContain(row!.token);
  });

  it('are ended one by one, all but this one, and never another person’s', async () => {
    const { agent, email } = await signedUp();
    const others = [test.anonymous(), test.anonymous(), test.anonymous()];
    for (const other of others) await post(other, 'sign-in/email', { email, password: PASSWORD }).expect(200);
    const items = await sessions(agent);
    const one = items.find(({ isCurrent }) => !isCurrent)!;
    const stranger = await signedUp();
    await stranger.agent.delete(`/api/account/sessions/${one.id}`).expect(404);
    await agent.delete(`/api/account/sessions/${one.id}`).expect(204);
    await agent.delete(`/api/account/sessions/${one.id}`).expect(404);
    await agent.delete('/api/account/sessions').expect(204);
    expect((await sessions(agent)).map(({ isCurrent }) => isCurrent)).toEqual([true]);
    for (const other of others) expect((await other.get('/api/me')).body).toEqual({ user: null });
    expect((await stranger.agent.get('/api/me')).body.user).not.toBeNull();
    await test.anonymous().get('/api/account/sessions').expect(401);
  });
});

describe('the account itself', () => {
  it('is read and renamed by its owner; nothing else about it can be sent', async () => {
    const { agent, email } = await signedUp();
    const changed = await agent.patch('/api/account').send({ name: ' Ada L. ' }).expect(200);
    expect(changed.body).toMatchObject({ name: 'Ada L.', email, role: 'member' });
    const refused = await agent.patch('/api/account').send({ name: 'x', role: 'admin' }).expect(422);
    expect(pointersOf(refused.body)).toEqual(['/role']);
    await agent.patch('/api/account').send({}).expect(200);
    expect(await account(agent)).toMatchObject({ name: 'Ada L.', role: 'member' });
    await test.anonymous().get('/api/account').expect(401);
    const [row] = await test.db.select().from(userTable).where(eq(userTable.email, email));
    expect(row?.role).toBe('member');
  });
});
