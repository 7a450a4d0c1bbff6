import { beforeAll, describe, expect, it } from 'vitest';
import { rateLimit } from '../../server/account/account.table.ts';
import { PASSWORD, testApp, type TestApp } from '../support/app.ts';
import { mailTo, tokenIn } from '../support/outbox.ts';

let test: TestApp;
beforeAll(async () => {
  test = await testApp({ limits: true, config: { trustProxy: 1 } });
});

const guess = (address: string, email: string, password = 'wrong password') =>
  test
    .anonymous()
    .post('/api/auth/sign-in/email')
    .set('X-Forwarded-For', address)
    .set('X-Leeway-Address', `203.0.113.${String(Math.floor(Math.random() * 250))}`)
    .send({ email, password });

describe('rate limits', () => {
  it('stop guessing from one address, whatever it claims to be, and leave another address alone', async () => {
    const statuses: number[] = [];
    for (let attempt = 0; attempt < 41; attempt += 1) {
      statuses.push((await guess('198.51.100.7', `nobody-${String(attempt)}@example.org`)).status);
    }
    expect(statuses.slice(0, 40)).toEqual(Array<number>(40).fill(401));
    expect(statuses[40]).toBe(429);

    const refused = await guess('198.51.100.7', 'n@example.org').expect(
      'content-type',
      /application\/problem\+json/,
    );
    expect(refused.body).toMatchObject({ type: '/problems/tooMany', status: 429 });
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
    await guess('198.51.100.8', 'n@example.org').expect(401);
  });

  it('are counted in the database, where every process sees them', async () => {
    const rows = await test.db.select().from(rateLimit);
    expect(rows.find((row) => row.key.startsWith('198.51.100.7|'))?.count).toBe(41);
  });

  it('let through no more than twenty of a thousand wrong passwords for one account from a thousand addresses', async () => {
    const { user } = await test.signedIn();
    const counts: Record<number, number> = {};
    for (let round = 0; round < 50; round += 1) {
      const answers = await Promise.all(
        Array.from({ length: 20 }, (_, at) => guess(`10.${String(round)}.0.${String(at)}`, user.email)),
      );
      for (const { status } of answers) counts[status] = (counts[status] ?? 0) + 1;
    }
    expect(counts).toEqual({ 401: 20, 429: 980 });
    const right = await guess('192.0.2.1', user.email, PASSWORD);
    expect(right.status).toBe(429);
    expect(Number(right.headers['retry-after'])).toBeGreaterThan(0);
    // Another account is not kept out, and an address nobody has is counted just the same.
    const { user: other } = await test.signedIn();
    await guess('192.0.2.1', other.email, PASSWORD).expect(200);
  }, 120_000);

  it('let a new password in at once, however many wrong ones came before it', async () => {
    const { user } = await test.signedIn();
    for (let at = 0; at < 20; at += 1) await guess(`10.8.0.${String(at)}`, user.email).expect(401);
    await guess('10.8.1.1', user.email, PASSWORD).expect(429);
    const ask = (path: string, body: object) =>
      test.anonymous().post(`/api/auth/${path}`).set('X-Forwarded-For', '10.8.1.2').send(body).expect(200);
    await ask('request-password-reset', { email: user.email });
    const token = await tokenIn(test.db, user.email, 'reset-password');
    await ask('reset-password', { token, newPassword: 'another quiet measure' });
    await guess('10.8.1.3', user.email, 'another quiet measure').expect(200);
  });

  it('count anew after the right password', async () => {
    const { user } = await test.signedIn();
    for (let round = 0; round < 3; round += 1) {
      for (let at = 0; at < 15; at += 1) {
        await guess(`10.9.${String(round)}.${String(at)}`, user.email).expect(401);
      }
      await guess(`10.9.${String(round)}.200`, user.email, PASSWORD).expect(200);
    }
  });

  it('tell an address that nobody has from one that somebody has by nothing', async () => {
    const statuses = async (email: string) => {
      const seen: number[] = [];
      for (let at = 0; at < 22; at += 1) seen.push((await guess(`10.8.0.${String(at)}`, email)).status);
      return seen;
    };
    const { user } = await test.signedIn();
    expect(await statuses('no-such-person@example.org')).toEqual(await statuses(user.email));
  });

  it('send no more than six mails an hour to one address, whoever asks from wherever', async () => {
    const { user } = await test.signedIn();
    const ask = (at: number, email: string) =>
      test
        .anonymous()
        .post('/api/auth/request-password-reset')
        .set('X-Forwarded-For', `10.7.0.${String(at)}`)
        .send({ email });
    const of = async (email: string) => {
      const seen: number[] = [];
      for (let at = 0; at < 8; at += 1) seen.push((await ask(at, email)).status);
      return seen;
    };
    const known = await of(user.email);
    expect(known).toEqual([200, 200, 200, 200, 200, 200, 429, 429]);
    expect(await of('nobody-there@example.org')).toEqual(known);
    expect(await mailTo(test.db, user.email)).toHaveLength(6);
  });

  it('bound the password asked for again from whoever holds a session', async () => {
    const { agent } = await test.signedIn();
    const statuses: number[] = [];
    for (let at = 0; at < 22; at += 1) {
      const body = { password: `guess number ${String(at)}` };
      statuses.push((await agent.delete('/api/account').send(body)).status);
    }
    expect(statuses).toEqual([...Array<number>(20).fill(422), 429, 429]);
    await agent.delete('/api/account').send({ password: PASSWORD }).expect(429);
  });
});

describe('rate limits behind no proxy', () => {
  it('take no word of a header for where a request comes from', async () => {
    test = await testApp({ limits: true, config: { trustProxy: 0 } });
    const statuses: number[] = [];
    for (let at = 0; at < 41; at += 1) {
      statuses.push((await guess(`10.6.0.${String(at)}`, `nobody-${String(at)}@example.org`)).status);
    }
    expect(statuses).toEqual([...Array<number>(40).fill(401), 429]);
  }, 60_000);
});
