import { eq } from 'drizzle-orm';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { adminAct } from '../../server/admin/admin.table.ts';
import { outbox } from '../../server/mail/mail.table.ts';
import { writeMail } from '../../server/mail/outbox.store.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { NOWHERE, pointersOf } from '../support/imports.ts';

let test: TestApp;
let admin: SignedIn;
beforeAll(async () => {
  test = await testApp();
  admin = await test.signedIn({ role: 'admin' });
});
beforeEach(async () => {
  await test.db.delete(outbox);
  await test.db.delete(adminAct);
});

const SECRET = 'https://leeway.example/new-password?token=very-secret';

async function mail(changes: Partial<typeof outbox.$inferInsert> = {}): Promise<string> {
  const id = await writeMail(test.db, 'Leeway <leeway@leeway.example>', {
    to: 'ada@example.org',
    userId: null,
    kind: 'reset-password',
    letter: { subject: 'x', greets: null, lines: [], link: { words: 'x', url: SECRET }, after: [] },
  });
  if (Object.keys(changes).length > 0) await test.db.update(outbox).set(changes).where(eq(outbox.id, id));
  return id;
}
const retry = (id: string, by = admin) => by.agent.post(`/api/admin/mail/${id}/retry`).send({});
const idsIn = async (query = '') => {
  const { body } = await admin.agent.get(`/api/admin/mail${query}`).expect(200);
  return (body.items as { id: string }[]).map(({ id }) => id);
};
const later = () => new Date(Date.now() + 3_600_000);

describe('mail: who may', () => {
  it('is for administrators alone', async () => {
    const id = await mail({ state: 'failed' });
    await test.anonymous().get('/api/admin/mail').expect(401);
    await test.anonymous().post(`/api/admin/mail/${id}/retry`).send({}).expect(401);
    for (const role of ['member', 'teacher'] as const) {
      const other = await test.signedIn({ role });
      await other.agent.get('/api/admin/mail').expect(403);
      await retry(id, other).expect(403);
    }
    expect(await idsIn('?state=failed')).toEqual([id]);
  });
});

describe('mail: the list', () => {
  it('says to whom, of what kind and how far, and never what it says', async () => {
    const id = await mail();
    const answer = await admin.agent.get('/api/admin/mail').expect(200);
    expect(answer.body).toEqual({
      items: [
        {
          id,
          to: 'ada@example.org',
          kind: 'reset-password',
          state: 'waiting',
          attempts: 0,
          nextAt: expect.stringMatching(/Z$/),
          createdAt: expect.stringMatching(/Z$/),
          sentAt: null,
          lastError: null,
        },
      ],
      page: 1,
      pageSize: 50,
      total: 1,
    });
    expect(answer.text).not.toContain('secret');
  });

  it('gives each state for itself, a page at a time', async () => {
    const waiting = [await mail(), await mail(), await mail()];
    const failed = await mail({ state: 'failed', attempts: 9, lastError: 'ECONNECTION' });
    const sent = await mail({ state: 'sent', sentAt: new Date() });
    expect((await idsIn()).sort()).toEqual([...waiting].sort());
    expect(await idsIn('?state=failed')).toEqual([failed]);
    expect(await idsIn('?state=sent')).toEqual([sent]);
    const pages = [...(await idsIn('?pageSize=2')), ...(await idsIn('?pageSize=2&page=2'))];
    expect(pages.sort()).toEqual([...waiting].sort());
  });

  it('points at a query it cannot use', async () => {
    const answer = await admin.agent.get('/api/admin/mail?state=lost&page=0').expect(422);
    expect(pointersOf(answer.body).sort()).toEqual(['/page', '/state']);
  });

  it('counts in the health what waits and what was given up', async () => {
    await mail();
    await mail({ state: 'sending' });
    await mail({ state: 'failed' });
    await mail({ state: 'sent' });
    const { body } = await admin.agent.get('/api/admin/health').expect(200);
    expect(body.mail).toEqual({ waiting: 2, failed: 1 });
  });
});

describe('mail: sending it on its way again', () => {
  it.each(['failed', 'waiting'] as const)('makes %s mail due at once and writes it down', async (state) => {
    const id = await mail({ state, attempts: 5, nextAt: later(), lastError: 'ECONNECTION' });
    const { body } = await retry(id).expect(200);
    expect(body).toMatchObject({ id, state: 'waiting', attempts: 0 });
    expect(Date.parse(body.nextAt as string)).toBeLessThanOrEqual(Date.now() + 1000);
    expect(await idsIn()).toEqual([id]);
    expect(await test.db.select().from(adminAct)).toMatchObject([
      { action: 'mailRetried', actorId: admin.user.id, subjectId: null, detail: { mailId: id } },
    ]);
  });

  it('leaves alone what is about to go anyway, and writes nothing down', async () => {
    await retry(await mail({ nextAt: new Date(Date.now() - 1000) })).expect(200);
    const sending = await mail({ state: 'sending' });
    expect((await retry(sending).expect(200)).body.state).toBe('sending');
    expect(await test.db.select().from(adminAct)).toEqual([]);
  });

  it('refuses what went out, and answers 404 to no mail', async () => {
    const id = await mail({ state: 'sent', sentAt: new Date() });
    const refused = await retry(id).expect(409);
    expect(refused.body.detail).toBe('This mail has gone out already.');
    await retry(NOWHERE).expect(404);
    await retry('x').expect(404);
    expect(await test.db.select().from(adminAct)).toEqual([]);
  });
});
