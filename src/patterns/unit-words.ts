import type { Measured } from '../../shared/fit/fit.schema.ts';
import { printLength, type LengthUnit } from '../../shared/units.ts';

export const UNIT_WORDS: Record<LengthUnit, string> = { cm: 'centimetres', mm: 'millimetres', in: 'inches' };

/** The units as a chooser in a sentence offers them. */
export const UNIT_OPTIONS = (['cm', 'in', 'mm'] as const).map((value) => ({
  value,
  label: UNIT_WORDS[value],
  inList: `${UNIT_WORDS[value]} (${value})`,
}));

/** A length or a range of them, without its unit: `91.5`, `91.0–94.0`. */
export function printMeasured(mm: Measured, unit: LengthUnit): string {
  if (typeof mm === 'number') return printLength(mm, unit);
  return `${printLength(mm.low, unit)}–${printLength(mm.high, unit)}`;
}
