import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, type CalcErrorCode } from '../src/index.js';
import { errorOf, withField } from './faults.js';
import { abba, clusters, threeArms, twoMeans, twoProportions } from './requests.js';

const factorial: AppraisalRequest = { ...twoMeans, design: { family: 'factorial', estimand: 'main-effect' } };
const nested: AppraisalRequest = {
  ...twoMeans,
  design: { family: 'partially-nested', icc: 0.05, groupSize: 8 },
};
const threeLevels: AppraisalRequest = {
  ...twoMeans,
  design: {
    family: 'three-level-cluster',
    iccCluster: 0.02,
    iccSubcluster: 0.06,
    subclusterSize: 10,
    subclustersPerCluster: 4,
  },
};
const clusterSizeAim = { find: 'cluster-size', units: 10, power: 0.8 };
const repeated = { baselines: 1, followUps: 1, correlation: 0.5 };

const faults: [AppraisalRequest, string, unknown, CalcErrorCode][] = [
  [twoMeans, 'outcome.sd', 0, 'schema'],
  [twoMeans, 'outcome.sd', -1, 'schema'],
  [twoMeans, 'outcome.sd', '10', 'schema'],
  [twoMeans, 'outcome.sd', undefined, 'schema'],
  [twoMeans, 'outcome.sd', Number.NaN, 'schema'],
  [twoMeans, 'outcome.sd', Number.POSITIVE_INFINITY, 'schema'],
  [twoMeans, 'outcome.difference', 0, 'no-effect'],
  [twoMeans, 'outcome.sdactive', 3, 'schema'],
  [abba, 'outcome', { kind: 'ordinal', controlProbabilities: [0.5, 0.5], oddsRatio: 2 }, 'unsupported'],
  [twoMeans, 'outcome.kind', 'ordinary', 'schema'],
  [twoMeans, 'test.alpha', 0, 'schema'],
  [twoMeans, 'test.alpha', 0.6, 'schema'],
  [twoMeans, 'test.sides', 3, 'schema'],
  [threeArms, 'test.hypothesis', 'equivalence', 'unsupported'],
  [twoMeans, 'test.margin', 1, 'unsupported'],
  [twoMeans, 'aim.power', 1, 'schema'],
  [twoMeans, 'aim.power', 0.02, 'schema'],
  [twoMeans, 'aim', { find: 'cluster-size', units: 10, power: 0.8 }, 'unsupported'],
  [twoMeans, 'aim.find', 'budget', 'schema'],
  [twoMeans, 'design.family', 'lattice', 'unsupported'],
  [twoMeans, 'design.family', 'constructor', 'unsupported'],
  [twoMeans, 'design.allocation', [1], 'schema'],
  [twoMeans, 'design.allocation', [1, -1], 'schema'],
  [twoMeans, 'design.allocation', [1, 5000], 'schema'],
  [twoMeans, 'design.clusterSizeCv', 0.4, 'schema'],
  [twoMeans, 'attrition.participants', 1, 'schema'],
  [twoMeans, 'attrition.participants', -0.1, 'schema'],
  [twoMeans, 'attrition.units', 0.1, 'unsupported'],
  [twoMeans, 'dilution.contamination', 1, 'schema'],
  [twoMeans, 'costs', { currency: 'EUR', perExposure: [1, 2, 3] }, 'schema'],
  [twoMeans, 'timeline', { accrualPerMonth: 3, accrualPerClusterPerMonth: 2 }, 'schema'],
  [twoMeans, 'outcome.repeated', { baselines: 1, followUps: 2, correlation: -0.6 }, 'impossible-correlation'],
  [twoProportions, 'outcome.active', 0.3, 'no-effect'],
  [twoProportions, 'outcome.active', 1, 'schema'],
  [twoProportions, 'outcome.control', 0, 'schema'],
  [twoProportions, 'test.reference', 't', 'unsupported'],
  [twoProportions, 'outcome.method', 'exact', 'schema'],
  [abba, 'design.correlation', 1, 'schema'],
  [abba, 'design.correlation', undefined, 'schema'],
  [abba, 'design.sequences', ['AB', 'AB'], 'not-estimable'],
  [abba, 'design.sequences', ['ab', 'BA'], 'schema'],
  [abba, 'design.carryover', true, 'not-estimable'],
  [abba, 'outcome.sdActive', 3, 'unsupported'],
  [clusters, 'design.icc', 1.2, 'schema'],
  [clusters, 'design.icc', undefined, 'schema'],
  [clusters, 'design.clusterSize', 2.5, 'schema'],
  [clusters, 'design.clusterSize', 0, 'schema'],
  [clusters, 'outcome.sdActive', 3, 'unsupported'],
  [threeArms, 'design.comparisons.adjust', 'scheffe', 'schema'],
  [threeArms, 'design.comparisons.powerGoal', 'most', 'schema'],
  [threeArms, 'design.comparisons.effects', [5], 'schema'],
  [threeArms, 'design.comparisons.effects', [5, 0], 'no-effect'],
  [threeArms, 'outcome.sdActive', 3, 'unsupported'],
  [threeArms, 'design.allocation', [1, 1], 'schema'],
  [factorial, 'design.estimand', 'simple-effect', 'schema'],
  [factorial, 'design.allocation', [1, 1], 'schema'],
  [factorial, 'outcome.sdActive', 3, 'unsupported'],
  [factorial, 'outcome.repeated', repeated, 'unsupported'],
  [factorial, 'attrition.units', 0.1, 'unsupported'],
  [factorial, 'aim', clusterSizeAim, 'unsupported'],
  [factorial, 'costs', { currency: 'EUR', perExposure: [1, 2] }, 'schema'],
  [nested, 'design.icc', -0.01, 'schema'],
  [nested, 'design.icc', undefined, 'schema'],
  [nested, 'design.groupSize', 0, 'schema'],
  [nested, 'design.groupSize', 7.5, 'schema'],
  [nested, 'design.allocation', [1, 1, 1], 'schema'],
  [nested, 'outcome.sdActive', 3, 'unsupported'],
  [nested, 'attrition.units', 0.1, 'unsupported'],
  [nested, 'aim', clusterSizeAim, 'unsupported'],
  [nested, 'test.hypothesis', 'equivalence', 'unsupported'],
  [threeLevels, 'design.iccSubcluster', 0.01, 'impossible-correlation'],
  [threeLevels, 'design.iccSubcluster', 1.01, 'schema'],
  [threeLevels, 'design.iccCluster', undefined, 'schema'],
  [threeLevels, 'design.subclusterSize', 0, 'schema'],
  [threeLevels, 'design.subclustersPerCluster', 1.5, 'schema'],
  [threeLevels, 'design.clusterSizeCv', 0.3, 'schema'],
  [threeLevels, 'outcome', { kind: 'binary', control: 0.2, active: 0.3, method: 'pooled' }, 'unsupported'],
  [threeLevels, 'outcome', { kind: 'count', controlRate: 1, rateRatio: 0.8, exposure: 1 }, 'unsupported'],
  [threeLevels, 'aim', clusterSizeAim, 'unsupported'],
];

