import { z } from 'zod';
import { pageOf } from '../../shared/paging.ts';
import {
  savedPlanInputSchema,
  savedPlanSchema,
  savedPlanSummarySchema,
} from '../../shared/plans/plans.schema.ts';
import type { NounDescription } from '../http/describe.ts';
import { listQuerySchema } from '../http/paging.ts';

/** A plan never changes but for its name: anything else sent is refused, not dropped. */
export const renameSchema = z.strictObject({ name: savedPlanInputSchema.shape.name });

export const plansApi: NounDescription = {
  noun: 'Saved plans',
  schemas: {
    SavedPlanInput: savedPlanInputSchema,
    SavedPlan: savedPlanSchema,
    SavedPlanSummary: savedPlanSummarySchema,
  },
  routes: {
    'GET /api/plans': {
      summary: 'List your saved plans, the latest saved first',
      who: 'member',
      scope: 'plans:read',
      query: listQuerySchema,
      answers: { 200: pageOf(savedPlanSummarySchema) },
    },
    'POST /api/plans': {
      summary: 'Reckon a plan and keep it',
      who: 'member',
      scope: 'plans:write',
      body: savedPlanInputSchema,
      answers: { 201: savedPlanSchema },
      problems: ['conflict', 'notFound'],
    },
    'GET /api/plans/:id': {
      summary: 'Read a saved plan with the input it followed from',
      who: 'member',
      scope: 'plans:read',
      answers: { 200: savedPlanSchema },
    },
    'PATCH /api/plans/:id': {
      summary: 'Rename a saved plan',
      who: 'member',
      scope: 'plans:write',
      body: renameSchema.partial(),
      answers: { 200: savedPlanSchema },
    },
    'DELETE /api/plans/:id': {
      summary: 'Delete a saved plan',
      who: 'member',
      scope: 'plans:write',
      answers: { 204: 'nothing' },
    },
  },
};
