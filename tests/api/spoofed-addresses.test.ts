import { beforeAll, describe, expect, it } from 'vitest';
import { testApp, type TestApp } from '../support/app.ts';

/** As many as may sign in from one address within a minute. */
const ALLOWED = 40;
/** What a client might hope is believed. */
const CLAIMS = [
  'X-Forwarded-For',
  'X-Real-IP',
  'X-Client-IP',
  'CF-Connecting-IP',
  'True-Client-IP',
  'X-Leeway-Address',
];

let test: TestApp;
let guesses = 0;

/** One wrong sign-in with the headers; never the same e-mail address twice, so that only the network address counts. */
async function guess(headers: Record<string, string>): Promise<number> {
  guesses += 1;
  const response = await test
    .anonymous()
    .post('/api/auth/sign-in/email')
    .set(headers)
    .send({ email: `nobody-${guesses}@example.org`, password: 'wrong password' });
  return response.status;
}

async function guessAll(headersOf: (attempt: number) => Record<string, string>): Promise<number[]> {
  const statuses: number[] = [];
  for (let attempt = 0; attempt <= ALLOWED; attempt += 1) statuses.push(await guess(headersOf(attempt)));
  return statuses;
}

const stopped = [...Array<number>(ALLOWED).fill(401), 429];

describe('behind no proxy (TRUST_PROXY=0)', () => {
  beforeAll(async () => {
    test = await testApp({ limits: true, config: { trustProxy: 0 } });
  });

  it('counts by the connection, whatever address a request claims and in whatever header', async () => {
    const statuses = await guessAll((attempt) =>
      Object.fromEntries(CLAIMS.map((name) => [name, `198.51.100.${attempt}`])),
    );
    expect(statuses).toEqual(stopped);
    expect(await guess({})).toBe(429);
    expect(await guess({ Forwarded: 'for=192.0.2.60;proto=http;by=203.0.113.43' })).toBe(429);
  });
});

describe('behind one proxy (TRUST_PROXY=1)', () => {
  beforeAll(async () => {
    test = await testApp({ limits: true, config: { trustProxy: 1 } });
  });

  it('counts by the address that the proxy wrote last, whatever the client wrote before it', async () => {
    const statuses = await guessAll((attempt) => ({
      'X-Forwarded-For': `10.0.0.${attempt}, 192.0.2.${attempt}, 203.0.113.9`,
      'X-Real-IP': `192.0.2.${attempt}`,
      'X-Leeway-Address': `192.0.2.${attempt}`,
    }));
    expect(statuses).toEqual(stopped);
    expect(await guess({ 'X-Forwarded-For': '203.0.113.9' })).toBe(429);
  });

  it('leaves another address alone, also where a client claims the one that was stopped', async () => {
    expect(await guess({ 'X-Forwarded-For': '203.0.113.9, 203.0.113.10' })).toBe(401);
    expect(await guess({ 'X-Forwarded-For': '203.0.113.10' })).toBe(401);
  });

  it.each([
    ['words', 'not an address'],
    ['a very long list', Array(500).fill('10.0.0.1').join(', ')],
    ['an address with a port', '203.0.113.77:4711'],
    ['nothing', ''],
    ['an address of the newer kind', '2001:db8::1'],
  ])('answers as ever where what came is %s', async (_what, address) => {
    expect(await guess({ 'X-Forwarded-For': address })).toBe(401);
  });
});
