import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, cheapest, optimalAllocation, optimalClusterSize } from '../../src/index.js';

describe('the optimal allocation', () => {
  it.each([
    [2, Math.SQRT2],
    [4, 2],
    [9, 3],
  ])(
    'at costs in the ratio %s is its square root: Nam 1973, Cochran 1977 (from memory)',
    (ratio, allocation) => {
      expect(optimalAllocation([ratio, 1], [1, 1])).toBeCloseTo(allocation, 9);
    },
  );

  it('of treatment groups of 10 at ICC 0.1 is 1.3784 for each control: Moerbeek & Wong 2008 (from memory)', () => {
    expect(optimalAllocation([1, 1], [1, 1 + 9 * 0.1])).toBeCloseTo(1.3784048752, 9);
  });
});

describe('the optimal cluster size', () => {
  it('is √((c_cluster/c_participant)(1 − ρ)/ρ): Raudenbush 1997 (from memory)', () => {
    // 10 × 0.95/0.05 = 190
    expect(optimalClusterSize({ cluster: 10, participant: 1 }, { within: 0.95, between: 0.05 })).toBeCloseTo(
      190 ** 0.5,
      12,
    );
  });
});

/** A large trial, in which rounding hides nothing of the closed forms. */
const large: AppraisalRequest = {
  outcome: { kind: 'continuous', difference: 0.01, sd: 1 },
  test: { hypothesis: 'superiority', alpha: 0.05, sides: 2, reference: 'normal' },
  design: { family: 'parallel' },
  aim: { find: 'size', power: 0.9 },
};

describe('the search in whole numbers', () => {
  it.each([
    [90, 10, 3],
    [160, 10, 4],
    [10, 40, 0.5],
  ])('finds the optimal allocation where arms cost %s and %s', (control, active, ratio) => {
    const best = cheapest(
      { ...large, costs: { currency: 'EUR', perExposure: [control, active] } },
      { allocation: { from: 0.1, to: 10 } },
    );
    if (!best.found) throw new Error(best.message);
    const [n0, n1] = best.appraisal.groups.map(({ units }) => units) as [number, number];
    expect(n1 / n0).toBeCloseTo(ratio, 2);
    // (z₀.₉₇₅ + z₀.₉)²σ²/δ² × (√c₀ + √c₁)², the least cost of a variance (Cochran 1977), but for the last unit.
    const least = 105_074.2 * (Math.sqrt(control) + Math.sqrt(active)) ** 2;
    expect(best.appraisal.costs?.total).toBeGreaterThan(least * (1 - 1e-6));
    expect(best.appraisal.costs?.total).toBeLessThan(least * (1 + 1e-6) + control + active);
  });

  it.each([
    [1900, 10, 0.05, 60],
    [250, 10, 0.2, 10],
    [99, 1, 0.01, 99],
  ])(
    'finds the optimal cluster size where a cluster costs %s, a member %s, at ICC %s',
    (cluster, member, icc, size) => {
      const best = cheapest(
        {
          ...large,
          design: { family: 'cluster', icc, clusterSize: 5 },
          costs: { currency: 'EUR', perCluster: cluster, perRecruited: member },
        },
        { clusterSize: { from: 1, to: 10_000 } },
      );
      if (!best.found) throw new Error(best.message);
      expect(Math.abs((best.appraisal.clusterSize as number) - size)).toBeLessThanOrEqual(1);
    },
  );
});
