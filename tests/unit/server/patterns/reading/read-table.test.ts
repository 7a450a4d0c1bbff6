import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import type { TableRole } from '../../../../../shared/patterns/imports.schema.ts';
import { buildTable } from '../../../../../server/patterns/reading/build-table.ts';
import { places, read } from './reading.ts';

const FOLDER = join(import.meta.dirname, '../../../../../fixtures/imports');

interface Expected {
  role: TableRole;
  delimiter: string;
  decimalComma: boolean;
  unit: string;
  unitFrom: string;
  points: string[];
  sizes: string[];
  mm: unknown[][];
}
const expected = JSON.parse(readFileSync(join(FOLDER, 'expected.json'), 'utf8')) as Record<string, Expected>;

describe('reading tables in the shapes people bring them', () => {
  it.each(Object.entries(expected))('%s', (name, wanted) => {
    const table = read(new Uint8Array(readFileSync(join(FOLDER, name))), wanted.role);
    expect(places(table, 'error')).toEqual([]);
    const points = table.columns.flatMap((column, at) => (column.point ? [{ at, point: column.point }] : []));
    expect({
      role: wanted.role,
      delimiter: table.delimiter,
      decimalComma: table.decimalComma,
      unit: table.unit,
      unitFrom: table.unitFrom,
      points: points.map(({ point }) => point),
      sizes: table.rows.map((row) => row.label),
      mm: table.rows.map((row) => points.map(({ at }) => row.cells[at]?.mm ?? null)),
    }).toEqual(wanted);
  });

  it('counts rows and columns as in the file, titles and blank lines included', () => {
    const table = read(new Uint8Array(readFileSync(join(FOLDER, 'finished-titled.csv'))), 'finished');
    expect(table.rows.map((row) => row.row)).toEqual([5, 6, 8]);
    expect(places(table)).toEqual([
      'titleRow 1:null',
      'titleRow 2:null',
      'likelyHeading 4:3',
      'likelyHeading 4:4',
      'likelyHeading 4:5',
    ]);
  });

  it('keeps every cell as typed', () => {
    const table = read('Size,Bust (in)\n8, 31 1/2 \n10,32½\n');
    expect(table.rows.map((row) => row.cells[1]?.typed)).toEqual(['31 1/2', '32½']);
  });
});

describe('the unit', () => {
  it.each([
    ['36', '38', 'in'],
    ['92', '96', 'cm'],
    ['920', '960', 'mm'],
  ])('a bust of %s is in %s by the size of the number, and says so', (small, large, unit) => {
    const table = read(`Size,Bust\n1,${small}\n2,${large}\n`);
    expect([table.unit, table.unitFrom]).toEqual([unit, 'size of the numbers']);
    const [said] = table.issues;
    expect(said?.code).toBe('unitFromNumbers');
    expect(said?.words).toContain(`a bust girth of ${small}`);
  });

  it('numbers that could be two units are pointed out as open: a chest of 56 is a child’s in cm', () => {
    expect(read('Size,Chest\n1,54\n2,56\n').issues.map((issue) => issue.code)).toContain('unitOpen');
  });

  it('a point without a usual range says that the unit is unknown', () => {
    expect(read('Size,Leg opening\n1,30\n').issues.map((issue) => issue.code)).toEqual(
      ['unitUnknown', 'garmentPointInChart'].reverse(),
    );
  });

  it('an eighth of an inch in any cell means inches', () => {
    const table = read('Size,Hem\n1,60\n2,62 3/8\n', 'finished');
    expect([table.unit, table.unitFrom]).toEqual(['in', 'cells']);
  });

  it('a half alone does not: 92 1/2 may be centimetres', () => {
    const table = read('Size,Bust\n1,92 1/2\n2,96\n');
    expect(table.unit).toBe('cm');
    expect(table.rows[0]?.cells[1]?.mm).toBe(925);
  });

  it('a chosen unit is taken for columns that state none, and another stated by one column stays', () => {
    const table = read('Size,Bust,Waist (cm),Hip (in)\n1,36,70,38\n', 'chart', { unit: 'in' });
    expect(table.unitFrom).toBe('chosen');
    expect(table.rows[0]?.cells.slice(1).map((cell) => cell.mm)).toEqual([914.4, 700, 965.2]);
    expect(places(table)).toEqual(['mixedUnits 1:3']);
  });

  it('a chosen unit overrules the one that all headings state, with a caution', () => {
    const table = read('Size,Bust (cm)\n1,36\n2,38\n', 'chart', { unit: 'in' });
    expect(table.rows[0]?.cells[1]?.mm).toBe(914.4);
    expect(places(table)).toEqual(['unitAgainstHeadings 1:null']);
  });

  it('a stated unit that the numbers contradict is pointed out at its column', () => {
    expect(places(read('Size,Bust (cm),Hip (cm)\n1,36,96\n2,38,100\n'))).toEqual(['unitDoubtful 1:2']);
  });

  it('a cape’s finished hip of 2.3 m is no reason to doubt its inches', () => {
    expect(places(read('Size,Hip (in)\nS,90\nM,94\n', 'finished'))).toEqual([]);
    const open = read('Size,Hip\nS,90\nM,94\n', 'finished');
    expect(open.issues.map((issue) => issue.code)).toEqual(['unitOpen']);
  });

  it('a cell with its own unit is honoured and pointed out', () => {
    const table = read('Size,Bust (cm)\n1,92\n2,38 in\n');
    expect(table.rows[1]?.cells[1]?.mm).toBe(965.2);
    expect(places(table)).toEqual(['mixedUnits 3:2']);
  });
});

