import { describe, expect, it } from 'vitest';
import type { FitInput, SizeRow } from '../../../../shared/fit/fit.schema.ts';
import { evaluateAt, planFit } from '../../../../shared/fit/plan-fit.ts';
import { caseSizes, fitInput, INCH, inches, labels } from '../../../support/fit-tables.ts';

const DRESS = { kind: 'dress', silhouette: 'fitted' } as const;
const POINTS = ['bust', 'waist', 'hip'] as const;
const CHART = caseSizes(POINTS);
const BOTH = caseSizes(POINTS, { bust: 3, waist: 1.5, hip: 3 });
const OWN = inches({ bust: 36, waist: 28, hip: 38 });
const cautionsOf = (input: FitInput) => planFit(input).cautions;

describe('what is not reckoned yet', () => {
  it.each<[string, Partial<FitInput>]>([
    ['knitNotReckoned', { fabric: { structure: 'knit' } }],
    ['knitNotReckoned', { fabric: { structure: 'woven', stretch: 0.1 } }],
    ['shrinkageNotReckoned', { fabric: { structure: 'woven', shrinkCrosswise: 0.03 } }],
    ['shrinkageNotReckoned', { fabric: { structure: 'woven', shrinkLengthwise: -0.01 } }],
    ['layersNotReckoned', { layers: [{ name: 'shirt', thicknessMm: 1 }] }],
    ['leanNotReckoned', { lean: 'roomier' }],
  ])('is refused in words and not half answered: %s', (code, more) => {
    const input = fitInput(DRESS, BOTH, OWN, more);
    const plan = planFit(input);
    expect(plan).toMatchObject({
      status: 'notEnough',
      zones: [],
      points: [],
      options: [],
      cautions: [{ code }],
    });
    expect(evaluateAt(input, { bust: 1 })).toEqual([]);
  });

  it('is refused all at once', () => {
    const input = fitInput(DRESS, BOTH, OWN, {
      lean: 'closer',
      fabric: { structure: 'knit' },
    });
    expect(cautionsOf(input).map(({ code }) => code)).toEqual(['knitNotReckoned', 'leanNotReckoned']);
  });

  it.each<Partial<FitInput>>([
    { layers: [] },
    { cutBetweenLines: false },
    { cutBetweenLines: true },
    { fabric: { structure: 'woven', stretch: 0, shrinkCrosswise: 0, usableShare: 0.5 } },
  ])('is not met by %j', (more) => {
    expect(planFit(fitInput(DRESS, BOTH, OWN, more)).status).toBe('planned');
  });
});

describe('what is missing', () => {
  it('nothing shared: not enough', () => {
    const plan = planFit(fitInput(DRESS, BOTH, { wrist: 160 }));
    expect(plan.status).toBe('notEnough');
    expect(plan.cautions.map(({ code }) => code)).toContain('nothingShared');
  });

  it.each(POINTS)(
    'a governing or fitted point of the pattern that was not measured is named: %s',
    (point) => {
      const body = Object.fromEntries(Object.entries(OWN).filter(([key]) => key !== point));
      const plan = planFit(fitInput(DRESS, BOTH, body));
      expect(plan.status).toBe('planned');
      expect(plan.cautions.filter(({ code }) => code === 'notMeasured')).toEqual([
        { code: 'notMeasured', point, zone: point },
      ]);
    },
  );

  it('a loose point that was not measured is not asked for', () => {
    const sizes = BOTH.map((row, size) => ({ ...row, body: { ...row.body, wrist: 150 + 5 * size } }));
    expect(cautionsOf(fitInput(DRESS, sizes, OWN))).toEqual([]);
  });

  it('chart only: the ease is unknown, point by point', () => {
    const plan = planFit(fitInput(DRESS, CHART, OWN));
    expect(plan.cautions).toEqual(POINTS.map((point) => ({ code: 'easeUnknown', point, zone: point })));
    for (const point of plan.points)
      expect(point).toMatchObject({ easeMm: null, leewayMm: null, verdict: 'asDrafted' });
  });

  it('finished only, and the handbook has no target: said, and the point does not choose', () => {
    const sizes = BOTH.map((row) => ({ ...row, body: {} }));
    const plan = planFit(fitInput(DRESS, sizes, OWN));
    expect(plan.cautions.filter(({ code }) => code === 'noTarget').map(({ point }) => point)).toEqual([
      'waist',
      'hip',
    ]);
    expect(plan.points.find(({ point }) => point === 'waist')).toMatchObject({
      deviationMm: null,
      verdict: 'unknown',
    });
  });

  it('finished only everywhere without a target: not enough', () => {
    const sizes = BOTH.map((row) => ({ ...row, body: {} }));
    expect(planFit(fitInput({ kind: 'dress' }, sizes, OWN)).status).toBe('notEnough');
  });
});

