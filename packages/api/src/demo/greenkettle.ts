import type { DemoStudy } from './demo-study.js';

/** A community programme, cluster randomised. */
export const greenkettle: DemoStudy = {
  study: {
    name: 'Greenkettle',
    organisation: 'Fernhollow District Health Cooperative',
    question: 'Does the kitchen-garden programme raise haemoglobin by 3 g/L in adolescent girls?',
    outcomeLabel: 'Haemoglobin at 4 months',
    outcomeUnit: 'g/L',
    plan: {
      outcome: { kind: 'continuous', difference: 3, better: 'higher' },
      test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
    },
    treatments: [{ name: 'Usual canteen' }, { name: 'Kitchen gardens and iron-rich meals' }],
    participants: { one: 'girl', many: 'girls' },
    clusters: { one: 'catchment', many: 'catchments' },
    daysAgo: 55.4,
  },
  team: { methodologist: 'oyelaran', investigator: 'doss', funder: 'solt', reader: 'tarvin' },
  planningValues: [
    {
      key: 'sd',
      family: null,
      value: 13,
      low: 11.96,
      high: 14.04,
      source: 'Assumed by the team, within 8 % either way',
      daysAgo: 53.2,
    },
    {
      key: 'icc',
      family: null,
      value: 0.04,
      low: 0.0075,
      high: 0.123,
      source: 'Pilot of 8 catchments: Beta(1.7, 32), median 0.042; the range holds nine tenths of it',
      daysAgo: 42.7,
    },
    {
      key: 'clusterAutocorrelation',
      family: null,
      value: 0.85,
      low: 0.61,
      high: 0.94,
      source: 'Published range: Beta(12, 3), mode 0.85; the range holds nine tenths of it',
      daysAgo: 42.6,
    },
    {
      key: 'clusterSizeCv',
      family: null,
      value: 0.35,
      low: null,
      high: null,
      source: 'Enrolment of the schools',
      daysAgo: 42.5,
    },
  ],
  costPlan: {
    costs: {
      currency: 'EUR',
      fixed: 240_000,
      perMonth: 4_200,
      perCluster: 5_500,
      perClusterPeriod: [900, 4_700],
      perMeasurement: 22,
    },
    timeline: { startUp: 8, accrualPerClusterPerMonth: 40, followUp: 4, period: 4, closeOut: 4 },
    daysAgo: 33.1,
  },
  limits: {
    limits: { clusters: 32, participantsPerCluster: 60, money: 800_000, months: 30 },
    daysAgo: 32.6,
  },
  hold: { kind: 'power', power: 0.8 },
  options: [
    {
      name: 'Cluster, end only',
      plan: {
        family: 'cluster',
        treatments: [0, 1],
        structure: { allocation: [1, 1] },
        clusterSize: 40,
        overrides: {},
      },
      daysAgo: 9.3,
    },
    {
      name: 'Cluster with baseline',
      plan: {
        family: 'cluster-baseline',
        treatments: [0, 1],
        structure: {},
        clusterSize: 40,
        overrides: {},
      },
      daysAgo: 9.25,
    },
    {
      name: 'Stepped wedge, 4 steps',
      plan: {
        family: 'stepped-wedge',
        treatments: [0, 1],
        structure: { steps: 4 },
        clusterSize: 25,
        overrides: {},
      },
      daysAgo: 9.2,
    },
    {
      name: 'Individual randomisation',
      plan: { family: 'parallel', treatments: [0, 1], structure: {}, overrides: {} },
      daysAgo: 9.1,
      ruling: {
        kind: 'not-admissible',
        reason:
          'The canteen is shared: girls in the control arm would eat the iron-rich meals too, and the difference looked for would vanish.',
        daysAgo: 7.4,
      },
    },
    {
      name: 'Crossover',
      plan: {
        family: 'crossover',
        treatments: [0, 1],
        structure: { sequences: ['AB', 'BA'] },
        overrides: {
          withinPersonCorrelation: {
            value: 0.5,
            reason: 'A round figure: the option was ruled out before anyone estimated it.',
          },
        },
      },
      daysAgo: 8.8,
      ruling: {
        kind: 'not-admissible',
        reason:
          'What girls learn about growing and eating iron-rich food stays with them, and the canteen is shared: there is no second period without the programme.',
        daysAgo: 7.3,
      },
    },
  ],
};
