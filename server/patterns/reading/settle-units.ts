import type { PointId } from '../../../shared/points/point-ids.ts';
import { pointName } from '../../../shared/points/catalogue.ts';
import type { ImportIssue, ImportTable, TableRole } from '../../../shared/patterns/imports.schema.ts';
import { LENGTH_UNITS, printLengthWithUnit, type LengthUnit } from '../../../shared/units.ts';
import type { Column } from './columns.ts';
import { listed, quote } from '../../../shared/patterns/quote.ts';
import { cautionAt } from './issues.ts';
import { howPlausible } from './plausible.ts';
import { middleOf, readCell } from '../../../shared/patterns/read-cell.ts';

/** What the unit of a table is settled from. `around` are titles and the size heading: “all in inches”. */
export interface UnitEvidence {
  columns: readonly Column[];
  /** The rows below the headings. */
  rows: readonly string[][];
  headingRow: number;
  role: TableRole;
  around: readonly string[];
  chosen: LengthUnit | null;
}

export interface SettledUnits {
  unit: LengthUnit;
  unitFrom: ImportTable['unitFrom'];
  /** The unit of each column, beside `columns`. */
  byColumn: LengthUnit[];
  issues: ImportIssue[];
}

const WORD: Record<LengthUnit, string> = { cm: 'centimetres', mm: 'millimetres', in: 'inches' };

/**
 * Settles the unit of a table and of each column: what a person chose, else what headings say, else what cells say (a unit or
 * inch fractions), else what the size of the numbers suggests, which is always said. A column whose heading states
 * another unit keeps it, unless a person chose against the one unit that all headings state.
 */
export function settleUnits(evidence: UnitEvidence): SettledUnits {
  const { columns, chosen } = evidence;
  const inHeadings = columns.flatMap((column) =>
    column.role === 'point' && column.written ? [column.written] : [],
  );
  const { unit, unitFrom, issues } = tableUnit(evidence, inHeadings);
  const allSay = new Set(inHeadings).size === 1 ? inHeadings[0] : undefined;
  const isOverruled = chosen !== null && allSay !== undefined && allSay !== chosen;
  const byColumn = columns.map((column) => (isOverruled ? unit : (column.written ?? unit)));
  if (isOverruled) {
    const words = `The headings say ${WORD[allSay]}; the table is read in ${WORD[chosen]}, as chosen.`;
    issues.push(cautionAt({ row: evidence.headingRow + 1 }, 'unitAgainstHeadings', words));
  }
  return { unit, unitFrom, byColumn, issues: [...issues, ...sayColumns(evidence, byColumn, unit)] };
}

type TableUnit = Pick<SettledUnits, 'unit' | 'unitFrom' | 'issues'>;

function tableUnit(evidence: UnitEvidence, inHeadings: readonly LengthUnit[]): TableUnit {
  if (evidence.chosen !== null) return { unit: evidence.chosen, unitFrom: 'chosen', issues: [] };
  const said = mostFrequent([...inHeadings, ...(inHeadings.length === 0 ? unitsIn(evidence.around) : [])]);
  if (said) return { unit: said, unitFrom: 'heading', issues: [] };
  const cells = evidence.columns.flatMap((column, at) =>
    column.role === 'point' ? evidence.rows.map((row) => row[at] ?? '') : [],
  );
  const written = mostFrequent(cells.flatMap((cell) => unitOfCell(cell)));
  if (written) return { unit: written, unitFrom: 'cells', issues: [] };
  return fromNumbers(evidence);
}

function unitsIn(texts: readonly string[]): LengthUnit[] {
  const found = new Set<LengthUnit>();
  for (const text of texts) {
    if (/\b(?:inch(?:es)?|ins)\b|[([]in\.?[)\]]/i.test(text)) found.add('in');
    if (/\b(?:cms?|centimet(?:re|er)s?)\b/i.test(text)) found.add('cm');
    if (/\b(?:mms?|millimet(?:re|er)s?)\b/i.test(text)) found.add('mm');
  }
  // Two units said round a table settle nothing.
  return found.size === 1 ? [...found] : [];
}

/** The unit that a cell writes itself; fractions finer than a half are an inch's. */
function unitOfCell(cell: string): LengthUnit[] {
  const read = readCell(cell, 'in', 'chart');
  if (read.kind !== 'length') return [];
  if (read.unitWritten) return [read.unit];
  return /[¼¾⅛⅜⅝⅞]|\d\s*[/⁄]\s*(?:4|8|16|32)\b/.test(cell) ? ['in'] : [];
}

