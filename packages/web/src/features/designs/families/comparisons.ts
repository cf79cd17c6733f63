import type { Comparisons, OptionPlan } from '@steelyard/calc';
import type { ComparisonOffers } from './structure-part';

interface Told {
  label: string;
  /** As a summary names it; nothing where it goes without saying. */
  short?: string;
  says: string;
}

export const adjustments: Record<Comparisons['adjust'], Told> = {
  none: {
    label: 'No adjustment',
    short: 'no adjustment',
    says: 'Each comparison keeps the whole type I error, as for questions of their own.',
  },
  bonferroni: {
    label: 'Bonferroni',
    short: 'Bonferroni',
    says: 'The type I error is shared out equally, so that all comparisons together keep it.',
  },
  holm: {
    label: 'Holm',
    short: 'Holm',
    says: 'The clearest comparison is held to the strictest level and each next one to a milder; together they keep the type I error.',
  },
  dunnett: {
    label: 'Dunnett',
    short: 'Dunnett',
    says: 'One critical value allows for the control arm that all comparisons share; together they keep the type I error.',
  },
  'fixed-sequence': {
    label: 'Fixed sequence',
    short: 'fixed sequence',
    says: 'In the order of the arms, each comparison takes the whole type I error until one fails.',
  },
};

export const powerGoals: Record<Comparisons['powerGoal'], Told> = {
  'per-comparison': {
    label: 'Power for each comparison',
    says: 'The aim holds for every comparison taken by itself.',
  },
  disjunctive: {
    label: 'Power for at least one',
    short: 'power for at least one',
    says: 'The aim is the chance that one comparison or more succeeds.',
  },
  conjunctive: {
    label: 'Power for all',
    short: 'power for all',
    says: 'The aim is the chance that every comparison succeeds together.',
  },
};

export const compared: Record<Comparisons['against'], Told> = {
  control: { label: 'With control', says: 'Each active arm is compared with control.' },
  'all-pairs': {
    label: 'Every pair',
    short: 'every pair',
    says: 'Every arm is compared with every other, each pair for the target difference.',
  },
};

/** Every stance against control, for continuous outcomes in arms that share their control. */
export const everyStance: ComparisonOffers = {
  adjustments: ['none', 'bonferroni', 'holm', 'dunnett', 'fixed-sequence'],
  goals: ['per-comparison', 'disjunctive', 'conjunctive'],
  allPairs: false,
  effects: true,
};

/** Each comparison by itself, the type I error shared out or not. */
export const eachByItself: ComparisonOffers = {
  adjustments: ['none', 'bonferroni'],
  goals: ['per-comparison'],
  allPairs: false,
  effects: true,
};

/** What a family offers where every pair is compared. */
export const inPairs = (offers: ComparisonOffers): ComparisonOffers => ({
  ...eachByItself,
  allPairs: offers.allPairs,
  effects: false,
});

export const usualComparisons: Comparisons = {
  against: 'control',
  adjust: 'bonferroni',
  powerGoal: 'per-comparison',
};

export const comparisonsOf = ({ structure }: Pick<OptionPlan, 'structure'>): Partial<Comparisons> =>
  (structure.comparisons ?? {}) as Partial<Comparisons>;

/** The plan with comparisons where it has several, and none where there is one only. */
export function withComparisons(plan: OptionPlan): OptionPlan {
  const { comparisons = usualComparisons, ...structure } = plan.structure;
  return { ...plan, structure: plan.treatments.length > 2 ? { ...structure, comparisons } : structure };
}

/** The plan with other treatments, each with the effect that was stated for it. */
export function comparedAnew(before: OptionPlan, plan: OptionPlan): OptionPlan {
  const { effects, ...comparisons } = comparisonsOf(before);
  if (!effects || plan.treatments.length < 3) return withComparisons(plan);
  const kept = plan.treatments
    .slice(1)
    .map((treatment) => effects[before.treatments.indexOf(treatment) - 1] ?? effects[0]);
  return { ...plan, structure: { ...plan.structure, comparisons: { ...comparisons, effects: kept } } };
}

/** “Bonferroni, power for all”: the stance in a summary; nothing where there is one comparison. */
export function stance(plan: OptionPlan): string | undefined {
  if (plan.treatments.length < 3) return undefined;
  const { adjust, powerGoal, against } = comparisonsOf(plan);
  const told = [
    against && compared[against],
    adjust && adjustments[adjust],
    powerGoal && powerGoals[powerGoal],
  ];
  return told.flatMap((each) => each?.short ?? []).join(', ') || undefined;
}
