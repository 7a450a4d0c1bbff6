import { EventEmitter, once } from 'node:events';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { connect } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { eq } from 'drizzle-orm';
import { pino } from 'pino';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { serve, type Served } from '../../server/index.ts';
import { person } from '../../server/people/people.table.ts';
import { PASSWORD, testApp, type TestApp } from '../support/app.ts';
import { freePort } from '../support/launcher.ts';

let test: TestApp;
let root: string;
let owner: { email: string };
beforeAll(async () => {
  test = await testApp();
  owner = (await test.signedIn()).user;
  root = mkdtempSync(join(tmpdir(), 'leeway-root-'));
  mkdirSync(join(root, 'dist/client/assets'), { recursive: true });
  writeFileSync(join(root, 'dist/client/index.html'), '<!doctype html><title>x</title>');
});
afterAll(() => rmSync(root, { recursive: true, force: true }));

interface Running extends Served {
  ask: (method: string, path: string, body?: object) => Promise<Response>;
  cookie: string;
  port: number;
}

/** The server as it runs, on a port of its own, and somebody signed in to it. */
async function start(patienceMs?: number): Promise<Running> {
  const port = await freePort();
  const url = `http://127.0.0.1:${String(port)}`;
  const config = { ...test.config, port, appUrl: url, origins: [url] };
  const served = await serve(config, {
    root,
    isDevelopment: false,
    log: pino({ level: 'silent' }),
    ...(patienceMs === undefined ? {} : { patienceMs }),
  });
  let cookie = '';
  const ask = (method: string, path: string, body?: object) =>
    fetch(`${url}${path}`, {
      method,
      headers: { origin: url, 'content-type': 'application/json', cookie },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
  const signedIn = await ask('POST', '/api/auth/sign-in/email', { email: owner.email, password: PASSWORD });
  expect(signedIn.status).toBe(200);
  cookie = signedIn.headers.getSetCookie()[0]?.split(';')[0] ?? '';
  return { ...served, ask, port, cookie };
}

const isRefused = (port: number) =>
  new Promise<boolean>((resolve) => {
    const socket = connect(port, '127.0.0.1');
    socket.once('connect', () => {
      socket.destroy();
      resolve(false);
    });
    socket.once('error', () => resolve(true));
  });

async function untilRefused(port: number) {
  while (!(await isRefused(port))) await wait(10);
}

const MARIA = { name: 'Maria', stage: 'adult', chestWord: 'bust', unit: 'cm' };

/** A change that cannot go on while another transaction holds the row; answers once it waits for it. */
async function slowChange(running: Running) {
  const { id } = (await (await running.ask('POST', '/api/people', MARIA)).json()) as { id: string };
  let open: () => void = () => undefined;
  const gate = new Promise<undefined>((resolve) => {
    open = () => resolve(undefined);
  });
  const held = new EventEmitter();
  const isHeld = once(held, 'held');
  const holding = test.db.transaction(async (tx) => {
    await tx.select().from(person).where(eq(person.id, id)).for('update');
    held.emit('held');
    await gate;
  });
  await isHeld;
  const answer = running
    .ask('PATCH', `/api/people/${id}`, { name: 'Maria, finished' })
    .catch((error: unknown) => error);
  await untilSomebodyWaits();
  return {
    id,
    answer,
    async release() {
      open();
      await holding;
    },
  };
}

async function untilSomebodyWaits() {
  for (;;) {
    const [rows] = await test.db.execute('SELECT COUNT(*) AS n FROM information_schema.innodb_lock_waits');
    if (Number((rows as unknown as { n: number }[])[0]?.n) > 0) return;
    // InnoDB renews this table only where nobody has read it for 100 ms: asked faster, it never changes.
    await wait(150);
  }
}

const nameOf = async (id: string) =>
  (await test.db.select({ name: person.name }).from(person).where(eq(person.id, id)))[0]?.name;

describe('stopping', () => {
  it('takes no new request, finishes the one under way, answers it and keeps what it wrote', async () => {
    const running = await start();
    const slow = await slowChange(running);
    let isStopped = false;
    const stopping = running.stop().then(() => (isStopped = true));
    await untilRefused(running.port);
    expect(isStopped).toBe(false);
    await slow.release();
    const answer = (await slow.answer) as Response;
    expect(answer.status).toBe(200);
    expect(await answer.json()).toMatchObject({ name: 'Maria, finished' });
    const answeredAt = Date.now();
    await stopping;
    // The connection, which the client would have kept for another request, does not hold it up.
    expect(Date.now() - answeredAt).toBeLessThan(2_000);
    expect(await nameOf(slow.id)).toBe('Maria, finished');
  });

  it('waits for a body that is still on its way', async () => {
    const running = await start();
    const body = JSON.stringify({ ...MARIA, name: 'Slow Ilse' });
    const socket = connect(running.port, '127.0.0.1');
    let heard = '';
    socket.setEncoding('utf8').on('data', (chunk: string) => (heard += chunk));
    const closed = new Promise((resolve) => socket.once('close', resolve));
    const head = [
      'POST /api/people HTTP/1.1',
      `host: 127.0.0.1:${String(running.port)}`,
      `origin: ${running.url}`,
      `cookie: ${running.cookie}`,
      'content-type: application/json',
      `content-length: ${String(Buffer.byteLength(body))}`,
      'expect: 100-continue',
    ];
    socket.write(`${head.join('\r\n')}\r\n\r\n`);
    // The server says that it has begun with this request.
    while (!heard.includes('100 Continue')) await wait(10);
    socket.write(body.slice(0, 20));
    const stopping = running.stop();
    await untilRefused(running.port);
    socket.write(body.slice(20));
    await closed;
    expect(heard).toContain('HTTP/1.1 201 Created');
    await stopping;
    const rows = await test.db.select().from(person).where(eq(person.name, 'Slow Ilse'));
    expect(rows).toHaveLength(1);
  });

  it('cuts off what hangs longer than its patience, and ends', async () => {
    const running = await start(300);
    const slow = await slowChange(running);
    const began = Date.now();
    const stopping = running.stop();
    expect(await slow.answer).toBeInstanceOf(Error);
    await slow.release();
    await stopping;
    expect(Date.now() - began).toBeLessThan(5_000);
  });
});
