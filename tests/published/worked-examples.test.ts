import { describe, expect, it } from 'vitest';
import { evaluateAt, planFit } from '../../shared/fit/plan-fit.ts';
import type { PointId } from '../../shared/points/point-ids.ts';
import { LENGTH_UNITS, MM_PER } from '../../shared/units.ts';
import { fitInput, INCH } from '../support/fit-tables.ts';
import { readFixtureRows } from '../support/published-rows.ts';

// Sources: beside each row of fixtures/practice/worked-examples.csv.
const ROWS = readFixtureRows('practice/worked-examples.csv').map((row) => {
  const unit = LENGTH_UNITS.find((known) => known === row.unit);
  if (!unit) throw new Error(`no unit: ${String(row.unit)}`);
  const mm = (text = '') => Number(text) * MM_PER[unit];
  return { row, mm, point: row.point as PointId, name: `${String(row.case)} (${String(row.source)})` };
});

describe('ease', () => {
  it.each(ROWS.filter(({ row }) => row.body !== ''))('$name', ({ row, mm, point }) => {
    const sizes = [{ label: 'one', body: {}, finished: { [point]: mm(row.pattern) } }];
    const [result] = evaluateAt(fitInput({ kind: 'dress' }, sizes, { [point]: mm(row.body) }), {
      [point]: 0,
    });
    expect(result?.easeMm).toBeCloseTo(mm(row.difference), 9);
  });
});

describe('a change shared over seam edges', () => {
  it.each(ROWS.filter(({ row }) => row.edges !== ''))('$name', ({ row, mm, point }) => {
    const change = mm(row.difference);
    const other = 700 + change;
    const size = (label: string, bust: number, waist: number) => ({
      label,
      body: { bust, waist },
      finished: {},
    });
    const sizes =
      change > 0
        ? [size('a', 900, 700), size('b', 950, other)]
        : [size('a', 900, other), size('b', 950, 700)];
    const held = change > 0 ? { bust: 0, waist: 1 } : { bust: 1, waist: 0 };
    const plan = planFit(fitInput({ kind: 'dress' }, sizes, { bust: 900, waist: 700 }, { held }));
    const blend = plan.blends.find(({ toZone }) => toZone === 'waist');
    expect(blend).toMatchObject({ point, edges: Number(row.edges) });
    expect(blend?.changeMm).toBeCloseTo(change, 9);
    expect(blend?.perEdgeMm).toBeCloseTo(mm(row.per_edge), 9);
  });

  it('over the edges that the pattern states: eight panels, 2 in, an eighth of it each', () => {
    const sizes = [
      { label: 'a', body: { bust: 900, waist: 700 }, finished: {} },
      { label: 'b', body: { bust: 950, waist: 700 + 2 * INCH }, finished: {} },
    ];
    const garment = { kind: 'dress', seamEdges: { waist: 16 } } as const;
    const plan = planFit(
      fitInput(garment, sizes, { bust: 900, waist: 750 }, { held: { bust: 0, waist: 1 } }),
    );
    expect(plan.blends[0]?.perEdgeMm).toBeCloseTo((2 * INCH) / 16, 9);
  });
});
