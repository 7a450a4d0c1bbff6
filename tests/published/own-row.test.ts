import { describe, expect, it } from 'vitest';
import { GARMENT_KINDS, SILHOUETTES } from '../../shared/fit/fit-words.ts';
import type { FitInput, SizeRow } from '../../shared/fit/fit.schema.ts';
import { garmentPoints } from '../../shared/fit/garments.ts';
import { planFit } from '../../shared/fit/plan-fit.ts';
import { bodyOf, fitInput, sizesOf, withEase } from '../support/fit-tables.ts';
import { readPublishedTable } from '../support/published-table.ts';
import { seededRandom } from '../support/seeded-random.ts';

// Sources: fixtures/standards/README.md. The tables come in as an uploaded file does.
const TABLES = [
  ['ASTM D5585-11e1, curvy', 'astm-d5585-11e1-curvy.csv', 12],
  ['ASTM D5585-11e1, straight', 'astm-d5585-11e1-straight.csv', 12],
  ['JIS L 4005, type A, regular', 'jis-l4005-a-regular.csv', 10],
  ['EN 13402-3, women (from memory)', 'en13402-3-women.csv', 16],
  ['EN 13402-3, women, with intervals (from memory)', 'en13402-3-women-intervals.csv', 16],
] as const;

/** Every kind in every silhouette, closed and open, that shares a point with the table. */
function garmentsFor(sizes: readonly SizeRow[]): FitInput['garment'][] {
  return GARMENT_KINDS.flatMap((kind) =>
    SILHOUETTES.flatMap((silhouette) =>
      (['closed', 'open'] as const)
        .filter(() => garmentPoints(kind).some(({ point }) => sizes[0]?.body[point] !== undefined))
        .map((worn) => ({ kind, silhouette, worn })),
    ),
  );
}

/** Everything that is not the row's own size, in words; empty where all is well. */
function strayFrom(
  garment: FitInput['garment'],
  sizes: SizeRow[],
  chart: readonly SizeRow[],
  more: Partial<FitInput> = {},
): string[] {
  return chart.flatMap((row, position) => {
    const plan = planFit(fitInput(garment, sizes, bodyOf(row), more));
    const said = `${garment.kind}, ${garment.silhouette}, ${garment.worn}, size ${row.label}`;
    const zones = plan.zones.filter(({ size }) => size.position !== position);
    const points = plan.points.filter(({ verdict }) => verdict !== 'asDrafted');
    return [
      ...(plan.status === 'planned' && plan.zones.length > 0 ? [] : [`${said}: ${plan.status}`]),
      ...(plan.options[0]?.cost === 0 ? [] : [`${said}: cost ${String(plan.options[0]?.cost)}`]),
      ...zones.map(({ zone, size }) => `${said}, ${zone}: ${size.label}`),
      ...points.map(({ point, verdict }) => `${said}, ${point}: ${verdict}`),
    ];
  });
}

describe.each(TABLES)('%s', (_name, fixture, rows) => {
  const chart = sizesOf(readPublishedTable(fixture));

  it('is read whole', () => {
    expect(chart).toHaveLength(rows);
  });

  it('plans every row, taken as a body, to its own size at every zone of every garment kind', () => {
    const garments = garmentsFor(chart);
    expect(garments.length).toBeGreaterThan(100);
    expect(garments.flatMap((garment) => strayFrom(garment, chart, chart))).toEqual([]);
  });

  it.each([-40, 0, 5, 25, 60, 140, 300])(
    'does so with finished measurements drafted at %d mm of ease',
    (ease) => {
      const sizes = withEase(chart, () => ease);
      expect(garmentsFor(chart).flatMap((garment) => strayFrom(garment, sizes, chart))).toEqual([]);
    },
  );

  it.each([0, 60, 300])(
    'does so where it may be cut between the lines too, drafted at %d mm of ease',
    (ease) => {
      const between = { cutBetweenLines: true };
      const sizes = withEase(chart, () => ease);
      const garments = garmentsFor(chart);
      expect(garments.flatMap((garment) => strayFrom(garment, sizes, chart, between))).toEqual([]);
      expect(garments.flatMap((garment) => strayFrom(garment, chart, chart, between))).toEqual([]);
    },
  );

  it('does so with another drafted ease at every point, drawn a hundred times', () => {
    const random = seededRandom(5585);
    const garments = garmentsFor(chart);
    for (let draw = 0; draw < 100; draw++) {
      const eases = new Map<string, number>();
      const sizes = withEase(chart, (point) => {
        if (!eases.has(point)) eases.set(point, Math.round(random() * 350) - 50);
        return eases.get(point) ?? 0;
      });
      const garment = garments[Math.floor(random() * garments.length)];
      expect(garment ? strayFrom(garment, sizes, chart) : ['no garment']).toEqual([]);
    }
  });
});
