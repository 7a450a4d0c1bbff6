import { describe, expect, it } from 'vitest';
import { places, read } from './reading.ts';

describe('headings', () => {
  it('an unknown heading is a caution, and its column is left out', () => {
    const table = read('Size,Bust (cm),Foo\n1,90,12\n');
    expect(places(table)).toEqual(['unknownHeading 1:3']);
    expect(table.columns[2]).toMatchObject({ role: 'ignored', point: null, heading: 'Foo' });
  });

  it('a correction maps a column, or leaves it out, and the caution goes', () => {
    const text = 'Size,Bust (cm),Foo,Bar\n1,90,96,3\n';
    const table = read(text, 'chart', { points: { 3: 'hip', 4: null } });
    expect(places(table)).toEqual([]);
    expect(table.columns[2]).toMatchObject({ role: 'point', point: 'hip', sureness: 'chosen', unit: 'cm' });
    expect(table.rows[0]?.cells[2]?.mm).toBe(960);
    expect(table.columns[3]).toMatchObject({ role: 'ignored', sureness: 'chosen' });
  });

  it('two columns for one point are an error at both, and leaving one out mends it', () => {
    const text = 'Size,Bust (cm),Chest (cm)\n1,90,92\n';
    expect(places(read(text))).toEqual(['pointTwice 1:2', 'pointTwice 1:3']);
    expect(places(read(text, 'chart', { points: { 3: null } }))).toEqual([]);
  });

  it('a heading that could be two points is left open with both named', () => {
    const [issue] = read('Size,Bust (cm),Shoulder (cm)\n1,90,12\n').issues;
    expect(issue).toMatchObject({ code: 'openHeading', row: 1, column: 3 });
    expect(issue?.words).toContain('shoulder length or shoulder width');
  });

  it('a half width laid flat is not read, and says what to do', () => {
    const [issue] = read('Size,Hip (cm),½ chest (cm)\n1,90,46\n', 'finished').issues;
    expect(issue).toMatchObject({ code: 'flatHeading', column: 3 });
    expect(issue?.words).toContain('double');
  });

  it('finished measurements in the place of the chart are pointed out', () => {
    expect(places(read('Size,Finished bust (cm)\n1,100\n'))).toEqual(['otherTable 1:2']);
  });

  it('a sizes column may stand anywhere under “Size”; a second one is left out', () => {
    const table = read('UK size,Bust (cm),Size\n8,84,34\n10,88,36\n');
    expect(table.rows.map((row) => row.label)).toEqual(['34', '36']);
    expect(places(table)).toEqual(['secondSizeColumn 1:1']);
  });

  it('a first column of a point without any sizes column is an error', () => {
    expect(places(read('Bust (cm),Hip (cm)\n90,96\n'), 'error')).toEqual(['noSizeColumn 1:1']);
  });

  it('a table with sizes across says to turn it', () => {
    expect(places(read(',8,10,12\nBust,84,88,92\nHip,90,94,98\n'), 'error')).toEqual(['sizesAcross 1:null']);
  });

  it('no heading that names a point is an error', () => {
    expect(places(read('a,b\n1,2\n'), 'error')).toEqual(['noPoints 1:null']);
  });

  it('formula-looking headings and sizes are plain text', () => {
    const table = read('=Size(),Bust (cm),=1+1\n=1+1,90,\n');
    expect(table.rows[0]?.label).toBe('=1+1');
    expect(places(table, 'error')).toEqual([]);
  });
});

describe('rows', () => {
  it('a size twice is an error at the second, naming the first', () => {
    const table = read('Size,Bust (cm)\n10,84\n12,88\n10,92\n');
    expect(places(table)).toEqual(['sizeTwice 4:1']);
    expect(table.issues[0]?.words).toContain('row 2');
  });

  it('a row without a label is an error', () => {
    expect(places(read('Size,Bust (cm)\n10,84\n,88\n'))).toEqual(['noLabel 3:1']);
  });

  it('a note below the table is an error at its row', () => {
    expect(places(read('Size,Bust (cm)\n10,84\n* measured without seam allowance\n'), 'error')).toEqual([
      'emptyRow 3:null',
    ]);
  });

  it('a row with more cells than headings is an error that mentions decimal commas', () => {
    const table = read('Size,Bust (cm),Hip (cm)\n36,84,5,91,0\n');
    expect(places(table, 'error')).toEqual(['rowLonger 2:4']);
    expect(table.issues[0]?.words).toContain('semicolons');
  });

  it('a shorter row is a caution, and empty cells after the last heading are nothing', () => {
    expect(places(read('Size,Bust (cm),Hip (cm)\n36,84\n38,88,95,,\n'))).toEqual(['rowShorter 2:3']);
  });

  it('values that fall are cautions at their place', () => {
    const table = read('Size,Bust (cm),Hip (cm)\n8,84,90\n10,83,94\n12,88,93.5\n');
    expect(places(table)).toEqual(['valuesFall 3:2', 'valuesFall 4:3']);
  });

  it('headings without rows are an error', () => {
    expect(places(read('Size,Bust (cm)\n'), 'error')).toEqual(['noSizes 1:null']);
  });

  it('200 sizes are read and 201 are not', () => {
    const rows = (count: number) =>
      `Size,Bust (mm)\n${Array.from({ length: count }, (_, at) => `s${String(at)},${String(800 + at)}`).join('\n')}`;
    expect(places(read(rows(200)))).toEqual([]);
    expect(places(read(rows(201)))).toEqual(['tooManySizes 202:null']);
  });

  it('an unclosed quotation mark is an error', () => {
    expect(places(read('Size,Bust (cm)\n"10,84\n12,88\n'), 'error')).toEqual(['openQuote 2:null']);
  });
});
