import { describe, expect, it } from 'vitest';
import type { Blend, Caution, FitPlan, PointResult, Reason } from '../../../../shared/fit/fit.schema.ts';
import { CAUTION_CODES, REASON_CODES } from '../../../../shared/fit/fit-words.ts';
import { sayBorderline, sayCautions, sayWatch } from '../../../../shared/fit/say-cautions.ts';
import { sayBeforeCutting, sayBlend, sayGivenUp, sayOption } from '../../../../shared/fit/say-cutting.ts';
import { sayNotes } from '../../../../shared/fit/say-notes.ts';
import { sayProfile } from '../../../../shared/fit/say-profile.ts';
import { sayReasons } from '../../../../shared/fit/say-reasons.ts';
import type { SayContext } from '../../../../shared/fit/say-words.ts';

const context: SayContext = { unit: 'cm', chestWord: 'bust', sizes: ['14', '16', '18', '20'] };

const point = (more: Partial<PointResult> & Pick<PointResult, 'point'>): PointResult => ({
  zone: 'hip',
  size: { label: '16', position: 1 },
  bodyMm: 1000,
  chartMm: 990,
  finishedMm: 1060,
  easeMm: 60,
  draftedEaseMm: 70,
  floorMm: 20,
  leewayMm: 40,
  deviationMm: 10,
  verdict: 'asDrafted',
  borderline: false,
  ...more,
});

const plan = (more: Partial<FitPlan> = {}): FitPlan => ({
  status: 'planned',
  zones: [{ zone: 'hip', size: { label: '16', position: 1 }, governedBy: 'hip' }],
  points: [],
  options: [],
  blends: [],
  alterations: [],
  certainty: null,
  reasons: [],
  cautions: [],
  ...more,
});

const blend: Blend = {
  fromZone: 'bust',
  toZone: 'waist',
  from: { label: '16', position: 1 },
  to: { label: '18', position: 2 },
  point: 'waist',
  changeMm: 52,
  edges: 4,
  perEdgeMm: 13,
  overMm: 160,
  overIsAssumed: true,
  angleDegrees: 4.6,
};

const said = [
  ...sayCautions(
    CAUTION_CODES.map((code): Caution => ({ code, point: 'hip', zone: 'hip', amountMm: 34 })),
    context,
  ),
  ...sayReasons(
    plan({ reasons: REASON_CODES.map((code): Reason => ({ code, point: 'hip', zone: 'hip' })) }),
    context,
  ),
];

