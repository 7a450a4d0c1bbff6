import { describe, expect, it } from 'vitest';
import { fitPlanSchema } from '../../../../shared/fit/fit.schema.ts';
import type { FitInput, SizeRow } from '../../../../shared/fit/fit.schema.ts';
import { GARMENT_KINDS } from '../../../../shared/fit/fit-words.ts';
import { zonesOf } from '../../../../shared/fit/garments.ts';
import { easeProfile, ENGINE_VERSION, evaluateAt, planFit } from '../../../../shared/fit/plan-fit.ts';
import { caseSizes, deepFreeze, fitInput, inches, labels } from '../../../support/fit-tables.ts';

const DRESS = { kind: 'dress', silhouette: 'fitted' } as const;
const POINTS = ['bust', 'waist', 'hip'] as const;
const EASE = { bust: 3, waist: 1.5, hip: 3 };
const SIZES = caseSizes(POINTS, EASE);
const codes = (found: readonly { code: string }[]) => found.map(({ code }) => code);
const only = (input: FitInput) => new Set(Object.values(labels(planFit(input))));

describe('planFit', () => {
  it('changes nothing it is given, answers the same again, and answers by the schema', () => {
    const input = deepFreeze(fitInput(DRESS, SIZES, inches({ bust: 34, waist: 28, hip: 41 })));
    const plan = planFit(input);
    expect(planFit(input)).toEqual(plan);
    expect(fitPlanSchema.parse(plan)).toEqual(plan);
    expect(ENGINE_VERSION).toMatch(/^\d+\.\d+\.\d+$/);
  });

  it('gives ease, drafted ease, floor, leeway and deviation at the planned size, in mm', () => {
    const body = inches({ bust: 36.5, waist: 28, hip: 38 });
    const { points } = planFit(fitInput(DRESS, SIZES, body));
    const bust = points.find(({ point }) => point === 'bust');
    expect(bust).toMatchObject({ zone: 'bust', size: { label: '14', position: 1 }, verdict: 'asDrafted' });
    expect(bust?.easeMm).toBeCloseTo(2.5 * 25.4, 9);
    expect(bust?.draftedEaseMm).toBeCloseTo(3 * 25.4, 9);
    expect(bust?.floorMm).toBeCloseTo(1.5 * 25.4, 9);
    expect(bust?.leewayMm).toBeCloseTo(1 * 25.4, 9);
    expect(bust?.deviationMm).toBeCloseTo(0.5 * 25.4, 9);
  });

  it('tells the points from neck to hem, in whatever order the tables give them', () => {
    const backwards = SIZES.map((row) => ({
      label: row.label,
      body: Object.fromEntries(Object.entries(row.body).reverse()),
      finished: Object.fromEntries(Object.entries(row.finished).reverse()),
    }));
    const body = inches({ bust: 34, waist: 29, hip: 41 });
    const reversed = Object.fromEntries(Object.entries(body).reverse());
    const plan = planFit(fitInput(DRESS, SIZES, body));
    expect(plan.points.map(({ point }) => point)).toEqual(['bust', 'waist', 'hip']);
    expect(planFit(fitInput(DRESS, backwards, reversed))).toEqual(plan);
  });

  it('offers the best single size and the best blend, cheapest first, and the plan is the cheapest', () => {
    const plan = planFit(fitInput(DRESS, SIZES, inches({ bust: 34, waist: 28, hip: 41 })));
    expect(plan.options.map(({ kind }) => kind)).toEqual(['blend', 'oneSize']);
    const [first, second] = plan.options;
    expect(first?.cost).toBeLessThan(second?.cost ?? 0);
    expect(plan.zones).toEqual(first?.zones);
    expect(plan.points).toEqual(first?.points);
    expect(new Set(second?.zones.map(({ size }) => size.label)).size).toBe(1);
    expect(second?.points).toHaveLength(3);
    expect(second?.blends).toEqual([]);
  });

  it('keeps one size where a blend is not worth its cost, and still offers the blend', () => {
    const plan = planFit(fitInput(DRESS, caseSizes(POINTS), inches({ bust: 36, waist: 28, hip: 39.2 })));
    expect(plan.options.map(({ kind }) => kind)).toEqual(['oneSize', 'blend']);
    expect(codes(plan.reasons)).toContain('oneSizeIsEnough');
    expect(labels(plan.options[1] ?? plan).hip).toBe('16');
  });

  it('offers no blend that brings no point nearer', () => {
    const plan = planFit(fitInput(DRESS, SIZES, inches({ bust: 36, waist: 28, hip: 38 })));
    expect(plan.options.map(({ kind }) => kind)).toEqual(['oneSize']);
    expect(plan.blends).toEqual([]);
  });

  it.each(GARMENT_KINDS)('plans every zone of a %s', (kind) => {
    const point = zonesOf(kind).includes('bust') ? 'bust' : 'waist';
    const plan = planFit(fitInput({ kind }, SIZES, inches({ [point]: point === 'bust' ? 38 : 30 })));
    expect(plan.zones.map(({ zone }) => zone)).toEqual(zonesOf(kind));
    expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['16']));
    expect(plan.zones.filter(({ governedBy }) => governedBy !== null).map(({ zone }) => zone)).toEqual([
      point,
    ]);
  });
});

