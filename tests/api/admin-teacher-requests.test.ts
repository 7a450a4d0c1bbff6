import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { user } from '../../server/account/account.table.ts';
import { adminAct, teacherRequest } from '../../server/admin/admin.table.ts';
import { outbox } from '../../server/mail/mail.table.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { NOWHERE, pointersOf } from '../support/imports.ts';

let test: TestApp;
let admin: SignedIn;
beforeAll(async () => {
  test = await testApp();
  admin = await test.signedIn({ role: 'admin', name: 'Sefa' });
});

const PATH = '/api/account/teacher-request';
const SENTENCE = 'I teach a class of twelve on Thursday evenings.';
const ask = (by: SignedIn, sentence = SENTENCE) => by.agent.post(PATH).send({ sentence });
const answerTo = (id: string, accept: unknown, by = admin) =>
  by.agent.post(`/api/admin/teacher-requests/${id}/answer`).send({ accept });
const listed = async (state = 'pending') =>
  (await admin.agent.get(`/api/admin/teacher-requests?pageSize=100&state=${state}`).expect(200)).body
    .items as {
    id: string;
  }[];

async function waiting(name = 'Ada') {
  const person = await test.signedIn({ name });
  const { body } = await ask(person).expect(201);
  return { person, id: (body as { id: string }).id };
}
const roleOf = async ({ agent }: SignedIn) => (await agent.get('/api/me')).body.user.role as string;
const mailTo = (id: string) => test.db.select().from(outbox).where(eq(outbox.userId, id));
const actsOn = (id: string) => test.db.select().from(adminAct).where(eq(adminAct.subjectId, id));

