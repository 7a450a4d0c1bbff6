import type { TableRole } from '../../shared/patterns/imports.schema.ts';

/** The two tables as they stand in a sentence. */
export const TABLE_NAMES: Record<TableRole, string> = {
  chart: 'the size chart',
  finished: 'the finished measurements',
};
