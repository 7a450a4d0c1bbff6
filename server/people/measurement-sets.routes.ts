import { Router, type Request } from 'express';
import { z } from 'zod';
import { pageOf, pageQuerySchema } from '../../shared/paging.ts';
import { measurementSetInputSchema, measurementSetSchema } from '../../shared/people/people.schema.ts';
import { readMeasurements } from '../../shared/people/read-measurements.ts';
import { pointIdSchema } from '../../shared/points/points.schema.ts';
import type { FieldProblem } from '../../shared/problem.ts';
import { LENGTH_UNITS } from '../../shared/units.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { toPage } from '../http/paging.ts';
import { parseBody, parseId, parseQuery } from '../http/parse.ts';
import { found, invalid, notFound, Problem } from '../http/problem.ts';
import {
  createMeasurementSet,
  deleteMeasurementSet,
  findMeasurementSet,
  isSetOf,
  listMeasurementSets,
} from './measurement-sets.store.ts';
import { canUsePerson } from './people.policy.ts';
import { findPerson } from './people.store.ts';

const PERSON = 'person';
const SET = 'measurement set';

export function measurementSetRoutes({ db, requireUser }: RouteDeps): Router {
  const router = Router();

  async function ownPerson(request: Request) {
    const user = await requireUser(request);
    const person = found(await findPerson(db, parseId(request, PERSON)), PERSON);
    if (!canUsePerson(user, person)) throw notFound(PERSON);
    return person;
  }

  async function ownSet(request: Request) {
    const user = await requireUser(request);
    const { set, ownerId } = found(await findMeasurementSet(db, parseId(request, SET)), SET);
    if (!canUsePerson(user, { ownerId })) throw notFound(SET);
    return set;
  }

  router.get('/api/people/:id/measurement-sets', async (request, reply) => {
    const person = await ownPerson(request);
    const query = parseQuery(pageQuerySchema, request);
    const { sets, total } = await listMeasurementSets(db, person.id, query);
    reply.json(answer(pageOf(measurementSetSchema), toPage(sets, total, query)));
  });

  router.post('/api/people/:id/measurement-sets', async (request, reply) => {
    const person = await ownPerson(request);
    const { typed, ...input } = parseBody(measurementSetInputSchema, request, checkMeasurements);
    if (input.startedFromId !== null && !(await isSetOf(db, input.startedFromId, person.id))) {
      const detail = 'Start from a set of this same person, or from none.';
      throw invalid([{ pointer: '/startedFromId', detail }]);
    }
    const { values } = readMeasurements(typed, input.unit);
    const set = await createMeasurementSet(db, { ...input, personId: person.id, values });
    reply.status(201).json(answer(measurementSetSchema, set));
  });

  router.get('/api/measurement-sets/:id', async (request, reply) => {
    reply.json(answer(measurementSetSchema, await ownSet(request)));
  });

  router.delete('/api/measurement-sets/:id', async (request, reply) => {
    const set = await ownSet(request);
    if ((await deleteMeasurementSet(db, set.id)) === 'inUse') {
      throw new Problem('conflict', {
        detail: 'A saved plan was made from these measurements. Delete that plan first, or keep both.',
      });
    }
    reply.status(204).end();
  });
  return router;
}

/** Reads what can be read even where another field is at fault, so that all is told at once. */
const looseSchema = z.object({
  takenOn: z.unknown(),
  unit: z.enum(LENGTH_UNITS),
  typed: z.record(z.string(), z.unknown()),
});

function checkMeasurements(body: unknown): FieldProblem[] {
  const loose = looseSchema.safeParse(body);
  if (!loose.success) return [];
  const texts = Object.entries(loose.data.typed).flatMap(([key, text]) => {
    const point = pointIdSchema.safeParse(key);
    return point.success && typeof text === 'string' && text.trim().length <= 40 ? [[point.data, text]] : [];
  });
  const { values, errors } = readMeasurements(
    Object.fromEntries(texts) as Parameters<typeof readMeasurements>[0],
    loose.data.unit,
  );
  const problems = errors.map(({ point, words }) => ({ pointer: `/typed/${point}`, detail: words }));
  const isEmpty = Object.keys(values).length === 0 && problems.length === 0;
  if (isEmpty) problems.push({ pointer: '/typed', detail: 'Write at least one measurement.' });
  return [...problems, ...checkDay(loose.data.takenOn)];
}

const DAY_MS = 86_400_000;

/** A day ahead is let through: it may be tomorrow already where the person is. */
function checkDay(takenOn: unknown): FieldProblem[] {
  if (!z.iso.date().safeParse(takenOn).success) return [];
  const latest = new Date(Date.now() + DAY_MS).toISOString().slice(0, 10);
  const day = String(takenOn);
  if (day >= '1900-01-01' && day <= latest) return [];
  return [{ pointer: '/takenOn', detail: 'Give the day they were taken: today or before, from 1900 on.' }];
}
