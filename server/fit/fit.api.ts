import {
  fitInputSchema,
  fitPlanSchema,
  optionSchema,
  pointResultSchema,
} from '../../shared/fit/fit.schema.ts';
import { fitAnswerSchema, fitRequestSchema, planOptionsSchema } from '../../shared/plans/plans.schema.ts';
import { pointIdSchema } from '../../shared/points/points.schema.ts';
import type { NounDescription } from '../http/describe.ts';

export const fitApi: NounDescription = {
  noun: 'Fit',
  schemas: {
    PointId: pointIdSchema,
    FitInput: fitInputSchema,
    FitPlan: fitPlanSchema,
    FitOption: optionSchema,
    PointResult: pointResultSchema,
    PlanOptions: planOptionsSchema,
    FitRequest: fitRequestSchema,
    FitAnswer: fitAnswerSchema,
  },
  routes: {
    'POST /api/fit': {
      summary: 'Reckon a plan of one measurement set in one pattern revision; nothing is kept',
      who: 'member',
      scope: 'plans:read',
      body: fitRequestSchema,
      answers: { 200: fitAnswerSchema },
      problems: ['notFound'],
    },
  },
};
