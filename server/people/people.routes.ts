import { Router, type Request } from 'express';
import { pageOf } from '../../shared/paging.ts';
import { personInputSchema, personSchema } from '../../shared/people/people.schema.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { listQuerySchema, toPage } from '../http/paging.ts';
import { parseBody, parseId, parsePatch, parseQuery } from '../http/parse.ts';
import { found, notFound } from '../http/problem.ts';
import { canUsePerson } from './people.policy.ts';
import { createPerson, deletePerson, findPerson, listPeople, updatePerson } from './people.store.ts';

const THING = 'person';

export function peopleRoutes({ db, requireUser }: RouteDeps): Router {
  const router = Router();

  async function own(request: Request) {
    const user = await requireUser(request);
    const person = found(await findPerson(db, parseId(request, THING)), THING);
    if (!canUsePerson(user, person)) throw notFound(THING);
    return person;
  }

  router.get('/api/people', async (request, reply) => {
    const user = await requireUser(request);
    const query = parseQuery(listQuerySchema, request);
    const { people, total } = await listPeople(db, user.id, query);
    reply.json(answer(pageOf(personSchema), toPage(people, total, query)));
  });

  router.post('/api/people', async (request, reply) => {
    const user = await requireUser(request);
    const id = await createPerson(db, user.id, parseBody(personInputSchema, request));
    reply.status(201).json(answer(personSchema, found(await findPerson(db, id), THING)));
  });

  router.get('/api/people/:id', async (request, reply) => {
    reply.json(answer(personSchema, await own(request)));
  });

  router.patch('/api/people/:id', async (request, reply) => {
    const person = await own(request);
    await updatePerson(db, person.id, parsePatch(personInputSchema, request));
    reply.json(answer(personSchema, found(await findPerson(db, person.id), THING)));
  });

  router.delete('/api/people/:id', async (request, reply) => {
    const person = await own(request);
    await deletePerson(db, person.id);
    reply.status(204).end();
  });
  return router;
}
