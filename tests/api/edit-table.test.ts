import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { comparisonSchema } from '../../shared/patterns/comparison.schema.ts';
import { staleEditSchema } from '../../shared/patterns/edits.schema.ts';
import { patternRevisionSchema, patternSchema, type Pattern } from '../../shared/patterns/patterns.schema.ts';
import { typedOf } from '../../shared/patterns/tables-as-typed.ts';
import { patternRevision } from '../../server/patterns/patterns.table.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { bring, DETAILS, expectNothingLost, NOWHERE, pointersOf, start, upload } from '../support/imports.ts';

let test: TestApp;
let ada: SignedIn;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
});

const editOf = (pattern: Pattern) => ({
  basedOn: pattern.revision.id,
  ...structuredClone(typedOf(pattern.revision.table)),
});
type Edit = ReturnType<typeof editOf>;
const send = (by: SignedIn, id: string, edit: unknown) =>
  by.agent.post(`/api/patterns/${id}/revisions`).send(edit as object);
const wholeOf = async (by: SignedIn, id: string) =>
  patternSchema.parse((await by.agent.get(`/api/patterns/${id}`).expect(200)).body);
const revisionsOf = async (id: string) =>
  test.db.select().from(patternRevision).where(eq(patternRevision.patternId, id));
/** The edit with one cell of the size chart written otherwise. */
function withCell(edit: Edit, line: number, size: number, text: string): Edit {
  const chart = edit.chart.map((column, at) =>
    at === line ? { ...column, typed: column.typed.with(size, text) } : column,
  );
  return { ...edit, chart };
}

describe('editing by hand: who may', () => {
  it('asks everybody to sign in first, and hides another’s pattern and revision', async () => {
    const made = await bring(ada);
    const nobody = test.anonymous();
    const { agent } = await test.signedIn({ role: 'admin' });
    const own = await bring(await test.signedIn());
    const compare = `/api/pattern-revisions/${made.revision.id}/compare?with=${made.revision.id}`;
    for (const [who, status] of [
      [nobody, 401],
      [agent, 404],
    ] as const) {
      await who.post(`/api/patterns/${made.id}/revisions`).send(editOf(made)).expect(status);
      await who.post(`/api/patterns/${made.id}/copy`).expect(status);
      await who.get(compare).expect(status);
    }
    await nobody.post('/api/patterns').send({}).expect(401);
    await ada.agent
      .get(`/api/pattern-revisions/${made.revision.id}/compare?with=${own.revision.id}`)
      .expect(404);
    await ada.agent
      .post(`/api/patterns/${made.id}/copy`)
      .set({ Origin: 'https://elsewhere.example' })
      .expect(403);
    expect(await wholeOf(ada, made.id)).toEqual(made);
  });
});

