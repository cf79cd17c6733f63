import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, type CalcErrorCode, curve, explain } from '../../src/index.js';
import { errorOf, withField } from '../faults.js';
import { clusters, feasible, twoProportions } from '../requests.js';
import { against, alike, categories, clusterRates, noWorse, rates, survival } from './requests.js';

const without = { participants: 0.1 };
const faults: [AppraisalRequest, string, unknown, CalcErrorCode][] = [
  [survival, 'outcome.hazardRatio', 0, 'schema'],
  [survival, 'outcome.hazardRatio', 1, 'no-effect'],
  [survival, 'outcome.controlSurvival.probability', 1, 'schema'],
  [survival, 'outcome.controlSurvival.probability', 0, 'schema'],
  [survival, 'outcome.controlSurvival.at', 0, 'schema'],
  [survival, 'outcome.accrual', -1, 'schema'],
  [survival, 'outcome.followUp', undefined, 'schema'],
  [survival, 'outcome.dropoutHazard', -0.1, 'schema'],
  [survival, 'outcome.method', 'cox', 'schema'],
  [survival, 'test.reference', 't', 'unsupported'],
  [withField(survival, 'outcome.accrual', 0), 'outcome.followUp', 0, 'schema'],
  [withField(survival, 'outcome.dropoutHazard', 0.01), 'attrition.participants', 0.1, 'counted-twice'],
  [against(survival, 1.3), 'outcome.method', 'freedman', 'unsupported'],
  [against(survival, 1.3), 'test.margin', 1, 'schema'],
  [against(survival, 1.3), 'test.margin', 0.8, 'schema'],
  [rates, 'outcome.controlRate', 0, 'schema'],
  [rates, 'outcome.exposure', 0, 'schema'],
  [rates, 'outcome.dispersion', -0.1, 'schema'],
  [rates, 'outcome.rateRatio', 1, 'no-effect'],
  [against(rates, 1.3), 'test.margin', 0.5, 'schema'],
  [categories, 'outcome.oddsRatio', 1, 'no-effect'],
  [categories, 'outcome.oddsRatio', -1, 'schema'],
  [categories, 'outcome.controlProbabilities', [0.2, 0.5, 0.2], 'schema'],
  [categories, 'outcome.controlProbabilities', [0.5, 0.5 + 2e-9], 'schema'],
  [categories, 'outcome.controlProbabilities', [1], 'schema'],
  [categories, 'outcome.controlProbabilities', [0, 1, 0], 'schema'],
  [categories, 'outcome.controlProbabilities', [1.2, -0.2], 'schema'],
  [against(categories, 1.3), 'test.margin', 1, 'schema'],
  [noWorse, 'outcome.better', undefined, 'schema'],
  [noWorse, 'test.margin', undefined, 'schema'],
  [noWorse, 'test.margin', 0, 'schema'],
  [noWorse, 'test.sides', 2, 'schema'],
  [alike, 'test.sides', 2, 'schema'],
  [alike, 'test.margin', undefined, 'schema'],
  [alike, 'aim', { find: 'effect', units: 50, power: 0.8 }, 'unsupported'],
  [noWorse, 'aim', { find: 'effect', units: 50, power: 0.8 }, 'unsupported'],
  [against(twoProportions, 0.1), 'outcome.method', 'unpooled', 'unsupported'],
  [clusters, 'design.rateCv', 0.2, 'unsupported'],
  [clusterRates, 'design.rateCv', undefined, 'schema'],
  [clusterRates, 'design.rateCv', -0.1, 'schema'],
  [clusterRates, 'design.icc', 0.05, 'unsupported'],
  [clusterRates, 'design.clusterSizeCv', 0.4, 'unsupported'],
  [clusterRates, 'outcome.dispersion', 0.5, 'unsupported'],
  [{ ...clusters, outcome: categories.outcome }, 'outcome', categories.outcome, 'unsupported'],
  [{ ...clusters, outcome: survival.outcome }, 'outcome', survival.outcome, 'unsupported'],
  [
    clusterRates,
    'test',
    { hypothesis: 'non-inferiority', alpha: 0.025, sides: 1, margin: 1.3 },
    'unsupported',
  ],
  [
    { ...clusters, outcome: twoProportions.outcome },
    'test',
    { hypothesis: 'equivalence', alpha: 0.05, sides: 1, margin: 0.1 },
    'unsupported',
  ],
];

describe('an outcome or a margin that breaks a bound', () => {
  it.each(faults)('is refused at its field, fault %#', (request, path, value, code) => {
    const error = errorOf(withField(request, path, value));
    expect(error.code).toBe(code);
    expect(error.path.startsWith(path), `${error.path} for ${path}`).toBe(true);
    expect(error.message).toMatch(/[.]$/);
  });

  it('is no fault where one of the two ways of stating loss is nothing', () => {
    const nothing = withField(survival, 'outcome.dropoutHazard', 0);
    expect(appraise({ ...nothing, attrition: without }).feasible).toBe(true);
    const dropout = withField(survival, 'outcome.dropoutHazard', 0.01);
    expect(appraise({ ...dropout, attrition: { participants: 0 } }).feasible).toBe(true);
  });
});

