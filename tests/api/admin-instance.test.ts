import { beforeAll, describe, expect, it } from 'vitest';
import about from '../../package.json' with { type: 'json' };
import { adminReferenceSchema } from '../../shared/admin/reference.schema.ts';
import { wearingEase } from '../../shared/fit/wearing-ease.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { NOWHERE } from '../support/imports.ts';

let test: TestApp;
let admin: SignedIn;
let ada: SignedIn;
beforeAll(async () => {
  test = await testApp();
  admin = await test.signedIn({ role: 'admin' });
  ada = await test.signedIn();
});

describe.each(['/api/admin/health', '/api/admin/reference', '/api/metrics'])('%s', (path) => {
  it('is for administrators alone', async () => {
    await test.anonymous().get(path).expect(401);
    await ada.agent.get(path).expect(403);
    await (await test.signedIn({ role: 'teacher' })).agent.get(path).expect(403);
    await admin.agent.get(path).expect(200);
  });
});

describe('the health of the instance', () => {
  it('says version, database, migrations, disk, running time and mail', async () => {
    const { body } = await admin.agent.get('/api/admin/health').expect(200);
    expect(body).toEqual({
      version: about.version,
      startedAt: expect.stringMatching(/Z$/),
      uptimeSeconds: expect.any(Number),
      database: {
        version: expect.stringMatching(/^\d+\.\d+\.\d+-MariaDB/),
        migrationsApplied: expect.any(Number),
        migrationsKnown: expect.any(Number),
      },
      disk: { freeBytes: expect.any(Number), totalBytes: expect.any(Number) },
      mail: { waiting: expect.any(Number), failed: 0 },
    });
    expect(body.database.migrationsKnown).toBeGreaterThan(1);
    expect(body.database.migrationsApplied).toBe(body.database.migrationsKnown);
    expect(body.disk.freeBytes).toBeGreaterThan(0);
    expect(body.disk.freeBytes).toBeLessThan(body.disk.totalBytes);
    expect(Date.now() - Date.parse(body.startedAt as string)).toBeGreaterThanOrEqual(
      body.uptimeSeconds * 1000 - 1000,
    );
  });
});

describe('the reference figures carried', () => {
  it('lists each table with where it comes from, and each ease with its source', async () => {
    const { body } = await admin.agent.get('/api/admin/reference').expect(200);
    const { bodyTables, wearingEase: eases } = adminReferenceSchema.parse(body);
    expect(bodyTables.map(({ number }) => number)).toEqual(['D5585-11e1', 'L 4005']);
    expect(bodyTables[0]?.sizes).toHaveLength(12);
    expect(bodyTables[0]?.points).toContain('waist');
    for (const { source } of [...bodyTables, ...eases]) expect(source.length).toBeGreaterThan(5);
    const hip = eases.find(({ kind, point }) => kind === 'trousers' && point === 'hip');
    expect(hip).toEqual({ kind: 'trousers', point: 'hip', ...wearingEase('trousers', 'hip') });
    expect(eases.some(({ kind }) => kind === 'swimwear')).toBe(false);
  });
});

describe('the metrics', () => {
  const read = async () => (await admin.agent.get('/api/metrics').expect(200)).text;
  const valueOf = (text: string, ...parts: string[]): number => {
    const line = text.split('\n').find((one) => parts.every((part) => one.includes(part)));
    return line === undefined ? NaN : Number(line.slice(line.lastIndexOf(' ') + 1));
  };

  it('come in the text exposition format: each line a comment or a name, labels and a number', async () => {
    const answer = await admin.agent.get('/api/metrics').expect(200);
    expect(answer.headers['content-type']).toBe('text/plain; version=0.0.4; charset=utf-8');
    expect(answer.text.endsWith('\n')).toBe(true);
    for (const line of answer.text.trimEnd().split('\n')) {
      expect(line).toMatch(
        /^(# (HELP|TYPE) leeway_\w+ .+|leeway_\w+\{(\w+="[^"\n]*",?)+\} (\d+(\.\d+)?(e[+-]?\d+)?|NaN))$/,
      );
      if (!line.startsWith('#')) expect(line).toMatch(/process="[^"]+:\d+"/);
    }
  });

  it('count answers by the pattern of the route and by status, never by the address', async () => {
    const labels = ['leeway_http_requests_total{', 'method="GET"', 'route="/api/people/:id"', 'status="404"'];
    const before = valueOf(await read(), ...labels) || 0;
    await ada.agent.get(`/api/people/${NOWHERE}`).expect(404);
    await ada.agent.get(`/api/people/${NOWHERE.replace('7', '8')}`).expect(404);
    await ada.agent.get('/api/nothing/of/this').expect(404);
    await ada.agent.get('/nothing?q=Theresia').expect(404);
    const after = await read();
    expect(valueOf(after, ...labels)).toBe(before + 2);
    expect(valueOf(after, 'requests_total{', 'route="unknown"', 'status="404"')).toBeGreaterThan(0);
    expect(valueOf(after, 'requests_total{', 'route="pages"', 'status="404"')).toBeGreaterThan(0);
    for (const told of [NOWHERE, 'Theresia', 'nothing', ada.user.email, '127.0.0.1']) {
      expect([told, after.includes(told)]).toEqual([told, false]);
    }
  });

  it('spread the durations over buckets that never fall and end at the count', async () => {
    await ada.agent.get('/api/people').expect(200);
    const lines = (await read())
      .split('\n')
      .filter((line) => line.includes('duration_seconds') && line.includes('route="/api/people"'));
    const buckets = lines
      .filter((line) => line.includes('_bucket'))
      .map((line) => Number(line.split(' ')[1]));
    expect(buckets.length).toBeGreaterThan(5);
    expect(buckets).toEqual([...buckets].sort((a, b) => a - b));
    expect(buckets.at(-1)).toBe(valueOf(lines.join('\n'), '_count'));
    expect(valueOf(lines.join('\n'), '_sum')).toBeGreaterThan(0);
  });

  it('say how busy the pool is', async () => {
    const limit = valueOf(await read(), 'leeway_database_connections_limit{');
    expect(limit).toBe(8);
    await test.db.transaction(async (tx) => {
      await tx.execute('SELECT 1');
      expect(valueOf(await read(), 'leeway_database_connections{', 'busy')).toBe(1);
    });
    const after = await read();
    expect(valueOf(after, 'leeway_database_connections{', 'busy')).toBe(0);
    expect(valueOf(after, 'leeway_database_connections{', 'idle')).toBeGreaterThan(0);
    expect(valueOf(after, 'leeway_database_waiting{')).toBe(0);
  });

  it('notice that the event loop was held up, and forget it once read', async () => {
    await read();
    await new Promise((next) => setTimeout(next, 30));
    const end = performance.now() + 200;
    while (performance.now() < end);
    await new Promise((next) => setTimeout(next, 30));
    expect(valueOf(await read(), 'leeway_event_loop_delay_seconds', 'quantile="1"')).toBeGreaterThan(0.15);
  });
});
