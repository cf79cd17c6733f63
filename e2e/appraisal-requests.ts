const twoSided = { hypothesis: 'superiority', alpha: 0.05, sides: 2 };
const timeline = { startUp: 4, accrualPerMonth: 6.6, followUp: 1.5, closeOut: 3 };

/** Every family, outcome, hypothesis, adjustment and aim, with costs, attrition, dilution and an aim out of reach. */
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
  [
    'four arms by Dunnett, all of whose doses are to be shown',
    {
      outcome: { kind: 'continuous', difference: 6, sd: 17 },
      test: twoSided,
      design: {
        family: 'multi-arm',
        allocation: [1.7320508, 1, 1, 1],
        comparisons: {
          against: 'control',
          adjust: 'dunnett',
          powerGoal: 'conjunctive',
          effects: [5, 6, -7],
        },
      },
      aim: { find: 'size', power: 0.8 },
    },
  ],
  [
    'three arms of clusters, stepping down by Holm',
    {
      outcome: { kind: 'continuous', difference: 3, sd: 13 },
      test: twoSided,
      design: {
        family: 'cluster',
        icc: 0.04,
        clusterSize: 31,
        allocation: [1, 1, 1],
        comparisons: { against: 'control', adjust: 'holm', powerGoal: 'disjunctive' },
      },
      aim: { find: 'size', power: 0.85 },
    },
  ],
  [
    'a stepped wedge of a cohort with fading correlation and clusters of varying size',
    {
      outcome: { kind: 'continuous', difference: 2.6, sd: 11 },
      test: twoSided,
      design: {
        family: 'stepped-wedge',
        steps: 5,
        transitionPeriods: 1,
        icc: 0.06,
        cac: 0.83,
        iac: 0.62,
        decay: true,
        clusterSize: 22,
        clusterSizeCv: 0.4,
      },
      aim: { find: 'size', power: 0.8 },
    },
  ],
  [
    'a schedule with cells that are not measured',
    {
      outcome: { kind: 'binary', control: 0.3, active: 0.2 },
      test: twoSided,
      design: {
        family: 'cluster-schedule',
        schedule: [
          [0, 0, 1, null],
          [0, 1, 1, 1],
          [null, 0, 0, 1],
        ],
        icc: 0.03,
        cac: 0.9,
        clusterSize: 28,
      },
      aim: { find: 'power', units: 7 },
    },
  ],
  [
    'a crossover of three treatments with carryover',
    {
      outcome: { kind: 'continuous', difference: 1, sd: 2 },
      test: twoSided,
      design: {
        family: 'crossover',
        sequences: ['ABC', 'BCA', 'CAB', 'CBA', 'ACB', 'BAC'],
        correlation: 0.5,
        carryover: true,
        comparisons: { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' },
      },
      aim: { find: 'size', power: 0.9 },
    },
  ],
  [
    'survival that is not to be worse',
    {
      outcome: {
        kind: 'time-to-event',
        hazardRatio: 1.02,
        controlSurvival: { at: 12, probability: 0.7 },
        accrual: 18,
        followUp: 12,
        dropoutHazard: 0.004,
        better: 'lower',
      },
      test: { hypothesis: 'non-inferiority', alpha: 0.025, sides: 1, margin: 1.35 },
      design: { family: 'parallel', allocation: [2, 1] },
      aim: { find: 'size', power: 0.9 },
    },
  ],
  [
    'two means that are to be equivalent',
    {
      outcome: { kind: 'continuous', difference: 0.4, sd: 10 },
      test: { hypothesis: 'equivalence', alpha: 0.05, sides: 1, margin: 4.5 },
      design: { family: 'parallel' },
      aim: { find: 'size', power: 0.85 },
    },
  ],
  [
    'overdispersed counts',
    {
      outcome: { kind: 'count', controlRate: 1.3, rateRatio: 0.72, exposure: 0.9, dispersion: 0.6 },
      test: twoSided,
      design: { family: 'parallel', allocation: [1, 2] },
      aim: { find: 'size', power: 0.9 },
    },
  ],
  [
    'the odds ratio that ordered categories detect',
    {
      outcome: { kind: 'ordinal', controlProbabilities: [0.15, 0.3, 0.35, 0.2], oddsRatio: 1.7 },
      test: twoSided,
      design: { family: 'parallel' },
      aim: { find: 'effect', units: 120, power: 0.8 },
    },
  ],
  [
    'an interaction of two treatments',
    {
      outcome: { kind: 'continuous', difference: 3, sd: 8 },
      test: twoSided,
      design: { family: 'factorial', estimand: 'interaction' },
      aim: { find: 'size', power: 0.8 },
    },
  ],
  [
    'treatment in groups',
    {
      outcome: { kind: 'continuous', difference: 2, sd: 5 },
      test: twoSided,
      design: { family: 'partially-nested', icc: 0.07, groupSize: 8, allocation: [1, 1.2] },
      aim: { find: 'size', power: 0.85 },
    },
  ],
  [
    'classes within schools',
    {
      outcome: { kind: 'binary', control: 0.3, active: 0.2 },
      test: twoSided,
      design: {
        family: 'three-level-cluster',
        iccCluster: 0.02,
        iccSubcluster: 0.05,
        subclusterSize: 12,
        subclustersPerCluster: 3,
      },
      aim: { find: 'size', power: 0.8 },
      attrition: { participants: 0.1, units: 0.04 },
    },
  ],
];