/** The chart with one value changed. */
function chartWith(at: number, point: 'bust' | 'waist' | 'hip', value: number | undefined): SizeRow[] {
  return CHART.map((row, index) => {
    if (index !== at) return row;
    const { [point]: _before, ...rest } = row.body;
    return { ...row, body: value === undefined ? rest : { ...rest, [point]: value } };
  });
}

describe('a point that abstains', () => {
  it.each([1, 3, 5])('a chart that falls at size number %d: the point says so and does not choose', (at) => {
    const sizes = chartWith(at, 'hip', 600);
    const plan = planFit(fitInput(DRESS, sizes, { ...OWN, ...inches({ hip: 42 }) }));
    expect(plan.cautions).toContainEqual({ code: 'chartFalls', point: 'hip', zone: 'hip' });
    expect(labels(plan)).toMatchObject({ bust: '14', hip: '14' });
    expect(plan.points.find(({ point }) => point === 'hip')).toMatchObject({
      deviationMm: null,
      verdict: 'unknown',
    });
    expect(plan.zones.find(({ zone }) => zone === 'hip')?.governedBy).toBeNull();
  });

  it('equal neighbours do not fall', () => {
    const sizes = chartWith(1, 'hip', 36 * INCH);
    expect(cautionsOf(fitInput(DRESS, sizes, OWN)).map(({ code }) => code)).not.toContain('chartFalls');
  });

  it.each([0, 3, 5])('a point that size number %d lacks: the point says so and does not choose', (at) => {
    const plan = planFit(
      fitInput(DRESS, chartWith(at, 'hip', undefined), { ...OWN, ...inches({ hip: 42 }) }),
    );
    expect(plan.cautions).toContainEqual({ code: 'givenAtSomeSizes', point: 'hip', zone: 'hip' });
    expect(labels(plan).hip).toBe('14');
  });
});

describe('less than wearing ease', () => {
  it('is told with the amount, at the planned size', () => {
    const input = fitInput(DRESS, BOTH, OWN, { held: { bust: 0 } });
    const caution = planFit(input).cautions.find(({ code }) => code === 'belowFloor');
    expect(caution).toMatchObject({ point: 'bust', zone: 'bust' });
    expect(caution?.amountMm).toBeCloseTo(0.5 * INCH, 9);
  });
});

describe('borderline', () => {
  const borderline = (more: Partial<FitInput>, bust = 36) =>
    evaluateAt(fitInput(DRESS, BOTH, inches({ bust }), more), { bust: 1 })[0]?.borderline;

  it('a leeway smaller than twice the tape’s error may be there or not', () => {
    // Drafted 3 in, floor 1.5 in: leeway 38.1 mm at 36 in, 12.7 mm at 37 in.
    expect(borderline({ takenBy: 'self' })).toBe(false);
    expect(borderline({ takenBy: 'self' }, 37)).toBe(true);
    expect(borderline({}, 37)).toBe(true);
    expect(borderline({ takenBy: 'another' }, 37)).toBe(false);
    expect(borderline({ takenBy: 'another' }, 37.3)).toBe(true);
  });

  it('counts with the error that the person states', () => {
    expect(borderline({ tapeErrorMm: { bust: 20 } })).toBe(true);
    expect(borderline({ tapeErrorMm: { waist: 20 } })).toBe(false);
    expect(borderline({ tapeErrorMm: { bust: 1 } }, 37)).toBe(false);
  });
});