describe('ranges and fractions', () => {
  const one = (cell: string, role: TableRole = 'chart', unit: 'in' | 'cm' = 'in') =>
    read(`Size;Bust (${unit})\n1;${cell}\n`, role).rows[0]?.cells[1]?.mm;

  it.each([
    ['37-3/8', 949.325],
    ['37–3/8', 949.325],
    ['37 - 3/8', 949.325],
    ['37⅜', 949.325],
    ['34-36', { low: 863.6, high: 914.4 }],
    ['36 1/2 - 38', { low: 927.1, high: 965.2 }],
    ['36-1/2-38-1/2', { low: 927.1, high: 977.9 }],
    ['36-38-1/2', { low: 914.4, high: 977.9 }],
    ['34"–36"', { low: 863.6, high: 914.4 }],
    ['34to36', { low: 863.6, high: 914.4 }],
    ['36–36', 914.4],
  ])('%s in inches', (cell, mm) => {
    expect(one(cell)).toEqual(mm);
  });

  it('a unit written once, at the end, is meant for both ends', () => {
    expect(one('91–94 cm')).toEqual({ low: 910, high: 940 });
  });

  it.each(['', '-', '–', '—', 'n/a', 'N/A', 'n.a.', '--', '…'])('“%s” is an empty cell', (blank) => {
    const table = read(`Size;Bust (cm);Hip (cm)\n1;90;${blank}\n`);
    expect(table.rows[0]?.cells[2]?.mm).toBeNull();
    expect(places(table, 'error')).toEqual([]);
  });

  it('the finished table refuses ranges', () => {
    const table = read('Size,Bust (cm)\n1,91–94\n2,96\n', 'finished');
    expect(places(table)).toEqual(['rangeInFinished 2:2']);
  });

  it('a range that falls is refused', () => {
    expect(places(read('Size,Bust (cm)\n1,94–91\n'), 'error')).toEqual(['rangeFalls 2:2']);
  });
});

describe('bad cells: an error at its place, in words', () => {
  it.each([
    ['-92', 'negative'],
    ['0', 'tooShort'],
    ['0.3', 'tooShort'],
    ['920', 'tooLong'],
    ['1e99', 'notALength'],
    ['=1+1', 'formula'],
    ["'=1+1", 'formula'],
    ['+cmd', 'formula'],
    ['@SUM(A1)', 'formula'],
    ['about 90', 'notALength'],
    ['92 cm (36 in)', 'notALength'],
    ['90 3/8', 'ambiguous'],
    ['90 5/3 in', 'badFraction'],
    ["5' 6", 'notALength'],
    ['1'.repeat(200), 'cellTooLong'],
  ])('%s is %s', (cell, code) => {
    const table = read(`Size,Bust (cm),Hip (cm)\n1,${cell},90\n2,92,96\n`);
    expect(places(table, 'error')).toEqual([`${code} 2:2`]);
    expect(table.issues[0]?.words.length).toBeGreaterThan(20);
    expect(table.rows[0]?.cells[1]?.mm).toBeNull();
  });

  it('keeps what was typed in a bad cell', () => {
    expect(read('Size,Bust (cm)\n1,=1+1\n').rows[0]?.cells[1]?.typed).toBe('=1+1');
  });

  it('more than can be listed ends in one that counts the rest, errors before cautions', () => {
    const rows = Array.from({ length: 150 }, (_, at) => `${String(at)},x,y,z`).join('\n');
    const table = read(`Size,Bust (cm),Hip (cm),Foo\n${rows}\n`);
    expect(table.issues).toHaveLength(201);
    expect(table.issues.at(-1)?.words).toContain('101 more');
    expect(table.issues.slice(0, 200).every((issue) => issue.severity === 'error')).toBe(true);
  });
});

describe('the tables of a revision', () => {
  it('hold what was understood, as typed and in mm, without empty or ignored columns', () => {
    const chart = read('Size,Bust (cm),Foo,Hip (cm),Waist (cm)\nS,86–91,1,92,\nM,91–96,2,n/a,\n');
    expect(buildTable(chart, null)).toEqual({
      sizes: ['S', 'M'],
      chart: [
        {
          point: 'bust',
          heading: 'Bust (cm)',
          unit: 'cm',
          mm: [
            { low: 860, high: 910 },
            { low: 910, high: 960 },
          ],
          typed: ['86–91', '91–96'],
        },
        { point: 'hip', heading: 'Hip (cm)', unit: 'cm', mm: [920, null], typed: ['92', 'n/a'] },
      ],
      finished: [],
    });
  });
});
