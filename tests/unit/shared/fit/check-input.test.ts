import { describe, expect, it } from 'vitest';
import type { FitInput } from '../../../../shared/fit/fit.schema.ts';
import type { GarmentKind } from '../../../../shared/fit/fit-words.ts';
import { bodyPosition } from '../../../../shared/fit/body-position.ts';
import { easeProfile, evaluateAt, planFit } from '../../../../shared/fit/plan-fit.ts';
import { caseSizes, fitInput, inches } from '../../../support/fit-tables.ts';

const SIZES = caseSizes(['bust', 'waist', 'hip'], { bust: 3, waist: 2, hip: 3 });
const BODY = inches({ bust: 36, waist: 28, hip: 38 });
const input = (more: Partial<FitInput>): FitInput => ({
  ...fitInput({ kind: 'dress' }, SIZES, BODY),
  ...more,
});
/** The sizes with one of them changed. */
const sizesWith = (at: number, change: Partial<FitInput['sizes'][number]>) =>
  SIZES.map((row, index) => (index === at ? { ...row, ...change } : row));

const MISUSES: [field: string, input: FitInput][] = [
  ['sizes', input({ sizes: [] })],
  ['garment.kind', input({ garment: { kind: 'sofa' as GarmentKind } })],
  ['body.bust', input({ body: { bust: -1, waist: 700 } })],
  ['body.waist', input({ body: { bust: 900, waist: NaN, hip: 1000 } })],
  ['body.hip', input({ body: { bust: 900, hip: Infinity } })],
  ['body.bust', input({ body: { bust: 0 } })],
  ['sizes[0].body.bust', input({ sizes: sizesWith(0, { body: { bust: -900 } }) })],
  ['sizes[2].body.knee', input({ sizes: sizesWith(2, { body: { knee: NaN } }) })],
  ['sizes[5].finished.hip', input({ sizes: sizesWith(5, { finished: { bust: 900, hip: 0 } }) })],
  ['sizes[1].body.waist', input({ sizes: sizesWith(1, { body: { waist: { low: 720, high: 700 } } }) })],
  ['sizes[1].body.waist', input({ sizes: sizesWith(1, { body: { waist: { low: NaN, high: 700 } } }) })],
  ['sizes[1].label', input({ sizes: sizesWith(1, { label: '12' }) })],
  ['sizes[5].label', input({ sizes: sizesWith(5, { label: '12' }) })],
  ['held.neck', input({ held: { neck: -1 } })],
  ['held.waist', input({ held: { neck: 0, waist: 6, hip: 1 } })],
  ['held.hem', input({ held: { hem: NaN } })],
  ['preferenceMm.hip', input({ preferenceMm: { bust: 1, hip: NaN } })],
  ['tapeErrorMm.bust', input({ tapeErrorMm: { bust: -1 } })],
  ['garment.seamEdges.waist', input({ garment: { kind: 'dress', seamEdges: { waist: 0 } } })],
  ['garment.seamEdges.hip', input({ garment: { kind: 'dress', seamEdges: { waist: 4, hip: 2.5 } } })],
  ['garment.draftedStretch', input({ garment: { kind: 'dress', draftedStretch: -0.1 } })],
  ['garment.draftedBustDifferenceMm', input({ garment: { kind: 'dress', draftedBustDifferenceMm: NaN } })],
  ['fabric.stretch', input({ fabric: { structure: 'knit', stretch: -0.1 } })],
  ['fabric.usableShare', input({ fabric: { structure: 'knit', usableShare: NaN } })],
  ['fabric.shrinkLengthwise', input({ fabric: { structure: 'woven', shrinkLengthwise: NaN } })],
  [
    'layers[1].thicknessMm',
    input({
      layers: [
        { name: 'a', thicknessMm: 1 },
        { name: 'b', thicknessMm: -1 },
      ],
    }),
  ],
  ['layers[0].finishedMm.bust', input({ layers: [{ name: 'a', thicknessMm: 1, finishedMm: { bust: -1 } }] })],
];

describe('misuse', () => {
  it.each(MISUSES)('throws a RangeError that names %s', (field, misuse) => {
    const ask = [
      () => planFit(misuse),
      () => evaluateAt(misuse, {}),
      () => easeProfile(misuse),
      () => bodyPosition(misuse, 'bust'),
    ];
    for (const call of ask) {
      expect(call).toThrow(RangeError);
      expect(call).toThrow(field);
    }
  });
});

describe('what is no misuse', () => {
  it('a key without a value, a held first and last size, an empty body', () => {
    const body = { ...BODY, knee: undefined } as unknown as FitInput['body'];
    expect(planFit(input({ body })).status).toBe('planned');
    expect(planFit(input({ held: { waist: 0, hem: 5 } })).status).toBe('planned');
    expect(planFit(input({ body: {} })).status).toBe('notEnough');
  });
});
