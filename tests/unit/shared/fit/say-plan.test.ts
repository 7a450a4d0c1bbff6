import { describe, expect, it } from 'vitest';
import type { Caution, FitPlan, SizeChoice, ZonePlan } from '../../../../shared/fit/fit.schema.ts';
import type { ZoneId } from '../../../../shared/fit/fit-words.ts';
import { sayNode, sayPlan, sayZones } from '../../../../shared/fit/say-plan.ts';
import type { SayContext } from '../../../../shared/fit/say-words.ts';

const SIZES = ['6', '8', '10', '12', '14', '16', '18', '20', '22'];
const context: SayContext = { unit: 'cm', chestWord: 'bust', sizes: SIZES };

/** A size by its label; `16–18` lies half-way between two. */
function size(label: string, labels: readonly string[] = SIZES): SizeChoice {
  const [smaller = '', larger] = label.split('–');
  if (larger === undefined) return { label, position: labels.indexOf(label) };
  return { label, position: labels.indexOf(smaller) + 0.5, between: { smaller, larger } };
}

function zones(sizes: Partial<Record<ZoneId, string>>, labels: readonly string[] = SIZES): ZonePlan[] {
  return Object.entries(sizes).map(([zone, label]) => ({
    zone: zone as ZoneId,
    size: size(label, labels),
    governedBy: null,
  }));
}

function plan(sizes: Partial<Record<ZoneId, string>>, more: Partial<FitPlan> = {}): FitPlan {
  return {
    status: 'planned',
    zones: zones(sizes),
    points: [],
    options: [],
    blends: [],
    alterations: [],
    certainty: null,
    reasons: [],
    cautions: [],
    ...more,
  };
}

describe('sayPlan', () => {
  it('says one size throughout', () => {
    expect(sayPlan(plan({ shoulder: '14', bust: '14', waist: '14', hip: '14' }), context)).toBe(
      'Cut 14 throughout.',
    );
  });

  it('runs out where the garment gets larger downwards', () => {
    expect(sayPlan(plan({ shoulder: '16', bust: '16', waist: '18', hip: '18', hem: '18' }), context)).toBe(
      'Cut 16 to the bust, then run out to 18 from the waist down.',
    );
  });

  it('says in words where the line lies halfway between two sizes: throughout, first, in the middle, last, apart', () => {
    expect(sayPlan(plan({ shoulder: '16–18', bust: '16–18', hip: '16–18' }), context)).toBe(
      'Cut halfway between 16 and 18 throughout.',
    );
    expect(sayPlan(plan({ shoulder: '14–16', bust: '14–16', waist: '16', hip: '16' }), context)).toBe(
      'Cut halfway between 14 and 16 to the bust, then run out to 16 from the waist down.',
    );
    expect(sayPlan(plan({ bust: '14', waist: '14–16', hip: '16', hem: '16' }), context)).toBe(
      'Cut 14 at the bust, then run out to halfway between 14 and 16 at the waist and 16 from the hip down.',
    );
    expect(sayPlan(plan({ bust: '18', waist: '18', hip: '16–18', hem: '16–18' }), context)).toBe(
      'Cut 18 to the waist, then come in to halfway between 16 and 18 from the hip down.',
    );
    expect(sayPlan(plan({ neck: '16–18', shoulder: '16', sleeve: '18', bust: '16' }), context)).toBe(
      'Cut 16, with the sleeve in 18 and the neck halfway between 16 and 18.',
    );
  });

  it('comes in where it gets smaller', () => {
    expect(sayPlan(plan({ shoulder: '18', bust: '18', waist: '18', hip: '14', hem: '14' }), context)).toBe(
      'Cut 18 to the waist, then come in to 14 from the hip down.',
    );
  });

  it('joins steps in the same direction', () => {
    expect(sayPlan(plan({ shoulder: '12', bust: '12', waist: '14', hip: '16', hem: '16' }), context)).toBe(
      'Cut 12 to the bust, then run out to 14 at the waist and 16 from the hip down.',
    );
    expect(sayPlan(plan({ shoulder: '10', bust: '12', waist: '14', hip: '16' }), context)).toBe(
      'Cut 10 at the shoulder, then run out to 12 at the bust, 14 at the waist and 16 from the hip down.',
    );
  });

  it('says both directions where they differ, and the stretch of a run in the middle', () => {
    expect(sayPlan(plan({ shoulder: '14', bust: '16', waist: '16', hip: '14', hem: '14' }), context)).toBe(
      'Cut 14 at the shoulder, run out to 16 from the bust to the waist, then come in to 14 from the hip down.',
    );
  });

  it('says the hem alone at the hem', () => {
    expect(sayPlan(plan({ waist: '14', hip: '14', hem: '16' }), context)).toBe(
      'Cut 14 to the hip, then run out to 16 at the hem.',
    );
  });

  it('says the sleeve and the neck where they leave the shoulder’s size, and not where they keep it', () => {
    expect(
      sayPlan(plan({ neck: '12', shoulder: '14', sleeve: '16', bust: '14', waist: '14' }), context),
    ).toBe('Cut 14, with the sleeve in 16 and the neck in 12.');
    expect(
      sayPlan(plan({ neck: '14', shoulder: '14', sleeve: '14', bust: '14', waist: '16' }), context),
    ).toBe('Cut 14 to the bust, then run out to 16 from the waist down.');
  });

  it('does not depend on the order of the zones', () => {
    expect(sayPlan(plan({ hip: '18', waist: '18', bust: '16', shoulder: '16' }), context)).toBe(
      'Cut 16 to the bust, then run out to 18 from the waist down.',
    );
  });

  it('speaks of the chest where that is the person’s word', () => {
    expect(
      sayPlan(plan({ shoulder: '16', bust: '16', waist: '18' }), { ...context, chestWord: 'chest' }),
    ).toBe('Cut 16 to the chest, then run out to 18 from the waist down.');
  });

  it('takes size labels of letters, and of numbers with letters', () => {
    const letters = ['S', 'M', 'L'];
    const mixed = { ...plan({}), zones: zones({ bust: 'M', waist: 'L' }, letters) };
    expect(sayPlan(mixed, { ...context, sizes: letters })).toBe(
      'Cut M at the bust, then run out to L from the waist down.',
    );
    const jis = ['7AR', '9AR', '11AR'];
    expect(
      sayPlan({ ...plan({}), zones: zones({ bust: '9AR', hip: '9AR' }, jis) }, { ...context, sizes: jis }),
    ).toBe('Cut 9AR throughout.');
  });

  it('says that an own garment has one size', () => {
    const one = ['own'];
    expect(sayPlan({ ...plan({}), zones: zones({ bust: 'own' }, one) }, { ...context, sizes: one })).toBe(
      'There is one size, own: cut it as it is.',
    );
  });
});

