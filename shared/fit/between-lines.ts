import type { PointId } from '../points/point-ids.ts';
import type { FitInput, Measured, SizeRow } from './fit.schema.ts';

/**
 * How many places a size has on the lattice that is planned on: one, or two where it may be cut between the lines too.
 * A place is a size's position times this, so that places are whole numbers.
 */
export function placesPerSize({ cutBetweenLines }: Pick<FitInput, 'cutBetweenLines'>): 1 | 2 {
  return cutBetweenLines === true ? 2 : 1;
}

/**
 * The rows planned on, in grade order: the sizes themselves, or with a row half-way between every two neighbours, where
 * every value that both of them have is the mean of theirs (of ranges, end by end). Nothing stands before the first
 * size or behind the last: there a line could only be guessed.
 */
export function latticeRows(sizes: readonly SizeRow[], perSize: 1 | 2): readonly SizeRow[] {
  if (perSize === 1) return sizes;
  return sizes.flatMap((row, at) => {
    const next = sizes[at + 1];
    return next ? [row, rowBetween(row, next)] : [row];
  });
}

/** What a line half-way between two sizes is called: `16–18`. */
export function labelBetween(smaller: string, larger: string): string {
  return `${smaller}–${larger}`;
}

function rowBetween(smaller: SizeRow, larger: SizeRow): SizeRow {
  return {
    label: labelBetween(smaller.label, larger.label),
    body: means(smaller.body, larger.body, meanMeasured),
    finished: means(smaller.finished, larger.finished, mean),
  };
}

function means<Value>(
  smaller: Partial<Record<PointId, Value>>,
  larger: Partial<Record<PointId, Value>>,
  between: (a: Value, b: Value) => Value,
): Partial<Record<PointId, Value>> {
  const found: Partial<Record<PointId, Value>> = {};
  for (const key in smaller) {
    const point = key as PointId;
    const a = smaller[point];
    const b = larger[point];
    if (a !== undefined && b !== undefined) found[point] = between(a, b);
  }
  return found;
}

/** A range and a single number meet as two ranges would, the number being both its ends. */
function meanMeasured(a: Measured, b: Measured): Measured {
  if (typeof a === 'number') return typeof b === 'number' ? mean(a, b) : meanMeasured({ low: a, high: a }, b);
  if (typeof b === 'number') return meanMeasured(b, a);
  return { low: mean(a.low, b.low), high: mean(a.high, b.high) };
}

function mean(a: number, b: number): number {
  return (a + b) / 2;
}