describe('editing by hand: saving', () => {
  it('writes the next revision, read by the same reading as a file, and leaves the one before', async () => {
    const made = await bring(ada);
    const edit = withCell(withCell(editOf(made), 0, 0, '33 1/2'), 2, 1, '92.5 cm');
    const { body } = await send(ada, made.id, edit).expect(201);
    const revision = patternRevisionSchema.parse(body);
    expect([revision.number, revision.chartFile, revision.finishedFile]).toEqual([2, null, null]);
    expect(revision.table.chart[0]).toMatchObject({
      point: 'bust',
      heading: 'Bust (in)',
      unit: 'in',
      typed: ['33 1/2', '34', '36'],
      mm: [850.9, 863.6, 914.4],
    });
    expect(revision.table.chart[2]?.mm[1]).toBe(925);
    const now = await wholeOf(ada, made.id);
    expect(now.revision).toEqual(revision);
    expect(now.updatedAt > made.updatedAt).toBe(true);
    const before = await ada.agent.get(`/api/pattern-revisions/${made.revision.id}`).expect(200);
    expect(patternRevisionSchema.parse(before.body)).toEqual(made.revision);
  });

  it('adds, removes, renames and reorders sizes and points', async () => {
    const made = await bring(ada);
    const { chart, finished, ...edit } = editOf(made);
    const bust = chart[0]!;
    const changed = {
      ...edit,
      sizes: ['8', '10', 'Twelve'],
      chart: [
        { point: 'hip', unit: 'cm', typed: ['86', '90', '94'] },
        { ...bust, typed: ['30', ...bust.typed.slice(0, 2)] },
      ],
      finished: finished.map((column) => ({ ...column, typed: ['34', ...column.typed.slice(0, 2)] })),
    };
    const { body } = await send(ada, made.id, changed).expect(201);
    const { table } = patternRevisionSchema.parse(body);
    expect(table.sizes).toEqual(['8', '10', 'Twelve']);
    expect(table.chart.map(({ point, unit, heading }) => [point, unit, heading])).toEqual([
      ['hip', 'cm', 'Hip girth'],
      ['bust', 'in', 'Bust (in)'],
    ]);
  });

  it('an edit of nothing writes nothing and answers the same revision', async () => {
    const made = await bring(ada);
    const { body } = await send(ada, made.id, editOf(made)).expect(200);
    expect(body).toEqual(made.revision);
    expect(await wholeOf(ada, made.id)).toEqual(made);
    expect(await revisionsOf(made.id)).toHaveLength(1);
  });

  it('a save sent again because its answer was lost is answered with what it wrote', async () => {
    const made = await bring(ada);
    const edit = withCell(editOf(made), 0, 0, '33');
    const first = await send(ada, made.id, edit).expect(201);
    const again = await send(ada, made.id, edit).expect(200);
    expect(again.body).toEqual(first.body);
    expect(await revisionsOf(made.id)).toHaveLength(2);
  });

  it('leaves no file behind when an edited pattern is deleted', async () => {
    const made = await bring(ada);
    await send(ada, made.id, withCell(editOf(made), 0, 0, '33')).expect(201);
    await ada.agent.delete(`/api/patterns/${made.id}`).expect(204);
    await expectNothingLost(test);
  });
});

describe('editing by hand: refused', () => {
  it('says every cell at fault at its place, and writes nothing', async () => {
    const made = await bring(ada);
    const edit = withCell(withCell(editOf(made), 1, 2, 'six'), 2, 0, '=1+1');
    const finished = edit.finished.map((column, at) =>
      at === 0 ? { ...column, typed: column.typed.with(1, '36 - 38') } : column,
    );
    const { body } = await send(ada, made.id, { ...edit, finished, sizes: ['10', '', '10'] }).expect(422);
    expect(pointersOf(body).sort()).toEqual([
      '/chart/1/typed/2',
      '/chart/2/typed/0',
      '/finished/0/typed/1',
      '/sizes/1',
      '/sizes/2',
    ]);
    expect(await wholeOf(ada, made.id)).toEqual(made);
  });

  it('refuses a point twice, a size or a point without a measurement, and tables of uneven length', async () => {
    const made = await bring(ada);
    const { chart, ...edit } = editOf(made);
    const [bust, waist, hip] = [chart[0]!, chart[1]!, chart[2]!];
    const twice = await send(ada, made.id, { ...edit, chart: [bust, { ...waist, point: 'bust' }] }).expect(
      422,
    );
    expect(pointersOf(twice.body)).toEqual(['/chart/1/point']);
    const empty = { ...hip, typed: ['', '-', ''] };
    const bare = await send(ada, made.id, { ...edit, chart: [bust, empty] }).expect(422);
    expect(pointersOf(bare.body)).toEqual(['/chart/1/point']);
    const gap = { ...bust, typed: ['32', '', '36'] };
    const hole = await send(ada, made.id, { ...edit, chart: [gap] }).expect(422);
    expect(pointersOf(hole.body)).toEqual(['/sizes/1']);
    const short = { ...bust, typed: ['32', '34'] };
    const uneven = await send(ada, made.id, { ...edit, chart: [short] }).expect(422);
    expect(pointersOf(uneven.body)).toContain('/chart/0/typed');
    const nothing = await send(ada, made.id, { ...edit, sizes: [], chart: [], finished: [] }).expect(422);
    expect(pointersOf(nothing.body).sort()).toEqual(['/chart', '/sizes']);
  });

  it('refuses what has another shape, all of it said', async () => {
    const made = await bring(ada);
    const bad = { basedOn: 'x', sizes: [1], chart: [{ point: 'toe', unit: 'ell', typed: [] }], finished: 7 };
    const { body } = await send(ada, made.id, bad).expect(422);
    expect(pointersOf(body).sort()).toEqual([
      '/basedOn',
      '/chart/0/point',
      '/chart/0/unit',
      '/finished',
      '/sizes/0',
    ]);
  });

  it('refuses an edit that began from another pattern’s revision, one’s own too', async () => {
    const made = await bring(ada);
    const other = await bring(ada, { title: 'Other' });
    for (const basedOn of [other.revision.id, NOWHERE]) {
      const edit = { ...withCell(editOf(made), 0, 0, '33'), basedOn };
      const { body } = await send(ada, made.id, edit).expect(422);
      expect(pointersOf(body)).toEqual(['/basedOn']);
    }
    expect(await revisionsOf(made.id)).toHaveLength(1);
  });
});

