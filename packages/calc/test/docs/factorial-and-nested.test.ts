import { describe, expect, it } from 'vitest';
import type { AppraisalRequest } from '../../src/index.js';
import { feasible, twoMeans } from '../requests.js';

/** The worked examples of docs/, whose figures were worked in R. */
describe('the worked example', () => {
  it('of the factorial takes 32 in each cell, and 127 for the interaction', () => {
    const at = (estimand: 'main-effect' | 'interaction') =>
      feasible({ ...twoMeans, design: { family: 'factorial', estimand } });
    const { units, participants, df, standardError, power } = at('main-effect');
    expect([units, participants, df]).toEqual([32, 128, 124]);
    expect(standardError).toBeCloseTo(1.768, 3);
    expect(5 / standardError).toBeCloseTo(2.828, 3);
    expect(power).toBeCloseTo(0.801, 3);
    expect(at('interaction').units).toBe(127);
  });

  it('of treatment groups takes 10 of them and 80 control participants', () => {
    const { groups, df, standardError, power } = feasible({
      ...twoMeans,
      design: { family: 'partially-nested', icc: 0.05, groupSize: 8 },
    });
    expect(groups.map(({ units, participants }) => [units, participants])).toEqual([
      [80, 80],
      [10, 80],
    ]);
    expect(df).toBeCloseTo(25.67, 2);
    expect(standardError).toBeCloseTo(1.714, 3);
    expect(5 / standardError).toBeCloseTo(2.917, 3);
    expect(power).toBeCloseTo(0.801, 3);
  });

  it('of three levels takes 9 clusters in each arm', () => {
    const design: AppraisalRequest['design'] = {
      family: 'three-level-cluster',
      iccCluster: 0.02,
      iccSubcluster: 0.06,
      subclusterSize: 10,
      subclustersPerCluster: 4,
    };
    const { units, participants, df, designEffect, standardError, power } = feasible({
      ...twoMeans,
      outcome: { kind: 'continuous', difference: 4, sd: 12 },
      design,
    });
    expect([units, participants, df, designEffect]).toEqual([9, 720, 16, 2.14]);
    expect(standardError).toBeCloseTo(1.308, 3);
    expect(4 / standardError).toBeCloseTo(3.057, 3);
    expect(power).toBeCloseTo(0.818, 3);
  });
});

describe('recruitment', () => {
  it('of three levels rounds up in each subcluster and in each arm’s clusters', () => {
    const { groups, recruited, measurements } = feasible({
      ...twoMeans,
      design: {
        family: 'three-level-cluster',
        iccCluster: 0.02,
        iccSubcluster: 0.06,
        subclusterSize: 10,
        subclustersPerCluster: 4,
      },
      aim: { find: 'power', units: 9 },
      attrition: { participants: 0.12, units: 0.1 },
    });
    // ⌈10/0.88⌉ = 12 in a subcluster, 48 in a cluster; ⌈9/0.9⌉ = 10 clusters in an arm.
    expect(groups.map((group) => [group.recruitedClusters, group.recruited])).toEqual([
      [10, 480],
      [10, 480],
    ]);
    expect([recruited, measurements]).toEqual([960, 960]);
  });

  it('of treatment groups rounds up in each arm', () => {
    const { groups } = feasible({
      ...twoMeans,
      design: { family: 'partially-nested', icc: 0.05, groupSize: 7, allocation: [2, 3] },
      aim: { find: 'power', units: 5 },
      attrition: { participants: 0.1 },
    });
    // 5 × 7 = 35 and ⌈35 × 2/3⌉ = 24; ⌈24/0.9⌉ = 27 and ⌈35/0.9⌉ = 39.
    expect(groups.map(({ participants, recruited }) => [participants, recruited])).toEqual([
      [24, 27],
      [35, 39],
    ]);
  });

  it('of a factorial costs by cell', () => {
    const { costs, arms } = feasible({
      ...twoMeans,
      design: { family: 'factorial', estimand: 'main-effect' },
      aim: { find: 'power', units: 9 },
      attrition: { participants: 0.1 },
      costs: { currency: 'EUR', fixed: 100, perRecruited: 10, perExposure: [0, 5, 7, 12], overhead: 0.1 },
    });
    expect(arms.map(({ label, exposures }) => [label, exposures])).toEqual([
      ['Control', 10],
      ['A', 10],
      ['B', 10],
      ['AB', 10],
    ]);
    // (100 + 40 × 10)/4 = 125 shared by each; direct 0, 50, 70, 120; 10 % on all.
    expect(costs?.arms.map(({ total }) => Math.round(total * 100) / 100)).toEqual([
      137.5, 192.5, 214.5, 269.5,
    ]);
    expect(costs?.total).toBeCloseTo(814, 9);
  });
});
