import {
  importTableSchema,
  type ImportCorrections,
  type ImportTable,
  type TableRole,
} from '../../../../../shared/patterns/imports.schema.ts';
import { readTable } from '../../../../../server/patterns/reading/read-table.ts';

const NONE: ImportCorrections = { unit: null, points: {} };

/** Reads a table as an upload would be read; the answer goes through its schema, as every answer does. */
export function read(
  bytes: Uint8Array | string,
  role: TableRole = 'chart',
  corrections: Partial<ImportCorrections> = {},
) {
  const data = typeof bytes === 'string' ? new TextEncoder().encode(bytes) : bytes;
  const file = { id: '0190a0a0-0000-7000-8000-000000000000', name: 'table.csv', bytes: data.length };
  return importTableSchema.parse(readTable(data, file, role, { ...NONE, ...corrections }));
}

/** Where and what, without the words. */
export function places(table: ImportTable, severity?: 'error' | 'caution') {
  return table.issues
    .filter((issue) => severity === undefined || issue.severity === severity)
    .map((issue) => `${issue.code} ${String(issue.row)}:${String(issue.column)}`);
}
