import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { session, twoFactor, verification } from '../../server/account/account.table.ts';
import { PASSWORD, testApp, type Agent, type SignedIn, type TestApp } from '../support/app.ts';
import { mailTo } from '../support/outbox.ts';
import { codeOf } from '../support/totp.ts';

let test: TestApp;
beforeAll(async () => {
  test = await testApp();
});

const DONE = { status: true };
const verify = (agent: Agent, code: string) => agent.post('/api/auth/two-factor/verify-totp').send({ code });
const recover = (agent: Agent, code: string) =>
  agent.post('/api/auth/two-factor/verify-backup-code').send({ code });

interface WithFactor extends SignedIn {
  uri: string;
  recoveryCodes: string[];
}

/** Somebody whose second factor is on; the code before the present one was spent on switching it on. */
async function withFactor(): Promise<WithFactor> {
  const person = await test.signedIn({ isVerified: true });
  const { body } = await person.agent
    .post('/api/auth/two-factor/enable')
    .send({ password: PASSWORD })
    .expect(200);
  await verify(person.agent, codeOf(body.totpURI, -1)).expect(200, DONE);
  return { ...person, uri: body.totpURI, recoveryCodes: body.backupCodes };
}

/** A browser that has given the password and is asked for a code. */
async function challenged(email: string): Promise<Agent> {
  const agent = test.anonymous();
  const answer = await agent.post('/api/auth/sign-in/email').send({ email, password: PASSWORD }).expect(200);
  expect(answer.body).toEqual({ twoFactorRedirect: true, twoFactorMethods: ['totp'] });
  expect((await agent.get('/api/me')).body).toEqual({ user: null });
  return agent;
}

/** Not within the last two seconds of a period, so that no code changes while a test counts on it. */
async function whileCodeLasts(): Promise<void> {
  const left = 30_000 - (Date.now() % 30_000);
  if (left < 4000) await new Promise((resolve) => setTimeout(resolve, left + 50));
}

describe('switching a second factor on', () => {
  it('shows the key and ten codes once, and is on only after a code has been given', async () => {
    const { agent, user } = await test.signedIn({ isVerified: true });
    const { body } = await agent.post('/api/auth/two-factor/enable').send({ password: PASSWORD }).expect(200);
    expect(body.totpURI).toMatch(/^otpauth:\/\/totp\/Leeway:/);
    expect(new Set(body.backupCodes).size).toBe(10);
    expect((await agent.get('/api/account')).body).toMatchObject({
      twoFactorEnabled: false,
      recoveryCodesLeft: null,
    });
    await verify(agent, codeOf(body.totpURI)).expect(200, DONE);
    expect((await agent.get('/api/account')).body).toMatchObject({
      twoFactorEnabled: true,
      recoveryCodesLeft: 10,
    });
    expect((await mailTo(test.db, user.email)).map(({ kind }) => kind)).toEqual(['second-factor-on']);
  });

  it('keeps neither key nor codes so that they can be read in the database', async () => {
    const { user, uri, recoveryCodes } = await withFactor();
    const [row] = await test.db.select().from(twoFactor).where(eq(twoFactor.userId, user.id));
    const kept = JSON.stringify(row);
    expect(kept).not.toContain(new URL(uri).searchParams.get('secret'));
    for (const code of recoveryCodes) expect(kept).not.toContain(code);
  });

  it('waits for a confirmed address', async () => {
    const { agent } = await test.signedIn();
    const answer = await agent.post('/api/auth/two-factor/enable').send({ password: PASSWORD }).expect(409);
    expect(answer.body.detail).toContain('Confirm your e-mail address');
  });

  it('asks for the password, and for somebody who is signed in', async () => {
    const { agent } = await test.signedIn({ isVerified: true });
    const wrong = await agent
      .post('/api/auth/two-factor/enable')
      .send({ password: 'not this one' })
      .expect(422);
    expect(wrong.body.errors[0].pointer).toBe('/password');
    await test.anonymous().post('/api/auth/two-factor/enable').send({ password: PASSWORD }).expect(401);
  });

  it('is not begun anew while it is on', async () => {
    const { agent } = await withFactor();
    await agent.post('/api/auth/two-factor/enable').send({ password: PASSWORD }).expect(409);
  });
});

