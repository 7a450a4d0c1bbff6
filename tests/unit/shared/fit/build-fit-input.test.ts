import { describe, expect, it } from 'vitest';
import { buildFitInput } from '../../../../shared/fit/build-fit-input.ts';
import type { FitSources } from '../../../../shared/fit/build-fit-input.ts';
import { fitInputSchema } from '../../../../shared/fit/fit.schema.ts';
import { planFit } from '../../../../shared/fit/plan-fit.ts';
import { deepFreeze } from '../../../support/fit-tables.ts';

const measured = (mm: number) => ({ typed: String(mm), unit: 'mm' as const, mm });
const SOURCES: FitSources = deepFreeze({
  pattern: {
    kind: 'trousers',
    silhouette: 'fitted',
    structure: 'woven',
    worn: 'closed',
    seamEdges: { hip: 6 },
    compareAs: { waist: 'highHip' },
  },
  table: {
    sizes: ['S', 'M', 'L'],
    chart: [
      { point: 'highHip', mm: [{ low: 800, high: 850 }, 880, null] },
      { point: 'hip', mm: [900, 950, 1000] },
    ],
    finished: [{ point: 'thigh', mm: [null, 620, 650] }],
  },
  values: { hip: measured(950), highHip: measured(880), thighLeft: measured(570), thighRight: measured(560) },
  takenBy: 'another',
  options: {},
});

describe('buildFitInput', () => {
  it('puts the table’s columns into rows and leaves empty cells out', () => {
    expect(buildFitInput(SOURCES).sizes).toEqual([
      { label: 'S', body: { highHip: { low: 800, high: 850 }, hip: 900 }, finished: {} },
      { label: 'M', body: { highHip: 880, hip: 950 }, finished: { thigh: 620 } },
      { label: 'L', body: { hip: 1000 }, finished: { thigh: 650 } },
    ]);
  });

  it('fits the larger side, and keeps who measured', () => {
    expect(buildFitInput(SOURCES).body).toMatchObject({ hip: 950, highHip: 880, thigh: 570 });
    expect(buildFitInput(SOURCES).takenBy).toBe('another');
  });

  it('carries what the pattern says of the garment', () => {
    expect(buildFitInput(SOURCES).garment).toEqual({
      kind: 'trousers',
      silhouette: 'fitted',
      worn: 'closed',
      seamEdges: { hip: 6 },
      compareAs: { waist: 'highHip' },
    });
  });

  it('is an input by the schema, and the engine answers it', () => {
    const input = buildFitInput(SOURCES);
    expect(fitInputSchema.safeParse(input).success).toBe(true);
    expect(planFit(input).status).toBe('planned');
  });

  it('lets what is set for the plan override the pattern', () => {
    const options = {
      silhouette: 'loose',
      fabric: { structure: 'woven', shrinkCrosswise: 0.02 },
      held: { hip: 2 },
      lean: 'closer',
    } as const;
    const input = buildFitInput({ ...SOURCES, options });
    expect(input.garment.silhouette).toBe('loose');
    expect(input.fabric).toEqual(options.fabric);
    expect(input).toMatchObject({ held: { hip: 2 }, lean: 'closer' });
  });

  it('takes the cloth that the pattern is meant for, unless told: a knit is then refused in words', () => {
    const knit: FitSources = { ...SOURCES, pattern: { ...SOURCES.pattern, structure: 'knit' } };
    expect(planFit(buildFitInput(knit)).cautions).toEqual([{ code: 'knitNotReckoned' }]);
    const told: FitSources = { ...knit, options: { fabric: { structure: 'woven' } } };
    expect(planFit(buildFitInput(told)).status).toBe('planned');
  });
});
