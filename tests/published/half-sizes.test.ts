import { describe, expect, it } from 'vitest';
import type { SizeRow } from '../../shared/fit/fit.schema.ts';
import { planFit } from '../../shared/fit/plan-fit.ts';
import type { PointId } from '../../shared/points/point-ids.ts';
import { bodyOf, fitInput, sizesOf, withEase } from '../support/fit-tables.ts';
import { readPublishedTable } from '../support/published-table.ts';

// Sources: fixtures/standards/README.md. Published rows are the outside measure: half-way between two of them lies what
// a line half-way between their two sizes must fit.
const TABLES = [
  ['ASTM D5585-11e1, curvy', 'astm-d5585-11e1-curvy.csv'],
  ['ASTM D5585-11e1, straight', 'astm-d5585-11e1-straight.csv'],
  ['JIS L 4005, type A, regular', 'jis-l4005-a-regular.csv'],
  ['EN 13402-3, women (from memory)', 'en13402-3-women.csv'],
] as const;
const KINDS = ['dress', 'trousers', 'shirt', 'jumpsuit', 'coat'] as const;

function bodyBetween(smaller: SizeRow, larger: SizeRow): Partial<Record<PointId, number>> {
  const other = bodyOf(larger);
  return Object.fromEntries(
    Object.entries(bodyOf(smaller)).map(([point, mm]) => [
      point,
      (mm + (other[point as PointId] ?? NaN)) / 2,
    ]),
  );
}

describe.each(TABLES)('%s', (_name, fixture) => {
  const chart = sizesOf(readPublishedTable(fixture));

  it.each(KINDS)(
    'gives the mean of two neighbouring rows the half between them at every zone of a %s',
    (kind) => {
      for (const sizes of [chart, withEase(chart, () => 60)]) {
        chart.slice(1).forEach((larger, before) => {
          const smaller = chart[before];
          if (!smaller) throw new Error('no smaller row');
          const body = bodyBetween(smaller, larger);
          const plan = planFit(
            fitInput({ kind, silhouette: 'fitted' }, sizes, body, { cutBetweenLines: true }),
          );
          const label = `${smaller.label}–${larger.label}`;
          expect(new Set(plan.zones.map(({ size }) => size.label)), label).toEqual(new Set([label]));
          expect(plan.options[0]?.cost, label).toBe(0);
          expect(new Set(plan.points.map(({ deviationMm }) => deviationMm)), label).toEqual(new Set([0]));
          // A body between two sizes is nobody's own row: whole sizes take the larger, and pay for it.
          const whole = planFit(fitInput({ kind, silhouette: 'fitted' }, sizes, body));
          expect(whole.options[0]?.cost, label).toBeGreaterThan(0);
        });
      }
    },
  );
});

describe('EN 13402-3 with intervals (from memory)', () => {
  const chart = sizesOf(readPublishedTable('en13402-3-women-intervals.csv'));

  it.each(['fitted', 'veryLoose'] as const)(
    'keeps a body anywhere inside an interval on its size’s own line, between the lines too: %s',
    (silhouette) => {
      // A shared end belongs to the larger size, so the shares stop short of it.
      const shares = [0, 0.05, 0.25, 0.5, 0.75, 0.95, 0.999];
      const inside = (row: SizeRow, share: number) =>
        Object.fromEntries(
          Object.entries(row.body).map(([point, value]) => [
            point,
            typeof value === 'number' ? value : value.low + share * (value.high - value.low),
          ]),
        );
      for (const sizes of [chart, withEase(chart, () => 60)]) {
        chart.forEach((row, position) => {
          const planned = shares.flatMap((share) =>
            planFit(
              fitInput({ kind: 'dress', silhouette }, sizes, inside(row, share), { cutBetweenLines: true }),
            ).zones.map(({ size }) => size.position),
          );
          expect(new Set(planned), row.label).toEqual(new Set([position]));
        });
      }
    },
  );
});
