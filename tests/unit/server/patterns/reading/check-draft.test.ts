import { describe, expect, it } from 'vitest';
import type { DraftDetails } from '../../../../../shared/patterns/imports.schema.ts';
import { checkDraft, isReady } from '../../../../../server/patterns/reading/check-draft.ts';
import { read } from './reading.ts';

const DETAILS: DraftDetails = {
  title: 'Harbour dress',
  kind: 'dress',
  silhouette: 'fitted',
  structure: 'woven',
};
const chart = (...sizes: string[]) =>
  read(`Size,Bust (cm)\n${sizes.map((size, at) => `${size},${String(84 + 4 * at)}`).join('\n')}`);

describe('a draft as a whole', () => {
  it('with details and one table is ready', () => {
    expect(checkDraft(DETAILS, chart('10', '12'), null)).toEqual([]);
    expect(checkDraft(DETAILS, null, chart('10', '12'))).toEqual([]);
  });

  it.each(['title', 'kind', 'silhouette', 'structure'] as const)('says that the %s is missing', (field) => {
    const { [field]: _left, ...details } = DETAILS;
    expect(checkDraft(details, chart('10'), null).map((issue) => issue.code)).toEqual([`${field}Missing`]);
  });

  it('an empty title is missing', () => {
    expect(checkDraft({ ...DETAILS, title: '' }, chart('10'), null)).toHaveLength(1);
  });

  it('needs at least one table', () => {
    expect(checkDraft(DETAILS, null, null).map((issue) => issue.code)).toEqual(['noTable']);
  });

  it('needs the same sizes in both tables, and says which differ', () => {
    const [issue] = checkDraft(DETAILS, chart('10', '12', '14'), chart('10', '12', '16'));
    expect(issue).toMatchObject({ severity: 'error', code: 'sizesDiffer' });
    expect(issue?.words).toContain('“14” in the size chart only');
    expect(issue?.words).toContain('“16” in the finished measurements only');
  });

  it('needs them in the same order, and says where they part', () => {
    const [issue] = checkDraft(DETAILS, chart('10', '12', '14'), chart('10', '14', '12'));
    expect(issue?.code).toBe('sizeOrderDiffers');
    expect(issue?.words).toContain('size 2 is “12”');
  });

  it('an error in a table keeps it from being ready, a caution does not', () => {
    const bad = read('Size,Bust (cm)\n1,-3\n');
    const doubtful = read('Size,Bust\n1,92\n');
    expect(isReady([], [bad, null])).toBe(false);
    expect(doubtful.issues).not.toEqual([]);
    expect(isReady([], [doubtful, null])).toBe(true);
  });
});
