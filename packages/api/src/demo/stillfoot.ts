import type { DemoStudy } from './demo-study.js';

const gels = [0, 1];

/** A chronic, stable condition, individually randomised. */
export const stillfoot: DemoStudy = {
  study: {
    name: 'Stillfoot',
    organisation: 'Brackwater Clinic for Long-Term Pain',
    question: 'Does vantholine foot gel lower pain by 1 point in stable neuropathic pain of the feet?',
    outcomeLabel: 'Mean pain, 0–10, over the last 7 days of a 6-week period',
    outcomeUnit: 'points',
    plan: {
      outcome: { kind: 'continuous', difference: -1, better: 'lower' },
      test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
    },
    treatments: [{ name: 'Vehicle gel' }, { name: 'Vantholine gel' }],
    participants: { one: 'participant', many: 'participants' },
    clusters: null,
    daysAgo: 47.3,
  },
  team: { methodologist: 'arrivel', investigator: 'quennell', funder: 'venn', reader: 'brannick' },
  planningValues: [
    {
      key: 'sd',
      family: null,
      value: 2.1,
      low: null,
      high: null,
      source: 'Pilot of 30: 1.9, taken up to its upper limit',
      daysAgo: 45.1,
    },
    {
      key: 'baselineCorrelation',
      family: null,
      value: 0.55,
      low: null,
      high: null,
      source: 'Assumed by the team',
      daysAgo: 44.2,
    },
    {
      key: 'withinPersonCorrelation',
      family: null,
      value: 0.6,
      low: 0.4,
      high: 0.75,
      source: 'Assumed by the team, with the range thought possible',
      daysAgo: 38.4,
    },
    {
      key: 'attrition',
      family: null,
      value: 0.12,
      low: null,
      high: null,
      source: 'Assumed for one treatment period',
      daysAgo: 37.9,
    },
    {
      key: 'attrition',
      family: 'crossover',
      value: 0.2,
      low: null,
      high: null,
      source: 'Assumed for two treatment periods with a washout between',
      daysAgo: 23.2,
    },
  ],
  costPlan: {
    costs: {
      currency: 'EUR',
      fixed: 239_000,
      perMonth: 2_500,
      perRecruited: 420,
      perMeasurement: 165,
      perExposure: [54, 168],
    },
    timeline: { startUp: 4, accrualPerMonth: 6.6, followUp: 1.5, period: 1.5, washout: 0.5, closeOut: 3 },
    daysAgo: 31.6,
  },
  hold: { kind: 'power', power: 0.9 },
  options: [
    {
      name: 'Parallel, unadjusted',
      plan: { family: 'parallel', treatments: gels, structure: {}, overrides: {} },
      daysAgo: 30.3,
    },
    {
      name: 'Parallel, baseline-adjusted',
      plan: {
        family: 'parallel',
        treatments: gels,
        structure: {},
        repeated: { baselines: 1, followUps: 1 },
        overrides: {},
      },
      daysAgo: 16.8,
    },
    {
      name: 'Crossover',
      plan: {
        family: 'crossover',
        treatments: gels,
        structure: { sequences: ['AB', 'BA'] },
        overrides: {},
      },
      daysAgo: 2.1,
    },
  ],
};
