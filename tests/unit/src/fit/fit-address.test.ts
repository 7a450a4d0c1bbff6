import { describe, expect, it } from 'vitest';
import { readFitAddress, readHeld, writeHeld } from '../../../../src/fit/fit-address.ts';

const SIZES = ['S', 'M', 'L: tall'];
const SET = '01a2301c-3b70-7146-8472-92dcd0aa1464';

describe('readFitAddress', () => {
  it('reads what is chosen', () => {
    const search = new URLSearchParams({ set: SET, silhouette: 'loose', cut: 'between', hold: 'hip:M' });
    expect(readFitAddress(search)).toEqual({
      setId: SET,
      revisionId: null,
      silhouette: 'loose',
      isBetween: true,
      hold: ['hip:M'],
    });
  });

  it('counts what is no id and no silhouette as not chosen', () => {
    const search = new URLSearchParams({ set: '../me', revision: '1', silhouette: 'baggy', cut: 'up' });
    expect(readFitAddress(search)).toEqual({
      setId: null,
      revisionId: null,
      silhouette: null,
      isBetween: false,
      hold: [],
    });
  });
});

describe('held sizes in the address', () => {
  it('come back as they went, by label, even where a label holds the mark between', () => {
    const held = { bust: 0, hip: 2 };
    const search = writeHeld(new URLSearchParams({ set: SET }), held, SIZES);
    expect(search.get('set')).toBe(SET);
    expect(readHeld(search.getAll('hold'), SIZES, ['bust', 'waist', 'hip'])).toEqual(held);
  });

  it('come back from between two sizes, first, middle and last, but only where it is cut there', () => {
    const held = { bust: 0.5, waist: 1, hip: 1.5 };
    const hold = writeHeld(new URLSearchParams(), held, SIZES).getAll('hold');
    expect(hold).toEqual(['bust:S–M', 'waist:M', 'hip:M–L: tall']);
    expect(readHeld(hold, SIZES, ['bust', 'waist', 'hip'], true)).toEqual(held);
    expect(readHeld(hold, SIZES, ['bust', 'waist', 'hip'], false)).toEqual({ waist: 1 });
  });

  it('go by a size’s own label before one between two', () => {
    expect(readHeld(['hip:16–18'], ['16', '18', '16–18'], ['hip'], true)).toEqual({ hip: 2 });
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
