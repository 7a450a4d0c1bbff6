import { describe, expect, it } from 'vitest';
import type { FitInput } from '../../../../shared/fit/fit.schema.ts';
import { planFit } from '../../../../shared/fit/plan-fit.ts';
import { caseSizes, fitInput, INCH, inches } from '../../../support/fit-tables.ts';

const DRESS = { kind: 'dress', silhouette: 'fitted' } as const;
const CHART = caseSizes(['bust', 'waist', 'hip']);
const reasonsOf = (input: FitInput) => planFit(input).reasons;

describe('reasons', () => {
  it('name for every zone, from neck to hem, what governs or that it follows', () => {
    const found = reasonsOf(fitInput(DRESS, CHART, inches({ bust: 36.25, hip: 38 })));
    expect(found.map(({ zone, code }) => `${zone ?? ''} ${code}`)).toEqual([
      'neck followsNeighbour',
      'shoulder followsNeighbour',
      'sleeve followsNeighbour',
      'bust governs',
      'waist followsNeighbour',
      'hip governs',
      'hem followsNeighbour',
    ]);
    const bust = found.find(({ zone }) => zone === 'bust');
    expect(bust?.point).toBe('bust');
    expect(bust?.amountMm).toBeCloseTo(0.25 * INCH, 9);
  });

  it('take as governing the point that loses most by the zone’s next best size', () => {
    const sizes = CHART.map((row, size) => ({ ...row, body: { ...row.body, highHip: 860 + 50 * size } }));
    const governedBy = (hip: number, highHip: number) =>
      planFit(fitInput(DRESS, sizes, { ...inches({ hip }), highHip })).zones.find(
        ({ zone }) => zone === 'hip',
      )?.governedBy;
    // The hip lies half-way between two sizes and loses nothing by the next: the high hip decides.
    expect(governedBy(39, 960)).toBe('highHip');
    expect(governedBy(40, 985)).toBe('hip');
  });

  it('with one size name the weightiest point', () => {
    const sizes = [{ label: 'one', body: { bust: 900, underbust: 780 }, finished: {} }];
    const { zones } = planFit(fitInput(DRESS, sizes, { bust: 900, underbust: 790 }));
    expect(zones.find(({ zone }) => zone === 'bust')?.governedBy).toBe('bust');
  });

  it('say where a join kept sizes closer together than the points wanted', () => {
    const found = reasonsOf(
      fitInput({ kind: 'trousers' }, caseSizes(['waist', 'hip']), inches({ waist: 26.5, hip: 44 })),
    );
    const held = found.find(({ code }) => code === 'joinHolds');
    expect(held).toMatchObject({ zone: 'waist', point: 'waist' });
    expect(held?.amountMm).toBeLessThan(0);
    expect(found.filter(({ code }) => code === 'joinHolds')).toHaveLength(1);
  });

  it('say where one size is kept though another would be nearer', () => {
    const found = reasonsOf(fitInput(DRESS, CHART, inches({ bust: 36, waist: 28, hip: 39.2 })));
    const kept = found.find(({ code }) => code === 'oneSizeIsEnough');
    expect(kept).toMatchObject({ zone: 'hip', point: 'hip' });
    expect(kept?.amountMm).toBeCloseTo(1.2 * INCH, 9);
  });

  it('say that two sizes were equally near, and only then', () => {
    const ties = (hip: number) =>
      reasonsOf(fitInput({ kind: 'trousers' }, CHART, inches({ hip }))).filter(
        ({ code }) => code === 'tieToLarger',
      );
    expect(ties(39)).toEqual([{ code: 'tieToLarger', zone: 'hip', point: 'hip' }]);
    expect(ties(38.9)).toEqual([]);
    expect(ties(39.1)).toEqual([]);
    expect(ties(36)).toEqual([]);
  });

  it('say which sizes are held, and of those nothing else', () => {
    const found = reasonsOf(fitInput(DRESS, CHART, inches({ bust: 36, hip: 38 }), { held: { bust: 3 } }));
    expect(found.filter(({ zone }) => zone === 'bust')).toEqual([{ code: 'held', zone: 'bust' }]);
  });
});