describe('editing by hand: two saves', () => {
  it('a stale one is refused with both versions, and nothing is written', async () => {
    const made = await bring(ada);
    const theirs = await send(ada, made.id, withCell(editOf(made), 0, 0, '33')).expect(201);
    const { body } = await send(ada, made.id, withCell(editOf(made), 0, 1, '34 1/4')).expect(409);
    expect(body).toMatchObject({ type: '/problems/conflict', status: 409 });
    expect(body.detail).toMatch(/Revision 2 was saved after revision 1/);
    const { versions } = staleEditSchema.parse(body);
    expect(versions.theirs).toEqual(theirs.body);
    expect(versions.yours.chart[0]?.typed).toEqual(['32 1/2', '34 1/4', '36']);
    expect(versions.yours.chart[0]?.mm[1]).toBe(869.95);
    expect(JSON.stringify(body)).not.toContain(ada.user.id);
    expect(await revisionsOf(made.id)).toHaveLength(2);
  });

  it('at once: exactly one wins, whoever began from the same revision', async () => {
    for (let round = 0; round < 5; round += 1) {
      const made = await bring(ada);
      const answers = await Promise.all(
        Array.from({ length: 6 }, (_, at) =>
          send(ada, made.id, withCell(editOf(made), 0, 0, String(31 + at / 4))),
        ),
      );
      expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409, 409, 409, 409]);
      const won = patternRevisionSchema.parse(answers.find(({ status }) => status === 201)?.body);
      const rows = await revisionsOf(made.id);
      expect(rows.map(({ number }) => number).sort()).toEqual([1, 2]);
      expect((await wholeOf(ada, made.id)).revision).toEqual(won);
      for (const { status, body } of answers) {
        if (status === 409) expect(staleEditSchema.parse(body).versions.theirs).toEqual(won);
      }
    }
  });

  it('an edit and an import at once: each gets a number of its own or the edit is refused', async () => {
    const made = await bring(ada);
    const draft = await start(ada, { patternId: made.id });
    await upload(ada, draft.id, 'chart', 'Size,Bust (in)\n10,33\n12,35\n14,37\n');
    const [edited, committed] = await Promise.all([
      send(ada, made.id, withCell(editOf(made), 0, 0, '31')),
      ada.agent.post(`/api/imports/${draft.id}/commit`),
    ]);
    expect(committed.status).toBe(201);
    const numbers = (await revisionsOf(made.id)).map(({ number }) => number).sort();
    expect(numbers).toEqual(edited.status === 201 ? [1, 2, 3] : [1, 2]);
    expect([201, 409]).toContain(edited.status);
  });
});

