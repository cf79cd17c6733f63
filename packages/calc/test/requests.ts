import { type Appraisal, type AppraisalRequest, appraise, type Feasible } from '../src/index.js';

/** A two-arm request of a mean difference, to be varied. */
export const twoMeans: AppraisalRequest = {
  outcome: { kind: 'continuous', difference: 5, sd: 10 },
  test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
  design: { family: 'parallel' },
  aim: { find: 'size', power: 0.8 },
};

export const twoProportions: AppraisalRequest = {
  ...twoMeans,
  outcome: { kind: 'binary', control: 0.3, active: 0.2 },
};

export const abba: AppraisalRequest = {
  ...twoMeans,
  design: { family: 'crossover', sequences: ['AB', 'BA'], correlation: 0.5 },
};

export const clusters: AppraisalRequest = {
  ...twoMeans,
  outcome: { kind: 'continuous', difference: 5, sd: 15 },
  design: { family: 'cluster', icc: 0.05, clusterSize: 20 },
};

export const threeArms: AppraisalRequest = {
  ...twoMeans,
  design: {
    family: 'multi-arm',
    allocation: [1, 1, 1],
    comparisons: { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' },
  },
};

export function feasible(request: AppraisalRequest): Feasible {
  const appraisal: Appraisal = appraise(request);
  if (!appraisal.feasible) throw new Error(appraisal.infeasible.message);
  return appraisal;
}

/** The real-valued size per arm, which tables of unrounded or nearest-integer sizes print. */
export function unrounded(request: AppraisalRequest): number {
  const { unroundedUnits } = feasible(request);
  if (unroundedUnits === undefined) throw new Error('no unrounded size');
  return unroundedUnits;
}