describe('signing in with a code', () => {
  it('takes the code of the moment', async () => {
    const { user, uri } = await withFactor();
    await whileCodeLasts();
    const agent = await challenged(user.email);
    const code = codeOf(uri);
    await verify(agent, `${code.slice(0, 3)} ${code.slice(3)}`).expect(200, DONE);
    expect((await agent.get('/api/me')).body.user.id).toBe(user.id);
  });

  it('refuses a code that was used already in its window, and makes no session for it', async () => {
    const { user, uri } = await withFactor();
    await whileCodeLasts();
    const code = codeOf(uri);
    await verify(await challenged(user.email), code).expect(200);
    const before = await test.db.select().from(session).where(eq(session.userId, user.id));
    const second = await challenged(user.email);
    const answer = await verify(second, code).expect(422);
    expect(answer.body.errors).toEqual([
      { pointer: '/code', detail: expect.stringContaining('used already') },
    ]);
    expect(answer.headers['set-cookie']).toBeUndefined();
    expect((await second.get('/api/me')).body).toEqual({ user: null });
    expect(await test.db.select().from(session).where(eq(session.userId, user.id))).toHaveLength(
      before.length,
    );
    // The same challenge still takes a fresh code.
    await verify(second, codeOf(uri, 1)).expect(200);
  });

  it('refuses the code that switched it on', async () => {
    const person = await test.signedIn({ isVerified: true });
    await whileCodeLasts();
    const { body } = await person.agent.post('/api/auth/two-factor/enable').send({ password: PASSWORD });
    const code = codeOf(body.totpURI);
    await verify(person.agent, code).expect(200);
    await verify(await challenged(person.user.email), code).expect(422);
  });

  it('lets one of two through that give the same code at once', async () => {
    const { user, uri } = await withFactor();
    await whileCodeLasts();
    const agents = [await challenged(user.email), await challenged(user.email)];
    const answers = await Promise.all(agents.map((agent) => verify(agent, codeOf(uri))));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 422]);
  });

  it('refuses a code of two periods ago and one that is no code', async () => {
    const { user, uri } = await withFactor();
    await whileCodeLasts();
    const agent = await challenged(user.email);
    await verify(agent, codeOf(uri, -2)).expect(422);
    await verify(agent, '12345').expect(422);
    await verify(agent, 'abcdef').expect(422);
  });

  it('ends a sign-in after five wrong codes, and locks the account for a while after ten', async () => {
    const { user, uri } = await withFactor();
    await whileCodeLasts();
    const wrong = String((Number(codeOf(uri)) + 1) % 1_000_000).padStart(6, '0');
    const statuses: number[] = [];
    for (let round = 0; round < 2; round += 1) {
      const agent = await challenged(user.email);
      for (let at = 0; at < 5; at += 1) statuses.push((await verify(agent, wrong)).status);
      statuses.push((await verify(agent, codeOf(uri))).status);
    }
    expect(statuses).toEqual([422, 422, 422, 422, 422, 401, 422, 422, 422, 422, 422, 429]);
    await verify(await challenged(user.email), codeOf(uri)).expect(429);
  });

  it('takes no code without a password before it, or after the challenge has run out', async () => {
    const { user, uri } = await withFactor();
    await whileCodeLasts();
    await verify(test.anonymous(), codeOf(uri)).expect(401);
    const late = await challenged(user.email);
    await test.db
      .update(verification)
      .set({ expiresAt: new Date(Date.now() - 1000) })
      .where(eq(verification.value, user.id));
    await verify(late, codeOf(uri)).expect(401);
  });

  it('refuses a code that another site sends', async () => {
    const { user, uri } = await withFactor();
    const agent = await challenged(user.email);
    await verify(agent, codeOf(uri)).set('Origin', 'https://elsewhere.example').expect(403);
  });
});

describe('recovery codes', () => {
  it('work once each', async () => {
    const { user, recoveryCodes } = await withFactor();
    const agent = await challenged(user.email);
    await recover(agent, recoveryCodes[0]!).expect(200, DONE);
    expect((await agent.get('/api/account')).body.recoveryCodesLeft).toBe(9);
    const again = await recover(await challenged(user.email), recoveryCodes[0]!).expect(422);
    expect(again.body.errors[0].pointer).toBe('/code');
    await recover(await challenged(user.email), recoveryCodes[1]!).expect(200);
  });

  it('let one of two through that give the same one at once', async () => {
    const { user, recoveryCodes } = await withFactor();
    const agents = [await challenged(user.email), await challenged(user.email)];
    const answers = await Promise.all(agents.map((agent) => recover(agent, recoveryCodes[2]!)));
    const statuses = answers.map(({ status }) => status);
    expect(statuses.filter((status) => status === 200)).toHaveLength(1);
    expect(statuses.filter((status) => status === 422 || status === 409)).toHaveLength(1);
  });

  it('are replaced as a whole', async () => {
    const { agent, user, recoveryCodes } = await withFactor();
    const made = await agent
      .post('/api/auth/two-factor/generate-backup-codes')
      .send({ password: PASSWORD })
      .expect(200);
    expect(made.body.backupCodes).toHaveLength(10);
    await recover(await challenged(user.email), recoveryCodes[0]!).expect(422);
    await recover(await challenged(user.email), made.body.backupCodes[0]).expect(200);
    await agent.post('/api/auth/two-factor/generate-backup-codes').send({ password: 'no' }).expect(422);
  });
});

describe('switching it off', () => {
  it('asks for the password; then the password alone signs in', async () => {
    const { agent, user } = await withFactor();
    await agent.post('/api/auth/two-factor/disable').send({ password: 'not this one' }).expect(422);
    await agent.post('/api/auth/two-factor/disable').send({ password: PASSWORD }).expect(200, DONE);
    expect((await agent.get('/api/account')).body).toMatchObject({ twoFactorEnabled: false });
    const fresh = test.anonymous();
    await fresh.post('/api/auth/sign-in/email').send({ email: user.email, password: PASSWORD }).expect(200);
    expect((await fresh.get('/api/me')).body.user.id).toBe(user.id);
    const kinds = (await mailTo(test.db, user.email)).map(({ kind }) => kind);
    expect(kinds).toEqual(['second-factor-on', 'second-factor-off']);
  });
});