describe('cautions and reasons', () => {
  it('have a sentence for every code', () => {
    expect(new Set(said.map((each) => each.code))).toEqual(new Set([...CAUTION_CODES, ...REASON_CODES]));
    for (const { words } of said) expect(words).toMatch(/^[A-Z].*\.$/s);
  });

  it('never call a body wrong, and hold no code', () => {
    for (const { words } of said) {
      expect(words).not.toMatch(/\b(too|problem|ideal|normal|flattering|wrong|out of range|women|men)\b/i);
      expect(words).not.toMatch(/[a-z][A-Z]|undefined|NaN|\{|\bnull\b/);
    }
  });

  it('hold without a point, a zone or an amount', () => {
    for (const { words } of sayCautions(
      CAUTION_CODES.map((code): Caution => ({ code })),
      context,
    )) {
      expect(words).not.toMatch(/undefined|NaN/);
    }
  });

  it('say the same code once, with all its points', () => {
    const cautions: Caution[] = [
      { code: 'easeUnknown', point: 'waist' },
      { code: 'easeUnknown', point: 'hip' },
    ];
    expect(sayCautions(cautions, context)).toHaveLength(1);
    expect(sayCautions(cautions, context)[0]?.words).toContain('waist and hip');
  });

  it('say less than wearing ease in the person’s unit', () => {
    const words = (unit: SayContext['unit']) =>
      sayCautions([{ code: 'belowFloor', point: 'upperArm', amountMm: -11 }], { ...context, unit })[0]?.words;
    expect(words('cm')).toBe('The upper arm has 1.1 cm less than wearing ease.');
    expect(words('in')).toBe('The upper arm has 7/16 in less than wearing ease.');
  });

  it('say the ends of the sizes, and of one size only what it is drafted for', () => {
    const cautions: Caution[] = [{ code: 'beyondLargest', point: 'hip', amountMm: 60 }];
    expect(sayCautions(cautions, context)[0]?.words).toBe(
      'This pattern’s sizes end at 20: the hip is 6.0 cm beyond it.',
    );
    expect(sayCautions(cautions, { ...context, sizes: ['my coat'] })[0]?.words).toBe(
      'The hip is 6.0 cm more than my coat is drafted for.',
    );
  });

  it('say it once for several points', () => {
    const cautions: Caution[] = [
      { code: 'belowFloor', point: 'waist', amountMm: 29 },
      { code: 'belowFloor', point: 'hip', amountMm: 186 },
    ];
    expect(sayCautions(cautions, context)[0]?.words).toBe(
      'Less than wearing ease: waist by 2.9 cm and hip by 18.6 cm.',
    );
  });

  it('name the size that is held', () => {
    expect(sayReasons(plan({ reasons: [{ code: 'held', zone: 'hip' }] }), context)[0]?.words).toContain(
      'hip 16',
    );
  });
});

describe('sayWatch', () => {
  it('puts what to watch before what to note, and does not repeat the answer', () => {
    const words = sayWatch(
      plan({
        status: 'outOfRange',
        cautions: [
          { code: 'easeUnknown', point: 'waist' },
          { code: 'beyondLargest', point: 'hip', amountMm: 34 },
          { code: 'belowFloor', point: 'waist', amountMm: 4 },
        ],
      }),
      context,
    ).map((each) => each.code);
    expect(words).toEqual(['belowFloor', 'easeUnknown']);
  });

  it('asks for another measuring where the tape could turn the verdict', () => {
    const words = sayBorderline([point({ point: 'hip', borderline: true, leewayMm: 9 })], context)?.words;
    expect(words).toBe('Measure the hip again first: 0.9 cm of leeway is no more than a tape can be out.');
    expect(sayBorderline([point({ point: 'hip', borderline: true, leewayMm: -2 })], context)?.words).toBe(
      'Measure the hip again first: 0.2 cm is no more than a tape can be out.',
    );
    const two = [
      point({ point: 'hip', borderline: true, leewayMm: 9 }),
      point({ point: 'waist', borderline: true, leewayMm: 4 }),
    ];
    expect(sayBorderline(two, context)?.words).toBe(
      'Measure the waist and hip again first: they lie so near wearing ease that the tape alone could decide.',
    );
    expect(sayBorderline([point({ point: 'hip' })], context)).toBeNull();
  });
});

describe('sayNotes', () => {
  it('says what to watch first, then what was given up, and last what only explains', () => {
    const codes = sayNotes(
      plan({
        reasons: [
          { code: 'governs', point: 'hip', zone: 'hip' },
          { code: 'oneSizeIsEnough', point: 'waist', zone: 'waist' },
        ],
        cautions: [
          { code: 'easeUnknown', point: 'waist' },
          { code: 'belowFloor', point: 'hip', amountMm: 4 },
        ],
      }),
      context,
    ).map((each) => each.code);
    expect(codes).toEqual(['belowFloor', 'oneSizeIsEnough', 'easeUnknown', 'governs']);
  });
});

describe('sayBlend', () => {
  it('says where to leave one line and meet the other, by how much an edge and over what length', () => {
    expect(sayBlend(blend, context)).toEqual({
      title: 'Bust to waist: 16 to 18',
      words:
        'Leave the 16 line at the underarm and meet the 18 line at the waist: 1.3 cm out on each of 4 edges over 16.0 cm (assumed).',
    });
  });

  it('comes in where the change is negative', () => {
    expect(sayBlend({ ...blend, perEdgeMm: -13 }, context).words).toContain('1.3 cm in on each of 4 edges');
  });

  it('does not call a known length assumed', () => {
    expect(sayBlend({ ...blend, overIsAssumed: false }, context).words).not.toContain('assumed');
    expect(sayBlend({ ...blend, overMm: null }, context).words).toMatch(/edges\.$/);
  });

  it('says the sleeve and the neck as pieces of their own', () => {
    expect(sayBlend({ ...blend, fromZone: 'shoulder', toZone: 'sleeve' }, context).words).toContain(
      'sleeve cap in 16',
    );
    expect(sayBlend({ ...blend, fromZone: 'shoulder', toZone: 'neck' }, context).words).toContain(
      'Cut the neckline, and the collar or facing with it, in 18',
    );
  });
});

describe('sayOption', () => {
  it('says what is given up, point by point', () => {
    const option = {
      kind: 'oneSize' as const,
      zones: plan().zones,
      points: [
        point({ point: 'waist', verdict: 'belowFloor', leewayMm: -4 }),
        point({ point: 'hip', verdict: 'closer', deviationMm: 30 }),
      ],
      alterations: [],
      blends: [],
      cost: 3,
    };
    expect(sayOption(option, context)).toEqual({
      title: '16 throughout',
      costs: 'No line to blend. Waist 0.4 cm less than wearing ease; hip 3.0 cm closer than drafted.',
    });
  });

  it('says when nothing is given up, and when nothing can be judged', () => {
    expect(sayGivenUp([point({ point: 'hip' })], context)).toBe('Every point as drafted.');
    expect(sayGivenUp([], context)).toBe('Nothing here can be held against the draft.');
  });
});

describe('sayBeforeCutting', () => {
  it('begins with the point that has less than wearing ease', () => {
    const words = sayBeforeCutting(
      plan({ points: [point({ point: 'upperArm', verdict: 'belowFloor', leewayMm: -11 })] }),
      context,
    );
    expect(words[0]).toContain('upper arm');
    expect(words[0]).toContain('1.1 cm');
    expect(words.at(-1)).toContain('test square');
    expect(words.join(' ')).not.toContain('meant for');
    expect(sayBeforeCutting(plan(), context, 'washed linen.')).toContain(
      'The pattern is meant for washed linen.',
    );
  });
});

describe('sayProfile', () => {
  it('says the range and the first size with wearing ease', () => {
    expect(sayProfile('hip', [-20, 20, 60, 100], 25, context)).toBe(
      'At the hip, ease runs from −2.0 cm at size 14 to 10.0 cm at size 20. 18 is the first size with wearing ease (2.5 cm).',
    );
  });

  it('says where no size has it, and where nothing is published', () => {
    expect(sayProfile('hip', [-20, -10, 0, 10], 25, context)).toContain('No size leaves wearing ease');
    expect(sayProfile('hip', [null, null, null, null], 25, context)).toContain('not published in any size');
  });
});
