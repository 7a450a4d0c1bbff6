import { beforeAll, describe, expect, it } from 'vitest';
import { pageOf } from '../../shared/paging.ts';
import { patternSchema, patternSummarySchema } from '../../shared/patterns/patterns.schema.ts';
import { printLength } from '../../shared/units.ts';
import { measurementSet, person } from '../../server/people/people.table.ts';
import { newId } from '../../server/db/columns.ts';
import { savedPlan } from '../../server/plans/plans.table.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { bring, bytesKept, CHART, NOWHERE, pointersOf, start, upload } from '../support/imports.ts';

let test: TestApp;
let ada: SignedIn;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
});

const ROUTES = ['', '/revisions'];

describe('patterns: who may', () => {
  it('asks everybody to sign in first', async () => {
    const nobody = test.anonymous();
    await nobody.get('/api/patterns').expect(401);
    for (const route of ROUTES) await nobody.get(`/api/patterns/${NOWHERE}${route}`).expect(401);
    await nobody.patch(`/api/patterns/${NOWHERE}`).send({ kind: 'toga' }).expect(401);
    await nobody.delete(`/api/patterns/${NOWHERE}`).expect(401);
    for (const route of ['', '/chart.csv', '/finished.csv']) {
      await nobody.get(`/api/pattern-revisions/${NOWHERE}${route}`).expect(401);
    }
  });

  it.each(['member', 'teacher', 'admin'] as const)('hides another’s pattern from a %s', async (role) => {
    const { agent } = await test.signedIn({ role });
    const made = await bring(ada);
    for (const route of ROUTES) await agent.get(`/api/patterns/${made.id}${route}`).expect(404);
    await agent.patch(`/api/patterns/${made.id}`).send({ title: 'Taken' }).expect(404);
    await agent.delete(`/api/patterns/${made.id}`).expect(404);
    for (const route of ['', '/chart.csv', '/finished.csv']) {
      await agent.get(`/api/pattern-revisions/${made.revision.id}${route}`).expect(404);
    }
    await agent.get('/api/patterns').expect(({ body }) => expect(body.total).toBe(0));
    await ada.agent.get(`/api/patterns/${made.id}`).expect(({ body }) => expect(body).toEqual(made));
  });

  it('refuses what another site asks for, and changes nothing', async () => {
    const made = await bring(ada);
    const from = { Origin: 'https://elsewhere.example' };
    await ada.agent.patch(`/api/patterns/${made.id}`).set(from).send({ title: 'x' }).expect(403);
    await ada.agent.delete(`/api/patterns/${made.id}`).set(from).expect(403);
    await ada.agent.get(`/api/patterns/${made.id}`).expect(({ body }) => expect(body).toEqual(made));
  });

  it('answers 404 to what is no id', async () => {
    await ada.agent.get('/api/patterns/1').expect(404);
    await ada.agent.get('/api/pattern-revisions/1/chart.csv').expect(404);
  });
});

describe('patterns: listing', () => {
  it('by title, a page at a time, found by title, maker or number, and by kind', async () => {
    const me = await test.signedIn();
    await bring(me, { title: 'Quay coat', kind: 'coat', maker: 'North & South' });
    await bring(me, { title: 'Anchor 100% skirt', kind: 'skirt', number: 'A-77' });
    await bring(me, { title: 'Moor shirt', kind: 'shirt' }, '');
    const titles = async (query: string) => {
      const { body } = await me.agent.get(`/api/patterns?${query}`).expect(200);
      const { total, items } = pageOf(patternSummarySchema).parse(body);
      return [total, ...items.map((item) => item.title)];
    };
    expect(await titles('')).toEqual([3, 'Anchor 100% skirt', 'Moor shirt', 'Quay coat']);
    expect(await titles('page=2&pageSize=2')).toEqual([3, 'Quay coat']);
    expect(await titles('q=quay')).toEqual([1, 'Quay coat']);
    expect(await titles('q=south')).toEqual([1, 'Quay coat']);
    expect(await titles('q=a-77')).toEqual([1, 'Anchor 100% skirt']);
    expect(await titles('q=100%25')).toEqual([1, 'Anchor 100% skirt']);
    expect(await titles('q=%25')).toEqual([1, 'Anchor 100% skirt']);
    expect(await titles('kind=shirt')).toEqual([1, 'Moor shirt']);
    expect(await titles('q=nothing')).toEqual([0]);
    const { body } = await me.agent.get('/api/patterns?kind=toga&page=0').expect(422);
    expect(pointersOf(body).sort()).toEqual(['/kind', '/page']);
  });

  it('says which tables there are', async () => {
    const me = await test.signedIn();
    await bring(me, {}, '');
    const { body } = await me.agent.get('/api/patterns').expect(200);
    expect(body.items[0]).toMatchObject({ hasChart: false, hasFinished: true, sizes: ['10', '12', '14'] });
    expect(body.items[0]).not.toHaveProperty('ownerId');
  });
});

