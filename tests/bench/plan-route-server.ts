// The process that `plan-route.ts` measures: the product on one port, a bare route on another, one database.
import { createServer, type RequestListener } from 'node:http';
import type { AddressInfo } from 'node:net';
import { fromNodeHeaders } from 'better-auth/node';
import express from 'express';
import { pino } from 'pino';
import { createApp } from '../../server/app.ts';
import { createAuth } from '../../server/auth.ts';
import { readConfig } from '../../server/config.ts';
import { createDatabase } from '../../server/db/client.ts';
import { newId } from '../../server/db/columns.ts';
import { migrate } from '../../server/db/migrate.ts';
import { loadPlanGround } from '../../server/fit/fit.store.ts';
import { measurementSet, person } from '../../server/people/people.table.ts';
import type { PatternTable } from '../../shared/patterns/patterns.schema.ts';
import { fitRequestSchema, type FitRequest } from '../../shared/plans/plans.schema.ts';
import type { PointId } from '../../shared/points/point-ids.ts';
import { insertPattern } from '../support/pattern-rows.ts';
import { benchInput } from './plan-fit.ts';

const config = readConfig(process.env);
const database = createDatabase(config.databaseUrl);
await migrate(database);
const { db } = database;
const log = pino({ base: null });
const auth = createAuth({ db, config, log, limits: false });
const { userId, cookie } = await signedIn();
const asked = await ground(userId);

const product = await listen(createApp({ db, auth, log, config }));
const bare = await listen(bareRoute());
process.send?.({ product, bare, cookie, asked, origin: config.appUrl });

/** The same look-up of the session, the same statements, and what they found as JSON: nothing else. */
function bareRoute(): RequestListener {
  const app = express();
  app.use(express.json());
  app.post('/api/fit', async (request, reply) => {
    const session = await auth.api.getSession({ headers: fromNodeHeaders(request.headers) });
    if (session === null) {
      reply.status(401).end();
      return;
    }
    reply.json(await loadPlanGround(db, session.user.id, request.body as FitRequest));
  });
  return app;
}

function listen(app: RequestListener): Promise<number> {
  return new Promise((resolve) => {
    const server = createServer(app).listen(0, '127.0.0.1', () =>
      resolve((server.address() as AddressInfo).port),
    );
  });
}

async function signedIn(): Promise<{ userId: string; cookie: string }> {
  const account = { name: 'Bench', email: `bench-${newId()}@example.org`, password: 'a quiet tape measure' };
  await auth.api.signUpEmail({ body: account });
  const response = await auth.api.signInEmail({ body: account, asResponse: true });
  const { user } = (await response.json()) as { user: { id: string } };
  const cookies = response.headers.getSetCookie().map((text) => text.split(';')[0] ?? '');
  return { userId: user.id, cookie: cookies.join('; ') };
}

/** A body and a pattern of 20 sizes and 12 points, as the bench of the engine has them. */
async function ground(ownerId: string): Promise<FitRequest> {
  const input = benchInput();
  const now = new Date();
  const [personId, measurementSetId] = [newId(), newId()];
  const column = (point: string, of: 'body' | 'finished') => {
    const mm = input.sizes.map((size) => Number(size[of][point as PointId]));
    return { point: point as PointId, heading: point, unit: 'mm' as const, mm, typed: mm.map(String) };
  };
  const points = Object.keys(input.body);
  const table: PatternTable = {
    sizes: input.sizes.map(({ label }) => label),
    chart: points.map((point) => column(point, 'body')),
    finished: points.map((point) => column(point, 'finished')),
  };
  await db.insert(person).values({
    ...{ id: personId, ownerId, name: 'Bench', stage: 'adult', chestWord: 'bust', unit: 'mm', notes: '' },
    ...{ createdAt: now, updatedAt: now },
  });
  const values = Object.fromEntries(
    Object.entries(input.body).map(([point, mm]) => [point, { typed: String(mm), unit: 'mm' as const, mm }]),
  );
  await db.insert(measurementSet).values({
    ...{ id: measurementSetId, personId, takenOn: '2025-01-31', takenBy: 'self', unit: 'mm', notes: '' },
    ...{ startedFromId: null, values, createdAt: now },
  });
  const { revisionId } = await insertPattern(db, ownerId, { kind: 'jumpsuit', table });
  return fitRequestSchema.parse({ measurementSetId, revisionId, options: {} });
}
