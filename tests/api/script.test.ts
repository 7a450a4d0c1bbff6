import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { importDraftSchema } from '../../shared/patterns/imports.schema.ts';
import { fitAnswerSchema, savedPlanSchema } from '../../shared/plans/plans.schema.ts';
import { newTokenSchema } from '../../shared/tokens/tokens.schema.ts';
import { testApp } from '../support/app.ts';
import { CHART, FINISHED } from '../support/imports.ts';

/** What a spreadsheet or script knows: an address and a token. */
let address: string;
let token: string;
let server: Server;
beforeAll(async () => {
  const test = await testApp();
  const { agent } = await test.signedIn();
  const scopes = ['people:write', 'patterns:read', 'patterns:write', 'plans:read', 'plans:write'];
  const made = await agent.post('/api/tokens').send({ name: 'Workshop list', scopes }).expect(201);
  ({ token } = newTokenSchema.parse(made.body));
  server = createServer(test.app);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  address = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
});
afterAll(() => void server.close());

async function call(method: string, path: string, sent?: object): Promise<Response> {
  const isForm = sent instanceof FormData;
  return fetch(`${address}${path}`, {
    method,
    headers: {
      authorization: `Bearer ${token}`,
      ...(sent === undefined || isForm ? {} : { 'content-type': 'application/json' }),
    },
    ...(sent === undefined ? {} : { body: isForm ? sent : JSON.stringify(sent) }),
  });
}

/** The JSON of an answer that must have the status. */
async function answered(status: number, response: Promise<Response>): Promise<unknown> {
  const { status: found, ...rest } = { status: (await response).status, body: await (await response).text() };
  expect({ status: found, body: rest.body }).toMatchObject({ status });
  return rest.body === '' ? null : JSON.parse(rest.body);
}

const idOf = (body: unknown): string => (body as { id: string }).id;

function file(content: string, name: string): FormData {
  const form = new FormData();
  form.set('file', new Blob([content], { type: 'text/csv' }), name);
  return form;
}

describe('a script with nothing but a token', () => {
  it('brings a pattern and a person’s measurements, reckons a plan, keeps it and takes the table away', async () => {
    const draft = idOf(
      await answered(
        201,
        call('POST', '/api/imports', {
          details: { title: 'Harbour dress', kind: 'dress', silhouette: 'fitted', structure: 'woven' },
        }),
      ),
    );
    await answered(200, call('PUT', `/api/imports/${draft}/tables/chart`, file(CHART, 'chart.csv')));
    const read = await answered(
      200,
      call('PUT', `/api/imports/${draft}/tables/finished`, file(FINISHED, 'finished.csv')),
    );
    expect(importDraftSchema.parse(read).ready).toBe(true);
    const committed = await answered(201, call('POST', `/api/imports/${draft}/commit`));
    const { revisionId } = committed as { revisionId: string };

    const person = idOf(
      await answered(
        201,
        call('POST', '/api/people', { name: 'Ines', stage: 'adult', chestWord: 'bust', unit: 'in' }),
      ),
    );
    const measurementSetId = idOf(
      await answered(
        201,
        call('POST', `/api/people/${person}/measurement-sets`, {
          takenOn: '2025-01-31',
          takenBy: 'self',
          unit: 'in',
          typed: { bust: '34', waist: '26 1/2', hip: '38' },
        }),
      ),
    );

    const asked = { measurementSetId, revisionId, options: {} };
    const { plan } = fitAnswerSchema.parse(await answered(200, call('POST', '/api/fit', asked)));
    // The bust is size 12's and the hip size 14's, as the chart has them.
    expect(plan.status).toBe('planned');
    const sizes = Object.fromEntries(plan.zones.map(({ zone, size }) => [zone, size.label]));
    expect(sizes).toMatchObject({ bust: '12', hip: '14' });

    const saved = savedPlanSchema.parse(
      await answered(201, call('POST', '/api/plans', { ...asked, name: 'For the workshop' })),
    );
    const again = savedPlanSchema.parse(await answered(200, call('GET', `/api/plans/${saved.id}`)));
    expect(again.plan).toEqual(plan);

    const csv = await call('GET', `/api/pattern-revisions/${revisionId}/chart.csv`);
    expect(csv.status).toBe(200);
    expect(await csv.text()).toContain('36 3/8');
  });

  it('is told where it has no right, and by which scope it would', async () => {
    const refused = await answered(403, call('GET', '/api/people'));
    expect(refused).toMatchObject({
      type: '/problems/outsideScope',
      detail: 'The token needs the scope people:read.',
    });
  });
});
