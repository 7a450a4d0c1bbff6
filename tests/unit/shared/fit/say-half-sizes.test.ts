import { describe, expect, it } from 'vitest';
import type { Blend, FitPlan, SizeChoice } from '../../../../shared/fit/fit.schema.ts';
import { planFit } from '../../../../shared/fit/plan-fit.ts';
import { sayBeforeCutting, sayBlend, sayOption } from '../../../../shared/fit/say-cutting.ts';
import { sayReasons } from '../../../../shared/fit/say-reasons.ts';
import { sayInSize, saySize, type SayContext } from '../../../../shared/fit/say-words.ts';
import { bodyOf, caseSizes, fitInput } from '../../../support/fit-tables.ts';

const SIZES = caseSizes(['bust', 'waist', 'hip'], { bust: 3, waist: 1.5, hip: 3 });
const context: SayContext = { unit: 'cm', chestWord: 'bust', sizes: SIZES.map(({ label }) => label) };
const SIXTEEN: SizeChoice = { label: '16', position: 2 };
const BETWEEN: SizeChoice = { label: '16–18', position: 2.5, between: { smaller: '16', larger: '18' } };

/** The plan of a body on size 16, with sizes held between the lines. */
function planHeld(held: FitPlanHeld): FitPlan {
  const body = bodyOf(SIZES[2]!);
  return planFit(
    fitInput({ kind: 'dress', silhouette: 'fitted' }, SIZES, body, { cutBetweenLines: true, held }),
  );
}
type FitPlanHeld = Partial<Record<FitPlan['zones'][number]['zone'], number>>;

describe('a size in words', () => {
  it('is its label, or both labels it lies between', () => {
    expect([saySize(SIXTEEN), saySize(BETWEEN)]).toEqual(['16', 'halfway between 16 and 18']);
    expect([sayInSize(SIXTEEN), sayInSize(SIXTEEN, 'at'), sayInSize(BETWEEN, 'at')]).toEqual([
      'in 16',
      'at 16',
      'halfway between 16 and 18',
    ]);
  });
});

describe('cutting between the lines in words', () => {
  const blend: Blend = {
    fromZone: 'bust',
    toZone: 'waist',
    from: SIXTEEN,
    to: BETWEEN,
    point: 'waist',
    changeMm: 25.4,
    edges: 4,
    perEdgeMm: 6.35,
    overMm: 160,
    overIsAssumed: false,
    angleDegrees: 2,
  };

  it('meets a line halfway between two, or leaves one', () => {
    expect(sayBlend(blend, context)).toEqual({
      title: 'Bust to waist: 16 to 16–18',
      words:
        'Leave the 16 line at the underarm and meet the line halfway between 16 and 18 at the waist: 0.6 cm out on each of 4 edges over 16.0 cm.',
    });
    expect(sayBlend({ ...blend, from: BETWEEN, to: SIXTEEN }, context).words).toMatch(
      /^Leave the line halfway between 16 and 18 at the underarm and meet the 16 line at the waist/,
    );
  });

  it('cuts neck and sleeve there as pieces of their own', () => {
    const at = (zone: 'neck' | 'sleeve', from: SizeChoice, to: SizeChoice) =>
      sayBlend({ ...blend, fromZone: 'shoulder', toZone: zone, from, to }, context).words;
    expect(at('neck', SIXTEEN, BETWEEN)).toMatch(
      /^Cut the neckline, and the collar or facing with it, halfway between 16 and 18; meet the 16 line along/,
    );
    expect(at('neck', BETWEEN, SIXTEEN)).toMatch(/, in 16; meet the line halfway between 16 and 18 along/);
    expect(at('sleeve', BETWEEN, SIXTEEN)).toMatch(/^Keep the sleeve cap halfway between 16 and 18 to go/);
    expect(at('sleeve', SIXTEEN, BETWEEN)).toMatch(
      /meet the line halfway between 16 and 18 at the upper arm/,
    );
  });

  it('says first how to draw a line that is not printed, each once', () => {
    const draw = (held: FitPlanHeld) => sayBeforeCutting(planHeld(held), context)[0] ?? '';
    const all = { shoulder: 2.5, bust: 2.5, waist: 2.5, hip: 2.5 };
    expect(draw(all)).toMatch(/^Draw the line halfway between 16 and 18: mark the middle of the gap/);
    expect(draw({ ...all, hip: 3.5 })).toMatch(
      /^Draw the lines halfway between 16 and 18 and halfway between 18 and 20: mark/,
    );
    expect(draw({ bust: 2, waist: 2, hip: 2 })).not.toContain('Draw the line');
  });

  it('names what is held and what an option is', () => {
    const plan = planHeld({ hip: 2.5 });
    expect(sayReasons(plan, context)[0]?.words).toBe(
      'Held by you: hip halfway between 16 and 18. The rest is planned round it.',
    );
    const [option] = planHeld({ shoulder: 2.5, bust: 2.5, waist: 2.5, hip: 2.5 }).options;
    expect(option && sayOption(option, context).title).toBe('Halfway between 16 and 18 throughout');
  });
});
