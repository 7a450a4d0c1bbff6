import { setTimeout as wait } from 'node:timers/promises';
import { sql } from 'drizzle-orm';
import type { Db } from '../db/client.ts';

const PATIENCE_MS = 2000;

/** Whether the database answers within two seconds. */
export async function doesDatabaseAnswer(db: Db): Promise<boolean> {
  const given = new AbortController();
  const answered = db.execute(sql`SELECT 1`).then(
    () => true,
    () => false,
  );
  const late = wait(PATIENCE_MS, false, { signal: given.signal }).catch(() => false);
  const result = await Promise.race([answered, late]);
  given.abort();
  return result;
}
