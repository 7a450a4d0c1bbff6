import { describe, expect, it } from 'vitest';
import { readFitAddress, readHeld, writeHeld } from '../../../../src/fit/fit-address.ts';

const SIZES = ['S', 'M', 'L: tall'];
const SET = '01a2301c-3b70-7146-8472-92dcd0aa1464';

describe('readFitAddress', () => {
  it('reads what is chosen', () => {
    const search = new URLSearchParams({ set: SET, silhouette: 'loose', hold: 'hip:M' });
    expect(readFitAddress(search)).toEqual({
      setId: SET,
      revisionId: null,
      silhouette: 'loose',
      hold: ['hip:M'],
    });
  });

  it('counts what is no id and no silhouette as not chosen', () => {
    const search = new URLSearchParams({ set: '../me', revision: '1', silhouette: 'baggy' });
    expect(readFitAddress(search)).toEqual({ setId: null, revisionId: null, silhouette: null, hold: [] });
  });
});

describe('held sizes in the address', () => {
  it('come back as they went, by label, even where a label holds the mark between', () => {
    const held = { bust: 0, hip: 2 };
    const search = writeHeld(new URLSearchParams({ set: SET }), held, SIZES);
    expect(search.get('set')).toBe(SET);
    expect(readHeld(search.getAll('hold'), SIZES, ['bust', 'waist', 'hip'])).toEqual(held);
  });

  it('are left out where the pattern has no such size or the garment no such zone', () => {
    expect(readHeld(['hip:XL', 'neck:M', 'ear:M', 'hip', ''], SIZES, ['hip'])).toEqual({});
  });

  it('replace those before', () => {
    const search = new URLSearchParams([
      ['hold', 'hip:S'],
      ['hold', 'bust:S'],
    ]);
    expect(writeHeld(search, { hip: 1 }, SIZES).getAll('hold')).toEqual(['hip:M']);
    expect(writeHeld(search, {}, SIZES).has('hold')).toBe(false);
  });
});
