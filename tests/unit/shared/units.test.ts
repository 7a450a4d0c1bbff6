import { describe, expect, it } from 'vitest';
import { parseLength, printLength, printLengthWithUnit, type LengthUnit } from '../../../shared/units.ts';

const mm = (text: string, assumed: LengthUnit = 'cm') => {
  const read = parseLength(text, assumed);
  return read.ok ? read.mm : read.code;
};

describe('reading a length', () => {
  it.each([
    ['95.2', 'cm', 952],
    ['95,2', 'cm', 952],
    ['95,2 cm', 'in', 952],
    ['952 mm', 'in', 952],
    ['952mm.', 'cm', 952],
    ['64.1', 'cm', 641],
    ['37.375 in', 'cm', 949.325],
    ['37,375', 'in', 949.325],
    ['37 3/8', 'in', 949.325],
    ['37-3/8"', 'cm', 949.325],
    ['37⅜', 'in', 949.325],
    ['37⅜"', 'cm', 949.325],
    ['37⅜″', 'cm', 949.325],
    ['37 3⁄8', 'in', 949.325],
    ["37 3/8''", 'cm', 949.325],
    ['37 3/8inches', 'cm', 949.325],
    ['3/8', 'in', 9.525],
    ['½', 'in', 12.7],
    ['.5', 'in', 12.7],
    ['5.', 'in', 127],
    ['1.375', 'in', 34.925],
    ['92½', 'cm', 925],
    ['92 1/2 cm', 'in', 925],
    ['10 1/4 cm', 'cm', 102.5],
    ['92.125', 'cm', 921.25],
    ['３７．５', 'cm', 375],
    ['９５，２　ｃｍ', 'in', 952],
    [' \u00a095.2\u202fcm ', 'in', 952],
    ['0', 'cm', 0],
  ] as const)('“%s” with %s assumed is %d mm', (text, assumed, expected) => {
    expect(mm(text, assumed)).toBe(expected);
  });

  it.each([
    ['', 'empty'],
    ['  ', 'empty'],
    ['-3', 'negative'],
    ['−3 cm', 'negative'],
    ['– 3', 'negative'],
    ['wide', 'notALength'],
    ['1e3', 'notALength'],
    ['0x10', 'notALength'],
    ['Infinity', 'notALength'],
    ['NaN', 'notALength'],
    ['1 2', 'notALength'],
    ['1.2.3', 'notALength'],
    ['.', 'notALength'],
    ['cm', 'notALength'],
    ['=1+1', 'notALength'],
    ['37 11/8 in', 'badFraction'],
    ['1/0 in', 'badFraction'],
    ['8/8 in', 'badFraction'],
    ['1,050', 'ambiguous'],
    ['1.050 mm', 'ambiguous'],
    ['37 3/8', 'ambiguous'],
    ['9'.repeat(40), 'notALength'],
  ])('“%s” with cm assumed is refused as %s', (text, code) => {
    expect(mm(text)).toBe(code);
  });

  it.each(['5\' 6"', '5′6″', "5'6''", '5 ft 6 in', '5ft', '5 feet 6', "5'"])(
    '%s is in feet: refused in words that say what to write',
    (text) => {
      const read = parseLength(text, 'in');
      expect(read).toMatchObject({ ok: false, code: 'notALength' });
      expect(read.ok ? '' : read.words).toContain('66 in');
    },
  );

  it('a unit in the middle says where to write it', () => {
    for (const text of ['37 in 3/8', '37" 3/8']) {
      const read = parseLength(text, 'cm');
      expect(read.ok ? '' : read.words).toContain('37 3/8 in');
    }
  });

  it('a fraction where centimetres are assumed asks for the unit', () => {
    const read = parseLength('37 3/8', 'cm');
    expect(read.ok ? '' : read.words).toContain('37 3/8 in');
  });

  it('what could be two numbers names both', () => {
    const read = parseLength('1,050', 'mm');
    expect(read.ok ? '' : read.words).toContain('1050 or 1.05');
  });

  it('says which unit it read, and whether it was written', () => {
    expect(parseLength('36', 'in')).toEqual({ ok: true, mm: 914.4, unit: 'in', unitWritten: false });
    expect(parseLength('36 in', 'cm')).toEqual({ ok: true, mm: 914.4, unit: 'in', unitWritten: true });
  });
});

describe('printing a length', () => {
  it.each([
    [952, 'cm', '95.2'],
    [952, 'mm', '952'],
    [2.5, 'cm', '0.3'],
    [949.325, 'in', '37 3/8'],
    [9.525, 'in', '3/8'],
    [25.4, 'in', '1'],
    [0, 'in', '0'],
    [25.3, 'in', '1'],
    [-30, 'cm', '−3.0'],
    [-0.01, 'cm', '0.0'],
  ] as const)('%d mm in %s is %s', (length, unit, text) => {
    expect(printLength(length, unit)).toBe(text);
  });

  it('puts a sign in front where asked, and none before nothing', () => {
    expect(printLength(30, 'mm', { signed: true })).toBe('+30');
    expect(printLength(-30, 'mm', { signed: true })).toBe('−30');
    expect(printLength(0.2, 'mm', { signed: true })).toBe('0');
    expect(printLengthWithUnit(949.325, 'in')).toBe('37 3/8 in');
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY])('refuses %d', (length) => {
    expect(() => printLength(length, 'cm')).toThrow(RangeError);
  });
});

describe('round trips', () => {
  // 1 in = 25.4 mm exactly (international yard and pound agreement, 1959): k/16 in = k × 127 ÷ 80 mm.
  it('every 1/16 in from 1 to 80 in is read exactly and printed as it was typed', () => {
    for (let sixteenths = 16; sixteenths <= 80 * 16; sixteenths += 1) {
      const exact = (sixteenths * 127) / 80;
      const text = printLength(exact, 'in');
      expect(mm(text, 'in'), text).toBe(exact);
      expect(mm(`${String(sixteenths / 16)} in`, 'cm')).toBe(exact);
      expect(mm(text.replace(' ', '-'), 'in')).toBe(exact);
    }
  });

  it('every millimetre from 1 to 4,000 is read exactly from cm and mm and printed as it was typed', () => {
    for (let length = 1; length <= 4000; length += 1) {
      const cm = printLength(length, 'cm');
      expect(mm(cm, 'cm'), cm).toBe(length);
      expect(mm(cm.replace('.', ','), 'cm'), cm).toBe(length);
      expect(mm(printLength(length, 'mm'), 'mm')).toBe(length);
    }
  });
});
