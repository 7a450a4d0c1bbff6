import { describe, expect, it } from 'vitest';
import { bodyForFitting, MEASURES } from '../../../../shared/points/measures.ts';
import { POINT_IDS } from '../../../../shared/points/point-ids.ts';
import { deepFreeze } from '../../../support/fit-tables.ts';

describe('MEASURES', () => {
  it('knows every point', () => {
    expect(Object.keys(MEASURES)).toEqual([...POINT_IDS]);
  });

  it('tells girths, widths and lengths apart', () => {
    expect(MEASURES.bust.kind).toBe('girth');
    expect(MEASURES.shoulderLength.kind).toBe('width');
    expect(MEASURES.hipBackArc.kind).toBe('width');
    expect(MEASURES.backWaistLength.kind).toBe('length');
    expect(MEASURES.garmentLength.kind).toBe('length');
    expect(MEASURES.legOpening.kind).toBe('girth');
  });

  it('allows 10 mm on large girths and 5 mm on the rest', () => {
    for (const point of [
      'upperBust',
      'bust',
      'underbust',
      'waist',
      'abdomen',
      'highHip',
      'hip',
      'trunk',
    ] as const) {
      expect(MEASURES[point].tapeErrorMm).toBe(10);
    }
    for (const point of ['head', 'neck', 'thigh', 'upperArm', 'shoulderLength', 'armLength'] as const) {
      expect(MEASURES[point].tapeErrorMm).toBe(5);
    }
  });

  it('knows of which point left and right are sides, and gives them its kind', () => {
    expect(MEASURES.thighLeft).toMatchObject({ sideOf: 'thigh', kind: 'girth' });
    expect(MEASURES.shoulderLengthRight).toMatchObject({ sideOf: 'shoulderLength', kind: 'width' });
    expect(MEASURES.armLengthLeft).toMatchObject({ sideOf: 'armLength', kind: 'length' });
    expect(MEASURES.thigh.sideOf).toBeNull();
    expect(POINT_IDS.filter((point) => MEASURES[point].sideOf !== null)).toHaveLength(10);
  });

  it('knows what only a garment has', () => {
    expect(POINT_IDS.filter((point) => MEASURES[point].garmentOnly)).toEqual([
      'garmentLength',
      'sleeveLength',
      'hemGirth',
      'neckOpening',
      'waistOpening',
      'cuffOpening',
      'legOpening',
    ]);
  });
});

describe('bodyForFitting', () => {
  it('takes the larger of left and right, whichever it is', () => {
    expect(bodyForFitting({ thighLeft: 560, thighRight: 572 }).thigh).toBe(572);
    expect(bodyForFitting({ upperArmLeft: 301, upperArmRight: 290 }).upperArm).toBe(301);
  });

  it('takes the one side that is known', () => {
    expect(bodyForFitting({ shoulderLengthRight: 124 }).shoulderLength).toBe(124);
  });

  it('lets the point itself stand where it was measured too', () => {
    expect(bodyForFitting({ thigh: 550, thighLeft: 560, thighRight: 572 }).thigh).toBe(550);
  });

  it('keeps every other point, leaves out what has no length, and changes nothing it is given', () => {
    const values = deepFreeze({ bust: 960, waist: undefined, armLengthLeft: 590 });
    expect(bodyForFitting(values)).toEqual({ bust: 960, armLengthLeft: 590, armLength: 590 });
    expect(bodyForFitting({})).toEqual({});
  });
});
