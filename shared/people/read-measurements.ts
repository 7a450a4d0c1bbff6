import { LENGTH_MAX_MM } from '../fit/fit.schema.ts';
import { isGarmentPoint, pointName } from '../points/catalogue.ts';
import { POINT_IDS, type PointId } from '../points/point-ids.ts';
import { parseLength, printLengthWithUnit, type LengthUnit } from '../units.ts';
import type { Measurement, MeasurementSet } from './people.schema.ts';

/** The shortest length, in mm, that a person's measurement may have: below it a slip of the pen, not a body. */
export const MEASUREMENT_MIN_MM = 5;

/** One text that is no measurement: its point and a sentence that says what would be right. */
export interface MeasurementError {
  point: PointId;
  words: string;
}

/**
 * Reads one typed measurement in mm; `unit` is assumed where none is written. Empty text answers null, bad or
 * absurd text (under 5 mm, over 4 m) and a point that only a garment has answer a sentence. Never throws.
 */
export function readMeasurement(point: PointId, text: string, unit: LengthUnit): Measurement | string | null {
  const typed = text.trim();
  if (typed === '') return null;
  if (isGarmentPoint(point)) {
    return `Leave this empty: ${pointName(point).toLowerCase()} is measured on a garment, not on a person.`;
  }
  const length = parseLength(typed, unit);
  if (!length.ok) return length.words;
  if (length.mm < MEASUREMENT_MIN_MM) {
    return `Write at least ${printLengthWithUnit(MEASUREMENT_MIN_MM, length.unit)}, or leave this empty if it was not measured.`;
  }
  if (length.mm > LENGTH_MAX_MM) {
    return `Write at most ${printLengthWithUnit(LENGTH_MAX_MM, length.unit)}: is it perhaps in another unit?`;
  }
  return { typed, unit: length.unit, mm: length.mm };
}

/**
 * Reads all typed measurements of a set, in the catalogue's order: values in mm beside their texts, and every
 * text that is none with its sentence. Empty texts are left out; nothing typed answers nothing.
 */
export function readMeasurements(
  typed: Partial<Record<PointId, string>>,
  unit: LengthUnit,
): { values: MeasurementSet['values']; errors: MeasurementError[] } {
  const values: MeasurementSet['values'] = {};
  const errors: MeasurementError[] = [];
  for (const point of POINT_IDS) {
    const read = readMeasurement(point, typed[point] ?? '', unit);
    if (typeof read === 'string') errors.push({ point, words: read });
    else if (read !== null) values[point] = read;
  }
  return { values, errors };
}
