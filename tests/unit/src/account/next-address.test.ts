import { describe, expect, it } from 'vitest';
import { nextAddress } from '../../../../src/account/next-address.ts';

const HERE = 'http://127.0.0.1:3000';
const next = (address: string | null) =>
  nextAddress(new URLSearchParams(address === null ? {} : { next: address }), HERE);

describe('where to go on after signing in', () => {
  it('goes back to the page that asked, with what was asked there', () => {
    expect(next('/plans?page=2#top')).toBe('/plans?page=2#top');
  });

  it('goes to the people where no page asked', () => {
    expect(next(null)).toBe('/people');
    expect(next('')).toBe('/people');
  });

  it.each([
    'https://example.org/',
    '//example.org/people',
    '/\\example.org/people',
    '/\t/example.org',
    'javascript:alert(1)',
    'people',
  ])('never leaves the site: %s', (address) => {
    expect(next(address)).toBe('/people');
  });

  it('does not come back to signing in or up', () => {
    expect(next('/sign-in?next=/plans')).toBe('/people');
    expect(next('/sign-up')).toBe('/people');
  });
});
