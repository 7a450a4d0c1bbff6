import { beforeAll, describe, expect, it } from 'vitest';
import { rateLimit } from '../../server/account/account.table.ts';
import { testApp, type TestApp } from '../support/app.ts';

let test: TestApp;
beforeAll(async () => {
  test = await testApp({ limits: true, config: { trustProxy: 1 } });
});

const guess = (address: string) =>
  test
    .anonymous()
    .post('/api/auth/sign-in/email')
    .set('X-Forwarded-For', address)
    .set('X-Leeway-Address', `203.0.113.${String(Math.floor(Math.random() * 250))}`)
    .send({ email: 'nobody@example.org', password: 'wrong password' });

describe('rate limits', () => {
  it('stop guessing from one address, whatever it claims to be, and leave another address alone', async () => {
    const statuses: number[] = [];
    for (let attempt = 0; attempt < 41; attempt += 1) statuses.push((await guess('198.51.100.7')).status);
    expect(statuses.slice(0, 40)).toEqual(Array<number>(40).fill(401));
    expect(statuses[40]).toBe(429);

    const refused = await guess('198.51.100.7').expect('content-type', /application\/problem\+json/);
    expect(refused.body).toMatchObject({ type: '/problems/tooMany', status: 429 });
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
    await guess('198.51.100.8').expect(401);
  });

  it('are counted in the database, where every process sees them', async () => {
    const rows = await test.db.select().from(rateLimit);
    expect(rows.find((row) => row.key.startsWith('198.51.100.7|'))?.count).toBe(40);
  });
});
