import { drizzle } from 'drizzle-orm/mysql2';
import type { MySqlDatabase } from 'drizzle-orm/mysql-core';
import type { MySql2PreparedQueryHKT, MySql2QueryResultHKT } from 'drizzle-orm/mysql2';
import { createPool, type Pool } from 'mysql2';

/** What a store works with: the database itself, or a transaction on it. */
export type Db = MySqlDatabase<MySql2QueryResultHKT, MySql2PreparedQueryHKT, Record<string, never>>;

export interface Database {
  db: Db;
  pool: Pool;
  poolUse: () => PoolUse;
  close: () => Promise<void>;
}

/** How many of the pool's connections work, rest and may be opened, and how many queries wait for one. */
export interface PoolUse {
  busy: number;
  idle: number;
  waiting: number;
  limit: number;
}

/** Connects to MariaDB. Every moment is UTC at both ends: the driver's and the session's. */
export function createDatabase(url: string, options: { connections?: number } = {}): Database {
  // No `charset` here: naming one makes the driver choose a collation of its own over the server's.
  const pool = createPool({
    uri: url,
    timezone: 'Z',
    connectionLimit: options.connections ?? 20,
    maxIdle: options.connections ?? 20,
    enableKeepAlive: true,
  });
  pool.on('connection', (connection) => {
    connection.query("SET time_zone = '+00:00'");
  });
  return {
    db: drizzle({ client: pool }),
    pool,
    poolUse: () => poolUse(pool),
    close: () => pool.promise().end(),
  };
}

/** The driver counts for itself and tells nobody: its own lists are read, in this one place. */
function poolUse(pool: Pool): PoolUse {
  const inner = pool as unknown as Record<string, { length?: number; connectionLimit?: number } | undefined>;
  const idle = inner['_freeConnections']?.length ?? 0;
  return {
    busy: (inner['_allConnections']?.length ?? 0) - idle,
    idle,
    waiting: inner['_connectionQueue']?.length ?? 0,
    limit: inner['config']?.connectionLimit ?? 0,
  };
}
