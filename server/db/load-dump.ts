import { createConnection } from 'mysql2';
import { asker, tableNames } from './dump.ts';

/** Whether there is no table in the database yet. */
export async function isEmptyDatabase(url: string): Promise<boolean> {
  const connection = createConnection(url);
  try {
    return (await tableNames(asker(connection))).length === 0;
  } finally {
    connection.destroy();
  }
}

/** Runs a dump's statements, one a line, and answers how many rows each table then has. */
export async function loadDump(url: string, dump: AsyncIterable<Buffer>): Promise<Record<string, number>> {
  const connection = createConnection(url);
  const ask = asker(connection);
  try {
    for await (const line of linesOf(dump)) if (line !== '') await ask(line);
    const rows: Record<string, number> = {};
    for (const table of await tableNames(ask)) {
      const [counted] = await ask('SELECT COUNT(*) AS n FROM ??', [table]);
      rows[table] = Number(counted?.['n']);
    }
    return rows;
  } finally {
    connection.destroy();
  }
}

/** Split at line feeds only: to the language's own reader of lines there are other ends of line, which a name may hold. */
async function* linesOf(dump: AsyncIterable<Buffer>): AsyncGenerator<string> {
  let rest: Buffer[] = [];
  for await (const chunk of dump) {
    let from = 0;
    for (let at = chunk.indexOf(10); at >= 0; at = chunk.indexOf(10, from)) {
      yield Buffer.concat([...rest, chunk.subarray(from, at)]).toString('utf8');
      rest = [];
      from = at + 1;
    }
    rest.push(chunk.subarray(from));
  }
  yield Buffer.concat(rest).toString('utf8');
}
