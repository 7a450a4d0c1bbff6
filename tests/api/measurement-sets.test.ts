import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';

let test: TestApp;
let ada: SignedIn;
let personId: string;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
});
beforeEach(async () => {
  personId = await newPerson();
});

const NOWHERE = '0190d5f2-0000-7000-8000-000000000000';
async function newPerson(): Promise<string> {
  const person = { name: 'Maria', stage: 'adult', chestWord: 'bust', unit: 'cm' };
  const { body } = await ada.agent.post('/api/people').send(person).expect(201);
  return (body as { id: string }).id;
}
const set = (typed: object, more: object = {}) => ({
  takenOn: '2025-01-31',
  takenBy: 'another',
  unit: 'cm',
  typed,
  ...more,
});
const take = (body: object, person = personId, agent = ada.agent) =>
  agent.post(`/api/people/${person}/measurement-sets`).send(body);

describe('measurement sets: who may', () => {
  it('asks everybody to sign in first', async () => {
    const nobody = test.anonymous();
    await nobody.get(`/api/people/${personId}/measurement-sets`).expect(401);
    await take({}, personId, nobody).expect(401);
    await nobody.get(`/api/measurement-sets/${NOWHERE}`).expect(401);
    await nobody.delete(`/api/measurement-sets/${NOWHERE}`).expect(401);
  });

  it.each(['member', 'teacher', 'admin'] as const)('hides another’s measurements from a %s', async (role) => {
    const { agent } = await test.signedIn({ role });
    const { body } = await take(set({ hip: '99' })).expect(201);
    const id = (body as { id: string }).id;
    await agent.get(`/api/people/${personId}/measurement-sets`).expect(404);
    await take(set({ hip: '99' }), personId, agent).expect(404);
    await agent.get(`/api/measurement-sets/${id}`).expect(404);
    await agent.delete(`/api/measurement-sets/${id}`).expect(404);
    await ada.agent.get(`/api/measurement-sets/${id}`).expect(200);
  });

  it('refuses a change that comes from another site', async () => {
    const { body } = await take(set({ hip: '99' })).expect(201);
    const from = { Origin: 'https://elsewhere.example' };
    await take(set({ hip: '98' }))
      .set(from)
      .expect(403);
    await ada.agent
      .delete(`/api/measurement-sets/${(body as { id: string }).id}`)
      .set(from)
      .expect(403);
    const list = await ada.agent.get(`/api/people/${personId}/measurement-sets`).expect(200);
    expect(list.body.total).toBe(1);
  });
});

