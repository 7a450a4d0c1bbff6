import { describe, expect, it } from 'vitest';
import type { ImportIssue, ImportTable } from '../../../../../shared/patterns/imports.schema.ts';
import { byTarget, noteIssues, sayPlace, sayTotals } from '../../../../../src/patterns/import/notes.ts';

const issue = (
  severity: ImportIssue['severity'],
  row: number | null,
  column: number | null,
): ImportIssue => ({ severity, code: 'x', row, column, words: 'Look here.' });

const table = (issues: ImportIssue[]): ImportTable => ({
  file: { id: '01a23013-9baf-73b0-8c93-230f6b64c699', name: 'chart.csv', bytes: 10 },
  delimiter: ',',
  decimalComma: false,
  unit: 'cm',
  unitFrom: 'heading',
  columns: [
    { column: 1, heading: 'Size', role: 'size', point: null, sureness: 'exact', unit: 'cm' },
    { column: 2, heading: 'Bust', role: 'point', point: 'bust', sureness: 'exact', unit: 'cm' },
    { column: 3, heading: 'Frill', role: 'ignored', point: null, sureness: 'none', unit: 'cm' },
  ],
  rows: [
    { row: 4, label: '10', cells: [] },
    { row: 5, label: '12', cells: [] },
  ],
  issues,
});

describe('the notes on a table', () => {
  it('stand errors first, then from the top down and from left to right, and are numbered so', () => {
    const notes = noteIssues(
      table([
        issue('caution', 3, 3),
        issue('error', 5, 2),
        issue('caution', null, null),
        issue('error', 4, 2),
      ]),
      'chart',
    );
    expect(notes.map(({ number, issue: { severity, row } }) => [number, severity, row])).toEqual([
      [1, 'error', 4],
      [2, 'error', 5],
      [3, 'caution', null],
      [4, 'caution', 3],
    ]);
  });

  it('lead to a cell, a heading, a row, or nowhere where the whole table is meant', () => {
    const issues = [
      issue('error', 4, 2),
      issue('error', 3, 2),
      issue('error', 4, null),
      issue('error', 4, 9),
      issue('error', 1, null),
      issue('error', null, null),
    ];
    const targets = issues.map((one) => noteIssues(table([one]), 'chart')[0]?.targetId);
    expect(targets).toEqual([
      'chart-row-4-column-2',
      'chart-column-2',
      'chart-row-4',
      'chart-row-4',
      null,
      null,
    ]);
  });

  it('of one place are found together', () => {
    const notes = noteIssues(table([issue('caution', 4, 2), issue('error', 4, 2)]), 'finished');
    expect(
      byTarget(notes)
        .get('finished-row-4-column-2')
        ?.map(({ number }) => number),
    ).toEqual([1, 2]);
  });

  it('are counted in a sentence with the sizes and the points that were understood', () => {
    const said = (...issues: ImportIssue[]) => sayTotals(table(issues), noteIssues(table(issues), 'chart'));
    expect(said()).toBe('2 sizes, 1 point; all of it was understood.');
    expect(said(issue('error', 4, 2))).toBe('2 sizes, 1 point; 1 error to mend.');
    expect(said(issue('error', 4, 2), issue('caution', 4, 3), issue('caution', 5, 3))).toBe(
      '2 sizes, 1 point; 1 error to mend and 2 places to look at.',
    );
  });

  it('say their place as one would over the file', () => {
    expect(sayPlace(issue('error', 4, 2))).toBe('row 4, column 2');
    expect(sayPlace(issue('error', 4, null))).toBe('row 4');
    expect(sayPlace(issue('error', null, null))).toBe('');
  });
});