describe('patterns: changing', () => {
  it('changes what is sent and nothing else', async () => {
    const made = await bring(ada, { maker: 'Somebody', notes: 'n' });
    await ada.agent
      .patch(`/api/patterns/${made.id}`)
      .send({ title: ' New ', compareAs: { waist: 'highHip' } })
      .expect(200);
    const { body } = await ada.agent.get(`/api/patterns/${made.id}`).expect(200);
    const { title, compareAs, updatedAt, ...rest } = patternSchema.parse(body);
    const { title: _t, compareAs: _c, updatedAt: before, ...was } = made;
    expect([title, compareAs]).toEqual(['New', { waist: 'highHip' }]);
    expect(updatedAt > before).toBe(true);
    expect(rest).toEqual(was);
  });

  it('a change of nothing leaves the time of the last change', async () => {
    const made = await bring(ada);
    await ada.agent.patch(`/api/patterns/${made.id}`).send({}).expect(200);
    await ada.agent.get(`/api/patterns/${made.id}`).expect(({ body }) => expect(body).toEqual(made));
  });

  it('answers 422 at each field and changes nothing', async () => {
    const made = await bring(ada);
    const bad = { title: ' ', kind: 'toga', seamEdges: { hip: 0 }, maker: 'x'.repeat(121) };
    const { body } = await ada.agent.patch(`/api/patterns/${made.id}`).send(bad).expect(422);
    expect(pointersOf(body).sort()).toEqual(['/kind', '/maker', '/seamEdges/hip', '/title']);
    await ada.agent.get(`/api/patterns/${made.id}`).expect(({ body: now }) => expect(now).toEqual(made));
  });
});

describe('patterns: deleting', () => {
  it('takes revisions, drafts for it and all files with it', async () => {
    const me = await test.signedIn();
    const before = bytesKept(test);
    const made = await bring(me);
    const draft = await start(me, { patternId: made.id });
    await upload(me, draft.id, 'chart', CHART);
    await me.agent.delete(`/api/patterns/${made.id}`).expect(204);
    await me.agent.get(`/api/patterns/${made.id}`).expect(404);
    await me.agent.delete(`/api/patterns/${made.id}`).expect(404);
    await me.agent.get(`/api/pattern-revisions/${made.revision.id}`).expect(404);
    await me.agent.get(`/api/imports/${draft.id}`).expect(404);
    expect(bytesKept(test)).toEqual(before);
  });

  it('is refused while a saved plan refers to it, and nothing is lost', async () => {
    const me = await test.signedIn();
    const made = await bring(me);
    const plan = await insertPlan(me, made.revision.id);
    const { body } = await me.agent.delete(`/api/patterns/${made.id}`).expect(409);
    expect(body.detail).toContain('Saved plans');
    await me.agent.get(`/api/patterns/${made.id}`).expect(200);
    await me.agent.get(`/api/files/${made.revision.chartFile?.id ?? ''}`).expect(200);
    await me.agent.delete(`/api/plans/${plan}`).expect(204);
    await me.agent.delete(`/api/patterns/${made.id}`).expect(204);
  });
});

