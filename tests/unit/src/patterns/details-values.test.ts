import { describe, expect, it } from 'vitest';
import {
  missingDetails,
  savableDetails,
  seamLevels,
  toValues,
  wholeDetails,
} from '../../../../src/patterns/details-values.ts';

const whole = {
  ...toValues({}),
  title: ' Ferry dress ',
  kind: 'dress',
  silhouette: 'fitted',
  structure: 'woven',
} as const;

describe('the details of a pattern in a form', () => {
  it('begin with two side seams, four edges, and nothing chosen', () => {
    expect(toValues({})).toMatchObject({ kind: '', seamEdges: { bust: '4', waist: '4', hip: '4' } });
    expect(toValues({ seamEdges: { bust: 6 } }).seamEdges.bust).toBe('6');
  });

  it('become a whole pattern’s details, and keep what the form does not ask for', () => {
    const kept = { seamEdges: { upperArm: 2, bust: 6 }, compareAs: { waist: 'highHip' } } as const;
    expect(
      wholeDetails(kept).parse({ ...whole, seamEdges: { bust: '8', waist: '', hip: ' 4 ' } }),
    ).toMatchObject({
      title: 'Ferry dress',
      seamEdges: { bust: 8, hip: 4, upperArm: 2 },
      compareAs: { waist: 'highHip' },
    });
  });

  it('have no seam edges at a level that the garment does not have', () => {
    expect(seamLevels('trousers')).toEqual(['waist', 'hip']);
    expect(seamLevels('')).toEqual(['bust', 'waist', 'hip']);
    expect(wholeDetails({}).parse({ ...whole, kind: 'trousers' }).seamEdges).toEqual({ waist: 4, hip: 4 });
  });

  it('say in words what is missing, field by field', () => {
    expect(missingDetails(toValues({}), {}).map(({ name }) => name)).toEqual([
      'title',
      'kind',
      'silhouette',
      'structure',
    ]);
    expect(missingDetails({ ...whole, seamEdges: { ...whole.seamEdges, hip: '2.5' } }, {})).toEqual([
      { name: 'seamEdges.hip', words: 'Write a whole number from 1 to 24, such as 4.' },
    ]);
    expect(missingDetails({ ...whole, maker: 'x'.repeat(121) }, {})).toEqual([
      { name: 'maker', words: 'Use at most 120 characters.' },
    ]);
    expect(missingDetails(whole, {})).toEqual([]);
  });

  it('are saved half done, but for a field that is not right yet', () => {
    const typed = { ...toValues({}), title: 'Ferry dress', number: 'x'.repeat(41) };
    const { details, isAll } = savableDetails(typed, {});
    expect(details).toMatchObject({ title: 'Ferry dress', seamEdges: { bust: 4 } });
    expect(details).not.toHaveProperty('kind');
    // Absent, not empty: what was saved of it before stands.
    expect(details).not.toHaveProperty('number');
    expect(isAll).toBe(false);
    expect(savableDetails({ ...typed, number: 'S 4' }, {})).toMatchObject({
      isAll: true,
      details: { number: 'S 4' },
    });
  });
});
