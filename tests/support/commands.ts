import { spawnTied } from '../../server/bin/tied.mjs';
import { createDatabase } from '../../server/db/client.ts';
import { ROOT } from './launcher.ts';

/** Runs one of the commands beside `npm start` to its end, as npm would; answers its exit code and what it said. */
export function command(
  name: 'admin' | 'backup' | 'restore',
  args: string[],
  environment: Record<string, string>,
): Promise<{ code: number | null; output: string }> {
  const child = spawnTied('npm', ['run', '--silent', name, '--', ...args], {
    cwd: ROOT,
    env: { PATH: process.env['PATH'], HOME: process.env['HOME'], ...environment },
  });
  let output = '';
  child.stdout?.on('data', (chunk: Buffer) => (output += chunk.toString()));
  child.stderr?.on('data', (chunk: Buffer) => (output += chunk.toString()));
  return new Promise((resolve) => {
    child.once('close', (code) => resolve({ code, output }));
  });
}

/** Every row of every table, as the server writes its values, and how each table was made. */
export async function everything(url: string): Promise<Record<string, { made: string; rows: string[] }>> {
  const { pool, close } = createDatabase(url, { connections: 1 });
  const ask = async (sql: string) => {
    const query = {
      sql,
      rowsAsArray: true,
      typeCast: (field: { string: () => string | null }) => field.string(),
    };
    const [rows] = await pool.promise().query(query);
    return rows as unknown as (string | null)[][];
  };
  try {
    const all: Record<string, { made: string; rows: string[] }> = {};
    for (const [table] of await ask('SHOW TABLES')) {
      const name = `\`${String(table)}\``;
      const [made] = await ask(`SHOW CREATE TABLE ${name}`);
      const rows = await ask(`SELECT * FROM ${name}`);
      all[String(table)] = { made: String(made?.[1]), rows: rows.map((row) => JSON.stringify(row)).sort() };
    }
    return all;
  } finally {
    await close();
  }
}
