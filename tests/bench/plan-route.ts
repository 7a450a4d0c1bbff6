import { join } from 'node:path';
import autocannon from 'autocannon';
import { z } from 'zod';
import { spawnTied } from '../../server/bin/tied.mjs';
import { ROOT, temporaryFolder } from '../support/launcher.ts';
import { startThrowawayServer } from '../support/mariadb.ts';
import type { Figure } from './figure.ts';

const CONNECTIONS = 20;
/** Until the engine's code is compiled for good, however slow the machine. */
const WARM_REQUESTS = 4000;
const SECONDS = 4;
const ROUNDS = 5;

const readySchema = z.object({
  product: z.int(),
  bare: z.int(),
  cookie: z.string(),
  asked: z.looseObject({}),
  origin: z.string(),
});
type Ready = z.infer<typeof readySchema>;

/** The plan over HTTP, and in turns with it the bare route of the same process on the same database. */
export async function run(): Promise<Figure[]> {
  const database = await startThrowawayServer();
  const folder = temporaryFolder();
  const url = new URL(database.url);
  url.pathname = '/bench';
  const { child, ready } = await startServer(url.href, folder.path);
  try {
    const perSecond = { product: [] as number[], bare: [] as number[] };
    for (const which of ['product', 'bare'] as const) await load(ready, which, { amount: WARM_REQUESTS });
    for (let round = 0; round < ROUNDS; round += 1) {
      for (const which of ['product', 'bare'] as const) {
        perSecond[which].push(await load(ready, which, { duration: SECONDS }));
      }
    }
    const ratios = perSecond.product.map((value, round) => value / (perSecond.bare[round] ?? NaN));
    return [
      {
        name: `POST /api/fit, ${CONNECTIONS} connections, 20 sizes × 12 points (goal 0.7)`,
        value: Math.round(median(perSecond.product)),
        unit: 'requests/s',
        ratio: Math.round(median(ratios) * 100) / 100,
        reference: `a bare Express route with the same session look-up and statements, answering what they found: ${Math.round(median(perSecond.bare))} requests/s`,
      },
    ];
  } finally {
    child.kill('SIGTERM');
    await database.stop();
    folder.remove();
  }
}

async function startServer(databaseUrl: string, dataFolder: string) {
  await makeDatabase(databaseUrl);
  const script = join(ROOT, 'tests/bench/plan-route-server.ts');
  const child = spawnTied(process.execPath, ['--import', 'tsx', script], {
    cwd: ROOT,
    env: {
      PATH: process.env['PATH'],
      NODE_ENV: 'production',
      DATABASE_URL: databaseUrl,
      LEEWAY_DATA: dataFolder,
    },
    stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
  });
  const ready = await new Promise<Ready>((resolve, reject) => {
    child.once('message', (message) => resolve(readySchema.parse(message)));
    child.once('close', (code) => reject(new Error(`The server ended with ${String(code)}.`)));
  });
  return { child, ready };
}

async function makeDatabase(databaseUrl: string): Promise<void> {
  const { createDatabase } = await import('../../server/db/client.ts');
  const server = createDatabase(new URL('/', databaseUrl).href, { connections: 1 });
  await server.pool.promise().query('CREATE DATABASE bench');
  await server.close();
}

/** Requests answered a second; any that is refused or fails makes the figure worthless. */
async function load(
  ready: Ready,
  which: 'product' | 'bare',
  until: { amount: number } | { duration: number },
): Promise<number> {
  const result = await autocannon({
    url: `http://127.0.0.1:${ready[which]}/api/fit`,
    method: 'POST',
    headers: { 'content-type': 'application/json', cookie: ready.cookie, origin: ready.origin },
    body: JSON.stringify(ready.asked),
    connections: CONNECTIONS,
    ...until,
  });
  if (result.non2xx > 0 || result.errors > 0) {
    throw new Error(`${which}: ${result.non2xx} refused, ${result.errors} failed.`);
  }
  return result.requests.average;
}

function median(values: number[]): number {
  return [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? NaN;
}
