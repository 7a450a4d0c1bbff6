import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { LENGTH_MAX_MM } from '../../../../../shared/fit/fit.schema.ts';
import { patternTableSchema } from '../../../../../shared/patterns/patterns.schema.ts';
import { printLength } from '../../../../../shared/units.ts';
import { buildTable } from '../../../../../server/patterns/reading/build-table.ts';
import { isReady } from '../../../../../server/patterns/reading/check-draft.ts';
import { readCell } from '../../../../../shared/patterns/read-cell.ts';
import { writeCsv } from '../../../../../server/patterns/reading/write-csv.ts';
import { read } from './reading.ts';

/** Pieces of tables, put together in any order: closer to what breaks a reader than random letters are. */
const piece = fc.constantFrom(
  ...[
    'Size',
    'Bust',
    'Hip (cm)',
    'Waist"',
    'Chest',
    '½ hip',
    'Length',
    '36',
    '37 3/8',
    '92,5',
    '91–94',
    '1,050',
  ],
  ...[
    '-',
    '=1+1',
    "'=x",
    '"',
    '""',
    ',',
    ';',
    '\t',
    '\n',
    '\r\n',
    ' ',
    '⅜',
    'in',
    'n/a',
    '\u00a0',
    '🙂',
    'sep=;\n',
  ],
);
const text = fc.array(piece, { maxLength: 60 }).map((pieces) => pieces.join(''));
const role = fc.constantFrom('chart', 'finished');

describe('whatever is brought', () => {
  it('is read without throwing, and answers within its schema', () => {
    fc.assert(
      fc.property(text, role, (content, as) => void read(content, as)),
      { numRuns: 1500 },
    );
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 400 }), role, (bytes, as) => void read(bytes, as)),
      {
        numRuns: 500,
      },
    );
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 200 }), (content) => void read(content)),
      {
        numRuns: 500,
      },
    );
  });

  it('is a table that a pattern can keep where no error stands in the way', () => {
    let ready = 0;
    const sized = fc.array(fc.tuple(fc.integer({ min: 1, max: 60 }), piece, piece), {
      minLength: 1,
      maxLength: 5,
    });
    fc.assert(
      fc.property(sized, (rows) => {
        const content = `Size;Bust (cm);Hip (in)\n${rows.map((row) => row.join(';')).join('\n')}`;
        const table = read(content);
        if (!isReady([], [table])) return;
        ready += 1;
        patternTableSchema.parse(buildTable(table, null));
      }),
      { numRuns: 1500 },
    );
    expect(ready).toBeGreaterThan(20);
  });

  it('a length printed in any unit is read as exactly that length, and refused beyond the longest', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 80, max: 2500 }),
        fc.constantFrom('in', 'cm', 'mm'),
        (sixteenths, unit) => {
          const mm = (sixteenths * 127) / 80;
          const typed =
            unit === 'in'
              ? printLength(mm, 'in')
              : String(unit === 'cm' ? Math.round(mm) / 10 : Math.round(mm));
          const cell = readCell(typed, unit, 'chart');
          const exact = unit === 'in' ? mm : Math.round(mm);
          if (exact > LENGTH_MAX_MM) expect(cell.kind).toBe('error');
          else expect(cell).toMatchObject({ kind: 'length', mm: exact });
        },
      ),
    );
  });

  it('comes back the same when it is written out and brought again, sizes of any text included', () => {
    const label = fc.string({ minLength: 1, maxLength: 30 }).map((found) => found.trim());
    const sizes = fc.uniqueArray(label, {
      minLength: 1,
      maxLength: 5,
      selector: (found) => found.toLowerCase(),
    });
    fc.assert(
      fc.property(sizes, (labels) => {
        fc.pre(labels.every((found) => found !== '' && !/^'\d/.test(found)));
        const table = {
          sizes: labels,
          chart: [
            {
              point: 'bust' as const,
              heading: 'Bust (cm)',
              unit: 'cm' as const,
              mm: labels.map((_, at) => 900 + at * 10),
              typed: labels.map((_, at) => String(90 + at)),
            },
          ],
          finished: [],
        };
        expect(buildTable(read(writeCsv(table, 'chart')), null)).toEqual(table);
      }),
      { numRuns: 1000 },
    );
  });
});
