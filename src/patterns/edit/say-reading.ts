import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import { readCell } from '../../../shared/patterns/read-cell.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { printMeasured } from '../unit-words.ts';

/** How a cell is read, as it stands under it: a length or a range of them; null where it is not read (empty: blank). */
export function sayReading(
  text: string,
  unit: LengthUnit,
  role: TableRole,
  shownIn: LengthUnit,
): string | null {
  const read = readCell(text.trim(), unit, role);
  if (read.kind === 'blank') return '';
  return read.kind === 'length' ? `${printMeasured(read.mm, shownIn)} ${shownIn}` : null;
}
