import { describe, expect, it } from 'vitest';
import { GARMENT_KINDS, ZONE_IDS } from '../../../../shared/fit/fit-words.ts';
import {
  garmentPoints,
  hasWaistband,
  isGarmentKind,
  joinLimits,
  zonesOf,
  zoneTree,
} from '../../../../shared/fit/garments.ts';
import { MEASURES } from '../../../../shared/points/measures.ts';

const roles = (...args: Parameters<typeof garmentPoints>) =>
  Object.fromEntries(garmentPoints(...args).map(({ point, role }) => [point, role]));

describe('zonesOf', () => {
  it('runs from neck to hem', () => {
    expect(zonesOf('dress')).toEqual(['neck', 'shoulder', 'sleeve', 'bust', 'waist', 'hip', 'hem']);
    expect(zonesOf('trousers')).toEqual(['waist', 'hip', 'thigh', 'knee', 'hem']);
    expect(zonesOf('jumpsuit')).toEqual(ZONE_IDS);
    expect(zonesOf('waistcoat')).not.toContain('sleeve');
    expect(zonesOf('dungarees')).toEqual(['bust', 'waist', 'hip', 'thigh', 'knee', 'hem']);
  });
});

describe.each(GARMENT_KINDS)('a %s', (kind) => {
  it('is one tree: the first zone hangs on nothing, every other on one that stands before it', () => {
    const tree = zoneTree(kind);
    expect(tree.map(({ zone }) => zone).sort()).toEqual([...zonesOf(kind)].sort());
    tree.forEach(({ parent }, index) => {
      const above = tree.slice(0, index).map(({ zone }) => zone);
      if (index === 0) expect(parent).toBeNull();
      else expect(above).toContain(parent);
    });
  });

  it('has a join for every zone but the first, with a limit', () => {
    const joins = joinLimits(kind);
    expect(joins).toHaveLength(zonesOf(kind).length - 1);
    for (const { limit } of joins) expect(limit).toBeGreaterThanOrEqual(1);
  });

  it('has points that a body has, each once, none of them a length, in the order of its zones', () => {
    const points = garmentPoints(kind);
    expect(new Set(points.map(({ point }) => point)).size).toBe(points.length);
    for (const { point } of points) {
      expect(MEASURES[point].kind).not.toBe('length');
      expect(MEASURES[point].garmentOnly).toBe(false);
    }
    const order = points.map(({ zone }) => zonesOf(kind).indexOf(zone));
    expect(order).toEqual([...order].sort((a, b) => a - b));
  });

  it('has something that governs', () => {
    const found = Object.values(roles(kind, 'fitted'));
    expect(found).toContain('governing');
  });
});

describe('joinLimits', () => {
  it('keeps an armhole to one size, a neckline to two, waist to hip to three and every other join to two', () => {
    const limits = Object.fromEntries(
      joinLimits('jumpsuit').map(({ from, to, limit }) => [`${from}-${to}`, limit]),
    );
    expect(limits).toEqual({
      'shoulder-neck': 2,
      'shoulder-sleeve': 1,
      'shoulder-bust': 1,
      'bust-waist': 2,
      'waist-hip': 3,
      'hip-thigh': 2,
      'thigh-knee': 2,
      'knee-hem': 2,
    });
  });

  it('joins a hem to the last zone that the garment has', () => {
    expect(joinLimits('skirt').at(-1)).toEqual({ from: 'hip', to: 'hem', limit: 2 });
    expect(joinLimits('shorts').at(-1)).toEqual({ from: 'thigh', to: 'hem', limit: 2 });
  });
});

describe('garmentPoints', () => {
  it('chooses tops by the bust, trousers by the hip, full skirts by the waist, capes by neck and shoulder', () => {
    expect(roles('dress')).toMatchObject({ bust: 'governing', waist: 'fitted', hip: 'fitted' });
    expect(roles('trousers')).toMatchObject({ hip: 'governing', waist: 'fitted' });
    expect(roles('fullSkirt')).toMatchObject({ waist: 'governing', hip: 'loose' });
    expect(roles('cape')).toMatchObject({ neck: 'governing', shoulderWidth: 'governing', bust: 'loose' });
  });

  it.each(['loose', 'veryLoose'] as const)(
    'makes bust, waist and hip of a %s garment loose',
    (silhouette) => {
      expect(roles('dress', silhouette)).toMatchObject({
        bust: 'loose',
        waist: 'loose',
        hip: 'loose',
        upperBust: 'governing',
        neck: 'fitted',
      });
    },
  );

  it.each(['close', 'fitted', 'semiFitted'] as const)('leaves them as they are in a %s one', (silhouette) => {
    expect(roles('dress', silhouette)).toEqual(roles('dress'));
  });

  it('makes them loose in a garment worn open', () => {
    expect(roles('jacket', 'fitted', 'open')).toMatchObject({ bust: 'loose', waist: 'loose', hip: 'loose' });
    expect(roles('jacket', 'fitted', 'closed')).toMatchObject({ bust: 'governing' });
  });

  it('leaves a waistband fitted however loose what hangs below it', () => {
    expect(roles('trousers', 'veryLoose')).toMatchObject({ waist: 'fitted', hip: 'loose' });
    expect(roles('fullSkirt', 'veryLoose')).toMatchObject({ waist: 'governing' });
    expect(hasWaistband('trousers')).toBe(true);
    expect(hasWaistband('dress')).toBe(false);
  });
});

describe('isGarmentKind', () => {
  it('knows the kinds and nothing else', () => {
    for (const kind of GARMENT_KINDS) expect(isGarmentKind(kind)).toBe(true);
    expect(isGarmentKind('sofa')).toBe(false);
    expect(isGarmentKind('')).toBe(false);
  });
});
