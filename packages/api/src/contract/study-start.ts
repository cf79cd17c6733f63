import {
  families,
  type Hypothesis,
  type OutcomeKind,
  questionOutcomeSchema,
  questionPlanSchema,
  testSchema,
} from '@steelyard/calc';
import { z } from 'zod';
import { nounSchema } from './nouns.js';
import { planningValueFigures } from './planning-values.js';
import {
  organisationSchema,
  outcomeLabelSchema,
  outcomeUnitSchema,
  questionTextSchema,
  studyNameSchema,
  treatmentsSchema,
} from './question.js';

const named = { label: outcomeLabelSchema, unit: outcomeUnitSchema };

/** The outcome with its target, as the question states it, and its name. */
const outcomeSchema = z.discriminatedUnion('kind', [
  questionOutcomeSchema.options[0].extend(named),
  questionOutcomeSchema.options[1].extend(named),
  questionOutcomeSchema.options[2].extend(named),
  questionOutcomeSchema.options[3].extend(named),
  questionOutcomeSchema.options[4].extend(named),
]);

/** The planning value that each kind of outcome cannot do without. */
export const neededValue = {
  continuous: 'sd',
  binary: 'controlProportion',
  'time-to-event': 'controlSurvival',
  count: 'controlRate',
  ordinal: undefined,
} as const;

const { sd, controlProportion, controlSurvival, controlRate } = planningValueFigures;

/** What a newcomer is asked; everything else is filled in with values marked as assumed. */
export const studyStartSchema = z
  .strictObject({
    name: studyNameSchema,
    organisation: organisationSchema,
    question: questionTextSchema,
    outcome: outcomeSchema,
    test: testSchema.omit({ reference: true }).partial().optional(),
    power: z
      .number()
      .gt(0, 'The power must lie between 0 and 1.')
      .lt(1, 'The power must lie between 0 and 1.')
      .optional(),
    sd: sd.optional(),
    controlProportion: controlProportion.optional(),
    controlSurvival: controlSurvival.optional(),
    controlRate: controlRate.optional(),
    participants: nounSchema,
    clusters: nounSchema.nullable(),
    treatments: treatmentsSchema,
    randomises: z.enum(['individuals', 'clusters']).default('individuals'),
  })
  .superRefine((start, context) => {
    const refuse = (path: string[], message: string) => context.addIssue({ code: 'custom', path, message });
    const { outcome, clusters, randomises } = start;
    // Each field has been judged by itself already; what they require of each other is left.
    const issues = questionPlanSchema.safeParse(questionPlanOf(start)).error?.issues ?? [];
    for (const { code, path, message } of issues) {
      if (code === 'custom') refuse(path.map(String), message);
    }
    for (const key of Object.values(neededValue)) {
      if (key && key !== neededValue[outcome.kind] && start[key] !== undefined) {
        refuse([key], 'This belongs to another kind of outcome.');
      }
    }
    if (outcome.kind === 'binary' && start.controlProportion !== undefined) {
      const active = start.controlProportion + outcome.difference;
      if (active <= 0 || active >= 1) {
        refuse(
          ['controlProportion'],
          'With this difference the active proportion would not lie between 0 and 1.',
        );
      }
    }
    if (randomises !== 'clusters') return;
    if (!clusters) refuse(['clusters'], 'Name the clusters that are randomised.');
    const combines: Partial<Record<OutcomeKind, readonly Hypothesis[]>> = families.cluster.combines;
    const { hypothesis } = questionPlanOf(start).test;
    if (!combines[outcome.kind]?.includes(hypothesis)) {
      const message = `With clusters, ${hypothesis} of this kind of outcome is not computed: choose individuals, or another outcome.`;
      refuse(['randomises'], message);
    }
  });

/** The question as calc takes it. */
export function questionPlanOf({
  outcome,
  test,
}: Pick<z.infer<typeof studyStartSchema>, 'outcome' | 'test'>) {
  const { label: _, unit: __, ...asked } = outcome;
  return {
    outcome: asked,
    test: { hypothesis: 'superiority' as const, alpha: 0.05, sides: 2 as const, ...test },
  };
}

export type StudyStart = z.input<typeof studyStartSchema>;
