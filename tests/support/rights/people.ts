import { measuredPerson } from '../measured-person.ts';
import { MARKER } from './marker.ts';
import { eachTheirOwn, having, ownRecord, type Ground, type Rows } from './row.ts';

const PERSON = { name: MARKER, stage: 'adult', chestWord: 'bust', unit: 'cm' };
const SET = { takenOn: '2025-01-31', takenBy: 'self', unit: 'cm', typed: { bust: '92' }, notes: MARKER };

const aPerson = async ({ owner }: Ground) => {
  const { personId } = await measuredPerson(owner.agent, undefined, MARKER);
  return { address: { id: personId } };
};
const aSet = async ({ owner }: Ground) => {
  const { measurementSetId } = await measuredPerson(owner.agent, undefined, MARKER);
  return { address: { id: measurementSetId } };
};

export const peopleRows: Rows = {
  'GET /api/people': { rights: eachTheirOwn(200), ask: having(aPerson) },
  'POST /api/people': {
    rights: eachTheirOwn(201),
    ask: () => ({ body: { ...PERSON, name: 'Somebody' } }),
  },
  'GET /api/people/:id': { rights: ownRecord(200), ask: aPerson },
  'PATCH /api/people/:id': {
    rights: ownRecord(200),
    ask: async (ground) => ({ ...(await aPerson(ground)), body: { notes: 'new' } }),
  },
  'DELETE /api/people/:id': { rights: ownRecord(204), ask: aPerson },
  'GET /api/people/:id/measurement-sets': { rights: ownRecord(200), ask: aPerson },
  'POST /api/people/:id/measurement-sets': {
    rights: ownRecord(201),
    ask: async (ground) => ({ ...(await aPerson(ground)), body: SET }),
  },
  'GET /api/measurement-sets/:id': { rights: ownRecord(200), ask: aSet },
  'DELETE /api/measurement-sets/:id': { rights: ownRecord(204), ask: aSet },
};