describe('an effect at its margin or beyond', () => {
  it.each([
    ['a mean', withField(noWorse, 'outcome.difference', -4.5)],
    ['a mean at the margin', withField(noWorse, 'outcome.difference', -4)],
    ['an equivalent mean', withField(alike, 'outcome.difference', 5)],
    ['a hazard ratio', against(withField(survival, 'outcome.hazardRatio', 1.35), 1.3)],
    ['a rate ratio at the margin', against(withField(rates, 'outcome.rateRatio', 1.3), 1.3)],
    ['an odds ratio', against(withField(categories, 'outcome.oddsRatio', 0.7), 1.3)],
    [
      'proportions at the margin but for rounding',
      {
        ...against(twoProportions, 0.1),
        outcome: { kind: 'binary', control: 0.85, active: 0.75, better: 'higher' },
      } as AppraisalRequest,
    ],
  ])('is an answer, not an error, for %s and every aim', (_, request) => {
    for (const aim of [
      { find: 'size', power: 0.8 },
      { find: 'power', units: 50 },
    ] as const) {
      const appraisal = appraise({ ...request, aim });
      expect(appraisal).toMatchObject({ feasible: false, infeasible: { code: 'margin' } });
      expect(explain({ ...request, aim })).toHaveLength(1);
    }
  });
});

describe('an effect that no target shows', () => {
  it('is answered with the most power there is', () => {
    const aim = { find: 'effect', units: 4, power: 0.9 } as const;
    const below = appraise({ ...withField(rates, 'outcome.rateRatio', 0.7), aim });
    if (below.feasible) throw new Error('expected no answer');
    expect(below.infeasible.code).toBe('effect');
    const most = below.infeasible.limitingPower as number;
    const powers = [0.01, 0.05, 0.1, 0.15, 0.2, 0.3].map(
      (rateRatio) =>
        feasible({
          ...withField(rates, 'outcome.rateRatio', rateRatio),
          aim: { find: 'power', units: 4 },
        }).power,
    );
    for (const power of powers) expect(power).toBeLessThanOrEqual(most);
    expect(Math.max(...powers)).toBeGreaterThan(0.95 * most);
  });
});

describe('extreme outcomes', () => {
  it('are answered without a hole, whatever is asked', () => {
    const extremes: AppraisalRequest[] = [
      ...[1e-12, 1e12, 1 + 1e-12].map((ratio) => withField(survival, 'outcome.hazardRatio', ratio)),
      ...[1e-12, 1e12, 1 + 1e-12].map((ratio) => withField(rates, 'outcome.rateRatio', ratio)),
      ...[1e-12, 1e12, 1 + 1e-12].map((ratio) => withField(categories, 'outcome.oddsRatio', ratio)),
      withField(survival, 'outcome.controlSurvival', { at: 1e12, probability: 1 - 1e-16 }),
      withField(survival, 'outcome.controlSurvival', { at: 1e-12, probability: 1e-300 }),
      withField(withField(survival, 'outcome.accrual', 0), 'outcome.followUp', 1e-12),
      withField(survival, 'outcome.dropoutHazard', 1e12),
      withField(survival, 'outcome.method', 'freedman'),
      withField(withField(survival, 'outcome.method', 'freedman'), 'outcome.hazardRatio', 1e12),
      withField(rates, 'outcome.controlRate', 1e-12),
      withField(rates, 'outcome.controlRate', 1e12),
      withField(categories, 'outcome.controlProbabilities', [1 - 1e-12, 1e-12]),
      withField(alike, 'test.margin', 1e-9),
      withField(alike, 'test.margin', 1e12),
      withField(alike, 'test.alpha', 1e-9),
      withField(alike, 'test.alpha', 0.5),
      withField(noWorse, 'test.margin', 1e12),
      clusterRates,
      withField(clusterRates, 'design.rateCv', 0),
      withField(clusterRates, 'design.rateCv', 1e9),
    ];
    for (const request of extremes) {
      for (const aim of [
        { find: 'size', power: 0.8 },
        { find: 'power', units: 2 },
        { find: 'effect', units: 2, power: 0.8 },
        { find: 'cluster-size', units: 2, power: 0.8 },
      ] as const) {
        const effect = aim.find === 'effect' && request.test.hypothesis !== 'superiority';
        const size = aim.find === 'cluster-size' && request.design.family !== 'cluster';
        if (effect || size) continue;
        const asked = { ...request, aim };
        const appraisal = appraise(asked);
        expect(JSON.stringify(appraisal), JSON.stringify(asked)).not.toMatch(/null(?!,"comparisons)/);
        for (const { value } of explain(asked)) expect(value).not.toBeNaN();
        for (const { power } of curve(asked, { over: 'units', from: 2, to: 50, points: 3 })) {
          expect(power).toBeGreaterThanOrEqual(0);
          expect(power).toBeLessThanOrEqual(1);
        }
      }
    }
  });
});
