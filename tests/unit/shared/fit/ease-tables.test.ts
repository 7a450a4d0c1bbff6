import { describe, expect, it } from 'vitest';
import { GARMENT_KINDS, SILHOUETTES } from '../../../../shared/fit/fit-words.ts';
import { targetEase, targetEaseMm } from '../../../../shared/fit/target-ease.ts';
import { wearingEase } from '../../../../shared/fit/wearing-ease.ts';
import { POINT_IDS } from '../../../../shared/points/point-ids.ts';

const ALL = GARMENT_KINDS.flatMap((kind) => POINT_IDS.map((point) => ({ kind, point })));

describe('wearingEase', () => {
  it('has a source and a standing for every figure, and a low end that does not exceed the high', () => {
    const figures = ALL.flatMap(({ kind, point }) => wearingEase(kind, point) ?? []);
    expect(figures.length).toBeGreaterThan(60);
    for (const { source, standing, lowMm, highMm } of figures) {
      expect(source.length).toBeGreaterThan(10);
      expect(lowMm).toBeGreaterThanOrEqual(0);
      expect(highMm ?? Infinity).toBeGreaterThanOrEqual(lowMm);
      if (source.startsWith('common practice')) expect(standing).toBe('commonPractice');
    }
  });

  it('has the figures of the handbooks, in mm', () => {
    expect(wearingEase('trousers', 'thigh')).toMatchObject({
      lowMm: 25.4,
      highMm: 50.8,
      standing: 'published',
    });
    expect(wearingEase('dress', 'bust')?.lowMm).toBeCloseTo(38.1, 9);
    expect(wearingEase('shirt', 'upperArm')).toMatchObject({ lowMm: 50.8, highMm: null });
    expect(wearingEase('skirt', 'hip')).toMatchObject({ lowMm: 50.8 });
  });

  it('has no figure where no handbook gives one, so that there is no floor', () => {
    expect(wearingEase('dress', 'neck')).toBeNull();
    expect(wearingEase('dress', 'backWaistLength')).toBeNull();
    expect(wearingEase('swimwear', 'hip')).toBeNull();
  });
});

describe('targetEase', () => {
  it('grows from one silhouette to the next, and marks what is from memory', () => {
    for (const [kind, point] of [
      ['dress', 'bust'],
      ['jacket', 'bust'],
      ['coat', 'bust'],
      ['trousers', 'hip'],
    ] as const) {
      let last = -1;
      for (const silhouette of SILHOUETTES) {
        const target = targetEase(kind, silhouette, point);
        if (!target) continue;
        expect(target.standing).toBe('fromMemory');
        expect(targetEaseMm(target)).toBeGreaterThan(last);
        last = targetEaseMm(target);
      }
      expect(last).toBeGreaterThan(100);
    }
  });

  it('is the middle of the range, or its beginning where it has no end', () => {
    expect(targetEaseMm({ lowMm: 76.2, highMm: 101.6 })).toBeCloseTo(88.9, 9);
    expect(targetEaseMm({ lowMm: 203.2, highMm: null })).toBe(203.2);
  });

  it('has none for the waist of a boxy shirt, for a close jacket, or without a silhouette', () => {
    expect(targetEase('shirt', 'loose', 'waist')).toBeNull();
    expect(targetEase('jacket', 'close', 'bust')).toBeNull();
    expect(targetEase('dress', undefined, 'bust')).toBeNull();
  });

  it('gives a waistband its wearing ease in every silhouette, marked as common practice', () => {
    expect(targetEase('trousers', 'veryLoose', 'waist')).toMatchObject({
      standing: 'commonPractice',
      highMm: 25.4,
    });
    expect(targetEase('skirt', undefined, 'waist')).not.toBeNull();
  });

  it('has the trade’s loose cape: 4 in at the bust and 12 in at the hip', () => {
    expect(targetEase('cape', 'loose', 'bust')).toMatchObject({ lowMm: 101.6, standing: 'commonPractice' });
    expect(targetEase('cape', 'loose', 'hip')?.lowMm).toBeCloseTo(304.8, 9);
  });
});