/** A plan straight into the tables: what matters here is that it refers to the revision. */
async function insertPlan(me: SignedIn, revisionId: string): Promise<string> {
  const [id, personId, measurementSetId, now] = [newId(), newId(), newId(), new Date()];
  const ownerId = me.user.id;
  const times = { createdAt: now, updatedAt: now };
  await test.db.insert(person).values({
    id: personId,
    ownerId,
    name: 'Ines',
    stage: 'adult',
    chestWord: 'bust',
    unit: 'cm',
    notes: '',
    ...times,
  });
  await test.db.insert(measurementSet).values({
    ...{ id: measurementSetId, personId, takenOn: '2025-03-31', takenBy: 'self', unit: 'cm', notes: '' },
    values: {},
    createdAt: now,
  });
  await test.db.insert(savedPlan).values({
    ...{
      id,
      ownerId,
      name: 'Plan',
      measurementSetId,
      revisionId,
      options: {},
      engine: 'x',
      status: 'notEnough',
    },
    input: { garment: { kind: 'dress' }, fabric: { structure: 'woven' }, body: {}, sizes: [] },
    result: {
      ...{ status: 'notEnough', zones: [], points: [], options: [], blends: [], alterations: [] },
      ...{ certainty: null, reasons: [], cautions: [] },
    },
    zones: [],
    ...times,
  });
  return id;
}

describe('pattern revisions', () => {
  it('are listed newest first, a page at a time', async () => {
    const made = await bring(ada);
    const draft = await start(ada, { patternId: made.id });
    await upload(ada, draft.id, 'chart', CHART);
    await ada.agent.post(`/api/imports/${draft.id}/commit`).expect(201);
    const { body } = await ada.agent.get(`/api/patterns/${made.id}/revisions?pageSize=1&page=2`).expect(200);
    expect(body).toEqual({ items: [made.revision], page: 2, pageSize: 1, total: 2 });
  });

  it('are written out as CSV that brings the same table back', async () => {
    const made = await bring(ada, { title: 'Quay/coat "N° 7"' });
    for (const role of ['chart', 'finished'] as const) {
      const csv = await ada.agent.get(`/api/pattern-revisions/${made.revision.id}/${role}.csv`).expect(200);
      expect(csv.headers['content-type']).toBe('text/csv; charset=utf-8');
      expect(csv.headers['content-disposition']).toMatch(/^attachment; filename=/);
      const again = await bring(
        ada,
        {},
        role === 'chart' ? csv.text : '',
        role === 'finished' ? csv.text : '',
      );
      expect(again.revision.table[role]).toEqual(made.revision.table[role]);
    }
  });

  it('have no CSV of a table that they do not have', async () => {
    const made = await bring(ada, {}, CHART, '');
    const { body } = await ada.agent
      .get(`/api/pattern-revisions/${made.revision.id}/finished.csv`)
      .expect(404);
    expect(body.detail).toContain('finished measurements');
  });

  it('written out hold no cell that a spreadsheet would run', async () => {
    const made = await bring(ada, {}, 'Size,Bust (cm)\n=1+1,90\n@x,92\n-12,94\n', '');
    const { text } = await ada.agent.get(`/api/pattern-revisions/${made.revision.id}/chart.csv`).expect(200);
    expect(text).toBe("\uFEFFSize,Bust (cm)\r\n'=1+1,90\r\n'@x,92\r\n'-12,94\r\n");
    const again = await bring(ada, {}, text, '');
    expect(again.sizes).toEqual(['=1+1', '@x', '-12']);
  });

  it('hold every 1/16 in from 1 to 80 in exactly: through reading, database and answer', async () => {
    // 1 in = 25.4 mm exactly: k/16 in = k × 127 ÷ 80 mm.
    const all = Array.from({ length: 79 * 16 + 1 }, (_, at) => at + 16);
    for (let from = 0; from < all.length; from += 190) {
      const some = all.slice(from, from + 190);
      const rows = some.map(
        (sixteenths) => `s${String(sixteenths)},${printLength((sixteenths * 127) / 80, 'in')}`,
      );
      const made = await bring(ada, {}, `Size,Bust (in)\n${rows.join('\n')}\n`, '');
      const [column] = made.revision.table.chart;
      expect(column?.mm).toEqual(some.map((sixteenths) => (sixteenths * 127) / 80));
      expect(column?.mm.map((mm) => printLength(typeof mm === 'number' ? mm : 0, 'in'))).toEqual(
        column?.typed,
      );
    }
  });
});
