import type { FamilyUi } from './family-ui';
import { parallel } from './parallel';

const adjustments: Record<string, string> = {
  none: 'no adjustment',
  bonferroni: 'Bonferroni',
};

/** Several active arms against one control: parallel arms, and how their comparisons are adjusted. */
export const multiArm: FamilyUi = {
  ...parallel,
  summary(plan, size, words) {
    const { adjust } = (plan.structure.comparisons ?? {}) as { adjust?: string };
    const named = adjust === undefined ? undefined : (adjustments[adjust] ?? adjust);
    return [parallel.summary(plan, size, words), ...(named ? [named] : [])].join(', ');
  },
};
