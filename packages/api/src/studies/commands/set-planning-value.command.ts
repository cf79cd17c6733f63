import { Command } from '@nestjs/cqrs';
import { ledgerEntrySchema, planningValueTraits } from '@steelyard/calc';
import { z } from 'zod';

export const newPlanningValueSchema = ledgerEntrySchema
  .extend({
    low: z.number().nullable(),
    high: z.number().nullable(),
    source: z.string().trim().min(1, 'Say where the value comes from.').max(1000),
    /** The version it replaces; null where there was none. */
    version: z.number().int().nullable(),
  })
  .superRefine(({ key, value, low, high }, context) => {
    if ((low !== null && low > value) || (high !== null && high < value)) {
      context.addIssue({ code: 'custom', path: ['value'], message: 'The value must lie within its range.' });
    }
    if (planningValueTraits[key].unit === 'proportion' && (value < 0 || value > 1)) {
      context.addIssue({ code: 'custom', path: ['value'], message: 'A proportion lies between 0 and 1.' });
    }
  });

/** Answers with the planning value's id. */
export class SetPlanningValue extends Command<string> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly planningValue: z.input<typeof newPlanningValueSchema>,
  ) {
    super();
  }
}
