import { describe, expect, it } from 'vitest';
import {
  measureResolver,
  NOTHING_TYPED,
  startValues,
  toInput,
  type MeasureValues,
} from '../../../../src/people/measure-values.ts';
import type { MeasurementSet, Person } from '../../../../shared/people/people.schema.ts';

const PERSON: Person = {
  id: '0190a000-0000-7000-8000-000000000001',
  name: 'Ines',
  stage: 'adult',
  chestWord: 'bust',
  unit: 'cm',
  notes: '',
  createdAt: '2026-01-01T00:00:00Z',
  updatedAt: '2026-01-01T00:00:00Z',
  latestSetId: null,
  latestTakenOn: null,
  setCount: 0,
};
const LAST: MeasurementSet = {
  id: '0190a000-0000-7000-8000-000000000002',
  personId: PERSON.id,
  takenOn: '2026-10-12',
  takenBy: 'another',
  unit: 'in',
  notes: 'over a vest',
  startedFromId: null,
  createdAt: '2026-10-12T00:00:00Z',
  values: {
    waist: { typed: '33 1/2', unit: 'in', mm: 850.9 },
    hip: { typed: '112 cm', unit: 'cm', mm: 1120 },
  },
};
const values = (change: Partial<MeasureValues>): MeasureValues => ({
  ...startValues(PERSON, null, '2026-12-01'),
  ...change,
});
const check = async (given: MeasureValues) =>
  measureResolver(given, undefined, { fields: {}, shouldUseNativeValidation: false });

describe('what a measuring form begins with', () => {
  it('is empty and in the person’s unit the first time', () => {
    const start = startValues(PERSON, null, '2026-12-01');
    expect(start).toMatchObject({ takenOn: '2026-12-01', takenBy: 'self', unit: 'cm', startedFromId: null });
    expect(Object.values(start.typed).every((text) => text === '')).toBe(true);
  });

  it('is the last set as it was typed then, on today’s date and without its notes', () => {
    const start = startValues(PERSON, LAST, '2026-12-01');
    expect(start).toMatchObject({ unit: 'in', takenBy: 'another', startedFromId: LAST.id, notes: '' });
    expect(start.takenOn).toBe('2026-12-01');
    expect(start.typed).toMatchObject({ waist: '33 1/2', hip: '112 cm', bust: '' });
  });
});

describe('what a measuring form sends and refuses', () => {
  it('sends only the points that were written', () => {
    const input = toInput(values({ typed: { ...NOTHING_TYPED, waist: ' 84 ', hip: '  ' } }));
    expect(input.typed).toEqual({ waist: '84' });
  });

  it('takes every way of writing a length', async () => {
    const typed = { ...NOTHING_TYPED, waist: '84', hip: '44 3/8"', bust: '98,5 cm' };
    expect((await check(values({ typed }))).errors).toEqual({});
  });

  it('says of each text that is no length what would be right', async () => {
    const typed = { ...NOTHING_TYPED, waist: '-84', hip: '1,050', bust: '98' };
    const { errors } = await check(values({ typed }));
    expect(Object.keys(errors.typed ?? {})).toEqual(['waist', 'hip']);
    expect(errors.typed?.waist?.message).toContain('negative');
    expect(errors.typed?.hip?.message).toContain('1050');
  });

  it('asks for at least one measurement', async () => {
    expect((await check(values({}))).errors.root?.message).toBe('Write at least one measurement.');
  });

  it('asks for a day', async () => {
    const { errors } = await check(values({ takenOn: '', typed: { ...NOTHING_TYPED, waist: '84' } }));
    expect(errors.takenOn?.message).toBe('Give the day as year-month-day.');
  });
});
