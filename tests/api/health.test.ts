import { beforeAll, describe, expect, it } from 'vitest';
import about from '../../package.json' with { type: 'json' };
import { createApp } from '../../server/app.ts';
import { createAuth } from '../../server/auth.ts';
import { createDatabase } from '../../server/db/client.ts';
import { pino } from 'pino';
import supertest from 'supertest';
import { ORIGIN, PASSWORD, testApp, type TestApp } from '../support/app.ts';

let test: TestApp;
beforeAll(async () => {
  test = await testApp();
});

describe('health', () => {
  it('says the version and that the database answers', async () => {
    const answer = await test.anonymous().get('/api/health').expect(200);
    expect(answer.body).toEqual({ status: 'ok', version: about.version, database: 'answers' });
  });

  it('answers 503 where the database is silent, and so do the routes that need it', async () => {
    const { db, close } = createDatabase('mysql://nobody@127.0.0.1:1/none');
    const log = pino({ level: 'silent' });
    const app = createApp({ ...test, db, log, auth: createAuth({ db, config: test.config, log }) });
    const answer = await supertest(app).get('/api/health').expect(503);
    expect(answer.body).toEqual({ status: 'degraded', version: about.version, database: 'silent' });
    const { user } = await test.signedIn();
    const signedIn = await test
      .anonymous()
      .post('/api/auth/sign-in/email')
      .send({ email: user.email, password: PASSWORD });
    const cookie = String(signedIn.headers['set-cookie']).split(';')[0] ?? '';
    const people = await supertest(app).get('/api/people').set('Cookie', cookie).expect(503);
    expect(people.body.type).toBe('/problems/unavailable');
    const signIn = await supertest(app)
      .post('/api/auth/sign-in/email')
      .set('Origin', ORIGIN)
      .send({ email: 'ada@example.org', password: PASSWORD });
    expect(signIn.status).toBe(503);
    await close();
  });
});

describe('the edges of the interface', () => {
  it('answers an unknown address with a problem', async () => {
    for (const path of ['/api', '/api/nothing', '/api/people/x/y', '/nothing']) {
      const answer = await test.anonymous().get(path).expect(404);
      expect(answer.headers['content-type']).toMatch(/^application\/problem\+json/);
      expect(answer.body).toMatchObject({
        type: '/problems/notFound',
        requestId: answer.headers['x-request-id'],
      });
    }
  });

  it('answers an address that cannot be read with 400 or 404, never 500', async () => {
    for (const path of ['/api/people/%E0%A4%A', '/%ff', '/api/people/%2e%2e%2f']) {
      const answer = await test.anonymous().get(path);
      expect([path, [400, 401, 404].includes(answer.status)]).toEqual([path, true]);
    }
  });

  it('lets nothing be kept, framed, sniffed or run from elsewhere', async () => {
    const { headers } = await test.anonymous().get('/api/health');
    expect(headers['cache-control']).toBe('no-store');
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['x-powered-by']).toBeUndefined();
    const policy = String(headers['content-security-policy']);
    expect(policy).toContain("script-src 'self';");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toContain('unsafe');
    expect(policy).not.toContain('upgrade-insecure-requests');
    expect(headers['strict-transport-security']).toBeUndefined();
  });

  it('insists on https where people come over https', async () => {
    const app = createApp({
      ...test,
      log: pino({ level: 'silent' }),
      config: { ...test.config, appUrl: 'https://leeway.example' },
    });
    const { headers } = await supertest(app).get('/api/health');
    expect(headers['strict-transport-security']).toMatch(/max-age/);
    expect(String(headers['content-security-policy'])).toContain('upgrade-insecure-requests');
  });
});