describe('sayPlan, where the sizes end', () => {
  const beyond = (
    code: 'beyondLargest' | 'beyondSmallest',
    point: 'hip' | 'waist',
    amountMm: number,
  ): Caution => ({
    code,
    point,
    amountMm,
  });

  it('says where, by how much in the person’s unit, and the nearest', () => {
    const end = plan(
      { waist: '22', hip: '22' },
      { status: 'outOfRange', cautions: [beyond('beyondLargest', 'hip', 34)] },
    );
    expect(sayPlan(end, context)).toBe(
      'This pattern’s sizes end at 22; the hip is 3.4 cm beyond it: the nearest is 22.',
    );
    expect(sayPlan(end, { ...context, unit: 'mm' })).toContain('the hip is 34 mm beyond it');
    expect(sayPlan(end, { ...context, unit: 'in' })).toContain('the hip is 1 5/16 in beyond it');
  });

  it('says every point that lies beyond', () => {
    const end = plan(
      { waist: '22', hip: '22' },
      {
        status: 'outOfRange',
        cautions: [beyond('beyondLargest', 'waist', 21), beyond('beyondLargest', 'hip', 34)],
      },
    );
    expect(sayPlan(end, context)).toContain('the waist is 2.1 cm and the hip is 3.4 cm beyond it');
  });

  it('says where they begin', () => {
    const end = plan(
      { waist: '6', hip: '6' },
      { status: 'outOfRange', cautions: [beyond('beyondSmallest', 'waist', -25)] },
    );
    expect(sayPlan(end, context)).toBe(
      'This pattern’s sizes begin at 6; the waist is 2.5 cm before it: the nearest is 6.',
    );
  });

  it('gives the nearest blend where the nearest is not one size', () => {
    const end = plan(
      { bust: '20', waist: '22', hip: '22' },
      { status: 'outOfRange', cautions: [beyond('beyondLargest', 'hip', 34)] },
    );
    expect(sayPlan(end, context)).toBe(
      'This pattern’s sizes end at 22; the hip is 3.4 cm beyond it. Nearest: cut 20 at the bust, then run out to 22 from the waist down.',
    );
  });
});

describe('sayPlan, where too little is known', () => {
  it('asks for the measurement that is missing', () => {
    const missing = plan({}, { status: 'notEnough', cautions: [{ code: 'notMeasured', point: 'hip' }] });
    expect(sayPlan(missing, context)).toBe('Measure the hip first: nothing else chooses a size here.');
  });

  it('offers several where any of them would do', () => {
    const missing = plan(
      {},
      {
        status: 'notEnough',
        cautions: [
          { code: 'notMeasured', point: 'bust' },
          { code: 'notMeasured', point: 'waist' },
          { code: 'notMeasured', point: 'hip' },
        ],
      },
    );
    expect(sayPlan(missing, context)).toBe(
      'Measure the bust, waist or hip first: any one of them lets a size be chosen.',
    );
  });

  it('refuses a knit in words', () => {
    const knit = plan({}, { status: 'notEnough', cautions: [{ code: 'knitNotReckoned' }] });
    expect(sayPlan(knit, context)).toContain('cannot reckon a knit yet');
  });
});

describe('sayZones', () => {
  it('is the phrase without the verb', () => {
    expect(sayZones(zones({ bust: '16', waist: '18' }), context)).toBe(
      '16 at the bust, then run out to 18 from the waist down',
    );
  });
});

describe('sayNode', () => {
  const drafted = { easeMm: 60, leewayMm: 20, verdict: 'asDrafted' as const };

  it('reads as one breath', () => {
    expect(sayNode({ size: size('16'), zone: 'hip', result: drafted, isHeld: false }, context)).toBe(
      '16, hip: ease 6.0 cm, as drafted',
    );
    expect(
      sayNode(
        { size: size('M'), zone: 'bust', result: { ...drafted, easeMm: null }, isHeld: false },
        context,
      ),
    ).toBe('M, bust: ease not published, as drafted');
    expect(sayNode({ size: size('M'), zone: 'hem', result: null, isHeld: false }, context)).toBe(
      'M, hem: nothing to compare',
    );
  });

  it('says a place between two sizes in words', () => {
    expect(sayNode({ size: size('16–18'), zone: 'hip', result: drafted, isHeld: false }, context)).toBe(
      'halfway between 16 and 18, hip: ease 6.0 cm, as drafted',
    );
  });

  it('says that it is held', () => {
    expect(sayNode({ size: size('16'), zone: 'hip', result: drafted, isHeld: true }, context)).toMatch(
      /as drafted, held$/,
    );
  });
});
