import type { NounDescription } from '../http/describe.ts';

export const openapiApi: NounDescription = {
  noun: 'This description',
  routes: {
    'GET /api/openapi.json': {
      summary: 'Read this description, OpenAPI 3.1',
      who: 'anyone',
      scope: null,
      answers: { 200: { mediaType: 'application/json' } },
    },
  },
};
