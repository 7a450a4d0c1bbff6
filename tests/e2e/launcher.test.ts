import { existsSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, afterEach, describe, expect, it } from 'vitest';
import { freshDatabase } from '../support/database.ts';
import {
  freePort,
  launch,
  processTree,
  temporaryFolder,
  untilGone,
  untilReady,
  type Launched,
} from '../support/launcher.ts';

const folder = temporaryFolder();
const dataFolder = folder.path;
let running: Launched[] = [];

async function start(options: Partial<Parameters<typeof launch>[0]> = {}): Promise<Launched> {
  const launched = await launch({ dataFolder, isThroughNpm: true, ...options });
  running.push(launched);
  return launched;
}

const startReady = async (options?: Parameters<typeof start>[0]) => untilReady(await start(options));

const health = async ({ url }: Launched): Promise<unknown> => (await fetch(`${url}/api/health`)).json();

/** The names of what runs below, such as `node` and `mariadbd`. */
const namesOf = (pids: number[]) =>
  pids.map((pid) => readFileSync(`/proc/${String(pid)}/comm`, 'utf8').trim());

afterEach(async () => {
  await Promise.all(running.map((launched) => launched.stop()));
  running = [];
});
afterAll(folder.remove);

describe('npm start', () => {
  it('prints its address and answers there with its version and its database', async () => {
    const launched = await startReady();
    expect(launched.output()).toContain(`Leeway is at ${launched.url}`);
    const { version } = JSON.parse(readFileSync('package.json', 'utf8')) as { version: string };
    expect(await health(launched)).toEqual({ status: 'ok', version, database: 'answers' });
    const page = await fetch(launched.url);
    expect(page.status).toBe(200);
    expect(await page.text()).toContain('<div id="root">');
  });

  it('prints the demo sign-ins, the same at every start, and they sign in', async () => {
    const launched = await startReady();
    const signIns = launched.signIns();
    expect(signIns.length).toBeGreaterThan(0);
    for (const { email, password } of signIns) {
      expect(launched.output()).toContain(email);
      expect(launched.output()).toContain(password);
      const response = await fetch(`${launched.url}/api/auth/sign-in/email`, {
        method: 'POST',
        headers: { 'content-type': 'application/json', origin: launched.url },
        body: JSON.stringify({ email, password }),
      });
      expect(response.status).toBe(200);
    }
  });

  it('keeps the secret, the passwords and the data from other users', async () => {
    await startReady();
    const modeOf = (name: string) => (statSync(join(dataFolder, name)).mode & 0o777).toString(8);
    for (const name of [
      'secret',
      'demo-sign-ins.json',
      'database-password',
      'database.cnf',
      'database.log',
    ]) {
      expect([name, modeOf(name)]).toEqual([name, '600']);
    }
    expect(modeOf('database')).toBe('700');
    expect(modeOf('database.tmp')).toBe('700');
  });

  it('refuses a second instance on the same data at once, in one sentence', async () => {
    const first = await startReady();
    const began = Date.now();
    const second = await start();
    expect(await second.ended).toBe(1);
    expect(Date.now() - began).toBeLessThan(3_000);
    expect(second.output()).toContain(`Leeway is already running on the data in ${dataFolder}`);
    expect(await health(first)).toMatchObject({ status: 'ok' });
  });

  it('says that a port is taken', async () => {
    const first = await startReady();
    const other = temporaryFolder();
    const second = await start({ dataFolder: other.path, port: Number(new URL(first.url).port) });
    expect(await second.ended).toBe(1);
    expect(second.output()).toContain(`PORT ${new URL(first.url).port} is taken`);
    other.remove();
  });

  it('names the variable that cannot be used, and starts nothing', async () => {
    const launched = await start({ environment: { MAIL_FROM: 'nobody' } });
    expect(await launched.ended).toBe(1);
    expect(launched.output()).toContain('MAIL_FROM must be an address');
    expect(launched.output()).not.toContain('    at ');
  });

  it('makes no demo accounts where other machines can reach it', async () => {
    const other = temporaryFolder();
    const launched = await startReady({ dataFolder: other.path, environment: { HOST: '0.0.0.0' } });
    expect(launched.output()).not.toContain('demo');
    expect(() => launched.signIns()).toThrow('ENOENT');
    await launched.stop();
    other.remove();
  });
});

describe('npm start with DATABASE_URL', () => {
  it('starts no server of its own and makes no demo accounts', async () => {
    const other = temporaryFolder();
    const url = await freshDatabase('leeway_given');
    const launched = await startReady({ dataFolder: other.path, environment: { DATABASE_URL: url } });
    expect(await health(launched)).toMatchObject({ database: 'answers' });
    expect(namesOf(processTree(launched.child.pid ?? 0))).not.toContain('mariadbd');
    expect(existsSync(join(other.path, 'database'))).toBe(false);
    expect(existsSync(join(other.path, 'demo-sign-ins.json'))).toBe(false);
    await launched.stop();
    other.remove();
  });
});

describe('ending it', () => {
  let tree: number[] = [];
  let launched: Launched;

  async function startWhole() {
    launched = await startReady({ port: await freePort() });
    tree = processTree(launched.child.pid ?? 0);
    expect(namesOf(tree)).toContain('mariadbd');
  }

  const find = (name: RegExp) => {
    const found = tree.find((pid) => name.test(readFileSync(`/proc/${String(pid)}/cmdline`, 'utf8')));
    if (found === undefined) throw new Error(`no process like ${String(name)}`);
    return found;
  };

  /** The data are whole when a new start on them answers and the sign-ins still sign in. */
  async function expectWhole() {
    expect(await untilGone(tree)).toEqual([]);
    const again = await startReady();
    expect(await health(again)).toMatchObject({ database: 'answers' });
  }

  it.each(['SIGINT', 'SIGTERM', 'SIGHUP', 'SIGKILL'] as const)(
    '%s to npm leaves no process',
    async (signal) => {
      await startWhole();
      process.kill(launched.child.pid ?? 0, signal);
      await expectWhole();
    },
  );

  it.each(['SIGINT', 'SIGTERM', 'SIGKILL'] as const)(
    '%s to the launcher leaves no process',
    async (signal) => {
      await startWhole();
      process.kill(find(/server\/bin\/start\.mjs/), signal);
      await expectWhole();
    },
  );

  it('Ctrl-C, which reaches npm and the launcher both, ends cleanly', async () => {
    await startWhole();
    process.kill(-(launched.child.pid ?? 0), 'SIGINT');
    await expectWhole();
    expect(launched.output()).not.toContain('Error');
  });

  it('the death of the database ends the rest and says so', async () => {
    await startWhole();
    process.kill(find(/mariadbd/), 'SIGKILL');
    expect(await launched.ended).toBe(1);
    expect(launched.output()).toContain('The database ended unexpectedly');
    await expectWhole();
  });

  it('SIGKILL while it is still starting leaves no process', async () => {
    launched = await start({ port: await freePort() });
    const seen = new Set<number>();
    for (
      const end = Date.now() + 10_000;
      Date.now() < end;
      await new Promise((next) => setTimeout(next, 5))
    ) {
      tree = processTree(launched.child.pid ?? 0);
      tree.forEach((pid) => seen.add(pid));
      if (namesOfLiving(tree).includes('mariadbd')) break;
    }
    process.kill(launched.child.pid ?? 0, 'SIGKILL');
    tree = [...seen];
    await expectWhole();
  });

  function namesOfLiving(pids: number[]): string[] {
    return pids.flatMap((pid) => {
      try {
        return namesOf([pid]);
      } catch {
        return [];
      }
    });
  }
});
