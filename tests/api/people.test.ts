import { beforeAll, describe, expect, it } from 'vitest';
import { measurementSet, person } from '../../server/people/people.table.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';

let test: TestApp;
let ada: SignedIn;
let other: SignedIn;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
  other = await test.signedIn();
});

const NOWHERE = '0190d5f2-0000-7000-8000-000000000000';
const input = (name = 'Maria') => ({
  name,
  stage: 'adult',
  chestWord: 'bust',
  unit: 'cm',
  notes: 'likes room',
});
const create = async (by: SignedIn = ada, name?: string) =>
  (await by.agent.post('/api/people').send(input(name)).expect(201)).body as {
    id: string;
    updatedAt: string;
  };
const pointersOf = (body: { errors: { pointer: string }[] }) => body.errors.map((error) => error.pointer);

describe('people: who may', () => {
  it('asks everybody to sign in first, before it looks at what was sent', async () => {
    const nobody = test.anonymous();
    await nobody.get('/api/people').expect(401);
    await nobody.post('/api/people').send({}).expect(401);
    await nobody.get(`/api/people/${NOWHERE}`).expect(401);
    await nobody.patch(`/api/people/${NOWHERE}`).send({}).expect(401);
    await nobody.delete(`/api/people/${NOWHERE}`).expect(401);
  });

  it.each(['member', 'teacher', 'admin'] as const)(
    'hides another’s person from a %s as if they did not exist',
    async (role) => {
      const { agent } = await test.signedIn({ role });
      const { id } = await create();
      const answers = [
        await agent.get(`/api/people/${id}`),
        await agent.patch(`/api/people/${id}`).send({ name: 'Taken' }),
        await agent.delete(`/api/people/${id}`),
      ];
      const never = await agent.get(`/api/people/${NOWHERE}`).expect(404);
      for (const answer of answers) {
        expect(answer.status).toBe(404);
        expect({ ...answer.body, requestId: '' }).toEqual({ ...never.body, requestId: '' });
      }
      await agent.get('/api/people').expect(({ body }) => expect(body.items).toEqual([]));
      await ada.agent.get(`/api/people/${id}`).expect(({ body }) => expect(body.name).toBe('Maria'));
    },
  );

  it('refuses a change that comes from another site, and makes none', async () => {
    const { id } = await create();
    const from = { Origin: 'https://elsewhere.example' };
    await ada.agent.post('/api/people').set(from).send(input('Smuggled')).expect(403);
    await ada.agent.patch(`/api/people/${id}`).set(from).send({ name: 'Smuggled' }).expect(403);
    const refused = await ada.agent.delete(`/api/people/${id}`).set(from).expect(403);
    expect(refused.body.type).toBe('/problems/foreignOrigin');
    await ada.agent.get(`/api/people/${id}`).expect(({ body }) => expect(body.name).toBe('Maria'));
    await ada.agent.get('/api/people?q=Smuggled').expect(({ body }) => expect(body.total).toBe(0));
  });

  it('answers 404 to what is no id', async () => {
    await ada.agent.get('/api/people/1').expect(404);
    await ada.agent.get('/api/people/%00').expect(404);
    await ada.agent.get(`/api/people/${NOWHERE.toUpperCase()}`).expect(404);
  });
});

describe('people: writing them down', () => {
  it('keeps a person and gives them back to another request, and no column more', async () => {
    const { id } = await create();
    const answer = await ada.agent.get(`/api/people/${id}`).expect(200);
    expect(answer.body).toEqual({
      id,
      ...input(),
      latestSetId: null,
      latestTakenOn: null,
      setCount: 0,
      createdAt: expect.stringMatching(/Z$/),
      updatedAt: expect.stringMatching(/Z$/),
    });
  });

  it('tells of every field at fault at once, with what would be right', async () => {
    const answer = await ada.agent
      .post('/api/people')
      .send({ name: '  ', stage: 'old', unit: 'ell', notes: 'x'.repeat(2001) })
      .expect(422)
      .expect('content-type', /application\/problem\+json/);
    expect(answer.body.errors).toEqual([
      { pointer: '/name', detail: 'Write a name: it is how you will find this person.' },
      { pointer: '/stage', detail: 'Give adult or child.' },
      { pointer: '/chestWord', detail: 'Give bust or chest.' },
      { pointer: '/unit', detail: 'Give cm, mm or in.' },
      { pointer: '/notes', detail: 'Use at most 2000 characters.' },
    ]);
  });

  it('keeps accents, quotes, signs and other scripts as they were written', async () => {
    const name = `Zoë "O'Hara" 林 👩🏽‍🦱 \\ %_ <b>`;
    const { id } = await create(ada, name);
    await ada.agent.get(`/api/people/${id}`).expect(({ body }) => expect(body.name).toBe(name));
  });

  it('answers 422 to no body, 400 to broken JSON, 415 to a form, 413 to too much', async () => {
    const post = () => ada.agent.post('/api/people');
    expect((await post()).status).toBe(422);
    expect((await post().type('json').send('{')).status).toBe(400);
    expect((await post().type('form').send('name=x')).status).toBe(415);
    expect((await post().send({ ...input(), notes: 'x'.repeat(1_100_000) })).status).toBe(413);
  });
});

