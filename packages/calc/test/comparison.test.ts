import { describe, expect, it } from 'vitest';
import {
  type LedgerEntry,
  type OptionPlan,
  requestOf,
  type StudyCosts,
  verdict,
  type WeighInput,
  weigh,
} from '../src/index.js';

/** An invented pain study; the expected figures were computed in R, money and months by hand. */
const ledger: LedgerEntry[] = [
  { key: 'sd', family: null, value: 2.1 },
  { key: 'baselineCorrelation', family: null, value: 0.55 },
  { key: 'withinPersonCorrelation', family: null, value: 0.6 },
  { key: 'attrition', family: null, value: 0.12 },
  { key: 'attrition', family: 'crossover', value: 0.2 },
];
const costs: StudyCosts = {
  costs: {
    currency: 'EUR',
    fixed: 239_000,
    perMonth: 2500,
    perRecruited: 420,
    perMeasurement: 165,
    perExposure: [54, 168],
  },
  timeline: { startUp: 4, accrualPerMonth: 6.6, followUp: 1.5, period: 1.5, washout: 0.5, closeOut: 3 },
};
const option = (plan: Partial<OptionPlan> & Pick<OptionPlan, 'family'>): OptionPlan => ({
  treatments: [0, 1],
  structure: {},
  overrides: {},
  ...plan,
});
const parallel = option({ family: 'parallel' });
const adjusted = option({ family: 'parallel', repeated: { baselines: 1, followUps: 1 } });
const crossed = option({ family: 'crossover', structure: { sequences: ['AB', 'BA'] } });
const study: WeighInput = {
  question: {
    outcome: { kind: 'continuous', difference: 1, better: 'lower' },
    test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
  },
  ledger,
  costs,
  hold: { kind: 'power', power: 0.9 },
  options: [
    { id: '1', name: 'Parallel', plan: parallel },
    { id: '2', name: 'Parallel, baseline-adjusted', plan: adjusted },
    { id: '3', name: 'Crossover', plan: crossed },
  ],
};
const words = {
  hold: study.hold,
  currency: 'EUR',
  participants: { one: 'participant', many: 'participants' },
  clusters: null,
};

describe('weighing the options of a study', () => {
  it.each([
    ['A', 188, 214, 490_000, 41],
    ['B', 132, 150, 446_000, 31],
    ['C', 40, 50, 333_000, 18],
  ])('gives option %s its size, money and months', (letter, analysed, recruited, euros, months) => {
    const weighed = weigh(study).find((each) => each.letter === letter);
    if (!weighed?.appraisal?.feasible) throw new Error('expected an answer');
    const { appraisal } = weighed;
    expect([appraisal.participants, appraisal.recruited]).toEqual([analysed, recruited]);
    expect(Math.round((appraisal.costs?.total as number) / 1000) * 1000).toBe(euros);
    expect(Math.round(appraisal.timeline?.months as number)).toBe(months);
  });

  it('takes a planning value from the override, else the family’s ledger line, else the general one', () => {
    const attritionOf = (plan: OptionPlan) => requestOf(study, plan).attrition?.participants;
    expect(attritionOf(parallel)).toBe(0.12);
    expect(attritionOf(crossed)).toBe(0.2);
    const reason = 'shorter periods';
    expect(attritionOf({ ...crossed, overrides: { attrition: { value: 0.1, reason } } })).toBe(0.1);
  });

  it('keeps an option that cannot be computed, with its error at its path', () => {
    const [first] = weigh({ ...study, ledger: ledger.filter(({ key }) => key !== 'sd') });
    expect(first).toMatchObject({ letter: 'A', appraisal: null, error: { path: 'outcome.sd' } });
  });

  it('takes the control proportion of a binary question from the ledger', () => {
    const request = requestOf(
      {
        ...study,
        question: { ...study.question, outcome: { kind: 'binary', difference: -0.1 } },
        ledger: [{ key: 'controlProportion', family: null, value: 0.3 }],
      },
      parallel,
    );
    expect(request.outcome).toEqual({ kind: 'binary', control: 0.3, active: expect.closeTo(0.2, 12) });
  });

  it('keeps the sizes entered where the hold is sizes', () => {
    const [first] = weigh({
      ...study,
      hold: { kind: 'sizes', power: 0.9 },
      options: [{ id: '1', name: 'Parallel', plan: { ...parallel, units: 50 } }],
    });
    expect(first?.appraisal).toMatchObject({ feasible: true, units: 50, participants: 100 });
  });

  it('charges an option for the treatments it compares', () => {
    const three = { ...study, costs: { ...costs, costs: { ...costs.costs, perExposure: [1, 2, 3] } } };
    expect(requestOf(three, { ...parallel, treatments: [0, 2] }).costs?.perExposure).toEqual([1, 3]);
  });
});

describe('the verdict', () => {
  it('names the option ahead on every measure, and how far the others are behind', () => {
    expect(verdict(weigh(study), words)).toEqual({
      headline: 'At power 90\u202f% C costs least, ends first and recruits the fewest participants.',
      detail:
        'A takes 164 more participants, 157\u202fk€ more and 23 months longer; B takes 100 more participants, 113\u202fk€ more and 13 months longer.',
    });
  });

  it('says who leads on what where no option leads on all', () => {
    const slow: StudyCosts = { ...costs, timeline: { ...costs.timeline, period: 18 } };
    const { headline, detail } = verdict(weigh({ ...study, costs: slow }), words);
    expect(headline).toBe('At power 90\u202f% C costs least and recruits the fewest participants.');
    expect(detail).toMatch(/^B ends first\. /);
  });

  it('speaks for one option, none, and those that cannot be computed', () => {
    const one = weigh({ ...study, options: study.options.slice(0, 1) });
    expect(verdict(one, words).headline).toMatch(/^A takes 214 participants, 490\u202fk€ and 41 months\.$/);
    expect(verdict([], words).headline).toBe('No options yet.');
    const none = weigh({ ...study, ledger: [] });
    expect(verdict(none, words).headline).toBe('No option can be sized as it stands.');
    expect(verdict(none, words).detail).toMatch(
      /A cannot be computed: The standard deviation must be a number\./,
    );
  });
});
