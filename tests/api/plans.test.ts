import { eq } from 'drizzle-orm';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { pattern } from '../../server/patterns/patterns.table.ts';
import { savedPlan } from '../../server/plans/plans.table.ts';
import { ENGINE_VERSION, planFit } from '../../shared/fit/plan-fit.ts';
import type { SavedPlan } from '../../shared/plans/plans.schema.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { measuredPerson } from '../support/measured-person.ts';
import { insertPattern } from '../support/pattern-rows.ts';

let test: TestApp;
let ada: SignedIn;
let personId: string;
let measurementSetId: string;
let patternId: string;
let revisionId: string;
beforeAll(async () => {
  test = await testApp();
});
beforeEach(async () => {
  ada = await test.signedIn();
  ({ personId, measurementSetId } = await measuredPerson(ada.agent));
  ({ patternId, revisionId } = await insertPattern(test.db, ada.user.id));
});

const NOWHERE = '0190d5f2-0000-7000-8000-000000000000';
const save = (more: object = {}, agent = ada.agent) =>
  agent.post('/api/plans').send({ name: 'For May', measurementSetId, revisionId, options: {}, ...more });
const saved = async (more: object = {}) => (await save(more).expect(201)).body as SavedPlan;

describe('saved plans: who may', () => {
  it('asks everybody to sign in first', async () => {
    const nobody = test.anonymous();
    await nobody.get('/api/plans').expect(401);
    await save({}, nobody).expect(401);
    await nobody.get(`/api/plans/${NOWHERE}`).expect(401);
    await nobody.patch(`/api/plans/${NOWHERE}`).send({}).expect(401);
    await nobody.delete(`/api/plans/${NOWHERE}`).expect(401);
  });

  it.each(['member', 'teacher', 'admin'] as const)('hides another’s plan from a %s', async (role) => {
    const { agent } = await test.signedIn({ role });
    const { id } = await saved();
    await agent.get(`/api/plans/${id}`).expect(404);
    await agent.patch(`/api/plans/${id}`).send({ name: 'Taken' }).expect(404);
    await agent.delete(`/api/plans/${id}`).expect(404);
    await agent.get('/api/plans').expect(({ body }) => expect(body.total).toBe(0));
    await save({}, agent).expect(404);
    await ada.agent.get(`/api/plans/${id}`).expect(({ body }) => expect(body.name).toBe('For May'));
  });

  it('refuses a change that comes from another site, and makes none', async () => {
    const { id } = await saved();
    const from = { Origin: 'https://elsewhere.example' };
    await save().set(from).expect(403);
    await ada.agent.patch(`/api/plans/${id}`).set(from).send({ name: 'x' }).expect(403);
    await ada.agent.delete(`/api/plans/${id}`).set(from).expect(403);
    const { body } = await ada.agent.get('/api/plans');
    expect([body.total, body.items[0].name]).toEqual([1, 'For May']);
  });
});

describe('saved plans: saving', () => {
  it('keeps what was asked and what the server reckoned, and gives it back to another request', async () => {
    const { id } = await saved({ options: { held: { hip: 2 } } });
    const { body } = (await ada.agent.get(`/api/plans/${id}`).expect(200)) as { body: SavedPlan };
    expect(body).toMatchObject({
      name: 'For May',
      engine: ENGINE_VERSION,
      personId,
      personName: 'Maria',
      measurementSetId,
      takenOn: '2025-01-31',
      patternId,
      patternTitle: 'Skirted dress',
      revisionId,
      revisionNumber: 1,
      options: { held: { hip: 2 } },
      status: 'planned',
    });
    expect(body.plan).toEqual(planFit(body.input));
    expect(body.zones).toEqual(body.plan.zones);
    expect(body.zones.find(({ zone }) => zone === 'hip')?.size).toEqual({ label: '14', position: 2 });
    expect(body).not.toHaveProperty('ownerId');
  });

  it('does not take a result that somebody sends along', async () => {
    const { id } = await saved({
      plan: { status: 'planned', zones: [] },
      engine: '99',
      status: 'outOfRange',
    });
    const { body } = await ada.agent.get(`/api/plans/${id}`);
    expect([body.engine, body.status]).toEqual([ENGINE_VERSION, 'planned']);
  });

  it('points at every field at fault and saves nothing', async () => {
    const { body } = await save({ name: ' ', measurementSetId: 'x', options: { lean: 'much' } }).expect(422);
    expect((body.errors as { pointer: string }[]).map((error) => error.pointer).sort()).toEqual([
      '/measurementSetId',
      '/name',
      '/options/lean',
    ]);
    await save({ options: { lean: 'roomier' } }).expect(422);
    await save({ options: { layers: [{ name: 'shirt', thicknessMm: 1 }] } }).expect(422);
    await ada.agent.get('/api/plans').expect(({ body: list }) => expect(list.total).toBe(0));
  });

  it('refuses another’s measurements or pattern as if they did not exist', async () => {
    const other = await test.signedIn();
    const theirs = await measuredPerson(other.agent);
    const { revisionId: theirRevision } = await insertPattern(test.db, other.user.id);
    await save({ measurementSetId: theirs.measurementSetId }).expect(404);
    await save({ revisionId: theirRevision }).expect(404);
  });
});

