import { questionOutcomeSchema, testSchema } from '@steelyard/calc';
import { z } from 'zod';
import { nounSchema } from './nouns.js';
import { planningValueFigures } from './planning-values.js';
import {
  askedPlanSchema,
  organisationSchema,
  outcomeLabelSchema,
  outcomeUnitSchema,
  questionTextSchema,
  studyNameSchema,
  treatmentsSchema,
} from './question.js';

const kinds = ['continuous', 'binary'] as const satisfies z.infer<typeof questionOutcomeSchema>['kind'][];

const outcomeSchema = z.strictObject({
  kind: z.enum(kinds),
  label: outcomeLabelSchema,
  unit: outcomeUnitSchema,
  better: z.enum(['higher', 'lower']).optional(),
  /** Active − control. */
  difference: z.number({ error: 'The target difference must be a number.' }),
});

/** What a newcomer is asked; everything else is filled in with values marked as assumed. */
export const studyStartSchema = z
  .strictObject({
    name: studyNameSchema,
    organisation: organisationSchema,
    question: questionTextSchema,
    outcome: outcomeSchema,
    test: testSchema.pick({ alpha: true, sides: true }).optional(),
    power: z
      .number()
      .gt(0, 'The power must lie between 0 and 1.')
      .lt(1, 'The power must lie between 0 and 1.')
      .optional(),
    /** Of a continuous outcome. */
    sd: planningValueFigures.sd.optional(),
    /** Of a binary outcome. */
    controlProportion: planningValueFigures.controlProportion.optional(),
    participants: nounSchema,
    clusters: nounSchema.nullable(),
    treatments: treatmentsSchema,
    randomises: z.enum(['individuals', 'clusters']).default('individuals'),
  })
  .superRefine((start, context) => {
    const refuse = (path: string[], message: string) => context.addIssue({ code: 'custom', path, message });
    const { outcome, sd, controlProportion, clusters, randomises } = start;
    for (const { path, message } of askedPlanSchema.safeParse(questionPlanOf(start)).error?.issues ?? []) {
      refuse(path.map(String), message);
    }
    const active = (controlProportion ?? 0.5) + outcome.difference;
    if (outcome.kind === 'binary' && controlProportion !== undefined && (active <= 0 || active >= 1)) {
      refuse(
        ['controlProportion'],
        'With this difference the active proportion would not lie between 0 and 1.',
      );
    }
    if (outcome.kind === 'binary' && sd !== undefined) refuse(['sd'], 'A proportion has no SD of its own.');
    if (outcome.kind === 'continuous' && controlProportion !== undefined) {
      refuse(['controlProportion'], 'A mean has no control proportion.');
    }
    if (randomises === 'clusters' && !clusters)
      refuse(['clusters'], 'Name the clusters that are randomised.');
  });

/** The question as calc takes it. */
export function questionPlanOf({
  outcome,
  test,
}: Pick<z.infer<typeof studyStartSchema>, 'outcome' | 'test'>) {
  const { kind, difference, better } = outcome;
  return {
    outcome: { kind, difference, ...(better && { better }) },
    test: { hypothesis: 'superiority' as const, alpha: 0.05, sides: 2 as const, ...test },
  };
}

export type StudyStart = z.input<typeof studyStartSchema>;
