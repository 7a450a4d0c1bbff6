import { z } from 'zod';
import { pointIdSchema } from '../../../shared/points/points.schema.ts';
import { LENGTH_UNITS } from '../../../shared/units.ts';
import type { EditedTable } from './edited-table.ts';

/** An edit that is not saved yet, and the revision it began from (null: a pattern that is only being typed in). */
export interface KeptEdit {
  basedOn: string | null;
  table: EditedTable;
}

const lines = z.array(
  z.object({
    point: pointIdSchema.nullable(),
    unit: z.enum(LENGTH_UNITS),
    typed: z.array(z.string()),
  }),
);
const keptSchema = z.object({
  basedOn: z.uuid().nullable(),
  table: z.object({
    sizes: z.array(z.object({ name: z.string(), was: z.string().nullable() })),
    chart: lines,
    finished: lines,
  }),
});

const keyOf = (name: string) => `leeway table ${name}`;

/** What was typed and not saved, kept in this tab: a reload, a lost connection or a refusal costs nothing. */
export function keepEdit(name: string, edit: KeptEdit): void {
  try {
    sessionStorage.setItem(keyOf(name), JSON.stringify(edit));
  } catch {
    // Full or forbidden: the page itself is then all there is, and it asks before it is left.
  }
}

/** What was kept; null where nothing was, or what lies there is no edit. */
export function readKeptEdit(name: string): KeptEdit | null {
  try {
    return keptSchema.safeParse(JSON.parse(sessionStorage.getItem(keyOf(name)) ?? 'null')).data ?? null;
  } catch {
    return null;
  }
}

export function forgetEdit(name: string): void {
  try {
    sessionStorage.removeItem(keyOf(name));
  } catch {
    // Nothing was kept.
  }
}
