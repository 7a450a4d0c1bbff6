import { healthSchema } from '../../shared/health.ts';
import type { NounDescription } from '../http/describe.ts';

export const healthApi: NounDescription = {
  noun: 'This instance',
  schemas: { Health: healthSchema },
  routes: {
    'GET /api/health': {
      summary: 'Ask whether this instance works; 503 where its database is silent',
      who: 'anyone',
      scope: null,
      answers: { 200: healthSchema, 503: healthSchema },
    },
  },
};
