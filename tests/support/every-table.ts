import { sql } from 'drizzle-orm';
import type { Db } from '../../server/db/client.ts';

/** The tables in which any of the texts stands, in any column, with how many rows name it. Looks into every table there is. */
export async function tablesNaming(db: Db, texts: readonly string[]): Promise<Record<string, number>> {
  const [columns] = (await db.execute(
    sql`SELECT table_name AS tableName, column_name AS columnName FROM information_schema.columns
        WHERE table_schema = DATABASE() ORDER BY table_name`,
  )) as unknown as [{ tableName: string; columnName: string }[]];
  const found: Record<string, number> = {};
  for (const table of new Set(columns.map(({ tableName }) => tableName))) {
    const own = columns.filter(({ tableName }) => tableName === table).map(({ columnName }) => columnName);
    const row = sql.join(
      own.map((name) => sql`COALESCE(CONVERT(${sql.identifier(name)} USING utf8mb4), '')`),
      sql`, `,
    );
    const anyText = sql.join(
      texts.map((text) => sql`LOCATE(${text}, CONCAT_WS('|', ${row})) > 0`),
      sql` OR `,
    );
    const [[counted]] = (await db.execute(
      sql`SELECT COUNT(*) AS n FROM ${sql.identifier(table)} WHERE ${anyText}`,
    )) as unknown as [[{ n: number }]];
    if (counted.n > 0) found[table] = counted.n;
  }
  return found;
}
