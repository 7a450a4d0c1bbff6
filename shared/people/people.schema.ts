import { z } from 'zod';
import { LENGTH_MAX_MM } from '../fit/fit.schema.ts';
import { pointIdSchema } from '../points/points.schema.ts';
import { LENGTH_UNITS } from '../units.ts';

const trimmed = (max: number) => z.string().trim().max(max);

/** What a person writes about somebody they sew for. Names up to 80 characters, notes up to 2,000. */
export const personInputSchema = z.object({
  name: trimmed(80).min(1, 'Write a name: it is how you will find this person.'),
  stage: z.enum(['adult', 'child']),
  chestWord: z.enum(['bust', 'chest']),
  unit: z.enum(LENGTH_UNITS),
  notes: trimmed(2000).default(''),
});
export type PersonInput = z.infer<typeof personInputSchema>;

/** A person as the server answers. `latestSetId` and `latestTakenOn` are null before the first measuring. */
export const personSchema = personInputSchema.extend({
  id: z.uuid(),
  createdAt: z.string(),
  updatedAt: z.string(),
  latestSetId: z.uuid().nullable(),
  latestTakenOn: z.iso.date().nullable(),
  setCount: z.number().int(),
});
export type Person = z.infer<typeof personSchema>;

/** One measured point: as typed, the unit it was understood in, and its length in mm. */
export const measurementSchema = z.object({
  typed: z.string().trim().min(1).max(40),
  unit: z.enum(LENGTH_UNITS),
  mm: z.number().positive().max(LENGTH_MAX_MM),
});
export type Measurement = z.infer<typeof measurementSchema>;

/** What is sent when a set is taken: the texts, with the unit assumed where none is written. The server reads them. */
export const measurementSetInputSchema = z.object({
  takenOn: z.iso.date('Give the day as year-month-day.'),
  takenBy: z.enum(['self', 'another']),
  unit: z.enum(LENGTH_UNITS),
  notes: trimmed(2000).default(''),
  startedFromId: z.uuid().nullable().default(null),
  typed: z.partialRecord(pointIdSchema, trimmed(40)),
});
export type MeasurementSetInput = z.infer<typeof measurementSetInputSchema>;

/** A dated, immutable set of measurements. */
export const measurementSetSchema = z.object({
  id: z.uuid(),
  personId: z.uuid(),
  takenOn: z.iso.date(),
  takenBy: z.enum(['self', 'another']),
  unit: z.enum(LENGTH_UNITS),
  notes: z.string(),
  startedFromId: z.uuid().nullable(),
  createdAt: z.string(),
  values: z.partialRecord(pointIdSchema, measurementSchema),
});
export type MeasurementSet = z.infer<typeof measurementSetSchema>;