describe('a zone without a measured point', () => {
  it('follows its neighbour and says so', () => {
    const plan = planFit(fitInput(DRESS, SIZES, inches({ bust: 34, hip: 40 })));
    const waist = plan.zones.find(({ zone }) => zone === 'waist');
    expect(waist?.governedBy).toBeNull();
    expect(Number(waist?.size.label)).toBeGreaterThanOrEqual(12);
    expect(Number(waist?.size.label)).toBeLessThanOrEqual(16);
    expect(plan.reasons).toContainEqual({ code: 'followsNeighbour', zone: 'waist' });
    expect(labels(plan)).toMatchObject({
      neck: '12',
      shoulder: '12',
      sleeve: '12',
      bust: '12',
      hip: '16',
      hem: '16',
    });
  });

  it('at the beginning of the garment follows what comes after it', () => {
    const plan = planFit(fitInput({ kind: 'trousers' }, SIZES, inches({ hip: 42 })));
    expect(labels(plan)).toEqual({ waist: '18', hip: '18', thigh: '18', knee: '18', hem: '18' });
  });
});

describe('held sizes', () => {
  const body = inches({ bust: 36, waist: 28, hip: 38 });

  it.each(['neck', 'bust', 'hem'] as const)(
    'stay where they are held, at the %s, and the rest is planned round them',
    (zone) => {
      for (const position of [0, 2, 5]) {
        const plan = planFit(fitInput(DRESS, SIZES, body, { held: { [zone]: position } }));
        expect(plan.zones.find((found) => found.zone === zone)?.size.position).toBe(position);
        expect(plan.reasons).toContainEqual({ code: 'held', zone });
      }
      expect(only(fitInput(DRESS, SIZES, body, { held: { [zone]: 1 } }))).toEqual(new Set(['14']));
    },
  );

  it('draw their neighbours along no further than the joins allow', () => {
    const plan = planFit(fitInput(DRESS, SIZES, body, { held: { bust: 4 } }));
    expect(labels(plan)).toMatchObject({ shoulder: '20', bust: '20', waist: '16', hip: '14' });
  });

  it('held apart from each other leave only a blend', () => {
    const plan = planFit(fitInput(DRESS, SIZES, body, { held: { bust: 1, hip: 3 } }));
    expect(plan.options.map(({ kind }) => kind)).toEqual(['blend']);
    expect(labels(plan)).toMatchObject({ bust: '14', hip: '18' });
  });

  it('held further apart than joins allow are still answered', () => {
    const plan = planFit(fitInput(DRESS, SIZES, body, { held: { shoulder: 0, bust: 5, waist: 0 } }));
    expect(labels(plan)).toMatchObject({ shoulder: '12', bust: '22', waist: '12' });
    expect(plan.options[0]?.cost).toBeLessThan(1000);
  });

  it('all held at one size are that size', () => {
    const held = Object.fromEntries(zonesOf('dress').map((zone) => [zone, 3]));
    expect(only(fitInput(DRESS, SIZES, body, { held }))).toEqual(new Set(['18']));
  });

  it('of a zone that the garment lacks say nothing', () => {
    const plain = planFit(fitInput(DRESS, SIZES, body));
    expect(planFit(fitInput(DRESS, SIZES, body, { held: { knee: 5 } }))).toEqual(plain);
  });
});

describe('a liking', () => {
  const body = inches({ bust: 36, waist: 28, hip: 38 });

  it.each(POINTS)('for more room at the %s takes a larger size there, and for less a smaller', (point) => {
    const zoneAt = (preference: number) =>
      labels(planFit(fitInput(DRESS, SIZES, body, { preferenceMm: { [point]: preference } })))[point];
    expect(Number(zoneAt(70))).toBeGreaterThan(14);
    expect(zoneAt(0)).toBe('14');
    expect(Number(zoneAt(-70))).toBeLessThanOrEqual(14);
  });

  it('counts in the deviation and leaves the ease alone', () => {
    const [plain] = evaluateAt(fitInput(DRESS, SIZES, body), { bust: 1 });
    const [liked] = evaluateAt(fitInput(DRESS, SIZES, body, { preferenceMm: { bust: 12 } }), { bust: 1 });
    expect(liked?.deviationMm).toBeCloseTo(12, 9);
    expect(liked?.easeMm).toBe(plain?.easeMm);
  });
});

