import type { ChildProcess } from 'node:child_process';
import { chmodSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, statSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { z } from 'zod';
import { spawnTied } from '../../server/bin/tied.mjs';

export const ROOT = join(import.meta.dirname, '../..');
const READY_MS = 60_000;
const GONE_MS = 20_000;
const HOUR_MS = 3_600_000;

const signInsSchema = z.array(
  z.object({ name: z.string(), email: z.email(), password: z.string(), role: z.string() }),
);
export type DemoSignIn = z.infer<typeof signInsSchema>[number];

export interface Launched {
  child: ChildProcess;
  url: string;
  /** All that it has printed so far. */
  output: () => string;
  /** Its exit code, once it has ended. */
  ended: Promise<number | null>;
  signIns: () => DemoSignIn[];
  stop: () => Promise<void>;
}

interface LaunchOptions {
  dataFolder: string;
  port?: number;
  environment?: Record<string, string>;
  /** As a person would start it; otherwise the launcher alone. */
  isThroughNpm?: boolean;
  /** As it is started while it is being written, through npm or not. */
  isDevelopment?: boolean;
}

/** Starts the product and answers at once; `untilReady` waits for it. */
export async function launch(options: LaunchOptions): Promise<Launched> {
  const port = options.port ?? (await freePort());
  const [command, args] = options.isThroughNpm
    ? ['npm', options.isDevelopment ? ['run', 'dev'] : ['start']]
    : [process.execPath, ['server/bin/start.mjs', ...(options.isDevelopment ? ['--dev'] : [])]];
  const child = spawnTied(command, args, {
    cwd: ROOT,
    env: {
      PATH: process.env['PATH'],
      HOME: process.env['HOME'],
      PORT: String(port),
      LEEWAY_DATA: options.dataFolder,
      ...options.environment,
    },
  });
  let output = '';
  child.stdout?.on('data', (chunk: Buffer) => (output += chunk.toString()));
  child.stderr?.on('data', (chunk: Buffer) => (output += chunk.toString()));
  const ended = new Promise<number | null>((resolve) => {
    child.once('close', resolve);
  });
  return {
    child,
    url: `http://127.0.0.1:${String(port)}`,
    output: () => output,
    ended,
    signIns: () =>
      signInsSchema.parse(JSON.parse(readFileSync(join(options.dataFolder, 'demo-sign-ins.json'), 'utf8'))),
    async stop() {
      child.kill('SIGTERM');
      await ended;
    },
  };
}

/** Waits until it has printed its address; throws with what it printed where it ended before. */
export async function untilReady(launched: Launched): Promise<Launched> {
  const end = Date.now() + READY_MS;
  while (!launched.output().includes('Leeway is at')) {
    if (launched.child.exitCode !== null || Date.now() > end) throw new Error(launched.output());
    await wait(20);
  }
  return launched;
}

/** A data folder of its own, ignored by git. What runs that were killed left behind an hour ago is removed. */
export function temporaryFolder(): { path: string; remove: () => void } {
  const home = join(ROOT, '.test');
  mkdirSync(home, { recursive: true });
  for (const name of readdirSync(home).filter((entry) => entry.startsWith('data-'))) {
    const path = join(home, name);
    if (Date.now() - statSync(path).mtimeMs > HOUR_MS) rmSync(path, { recursive: true, force: true });
  }
  const path = mkdtempSync(join(home, 'data-'));
  // As a person's own would be: the database's user passes through.
  chmodSync(path, 0o711);
  return { path, remove: () => rmSync(path, { recursive: true, force: true }) };
}

/** The process and everything below it, now. */
export function processTree(pid: number): number[] {
  const parents = new Map(allProcesses().map((process) => [process.pid, process.parent]));
  const below = (parent: number): number[] =>
    [...parents].filter(([, at]) => at === parent).flatMap(([child]) => [child, ...below(child)]);
  return [pid, ...below(pid)];
}

/** Waits until none of the processes runs any more and answers those that still do. */
export async function untilGone(pids: number[]): Promise<number[]> {
  const end = Date.now() + GONE_MS;
  for (;;) {
    const running = allProcesses().flatMap(({ pid }) => (pids.includes(pid) ? [pid] : []));
    if (running.length === 0 || Date.now() > end) return running;
    await wait(20);
  }
}

/** Ended ones that nobody has asked about yet (zombies) do not count. */
function allProcesses(): { pid: number; parent: number }[] {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .flatMap((name) => {
      try {
        const [state, parent] = readFileSync(`/proc/${name}/stat`, 'utf8').split(') ')[1]?.split(' ') ?? [];
        return state === 'Z' ? [] : [{ pid: Number(name), parent: Number(parent) }];
      } catch {
        return [];
      }
    });
}

export function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer().once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() => resolve(typeof address === 'object' && address ? address.port : 0));
    });
  });
}
