import { sql } from 'drizzle-orm';
import { z } from 'zod';
import type { AdminHealth } from '../../shared/admin/health.schema.ts';
import type { Db } from '../db/client.ts';
import { countKnownMigrations } from '../db/migrate.ts';
import { listMail } from '../mail/outbox.store.ts';

const rowSchema = z.object({ version: z.string(), applied: z.coerce.number() });

/** The server's version, and how many of the migrations that this version of Leeway knows it has. */
export async function databaseHealth(db: Db): Promise<AdminHealth['database']> {
  const [rows] = await db.execute(
    sql`SELECT VERSION() AS version, (SELECT COUNT(*) FROM __drizzle_migrations) AS applied`,
  );
  const [row] = z.tuple([rowSchema]).parse(rows);
  return { version: row.version, migrationsApplied: row.applied, migrationsKnown: countKnownMigrations() };
}

/** How much mail has yet to go out, and how much was given up. */
export async function mailHealth(db: Db): Promise<AdminHealth['mail']> {
  const one = { page: 1, pageSize: 1 };
  const waiting = await listMail(db, 'waiting', one);
  const sending = await listMail(db, 'sending', one);
  const failed = await listMail(db, 'failed', one);
  return { waiting: waiting.total + sending.total, failed: failed.total };
}
