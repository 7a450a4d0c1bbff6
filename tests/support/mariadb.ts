import { mkdirSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { startDatabase } from '../../server/bin/database.mjs';
import { lockFolder } from '../../server/bin/lock.mjs';

declare module 'vitest' {
  interface ProvidedContext {
    /** The address of the run's own MariaDB, without a database's name. */
    mariaDbUrl: string;
  }
}

const HOME = join(import.meta.dirname, '../../.test');

/** One private MariaDB for the whole run, or the one that `npm test` has started for all its steps. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const given = process.env['LEEWAY_TEST_SERVER'];
  if (given !== undefined) {
    project.provide('mariaDbUrl', given);
    return () => Promise.resolve();
  }
  const server = await startThrowawayServer();
  project.provide('mariaDbUrl', server.url);
  return server.stop;
}

/** A server whose data are removed when it stops; what a killed run left behind is removed first. */
export async function startThrowawayServer(): Promise<{ url: string; stop: () => Promise<void> }> {
  mkdirSync(HOME, { recursive: true });
  for (const name of readdirSync(HOME).filter((entry) => entry.startsWith('mariadb-'))) {
    const lock = await lockFolder(join(HOME, name), 'test');
    if (lock === null) continue;
    rmSync(join(HOME, name), { recursive: true, force: true });
    await lock.release();
  }
  const folder = mkdtempSync(join(HOME, 'mariadb-'));
  const lock = await lockFolder(folder, 'test');
  const server = await startDatabase(folder, { isThrowaway: true });
  return {
    url: server.url,
    async stop() {
      await server.stop();
      rmSync(folder, { recursive: true, force: true });
      await lock?.release();
    },
  };
}