describe('saved plans: they never change by themselves', () => {
  it('stay as they were when the pattern is edited and the person is measured anew', async () => {
    const before = await saved();
    await test.db
      .update(pattern)
      .set({ kind: 'coat', silhouette: 'veryLoose' })
      .where(eq(pattern.id, patternId));
    await ada.agent
      .post(`/api/people/${personId}/measurement-sets`)
      .send({ takenOn: '2025-06-01', takenBy: 'self', unit: 'mm', typed: { bust: '1000' } })
      .expect(201);
    const { body } = await ada.agent.get(`/api/plans/${before.id}`);
    expect(body).toEqual(before);
  });

  it('take another name and nothing else', async () => {
    const before = await saved();
    await ada.agent.patch(`/api/plans/${before.id}`).send({ name: ' For June ' }).expect(200);
    const { body } = await ada.agent.get(`/api/plans/${before.id}`);
    expect(body).toEqual({ ...before, name: 'For June' });
    const refused = await ada.agent
      .patch(`/api/plans/${before.id}`)
      .send({ name: '', options: {}, engine: '2' })
      .expect(422);
    expect((refused.body.errors as { pointer: string }[]).map((error) => error.pointer)).toEqual([
      '/name',
      '/options',
      '/engine',
    ]);
    await ada.agent.patch(`/api/plans/${before.id}`).send({}).expect(200);
    await ada.agent
      .get(`/api/plans/${before.id}`)
      .expect(({ body: now }) => expect(now.name).toBe('For June'));
  });

  it('keep the measurements they were made from: these cannot be deleted until the plan is', async () => {
    const { id } = await saved();
    const refused = await ada.agent.delete(`/api/measurement-sets/${measurementSetId}`).expect(409);
    expect(refused.body).toMatchObject({
      type: '/problems/conflict',
      detail: expect.stringContaining('saved plan'),
    });
    await ada.agent.get(`/api/measurement-sets/${measurementSetId}`).expect(200);
    await ada.agent.delete(`/api/plans/${id}`).expect(204);
    await ada.agent.delete(`/api/measurement-sets/${measurementSetId}`).expect(204);
  });
});

describe('saved plans: lists and deleting', () => {
  it('lists the latest first, in pages, and finds by name, person and pattern', async () => {
    await saved({ name: 'One' });
    await saved({ name: 'Two' });
    const bea = await measuredPerson(ada.agent, { hip: '980' }, 'Béatrice');
    await saved({ name: 'Three', measurementSetId: bea.measurementSetId });
    const coat = await insertPattern(test.db, ada.user.id, { title: 'Winter coat', kind: 'coat' });
    await saved({ name: 'Four', revisionId: coat.revisionId });
    const names = async (query: string) => {
      const { body } = await ada.agent.get(`/api/plans?${query}`).expect(200);
      return [(body.items as { name: string }[]).map((one) => one.name), body.total];
    };
    expect(await names('')).toEqual([['Four', 'Three', 'Two', 'One'], 4]);
    expect(await names('pageSize=3&page=2')).toEqual([['One'], 4]);
    expect(await names('q=two')).toEqual([['Two'], 1]);
    expect(await names('q=beatrice')).toEqual([['Three'], 1]);
    expect(await names('q=winter')).toEqual([['Four'], 1]);
    expect(await names('q=%25')).toEqual([[], 0]);
    await ada.agent.get('/api/plans?page=0').expect(422);
  });

  it('lists no more of a plan than its answer', async () => {
    await saved();
    const { body } = await ada.agent.get('/api/plans');
    expect(Object.keys(body.items[0] as object)).not.toContain('input');
    expect(body.items[0].zones.length).toBeGreaterThan(0);
  });

  it('deletes one, once', async () => {
    const { id } = await saved();
    await ada.agent.delete(`/api/plans/${id}`).expect(204);
    await ada.agent.get(`/api/plans/${id}`).expect(404);
    await ada.agent.delete(`/api/plans/${id}`).expect(404);
    expect(await test.db.select().from(savedPlan).where(eq(savedPlan.id, id))).toEqual([]);
  });

  it('goes with the person it was made for', async () => {
    const { id } = await saved();
    await ada.agent.delete(`/api/people/${personId}`).expect(204);
    await ada.agent.get(`/api/plans/${id}`).expect(404);
    expect(await test.db.select().from(savedPlan).where(eq(savedPlan.id, id))).toEqual([]);
  });
});
