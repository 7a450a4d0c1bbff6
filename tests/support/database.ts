import { sql } from 'drizzle-orm';
import { afterAll, inject } from 'vitest';
import { createDatabase, type Database } from '../../server/db/client.ts';
import { migrate } from '../../server/db/migrate.ts';

export interface TestDatabase extends Database {
  url: string;
}

/**
 * This worker's own database, migrated and empty: another file's rows are gone. Closed after the file's tests.
 * `name` gives a second database beside it.
 */
export async function testDatabase(name = ''): Promise<TestDatabase> {
  const url = await makeDatabase(`leeway_${process.env['VITEST_POOL_ID'] ?? '0'}${name ? `_${name}` : ''}`);
  const database = createDatabase(url, { connections: 8 });
  afterAll(() => database.close());
  await migrate(database);
  await emptyTables(database);
  return { ...database, url };
}

/** An empty database under a name of its own, not migrated; answers its address. */
export async function freshDatabase(name: string): Promise<string> {
  const server = createDatabase(inject('mariaDbUrl'), { connections: 1 });
  try {
    await server.db.execute(sql`DROP DATABASE IF EXISTS ${sql.identifier(name)}`);
  } finally {
    await server.close();
  }
  return makeDatabase(name);
}

async function makeDatabase(name: string): Promise<string> {
  const address = inject('mariaDbUrl');
  const server = createDatabase(address, { connections: 1 });
  try {
    await server.db.execute(sql`CREATE DATABASE IF NOT EXISTS ${sql.identifier(name)}`);
  } finally {
    await server.close();
  }
  const url = new URL(address);
  url.pathname = `/${name}`;
  return url.href;
}

async function emptyTables({ pool }: Database): Promise<void> {
  const connection = await pool.promise().getConnection();
  try {
    const [rows] = await connection.query(
      `SELECT table_name AS name FROM information_schema.tables
       WHERE table_schema = DATABASE() AND table_type = 'BASE TABLE' AND table_name <> '__drizzle_migrations'`,
    );
    await connection.query('SET FOREIGN_KEY_CHECKS = 0');
    // DELETE, since TRUNCATE makes each of them a new file.
    for (const { name } of rows as { name: string }[]) await connection.query('DELETE FROM ??', [name]);
    await connection.query('SET FOREIGN_KEY_CHECKS = 1');
  } finally {
    connection.release();
  }
}
