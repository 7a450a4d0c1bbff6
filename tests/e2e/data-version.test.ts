import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startDatabase } from '../../server/bin/database.mjs';
import { everything } from '../support/commands.ts';
import { launch, temporaryFolder, untilReady, type Launched } from '../support/launcher.ts';

const folder = temporaryFolder();
afterAll(folder.remove);
const stamp = join(folder.path, 'database-version');
const version = () => readFileSync(stamp, 'utf8').trim();
const running: Launched[] = [];
afterAll(() => Promise.all(running.map((launched) => launched.stop())));

async function start() {
  const launched = await launch({ dataFolder: folder.path });
  running.push(launched);
  return launched;
}

/** Starts it once and stops it, and answers what it said. */
async function startOnce(): Promise<string> {
  const launched = await untilReady(await start());
  const health = (await (await fetch(`${launched.url}/api/health`)).json()) as { database: string };
  expect(health.database).toBe('answers');
  await launched.stop();
  return launched.output();
}

/** A table of the server’s own that only its upgrade makes again. */
const system = join(folder.path, 'database/mysql');
const helpFiles = () => readdirSync(system).filter((name) => name.startsWith('help_topic.'));
const dropHelp = () => {
  for (const name of helpFiles()) rmSync(join(system, name));
};

async function read() {
  const server = await startDatabase(folder.path);
  try {
    return await everything(server.url);
  } finally {
    await server.stop();
  }
}

describe('data last used by another MariaDB', () => {
  let here: string;
  let before: Awaited<ReturnType<typeof everything>>;
  beforeAll(async () => {
    expect(await startOnce()).not.toContain('bringing them up');
    here = version();
    before = await read();
    expect(before['person']?.rows.length).toBeGreaterThan(0);
  });

  it('are stamped with the version of the server that made them', () => {
    expect(here).toMatch(/^\d+\.\d+\.\d+$/);
  });

  it.each([
    ['an older version', '10.6.3'],
    ['no version, as before there was a stamp', null],
  ])('are upgraded where the stamp says %s, with nothing of ours changed', async (_case, older) => {
    dropHelp();
    if (older === null) rmSync(stamp);
    else writeFileSync(stamp, `${older}\n`);
    const said = await startOnce();
    expect(said).toContain(`bringing them up to MariaDB ${here}`);
    if (older !== null) expect(said).toContain(`were last used by MariaDB ${older}`);
    expect(helpFiles().length).toBeGreaterThan(0);
    expect(version()).toBe(here);
    expect(await read()).toEqual(before);
  });

  it('are left alone where the version is the same, or an older one of the same series uses them', async () => {
    const [major, minor] = here.split('.');
    for (const same of [here, `${String(major)}.${String(minor)}.999`]) {
      writeFileSync(stamp, `${same}\n`);
      dropHelp();
      expect(await startOnce()).not.toContain('bringing them up');
      expect(helpFiles()).toEqual([]);
      expect(version()).toBe(same);
    }
    writeFileSync(stamp, `${here}\n`);
  });

  it('are not touched where a newer series used them: a sentence says what to do', async () => {
    writeFileSync(stamp, '99.1.4\n');
    const launched = await start();
    expect(await launched.ended).toBe(1);
    expect(launched.output()).toContain('were last used by MariaDB 99.1.4');
    expect(launched.output()).toContain('install MariaDB 99.1 or newer');
    expect(launched.output()).not.toContain('    at ');
    expect(existsSync(join(folder.path, 'database.cnf'))).toBe(false);
    expect(version()).toBe('99.1.4');
    writeFileSync(stamp, `${here}\n`);
    expect(await read()).toEqual(before);
  });
});
