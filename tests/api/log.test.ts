import { pino } from 'pino';
import supertest from 'supertest';
import { beforeAll, describe, expect, it } from 'vitest';
import { createApp } from '../../server/app.ts';
import { createDatabase } from '../../server/db/client.ts';
import { measurementSet } from '../../server/people/people.table.ts';
import { sql } from 'drizzle-orm';
import { ORIGIN, PASSWORD, testApp, type SignedIn, type TestApp } from '../support/app.ts';

let test: TestApp;
let ada: SignedIn;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
});

describe('the log', () => {
  it('holds no measurement, name, address, cookie or search, not even when a query fails', async () => {
    const lines: string[] = [];
    const log = pino({ level: 'trace' }, { write: (line: string) => void lines.push(line) });
    const failing = new Proxy(test.db, {
      get(target, key) {
        if (key !== 'insert') return Reflect.get(target, key) as unknown;
        return () => ({
          values: (row: object) =>
            test.db.execute(sql`INSERT INTO nothing_of_this_name VALUES (${JSON.stringify(row)})`),
        });
      },
    });
    const { body } = await ada.agent
      .post('/api/people')
      .send({ name: 'Maria Theresia', stage: 'adult', chestWord: 'bust', unit: 'cm' })
      .expect(201);
    const app = createApp({ ...test, db: failing, log });
    const ask = supertest.agent(app).set('Origin', ORIGIN);
    const session = await cookieOf();
    const answer = await ask
      .post(`/api/people/${(body as { id: string }).id}/measurement-sets?q=Theresia`)
      .set('Cookie', session)
      .set('X-Forwarded-For', '198.51.100.9')
      .send({
        takenOn: '2025-01-31',
        takenBy: 'self',
        unit: 'cm',
        notes: 'a secret',
        typed: { hip: '123.4' },
      })
      .expect(500);
    expect(answer.body).toEqual({
      type: '/problems/failed',
      title: expect.any(String),
      status: 500,
      requestId: answer.headers['x-request-id'],
    });
    const written = lines.join('');
    expect(written).toContain(answer.headers['x-request-id']);
    expect(written).toContain('"errno":1146');
    for (const secret of [
      '123.4',
      '1234',
      'Theresia',
      'a secret',
      '198.51.100.9',
      '127.0.0.1',
      session,
      'INSERT',
    ]) {
      expect([secret, written.includes(secret)]).toEqual([secret, false]);
    }
    expect(await test.db.select().from(measurementSet)).toEqual([]);
  });
});

describe('the log of a failure below the query', () => {
  it('holds neither the query nor its values where the connection is gone', async () => {
    const lines: string[] = [];
    const log = pino({ level: 'trace' }, { write: (line: string) => void lines.push(line) });
    const { db, close } = createDatabase(test.config.databaseUrl, { connections: 1 });
    await close();
    const failing = new Proxy(test.db, {
      get: (target, key) => (key === 'insert' ? db.insert.bind(db) : (Reflect.get(target, key) as unknown)),
    });
    const ask = supertest.agent(createApp({ ...test, db: failing, log })).set('Origin', ORIGIN);
    await ask
      .post('/api/people')
      .set('Cookie', await cookieOf())
      .send({ name: 'Maria Theresia', stage: 'adult', chestWord: 'bust', unit: 'cm', notes: 'hip 1063.7' })
      .expect(500);
    const written = lines.join('');
    expect(written).toContain('a request failed');
    for (const secret of ['Theresia', '1063.7', 'insert into', 'INSERT', 'params']) {
      expect([secret, written.includes(secret)]).toEqual([secret, false]);
    }
  });
});

async function cookieOf(): Promise<string> {
  const answer = await test
    .anonymous()
    .post('/api/auth/sign-in/email')
    .send({ email: ada.user.email, password: PASSWORD })
    .expect(200);
  return String(answer.headers['set-cookie']).split(';')[0] ?? '';
}