describe('a request that breaks a bound', () => {
  it.each(faults)('is refused at its field, fault %#', (request, path, value, code) => {
    const error = errorOf(withField(request, path, value));
    expect(error.code).toBe(code);
    expect(error.path.startsWith(path), `${error.path} for ${path}`).toBe(true);
    expect(error.message).toMatch(/[.]$/);
  });

  it('is refused when it asks for fewer units than can be analysed', () => {
    const error = errorOf({ ...twoMeans, aim: { find: 'power', units: 1 } });
    expect([error.code, error.path]).toEqual(['too-few-units', 'aim.units']);
  });

  it('is refused when a treatment group or a control participant would stand alone', () => {
    const few = { ...nested, aim: { find: 'power', units: 1 } };
    expect(errorOf(few).code).toBe('too-few-units');
    const design = { family: 'partially-nested', icc: 0, groupSize: 1, allocation: [1, 4] };
    expect(errorOf({ ...nested, design, aim: { find: 'power', units: 4 } }).code).toBe('too-few-units');
    expect(
      appraise({ ...nested, design, aim: { find: 'power', units: 5 } } as AppraisalRequest).feasible,
    ).toBe(true);
  });

  it('is refused when it is no object at all', () => {
    for (const junk of [null, undefined, 3, 'a', [], {}]) expect(errorOf(junk).code).toBe('schema');
  });
});