describe('a body beyond the sizes', () => {
  const far = (body: Parameters<typeof inches>[0], garment: FitInput['garment'] = DRESS) =>
    planFit(fitInput(garment, BOTH, inches(body)));

  it('by more than half a size and more than 20 mm an edge: the sizes end before, said where and by how many steps', () => {
    const plan = far({ bust: 50, waist: 42, hip: 52 });
    expect(plan.status).toBe('outOfRange');
    expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['22']));
    expect(plan.points).toHaveLength(3);
    const caution = plan.cautions.find(({ code, point }) => code === 'beyondLargest' && point === 'bust');
    expect(caution?.amountMm).toBeCloseTo(6 * INCH, 9);
    expect(caution?.steps).toBeCloseTo(3, 9);
  });

  it('below the first size likewise', () => {
    const plan = far({ bust: 28, waist: 21, hip: 30 });
    expect(plan.status).toBe('outOfRange');
    expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['12']));
    const caution = plan.cautions.find(({ code, point }) => code === 'beyondSmallest' && point === 'hip');
    expect(caution?.amountMm).toBeCloseTo(-6 * INCH, 9);
    expect(caution?.steps).toBeCloseTo(3, 9);
  });

  it('by less than 20 mm an edge: the last size is a plan, and it is said', () => {
    const plan = far({ bust: 46, waist: 38, hip: 48 });
    expect(plan.status).toBe('planned');
    expect(plan.cautions.map(({ code }) => code)).toContain('beyondLargest');
  });

  it('by less than half a size: nothing is said', () => {
    const plan = far({ bust: 44.5, waist: 36.5, hip: 46.5 });
    expect(plan.status).toBe('planned');
    expect(plan.cautions).toEqual([]);
  });

  it('counts the edges that the pattern states', () => {
    const seamEdges = { bust: 8, waist: 8, hip: 8 };
    expect(far({ bust: 48.5, waist: 40, hip: 50 }).status).toBe('outOfRange');
    expect(far({ bust: 48.5, waist: 40, hip: 50 }, { ...DRESS, seamEdges }).status).toBe('planned');
  });

  it('loose points end too, where the cloth would not close by far, or where nothing else is there to judge', () => {
    const loose = { kind: 'dress', silhouette: 'veryLoose' } as const;
    expect(far({ bust: 56, waist: 50, hip: 56 }, loose).status).toBe('outOfRange');
    expect(far({ bust: 26, waist: 20, hip: 28 }, loose).status).toBe('outOfRange');
  });
});

describe('where nothing opens', () => {
  const sizes = BOTH.map((row, size) => ({
    ...row,
    finished: { ...row.finished, neckOpening: 560 + 10 * size, cuffOpening: 210 },
  }));
  const body = { ...OWN, head: 575, hand: 205 };

  it('an opening smaller than what must pass through it is told with the amount, at the zone’s size', () => {
    const found = cautionsOf(fitInput({ ...DRESS, pullOn: true }, sizes, body));
    expect(found).toContainEqual({ code: 'doesNotPass', point: 'neckOpening', zone: 'neck', amountMm: 5 });
    expect(found.map(({ point }) => point)).not.toContain('cuffOpening');
    const larger = cautionsOf(fitInput({ ...DRESS, pullOn: true }, sizes, body, { held: { neck: 2 } }));
    expect(larger.map(({ code }) => code)).not.toContain('doesNotPass');
  });

  it('and not where something opens', () => {
    for (const pullOn of [false, undefined]) {
      const garment = pullOn === undefined ? DRESS : { ...DRESS, pullOn };
      expect(cautionsOf(fitInput(garment, sizes, body)).map(({ code }) => code)).not.toContain('doesNotPass');
    }
  });
});
