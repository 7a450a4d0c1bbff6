import { beforeAll, describe, expect, it } from 'vitest';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import {
  bring,
  CHART,
  DETAILS,
  draftOf,
  expectNothingLost,
  FINISHED,
  NOWHERE,
  pointersOf,
  send,
  start,
  upload,
} from '../support/imports.ts';

let test: TestApp;
let ada: SignedIn;
let other: SignedIn;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
  other = await test.signedIn();
});

const codes = (issues: readonly { code: string; row: number | null; column: number | null }[]) =>
  issues.map(({ code, row, column }) => `${code} ${String(row)}:${String(column)}`);

describe('imports: who may', () => {
  it('asks everybody to sign in first, before it looks at what was sent', async () => {
    const nobody = test.anonymous();
    await nobody.get('/api/imports').expect(401);
    await nobody.post('/api/imports').send({ patternId: 'no' }).expect(401);
    for (const path of [`/api/imports/${NOWHERE}`, `/api/imports/${NOWHERE}/tables/chart`]) {
      await nobody.delete(path).expect(401);
    }
    await nobody.get(`/api/imports/${NOWHERE}`).expect(401);
    await nobody.patch(`/api/imports/${NOWHERE}`).send({}).expect(401);
    await send({ agent: nobody }, NOWHERE, 'chart', CHART).expect(401);
    await nobody.post(`/api/imports/${NOWHERE}/commit`).expect(401);
  });

  it.each(['member', 'teacher', 'admin'] as const)('hides another’s draft from a %s', async (role) => {
    const somebody = await test.signedIn({ role });
    const { id } = await start(ada, { details: DETAILS });
    await upload(ada, id, 'chart', CHART);
    const before = await draftOf(ada, id);
    await somebody.agent.get(`/api/imports/${id}`).expect(404);
    await somebody.agent
      .patch(`/api/imports/${id}`)
      .send({ details: { title: 'Taken' } })
      .expect(404);
    await send(somebody, id, 'chart', FINISHED).expect(404);
    await somebody.agent.delete(`/api/imports/${id}/tables/chart`).expect(404);
    await somebody.agent.post(`/api/imports/${id}/commit`).expect(404);
    await somebody.agent.delete(`/api/imports/${id}`).expect(404);
    await somebody.agent.get('/api/imports').expect(({ body }) => expect(body.total).toBe(0));
    expect(await draftOf(ada, id)).toEqual(before);
  });

  it('refuses what another site asks for, and changes nothing', async () => {
    const { id } = await start(ada, { details: DETAILS });
    await upload(ada, id, 'chart', CHART);
    const before = await draftOf(ada, id);
    const from = { Origin: 'https://elsewhere.example' };
    const { agent } = ada;
    await agent.post('/api/imports').set(from).send({}).expect(403);
    await agent
      .patch(`/api/imports/${id}`)
      .set(from)
      .send({ details: { title: 'x' } })
      .expect(403);
    await send(ada, id, 'chart', FINISHED).set(from).expect(403);
    await agent.delete(`/api/imports/${id}/tables/chart`).set(from).expect(403);
    await agent.post(`/api/imports/${id}/commit`).set(from).expect(403);
    await agent.delete(`/api/imports/${id}`).set(from).expect(403);
    expect(await draftOf(ada, id)).toEqual(before);
  });

  it('starts nothing for another’s pattern', async () => {
    const theirs = await bring(other);
    await ada.agent.post('/api/imports').send({ patternId: theirs.id }).expect(404);
    await ada.agent.post('/api/imports').send({ patternId: NOWHERE }).expect(404);
  });
});

