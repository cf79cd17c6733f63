import { describe, expect, it } from 'vitest';
import {
  appraise,
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

/** An invented school study in clusters, with limits; figures computed in R, money and months by hand. */
const schools: WeighInput = {
  question: {
    outcome: { kind: 'continuous', difference: 3 },
    test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
  },
  ledger: [
    { key: 'sd', family: null, value: 13 },
    { key: 'icc', family: null, value: 0.04 },
    { key: 'clusterSizeCv', family: null, value: 0.35 },
  ],
  costs: {
    costs: {
      currency: 'EUR',
      fixed: 240_000,
      perMonth: 4200,
      perCluster: 5500,
      perClusterPeriod: [900, 4700],
      perMeasurement: 22,
    },
    timeline: { startUp: 8, accrualPerClusterPerMonth: 40, followUp: 4, period: 4, closeOut: 4 },
  },
  hold: { kind: 'power', power: 0.8 },
  limits: { clusters: 32, participantsPerCluster: 60, money: 800_000, months: 30 },
  options: [{ id: '1', name: 'Cluster', plan: option({ family: 'cluster', clusterSize: 40 }) }],
};
const girls = {
  hold: schools.hold,
  currency: 'EUR',
  participants: { one: 'girl', many: 'girls' },
  clusters: { one: 'catchment', many: 'catchments' },
};
const standingIn = (study: WeighInput, position = 0) => {
  const standing = weigh(study)[position]?.standing;
  if (!standing) throw new Error('expected a standing');
  return standing;
};

describe('an option against the limits', () => {
  it('names the limit it breaks and by how much, and what the others leave', () => {
    const { fits, breaches, uses } = standingIn(schools);
    expect(fits).toBe(false);
    expect(breaches).toEqual([{ limit: 'clusters', allowed: 32, taken: 44, over: 12 }]);
    expect(uses.map(({ limit, over }) => [limit, Math.round(over)])).toEqual([
      ['clusters', 12],
      ['participantsPerCluster', -20],
      ['money', -84_680],
      ['months', -13],
    ]);
  });

  it('gives the most power that the limits leave it', () => {
    const { within } = standingIn(schools);
    expect(within).toMatchObject({ clusters: 32, clusterSize: 60 });
    expect(within?.power).toBeCloseTo(0.726, 3);
    const { limits } = schools;
    const narrow = standingIn({ ...schools, limits: { ...limits, participantsPerCluster: 40 } });
    expect(narrow.within).toMatchObject({ clusters: 32, clusterSize: 40 });
    expect(narrow.within?.power).toBeCloseTo(0.672, 3);
  });

  it('gives the smallest relaxation that would admit it, which larger clusters may make smaller', () => {
    const { relaxation } = standingIn(schools);
    const [change] = relaxation?.changes ?? [];
    expect(relaxation?.clusterSize).toBe(60);
    expect(change).toMatchObject({ limit: 'clusters', from: 32 });
    const relaxed = (clusters: number) =>
      standingIn({
        ...schools,
        limits: { ...schools.limits, clusters },
        options: [{ id: '1', name: 'Cluster', plan: option({ family: 'cluster', clusterSize: 60 }) }],
      }).fits;
    const needed = change?.to as number;
    expect(needed).toBeLessThan(44);
    expect([relaxed(needed - 1), relaxed(needed)]).toEqual([false, true]);
  });

  it('fits when nothing is broken and the power is reached', () => {
    const wide = standingIn({ ...schools, limits: { clusters: 44, money: 715_320, months: 17 } });
    expect(wide).toMatchObject({ fits: true, breaches: [], within: null, relaxation: null });
  });
});

describe('the hold of a budget', () => {
  it('buys the most units whose cost stays within it', () => {
    const hold = { kind: 'budget', power: 0.9, budget: 400_000 } as const;
    for (const { appraisal, request } of weigh({ ...study, hold })) {
      if (!appraisal?.feasible) throw new Error('expected an answer');
      expect(appraisal.costs?.total).toBeLessThanOrEqual(400_000);
      const more = appraise({ ...request, aim: { find: 'power', units: appraisal.units + 1 } });
      if (!more.feasible) throw new Error('expected an answer');
      expect(more.costs?.total).toBeGreaterThan(400_000);
    }
  });

  it('says so where it buys nothing, and where there are no costs', () => {
    const hold = { kind: 'budget', power: 0.9, budget: 1000 } as const;
    expect(weigh({ ...study, hold })[0]?.error?.path).toBe('hold.budget');
    expect(weigh({ ...study, hold, costs: null })[0]?.error?.path).toBe('costs');
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

  it('names the only option that fits every limit, and why not the others', () => {
    const two: WeighInput = {
      ...schools,
      limits: { clusters: 44, money: 700_000 },
      options: [
        ...schools.options,
        { id: '2', name: 'Larger clusters', plan: option({ family: 'cluster', clusterSize: 60 }) },
        {
          id: '3',
          name: 'Individuals',
          plan: option({ family: 'parallel' }),
          ruling: { kind: 'not-admissible', reason: 'shared canteen' },
        },
      ],
    };
    const { headline, detail } = verdict(weigh(two), girls);
    expect(headline).toBe('Only B fits every limit.');
    expect(detail).toBe('A costs 15\u202fk€ too much. C is ruled out.');
  });

  it('counts the clusters that do not exist in the words of the study', () => {
    expect(verdict(weigh(schools), girls)).toEqual({
      headline: 'No option fits every limit.',
      detail: 'A needs 12 catchments that do not exist.',
    });
  });
});
