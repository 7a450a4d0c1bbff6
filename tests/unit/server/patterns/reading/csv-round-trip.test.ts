import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { buildTable } from '../../../../../server/patterns/reading/build-table.ts';
import { writeCsv } from '../../../../../server/patterns/reading/write-csv.ts';
import { typedTableSchema } from '../../../../../shared/patterns/edits.schema.ts';
import type { TableRole } from '../../../../../shared/patterns/imports.schema.ts';
import type { PatternTable } from '../../../../../shared/patterns/patterns.schema.ts';
import { tableOf } from '../../../../../shared/patterns/tables-as-typed.ts';
import { readTypedTable } from '../../../../../shared/patterns/typed-table.ts';
import { POINT_IDS } from '../../../../../shared/points/point-ids.ts';
import { LENGTH_UNITS, type LengthUnit } from '../../../../../shared/units.ts';
import { places, read } from './reading.ts';

const SIGNS: Record<string, string> = { '1/2': '½', '3/8': '⅜', '3/4': '¾' };
const part = fc.constantFrom('1/2', '3/8', '3/4', '1/8', '5/16');

/** One length as somebody might type it for a line in the unit. */
function length(unit: LengthUnit): fc.Arbitrary<string> {
  const whole = { in: [4, 60], cm: [10, 150], mm: [100, 1500] }[unit] as [number, number];
  const number = fc.integer({ min: whole[0], max: whole[1] });
  const decimal = fc.tuple(number, fc.integer({ min: 0, max: 99 }), fc.constantFrom('.', ','));
  const written = fc.constantFrom(...LENGTH_UNITS);
  return fc.oneof(
    number.map(String),
    decimal.map(([a, b, sign]) => `${a}${sign}${String(b)}`),
    fc.tuple(number, part).map(([a, b]) => `${Math.min(a, 60)} ${b} in`),
    fc
      .tuple(number, fc.constantFrom(...Object.keys(SIGNS)))
      .map(([a, b]) => `${Math.min(a, 60)}${SIGNS[b] ?? ''}"`),
    fc.tuple(number, written).map(([a, other]) => `${a} ${other}`),
    unit === 'in' ? fc.tuple(number, part).map(([a, b]) => `${a} ${b}`) : number.map((a) => `${a} 1/2`),
  );
}

const range = (unit: LengthUnit) =>
  fc
    .tuple(length(unit), fc.constantFrom('-', ' – ', ' to '), length(unit))
    .map(([low, dash, high]) => `${low}${dash}${high}`);

const cell = (unit: LengthUnit, role: TableRole) =>
  fc.oneof(
    { weight: 8, arbitrary: length(unit) },
    { weight: role === 'chart' ? 2 : 0, arbitrary: range(unit) },
    { weight: 1, arbitrary: fc.constantFrom('', '-', '–', 'n/a') },
  );

/** Names of sizes with all that a table, a spreadsheet or a reader could trip over. */
const label = fc.oneof(
  { weight: 3, arbitrary: fc.constantFrom('8', '10', 'M', 'XL', '34/36', '10 (UK)') },
  {
    weight: 1,
    arbitrary: fc.constantFrom(
      '=1+1',
      '+12',
      '-12',
      '@x',
      "'12",
      "''=2",
      '"Q"',
      'a,b',
      'a;b',
      'a\tb',
      '＝1',
      'Bust',
      'Size',
      'Ñ½',
    ),
  },
  { weight: 2, arbitrary: fc.string({ unit: 'grapheme', minLength: 1, maxLength: 12 }) },
);

const typedTable = (role: TableRole) =>
  fc
    .record({
      sizes: fc.uniqueArray(label, {
        minLength: 1,
        maxLength: 6,
        selector: (text) => text.trim().toLowerCase(),
      }),
      points: fc.uniqueArray(fc.constantFrom(...POINT_IDS), { minLength: 1, maxLength: 5 }),
    })
    .chain(({ sizes, points }) =>
      fc
        .tuple(
          ...points.map((point) =>
            fc
              .constantFrom(...LENGTH_UNITS)
              .chain((unit) =>
                fc
                  .array(cell(unit, role), { minLength: sizes.length, maxLength: sizes.length })
                  .map((typed) => ({ point, unit, typed })),
              ),
          ),
        )
        .map((columns) => ({ sizes, chart: [], finished: [], [role]: columns })),
    );

/** The numbers and words that must survive; a heading that came from nowhere is written anew. */
const kept = (table: PatternTable, role: TableRole) => ({
  sizes: table.sizes,
  columns: table[role].map(({ point, unit, mm, typed }) => ({ point, unit, mm, typed })),
});

describe('CSV out and in again', () => {
  it.each(['chart', 'finished'] as const)(
    'a %s typed by hand comes back with the same sizes, points, units, cells and numbers',
    (role) => {
      let tried = 0;
      fc.assert(
        fc.property(typedTable(role), (sent) => {
          const typed = typedTableSchema.parse(sent);
          const reading = readTypedTable(typed);
          // What may not be saved does not leave either.
          fc.pre(reading.findings.every(({ severity }) => severity !== 'error'));
          tried += 1;
          const table = tableOf(typed, reading, null);
          const again = read(writeCsv(table, role), role);
          expect(places(again, 'error')).toEqual([]);
          const back = role === 'chart' ? buildTable(again, null) : buildTable(null, again);
          expect(kept(back, role)).toEqual(kept(table, role));
        }),
        { numRuns: 300, maxSkipsPerRun: 400 },
      );
      expect(tried).toBeGreaterThanOrEqual(300);
    },
  );

  it('every point in every unit', () => {
    for (const role of ['chart', 'finished'] as const) {
      for (const point of POINT_IDS) {
        for (const unit of LENGTH_UNITS) {
          const column = { point, unit, typed: [unit === 'in' ? '37 3/8' : unit === 'cm' ? '95,2' : '952'] };
          const typed = { sizes: ['12'], chart: [], finished: [], [role]: [column] };
          const table = tableOf(typed, readTypedTable(typed), null);
          const again = read(writeCsv(table, role), role);
          const back = role === 'chart' ? buildTable(again, null) : buildTable(null, again);
          expect(kept(back, role), `${role} ${point} ${unit}`).toEqual(kept(table, role));
        }
      }
    }
  });
});