describe('imports: a draft', () => {
  it('begins empty and says what is missing', async () => {
    const draft = await start(ada);
    expect(draft).toMatchObject({ patternId: null, details: {}, chart: null, finished: null, ready: false });
    expect(draft.createdAt).toBe(draft.updatedAt);
    expect(draft.issues.map((issue) => issue.code)).toEqual([
      'titleMissing',
      'kindMissing',
      'silhouetteMissing',
      'structureMissing',
      'noTable',
    ]);
  });

  it('keeps details as they are written, key by key, and nothing that was not sent', async () => {
    const { id } = await start(ada, { details: { title: 'Harbour dress', maker: 'Somebody' } });
    await ada.agent
      .patch(`/api/imports/${id}`)
      .send({ details: { kind: 'dress' } })
      .expect(200);
    await ada.agent
      .patch(`/api/imports/${id}`)
      .send({ details: { title: '' } })
      .expect(200);
    expect((await draftOf(ada, id)).details).toEqual({ title: '', maker: 'Somebody', kind: 'dress' });
  });

  it('a change that changes nothing leaves the time of the last change', async () => {
    const { id, updatedAt } = await start(ada, { details: DETAILS });
    for (const body of [{}, { details: {} }, { details: DETAILS }, { chart: { unit: null, points: {} } }]) {
      await ada.agent.patch(`/api/imports/${id}`).send(body).expect(200);
    }
    expect((await draftOf(ada, id)).updatedAt).toBe(updatedAt);
  });

  it('is listed with its details, the last touched first', async () => {
    const { agent } = await test.signedIn();
    const me = { agent, user: ada.user };
    const first = await start(me, { details: { title: 'First' } });
    await start(me, { details: { title: 'Second' } });
    await agent
      .patch(`/api/imports/${first.id}`)
      .send({ details: { maker: 'x' } })
      .expect(200);
    const { body } = await agent.get('/api/imports?pageSize=1').expect(200);
    expect(body).toMatchObject({
      total: 2,
      items: [{ id: first.id, details: { title: 'First', maker: 'x' } }],
    });
    await agent.get('/api/imports?pageSize=0').expect(422);
  });

  it('answers 422 at the field', async () => {
    const { id } = await start(ada);
    const bad = {
      details: { kind: 'toga', title: 'x'.repeat(121) },
      chart: { unit: 'ell', points: { x: 'bust', 2: 'nose' } },
    };
    const { body } = await ada.agent.patch(`/api/imports/${id}`).send(bad).expect(422);
    expect(pointersOf(body).sort()).toEqual([
      '/chart/points/2',
      '/chart/points/x',
      '/chart/unit',
      '/details/kind',
      '/details/title',
    ]);
    await ada.agent
      .post('/api/imports')
      .send({ patternId: 'x', details: { worn: 1 } })
      .expect(422);
  });

  it('is discarded with its files', async () => {
    const { id } = await start(ada);
    const { chart } = await upload(ada, id, 'chart', CHART);
    await ada.agent.delete(`/api/imports/${id}`).expect(204);
    await ada.agent.get(`/api/imports/${id}`).expect(404);
    await ada.agent.delete(`/api/imports/${id}`).expect(404);
    await ada.agent.get(`/api/files/${chart?.file.id ?? ''}`).expect(404);
    await expectNothingLost(test);
  });
});

describe('imports: a table', () => {
  it('is read cell by cell, and reads the same to the next request', async () => {
    const { id } = await start(ada, { details: DETAILS });
    const draft = await upload(ada, id, 'chart', CHART, 'Größen ⅜.csv');
    expect(draft.ready).toBe(true);
    expect(draft.chart?.file).toMatchObject({ name: 'Größen ⅜.csv', bytes: Buffer.byteLength(CHART) });
    expect(draft.chart?.rows[1]).toEqual({
      row: 3,
      label: '12',
      cells: [
        { typed: '12', mm: null },
        { typed: '34', mm: 863.6 },
        { typed: '26 1/2', mm: 673.1 },
        { typed: '36 3/8', mm: 923.925 },
      ],
    });
    expect(await draftOf(ada, id)).toEqual(draft);
  });

  it('is corrected: the unit, and what a column is', async () => {
    const { id } = await start(ada, { details: DETAILS });
    const first = await upload(ada, id, 'chart', 'Size,Bust,Foo,Bar\n10,36,38,1\n12,38,40,2\n');
    expect(codes(first.chart?.issues ?? [])).toContain('unknownHeading 1:3');
    const sent = { chart: { unit: 'cm', points: { 3: 'hip', 4: null } } };
    await ada.agent.patch(`/api/imports/${id}`).send(sent).expect(200);
    await ada.agent
      .patch(`/api/imports/${id}`)
      .send({ chart: { unit: 'in' } })
      .expect(200);
    const { chart } = await draftOf(ada, id);
    expect(chart).toMatchObject({ unit: 'in', unitFrom: 'chosen', issues: [] });
    expect(chart?.rows[0]?.cells.map((cell) => cell.mm)).toEqual([null, 914.4, 965.2, null]);
  });

  it('brought again with the same headings keeps what was chosen, with others forgets it', async () => {
    const { id } = await start(ada);
    await upload(ada, id, 'chart', 'Size,Bust (cm),Foo\n10,90,9\n');
    await ada.agent
      .patch(`/api/imports/${id}`)
      .send({ chart: { points: { 3: 'hip' } } })
      .expect(200);
    const mended = await upload(ada, id, 'chart', 'Size,Bust (cm),Foo\n10,90,96\n');
    expect(mended.chart?.columns[2]).toMatchObject({ point: 'hip', sureness: 'chosen' });
    const another = await upload(ada, id, 'chart', 'Size,Bust (cm),Bar\n10,90,96\n');
    expect(another.chart?.columns[2]).toMatchObject({ point: null, role: 'ignored' });
    await expectNothingLost(test);
  });

  it('is taken out again; taking out what is not there changes nothing', async () => {
    const { id } = await start(ada);
    await upload(ada, id, 'finished', FINISHED);
    await ada.agent.delete(`/api/imports/${id}/tables/finished`).expect(200);
    const { finished, updatedAt } = await draftOf(ada, id);
    expect(finished).toBeNull();
    await ada.agent.delete(`/api/imports/${id}/tables/finished`).expect(200);
    expect((await draftOf(ada, id)).updatedAt).toBe(updatedAt);
    await expectNothingLost(test);
  });

  it('is a chart or finished measurements and nothing else', async () => {
    const { id } = await start(ada);
    await send(ada, id, 'seams', CHART).expect(404);
    await ada.agent.delete(`/api/imports/${id}/tables/seams`).expect(404);
  });

  it('has to come as one file in one field', async () => {
    const { id } = await start(ada);
    const put = () => ada.agent.put(`/api/imports/${id}/tables/chart`);
    await put().send({ file: CHART }).expect(415);
    await put().type('text/csv').send(CHART).expect(415);
    const wrong = await put().attach('table', Buffer.from(CHART), 'a.csv').expect(422);
    expect(pointersOf(wrong.body)).toEqual(['/file']);
    const more = await put()
      .attach('file', Buffer.from(CHART), 'a.csv')
      .attach('file', Buffer.from(CHART), 'b.csv');
    expect(more.status).toBe(422);
    await put().set('content-type', 'multipart/form-data').send('nonsense').expect(400);
    await put().set('content-type', 'multipart/form-data; boundary=x').send('--x--\r\n').expect(422);
    expect((await draftOf(ada, id)).chart).toBeNull();
  });
});

