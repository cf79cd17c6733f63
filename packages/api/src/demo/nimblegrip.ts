import type { Comparisons } from '@steelyard/calc';
import type { DemoStudy } from './demo-study.js';

const everyDose = [0, 1, 2, 3];
const repeated = { baselines: 1, followUps: 1 };

const againstAdvice = (adjust: Comparisons['adjust']): Comparisons => ({
  against: 'control',
  adjust,
  powerGoal: 'per-comparison',
});

function fourArms(name: string, allocation: number[], adjust: Comparisons['adjust']) {
  const structure = { allocation, comparisons: againstAdvice(adjust) };
  return {
    name,
    plan: { family: 'multi-arm' as const, treatments: everyDose, structure, repeated, overrides: {} },
  };
}

/** Several doses in primary care. */
export const nimblegrip: DemoStudy = {
  study: {
    name: 'Nimblegrip',
    organisation: 'Bristlecone Primary Care Network',
    question:
      'How many supervised sessions of hand exercise improve function by 6 points in hand osteoarthritis?',
    outcomeLabel: 'Hand function, 0–100, at 6 months',
    outcomeUnit: 'points',
    plan: {
      outcome: { kind: 'continuous', difference: 6, better: 'higher' },
      test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
    },
    treatments: [
      { name: 'Advice sheet' },
      { name: '2 sessions' },
      { name: '4 sessions' },
      { name: '8 sessions' },
    ],
    participants: { one: 'participant', many: 'participants' },
    clusters: null,
    daysAgo: 51.2,
  },
  team: { methodologist: 'aalderink', investigator: 'mackrell', funder: 'hallam', reader: 'ferrow' },
  planningValues: [
    {
      key: 'sd',
      family: null,
      value: 17,
      low: null,
      high: null,
      source: 'Assumed by the team',
      daysAgo: 49.6,
    },
    {
      key: 'baselineCorrelation',
      family: null,
      value: 0.5,
      low: null,
      high: null,
      source: 'Assumed by the team',
      daysAgo: 49.5,
    },
    {
      key: 'attrition',
      family: null,
      value: 0.12,
      low: null,
      high: null,
      source: 'Assumed by the team for 6 months of follow-up',
      daysAgo: 40.3,
    },
  ],
  costPlan: {
    costs: { currency: 'EUR', fixed: 372_400, perRecruited: 290, perExposure: [12, 101, 177, 329] },
    timeline: { startUp: 6, accrualPerMonth: 21.6, followUp: 6, closeOut: 5 },
    daysAgo: 35.4,
  },
  limits: { limits: { money: 690_000, months: 49 }, daysAgo: 34.8 },
  hold: { kind: 'power', power: 0.9 },
  options: [
    { ...fourArms('Four equal arms, no adjustment', [1, 1, 1, 1], 'none'), daysAgo: 28.7 },
    { ...fourArms('Four equal arms, Bonferroni', [1, 1, 1, 1], 'bonferroni'), daysAgo: 28.6 },
    { ...fourArms('Four equal arms, Dunnett', [1, 1, 1, 1], 'dunnett'), daysAgo: 27.5 },
    { ...fourArms('Four arms, larger control, Dunnett', [Math.sqrt(3), 1, 1, 1], 'dunnett'), daysAgo: 12.4 },
    {
      name: 'Three arms, larger control, Dunnett',
      plan: {
        family: 'multi-arm',
        treatments: [0, 1, 3],
        structure: { allocation: [Math.SQRT2, 1, 1], comparisons: againstAdvice('dunnett') },
        repeated,
        overrides: {},
      },
      daysAgo: 5.2,
    },
  ],
};
