const twoSided = { hypothesis: 'superiority', alpha: 0.05, sides: 2 };
const timeline = { startUp: 4, accrualPerMonth: 6.6, followUp: 1.5, closeOut: 3 };

/** Every family of the product, both outcome kinds, every aim, costs, attrition, dilution and an aim out of reach. */
export const appraisalRequests: [title: string, request: Record<string, unknown>][] = [
  [
    'two arms of unequal size, money and months counted',
    {
      outcome: { kind: 'continuous', difference: 1.1, sd: 2.3 },
      test: twoSided,
      design: { family: 'parallel', allocation: [2, 1] },
      aim: { find: 'size', power: 0.87 },
      attrition: { participants: 0.13 },
      costs: {
        currency: 'EUR',
        fixed: 120_000,
        perArm: 2_500,
        perRecruited: 410.5,
        perMeasurement: 162.25,
        perExposure: [54, 168],
        perMonth: 2_400,
        overhead: 0.17,
      },
      timeline,
    },
  ],
  [
    'two arms with unequal spreads, at a given size',
    {
      outcome: { kind: 'continuous', difference: 4.2, sd: 9.1, sdActive: 13.7 },
      test: twoSided,
      design: { family: 'parallel' },
      aim: { find: 'power', units: 83 },
    },
  ],
  [
    'two proportions with a continuity correction',
    {
      outcome: { kind: 'binary', control: 0.31, active: 0.19, method: 'continuity-corrected' },
      test: twoSided,
      design: { family: 'parallel' },
      aim: { find: 'size', power: 0.8 },
      dilution: { contamination: 0.06, nonAdherence: 0.09 },
    },
  ],
  [
    'the proportion that one side of an arcsine test detects',
    {
      outcome: { kind: 'binary', control: 0.22, active: 0.35, method: 'arcsine' },
      test: { hypothesis: 'superiority', alpha: 0.025, sides: 1 },
      design: { family: 'parallel' },
      aim: { find: 'effect', units: 140, power: 0.85 },
    },
  ],
  [
    'four arms with Bonferroni and a baseline',
    {
      outcome: {
        kind: 'continuous',
        difference: 6,
        sd: 17,
        repeated: { baselines: 1, followUps: 2, correlation: 0.47 },
      },
      test: twoSided,
      design: {
        family: 'multi-arm',
        allocation: [1.7320508, 1, 1, 1],
        comparisons: { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' },
      },
      aim: { find: 'size', power: 0.9 },
      attrition: { participants: 0.12 },
      costs: { currency: 'EUR', fixed: 372_400, perRecruited: 290, perExposure: [12, 101, 177, 329] },
      timeline: { startUp: 6, accrualPerMonth: 21.6, followUp: 6, closeOut: 5 },
    },
  ],
  [
    'three arms of proportions without adjustment, at a given size',
    {
      outcome: { kind: 'binary', control: 0.4, active: 0.55 },
      test: twoSided,
      design: {
        family: 'multi-arm',
        allocation: [1, 1, 1],
        comparisons: { against: 'control', adjust: 'none', powerGoal: 'per-comparison' },
      },
      aim: { find: 'power', units: 151 },
    },
  ],
  [
    'a crossover with washout',
    {
      outcome: { kind: 'continuous', difference: 0.95, sd: 2.1 },
      test: twoSided,
      design: { family: 'crossover', sequences: ['AB', 'BA'], correlation: 0.58 },
      aim: { find: 'size', power: 0.9 },
      attrition: { participants: 0.2 },
      costs: {
        currency: 'EUR',
        fixed: 239_000,
        perMonth: 2_500,
        perMeasurement: 165,
        perExposure: [54, 168],
      },
      timeline: { startUp: 4, accrualPerMonth: 6.6, period: 1.5, washout: 0.5, closeOut: 3 },
    },
  ],
  [
    'the difference a crossover detects under a normal reference',
    {
      outcome: { kind: 'continuous', difference: -3, sd: 8.4 },
      test: { ...twoSided, reference: 'normal' },
      design: { family: 'crossover', sequences: ['AB', 'BA'], correlation: 0.35 },
      aim: { find: 'effect', units: 21, power: 0.8 },
    },
  ],
  [
    'clusters of varying size',
    {
      outcome: { kind: 'continuous', difference: 3, sd: 13 },
      test: twoSided,
      design: { family: 'cluster', icc: 0.041, clusterSize: 37, clusterSizeCv: 0.35, allocation: [1, 1.5] },
      aim: { find: 'size', power: 0.8 },
      attrition: { participants: 0.08, units: 0.05 },
      costs: {
        currency: 'EUR',
        fixed: 240_000,
        perCluster: 5_500,
        perClusterPeriod: [900, 4_700],
        perMeasurement: 22,
        perMonth: 4_200,
      },
      timeline: { startUp: 8, accrualPerClusterPerMonth: 40, followUp: 4, closeOut: 4 },
    },
  ],
  [
    'a cluster size that no number of participants makes large enough',
    {
      outcome: { kind: 'binary', control: 0.2, active: 0.26 },
      test: twoSided,
      design: { family: 'cluster', icc: 0.09, clusterSize: 20 },
      aim: { find: 'cluster-size', units: 9, power: 0.9 },
    },
  ],
];
