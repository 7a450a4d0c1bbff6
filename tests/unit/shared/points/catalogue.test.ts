import { describe, expect, it } from 'vitest';
import {
  CATALOGUE,
  howToTake,
  isGarmentPoint,
  MEASURING_ORDER,
  pointName,
  shortPointName,
} from '../../../../shared/points/catalogue.ts';
import { POINT_IDS } from '../../../../shared/points/point-ids.ts';

describe('the catalogue of points', () => {
  it('says of every point its name and how to take it, in one to three sentences', () => {
    for (const point of POINT_IDS) {
      expect(CATALOGUE[point].name).not.toBe('');
      const sentences = howToTake(point).match(/[.!?](?:\s|$)/g) ?? [];
      const most = /(?:Left|Right)$/.test(point) ? 4 : 3;
      expect(sentences.length, point).toBeGreaterThanOrEqual(1);
      expect(sentences.length, point).toBeLessThanOrEqual(most);
    }
  });

  it('has no two points of one name, by either word', () => {
    for (const word of ['bust', 'chest'] as const) {
      expect(new Set(POINT_IDS.map((point) => pointName(point, word))).size).toBe(POINT_IDS.length);
      expect(new Set(POINT_IDS.map((point) => shortPointName(point, word))).size).toBe(POINT_IDS.length);
    }
  });

  it('uses the person’s word: bust or chest, in names and in how to take', () => {
    expect(pointName('bust', 'bust')).toBe('Bust girth');
    expect(pointName('bust', 'chest')).toBe('Chest girth');
    expect(pointName('upperBust', 'chest')).toBe('Upper chest girth');
    expect(pointName('hip', 'chest')).toBe('Hip girth');
    for (const point of POINT_IDS) {
      const text = `${pointName(point, 'chest')} ${shortPointName(point, 'chest')} ${howToTake(point, 'chest')}`;
      expect(text, point).not.toMatch(/\bbust|[{}]/i);
    }
  });

  it('puts every point of a body once into the order of measuring, the waist first, and no garment point', () => {
    const ofBody = POINT_IDS.filter((point) => !isGarmentPoint(point));
    expect([...MEASURING_ORDER].sort()).toEqual([...ofBody].sort());
    expect(MEASURING_ORDER[0]).toBe('waist');
  });
});
