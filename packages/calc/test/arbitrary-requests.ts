import fc from 'fast-check';
import type { AppraisalRequest, FamilyId } from '../src/index.js';
import { designsOf } from './arbitrary-designs.js';
import { questionsOf } from './arbitrary-outcomes.js';
import { type Combination, everyCombination, isComputed } from './combinations.js';

const aim = fc.record({
  find: fc.constant('size' as const),
  power: fc.double({ min: 0.3, max: 0.99, noNaN: true }),
});

/** Requests of one combination that the calculation answers, with an aim of a size. */
export function requestsFor(combination: Combination): fc.Arbitrary<AppraisalRequest> {
  const { kind, hypothesis } = combination;
  return fc
    .record({ question: questionsOf(kind, hypothesis), design: designsOf(combination), aim })
    .map(({ question, design, aim }) => {
      // Rates in clusters vary by their rateCv alone.
      if (design.family === 'cluster' && question.outcome.kind === 'count')
        delete question.outcome.dispersion;
      return { ...question, design, aim };
    });
}

/** Requests of one family, whatever outcomes and hypotheses it answers. */
export function requestsOf(family: FamilyId): fc.Arbitrary<AppraisalRequest> {
  return fc.oneof(
    ...everyCombination.filter((each) => each.family === family && isComputed(each)).map(requestsFor),
  );
}

/** Whole counts where CI is set, a tenth otherwise. */
export const runs = (count: number) => ({ numRuns: process.env.CI ? count : Math.ceil(count / 10) });
