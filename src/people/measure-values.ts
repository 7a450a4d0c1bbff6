import type { FieldErrors, Resolver } from 'react-hook-form';
import {
  measurementSetInputSchema,
  type MeasurementSet,
  type MeasurementSetInput,
  type Person,
} from '../../shared/people/people.schema.ts';
import { readMeasurements } from '../../shared/people/read-measurements.ts';
import { POINT_IDS, type PointId } from '../../shared/points/point-ids.ts';
import { textForForm } from './print-measurement.ts';

/** What the measuring form holds: every point has its text, empty where it was not taken. */
export type MeasureValues = Omit<MeasurementSetInput, 'typed'> & { typed: Record<PointId, string> };

export const NOTHING_TYPED = Object.fromEntries(POINT_IDS.map((point) => [point, ''])) as Record<
  PointId,
  string
>;

/** The form as it begins: from the last set as it was typed then, or empty. */
export function startValues(person: Person, last: MeasurementSet | null, today: string): MeasureValues {
  const unit = last?.unit ?? person.unit;
  const typed = { ...NOTHING_TYPED };
  for (const point of POINT_IDS) {
    const before = last?.values[point];
    if (before) typed[point] = textForForm(before, unit);
  }
  return {
    takenOn: today,
    takenBy: last?.takenBy ?? 'self',
    unit,
    notes: '',
    startedFromId: last?.id ?? null,
    typed,
  };
}

/** What is sent: empty texts are points that were not taken. */
export function toInput(values: MeasureValues): MeasurementSetInput {
  const typed: MeasurementSetInput['typed'] = {};
  for (const point of POINT_IDS) {
    const text = values.typed[point].trim();
    if (text !== '') typed[point] = text;
  }
  return { ...values, typed };
}

/** Checks with the server's own rules: each length in words at its field, then the rest of the schema. */
export const measureResolver: Resolver<MeasureValues> = (values) => {
  const input = toInput(values);
  const errors: FieldErrors<MeasureValues> = {};
  const wrong = readMeasurements(input.typed, values.unit).errors;
  if (wrong.length > 0) {
    errors.typed = Object.fromEntries(
      wrong.map(({ point, words }) => [point, { type: 'length', message: words }]),
    );
  }
  const rest = measurementSetInputSchema.omit({ typed: true }).safeParse(input);
  for (const issue of rest.error?.issues ?? []) {
    const error = { type: 'schema', message: issue.message };
    if (issue.path[0] === 'takenOn') errors.takenOn ??= error;
    if (issue.path[0] === 'notes') errors.notes ??= error;
  }
  if (Object.keys(input.typed).length === 0) {
    const nothing = { type: 'empty', message: 'Write at least one measurement.' };
    errors.root = nothing;
  }
  return Object.keys(errors).length === 0 ? { values, errors: {} } : { values: {}, errors };
};