function mostFrequent(units: readonly LengthUnit[]): LengthUnit | null {
  const counts = LENGTH_UNITS.map((unit) => ({
    unit,
    count: units.filter((found) => found === unit).length,
  }));
  const [first] = counts.sort((a, b) => b.count - a.count);
  return first && first.count > 0 ? first.unit : null;
}

function fromNumbers(evidence: UnitEvidence): TableUnit {
  const tried = LENGTH_UNITS.map((unit) => ({ unit, ...suits(evidence, unit) })).sort(
    (a, b) => b.score - a.score,
  );
  const [best, next] = tried;
  if (!best || best.score === 0) {
    const words =
      'No unit is written, and the numbers do not tell it: choose the unit. Centimetres are assumed until then.';
    return { unit: 'cm', unitFrom: 'size of the numbers', issues: [cautionAt({}, 'unitUnknown', words)] };
  }
  const example = sayExample(evidence, best.unit);
  const isClose = next !== undefined && next.score > best.score * 0.6;
  const rest = isClose
    ? ` They could also be ${WORD[next.unit]}: choose the unit yourself.`
    : ' Choose another unit if that is not so.';
  const words = `No unit is written. By their size the numbers are ${WORD[best.unit]}: ${example}.${rest}`;
  return {
    unit: best.unit,
    unitFrom: 'size of the numbers',
    issues: [cautionAt({}, isClose ? 'unitOpen' : 'unitFromNumbers', words)],
  };
}

function suits(evidence: UnitEvidence, unit: LengthUnit): { score: number } {
  const scores = evidence.columns.flatMap((column, at) => {
    if (column.point === null) return [];
    const found = howPlausible(column.point, lengthsIn(evidence, at, unit), evidence.role);
    return found ? [found.score] : [];
  });
  return { score: scores.reduce((sum, score) => sum + score, 0) };
}

function lengthsIn(evidence: UnitEvidence, at: number, unit: LengthUnit): number[] {
  return evidence.rows.flatMap((row) => {
    const read = readCell(row[at] ?? '', unit, 'chart');
    if (read.kind === 'length') return read.unitWritten ? [] : [middleOf(read.mm)];
    // Too long or too short in this unit speaks against it; what is no number says nothing.
    return read.kind === 'error' && /^too(?:Long|Short)$/.test(read.code) ? [0] : [];
  });
}

function sayExample({ columns, rows }: UnitEvidence, unit: LengthUnit): string {
  for (const [at, { point }] of columns.entries()) {
    const cell = rows
      .map((row) => row[at] ?? '')
      .find((text) => readCell(text, unit, 'chart').kind === 'length');
    if (point === null || cell === undefined) continue;
    const read = readCell(cell, unit, 'chart');
    if (read.kind !== 'length') continue;
    const other = unit === 'in' ? 'cm' : 'in';
    return `a ${nameOf(point)} of ${cell} is ${printLengthWithUnit(middleOf(read.mm), other)}`;
  }
  return 'see below';
}

function nameOf(point: PointId): string {
  return pointName(point).toLowerCase();
}

/** Columns in another unit than the table's, and columns whose numbers look like another unit than theirs. */
function sayColumns(
  evidence: UnitEvidence,
  byColumn: readonly LengthUnit[],
  unit: LengthUnit,
): ImportIssue[] {
  const issues: ImportIssue[] = [];
  evidence.columns.forEach(({ point, column, heading }, at) => {
    const own = byColumn[at] ?? unit;
    if (point === null) return;
    const place = { row: evidence.headingRow + 1, column };
    if (own !== unit) {
      const words = `${quote(heading)} is read in ${WORD[own]}, as it says; the table is in ${WORD[unit]}.`;
      issues.push(cautionAt(place, 'mixedUnits', words));
    }
    const better = betterUnits(evidence, at, point, own);
    if (better.length === 0) return;
    const words = `In ${WORD[own]} these numbers are unlikely for ${nameOf(point)}; in ${listed(
      better.map((found) => WORD[found]),
      'or',
    )} they would be likely. Look at the unit.`;
    issues.push(cautionAt(place, 'unitDoubtful', words));
  });
  return issues;
}

function betterUnits(evidence: UnitEvidence, at: number, point: PointId, own: LengthUnit): LengthUnit[] {
  const share = (unit: LengthUnit) =>
    howPlausible(point, lengthsIn(evidence, at, unit), evidence.role)?.share ?? null;
  const owned = share(own);
  if (owned === null || owned > 0.5) return [];
  return LENGTH_UNITS.filter((unit) => unit !== own && (share(unit) ?? 0) >= 0.9);
}