describe('asking to become a teacher', () => {
  it('is for somebody signed in', async () => {
    await test.anonymous().post(PATH).send({}).expect(401);
    await test.anonymous().delete(PATH).expect(401);
  });

  it('keeps the sentence until it is answered, and shows it to the administrator', async () => {
    const ada = await test.signedIn({ name: 'Ada' });
    const { body } = await ask(ada, `  ${SENTENCE} `).expect(201);
    const request = {
      id: expect.any(String),
      sentence: SENTENCE,
      state: 'pending',
      createdAt: expect.stringMatching(/Z$/),
      answeredAt: null,
    };
    expect(body).toEqual(request);
    expect(await listed()).toContainEqual({
      ...request,
      id: (body as { id: string }).id,
      person: { id: ada.user.id, name: 'Ada', email: ada.user.email },
    });
    const people = await admin.agent.get(`/api/admin/people?q=${ada.user.email}`);
    expect(people.body.items[0]).toMatchObject({ role: 'member', asksToTeach: true });
  });

  it('wants a sentence and nothing beside it', async () => {
    const ada = await test.signedIn();
    const send = async (body: object) => pointersOf((await ada.agent.post(PATH).send(body).expect(422)).body);
    expect(await send({})).toEqual(['/sentence']);
    expect(await send({ sentence: '         x         ' })).toEqual(['/sentence']);
    expect(await send({ sentence: 'x'.repeat(501) })).toEqual(['/sentence']);
    expect(await send({ sentence: SENTENCE, role: 'teacher' })).toEqual(['/role']);
    expect(await roleOf(ada)).toBe('member');
  });

  it('takes one at a time, also of two at once', async () => {
    const { person } = await waiting();
    await ask(person).expect(409);
    const twice = await test.signedIn();
    const answers = await Promise.all([ask(twice), ask(twice), ask(twice)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
    const rows = await test.db.select().from(teacherRequest).where(eq(teacherRequest.userId, twice.user.id));
    expect(rows).toHaveLength(1);
  });

  it.each(['teacher', 'admin'] as const)('says that a %s need not ask', async (role) => {
    const refused = await ask(await test.signedIn({ role })).expect(409);
    expect(refused.body.detail).toContain('already');
  });

  it('is withdrawn once, and can then be asked again', async () => {
    const { person, id } = await waiting();
    await person.agent.delete(PATH).expect(204);
    await person.agent.delete(PATH).expect(404);
    expect((await listed()).map((one) => one.id)).not.toContain(id);
    await answerTo(id, true).expect(404);
    await ask(person).expect(201);
  });

  it('goes with the account', async () => {
    const { person } = await waiting();
    await test.db.delete(user).where(eq(user.id, person.user.id));
    const rows = await test.db.select().from(teacherRequest).where(eq(teacherRequest.userId, person.user.id));
    expect(rows).toEqual([]);
  });
});

describe('answering: who may', () => {
  it('is for administrators alone', async () => {
    const { person, id } = await waiting();
    await test.anonymous().get('/api/admin/teacher-requests').expect(401);
    await test.anonymous().post(`/api/admin/teacher-requests/${id}/answer`).send({}).expect(401);
    for (const other of [person, await test.signedIn({ role: 'teacher' })]) {
      await other.agent.get('/api/admin/teacher-requests').expect(403);
      await answerTo(id, true, other).expect(403);
    }
    expect(await roleOf(person)).toBe('member');
  });
});

describe('answering', () => {
  it('makes a teacher of whoever is accepted, writes it down, and the list of the waiting is shorter', async () => {
    const { person, id } = await waiting('Oriel');
    const { body } = await answerTo(id, true).expect(200);
    expect(body).toMatchObject({
      id,
      state: 'accepted',
      answeredAt: expect.stringMatching(/Z$/),
      person: { name: 'Oriel' },
    });
    expect(await roleOf(person)).toBe('teacher');
    expect((await listed()).map((one) => one.id)).not.toContain(id);
    expect((await listed('accepted')).map((one) => one.id)).toContain(id);
    expect(await actsOn(person.user.id)).toMatchObject([
      { actorId: admin.user.id, through: 'page', action: 'teacherRequestAccepted' },
    ]);
    const mail = (await mailTo(person.user.id)).filter(({ kind }) => kind.startsWith('teacher-'));
    expect(mail).toMatchObject([
      { kind: 'teacher-accepted', to: person.user.email, state: 'waiting', payload: { greets: 'Oriel' } },
    ]);
  });

  it('leaves whoever is declined a member, who may ask again', async () => {
    const { person, id } = await waiting();
    await answerTo(id, false).expect(200);
    expect(await roleOf(person)).toBe('member');
    await person.agent.delete(PATH).expect(404);
    await ask(person, 'I teach in the community hall now.').expect(201);
    expect(await actsOn(person.user.id)).toMatchObject([{ action: 'teacherRequestDeclined' }]);
    const kinds = (await mailTo(person.user.id)).map(({ kind }) => kind);
    expect(kinds).toContain('teacher-declined');
    expect(kinds).not.toContain('teacher-accepted');
  });

  it('does nothing at the same answer again, and refuses the other one', async () => {
    const { person, id } = await waiting();
    const first = await answerTo(id, true).expect(200);
    const again = await answerTo(id, true).expect(200);
    expect(again.body).toEqual(first.body);
    const refused = await answerTo(id, false).expect(409);
    expect(refused.body.detail).toBe('This request was accepted already.');
    expect(await roleOf(person)).toBe('teacher');
    expect(await actsOn(person.user.id)).toHaveLength(1);
    const mail = (await mailTo(person.user.id)).filter(({ kind }) => kind.startsWith('teacher-'));
    expect(mail).toHaveLength(1);
  });

  it('changes nothing where the mail cannot be written', async () => {
    const { person, id } = await waiting();
    await test.db.execute('RENAME TABLE outbox TO outbox_away');
    try {
      await answerTo(id, true).expect(500);
    } finally {
      await test.db.execute('RENAME TABLE outbox_away TO outbox');
    }
    expect(test.takeErrors()).toHaveLength(1);
    expect(await roleOf(person)).toBe('member');
    expect(await actsOn(person.user.id)).toEqual([]);
    expect((await listed()).map((one) => one.id)).toContain(id);
  });

  it('takes one of two answers that come at once', async () => {
    const second = await test.signedIn({ role: 'admin' });
    const { person, id } = await waiting();
    const answers = await Promise.all([answerTo(id, true), answerTo(id, false, second)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(await actsOn(person.user.id)).toHaveLength(1);
  });

  it('takes no role from somebody who was made an administrator meanwhile', async () => {
    const { person, id } = await waiting();
    await admin.agent.patch(`/api/admin/people/${person.user.id}`).send({ role: 'admin' }).expect(200);
    await answerTo(id, true).expect(200);
    expect(await roleOf(person)).toBe('admin');
  });

  it('points at an answer that is none, and answers 404 to no request', async () => {
    const { id } = await waiting();
    expect(pointersOf((await answerTo(id, 'yes').expect(422)).body)).toEqual(['/accept']);
    await answerTo(NOWHERE, true).expect(404);
    await answerTo('x', true).expect(404);
    const query = await admin.agent.get('/api/admin/teacher-requests?state=lost').expect(422);
    expect(pointersOf(query.body)).toEqual(['/state']);
  });
});
