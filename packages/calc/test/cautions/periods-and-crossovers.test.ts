import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, type CautionCode } from '../../src/index.js';
import { abba, twoMeans } from '../requests.js';

const at = (request: AppraisalRequest, units: number): AppraisalRequest => ({
  ...request,
  aim: { find: 'power', units },
});
const normal = (request: AppraisalRequest): AppraisalRequest => ({
  ...request,
  test: { ...request.test, reference: 'normal' },
});
const shared = { icc: 0.05, cac: 0.8, clusterSize: 10, clusterSizeCv: 0.4 };
const wedge = (part: object = {}): AppraisalRequest =>
  at({ ...twoMeans, design: { family: 'stepped-wedge', steps: 4, ...shared, ...part } }, 4);
const baseline = (part: object = {}): AppraisalRequest =>
  at({ ...twoMeans, design: { family: 'cluster-baseline', ...shared, ...part } }, 8);
const crossed = (part: object = {}): AppraisalRequest =>
  at({ ...twoMeans, design: { family: 'cluster-crossover', ...shared, ...part } }, 8);
const accrual = (perMonth: number, part: object = {}): AppraisalRequest => ({
  ...wedge(part),
  timeline: { startUp: 1, accrualPerClusterPerMonth: perMonth, period: 3, closeOut: 1 },
});
const threeTreatments = (adjust?: 'none' | 'bonferroni'): AppraisalRequest => ({
  ...twoMeans,
  design: {
    family: 'crossover',
    sequences: ['ABC', 'BCA', 'CAB'],
    correlation: 0.5,
    ...(adjust ? { comparisons: { against: 'control', adjust, powerGoal: 'per-comparison' } } : {}),
  },
});
const pairs = (units: number): AppraisalRequest =>
  at(
    {
      ...twoMeans,
      outcome: { kind: 'binary', control: 0.2, active: 0.4 },
      design: { family: 'crossover', sequences: ['AB', 'BA'], correlation: 0.3 },
    },
    units,
  );
const rare = (proportion: number): AppraisalRequest => ({
  ...at(wedge(), 3),
  outcome: { kind: 'binary', control: proportion, active: 0.1 },
});
const carriedOver = (carryover: boolean): AppraisalRequest => ({
  ...twoMeans,
  design: { family: 'crossover', sequences: ['ABB', 'BAA'], correlation: 0.5, carryover },
});

/** Each caution with a request that raises it and one, as near as can be, that does not. */
const each: [CautionCode, AppraisalRequest, AppraisalRequest][] = [
  ['few-clusters', at(baseline(), 3), at(baseline(), 4)],
  ['few-clusters', at(crossed(), 3), at(crossed(), 4)],
  ['few-clusters', at(wedge(), 1), at(wedge(), 2)],
  ['few-clusters-period', at(baseline(), 5), at(baseline(), 6)],
  ['few-clusters-period', at(wedge(), 2), at(wedge(), 3)],
  ['few-clusters-period', at(wedge({ steps: 11 }), 1), at(wedge({ steps: 12 }), 1)],
  ['one-per-sequence', at(wedge(), 1), at(wedge(), 2)],
  [
    'one-per-sequence',
    at(wedge({ allocation: [2, 1, 2, 2] }), 2),
    at(wedge({ allocation: [2, 1, 2, 2] }), 4),
  ],
  ['normal-reference', at(normal(wedge()), 9), at(normal(wedge()), 10)],
  ['icc-zero', wedge({ icc: 0 }), wedge({ icc: 0.001 })],
  ['equal-sizes', wedge({ clusterSizeCv: undefined }), wedge({ clusterSizeCv: 0 })],
  ['accrual', accrual(3.3), accrual(10 / 3)],
  ['accrual', accrual(3.3, { iac: 0.5 }), accrual(4, { iac: 0.5 })],
  ['missing-figure', { ...wedge(), timeline: { startUp: 1, closeOut: 1 } }, accrual(10)],
  ['high-attrition', { ...wedge(), attrition: { participants: 0.2, units: 0.1 } }, wedge()],
  ['multiplicity', threeTreatments(), threeTreatments('bonferroni')],
  ['multiplicity', threeTreatments('none'), abba],
  ['small-counts', pairs(6), pairs(20)],
  // 3 × 10 × (1 + 2 + 3 + 4) measurements under control, of which 4.5 or 6 are expected.
  ['small-counts', rare(0.015), rare(0.02)],
  ['carryover', carriedOver(false), carriedOver(true)],
  ['no-washout', { ...abba, timeline: { washout: 0 } }, { ...abba, timeline: { washout: 1 } }],
  ['completers-only', { ...threeTreatments(), attrition: { participants: 0.1 } }, threeTreatments()],
];

const codes = (request: AppraisalRequest) => appraise(request).cautions.map((caution) => caution.code);

describe('a caution of a design over periods', () => {
  it.each(each)('of %s is raised where it belongs, and not beside it', (code, raises, doesNot) => {
    expect(codes(raises)).toContain(code);
    expect(codes(doesNot)).not.toContain(code);
  });

  it('is raised once', () => {
    for (const [, request] of each) {
      const raised = codes(request);
      expect(new Set(raised).size).toBe(raised.length);
    }
  });
});
