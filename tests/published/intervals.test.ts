import { describe, expect, it } from 'vitest';
import type { Silhouette } from '../../shared/fit/fit-words.ts';
import type { SizeRow } from '../../shared/fit/fit.schema.ts';
import { planFit } from '../../shared/fit/plan-fit.ts';
import type { PointId } from '../../shared/points/point-ids.ts';
import { fitInput, sizesOf, withEase } from '../support/fit-tables.ts';
import { readPublishedTable } from '../support/published-table.ts';
import { seededRandom } from '../support/seeded-random.ts';

// Source: EN 13402-3:2004, women, bust, waist and hip with intervals: from memory (fixtures/standards/README.md).
const CHART = sizesOf(readPublishedTable('en13402-3-women-intervals.csv'));
const POINTS = ['bust', 'waist', 'hip'] as const;

function interval(row: SizeRow | undefined, point: PointId): { low: number; high: number } {
  const value = row?.body[point];
  if (typeof value !== 'object') throw new Error(`${point} is not an interval`);
  return value;
}

/** A body at the same share of each interval: 0 its lower end, 1 its upper end; `beyond` in mm is added. */
function bodyAt(row: SizeRow | undefined, share: () => number, beyond = 0): Partial<Record<PointId, number>> {
  return Object.fromEntries(
    POINTS.map((point) => {
      const { low, high } = interval(row, point);
      return [point, low + share() * (high - low) + beyond];
    }),
  );
}

function plannedSizes(
  silhouette: Silhouette,
  sizes: SizeRow[],
  body: Partial<Record<PointId, number>>,
): number[] {
  const { zones } = planFit(fitInput({ kind: 'dress', silhouette }, sizes, body));
  return [...new Set(zones.map((zone) => zone.size.position))];
}

describe.each([
  ['fitted, chart only', 'fitted', CHART],
  ['fitted, drafted at 60 mm of ease', 'fitted', withEase(CHART, () => 60)],
  ['close, drafted at 10 mm of ease', 'close', withEase(CHART, () => 10)],
  ['loose, chart only', 'loose', CHART],
  ['very loose, drafted at 300 mm of ease', 'veryLoose', withEase(CHART, () => 300)],
] as const)('EN 13402-3 intervals (from memory), %s', (_name, silhouette, sizes) => {
  it('gives a body anywhere inside an interval that size, at every zone', () => {
    const random = seededRandom(13402);
    CHART.forEach((row, position) => {
      for (let draw = 0; draw < 50; draw++) {
        // A shared end belongs to the larger size, so the draws stop short of it.
        expect(
          plannedSizes(
            silhouette,
            sizes,
            bodyAt(row, () => random() * 0.999),
          ),
        ).toEqual([position]);
      }
    });
  });

  it('gives a body on the end that two sizes share the larger', () => {
    CHART.slice(1).forEach((row, before) => {
      expect(
        plannedSizes(
          silhouette,
          sizes,
          bodyAt(row, () => 0),
        ),
      ).toEqual([before + 1]);
    });
  });

  it('gives a body 1 mm beyond either end of an interval the neighbour', () => {
    CHART.slice(1).forEach((row, before) => {
      expect(
        plannedSizes(
          silhouette,
          sizes,
          bodyAt(row, () => 0, -1),
        ),
      ).toEqual([before]);
      expect(
        plannedSizes(
          silhouette,
          sizes,
          bodyAt(CHART[before], () => 1, 1),
        ),
      ).toEqual([before + 1]);
    });
  });

  it.each(POINTS)('does the same where only the %s is shared', (point) => {
    const kind = point === 'bust' ? 'shirt' : 'skirt';
    const sizeFor = (mm: number) => {
      const { zones } = planFit(fitInput({ kind, silhouette }, sizes, { [point]: mm }));
      return [...new Set(zones.map((zone) => zone.size.position))];
    };
    CHART.forEach((row, position) => {
      const { low, high } = interval(row, point);
      expect(sizeFor(low)).toEqual([position]);
      expect(sizeFor((low + high) / 2)).toEqual([position]);
      expect(sizeFor(high - 0.01)).toEqual([position]);
      if (position > 0) expect(sizeFor(low - 1)).toEqual([position - 1]);
      if (position < CHART.length - 1) expect(sizeFor(high + 1)).toEqual([position + 1]);
    });
  });
});
