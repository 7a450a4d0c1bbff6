import { createConnection, type Connection, type RowDataPacket } from 'mysql2';
import { escape, escapeId } from 'mysql2';

const STATEMENT_BYTES = 1_000_000;
const LOCK_SECONDS = 60;

/** What a dump holds: the rows of each table, and the values of the column that was asked for. */
export interface Dumped {
  rows: Record<string, number>;
  serverVersion: string;
  values: Set<string>;
}

interface DumpOptions {
  /** A statement at a time, each on one line and with its semicolon. */
  write: (line: string) => Promise<void>;
  /** A column whose values the caller wants to know as they are in the dump. */
  column: { table: string; column: string };
}

/**
 * Writes every table as it is at one moment, while others go on working: a snapshot, as `--single-transaction` takes
 * one. The driver does it, so that it works on any machine that runs Leeway and on a database elsewhere; the statements
 * are plain SQL that any client can load.
 */
export async function dumpDatabase(url: string, { write, column }: DumpOptions): Promise<Dumped> {
  const connection = createConnection({ uri: url, supportBigNumbers: true });
  const ask = asker(connection);
  try {
    await ask("SET NAMES utf8mb4, time_zone = '+00:00'");
    // Nobody changes the tables' shape meanwhile.
    const [locked] = await ask(`SELECT GET_LOCK(CONCAT(DATABASE(), '.migrate'), ${LOCK_SECONDS}) AS granted`);
    if (locked?.['granted'] !== 1) throw new Error('Another process is migrating this database.');
    await ask('SET TRANSACTION ISOLATION LEVEL REPEATABLE READ');
    await ask('START TRANSACTION WITH CONSISTENT SNAPSHOT, READ ONLY');
    const [about] = await ask('SELECT VERSION() AS version');
    for (const line of HEADER) await write(`${line};`);
    const dumped: Dumped = { rows: {}, serverVersion: String(about?.['version']), values: new Set() };
    for (const table of await tableNames(ask)) {
      const wanted = column.table === table ? column.column : null;
      const onValue = (value: string) => dumped.values.add(value);
      dumped.rows[table] = await dumpTable(connection, { table, write, wanted, onValue });
    }
    return dumped;
  } finally {
    connection.destroy();
  }
}

/** Tables may come in any order, and values exactly as they are written. */
const HEADER = [
  'SET NAMES utf8mb4',
  "SET time_zone = '+00:00'",
  "SET sql_mode = 'NO_AUTO_VALUE_ON_ZERO'",
  'SET foreign_key_checks = 0',
  'SET unique_checks = 0',
];

export type Ask = (sql: string, values?: unknown[]) => Promise<RowDataPacket[]>;

/** Asks and answers rows as plain objects, on this one connection. */
export const asker =
  (connection: Connection): Ask =>
  async (sql, values) => {
    const [rows] = await connection.promise().query<RowDataPacket[]>(sql, values);
    return rows;
  };

/** The names of all tables, in order. */
export async function tableNames(ask: Ask): Promise<string[]> {
  const rows = await ask(
    `SELECT table_name AS name FROM information_schema.tables
     WHERE table_schema = DATABASE() AND table_type = 'BASE TABLE' ORDER BY table_name`,
  );
  return rows.map((row) => String(row['name']));
}

interface TableDump {
  table: string;
  write: DumpOptions['write'];
  wanted: string | null;
  onValue: (value: string) => void;
}

async function dumpTable(
  connection: Connection,
  { table, write, wanted, onValue }: TableDump,
): Promise<number> {
  const ask = asker(connection);
  const [made] = await ask('SHOW CREATE TABLE ??', [table]);
  await write(`${String(made?.['Create Table']).replaceAll('\n', ' ')};`);
  const columns = await readColumns(ask, table);
  const names = [...columns.keys()].map((name) => escapeId(name)).join(', ');
  const insert = `INSERT INTO ${escapeId(table)} (${names}) VALUES `;
  let rows = 0;
  let batch: string[] = [];
  let bytes = 0;
  const flush = async () => {
    if (batch.length > 0) await write(`${insert}${batch.join(',')};`);
    batch = [];
    bytes = 0;
  };
  for await (const literals of readRows(connection, `SELECT ${names} FROM ${escapeId(table)}`, columns)) {
    const row = `(${literals.join(',')})`;
    if (wanted !== null) onValue(unquoted(literals[[...columns.keys()].indexOf(wanted)] ?? ''));
    if (bytes + row.length > STATEMENT_BYTES) await flush();
    batch.push(row);
    bytes += row.length;
    rows += 1;
  }
  await flush();
  return rows;
}

type Kind = 'number' | 'bytes' | 'text';
const NUMBERS = /^(tinyint|smallint|mediumint|int|bigint|float|double|decimal|year)$/;
const BYTES = /^(binary|varbinary|tinyblob|blob|mediumblob|longblob|bit)$/;

/** What is stored of each column and how it is written; a generated column makes itself. */
async function readColumns(ask: Ask, table: string): Promise<Map<string, Kind>> {
  const rows = await ask(
    `SELECT column_name AS name, data_type AS type FROM information_schema.columns
     WHERE table_schema = DATABASE() AND table_name = ? AND extra NOT LIKE '%GENERATED%' ORDER BY ordinal_position`,
    [table],
  );
  return new Map(
    rows.map((row) => {
      const type = String(row['type']);
      return [String(row['name']), NUMBERS.test(type) ? 'number' : BYTES.test(type) ? 'bytes' : 'text'];
    }),
  );
}

/** Rows as SQL literals, from the server's own bytes: a number through JavaScript could come out as another. */
function readRows(connection: Connection, sql: string, columns: Map<string, Kind>): AsyncIterable<string[]> {
  const query = connection.query({
    sql,
    rowsAsArray: true,
    typeCast: (field) => {
      const raw = field.buffer();
      if (raw === null) return 'NULL';
      const kind = columns.get(field.name);
      if (kind === 'number') return raw.toString('latin1');
      if (kind === 'bytes') return raw.length === 0 ? "''" : `X'${raw.toString('hex')}'`;
      return escape(raw.toString('utf8'));
    },
  });
  return query.stream({ highWaterMark: 100 }) as AsyncIterable<string[]>;
}

const unquoted = (literal: string): string => literal.replace(/^'|'$/g, '');
