import { createHash } from 'node:crypto';
import { eq } from 'drizzle-orm';
import supertest from 'supertest';
import { beforeAll, describe, expect, it } from 'vitest';
import { user as userTable } from '../../server/account/account.table.ts';
import { accessToken } from '../../server/tokens/tokens.table.ts';
import {
  accessTokenSchema,
  newTokenSchema,
  TOKENS_MAX,
  TOKEN_SCOPES,
} from '../../shared/tokens/tokens.schema.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { NOWHERE, pointersOf } from '../support/imports.ts';

let test: TestApp;
let ada: SignedIn;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
});

const make = async (by: SignedIn, more: object = {}) =>
  newTokenSchema.parse(
    (
      await by.agent
        .post('/api/tokens')
        .send({ name: 'Spreadsheet', scopes: ['people:read'], ...more })
        .expect(201)
    ).body,
  );
/** A script: no cookie, no Origin. */
const script = (token: string) => supertest.agent(test.app).set('Authorization', `Bearer ${token}`);
const rowOf = async (id: string) =>
  (await test.db.select().from(accessToken).where(eq(accessToken.id, id)))[0];

describe('making a token', () => {
  it('shows it once, and keeps nothing that it could be made from again', async () => {
    const made = await make(ada);
    expect(made.token).toMatch(/^leeway_[\w-]{43}$/);
    expect(made.token.startsWith(made.prefix)).toBe(true);
    expect(made.token.length - made.prefix.length).toBeGreaterThan(30);
    const row = await rowOf(made.id);
    expect(row?.hash).toBe(createHash('sha256').update(made.token).digest('hex'));
    expect(JSON.stringify(row)).not.toContain(made.token.slice(made.prefix.length));

    const listed = await ada.agent.get('/api/tokens').expect(200);
    expect((listed.body.items as { id: string }[]).map(({ id }) => id)).toContain(made.id);
    expect(JSON.stringify(listed.body)).not.toContain(made.token);
    for (const item of listed.body.items)
      expect(Object.keys(item).sort()).toEqual(Object.keys(accessTokenSchema.shape).sort());
  });

  it('gives two tokens of one name that differ', async () => {
    const [one, other] = [await make(ada), await make(ada)];
    expect(one.token).not.toBe(other.token);
  });

  it.each([
    ['no name', { name: '  ' }, '/name'],
    ['a name that is too long', { name: 'n'.repeat(81) }, '/name'],
    ['no scope', { scopes: [] }, '/scopes'],
    ['an unknown scope', { scopes: ['admin:write'] }, '/scopes/0'],
    ['a scope twice', { scopes: ['plans:read', 'plans:read'] }, '/scopes'],
    ['an end that is past', { expiresAt: '2020-01-01T00:00:00Z' }, '/expiresAt'],
    ['an end beyond all calendars', { expiresAt: '9999-12-31T23:59:59Z' }, '/expiresAt'],
    ['an end that is no moment', { expiresAt: 'tomorrow' }, '/expiresAt'],
  ])('refuses %s, pointing at it', async (_what, more, pointer) => {
    const refused = await ada.agent
      .post('/api/tokens')
      .send({ name: 'n', scopes: ['plans:read'], ...more })
      .expect(422);
    expect(pointersOf(refused.body)).toEqual([pointer]);
  });

  it('stops at the most an account may have, also where two are asked for at once', async () => {
    const cy = await test.signedIn();
    for (let count = 1; count < TOKENS_MAX; count += 1) await make(cy);
    const ask = () => cy.agent.post('/api/tokens').send({ name: 'last', scopes: ['plans:read'] });
    const statuses = await Promise.all([ask(), ask(), ask()].map(async (asked) => (await asked).status));
    expect(statuses.sort()).toEqual([201, 409, 409]);
    expect((await cy.agent.get('/api/tokens').expect(200)).body.items).toHaveLength(TOKENS_MAX);
  });
});

