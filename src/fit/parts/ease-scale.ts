import { MM_PER, printLength, type LengthUnit } from '../../../shared/units.ts';

/** From where to where the ease axis runs, in mm; 0 is the body. */
export interface EaseDomain {
  low: number;
  high: number;
}

/** The least the axis shows on either side, in mm, so that one tight point alone does not fill the page. */
const LEAST_HIGH_MM = 60;
const LEAST_LOW_MM = -12;

/** The axis that holds every value, with a little room at both ends. Values that are not numbers are left out. */
export function easeDomain(values: readonly (number | null)[]): EaseDomain {
  const known = values.filter((value): value is number => value !== null && Number.isFinite(value));
  const high = Math.max(LEAST_HIGH_MM, ...known);
  const low = Math.min(LEAST_LOW_MM, ...known);
  const room = (high - low) * 0.04;
  return { low: low - room, high: high + room };
}

/** The one axis that holds both. */
export function widen(one: EaseDomain, other: EaseDomain): EaseDomain {
  return { low: Math.min(one.low, other.low), high: Math.max(one.high, other.high) };
}

const STEPS: Record<LengthUnit, readonly number[]> = {
  cm: [1, 2, 5, 10, 20, 50, 100],
  mm: [10, 20, 50, 100, 200, 500, 1000],
  in: [0.5, 1, 2, 4, 8, 16, 32],
};

/** Round values of the axis in the person's unit, at least `apartPx` from one another; 0 is the body and is not among them. */
export function easeTicks(
  domain: EaseDomain,
  width: number,
  unit: LengthUnit,
  apartPx = 56,
): { mm: number; label: string }[] {
  const mm = MM_PER[unit];
  const pxPerUnit = (width / (domain.high - domain.low)) * mm;
  const step = STEPS[unit].find((candidate) => candidate * pxPerUnit >= apartPx) ?? STEPS[unit].at(-1) ?? 1;
  const ticks: { mm: number; label: string }[] = [];
  for (let at = Math.ceil(domain.low / mm / step); at * step * mm <= domain.high; at += 1) {
    if (at !== 0) ticks.push({ mm: at * step * mm, label: tickLabel(at * step * mm, unit) });
  }
  return ticks;
}

/** Whole values without a useless decimal: `+5`, not `+5.0`. */
function tickLabel(mm: number, unit: LengthUnit): string {
  return printLength(mm, unit, { signed: true }).replace(/\.0$/, '');
}
