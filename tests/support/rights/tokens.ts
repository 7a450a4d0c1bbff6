import { MARKER } from './marker.ts';
import { bySession, eachTheirOwn, having, ownRecord, type Ground, type Rows } from './row.ts';

const aToken = async ({ owner }: Ground) => {
  const made = await owner.agent
    .post('/api/tokens')
    .send({ name: MARKER, scopes: ['plans:read'] })
    .expect(201);
  const { id } = made.body as { id: string };
  return { address: { id } };
};

export const tokenRows: Rows = {
  'GET /api/tokens': { rights: bySession(eachTheirOwn(200)), ask: having(aToken) },
  'POST /api/tokens': {
    rights: bySession(eachTheirOwn(201)),
    ask: () => ({ body: { name: 'Script', scopes: ['plans:read'] } }),
  },
  'DELETE /api/tokens/:id': { rights: bySession(ownRecord(204)), ask: aToken },
};
