import { beforeAll, describe, expect, it } from 'vitest';
import { ENGINE_VERSION, planFit } from '../../shared/fit/plan-fit.ts';
import type { FitAnswer } from '../../shared/plans/plans.schema.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { measuredPerson } from '../support/measured-person.ts';
import { DRESS_TABLE, insertPattern } from '../support/pattern-rows.ts';

let test: TestApp;
let ada: SignedIn;
let measurementSetId: string;
let revisionId: string;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
  ({ measurementSetId } = await measuredPerson(ada.agent));
  ({ revisionId } = await insertPattern(test.db, ada.user.id));
});

const NOWHERE = '0190d5f2-0000-7000-8000-000000000000';
const ask = (options: object = {}, more: object = {}, agent = ada.agent) =>
  agent.post('/api/fit').send({ measurementSetId, revisionId, options, ...more });
const sizesOf = (body: FitAnswer) =>
  Object.fromEntries(body.plan.zones.map(({ zone, size }) => [zone, size.label]));

describe('the fit plan: who may ask', () => {
  it('asks everybody to sign in first', async () => {
    await ask({}, {}, test.anonymous()).expect(401);
    await test.anonymous().post('/api/fit').send({}).expect(401);
  });

  it.each(['member', 'teacher', 'admin'] as const)(
    'hides another’s measurements and another’s pattern from a %s as if they did not exist',
    async (role) => {
      const other = await test.signedIn({ role });
      const theirs = await measuredPerson(other.agent);
      const { revisionId: theirRevision } = await insertPattern(test.db, other.user.id);
      await ask({}, { revisionId: theirRevision }, other.agent).expect(404);
      await ask({}, { measurementSetId: theirs.measurementSetId }, other.agent).expect(404);
      await ask({}, { measurementSetId: NOWHERE }).expect(404);
      await ask({}, { revisionId: NOWHERE }).expect(404);
    },
  );

  it('refuses another site', async () => {
    await ask().set('Origin', 'https://elsewhere.example').expect(403);
  });
});

describe('the fit plan: what it answers', () => {
  it('plans the measurements in the pattern, with the input it follows from', async () => {
    const { body } = (await ask().expect(200)) as { body: FitAnswer };
    expect(body.engine).toBe(ENGINE_VERSION);
    expect(body.input.body).toEqual({ bust: 920, waist: 740, hip: 1060 });
    expect(body.input.sizes[1]).toEqual({
      label: '12',
      body: { bust: 920, waist: 740, hip: 980 },
      finished: { bust: 1000, waist: 800, hip: 1050 },
    });
    expect(body.input.garment).toMatchObject({ kind: 'dress', silhouette: 'fitted', worn: 'closed' });
    expect(body.plan.status).toBe('planned');
    // Bust and waist are a 12 and the hip a 16, two sizes over: a dress is graded out to it.
    expect(sizesOf(body)).toMatchObject({ bust: '12', hip: '16' });
    expect(body.plan).toEqual(planFit(body.input));
  });

  it('takes the silhouette of this plan over the pattern’s own', async () => {
    const { body } = (await ask({ silhouette: 'veryLoose' }).expect(200)) as { body: FitAnswer };
    expect(body.input.garment.silhouette).toBe('veryLoose');
  });

  it('keeps a size that is held', async () => {
    const { body } = (await ask({ held: { hip: 2 } }).expect(200)) as { body: FitAnswer };
    expect(sizesOf(body)['hip']).toBe('14');
    expect(body.plan.reasons).toContainEqual(expect.objectContaining({ code: 'held', zone: 'hip' }));
  });

  it('plans between the lines where it is asked to, and takes a half that is held', async () => {
    const { body } = (await ask({ cutBetweenLines: true, held: { hip: 1.5 } }).expect(200)) as {
      body: FitAnswer;
    };
    expect(body.plan.zones.find(({ zone }) => zone === 'hip')?.size).toEqual({
      label: '12–14',
      position: 1.5,
      between: { smaller: '12', larger: '14' },
    });
    expect(body.plan).toEqual(planFit(body.input));
  });

  it('says of a pattern drafted for a knit that it does not reckon with it yet', async () => {
    const knit = await insertPattern(test.db, ada.user.id, { structure: 'knit', kind: 'knitTop' });
    const { body } = (await ask({}, { revisionId: knit.revisionId }).expect(200)) as { body: FitAnswer };
    expect(body.plan.status).toBe('notEnough');
    expect(body.plan.cautions.map(({ code }) => code)).toContain('knitNotReckoned');
    expect(body.plan.zones).toEqual([]);
  });

  it('says what is missing where nothing is shared', async () => {
    const neck = await measuredPerson(ada.agent, { ankle: '230' });
    const { body } = (await ask({}, { measurementSetId: neck.measurementSetId }).expect(200)) as {
      body: FitAnswer;
    };
    expect(body.plan.status).toBe('notEnough');
    expect(body.plan.cautions.map(({ code }) => code)).toContain('nothingShared');
  });

  it('answers the same to the same, and writes nothing', async () => {
    const first = await ask().expect(200);
    const second = await ask().expect(200);
    expect(second.body).toEqual(first.body);
    await ada.agent.get('/api/plans').expect(({ body }) => expect(body.total).toBe(0));
  });
});

