import type { PlanningValueKey } from '../comparison/planning-values.js';
import type { OptionPlan } from '../comparison/study-plan.js';
import type { Noun } from '../comparison/wording.js';
import type { OutcomeKind } from '../request.js';

/** An option and what its study has to offer to a change of it. */
export interface LeverContext {
  plan: OptionPlan;
  outcome: OutcomeKind;
  participants: Noun;
  clusters: Noun;
  /** What the arms are called, control first. */
  arms: readonly string[];
  /** Has the ledger this value, or the option its own? */
  states(key: PlanningValueKey, family?: OptionPlan['family']): boolean;
}

/** A change of an option that may cut participants, and what it asks for in visits and validity. */
export interface LeverIdea {
  label: string;
  price: string;
  plan: OptionPlan;
}

export type Lever = (context: LeverContext) => LeverIdea[];

/** ANCOVA on a baseline: Borm, Fransen & Lemmens 2007. */
export const adjustForBaseline: Lever = ({ plan, outcome, states }) =>
  outcome !== 'continuous' || (plan.repeated?.baselines ?? 0) > 0 || !states('baselineCorrelation')
    ? []
    : [
        {
          label: 'Adjust for a baseline measurement',
          price: 'one more visit before treatment; its correlation with the outcome must hold',
          plan: { ...plan, repeated: { baselines: 1, followUps: plan.repeated?.followUps ?? 1 } },
        },
      ];

/** The mean of several follow-ups: Frison & Pocock 1992. */
export const measureAgain: Lever = ({ plan, outcome, states }) => {
  const { baselines = 0, followUps = 1 } = plan.repeated ?? {};
  return outcome !== 'continuous' || followUps > 3 || !states('baselineCorrelation')
    ? []
    : [
        {
          label: `Average ${followUps + 1} follow-up measurements`,
          price: 'one more visit each; the outcome becomes a mean over time',
          plan: { ...plan, repeated: { baselines, followUps: followUps + 1 } },
        },
      ];
};

/** Each participant as their own control: Senn 2002. */
export const crossOver: Lever = ({ plan, outcome, states }) =>
  outcome !== 'continuous' || plan.treatments.length !== 2 || !states('withinPersonCorrelation', 'crossover')
    ? []
    : [
        {
          label: 'Give everyone both treatments, in either order',
          price: 'the effect must wear off between periods: a carryover biases it; a dropout is lost whole',
          plan: {
            family: 'crossover',
            treatments: plan.treatments,
            structure: { sequences: ['AB', 'BA'] },
            overrides: {},
          },
        },
      ];

interface WithComparisons {
  allocation?: readonly number[];
  comparisons?: { adjust: string; against: string };
}

/** √K : 1 for K active arms: Dunnett 1955. */
export const largerControl: Lever = ({ plan }) => {
  const { allocation, comparisons } = plan.structure as WithComparisons;
  const active = plan.treatments.length - 1;
  const equal = allocation?.every((share) => share === allocation[0]) ?? true;
  if (active < 2 || !equal || comparisons?.against === 'all-pairs') return [];
  return [
    {
      label: `Make the control arm √${active} times as large`,
      price: 'fewer receive each active treatment',
      plan: {
        ...plan,
        structure: { ...plan.structure, allocation: [Math.sqrt(active), ...Array(active).fill(1)] },
      },
    },
  ];
};

/** Dunnett 1955, 1964 in the place of Bonferroni's inequality. */
export const sharperAdjustment: Lever = ({ plan, outcome }) => {
  const { comparisons } = plan.structure as WithComparisons;
  if (outcome !== 'continuous' || comparisons?.adjust !== 'bonferroni' || comparisons.against !== 'control') {
    return [];
  }
  return [
    {
      label: 'Adjust by Dunnett instead of Bonferroni',
      price: 'rests on one SD in all arms and on every arm being analysed together',
      plan: { ...plan, structure: { ...plan.structure, comparisons: { ...comparisons, adjust: 'dunnett' } } },
    },
  ];
};

/** One active arm fewer: of three or more, so that there is still something to compare. */
export const dropAnArm: Lever = ({ plan, arms }) => {
  const { allocation = [] } = plan.structure as WithComparisons;
  if (plan.treatments.length < 4) return [];
  return plan.treatments.slice(1).map((_, index) => {
    const without = <T>(items: readonly T[]) => items.filter((__, place) => place !== index + 1);
    return {
      label: `Leave out ${arms[index + 1] ?? `active treatment ${index + 1}`}`,
      price: 'nothing is learnt about it',
      plan: {
        ...plan,
        treatments: without(plan.treatments),
        structure: { ...plan.structure, ...(allocation.length > 0 && { allocation: without(allocation) }) },
      },
    };
  });
};

/** More clusters of fewer participants carry more information each: Donner, Birkett & Buck 1981. */
export const smallerClusters: Lever = ({ plan, participants, clusters }) => {
  const { clusterSize = 1 } = plan;
  const smaller = Math.round((3 * clusterSize) / 4);
  return smaller < 2 || smaller === clusterSize
    ? []
    : [
        {
          label: `${smaller} ${participants.many} in each ${clusters.one} instead of ${clusterSize}`,
          price: `more ${clusters.many} have to be found`,
          plan: { ...plan, clusterSize: smaller },
        },
      ];
};

/** A baseline period in every cluster: Hooper et al. 2016. */
export const baselinePeriod: Lever = ({ plan, outcome, clusters, states }) =>
  outcome === 'count' || plan.treatments.length !== 2 || !states('clusterAutocorrelation', 'cluster-baseline')
    ? []
    : [
        {
          label: 'Measure a baseline period first',
          price: `a period more for every ${clusters.one}; rests on the cluster autocorrelation`,
          plan: {
            ...plan,
            family: 'cluster-baseline',
            structure: {},
          },
        },
      ];
