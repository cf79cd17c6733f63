import { Command } from '@nestjs/cqrs';
import { studyCostsSchema } from '@steelyard/calc';
import { z } from 'zod';

export const newCostPlanSchema = studyCostsSchema.extend({
  /** The version it replaces; null where there was none. */
  version: z.number().int().nullable(),
});

/** Answers with the cost plan's id. */
export class SetCostPlan extends Command<string> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly costPlan: z.input<typeof newCostPlanSchema>,
  ) {
    super();
  }
}