describe('extreme figures', () => {
  it('are answered at once and without a hole', () => {
    const baseline = { baselines: 1, followUps: 1, correlation: 0.5 };
    for (const difference of [1, 1e6, 1e12]) {
      for (const aim of [
        { find: 'power', units: 2 },
        { find: 'effect', units: 2, power: 0.8 },
        { find: 'size', power: 0.999 },
      ] as const) {
        const appraisal = appraise({
          ...twoMeans,
          outcome: { kind: 'continuous', difference, sd: 1, repeated: baseline },
          test: { hypothesis: 'superiority', alpha: 1e-9, sides: 1 },
          aim,
        });
        if (!appraisal.feasible) throw new Error(appraisal.infeasible.message);
        expect(appraisal.power).toBeGreaterThan(0);
        expect(appraisal.power).toBeLessThanOrEqual(1);
        if (aim.find === 'effect') expect(appraisal.detectable).toBeGreaterThan(0);
      }
    }
  });

  it('have an unrounded size too where two in each arm suffice', () => {
    for (const difference of [5, 10, 20]) {
      const { unroundedUnits, units } = appraise({
        ...twoMeans,
        outcome: { kind: 'continuous', difference, sd: 1 },
      }) as { unroundedUnits: number; units: number };
      expect(Math.max(2, Math.ceil(unroundedUnits))).toBe(units);
    }
  });
});

describe('an aim out of reach', () => {
  it('answers with the limiting power and the fewest clusters that would do', () => {
    const appraisal = appraise({
      ...clusters,
      design: { family: 'cluster', icc: 0.3, clusterSize: 1 },
      aim: { find: 'cluster-size', units: 10, power: 0.9 },
    });
    if (appraisal.feasible) throw new Error('expected no answer');
    const { code, limitingPower, fewestUnits } = appraisal.infeasible;
    expect(code).toBe('clusters');
    expect(limitingPower).toBeLessThan(0.9);
    const feasibleAt = (units: number) =>
      appraise({
        ...clusters,
        design: { family: 'cluster', icc: 0.3, clusterSize: 1 },
        aim: { find: 'cluster-size', units, power: 0.9 },
      }).feasible;
    expect([feasibleAt((fewestUnits as number) - 1), feasibleAt(fewestUnits as number)]).toEqual([
      false,
      true,
    ]);
  });

  it('answers when only a cluster size beyond all bounds would do', () => {
    // Two degrees of freedom at so small a type I error: the critical value is above 20 000.
    const appraisal = appraise({
      ...clusters,
      test: { hypothesis: 'superiority', alpha: 1e-9, sides: 1 },
      design: { family: 'cluster', icc: 0, clusterSize: 1 },
      aim: { find: 'cluster-size', units: 2, power: 0.9 },
    });
    if (appraisal.feasible) throw new Error('expected no answer');
    expect(appraisal.infeasible.limitingPower).toBeLessThan(0.9);
    expect(appraisal.infeasible.fewestUnits).toBeGreaterThan(2);
  });

  it('answers when no active proportion can be told from control at that size', () => {
    const appraisal = appraise({ ...twoProportions, aim: { find: 'effect', units: 4, power: 0.95 } });
    expect(appraisal).toMatchObject({ feasible: false, infeasible: { code: 'effect' } });
  });

  it('answers when the effect is too small for any size', () => {
    const appraisal = appraise({ ...twoMeans, outcome: { kind: 'continuous', difference: 1e-9, sd: 1 } });
    expect(appraisal).toMatchObject({ feasible: false, infeasible: { code: 'effect' } });
  });
});
