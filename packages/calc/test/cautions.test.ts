import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, type CautionCode } from '../src/index.js';
import { abba, clusters, threeArms, twoMeans, twoProportions } from './requests.js';

const at = (request: AppraisalRequest, units: number): AppraisalRequest => ({
  ...request,
  aim: { find: 'power', units },
});
const normal = (request: AppraisalRequest): AppraisalRequest => ({
  ...request,
  test: { ...request.test, reference: 'normal' },
});
const inClusters = (part: object): AppraisalRequest => ({
  ...clusters,
  design: { family: 'cluster', icc: 0.05, clusterSize: 20, ...part },
});
const unequalSd: AppraisalRequest = {
  ...twoMeans,
  outcome: { kind: 'continuous', difference: 5, sd: 10, sdActive: 14 },
};
const baseline: AppraisalRequest = {
  ...twoMeans,
  outcome: {
    kind: 'continuous',
    difference: 5,
    sd: 10,
    repeated: { baselines: 1, followUps: 1, correlation: 0.5 },
  },
};
const washedOut: AppraisalRequest = { ...abba, timeline: { washout: 0.5 } };

/** Each caution with a request that raises it and one, as near as can be, that does not. */
const pairs: [CautionCode, AppraisalRequest, AppraisalRequest][] = [
  ['few-clusters', at(clusters, 3), at(clusters, 4)],
  ['normal-reference', at(normal(clusters), 19), at(normal(clusters), 20)],
  ['carryover', abba, twoMeans],
  ['no-washout', abba, washedOut],
  ['completers-only', { ...abba, attrition: { participants: 0.1 } }, abba],
  [
    'high-attrition',
    { ...twoMeans, attrition: { participants: 0.21 } },
    { ...twoMeans, attrition: { participants: 0.2 } },
  ],
  ['unequal-sd', { ...unequalSd, design: { family: 'parallel', allocation: [1, 2] } }, unequalSd],
  ['small-counts', at(twoProportions, 24), at(twoProportions, 25)],
  [
    'multiplicity',
    {
      ...threeArms,
      design: {
        ...threeArms.design,
        comparisons: { against: 'control', adjust: 'none', powerGoal: 'per-comparison' },
      } as AppraisalRequest['design'],
    },
    threeArms,
  ],
  ['icc-zero', inClusters({ icc: 0 }), inClusters({ icc: 0.001 })],
  ['equal-sizes', inClusters({}), inClusters({ clusterSizeCv: 0 })],
  ['small-ancova', at(baseline, 19), at(baseline, 20)],
  [
    'missing-figure',
    { ...twoMeans, timeline: { startUp: 1 } },
    { ...twoMeans, timeline: { startUp: 1, accrualPerMonth: 4, followUp: 6, closeOut: 1 } },
  ],
  [
    'missing-figure',
    { ...twoMeans, costs: { currency: 'EUR', perMonth: 10 } },
    { ...twoMeans, costs: { currency: 'EUR', fixed: 10 } },
  ],
];

const codes = (request: AppraisalRequest) => appraise(request).cautions.map((caution) => caution.code);

describe('a caution', () => {
  it.each(pairs)('of %s is raised where it belongs, and not beside it', (code, raises, doesNot) => {
    expect(codes(raises)).toContain(code);
    expect(codes(doesNot)).not.toContain(code);
  });

  it('of a fixed design, of random error and of a statistician’s confirmation stands on every appraisal', () => {
    const infeasible = {
      ...twoMeans,
      outcome: { kind: 'continuous', difference: 1e-9, sd: 1 },
    } as AppraisalRequest;
    for (const request of [twoMeans, twoProportions, abba, clusters, threeArms, infeasible]) {
      expect(codes(request)).toEqual(expect.arrayContaining(['fixed-design', 'random-error', 'confirm']));
    }
  });
});
