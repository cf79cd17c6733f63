const question = {
  outcome: { kind: 'continuous', difference: 1, sd: 2.1 },
  test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
  aim: { find: 'size', power: 0.9 },
  attrition: { participants: 0.12 },
  costs: {
    currency: 'EUR',
    fixed: 240_000,
    perMonth: 4200,
    perRecruited: 420,
    perMeasurement: 165,
    perExposure: [54, 168],
  },
  timeline: { startUp: 4, accrualPerMonth: 6.6, followUp: 1.5, period: 1.5, washout: 0.5, closeOut: 3 },
};
const repeated = { baselines: 1, followUps: 1, correlation: 0.55 };

/** Six options of one question, as a study might weigh them. */
export const options = [
  { ...question, design: { family: 'parallel' } },
  { ...question, outcome: { ...question.outcome, repeated }, design: { family: 'parallel' } },
  { ...question, design: { family: 'crossover', sequences: ['AB', 'BA'], correlation: 0.6 } },
  { ...question, design: { family: 'cluster', icc: 0.04, clusterSize: 40, clusterSizeCv: 0.35 } },
  {
    ...question,
    design: { family: 'stepped-wedge', steps: 4, icc: 0.04, cac: 0.85, clusterSize: 25 },
  },
  {
    ...question,
    costs: { ...question.costs, perExposure: [54, 168, 180] },
    design: {
      family: 'multi-arm',
      allocation: [1, 1, 1],
      comparisons: { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' },
    },
  },
];

/** Twelve sequences over thirteen periods. */
export const largeWedge = {
  ...question,
  costs: undefined,
  timeline: undefined,
  outcome: { kind: 'continuous', difference: 0.3, sd: 1 },
  design: { family: 'stepped-wedge', steps: 12, icc: 0.05, cac: 0.8, clusterSize: 20 },
};
