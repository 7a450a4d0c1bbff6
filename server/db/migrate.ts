import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { sql } from 'drizzle-orm';
import { drizzle } from 'drizzle-orm/mysql2';
import { migrate as runMigrations } from 'drizzle-orm/mysql2/migrator';
import type { Database } from './client.ts';

const LOCK_SECONDS = 60;

/**
 * Brings the tables up to date. Migrations neither take a lock nor roll back, so two processes that start
 * together would run them twice: the lock belongs to one connection, which therefore also runs them.
 */
export async function migrate(database: Database, folder: string = migrationsFolder()): Promise<void> {
  const connection = await database.pool.promise().getConnection();
  try {
    const db = drizzle({ client: connection });
    const [locked] = await db.execute(
      sql`SELECT GET_LOCK(CONCAT(DATABASE(), '.migrate'), ${LOCK_SECONDS}) AS granted`,
    );
    if (!isGranted(locked)) {
      throw new Error(
        `Another process has been migrating this database for ${String(LOCK_SECONDS)} seconds.`,
      );
    }
    try {
      await runMigrations(db, { migrationsFolder: folder });
    } finally {
      await db.execute(sql`SELECT RELEASE_LOCK(CONCAT(DATABASE(), '.migrate'))`);
    }
  } finally {
    connection.release();
  }
}

function isGranted(rows: unknown): boolean {
  return Array.isArray(rows) && (rows[0] as { granted?: unknown } | undefined)?.granted === 1;
}

/** How many migrations this version brings. */
export function countKnownMigrations(folder: string = migrationsFolder()): number {
  const journal = JSON.parse(readFileSync(join(folder, 'meta', '_journal.json'), 'utf8')) as {
    entries: unknown[];
  };
  return journal.entries.length;
}

/** The nearest `drizzle/` at or above this file: it lies at other depths in the sources and in the build. */
function migrationsFolder(): string {
  for (let folder = import.meta.dirname; folder !== dirname(folder); folder = dirname(folder)) {
    const candidate = join(folder, 'drizzle');
    if (existsSync(join(candidate, 'meta', '_journal.json'))) return candidate;
  }
  throw new Error('There is no folder of migrations: drizzle/meta/_journal.json was not found.');
}
