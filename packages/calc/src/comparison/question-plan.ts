import { z } from 'zod';
import { closedProportion, positive, quantity, testSchema } from '../request.js';

/** What the study asks: the outcome with its target difference, and the test. The rest comes from the ledger. */
export const questionOutcomeSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('continuous'),
    difference: quantity('The target difference'),
    better: z.enum(['higher', 'lower']).optional(),
  }),
  z.strictObject({
    kind: z.literal('binary'),
    /** Active − control proportion. */
    difference: quantity('The target difference', -1, 1),
    method: z.enum(['pooled', 'unpooled', 'continuity-corrected', 'arcsine']).optional(),
    better: z.enum(['higher', 'lower']).optional(),
  }),
  z.strictObject({
    kind: z.literal('time-to-event'),
    hazardRatio: positive('The target hazard ratio'),
    /** Months after which the ledger's control survival is stated. */
    survivalAt: positive('The month at which survival is stated'),
    accrual: quantity('The accrual period', 0, 1200),
    followUp: quantity('The follow-up', 0, 1200),
    method: z.enum(['schoenfeld', 'freedman']).optional(),
    better: z.enum(['higher', 'lower']).optional(),
  }),
  z.strictObject({
    kind: z.literal('count'),
    rateRatio: positive('The target rate ratio'),
    exposure: positive('The exposure'),
    better: z.enum(['higher', 'lower']).optional(),
  }),
  z.strictObject({
    kind: z.literal('ordinal'),
    oddsRatio: positive('The target odds ratio'),
    controlProbabilities: z
      .array(closedProportion('A category probability'))
      .min(2, 'State two categories or more.')
      .max(100),
    better: z.enum(['higher', 'lower']).optional(),
  }),
]);

/** What a study asks, with what its outcome and its test require of each other. */
export const questionPlanSchema = z
  .strictObject({ outcome: questionOutcomeSchema, test: testSchema })
  .superRefine(({ outcome, test }, context) => {
    const refuse = (path: string[], message: string) => context.addIssue({ code: 'custom', path, message });
    const [field, target, none] = targetOf(outcome);
    if (outcome.kind === 'ordinal') {
      const sum = outcome.controlProbabilities.reduce((total, each) => total + each, 0);
      if (Math.abs(sum - 1) > 1e-9) {
        refuse(['outcome', 'controlProbabilities'], 'The probabilities of the categories must sum to 1.');
      }
    }
    if (outcome.kind === 'time-to-event' && outcome.accrual + outcome.followUp === 0) {
      refuse(['outcome', 'followUp'], 'Somebody has to be followed: accrual and follow-up are both 0.');
    }
    if (test.hypothesis === 'superiority') {
      if (target === none) {
        const what = none === 0 ? 'The target difference must not be 0' : 'The target ratio must not be 1';
        refuse(['outcome', field], `${what}: no trial is large enough to find it.`);
      }
      if (test.margin !== undefined) refuse(['test', 'margin'], 'A superiority test has no margin.');
      return;
    }
    if (test.sides !== 1) refuse(['test', 'sides'], 'A test against a margin has one side.');
    if (test.margin === undefined) {
      refuse(['test', 'margin'], 'State the margin that the difference must stay within.');
    } else if (none === 1 && test.margin <= 1) {
      refuse(['test', 'margin'], 'The margin of a ratio must be above 1.');
    }
    if (test.hypothesis === 'non-inferiority' && outcome.better === undefined) {
      refuse(['outcome', 'better'], 'Say what is better: non-inferiority has a direction.');
    }
  });

/** The field that holds the target, its value, and the value that stands for no difference. */
export function targetOf(outcome: QuestionOutcome): [field: string, target: number, none: 0 | 1] {
  switch (outcome.kind) {
    case 'time-to-event':
      return ['hazardRatio', outcome.hazardRatio, 1];
    case 'count':
      return ['rateRatio', outcome.rateRatio, 1];
    case 'ordinal':
      return ['oddsRatio', outcome.oddsRatio, 1];
    default:
      return ['difference', outcome.difference, 0];
  }
}

export type QuestionOutcome = z.infer<typeof questionOutcomeSchema>;
export type QuestionPlan = z.infer<typeof questionPlanSchema>;