describe('measurement sets: taking them', () => {
  it('keeps each text as typed beside its length in mm, in whatever unit it was written', async () => {
    const typed = {
      bust: ' 37 3/8 in ',
      waist: '72,5',
      hip: '37⅜″',
      neck: '360mm',
      height: '5.5 in',
      knee: '',
    };
    const { body } = await take(set(typed)).expect(201);
    const answer = await ada.agent.get(`/api/measurement-sets/${(body as { id: string }).id}`).expect(200);
    expect(answer.body).toEqual({
      id: expect.any(String),
      personId,
      takenOn: '2025-01-31',
      takenBy: 'another',
      unit: 'cm',
      notes: '',
      startedFromId: null,
      createdAt: expect.stringMatching(/Z$/),
      values: {
        bust: { typed: '37 3/8 in', unit: 'in', mm: 949.325 },
        waist: { typed: '72,5', unit: 'cm', mm: 725 },
        hip: { typed: '37⅜″', unit: 'in', mm: 949.325 },
        neck: { typed: '360mm', unit: 'mm', mm: 360 },
        height: { typed: '5.5 in', unit: 'in', mm: 5.5 * 25.4 },
      },
    });
  });

  it('reads a text without a unit in the unit that was chosen', async () => {
    for (const [unit, mm] of [
      ['mm', 40],
      ['cm', 400],
      ['in', 1016],
    ] as const) {
      const { body } = await take(set({ hip: '40' }, { unit })).expect(201);
      expect([unit, body.values.hip.mm]).toEqual([unit, mm]);
    }
  });

  it('tells of every text at fault at its own place, together with every other field', async () => {
    const typed = {
      bust: 'ninety',
      waist: '-70',
      hip: '99 5/4 in',
      thigh: '1,050',
      knee: '4001 mm',
      calf: '0',
      ankle: '4 mm',
      hemGirth: '120',
      nose: '5',
      neck: 36,
      wrist: '16',
      height: '1'.repeat(41),
    };
    const answer = await take(set(typed, { takenOn: '2025-02-30', takenBy: 'nobody' })).expect(422);
    const errors = answer.body.errors as { pointer: string; detail: string }[];
    const said = Object.fromEntries(errors.map(({ pointer, detail }) => [pointer, detail]));
    expect(Object.keys(said).sort()).toEqual(
      [
        ...[
          'bust',
          'waist',
          'hip',
          'thigh',
          'knee',
          'calf',
          'ankle',
          'hemGirth',
          'nose',
          'neck',
          'height',
        ].map((point) => `/typed/${point}`),
        '/takenOn',
        '/takenBy',
      ].sort(),
    );
    expect(errors).toHaveLength(13);
    expect(said['/typed/bust']).toBe('“ninety” is not a length: write it like 95.2.');
    expect(said['/typed/thigh']).toBe('“1,050” could be 1050 or 1.05: write one of those.');
    expect(said['/typed/knee']).toContain('4000 mm');
    expect(said['/typed/calf']).toContain('0.5 cm');
    expect(said['/typed/hemGirth']).toContain('measured on a garment');
    const list = await ada.agent.get(`/api/people/${personId}/measurement-sets`);
    expect(list.body.total).toBe(0);
  });

  it('asks for at least one measurement', async () => {
    for (const typed of [{}, { hip: '  ' }]) {
      const answer = await take(set(typed)).expect(422);
      expect(answer.body.errors).toEqual([{ pointer: '/typed', detail: 'Write at least one measurement.' }]);
    }
  });

  it('does not take a day that is still to come', async () => {
    const dayAfterTomorrow = new Date(Date.now() + 2 * 86_400_000).toISOString().slice(0, 10);
    for (const takenOn of [dayAfterTomorrow, '1899-12-31', '0000-01-01']) {
      const answer = await take(set({ hip: '99' }, { takenOn })).expect(422);
      expect(answer.body.errors).toEqual([{ pointer: '/takenOn', detail: expect.any(String) }]);
    }
    await take(set({ hip: '99' }, { takenOn: '2024-02-29' })).expect(201);
  });

  it('starts from a set of the same person and from no other', async () => {
    const first = await take(set({ hip: '99' })).expect(201);
    const startedFromId = (first.body as { id: string }).id;
    const next = await take(set({ hip: '100' }, { startedFromId })).expect(201);
    expect(next.body.startedFromId).toBe(startedFromId);
    for (const [from, person] of [
      [startedFromId, await newPerson()],
      [NOWHERE, personId],
    ] as const) {
      const answer = await take(set({ hip: '1' }, { startedFromId: from }), person).expect(422);
      expect(answer.body.errors).toEqual([{ pointer: '/startedFromId', detail: expect.any(String) }]);
    }
  });

  it('never changes one: there is no way to write over it', async () => {
    const { body } = await take(set({ hip: '99' })).expect(201);
    const at = `/api/measurement-sets/${(body as { id: string }).id}`;
    await ada.agent.patch(at).send({ notes: 'x' }).expect(404);
    await ada.agent
      .put(at)
      .send(set({ hip: '1' }))
      .expect(404);
    await ada.agent.get(at).expect(({ body: now }) => expect(now).toEqual(body));
  });
});

describe('measurement sets: lists and deleting', () => {
  it('lists the latest taken first, and the person names that one', async () => {
    for (const takenOn of ['2025-01-02', '2025-03-01', '2024-12-24']) {
      await take(set({ hip: '99' }, { takenOn })).expect(201);
    }
    const later = await take(set({ hip: '98' }, { takenOn: '2025-03-01' })).expect(201);
    const { body } = await ada.agent.get(`/api/people/${personId}/measurement-sets?pageSize=3`).expect(200);
    const days = (body.items as { takenOn: string }[]).map((one) => one.takenOn);
    expect([days, body.total]).toEqual([['2025-03-01', '2025-03-01', '2025-01-02'], 4]);
    expect(body.items[0].id).toBe(later.body.id);
    const person = await ada.agent.get(`/api/people/${personId}`);
    expect(person.body).toMatchObject({
      latestSetId: later.body.id,
      latestTakenOn: '2025-03-01',
      setCount: 4,
    });
  });

  it('deletes one, once, and a set that started from it stays', async () => {
    const first = await take(set({ hip: '99' })).expect(201);
    const id = (first.body as { id: string }).id;
    const next = await take(set({ hip: '98' }, { startedFromId: id })).expect(201);
    await ada.agent.delete(`/api/measurement-sets/${id}`).expect(204);
    await ada.agent.get(`/api/measurement-sets/${id}`).expect(404);
    await ada.agent.delete(`/api/measurement-sets/${id}`).expect(404);
    await ada.agent.get(`/api/measurement-sets/${(next.body as { id: string }).id}`).expect(200);
  });
});
