import type { Measurement } from '../../shared/people/people.schema.ts';
import { parseLength, printLength, printLengthWithUnit, type LengthUnit } from '../../shared/units.ts';

/** A measurement as read: in the unit it was typed in. */
export const printMeasurement = ({ mm, unit }: Measurement): string => printLengthWithUnit(mm, unit);

/** What was typed, where that reads otherwise than the value beside it; null where it would only repeat it. */
export function typedOtherwise({ typed, mm, unit }: Measurement): string | null {
  const plain = printLength(mm, unit);
  const numbers = [plain, plain.replace(/\.0$/, '')];
  const written = numbers.flatMap((number) => [number, `${number} ${unit}`, `${number}${unit}`]);
  return written.includes(typed) ? null : typed;
}

/** The text to begin a field with: as typed, and with its unit written out where the form assumes another. */
export function textForForm({ typed, unit }: Measurement, assumed: LengthUnit): string {
  const read = parseLength(typed, assumed);
  return read.ok && read.unit !== unit ? `${typed} ${unit}` : typed;
}
