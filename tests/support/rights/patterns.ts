import { bring, CHART, DETAILS, start, upload } from '../imports.ts';
import { MARKER } from './marker.ts';
import { eachTheirOwn, having, ownRecord, type Ground, type Rows } from './row.ts';

const brought = ({ owner }: Ground) => bring(owner, { title: MARKER });
const aPattern = async (ground: Ground) => ({ address: { id: (await brought(ground)).id } });
const aRevision = async (ground: Ground) => ({ address: { id: (await brought(ground)).latestRevisionId } });
const aFile = async (ground: Ground) => ({
  address: { id: (await brought(ground)).revision.chartFile?.id ?? 'none' },
});

const aDraft = async ({ owner }: Ground) => {
  const { id } = await start(owner, { details: { ...DETAILS, title: MARKER } });
  await upload(owner, id, 'chart', CHART);
  return { address: { id } };
};
const aTable = async (ground: Ground) => {
  const { address } = await aDraft(ground);
  return { address: { ...address, role: 'chart' } };
};

export const patternRows: Rows = {
  'GET /api/patterns': { rights: eachTheirOwn(200), ask: having(brought) },
  'GET /api/patterns/:id': { rights: ownRecord(200), ask: aPattern },
  'PATCH /api/patterns/:id': {
    rights: ownRecord(200),
    ask: async (ground) => ({ ...(await aPattern(ground)), body: { notes: 'new' } }),
  },
  'DELETE /api/patterns/:id': { rights: ownRecord(204), ask: aPattern },
  'GET /api/patterns/:id/revisions': { rights: ownRecord(200), ask: aPattern },
  'GET /api/pattern-revisions/:id': { rights: ownRecord(200), ask: aRevision },
  'GET /api/pattern-revisions/:id/chart.csv': { rights: ownRecord(200), ask: aRevision },
  'GET /api/pattern-revisions/:id/finished.csv': { rights: ownRecord(200), ask: aRevision },
  'GET /api/files/:id': { rights: ownRecord(200), ask: aFile },
};

export const importRows: Rows = {
  'GET /api/imports': { rights: eachTheirOwn(200), ask: having(aDraft) },
  'POST /api/imports': { rights: eachTheirOwn(201), ask: () => ({ body: {} }) },
  'GET /api/imports/:id': { rights: ownRecord(200), ask: aDraft },
  'PATCH /api/imports/:id': {
    rights: ownRecord(200),
    ask: async (ground) => ({ ...(await aDraft(ground)), body: { details: { notes: 'new' } } }),
  },
  'DELETE /api/imports/:id': { rights: ownRecord(204), ask: aDraft },
  'PUT /api/imports/:id/tables/:role': {
    rights: ownRecord(200),
    ask: async (ground) => ({ ...(await aTable(ground)), file: CHART }),
  },
  'DELETE /api/imports/:id/tables/:role': { rights: ownRecord(200), ask: aTable },
  'POST /api/imports/:id/commit': { rights: ownRecord(201), ask: aDraft },
};
