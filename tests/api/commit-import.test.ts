import { rmSync, writeFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import { pageOf } from '../../shared/paging.ts';
import { patternRevisionSchema } from '../../shared/patterns/patterns.schema.ts';
import { importDraft, pattern, patternRevision } from '../../server/patterns/patterns.table.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import {
  bring,
  CHART,
  DETAILS,
  draftOf,
  expectNothingLost,
  FINISHED,
  pointersOf,
  send,
  start,
  upload,
} from '../support/imports.ts';

let test: TestApp;
let ada: SignedIn;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
});

describe('committing an import', () => {
  it('makes a pattern with its first revision, keeps the files, and the draft is gone', async () => {
    const { id } = await start(ada, { details: { ...DETAILS, seamEdges: { hip: 4 } } });
    await upload(ada, id, 'chart', CHART, 'chart.csv');
    await upload(ada, id, 'finished', FINISHED, 'finished.csv');
    const { body } = await ada.agent.post(`/api/imports/${id}/commit`).expect(201);
    const made = await ada.agent.get(`/api/patterns/${body.patternId as string}`).expect(200);
    expect(made.body).toMatchObject({
      title: 'Harbour dress',
      maker: '',
      worn: 'closed',
      seamEdges: { hip: 4 },
      sizes: ['10', '12', '14'],
      hasChart: true,
      hasFinished: true,
      latestRevisionId: body.revisionId,
      latestRevisionNumber: 1,
      revision: { number: 1, chartFile: { name: 'chart.csv' }, finishedFile: { name: 'finished.csv' } },
    });
    expect(made.body.revision.table.chart[2]).toEqual({
      point: 'hip',
      heading: 'Hip (in)',
      unit: 'in',
      mm: [889, 923.925, 965.2],
      typed: ['35', '36 3/8', '38'],
    });
    await ada.agent.get(`/api/imports/${id}`).expect(404);
    await ada.agent.post(`/api/imports/${id}/commit`).expect(404);
    await expectNothingLost(test);
  });

  it('makes nothing where anything is in the way, and says it at its part', async () => {
    const me = await test.signedIn();
    const { id } = await start(me, { details: { title: 'Harbour dress' } });
    const nothing = await me.agent.post(`/api/imports/${id}/commit`).expect(422);
    expect(pointersOf(nothing.body)).toEqual([
      '/details/kind',
      '/details/silhouette',
      '/details/structure',
      '/chart',
    ]);
    await me.agent.patch(`/api/imports/${id}`).send({ details: DETAILS }).expect(200);
    await upload(me, id, 'chart', 'Size,Bust (cm)\n10,-90\n12,92\n');
    await upload(me, id, 'finished', 'Size,Bust (cm)\n10,100\n14,104\n');
    const refused = await me.agent.post(`/api/imports/${id}/commit`).expect(422);
    expect(pointersOf(refused.body)).toEqual(['/finished', '/chart']);
    expect(refused.body.errors[1].detail).toMatch(/^Row 2, column 2: /);
    await me.agent.get('/api/patterns').expect(({ body }) => expect(body.total).toBe(0));
    expect((await draftOf(me, id)).chart?.rows).toHaveLength(2);
  });

  it('with cautions alone is possible', async () => {
    const made = await bring(ada, {}, 'Size,Bust (cm),Foo\n10,90,1\n12,89,2\n', '');
    expect(made.revision.table.chart.map((column) => column.point)).toEqual(['bust']);
    expect(made).toMatchObject({ hasChart: true, hasFinished: false });
  });

  it('of a draft for a pattern makes its next revision, with what was changed about the pattern', async () => {
    const made = await bring(ada, { maker: 'Somebody' });
    const draft = await start(ada, { patternId: made.id });
    expect(draft.details).toMatchObject({ title: 'Harbour dress', maker: 'Somebody', kind: 'dress' });
    await ada.agent
      .patch(`/api/imports/${draft.id}`)
      .send({ details: { title: 'Harbour dress II' } })
      .expect(200);
    await upload(ada, draft.id, 'chart', 'Size,Bust (cm)\nS,90\nM,96\n');
    const { body } = await ada.agent.post(`/api/imports/${draft.id}/commit`).expect(201);
    expect(body.patternId).toBe(made.id);
    const now = (await ada.agent.get(`/api/patterns/${made.id}`).expect(200)).body;
    expect(now).toMatchObject({
      title: 'Harbour dress II',
      maker: 'Somebody',
      sizes: ['S', 'M'],
      latestRevisionId: body.revisionId,
      latestRevisionNumber: 2,
      hasFinished: false,
    });
    const old = await ada.agent.get(`/api/pattern-revisions/${made.revision.id}`).expect(200);
    expect(old.body).toEqual(made.revision);
  });

  it('twice at once: one wins, the other finds the draft gone, and one pattern is made', async () => {
    const me = await test.signedIn();
    const { id } = await start(me, { details: DETAILS });
    await upload(me, id, 'chart', CHART);
    const answers = await Promise.all(
      Array.from({ length: 4 }, () => me.agent.post(`/api/imports/${id}/commit`)),
    );
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 404, 404, 404]);
    await me.agent.get('/api/patterns').expect(({ body }) => expect(body.total).toBe(1));
    await expectNothingLost(test);
  });

  it('of two drafts for one pattern at once gives two revisions of different numbers', async () => {
    const me = await test.signedIn();
    const made = await bring(me);
    const drafts = await Promise.all([1, 2, 3].map(() => start(me, { patternId: made.id })));
    for (const { id } of drafts) await upload(me, id, 'chart', CHART);
    await Promise.all(drafts.map(({ id }) => me.agent.post(`/api/imports/${id}/commit`).expect(201)));
    const { body } = await me.agent.get(`/api/patterns/${made.id}/revisions`).expect(200);
    const { items } = pageOf(patternRevisionSchema).parse(body);
    expect(items.map((item) => item.number)).toEqual([4, 3, 2, 1]);
    await me.agent.get(`/api/patterns/${made.id}`).expect(({ body: now }) => {
      expect(now.latestRevisionNumber).toBe(4);
    });
  });

  it('while a table is brought loses neither: the file is the revision’s or is gone', async () => {
    const me = await test.signedIn();
    for (let round = 0; round < 3; round += 1) {
      const { id } = await start(me, { details: DETAILS });
      await upload(me, id, 'chart', CHART);
      const [committed, brought] = await Promise.all([
        me.agent.post(`/api/imports/${id}/commit`),
        send(me, id, 'chart', CHART.replace('32 1/2', '33')),
      ]);
      expect(committed.status).toBe(201);
      expect([200, 404]).toContain(brought.status);
      await expectNothingLost(test);
    }
  });

  it('that fails leaves the draft, its files and no pattern', async () => {
    const me = await test.signedIn();
    const { id } = await start(me, { details: DETAILS });
    const { chart } = await upload(me, id, 'chart', CHART);
    const rows = async () => [
      (await test.db.select().from(pattern)).length,
      (await test.db.select().from(patternRevision)).length,
      (await test.db.select().from(importDraft)).length,
    ];
    const before = await rows();
    // The bytes are taken away under the server, as a broken disk would.
    const file = chart?.file.id ?? '';
    const path = `${test.config.filesFolder}/${file.slice(-2)}/${file}`;
    rmSync(path);
    await me.agent.post(`/api/imports/${id}/commit`).expect(500);
    expect(test.takeErrors()).toHaveLength(1);
    writeFileSync(path, CHART);
    expect(await rows()).toEqual(before);
    await me.agent.post(`/api/imports/${id}/commit`).expect(201);
  });
});
