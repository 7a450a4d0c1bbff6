import { z } from 'zod';
import { fitInputSchema, fitPlanSchema } from '../fit/fit.schema.ts';

/** What a person sets for one plan beside who and which pattern. */
export const planOptionsSchema = fitInputSchema
  .pick({ layers: true, lean: true, cutBetweenLines: true, held: true })
  .extend({
    fabric: fitInputSchema.shape.fabric.optional(),
    silhouette: fitInputSchema.shape.garment.shape.silhouette,
  });
export type PlanOptions = z.infer<typeof planOptionsSchema>;

/** Asks for a plan of one measurement set in one pattern revision. */
export const fitRequestSchema = z.object({
  measurementSetId: z.uuid(),
  revisionId: z.uuid(),
  options: planOptionsSchema,
});
export type FitRequest = z.infer<typeof fitRequestSchema>;

/** The plan and the input it follows from, so that the browser reckons on with the same numbers. */
export const fitAnswerSchema = z.object({ engine: z.string(), input: fitInputSchema, plan: fitPlanSchema });
export type FitAnswer = z.infer<typeof fitAnswerSchema>;

/** What is sent to save a plan. */
export const savedPlanInputSchema = fitRequestSchema.extend({
  name: z.string().trim().min(1, 'Give the plan a name.').max(120),
});
export type SavedPlanInput = z.infer<typeof savedPlanInputSchema>;

/** A saved plan in a list. */
export const savedPlanSummarySchema = z.object({
  id: z.uuid(),
  name: z.string(),
  createdAt: z.string(),
  engine: z.string(),
  personId: z.uuid(),
  personName: z.string(),
  measurementSetId: z.uuid(),
  takenOn: z.iso.date(),
  patternId: z.uuid(),
  patternTitle: z.string(),
  revisionId: z.uuid(),
  revisionNumber: z.number().int(),
  status: fitPlanSchema.shape.status,
  zones: fitPlanSchema.shape.zones,
});
export type SavedPlanSummary = z.infer<typeof savedPlanSummarySchema>;

/** A saved plan: it refers to a revision and a set, and never changes by itself. */
export const savedPlanSchema = savedPlanSummarySchema.extend({
  options: planOptionsSchema,
  input: fitInputSchema,
  plan: fitPlanSchema,
});
export type SavedPlan = z.infer<typeof savedPlanSchema>;
