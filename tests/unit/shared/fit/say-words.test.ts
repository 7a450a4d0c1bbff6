import { describe, expect, it } from 'vitest';
import { GARMENT_KINDS, SILHOUETTES, VERDICTS, ZONE_IDS } from '../../../../shared/fit/fit-words.ts';
import {
  capital,
  KIND_WORDS,
  listWords,
  sayPoint,
  sayZone,
  sayVerdict,
  SILHOUETTE_WORDS,
  VERDICT_WORDS,
} from '../../../../shared/fit/say-words.ts';
import { POINT_IDS } from '../../../../shared/points/point-ids.ts';

const everyWord = [
  ...VERDICTS.map((verdict) => VERDICT_WORDS[verdict]),
  ...SILHOUETTES.map((silhouette) => SILHOUETTE_WORDS[silhouette]),
  ...GARMENT_KINDS.map((kind) => KIND_WORDS[kind]),
  ...ZONE_IDS.map((zone) => sayZone(zone, 'bust')),
  ...POINT_IDS.map((point) => sayPoint(point, 'bust')),
];

describe('the words', () => {
  it('exist for every code, and none shows a code as it is written', () => {
    for (const word of everyWord) expect(word).toMatch(/^[a-z][a-z ,-]*$/);
  });

  it('never call a body or a size wrong', () => {
    for (const word of everyWord) {
      expect(word).not.toMatch(/\b(too|tight|problem|ideal|normal|flattering|wrong|big|fat|range)\b/);
    }
  });

  it('tell every point from every other', () => {
    expect(new Set(POINT_IDS.map((point) => sayPoint(point, 'bust'))).size).toBe(POINT_IDS.length);
    expect(new Set(POINT_IDS.map((point) => sayPoint(point, 'chest'))).size).toBe(POINT_IDS.length);
  });

  it('use the person’s own word', () => {
    expect(sayPoint('upperBust', 'chest')).toBe('upper chest');
    expect(sayPoint('upperBust', 'bust')).toBe('upper bust');
    expect(sayZone('bust', 'chest')).toBe('chest');
    for (const point of POINT_IDS) expect(sayPoint(point, 'chest')).not.toContain('bust');
  });
});

describe('listWords', () => {
  it('joins as a sentence does', () => {
    expect(listWords([])).toBe('');
    expect(listWords(['a'])).toBe('a');
    expect(listWords(['a', 'b'])).toBe('a and b');
    expect(listWords(['a', 'b', 'c'], 'or')).toBe('a, b or c');
  });
});

describe('capital', () => {
  it('raises the first letter and leaves an empty text', () => {
    expect(capital('hip')).toBe('Hip');
    expect(capital('')).toBe('');
  });
});

describe('sayVerdict', () => {
  it('still says wearing ease where the draft is not known', () => {
    expect(sayVerdict({ verdict: 'unknown', leewayMm: 12 })).toBe('has wearing ease');
    expect(sayVerdict({ verdict: 'unknown', leewayMm: null })).toBe('cannot be said');
    expect(sayVerdict({ verdict: 'belowFloor', leewayMm: -2 })).toBe('less than wearing ease');
  });
});