describe('the fit plan: what it refuses in words', () => {
  it.each([
    [{ layers: [{ name: 'shirt', thicknessMm: 1 }] }, ['/options/layers']],
    [{ lean: 'roomier' }, ['/options/lean']],
    [{ fabric: { structure: 'knit' } }, ['/options/fabric/structure']],
    [{ fabric: { structure: 'woven', stretch: 0.1 } }, ['/options/fabric/stretch']],
    [{ fabric: { structure: 'woven', shrinkLengthwise: 0.05 } }, ['/options/fabric/shrinkLengthwise']],
    [{ fabric: { structure: 'woven', shrinkCrosswise: -0.01 } }, ['/options/fabric/shrinkCrosswise']],
    [{ held: { hip: 4 } }, ['/options/held/hip']],
    [{ held: { hip: 1.5 } }, ['/options/held/hip']],
    [{ cutBetweenLines: true, held: { hip: 1.25 } }, ['/options/held/hip']],
    [{ cutBetweenLines: true, held: { hip: 3.5 } }, ['/options/held/hip']],
    [{ held: { hip: -1 } }, ['/options/held/hip']],
    [{ held: { nose: 1 } }, ['/options/held/nose']],
    [{ silhouette: 'tight' }, ['/options/silhouette']],
    [
      { lean: 'closer', held: { bust: 9, hip: 0.5 }, cutBetweenLines: false },
      ['/options/lean', '/options/held/bust', '/options/held/hip'],
    ],
  ])('%j', async (options, pointers) => {
    const { body } = await ask(options).expect(422);
    const errors = body.errors as { pointer: string; detail: string }[];
    expect(errors.map((error) => error.pointer)).toEqual(pointers);
    for (const { detail } of errors) expect(detail).toMatch(/^[A-Z“].*\.$/);
  });

  it('a woven in a pattern that is drafted for a knit', async () => {
    const knit = await insertPattern(test.db, ada.user.id, { structure: 'knit', kind: 'knitTop' });
    const { body } = await ask({ fabric: { structure: 'woven' } }, { revisionId: knit.revisionId }).expect(
      422,
    );
    expect(body.errors).toMatchObject([{ pointer: '/options/fabric/structure' }]);
  });

  it('a size held in a zone that the garment has not', async () => {
    const skirt = await insertPattern(test.db, ada.user.id, { kind: 'skirt' });
    const { body } = await ask({ held: { sleeve: 1 } }, { revisionId: skirt.revisionId }).expect(422);
    expect(body.errors).toMatchObject([{ pointer: '/options/held/sleeve' }]);
  });

  it('but takes options that say what is so anyway', async () => {
    const options = {
      layers: [],
      cutBetweenLines: false,
      fabric: { structure: 'woven', stretch: 0 },
      held: {},
    };
    await ask(options).expect(200);
  });

  it('ids that are none, at their places', async () => {
    const { body } = await ask({}, { measurementSetId: 'x', revisionId: undefined }).expect(422);
    expect((body.errors as { pointer: string }[]).map((error) => error.pointer)).toEqual([
      '/measurementSetId',
      '/revisionId',
    ]);
    await ada.agent.post('/api/fit').send({ measurementSetId, revisionId }).expect(422);
  });
});

describe('the fit plan: a large pattern', () => {
  it('answers 200 sizes', async () => {
    const sizes = Array.from({ length: 200 }, (_, index) => `S${index}`);
    const mm = sizes.map((_, index) => 700 + index * 5);
    const chart = DRESS_TABLE.chart.map((column) => ({ ...column, mm, typed: mm.map(String) }));
    const large = await insertPattern(test.db, ada.user.id, { table: { sizes, chart, finished: [] } });
    const { body } = (await ask({}, { revisionId: large.revisionId }).expect(200)) as { body: FitAnswer };
    expect(body.input.sizes).toHaveLength(200);
  });
});