describe('using a token', () => {
  it('does what its scopes allow, without a cookie and without an Origin', async () => {
    const { token } = await make(ada, { scopes: ['people:read', 'people:write'] });
    const added = await script(token)
      .post('/api/people')
      .send({ name: 'Noor', stage: 'adult', chestWord: 'bust', unit: 'cm' })
      .expect(201);
    await ada.agent.get(`/api/people/${added.body.id}`).expect(200);
    await script(token).get(`/api/people/${added.body.id}`).expect(200);
    await script(token).head(`/api/people/${added.body.id}`).expect(200);
  });

  it('is refused outside its scopes, which are told; writing does not include reading', async () => {
    const { token } = await make(ada, { scopes: ['people:write'] });
    const refused = await script(token).get('/api/people').expect(403);
    expect(refused.body).toMatchObject({
      type: '/problems/outsideScope',
      detail: expect.stringContaining('people:read'),
    });
    expect(refused.headers['www-authenticate']).toContain('scope="people:read"');
  });

  it.each(['/api/tokens', '/api/me'])('never opens %s, whatever its scopes', async (address) => {
    const { token } = await make(ada, { scopes: TOKEN_SCOPES });
    const refused = await script(token).get(address).expect(403);
    expect(refused.body.type).toBe('/problems/outsideScope');
  });

  it('cannot make or withdraw tokens', async () => {
    const { id, token } = await make(ada, { scopes: TOKEN_SCOPES });
    await script(token)
      .post('/api/tokens')
      .send({ name: 'child', scopes: ['plans:read'] })
      .expect(403);
    await script(token).delete(`/api/tokens/${id}`).expect(403);
    expect(await rowOf(id)).toBeDefined();
  });

  it('finds nothing of another’s', async () => {
    const bo = await test.signedIn();
    const { token } = await make(bo, { scopes: TOKEN_SCOPES });
    const mine = await ada.agent
      .post('/api/people')
      .send({ name: 'Lu', stage: 'adult', chestWord: 'bust', unit: 'cm' })
      .expect(201);
    await script(token).get(`/api/people/${mine.body.id}`).expect(404);
  });

  it.each([
    ['one that never was', 'leeway_AAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAA'],
    ['an empty one', ''],
    ['half a one', 'leeway_'],
    ['a very long one', 'x'.repeat(5000)],
  ])('refuses %s as signed out', async (_what, token) => {
    const refused = await script(token).get('/api/people').expect(401);
    expect(refused.body.type).toBe('/problems/signedOut');
    expect(refused.headers['www-authenticate']).toContain('invalid_token');
  });

  it('refuses its hash in its place: who reads the table can use nothing in it', async () => {
    const { id } = await make(ada);
    await script((await rowOf(id))?.hash ?? '')
      .get('/api/people')
      .expect(401);
  });

  it('refuses one in other letters', async () => {
    const { token } = await make(ada);
    await script(token.toUpperCase()).get('/api/people').expect(401);
  });

  it('refuses one that has expired', async () => {
    const { id, token } = await make(ada, { expiresAt: new Date(Date.now() + 3_600_000).toISOString() });
    await script(token).get('/api/people').expect(200);
    await test.db
      .update(accessToken)
      .set({ expiresAt: new Date(Date.now() - 1) })
      .where(eq(accessToken.id, id));
    await script(token).get('/api/people').expect(401);
  });

  it('ends with its account', async () => {
    const dee = await test.signedIn();
    const { id, token } = await make(dee);
    await test.db.delete(userTable).where(eq(userTable.id, dee.user.id));
    await script(token).get('/api/people').expect(401);
    expect(await rowOf(id)).toBeUndefined();
  });

  it('is noted at most once a minute', async () => {
    const { id, token } = await make(ada);
    expect((await rowOf(id))?.lastUsedAt).toBeNull();
    await script(token).get('/api/people').expect(200);
    const first = (await rowOf(id))?.lastUsedAt;
    expect(Math.abs((first?.getTime() ?? 0) - Date.now())).toBeLessThan(10_000);
    await script(token).get('/api/people').expect(200);
    expect((await rowOf(id))?.lastUsedAt).toEqual(first);

    const before = new Date(Date.now() - 61_000);
    await test.db.update(accessToken).set({ lastUsedAt: before }).where(eq(accessToken.id, id));
    await script(token).get('/api/people').expect(200);
    expect((await rowOf(id))?.lastUsedAt?.getTime()).toBeGreaterThan(before.getTime() + 60_000);
  });
});

describe('withdrawing a token', () => {
  it('refuses it from then on', async () => {
    const { id, token } = await make(ada);
    await script(token).get('/api/people').expect(200);
    await ada.agent.delete(`/api/tokens/${id}`).expect(204);
    await script(token).get('/api/people').expect(401);
    await ada.agent.delete(`/api/tokens/${id}`).expect(404);
  });

  it('is nobody else’s to do', async () => {
    const bo = await test.signedIn({ role: 'admin' });
    const { id, token } = await make(ada);
    await bo.agent.delete(`/api/tokens/${id}`).expect(404);
    await bo.agent.delete(`/api/tokens/${NOWHERE}`).expect(404);
    await script(token).get('/api/people').expect(200);
  });
});

describe('a token beside a session', () => {
  const cookieOf = async () => {
    const response = await test.auth.api.signInEmail({
      body: { email: ada.user.email, password: 'a quiet tape measure' },
      asResponse: true,
    });
    return response.headers
      .getSetCookie()
      .map((text) => text.split(';')[0])
      .join('; ');
  };

  it('cannot be a made-up word that opens the session to another site', async () => {
    const cookie = await cookieOf();
    const forged = supertest(test.app)
      .post('/api/people')
      .set('Cookie', cookie)
      .set('Origin', 'https://evil.example');
    await forged
      .set('Authorization', 'Bearer anything')
      .send({ name: 'X', stage: 'adult', chestWord: 'bust', unit: 'cm' })
      .expect(401);
  });

  it('leaves a change without token to our own pages', async () => {
    const cookie = await cookieOf();
    for (const authorization of ['', 'Basic YTpi', 'Token abc']) {
      await supertest(test.app)
        .delete(`/api/people/${NOWHERE}`)
        .set('Cookie', cookie)
        .set('Authorization', authorization)
        .expect(403);
    }
  });

  it('lets nobody sign in from another site', async () => {
    await supertest(test.app)
      .post('/api/auth/sign-in/email')
      .set('Authorization', 'Bearer anything')
      .set('Origin', 'https://evil.example')
      .send({ email: ada.user.email, password: 'a quiet tape measure' })
      .expect(403);
  });

  it('leaves the session in force where a proxy adds its own kind of authorization', async () => {
    const cookie = await cookieOf();
    await supertest(test.app)
      .get('/api/people')
      .set('Cookie', cookie)
      .set('Authorization', 'Basic YTpi')
      .expect(200);
  });
});
