import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { user as userTable } from '../../server/account/account.table.ts';
import { PASSWORD, testApp, type TestApp } from '../support/app.ts';
import { archiveOf, busyPerson } from '../support/busy-person.ts';
import { tablesNaming } from '../support/every-table.ts';
import { bytesKept, CHART, expectNothingLost, start } from '../support/imports.ts';
import { mailTo } from '../support/outbox.ts';

let test: TestApp;
beforeAll(async () => {
  test = await testApp({ limits: true });
});

describe('deleting an account', () => {
  it('leaves nothing of it in any table or file, and everything of everybody else', async () => {
    const hal = await busyPerson(test, 'Haldora');
    const ida = await busyPerson(test, 'Idalina');
    await test
      .anonymous()
      .post('/api/auth/sign-in/email')
      .send({ email: hal.user.email, password: 'wrong one' });
    await archiveOf(hal);
    await archiveOf(ida);
    const others = await tablesNaming(test.db, ida.names);
    const before = await tablesNaming(test.db, hal.names);
    expect(Object.keys(before)).toEqual(Object.keys(others));
    const files = bytesKept(test).length;

    const answer = await hal.agent.delete('/api/account').send({ password: PASSWORD }).expect(204);
    expect(String(answer.headers['set-cookie'])).toMatch(/session_token=;/);
    expect(await tablesNaming(test.db, hal.names)).toEqual({});
    expect(await tablesNaming(test.db, ida.names)).toEqual(others);
    expect(bytesKept(test)).toHaveLength(files - 3);
    await expectNothingLost(test);
    expect((await hal.agent.get('/api/me')).body).toEqual({ user: null });
    expect((await ida.agent.get('/api/people')).body.total).toBe(1);
    const signIn = { email: hal.user.email, password: PASSWORD };
    await test.anonymous().post('/api/auth/sign-in/email').send(signIn).expect(401);
    expect(await mailTo(test.db, hal.user.email)).toEqual([]);
  });

  it('asks for the password again, and for its owner', async () => {
    const { agent, user } = await test.signedIn();
    const wrong = await agent.delete('/api/account').send({ password: 'not this one' }).expect(422);
    expect(wrong.body.errors[0].pointer).toBe('/password');
    await agent.delete('/api/account').send({}).expect(422);
    await agent
      .delete('/api/account')
      .send({ password: PASSWORD })
      .set('Origin', 'https://elsewhere.example')
      .expect(403);
    await test.anonymous().delete('/api/account').send({ password: PASSWORD }).expect(401);
    expect(await test.db.select().from(userTable).where(eq(userTable.id, user.id))).toHaveLength(1);
  });

  it('happens once where it is asked for twice at once', async () => {
    const person = await busyPerson(test, 'Jolanta');
    const answers = await Promise.all(
      [1, 2].map(() => person.agent.delete('/api/account').send({ password: PASSWORD })),
    );
    for (const { status } of answers) expect([204, 401, 422]).toContain(status);
    expect(answers.map(({ status }) => status)).toContain(204);
    expect(await tablesNaming(test.db, person.names)).toEqual({});
  });

  it('leaves nothing where something is added meanwhile', async () => {
    const person = await busyPerson(test, 'Katarzyna');
    const adding = Array.from({ length: 6 }, (_, at) =>
      person.agent
        .post('/api/people')
        .send({ name: `Katarzyna ${String(at)}`, stage: 'adult', chestWord: 'bust', unit: 'mm' }),
    );
    const uploading = start(person).then(
      ({ id }) =>
        person.agent.put(`/api/imports/${id}/tables/chart`).attach('file', Buffer.from(CHART), 'c.csv'),
      () => null,
    );
    const deleting = person.agent.delete('/api/account').send({ password: PASSWORD });
    const [deleted, , ...added] = await Promise.all([deleting, uploading, ...adding]);
    expect(deleted.status).toBe(204);
    for (const { status } of added) expect([201, 401, 409]).toContain(status);
    expect(await tablesNaming(test.db, person.names)).toEqual({});
    await expectNothingLost(test);
  });
});
