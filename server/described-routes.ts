import { accountApi } from './account/account.api.ts';
import { adminApi } from './admin/admin.api.ts';
import { fitApi } from './fit/fit.api.ts';
import { healthApi } from './health/health.api.ts';
import type { NounDescription } from './http/describe.ts';
import { mailboxApi } from './mailbox/mailbox.api.ts';
import { openapiApi } from './openapi/openapi.api.ts';
import { editsApi } from './patterns/edits.api.ts';
import { importsApi } from './patterns/imports.api.ts';
import { patternsApi } from './patterns/patterns.api.ts';
import { peopleApi } from './people/people.api.ts';
import { plansApi } from './plans/plans.api.ts';
import { tokensApi } from './tokens/tokens.api.ts';

/** Every noun's description, in the order in which the interface's page lists them. */
export const describedNouns: readonly NounDescription[] = [
  peopleApi,
  patternsApi,
  editsApi,
  importsApi,
  fitApi,
  plansApi,
  tokensApi,
  accountApi,
  adminApi,
  mailboxApi,
  healthApi,
  openapiApi,
];
