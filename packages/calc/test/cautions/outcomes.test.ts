import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, type CautionCode } from '../../src/index.js';
import { withField } from '../faults.js';
import { against, alike, categories, clusterRates, noWorse, rates, survival } from '../outcomes/requests.js';
import { clusters, twoMeans, twoProportions } from '../requests.js';

const at = (request: AppraisalRequest, units: number): AppraisalRequest => ({
  ...request,
  aim: { find: 'power', units },
});
const diluted = (
  request: AppraisalRequest,
  dilution: AppraisalRequest['dilution'] = { contamination: 0.1 },
) => ({
  ...request,
  dilution,
});
// 200 in each arm at 20 a month take 20 months.
const recruitedIn = (accrual: number): AppraisalRequest => ({
  ...at(withField(survival, 'outcome.accrual', accrual), 200),
  timeline: { startUp: 1, accrualPerMonth: 20, closeOut: 1 },
});
const inClusters = (request: AppraisalRequest): AppraisalRequest => ({
  ...clusters,
  outcome: request.outcome,
  test: request.test,
});

/** Each caution with a request that raises it and one, as near as can be, that does not. */
const pairs: [CautionCode, string, AppraisalRequest, AppraisalRequest][] = [
  // Control survival 0.6 at 12 months, 18 months' accrual and 12 of follow-up: P₁ = 0.459, so 11 expect 5.0.
  ['small-counts', 'few events of a time-to-event outcome', at(survival, 10), at(survival, 11)],
  // 1.2 × 0.7 = 0.84 events each: 5 expect 4.2, 6 expect 5.04.
  ['small-counts', 'few events of a count', at(rates, 5), at(rates, 6)],
  // Half of the control arm lies outside its commonest category, 0.49 of the active arm.
  ['small-counts', 'few outside the commonest category', at(categories, 9), at(categories, 12)],
  [
    'small-counts',
    'few of the rarer outcome against a margin',
    at(against(twoProportions, 0.2), 24),
    at(against(twoProportions, 0.2), 25),
  ],
  // 0.14 events each in the active arm.
  [
    'small-counts',
    'few events in clusters',
    at(withField(clusterRates, 'design.clusterSize', 5), 7),
    at(withField(clusterRates, 'design.clusterSize', 5), 8),
  ],
  ['dilution', 'non-inferiority', diluted(noWorse), noWorse],
  ['dilution', 'equivalence', diluted(alike), diluted(alike, { contamination: 0, nonAdherence: 0 })],
  ['dilution', 'but not superiority', diluted(against(rates, 1.3)), diluted(rates)],
  ['accrual', 'an accrual too short for the timeline', recruitedIn(17.9), recruitedIn(18)],
  ['accrual', 'an accrual too long for the timeline', recruitedIn(22.1), recruitedIn(22)],
  [
    'accrual',
    'an accrual without a timeline',
    recruitedIn(10),
    at(withField(survival, 'outcome.accrual', 10), 200),
  ],
  ['few-clusters', 'rates in clusters', at(clusterRates, 3), at(clusterRates, 4)],
  ['few-clusters', 'a margin in clusters', at(inClusters(noWorse), 3), at(inClusters(noWorse), 4)],
  ['icc-zero', 'a CV of the rate of 0', withField(clusterRates, 'design.rateCv', 0), clusterRates],
  ['equal-sizes', 'rates in clusters', clusterRates, withField(clusterRates, 'design.clusterSizeCv', 0)],
  [
    'normal-reference',
    'rates in clusters',
    at(withField(clusterRates, 'test.reference', 'normal'), 19),
    at(withField(clusterRates, 'test.reference', 'normal'), 20),
  ],
  [
    'missing-figure',
    'no follow-up beside the outcome’s own',
    { ...twoMeans, timeline: { startUp: 1, accrualPerMonth: 9, closeOut: 1 } },
    recruitedIn(20),
  ],
];

const codes = (request: AppraisalRequest) => appraise(request).cautions.map((caution) => caution.code);

describe('a caution of outcomes and margins', () => {
  it.each(pairs)('of %s is raised for %s, and not beside it', (code, _, raises, doesNot) => {
    expect(codes(raises)).toContain(code);
    expect(codes(doesNot)).not.toContain(code);
  });

  it('of small counts gives the number expected', () => {
    const caution = appraise(at(rates, 5)).cautions.find(({ code }) => code === 'small-counts');
    expect(caution?.message).toContain('only 4.2 events');
  });

  it('of accrual names both durations', () => {
    const caution = appraise(recruitedIn(12)).cautions.find(({ code }) => code === 'accrual');
    expect(caution?.message).toContain('12 months of accrual');
    expect(caution?.message).toContain('20.0 months to recruit');
  });
});

describe('the timeline of a time-to-event outcome', () => {
  it('takes its follow-up from the outcome', () => {
    const appraisal = appraise(recruitedIn(20));
    if (!appraisal.feasible) throw new Error(appraisal.infeasible.message);
    // 1 to start, 20 to recruit, 12 of follow-up, 1 to close.
    expect(appraisal.timeline?.months).toBe(34);
  });
});
