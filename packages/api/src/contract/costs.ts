import { studyCostsSchema } from '@steelyard/calc';
import { z } from 'zod';

export const newCostPlanSchema = studyCostsSchema.extend({
  source: z.string().trim().max(1000).nullable().default(null),
  /** The version it replaces; null where there was none. */
  version: z.number().int().nullable(),
});

export type NewCostPlan = z.input<typeof newCostPlanSchema>;
