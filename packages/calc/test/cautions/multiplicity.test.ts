import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, type Comparisons } from '../../src/index.js';
import { clusters, threeArms } from '../requests.js';

const compared = (comparisons: Partial<Comparisons>, base = threeArms): AppraisalRequest => ({
  ...base,
  design: {
    ...base.design,
    comparisons: { against: 'control', adjust: 'none', powerGoal: 'per-comparison', ...comparisons },
  } as AppraisalRequest['design'],
});

const clustersInThreeArms: AppraisalRequest = {
  ...clusters,
  design: { ...clusters.design, allocation: [1, 1, 1] } as AppraisalRequest['design'],
};

const multiplicityOf = (request: AppraisalRequest) =>
  appraise(request).cautions.find((caution) => caution.code === 'multiplicity')?.message;

describe('the caution of multiplicity', () => {
  it.each([
    ['two comparisons with control', compared({}), '2 comparisons'],
    ['all three pairs', compared({ against: 'all-pairs' }), '3 comparisons'],
    ['a disjunctive goal', compared({ powerGoal: 'disjunctive' }), '2 comparisons'],
    ['clusters in three arms', compared({}, clustersInThreeArms), '2 comparisons'],
  ])('is raised for %s without adjustment', (_, request, words) => {
    expect(multiplicityOf(request)).toContain(words);
  });

  it.each(['bonferroni', 'holm', 'dunnett', 'fixed-sequence'] as const)(
    'is not raised under %s',
    (adjust) => {
      expect(multiplicityOf(compared({ adjust }))).toBeUndefined();
      expect(multiplicityOf(compared({ adjust }, clustersInThreeArms))).toBeUndefined();
    },
  );

  it('is not raised for two arms', () => {
    expect(multiplicityOf(clusters)).toBeUndefined();
  });
});
