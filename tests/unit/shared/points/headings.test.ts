import { describe, expect, it } from 'vitest';
import { CATALOGUE } from '../../../../shared/points/catalogue.ts';
import { isSizeHeading, matchHeading } from '../../../../shared/points/headings.ts';
import { POINT_IDS } from '../../../../shared/points/point-ids.ts';

const short = (heading: string, table: 'chart' | 'finished' | null = null) => {
  const { point, sureness, unit } = matchHeading(heading, table);
  return [point, sureness, unit];
};

describe('matching a heading', () => {
  const names = POINT_IDS.flatMap((point) => {
    const { name, chestName = name, shortName, shortChestName = shortName, otherNames } = CATALOGUE[point];
    return [name, chestName, shortName, shortChestName, ...otherNames].map((text) => ({ point, text }));
  });

  it('finds every name of every point of the catalogue, and no name belongs to two', () => {
    const missed = names.filter(({ point, text }) => {
      // “Sleeve length” is settled by its table: a body's arm, a garment's sleeve.
      const match = matchHeading(text, 'finished');
      return match.point !== point;
    });
    expect(missed).toEqual([]);
    expect(names.length).toBeGreaterThan(400);
  });

  it('finds every id, as an export may write it', () => {
    for (const point of POINT_IDS) expect(short(`${point} (mm)`)).toEqual([point, 'exact', 'mm']);
  });

  it.each([
    ['Bust (in)', 'bust', 'in'],
    ['Waist, cm', 'waist', 'cm'],
    ['HIP [mm]', 'hip', 'mm'],
    ['Hips in inches', 'hip', 'in'],
    ['Hip"', 'hip', 'in'],
    ['bust_cm', 'bust', 'cm'],
    ['Chest – centimetres', 'bust', 'cm'],
    ['  biceps  ', 'upperArm', null],
    ['In-seam', 'insideLeg', null],
    ['Chest/Bust Girth', 'bust', null],
    ['Under-Bust Girth', 'underbust', null],
    ['Mid-Neck Girth', 'neck', null],
    ['Finished bust', 'bust', null],
    ['Bust measurement', 'bust', null],
    ['To fit chest', 'bust', null],
    ['Neck to waist', 'backWaistLength', null],
    ['Left thigh', 'thighLeft', null],
    ['Biceps (R) cm', 'upperArmRight', 'cm'],
    ['ＢＵＳＴ', 'bust', null],
    ['Bust (cm/in)', 'bust', null],
  ])('%s is exactly %s', (heading, point, unit) => {
    expect(short(heading)).toEqual([point, 'exact', unit]);
  });

  it.each([
    ['Finished hip width', 'hip', true],
    ['thighs', 'thigh', false],
    ['Hip (at widest)', 'hip', false],
    ['Hem width', 'hemGirth', true],
  ])('%s is likely %s', (heading, point, flat) => {
    expect(matchHeading(heading)).toMatchObject({ point, sureness: 'likely', flat });
  });

  it.each([
    ['Length', 'chart', null],
    ['Length', 'finished', 'garmentLength'],
    ['CB length', 'chart', 'backWaistLength'],
    ['CB length', 'finished', 'garmentLength'],
    ['Sleeve', 'chart', 'armLength'],
    ['Sleeve', 'finished', 'sleeveLength'],
    ['Finished sleeve', 'chart', 'sleeveLength'],
  ] as const)('%s over the %s table is %s: the table settles it', (heading, table, point) => {
    expect(matchHeading(heading, table)).toMatchObject({ point, sureness: point ? 'likely' : 'none' });
  });

  it.each([
    ['Shoulder', ['shoulderLength', 'shoulderWidth']],
    ['Chest width', ['bust', 'frontWidth']],
    ['CB length', ['backWaistLength', 'garmentLength']],
    ['Rise', ['bodyRise', 'crotchLengthFront', 'crotchLength']],
  ])('%s could be more than one point: it is not guessed', (heading, between) => {
    expect(matchHeading(heading)).toMatchObject({ point: null, sureness: 'none', between });
  });

  it.each(['', ' ', '=1+1', "'=1+1", 'Foo', 'Bust min', 'Waist to something', '123', '🙂', 'x'.repeat(5000)])(
    '“%s” is no point',
    (heading) => expect(short(heading)).toEqual([null, 'none', null]),
  );

  it.each(['Half chest', '½ chest', '1/2 hip', 'Bust flat', 'Pit to pit'])(
    '%s is a flat half width',
    (heading) => {
      expect(matchHeading(heading)).toMatchObject({ point: null, flat: true });
    },
  );

  it('tells what a heading says of itself', () => {
    expect(matchHeading('Finished waist').says).toBe('finished');
    expect(matchHeading('Body waist').says).toBe('chart');
    expect(matchHeading('Waist').says).toBeNull();
  });
});

describe('a heading over the names of sizes', () => {
  it.each(['Size', 'sizes', 'UK size', 'Sizes (EU)', 'Size label'])('%s', (heading) => {
    expect(isSizeHeading(heading)).toBe(true);
  });

  it.each(['', 'Bust size', 'Collar size', 'Bust', 'oversize'])('not “%s”', (heading) => {
    expect(isSizeHeading(heading)).toBe(false);
  });
});
