import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { user } from '../../server/account/account.table.ts';
import { adminAct } from '../../server/admin/admin.table.ts';
import { makeAdministrator } from '../../server/admin/roles.store.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { measuredPerson } from '../support/measured-person.ts';
import { NOWHERE, pointersOf } from '../support/imports.ts';

let test: TestApp;
let admin: SignedIn;
let ada: SignedIn;
beforeAll(async () => {
  test = await testApp();
  admin = await test.signedIn({ role: 'admin', name: 'Sefa' });
  ada = await test.signedIn({ name: 'Ada Zwirn' });
});

const roleOf = async (id: string) =>
  (await test.db.select({ role: user.role }).from(user).where(eq(user.id, id)))[0]?.role;
const acts = () => test.db.select().from(adminAct);
const change = (by: SignedIn, id: string, role: string) =>
  by.agent.patch(`/api/admin/people/${id}`).send({ role });

describe('the accounts: who may', () => {
  it('asks everybody to sign in first, before it looks at what was sent', async () => {
    await test.anonymous().get('/api/admin/people').expect(401);
    await test.anonymous().get('/api/admin/log').expect(401);
    await test.anonymous().patch(`/api/admin/people/${ada.user.id}`).send({}).expect(401);
  });

  it.each(['member', 'teacher'] as const)('refuses a %s, and changes nothing', async (role) => {
    const other = await test.signedIn({ role });
    const refused = await other.agent.get('/api/admin/people').expect(403);
    expect(refused.body.type).toBe('/problems/forbidden');
    await other.agent.get('/api/admin/log').expect(403);
    await change(other, other.user.id, 'admin').expect(403);
    await change(other, NOWHERE, 'admin').expect(403);
    expect(await roleOf(other.user.id)).toBe(role);
  });

  it('refuses a change that another site asks for', async () => {
    const asked = change(admin, ada.user.id, 'admin').set('Origin', 'https://elsewhere.example');
    expect((await asked).status).toBe(403);
    expect(await roleOf(ada.user.id)).toBe('member');
  });
});

describe('the accounts: the list', () => {
  it('says who is here and what they may do, and nothing that they keep', async () => {
    await measuredPerson(ada.agent, { hip: '1063' });
    const answer = await admin.agent.get('/api/admin/people?q=Zwirn').expect(200);
    expect(answer.body).toEqual({
      items: [
        {
          id: ada.user.id,
          name: 'Ada Zwirn',
          email: ada.user.email,
          role: 'member',
          emailVerified: expect.any(Boolean),
          createdAt: expect.stringMatching(/Z$/),
          asksToTeach: false,
        },
      ],
      page: 1,
      pageSize: 50,
      total: 1,
    });
    const everything = await admin.agent.get('/api/admin/people?pageSize=100').expect(200);
    expect(JSON.stringify(everything.body)).not.toContain('1063');
    expect(JSON.stringify(everything.body)).not.toContain('Maria');
  });

  it('still hides what somebody keeps from an administrator', async () => {
    const { personId, measurementSetId } = await measuredPerson(ada.agent);
    await admin.agent.get(`/api/people/${personId}`).expect(404);
    await admin.agent.get(`/api/measurement-sets/${measurementSetId}`).expect(404);
  });

  it('finds by address in any capitals, by role, and takes wildcards literally', async () => {
    const find = async (query: string) => {
      const { body } = await admin.agent.get(`/api/admin/people?${query}`).expect(200);
      return (body.items as { id: string }[]).map(({ id }) => id);
    };
    expect(await find(`q=${ada.user.email.toUpperCase()}`)).toEqual([ada.user.id]);
    expect(await find('role=admin')).toEqual([admin.user.id]);
    expect(await find(`role=teacher&q=${ada.user.email}`)).toEqual([]);
    expect(await find('q=%25')).toEqual([]);
    expect(await find('q=_')).toEqual([]);
  });

  it('gives a page at a time, each account once', async () => {
    const first = await admin.agent.get('/api/admin/people?pageSize=2&page=1').expect(200);
    const second = await admin.agent.get('/api/admin/people?pageSize=2&page=2').expect(200);
    const ids = [...first.body.items, ...second.body.items].map((one: { id: string }) => one.id);
    expect(new Set(ids).size).toBe(4);
    expect(second.body).toMatchObject({ page: 2, pageSize: 2, total: first.body.total });
    const beyond = await admin.agent.get('/api/admin/people?page=1000').expect(200);
    expect(beyond.body.items).toEqual([]);
  });

  it('points at a query it cannot use', async () => {
    const answer = await admin.agent.get('/api/admin/people?page=0&pageSize=101&role=boss').expect(422);
    expect(pointersOf(answer.body).sort()).toEqual(['/page', '/pageSize', '/role']);
  });
});