describe('imports: bad input is refused in words, and what was there stays', () => {
  const refusals: [string, string | Buffer, number, string][] = [
    ['an empty file', '', 422, 'empty'],
    ['a spreadsheet named .csv', Buffer.from([0x50, 0x4b, 3, 4, 0, 0, 0, 0]), 422, 'save the sheet as CSV'],
    ['a binary file named .csv', Buffer.from([1, 0, 2, 0, 255, 254]), 422, 'not text'],
    ['a file of 10 MB', Buffer.alloc(10_000_000, 'a,'), 413, '5 MB'],
    ['a million columns', ','.repeat(1_000_000), 422, '120 columns'],
    ['a hundred thousand sizes', `Size,Bust\n${'10,36\n'.repeat(100_000)}`, 422, '200 sizes'],
  ];
  it.each(refusals)('%s', async (_name, content, status, words) => {
    const { id } = await start(ada, { details: DETAILS });
    const before = await upload(ada, id, 'chart', CHART);
    const answer = await send(ada, id, 'chart', content).expect(status);
    const said = JSON.stringify(answer.body);
    expect(said).toContain(words);
    if (status === 422) expect(pointersOf(answer.body)).toEqual(['/file']);
    expect(await draftOf(ada, id)).toEqual(before);
    await expectNothingLost(test);
  });

  it('a file of just 5 MB is not too large', async () => {
    const { id } = await start(ada);
    const content = CHART + ' '.repeat(5_000_000 - CHART.length);
    expect((await upload(ada, id, 'chart', content)).chart?.file.bytes).toBe(5_000_000);
    await send(ada, id, 'chart', `${content} `).expect(413);
  });

  it.each([
    ['negative lengths', 'Size,Bust (cm)\n10,-90\n', 'negative 2:2'],
    ['absurd lengths', 'Size,Bust (cm)\n10,9000\n', 'tooLong 2:2'],
    ['a duplicate size', 'Size,Bust (cm)\n10,90\n10,92\n', 'sizeTwice 3:1'],
    ['two columns for one point', 'Size,Bust (cm),Chest (cm)\n10,90,90\n', 'pointTwice 1:2'],
    ['a formula for a length', 'Size,Bust (cm)\n10,=1+1\n', 'formula 2:2'],
    ['an unknown heading', 'Size,Bust (cm),Foo\n10,90,1\n', 'unknownHeading 1:3'],
    ['mixed units', 'Size,Bust (cm)\n10,90\n12,37 in\n', 'mixedUnits 3:2'],
  ])('%s: kept, and said at its place', async (_name, content, place) => {
    const { id } = await start(ada, { details: DETAILS });
    const draft = await upload(ada, id, 'chart', content);
    expect(codes(draft.chart?.issues ?? [])).toContain(place);
    expect(draft.ready).toBe(draft.chart?.issues.every((issue) => issue.severity === 'caution'));
    const kept = await ada.agent
      .get(`/api/files/${draft.chart?.file.id ?? ''}`)
      .buffer(true)
      .expect(200);
    expect(Buffer.from(kept.body as Buffer).toString()).toBe(content);
  });
});
