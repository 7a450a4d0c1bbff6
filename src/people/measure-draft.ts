import { z } from 'zod';
import { measurementSetInputSchema } from '../../shared/people/people.schema.ts';
import { NOTHING_TYPED, type MeasureValues } from './measure-values.ts';

/**
 * What was typed and not saved, kept in this tab only: measurements are private, and a tab that is closed takes
 * them along.
 */
const keyOf = (personId: string) => `leeway.measuring.${personId}`;

// Half-written fields belong in a draft: whatever the texts are, they come back.
const draftSchema = measurementSetInputSchema.extend({ takenOn: z.string(), notes: z.string() });

export function readDraft(personId: string): MeasureValues | null {
  try {
    const read = draftSchema.safeParse(JSON.parse(sessionStorage.getItem(keyOf(personId)) ?? 'null'));
    return read.success ? { ...read.data, typed: { ...NOTHING_TYPED, ...read.data.typed } } : null;
  } catch {
    return null;
  }
}

export function keepDraft(personId: string, values: MeasureValues): void {
  try {
    sessionStorage.setItem(keyOf(personId), JSON.stringify(values));
  } catch {
    // Storage may be full or switched off: then the form itself is all there is.
  }
}

export function dropDraft(personId: string): void {
  sessionStorage.removeItem(keyOf(personId));
}