describe('people: changing them', () => {
  it('changes what was sent and leaves the rest', async () => {
    const { id } = await create();
    await ada.agent.patch(`/api/people/${id}`).send({ unit: 'in' }).expect(200);
    const answer = await ada.agent.get(`/api/people/${id}`);
    expect(answer.body).toMatchObject({ ...input(), unit: 'in', notes: 'likes room' });
  });

  it('changes nothing where nothing was sent, the time of the last change included', async () => {
    const { id, updatedAt } = await create();
    await ada.agent.patch(`/api/people/${id}`).send({}).expect(200);
    await ada.agent.patch(`/api/people/${id}`).send({ ownerId: other.user.id }).expect(200);
    await ada.agent.get(`/api/people/${id}`).expect(({ body }) => expect(body.updatedAt).toBe(updatedAt));
  });

  it('points at a field that cannot be changed so, and changes none', async () => {
    const { id } = await create();
    const answer = await ada.agent.patch(`/api/people/${id}`).send({ name: '', stage: 'child' }).expect(422);
    expect(pointersOf(answer.body)).toEqual(['/name']);
    await ada.agent.get(`/api/people/${id}`).expect(({ body }) => expect(body).toMatchObject(input()));
  });
});

describe('people: lists', () => {
  it('pages by name, and finds by part of a name whatever its accents', async () => {
    const by = await test.signedIn();
    for (const name of ['Dora', 'Ágnes', 'Béla', 'Csilla', '100% wool']) await create(by, name);
    const names = async (query: string) => {
      const { body } = await by.agent.get(`/api/people?${query}`).expect(200);
      return [
        (body.items as { name: string }[]).map((one) => one.name),
        body.page,
        body.pageSize,
        body.total,
      ];
    };
    expect(await names('pageSize=2')).toEqual([['100% wool', 'Ágnes'], 1, 2, 5]);
    expect(await names('pageSize=2&page=3')).toEqual([['Dora'], 3, 2, 5]);
    expect(await names('page=9')).toEqual([[], 9, 50, 5]);
    expect(await names('q=bel')).toEqual([['Béla'], 1, 50, 1]);
    expect(await names('q=%25')).toEqual([['100% wool'], 1, 50, 1]);
    expect(await names('q=_')).toEqual([[], 1, 50, 0]);
    expect(await names('q=%5C')).toEqual([[], 1, 50, 0]);
  });

  it('points at a page that cannot be', async () => {
    const answer = await ada.agent.get('/api/people?page=0&pageSize=1000').expect(422);
    expect(pointersOf(answer.body)).toEqual(['/page', '/pageSize']);
    await ada.agent.get('/api/people?page=x').expect(422);
    await ada.agent.get('/api/people?q=a&q=b').expect(422);
  });
});

describe('people: deleting them', () => {
  it('really deletes a person and their measurements, once', async () => {
    const { id } = await create();
    await ada.agent
      .post(`/api/people/${id}/measurement-sets`)
      .send({ takenOn: '2025-01-31', takenBy: 'self', unit: 'cm', typed: { hip: '99' } })
      .expect(201);
    await ada.agent.delete(`/api/people/${id}`).expect(204);
    await ada.agent.get(`/api/people/${id}`).expect(404);
    await ada.agent.delete(`/api/people/${id}`).expect(404);
    expect((await test.db.select().from(person)).some((row) => row.id === id)).toBe(false);
    expect((await test.db.select().from(measurementSet)).some((row) => row.personId === id)).toBe(false);
  });
});