describe('the body that a point is held against', () => {
  const sizes: SizeRow[] = SIZES.map((row, size) => ({
    ...row,
    body: { ...row.body, highHip: 880 + 50 * size },
    finished: { ...row.finished, waist: 900 + 50 * size },
  }));
  const body = { ...inches({ bust: 38, waist: 26.5, hip: 40 }), highHip: 980 };

  it('is what the pattern says: a low band’s waist against the high hip, in chart and body alike', () => {
    const garment = { kind: 'trousers', compareAs: { waist: 'highHip' } } as const;
    const plan = planFit(fitInput(garment, sizes, body));
    expect(plan.points.find(({ point }) => point === 'waist')).toMatchObject({
      bodyMm: 980,
      chartMm: 980,
      finishedMm: 1000,
      easeMm: 20,
      deviationMm: 0,
    });
    expect(labels(plan)).toMatchObject({ waist: '16', hip: '16' });
    const plain = planFit(fitInput({ kind: 'trousers' }, sizes, body));
    expect(plain.points.find(({ point }) => point === 'waist')?.bodyMm).toBeCloseTo(26.5 * 25.4, 9);
  });

  it('is not measured where that point is not, however well the other is known', () => {
    const garment = { kind: 'trousers', compareAs: { waist: 'highHip' } } as const;
    const plan = planFit(fitInput(garment, sizes, inches({ waist: 30, hip: 40 })));
    expect(plan.cautions).toContainEqual({ code: 'notMeasured', point: 'waist', zone: 'waist' });
  });
});

describe('the floor', () => {
  it('takes a larger size than the deviation alone where the draft was meant for stretch', () => {
    const sizes = caseSizes(POINTS, { bust: 0, waist: 1.5, hip: 3 });
    const garment = { ...DRESS, draftedStretch: 0.25 };
    const body = inches({ bust: 36, waist: 28, hip: 38 });
    const plan = planFit(fitInput(garment, sizes, body));
    expect(labels(plan).bust).toBe('16');
    expect(plan.reasons.find(({ code }) => code === 'floorDecides')).toMatchObject({
      zone: 'bust',
      point: 'bust',
    });
    expect(only(fitInput(DRESS, sizes, body))).toEqual(new Set(['14']));
  });

  it('is at most what the drafter meant, and then it is said where that is under the handbook’s', () => {
    const sizes = caseSizes(POINTS, { bust: 1, waist: 1.5, hip: 3 });
    const plan = planFit(fitInput(DRESS, sizes, inches({ bust: 36, waist: 28, hip: 38 })));
    const bust = plan.points.find(({ point }) => point === 'bust');
    expect(bust?.floorMm).toBeCloseTo(25.4, 9);
    expect(bust?.verdict).toBe('asDrafted');
    const caution = plan.cautions.find(({ code }) => code === 'belowHandbook');
    expect(caution).toMatchObject({ point: 'bust' });
    expect(caution?.amountMm).toBeCloseTo(0.5 * 25.4, 9);
  });

  it('does not bind at bust, waist and hip of a garment worn open, and binds elsewhere', () => {
    const sizes = SIZES.map((row, size) => ({
      ...row,
      finished: { ...row.finished, upperArm: 300 + 15 * size },
    }));
    const body = { ...inches({ bust: 44, waist: 36, hip: 46 }), upperArm: 300 };
    const at = Object.fromEntries(zonesOf('jacket').map((zone) => [zone, 0]));
    const floors = (worn: 'open' | 'closed') =>
      evaluateAt(fitInput({ kind: 'jacket', silhouette: 'fitted', worn }, sizes, body), at).map((result) => [
        result.point,
        result.floorMm === null ? 'none' : result.verdict,
      ]);
    expect(floors('open')).toEqual([
      ['upperArm', 'belowFloor'],
      ['bust', 'none'],
      ['waist', 'none'],
      ['hip', 'none'],
    ]);
    expect(new Set(floors('closed').map(([, verdict]) => verdict))).toEqual(new Set(['belowFloor']));
  });
});

describe('evaluateAt', () => {
  const input = fitInput(DRESS, SIZES, inches({ bust: 36, waist: 28, hip: 38 }));

  it('judges the sizes held by hand, each zone by its own', () => {
    const results = evaluateAt(input, { bust: 0, waist: 1, hip: 5 });
    expect(results.map(({ point, size, verdict }) => [point, size.label, verdict])).toEqual([
      ['bust', '12', 'belowFloor'],
      ['waist', '14', 'asDrafted'],
      ['hip', '22', 'looser'],
    ]);
  });

  it('leaves out a zone without a position', () => {
    expect(evaluateAt(input, { waist: 2 }).map(({ point }) => point)).toEqual(['waist']);
    expect(evaluateAt(input, {})).toEqual([]);
  });

  it('agrees with the plan at the plan’s sizes', () => {
    const plan = planFit(input);
    const positions = Object.fromEntries(plan.zones.map(({ zone, size }) => [zone, size.position]));
    expect(evaluateAt(input, positions)).toEqual(plan.points);
  });

  it.each([-1, 6, 1.5, NaN])('refuses the position %d and names the zone', (position) => {
    expect(() => evaluateAt(input, { waist: position })).toThrow(/positions\.waist/);
  });
});

describe('easeProfile', () => {
  it('is evaluateAt at every size, in grade order', () => {
    const input = fitInput(DRESS, SIZES, inches({ bust: 36, waist: 28, hip: 38 }));
    const profile = easeProfile(input);
    expect(profile).toHaveLength(6);
    profile.forEach((points, position) => {
      const positions = Object.fromEntries(zonesOf('dress').map((zone) => [zone, position]));
      expect(points).toEqual(evaluateAt(input, positions));
    });
  });
});
