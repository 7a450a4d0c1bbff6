import { describe, expect, it } from 'vitest';
import { sayDevice } from '../../../../src/account/device-words.ts';
import { endAfter, sayScopes } from '../../../../src/account/token-words.ts';
import { keyToType } from '../../../../src/account/totp-key.ts';

const MOZ = 'Mozilla/5.0';

describe('sayDevice', () => {
  it.each([
    [`${MOZ} (Macintosh; Intel Mac OS X 10.15; rv:140.0) Gecko/20100101 Firefox/140.0`, 'Firefox on a Mac'],
    [
      `${MOZ} (iPhone; CPU iPhone OS 18_0 like Mac OS X) AppleWebKit/605.1.15 (KHTML, like Gecko) Version/18.0 Mobile/15E148 Safari/604.1`,
      'Safari on an iPhone',
    ],
    [
      `${MOZ} (Linux; Android 14; Pixel 8) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0.0.0 Mobile Safari/537.36`,
      'Chrome on an Android phone',
    ],
    [
      `${MOZ} (Windows NT 10.0; Win64; x64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0.0.0 Safari/537.36 Edg/140.0.0.0`,
      'Edge on Windows',
    ],
    [
      `${MOZ} (X11; Linux x86_64) AppleWebKit/537.36 HeadlessChrome/140.0.0.0 Safari/537.36`,
      'Chrome on Linux',
    ],
    ['curl/8.5.0', 'curl'],
    ['', 'Some browser'],
    [null, 'Some browser'],
  ])('%s is “%s”', (userAgent, words) => {
    expect(sayDevice(userAgent)).toBe(words);
  });
});

describe('sayScopes', () => {
  it.each([
    [['people:read'] as const, 'Reads people'],
    [['patterns:read', 'people:read', 'plans:read'] as const, 'Reads people, patterns and plans'],
    [['plans:write'] as const, 'Changes plans'],
    [
      ['people:read', 'patterns:write', 'patterns:read'] as const,
      'Reads people and patterns, changes patterns',
    ],
  ])('%s is “%s”', (scopes, words) => {
    expect(sayScopes(scopes)).toBe(words);
  });
});

describe('endAfter', () => {
  const now = new Date('2026-12-01T12:00:00Z');
  it('is so many days on, in UTC', () => {
    expect(endAfter('30', now)).toBe('2026-12-31T12:00:00.000Z');
  });
  it.each(['never', '', 'NaN'])('is no end for “%s”', (lifetime) => {
    expect(endAfter(lifetime, now)).toBeNull();
  });
});

describe('keyToType', () => {
  it('gives the key in groups of four', () => {
    expect(keyToType('otpauth://totp/Leeway:a?secret=JBSWY3DPEHPK3PXPQ&issuer=Leeway')).toBe(
      'JBSW Y3DP EHPK 3PXP Q',
    );
  });
  it.each(['otpauth://totp/Leeway:a', 'otpauth://totp/Leeway:a?secret=', 'no address'])(
    'is null for %s',
    (uri) => {
      expect(keyToType(uri)).toBeNull();
    },
  );
});
