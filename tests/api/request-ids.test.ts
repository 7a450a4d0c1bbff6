import { pino } from 'pino';
import supertest from 'supertest';
import { beforeAll, describe, expect, it } from 'vitest';
import { createApp } from '../../server/app.ts';
import { ORIGIN, testApp, type TestApp } from '../support/app.ts';

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;
const GIVEN = 'edge-7.0001_abc';

let test: TestApp;
beforeAll(async () => {
  test = await testApp();
});

const behind = (trustProxy: number | string[]) =>
  supertest
    .agent(createApp({ ...test, log: pino({ level: 'silent' }), config: { ...test.config, trustProxy } }))
    .set('Origin', ORIGIN);
const idOf = (answer: { headers: Record<string, string> }) => answer.headers['x-request-id'];

describe('the request id', () => {
  it('is on every answer: of a route, a refusal, a wrong address, a broken body and the sign-in library', async () => {
    const ask = behind(0);
    const answers = [
      await ask.get('/api/health'),
      await ask.get('/api/people'),
      await ask.get('/nothing'),
      await ask.post('/api/people').type('json').send('{'),
      await ask.post('/api/auth/sign-in/email').send({ email: 'a@example.org', password: 'wrong' }),
      await ask.post('/api/people').set('Origin', 'https://elsewhere.example').send({}),
      await ask.get('/%ff'),
      await ask.options('/api/people'),
    ];
    const ids = answers.map(idOf);
    for (const id of ids) expect(id).toMatch(UUID);
    expect(new Set(ids).size).toBe(ids.length);
    for (const answer of answers) {
      const { requestId } = answer.body as { requestId?: string };
      if (requestId !== undefined) expect(requestId).toBe(idOf(answer));
    }
  });

  it('is not taken from whoever asks', async () => {
    const answer = await behind(0).get('/api/health').set('X-Request-Id', GIVEN);
    expect(idOf(answer)).toMatch(UUID);
    const elsewhere = await behind(['192.0.2.7']).get('/api/health').set('X-Request-Id', GIVEN);
    expect(idOf(elsewhere)).toMatch(UUID);
  });

  it.each([[1], [['loopback']]])('is taken from a proxy that is trusted (%j)', async (trusted) => {
    const answer = await behind(trusted).get('/api/nothing').set('X-Request-Id', GIVEN);
    expect(idOf(answer)).toBe(GIVEN);
    expect((answer.body as { requestId: string }).requestId).toBe(GIVEN);
  });

  it.each(['short', 'with blanks in it', 'x'.repeat(65), '{"a":"line"}', 'ada@example.org'])(
    'is made anew where a proxy passes on what is none: %s',
    async (odd) => {
      const answer = await behind(1).get('/api/health').set('X-Request-Id', odd);
      expect(idOf(answer)).toMatch(UUID);
    },
  );
});
