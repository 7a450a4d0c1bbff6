import { pino } from 'pino';
import supertest from 'supertest';
import { beforeAll, describe, expect, it } from 'vitest';
import { createApp } from '../../server/app.ts';
import { createAuth } from '../../server/auth.ts';
import { ORIGIN, PASSWORD, testApp, type TestApp } from '../support/app.ts';
import { CHART, DETAILS, FINISHED, NOWHERE } from '../support/imports.ts';

let test: TestApp;
const lines: string[] = [];
beforeAll(async () => {
  test = await testApp();
});

const EMAIL = 'theresia.vogel@example.org';
/** As a proxy on another machine would pass it on. */
const ADDRESS = '203.0.113.77';
const TYPED = { bust: '917.3', waist: '743.9', hip: '1063.7' };

/** Everything that somebody does on a first evening, on a server that writes down all it ever would. */
async function wholeSession() {
  const log = pino({ level: 'trace', base: null }, { write: (line: string) => void lines.push(line) });
  const config = { ...test.config, trustProxy: 1 };
  const auth = createAuth({ db: test.db, config, log });
  const agent = supertest
    .agent(createApp({ ...test, auth, log, config }))
    .set('Origin', ORIGIN)
    .set('X-Forwarded-For', ADDRESS)
    .set('User-Agent', 'Loom/7.1 (thirty-two heddles)');
  const send = async (path: string, body: object, status: number) =>
    (await agent.post(path).send(body).expect(status)).body as Record<string, string>;
  const credentials = { email: EMAIL, password: PASSWORD };
  await send('/api/auth/sign-up/email', { ...credentials, name: 'Theresia Vogel' }, 200);
  await send('/api/auth/sign-in/email', { email: EMAIL, password: 'a wrong guess' }, 401);
  await send('/api/auth/sign-in/email', credentials, 200);
  await send('/api/auth/request-password-reset', { email: EMAIL }, 200);
  const person = await send(
    '/api/people',
    { name: 'Grandmother Ilse', stage: 'adult', chestWord: 'bust', unit: 'mm', notes: 'one shoulder lower' },
    201,
  );
  const taken = { takenOn: '2025-01-31', takenBy: 'self', unit: 'mm' };
  const sets = `/api/people/${String(person['id'])}/measurement-sets`;
  const set = await send(sets, { ...taken, typed: TYPED }, 201);
  await send(sets, { ...taken, typed: { hip: 'eleven hundred' } }, 422);
  const draft = await send('/api/imports', { details: { ...DETAILS, title: 'Ferry dress' } }, 201);
  for (const [role, text] of Object.entries({ chart: CHART, finished: FINISHED })) {
    const path = `/api/imports/${String(draft['id'])}/tables/${role}`;
    await agent.put(path).attach('file', Buffer.from(text), `ilse-${role}.csv`).expect(200);
  }
  const { patternId } = await send(`/api/imports/${String(draft['id'])}/commit`, {}, 201);
  const { body: pattern } = await agent.get(`/api/patterns/${String(patternId)}`).expect(200);
  const plan = {
    name: 'For Ilse, in linen',
    measurementSetId: set['id'],
    revisionId: (pattern as { latestRevisionId: string }).latestRevisionId,
    options: {},
  };
  await send('/api/plans', plan, 201);
  await agent.get('/api/people?q=Ilse').expect(200);
  await agent.get(`/api/people/${NOWHERE}`).expect(404);
  await agent.get(`/api/people/${encodeURIComponent(EMAIL)}`).expect(404);
  await agent.get('/somebody/theresia.vogel').expect(404);
}

describe('the log of a whole session', () => {
  it('holds no e-mail address, name, password, measurement, table, network address, browser or cookie', async () => {
    await wholeSession();
    // Ids and times are numbers too, which could hold a measurement's digits by chance.
    const written = lines
      .join('')
      .replace(/[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}/g, 'id')
      .replace(/"(time|responseTime)":\d+/g, '');
    expect(lines.length).toBeGreaterThan(15);
    expect(written).toContain('/api/people');
    for (const secret of [
      EMAIL,
      'example.org',
      'heresia',
      'Vogel',
      'Ilse',
      'ilse',
      PASSWORD,
      'a wrong guess',
      'shoulder',
      'eleven hundred',
      'Ferry',
      'linen',
      ADDRESS,
      '127.0.0.1',
      '::1',
      'ffff:',
      'Loom/7.1',
      'session_token',
      'eyJ',
      ...Object.values(TYPED),
      ...Object.values(TYPED).map((typed) => String(Math.round(Number(typed)))),
      '36 3/8',
    ]) {
      expect([secret, written.includes(secret)]).toEqual([secret, false]);
    }
  });

  it('says of each request its id, method, route’s path, status and time, and nothing else', () => {
    const requests = lines
      .map((line) => JSON.parse(line) as Record<string, unknown>)
      .filter((line) => line['req']);
    expect(requests.length).toBeGreaterThan(15);
    for (const line of requests) {
      expect(Object.keys(line).sort()).toEqual(['level', 'msg', 'req', 'res', 'responseTime', 'time']);
      expect(Object.keys(line['req'] as object).sort()).toEqual(['id', 'method', 'path']);
      expect(Object.keys(line['res'] as object)).toEqual(['status']);
      expect((line['req'] as { path: string }).path).toMatch(/^[/a-z0-9…-]+$/);
    }
  });
});
