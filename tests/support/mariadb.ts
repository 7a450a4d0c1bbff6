import { mkdirSync, mkdtempSync, readdirSync, rmSync, statSync } from 'node:fs';
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
const MINUTE_MS = 60_000;

/** One private MariaDB for the whole run. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const server = await startThrowawayServer();
  project.provide('mariaDbUrl', server.url);
  return server.stop;
}

/** A server whose data are removed when it stops; what a killed run left behind is removed first. */
export async function startThrowawayServer(): Promise<{ url: string; stop: () => Promise<void> }> {
  mkdirSync(HOME, { recursive: true });
  for (const name of readdirSync(HOME).filter((entry) => entry.startsWith('mariadb-'))) {
    // One made a moment ago may belong to a run that is about to lock it.
    const isNew = Date.now() - statSync(join(HOME, name)).mtimeMs < MINUTE_MS;
    const lock = isNew ? null : await lockFolder(join(HOME, name), 'test');
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
