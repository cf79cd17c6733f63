import { Command } from '@nestjs/cqrs';
import { questionPlanSchema } from '@steelyard/calc';
import { z } from 'zod';
import { nounSchema, treatmentSchema } from '../../contract/nouns.js';
import { studyRoles } from '../../contract/studies.js';

const line = z.string().trim().min(1).max(200);

export const newStudySchema = z.strictObject({
  name: line,
  organisation: line,
  fictional: z.boolean(),
  question: z.string().trim().min(1).max(1000),
  outcomeLabel: line,
  outcomeUnit: z.string().trim().max(40),
  plan: questionPlanSchema,
  treatments: z.array(treatmentSchema).min(2).max(11),
  participants: nounSchema,
  clusters: nounSchema.nullable(),
  /** Besides the methodologist, who creates the study. */
  members: z.array(z.strictObject({ personId: z.uuid(), role: z.enum(studyRoles) })),
});

/** Any person may create a study and becomes its methodologist. Answers with the study's id. */
export class CreateStudy extends Command<string> {
  constructor(
    readonly personId: string,
    readonly study: z.input<typeof newStudySchema>,
  ) {
    super();
  }
}
