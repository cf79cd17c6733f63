import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise } from '../../src/index.js';
import { abba, clusters, feasible, twoMeans } from '../requests.js';

const large = { find: 'power', units: 100_000 } as const;
const normal = <T extends AppraisalRequest>(request: T): T => ({
  ...request,
  test: { ...request.test, reference: 'normal' },
});

describe('published facts of the crossover', () => {
  it.each([
    [0, 0.5],
    [0.5, 0.25],
    [0.8, 0.1],
  ])(
    'needs (1 − ρ)/2 of the parallel participants at ρ = %s: Senn 2002, Fleiss 1986 (from memory)',
    (correlation, share) => {
      const parallel = feasible({ ...twoMeans, aim: large });
      const crossed = feasible({
        ...abba,
        design: { family: 'crossover', sequences: ['AB', 'BA'], correlation },
        aim: large,
      });
      expect(crossed.standardError ** 2 / parallel.standardError ** 2).toBeCloseTo(share, 9);
    },
  );

  it('takes a fourth to a tenth of the participants at correlations 0.5 to 0.8: Garcia et al. 2004, Stat Med 23:3773 (read)', () => {
    for (const [correlation, ratio] of [
      [0.5, 4],
      [0.8, 10],
    ] as const) {
      const small = { kind: 'continuous', difference: 0.02, sd: 1 } as const;
      const parallel = feasible(normal({ ...twoMeans, outcome: small })).participants;
      const crossed = feasible(
        normal({
          ...abba,
          outcome: small,
          design: { family: 'crossover', sequences: ['AB', 'BA'], correlation },
        }),
      ).participants;
      expect(parallel / crossed).toBeCloseTo(ratio, 1);
    }
  });
});

describe('published facts of cluster designs', () => {
  const effectOf = (icc: number, clusterSize: number, clusterSizeCv?: number) =>
    feasible({
      ...clusters,
      design: { family: 'cluster', icc, clusterSize, ...(clusterSizeCv ? { clusterSizeCv } : {}) },
      aim: { find: 'power', units: 10 },
    }).designEffect;

  it('have the design effects of Killip, Mahfoud & Pearce 2004, Ann Fam Med 2:204 (read)', () => {
    expect([10, 20, 40, 80].map((m) => effectOf(0.017, m))).toEqual([
      expect.closeTo(1.153, 9),
      expect.closeTo(1.323, 9),
      expect.closeTo(1.663, 9),
      expect.closeTo(2.343, 9),
    ]);
  });

  it('need five times the participants at ICC 0.04 and 100 a cluster: Ip, Wasserman & Barkin 2011 (read)', () => {
    expect(Math.abs((effectOf(0.04, 100) as number) - 5)).toBeLessThanOrEqual(0.05);
  });

  it('inflate by at most 1 + cv² for unequal sizes: Eldridge, Ashby & Kerry 2006 (read)', () => {
    for (const [cv, most] of [
      [0.23, 1.053],
      [0.65, 1.4225],
    ] as const) {
      const ratio = (effectOf(0.9, 100_000, cv) as number) / (effectOf(0.9, 100_000) as number);
      expect(Math.abs(ratio - most)).toBeLessThanOrEqual(0.001);
    }
  });

  it('are feasible only with more clusters than n·ρ: Hemming et al. 2011, BMC Med Res Methodol 11:102 (read)', () => {
    // n = 267.35 in an individually randomised arm; 16 clusters an arm suffice at ICC 0.05, not at 0.07.
    const standardised = Math.sqrt((2 * (1.959963984540054 + 0.8416212335729143) ** 2) / 267.35);
    const reaches = (icc: number) =>
      appraise(
        normal({
          ...clusters,
          outcome: { kind: 'continuous', difference: standardised, sd: 1 },
          design: { family: 'cluster', icc, clusterSize: 1 },
          aim: { find: 'cluster-size', units: 16, power: 0.8 },
        }),
      ).feasible;
    expect([reaches(0.05), reaches(0.07)]).toEqual([true, false]);
  });

  it('take about one cluster an arm more than the normal formula at 5 %, two at 1 %: Snedecor & Cochran, Hayes & Bennett 1999 (from memory)', () => {
    for (const [alpha, extra] of [
      [0.05, 1],
      [0.01, 2],
    ] as const) {
      for (const standardised of [0.8, 1, 1.2, 1.5]) {
        const request: AppraisalRequest = {
          ...clusters,
          outcome: { kind: 'continuous', difference: standardised, sd: 1 },
          test: { hypothesis: 'superiority', alpha, sides: 2 },
          design: { family: 'cluster', icc: 1, clusterSize: 1 },
        };
        const added = feasible(request).units - feasible(normal(request)).units;
        expect(Math.abs(added - extra)).toBeLessThanOrEqual(1);
      }
    }
  });
});

describe('published facts of recruitment', () => {
  it('takes 22 months for 400 participants in 20 centres at 0.92 a centre and month: rate of Walters et al. 2017 (read)', () => {
    const { timeline } = feasible({
      ...twoMeans,
      aim: { find: 'power', units: 200 },
      timeline: { startUp: 0, accrualPerMonth: 20 * 0.92, followUp: 0, closeOut: 0 },
    });
    expect(Math.round(timeline?.months as number)).toBe(22);
  });
});
