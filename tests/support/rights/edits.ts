import { bring, DETAILS } from '../imports.ts';
import { MARKER } from './marker.ts';
import { eachTheirOwn, ownRecord, type Ground, type Rows } from './row.ts';

const TABLE = {
  sizes: ['10', '12'],
  chart: [
    { point: 'bust', unit: 'in', typed: ['33', '35'] },
    { point: 'hip', unit: 'in', typed: ['36', '38'] },
  ],
  finished: [],
};
const brought = ({ owner }: Ground) => bring(owner, { title: MARKER });

export const editRows: Rows = {
  'POST /api/patterns': { rights: eachTheirOwn(201), ask: () => ({ body: { details: DETAILS, ...TABLE } }) },
  'POST /api/patterns/:id/revisions': {
    rights: ownRecord(201),
    ask: async (ground) => {
      const { id, latestRevisionId } = await brought(ground);
      return { address: { id }, body: { ...TABLE, basedOn: latestRevisionId } };
    },
  },
  'POST /api/patterns/:id/copy': {
    rights: ownRecord(201),
    ask: async (ground) => ({ address: { id: (await brought(ground)).id } }),
  },
  'GET /api/pattern-revisions/:id/compare': {
    rights: ownRecord(200),
    ask: async (ground) => {
      const { latestRevisionId: id } = await brought(ground);
      return { address: { id }, query: { with: id } };
    },
  },
};
