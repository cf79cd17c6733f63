import { describe, expect, it } from 'vitest';
import { leversOf, type OptionPlan, type Study } from '../src/index.js';

const nouns = {
  participants: { one: 'participant', many: 'participants' },
  clusters: { one: 'catchment', many: 'catchments' },
};
const superiority = { hypothesis: 'superiority', alpha: 0.05, sides: 2 } as const;

/** Invented studies; sizes computed in R from the written formulas, money and months by hand, to a thousand. */
const gel: Study = {
  question: { outcome: { kind: 'continuous', difference: -1, better: 'lower' }, test: superiority },
  ledger: [
    { key: 'sd', family: null, value: 2.1 },
    { key: 'baselineCorrelation', family: null, value: 0.55 },
    { key: 'withinPersonCorrelation', family: null, value: 0.6 },
    { key: 'attrition', family: null, value: 0.12 },
    { key: 'attrition', family: 'crossover', value: 0.2 },
  ],
  costs: {
    costs: {
      currency: 'EUR',
      fixed: 239_000,
      perMonth: 2500,
      perRecruited: 420,
      perMeasurement: 165,
      perExposure: [54, 168],
    },
    timeline: { startUp: 4, accrualPerMonth: 6.6, followUp: 1.5, period: 1.5, washout: 0.5, closeOut: 3 },
  },
  hold: { kind: 'power', power: 0.9 },
};
const exercise: Study = {
  question: { outcome: { kind: 'continuous', difference: 6, better: 'higher' }, test: superiority },
  ledger: [
    { key: 'sd', family: null, value: 17 },
    { key: 'baselineCorrelation', family: null, value: 0.5 },
    { key: 'attrition', family: null, value: 0.12 },
  ],
  costs: null,
  hold: { kind: 'power', power: 0.9 },
};

const parallel: OptionPlan = { family: 'parallel', treatments: [0, 1], structure: {}, overrides: {} };
const fourArms = (adjust: string): OptionPlan => ({
  family: 'multi-arm',
  treatments: [0, 1, 2, 3],
  structure: {
    allocation: [1, 1, 1, 1],
    comparisons: { against: 'control', adjust, powerGoal: 'per-comparison' },
  },
  repeated: { baselines: 1, followUps: 1 },
  overrides: {},
});
const fourNames = ['Advice', 'Two sessions', 'Four sessions', 'Eight sessions'];
const offers = (study: Study, plan: OptionPlan, arms = ['Vehicle', 'Gel']) =>
  leversOf(study, plan, { ...nouns, arms });

describe('levers', () => {
  it('save what two appraisals differ by, with the price in money, months and measurements', () => {
    const found = offers(gel, parallel);
    const crossover = found.find(({ plan }) => plan.family === 'crossover');
    expect(crossover?.saving).toBe(214 - 50);
    expect(Math.round((crossover?.cost as number) / 1000)).toBe(333 - 490);
    expect(crossover?.visits).toBeCloseTo(1, 12);
    const baseline = found.find(({ plan }) => plan.repeated?.baselines === 1);
    expect(baseline?.saving).toBe(214 - 150);
    expect(Math.round((baseline?.cost as number) / 1000)).toBe(446 - 490);
    expect(Math.round(baseline?.months as number)).toBe(31 - 41);
    expect(baseline?.visits).toBeCloseTo(1, 12);
  });

  it('are offered the largest saving first', () => {
    const savings = offers(gel, parallel).map(({ saving }) => saving);
    expect(savings).toEqual(savings.toSorted((a, b) => b - a));
  });

  it('sharpen an adjustment, enlarge the control arm and leave out an arm', () => {
    const saved = (adjust: string, label: RegExp) =>
      offers(exercise, fourArms(adjust), fourNames).find((offer) => label.test(offer.label))?.saving;
    expect(saved('bonferroni', /Dunnett/)).toBe(748 - 728);
    expect(saved('dunnett', /control arm/)).toBe(728 - 688);
    expect(saved('dunnett', /Leave out Four sessions/)).toBeGreaterThan(0);
    expect(saved('dunnett', /Dunnett/)).toBeUndefined();
  });

  it('are not shown where they save nothing', () => {
    // At a correlation of 0 a baseline tells nothing and costs a degree of freedom.
    const ledger = exercise.ledger.map((line) =>
      line.key === 'baselineCorrelation' ? { ...line, value: 0 } : line,
    );
    const labels = offers({ ...exercise, ledger }, parallel).map(({ label }) => label);
    expect(labels).not.toContain('Adjust for a baseline measurement');
    expect(labels.some((label) => label.startsWith('Average 2'))).toBe(true);
  });

  it('are not offered without the planning value they rest on, nor for an option that cannot be computed', () => {
    const bare = { ...gel, ledger: gel.ledger.filter(({ key }) => !key.endsWith('Correlation')) };
    expect(offers(bare, parallel)).toEqual([]);
    expect(offers({ ...gel, ledger: [] }, parallel)).toEqual([]);
  });
});
