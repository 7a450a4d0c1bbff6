import Papa from 'papaparse';
import { describe, expect, it, vi } from 'vitest';
import { refusalOf } from '../../../../../server/patterns/reading/read-table.ts';
import { read } from './reading.ts';

describe('files that are no table', () => {
  const refuse = (bytes: Uint8Array | string) => {
    const table = read(bytes);
    expect(table.rows).toEqual([]);
    return refusalOf(table)?.code;
  };

  it.each([
    ['an empty file', '', 'emptyFile'],
    ['blank lines', '\n \r\n\t\n', 'emptyFile'],
    ['a spreadsheet', new Uint8Array([0x50, 0x4b, 0x03, 0x04, 20, 0, 6, 0]), 'spreadsheetFile'],
    ['an old spreadsheet', new Uint8Array([0xd0, 0xcf, 0x11, 0xe0, 0xa1]), 'spreadsheetFile'],
    ['a PDF', '%PDF-1.7\n', 'binaryFile'],
    ['a picture', new Uint8Array([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a]), 'binaryFile'],
    ['zero bytes', new Uint8Array([83, 105, 122, 101, 0, 44]), 'binaryFile'],
    ['6 MB', new Uint8Array(6_000_000).fill(65), 'fileTooLarge'],
    ['300,000 rows', '1,2\n'.repeat(300_000), 'tooManySizes'],
    ['a thousand blank rows too many', `Size,Bust\n${',\n'.repeat(3000)}`, 'tooManySizes'],
  ])('%s', (_name, bytes, code) => {
    expect(refuse(bytes)).toBe(code);
  });

  it('says to save a spreadsheet as CSV first', () => {
    expect(read(new Uint8Array([0x50, 0x4b, 0x03, 0x04])).issues[0]?.words).toContain('CSV');
  });

  it.each([
    ['commas', ','.repeat(1_000_000)],
    ['headings', `Size,${'Bust,'.repeat(900_000)}`],
    ['semicolons', ';'.repeat(1_000_000)],
    ['quoted', '"a",'.repeat(1_000_000)],
    ['open quotes', `"${'a,'.repeat(2_000_000)}`],
  ])('a million columns of %s are refused before a single cell is built', (_name, text) => {
    const parsing = vi.spyOn(Papa, 'parse');
    const code = refuse(new TextEncoder().encode(text));
    expect(parsing).not.toHaveBeenCalled();
    expect(['tooManyColumns', 'openQuote']).toContain(code);
    parsing.mockRestore();
  });

  it('the largest table that is allowed is read whole', () => {
    const headings = Array.from({ length: 60 }, (_, at) => `h${String(at)}`);
    const row = headings.map((_, at) => `${String(30 + at)} 3/8`).join(',');
    const text = `Size,${headings.join(',')}\n${Array.from({ length: 200 }, (_, at) => `s${String(at)},${row}`).join('\n')}`;
    const table = read(text, 'chart', { points: { 2: 'bust', 3: 'waist', 4: 'hip', 5: 'knee' } });
    expect(table.rows).toHaveLength(200);
    expect(table.columns).toHaveLength(61);
    expect(table.issues.filter((issue) => issue.severity === 'error')).toEqual([]);
  });
});