describe('roles', () => {
  it('changes a role, which the next request of that person knows, and writes it down', async () => {
    const grace = await test.signedIn({ name: 'Grace' });
    await grace.agent.get('/api/admin/people').expect(403);
    const before = (await acts()).length;
    const answer = await change(admin, grace.user.id, 'admin').expect(200);
    expect(answer.body).toMatchObject({ id: grace.user.id, role: 'admin' });
    await grace.agent.get('/api/me').expect(({ body }) => expect(body.user.role).toBe('admin'));
    await grace.agent.get('/api/admin/people').expect(200);
    const { body } = await admin.agent.get('/api/admin/log?pageSize=1').expect(200);
    expect(body.total).toBe(before + 1);
    expect(body.items).toEqual([
      {
        id: expect.any(String),
        at: expect.stringMatching(/Z$/),
        by: { id: admin.user.id, name: 'Sefa' },
        through: 'page',
        action: 'roleChanged',
        on: { id: grace.user.id, name: 'Grace' },
        detail: { from: 'member', to: 'admin' },
      },
    ]);
    await change(admin, grace.user.id, 'teacher').expect(200);
    await grace.agent.get('/api/admin/people').expect(403);
  });

  it('does nothing for the role somebody has already, and writes nothing down', async () => {
    const before = (await acts()).length;
    const { user: person } = await test.signedIn();
    const answer = await change(admin, person.id, 'member').expect(200);
    expect(answer.body).toMatchObject({ role: 'member' });
    expect((await acts()).length).toBe(before);
  });

  it('refuses what is no role and anything beside it, and answers 404 to nobody', async () => {
    const url = `/api/admin/people/${ada.user.id}`;
    const wrong = await admin.agent.patch(url).send({ role: 'owner', name: 'Eve' }).expect(422);
    expect(pointersOf(wrong.body).sort()).toEqual(['/name', '/role']);
    expect(pointersOf((await admin.agent.patch(url).send({}).expect(422)).body)).toEqual(['/role']);
    await change(admin, NOWHERE, 'teacher').expect(404);
    await change(admin, 'x', 'teacher').expect(404);
  });

  it('keeps the last administrator, who may step down once there is another', async () => {
    const refused = await change(admin, admin.user.id, 'member').expect(409);
    expect(refused.body.detail).toBe('This is the only administrator: make somebody else one first.');
    expect(await roleOf(admin.user.id)).toBe('admin');
    const second = await test.signedIn({ role: 'admin' });
    await change(second, second.user.id, 'member').expect(200);
    await change(admin, admin.user.id, 'teacher').expect(409);
  });

  it('keeps one of two administrators that step down at the same moment', async () => {
    for (let round = 0; round < 5; round += 1) {
      const second = await test.signedIn({ role: 'admin' });
      const answers = await Promise.all([
        change(admin, admin.user.id, 'member'),
        change(second, second.user.id, 'member'),
      ]);
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
      const left = await test.db.select().from(user).where(eq(user.role, 'admin'));
      expect(left.length).toBe(1);
      await test.db.update(user).set({ role: 'member' });
      await test.db.update(user).set({ role: 'admin' }).where(eq(user.id, admin.user.id));
    }
  });

  it('leaves neither the role nor the line where one of the two fails', async () => {
    const grace = await test.signedIn();
    const before = (await acts()).length;
    await test.db.execute('RENAME TABLE admin_act TO admin_act_away');
    try {
      await change(admin, grace.user.id, 'teacher').expect(500);
    } finally {
      await test.db.execute('RENAME TABLE admin_act_away TO admin_act');
    }
    expect(test.takeErrors()).toHaveLength(1);
    expect(await roleOf(grace.user.id)).toBe('member');
    expect((await acts()).length).toBe(before);
  });
});

describe('the log of acts', () => {
  it('keeps the act and empties the place of somebody whose account was deleted', async () => {
    const gone = await test.signedIn({ name: 'Gone' });
    await change(admin, gone.user.id, 'teacher').expect(200);
    await test.db.delete(user).where(eq(user.id, gone.user.id));
    const { body } = await admin.agent.get('/api/admin/log?pageSize=1').expect(200);
    expect(body.items[0]).toMatchObject({ action: 'roleChanged', by: { name: 'Sefa' }, on: null });
    expect(JSON.stringify(await acts())).not.toContain(gone.user.id);
  });

  it('gives a page at a time, the latest first', async () => {
    const { body } = await admin.agent.get('/api/admin/log?pageSize=100').expect(200);
    const moments = (body.items as { at: string }[]).map(({ at }) => at);
    expect(moments.length).toBeGreaterThan(3);
    expect(moments).toEqual([...moments].sort().reverse());
    await admin.agent.get('/api/admin/log?page=0').expect(422);
  });
});

describe('the first administrator', () => {
  it('is made of an existing account by its address in any capitals, once, and written down', async () => {
    const first = await test.signedIn({ name: 'First' });
    const before = (await acts()).length;
    expect(await makeAdministrator(test.db, ` ${first.user.email.toUpperCase()} `)).toBe('made');
    expect(await makeAdministrator(test.db, first.user.email)).toBe('already');
    expect(await makeAdministrator(test.db, 'nobody@example.org')).toBe('unknown');
    expect(await roleOf(first.user.id)).toBe('admin');
    expect((await acts()).length).toBe(before + 1);
    const { body } = await first.agent.get('/api/admin/log?pageSize=1').expect(200);
    expect(body.items[0]).toMatchObject({
      by: null,
      through: 'command',
      action: 'administratorMade',
      on: { name: 'First' },
      detail: { from: 'member', to: 'admin' },
    });
  });
});
