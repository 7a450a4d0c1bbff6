import { measuredPerson } from '../measured-person.ts';
import { insertPattern } from '../pattern-rows.ts';
import { MARKER } from './marker.ts';
import { eachTheirOwn, having, ownRecord, type Ground, type Rows } from './row.ts';

async function asking({ test, owner }: Ground) {
  const { measurementSetId } = await measuredPerson(owner.agent, undefined, MARKER);
  const { revisionId } = await insertPattern(test.db, owner.user.id, { title: MARKER });
  return { measurementSetId, revisionId, options: {} };
}

const aPlan = async (ground: Ground) => {
  const saved = await ground.owner.agent
    .post('/api/plans')
    .send({ ...(await asking(ground)), name: MARKER })
    .expect(201);
  return { address: { id: (saved.body as { id: string }).id } };
};

export const planRows: Rows = {
  'POST /api/fit': { rights: ownRecord(200), ask: async (ground) => ({ body: await asking(ground) }) },
  'GET /api/plans': { rights: eachTheirOwn(200), ask: having(aPlan) },
  'POST /api/plans': {
    rights: ownRecord(201),
    ask: async (ground) => ({ body: { ...(await asking(ground)), name: MARKER } }),
  },
  'GET /api/plans/:id': { rights: ownRecord(200), ask: aPlan },
  'PATCH /api/plans/:id': {
    rights: ownRecord(200),
    ask: async (ground) => ({ ...(await aPlan(ground)), body: { name: 'Another name' } }),
  },
  'DELETE /api/plans/:id': { rights: ownRecord(204), ask: aPlan },
};
