import { describe, expect, it } from 'vitest';
import { readListAddress } from '../../../../src/ui/pagination.tsx';

describe('what the address of a list asks for', () => {
  it('reads the page and the words', () => {
    expect(readListAddress('http://x.invalid/people?page=3&q=%20ines%20')).toEqual({ page: 3, q: 'ines' });
    expect(readListAddress('?q=a+b')).toEqual({ page: 1, q: 'a b' });
  });

  it.each(['?page=0', '?page=-1', '?page=1.5', '?page=all', '?page=', ''])(
    'takes %s for the first page',
    (address) => {
      expect(readListAddress(address)).toEqual({ page: 1, q: '' });
    },
  );
});
