import { Command } from '@nestjs/cqrs';
import { optionPlanSchema } from '@steelyard/calc';
import { z } from 'zod';

export const newOptionSchema = z.strictObject({
  name: z.string().trim().min(1, 'Name the option.').max(200),
  plan: optionPlanSchema,
});

/** Adds a candidate design behind those that are there. Answers with the option's id. */
export class AddOption extends Command<string> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly option: z.input<typeof newOptionSchema>,
  ) {
    super();
  }
}
