import { equalShares, treatedByArm } from './arms';
import { comparedAnew, eachByItself, everyStance, stance, usualComparisons } from './comparisons';
import type { FamilyUi } from './family-ui';
import { parallel } from './parallel';

/** Several active arms against one control: parallel arms, and how their comparisons are adjusted. */
export const multiArm: FamilyUi = {
  ...parallel,
  name: 'Multi-arm',
  describes: 'Several active arms share one control; each is compared with it.',
  refusal: ({ treatments }) =>
    treatments.length < 3 ? 'Name a third treatment in the question to compare several arms.' : undefined,
  start: ({ treatments }) => ({
    treatments: treatments.map((_, index) => index),
    structure: { ...equalShares(treatments.length), comparisons: usualComparisons },
    overrides: {},
  }),
  arms: () => ({ fewest: 3, most: 11 }),
  whole(plan) {
    const { structure, ...rest } = parallel.whole(plan);
    return { ...rest, structure: { comparisons: usualComparisons, ...structure } };
  },
  treated: (plan, treatments) => comparedAnew(plan, treatedByArm(plan, treatments)),
  summary: (plan, size, words) =>
    [parallel.summary(plan, size, words), stance(plan)].filter((part) => part !== undefined).join(', '),
  structure: (plan, study, words) => [
    ...parallel.structure(plan, study, words),
    {
      part: 'comparisons',
      offers: study.plan.outcome.kind === 'continuous' ? { ...everyStance, allPairs: true } : eachByItself,
    },
  ],
};