describe('editing by hand: comparing, copying, typing in', () => {
  it('says what differs cell by cell, and nothing of a revision with itself', async () => {
    const made = await bring(ada);
    const { body } = await send(ada, made.id, withCell(editOf(made), 0, 0, '33')).expect(201);
    const compare = async (a: string, b: string) =>
      comparisonSchema.parse(
        (await ada.agent.get(`/api/pattern-revisions/${a}/compare?with=${b}`).expect(200)).body,
      );
    const { from, to, difference } = await compare(made.revision.id, body.id);
    expect([from.number, to.number]).toEqual([1, 2]);
    expect(difference.cells).toEqual([
      {
        role: 'chart',
        point: 'bust',
        size: { from: '10', to: '10' },
        from: { typed: '32 1/2', unit: 'in', mm: 825.5 },
        to: { typed: '33', unit: 'in', mm: 838.2 },
        isSameLength: false,
      },
    ]);
    expect((await compare(body.id, body.id)).difference.isSame).toBe(true);
    const bad = await ada.agent.get(`/api/pattern-revisions/${body.id}/compare?with=1`).expect(422);
    expect(pointersOf(bad.body)).toEqual(['/with']);
    await ada.agent.get(`/api/pattern-revisions/${body.id}/compare?with=${NOWHERE}`).expect(404);
  });

  it('copies details and latest tables into a pattern of its own, and shares no file', async () => {
    const made = await bring(ada, { maker: 'Slipway', notes: 'n', seamEdges: { hip: 6 } });
    const edited = await send(ada, made.id, withCell(editOf(made), 0, 0, '33')).expect(201);
    const { body } = await ada.agent.post(`/api/patterns/${made.id}/copy`).expect(201);
    const copy = patternSchema.parse(body);
    expect(copy).toMatchObject({
      title: 'Harbour dress (copy)',
      maker: 'Slipway',
      seamEdges: { hip: 6 },
      notes: 'n',
      latestRevisionNumber: 1,
    });
    expect(copy.revision.table).toEqual(edited.body.table);
    expect([copy.revision.chartFile, copy.revision.finishedFile]).toEqual([null, null]);
    await ada.agent.delete(`/api/patterns/${copy.id}`).expect(204);
    expect((await wholeOf(ada, made.id)).revision).toEqual(edited.body);
    await expectNothingLost(test);
    await ada.agent.post(`/api/patterns/${NOWHERE}/copy`).expect(404);
  });

  it('a copy’s title still fits', async () => {
    const made = await bring(ada, { title: 'x'.repeat(120) });
    const { body } = await ada.agent.post(`/api/patterns/${made.id}/copy`).expect(201);
    expect(body.title).toHaveLength(120);
    expect(body.title).toMatch(/…\u0020\(copy\)$/);
  });

  it('types a pattern in without a file, and says what is missing at its place', async () => {
    const sent = {
      details: DETAILS,
      sizes: ['S', 'M'],
      chart: [],
      finished: [{ point: 'bust', unit: 'cm', typed: ['96', '1 000'] }],
    };
    const refused = await ada.agent
      .post('/api/patterns')
      .send({ ...sent, details: { ...DETAILS, title: ' ' } })
      .expect(422);
    expect(pointersOf(refused.body)).toEqual(['/details/title']);
    const cell = await ada.agent.post('/api/patterns').send(sent).expect(422);
    expect(pointersOf(cell.body)).toEqual(['/finished/0/typed/1']);
    sent.finished[0]!.typed[1] = '100';
    const { body } = await ada.agent.post('/api/patterns').send(sent).expect(201);
    const made = await wholeOf(ada, String(body.id));
    expect(made.revision.table.finished[0]).toMatchObject({ heading: 'Bust girth', mm: [960, 1000] });
    expect([made.hasChart, made.latestRevisionNumber]).toEqual([false, 1]);
  });
});
