import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, type CautionCode } from '../../src/index.js';
import { twoMeans } from '../requests.js';

const at = (request: AppraisalRequest, units: number): AppraisalRequest => ({
  ...request,
  aim: { find: 'power', units },
});
const normal = (request: AppraisalRequest): AppraisalRequest => ({
  ...request,
  test: { ...request.test, reference: 'normal' },
});
const groups = (part: object = {}): AppraisalRequest => ({
  ...twoMeans,
  design: { family: 'partially-nested', icc: 0.05, groupSize: 8, ...part },
});
const levels = (part: object = {}): AppraisalRequest => ({
  ...twoMeans,
  design: {
    family: 'three-level-cluster',
    iccCluster: 0.02,
    iccSubcluster: 0.06,
    subclusterSize: 10,
    subclustersPerCluster: 4,
    ...part,
  },
});
const factorial: AppraisalRequest = { ...twoMeans, design: { family: 'factorial', estimand: 'main-effect' } };
const nonInferior: AppraisalRequest = {
  ...levels(),
  outcome: { kind: 'continuous', difference: 0, sd: 10, better: 'higher' },
  test: { hypothesis: 'non-inferiority', alpha: 0.025, sides: 1, margin: 4 },
};
const rare: AppraisalRequest = {
  ...levels(),
  outcome: { kind: 'binary', control: 0.02, active: 0.01 },
};
const accrual = { startUp: 1, accrualPerMonth: 9, followUp: 6, closeOut: 1 };

/** Each caution with a request that raises it and one, as near as can be, that does not. */
const pairs: [CautionCode, AppraisalRequest, AppraisalRequest][] = [
  ['few-clusters', at(groups(), 3), at(groups(), 4)],
  ['few-clusters', at(levels(), 3), at(levels(), 4)],
  ['normal-reference', at(normal(groups()), 39), at(normal(groups()), 40)],
  ['normal-reference', at(normal(levels()), 19), at(normal(levels()), 20)],
  ['normal-reference', at(normal(levels()), 10), at(levels(), 10)],
  ['icc-zero', groups({ icc: 0 }), groups({ icc: 0.001 })],
  ['icc-zero', levels({ iccCluster: 0 }), levels({ iccCluster: 0.001 })],
  ['small-counts', at(rare, 10), at(rare, 13)],
  ['high-attrition', { ...factorial, attrition: { participants: 0.3 } }, factorial],
  [
    'high-attrition',
    { ...levels(), attrition: { participants: 0.15, units: 0.1 } },
    { ...levels(), attrition: { participants: 0.1, units: 0.1 } },
  ],
  ['missing-figure', { ...factorial, timeline: { startUp: 1 } }, { ...factorial, timeline: accrual }],
  [
    'missing-figure',
    { ...groups(), timeline: { ...accrual, followUp: undefined } },
    { ...groups(), timeline: accrual },
  ],
  [
    'dilution',
    { ...nonInferior, dilution: { nonAdherence: 0.1 } },
    { ...levels(), dilution: { nonAdherence: 0.1 } },
  ],
];

const codes = (request: AppraisalRequest) => appraise(request).cautions.map((caution) => caution.code);

describe('a caution on a factorial, partially nested or three-level design', () => {
  it.each(pairs)('of %s is raised where it belongs, and not beside it', (code, raises, doesNot) => {
    expect(codes(raises)).toContain(code);
    expect(codes(doesNot)).not.toContain(code);
  });

  it('is always that of a fixed design, of random error and of a statistician’s confirmation', () => {
    for (const request of [factorial, groups(), levels()]) {
      expect(codes(request)).toEqual(expect.arrayContaining(['fixed-design', 'random-error', 'confirm']));
    }
  });
});
