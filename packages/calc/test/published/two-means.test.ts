import { describe, expect, it } from 'vitest';
import type { AppraisalRequest } from '../../src/index.js';
import { feasible, twoMeans, unrounded } from '../requests.js';

const means = (difference: number, alpha: number, power: number, sd = 1): AppraisalRequest => ({
  ...twoMeans,
  outcome: { kind: 'continuous', difference, sd },
  test: { hypothesis: 'superiority', alpha, sides: 2 },
  aim: { find: 'size', power },
});
const normal = (request: AppraisalRequest): AppraisalRequest => ({
  ...request,
  test: { ...request.test, reference: 'normal' },
});

describe('published sizes for two means', () => {
  it.each([
    [0.01, [586, 95, 38], 'from memory'],
    [0.05, [393, 64, 26], 'read in a stored copy'],
    [0.1, [310, 50, 20], 'from memory'],
  ])('agree with Cohen 1992, Psychol Bull 112:155, table 2, at alpha %s', (alpha, sizes) => {
    // The table prints the nearest whole number, not the next one up.
    expect([0.2, 0.5, 0.8].map((d) => Math.round(unrounded(means(d, alpha, 0.8))))).toEqual(sizes);
  });

  it('agree with a textbook table at power 90 % after Cohen 1988', () => {
    const table = { 0.2: 526, 0.3: 234, 0.4: 132, 0.5: 85, 0.6: 59, 0.7: 44, 0.8: 34 };
    for (const [d, size] of Object.entries(table)) {
      expect(Math.round(unrounded(means(Number(d), 0.05, 0.9)))).toBe(size);
    }
  });

  it('agree with the examples of power.t.test in the R documentation', () => {
    const power = feasible({ ...means(1, 0.05, 0.9), aim: { find: 'power', units: 20 } }).power;
    expect(power).toBeCloseTo(0.8689528, 6);
    expect(unrounded(means(1, 0.05, 0.9))).toBeCloseTo(22.0211, 3);
    const oneSided: AppraisalRequest = {
      ...means(1, 0.05, 0.9),
      test: { hypothesis: 'superiority', alpha: 0.05, sides: 1 },
    };
    expect(unrounded(oneSided)).toBeCloseTo(17.84713, 3);
  });

  it('agree with Julious 2004, Stat Med 23:1921, parallel superiority table (from memory)', () => {
    const table = {
      0.05: 8407,
      0.1: 2103,
      0.15: 935,
      0.2: 527,
      0.25: 338,
      0.3: 235,
      0.4: 133,
      0.5: 86,
      0.75: 39,
      1: 23,
    };
    for (const [d, size] of Object.entries(table)) {
      expect(feasible(means(Number(d), 0.05, 0.9)).units).toBe(size);
    }
  });

  it('agree with the CONSORT 2010 example, BMJ 340:c869, item 7a (from memory): 50 recruited a group', () => {
    const { groups } = feasible({ ...means(3, 0.05, 0.8, 5), attrition: { participants: 0.1 } });
    expect(groups.map((group) => group.recruited)).toEqual([50, 50]);
  });

  it('agree with the nomogram example of Altman 1980, BMJ 281:1336 (from memory): about 750 in all', () => {
    expect(Math.abs(2 * unrounded(normal(means(0.25, 0.01, 0.8))) - 750)).toBeLessThanOrEqual(5);
  });

  it('agree with Lehr 1992, Stat Med 11:1099 (from memory): 16 over the squared standardised difference', () => {
    expect(Math.abs(unrounded(normal(means(1, 0.05, 0.8))) - 16)).toBeLessThanOrEqual(0.4);
    expect(Math.abs(unrounded(normal(means(1, 0.05, 0.9))) - 21)).toBeLessThanOrEqual(0.4);
  });

  it('agree with the table of Pocock 1983 (from memory)', () => {
    const table: [number, number, number][] = [
      [0.1, 0.05, 10.8],
      [0.05, 0.05, 13],
      [0.02, 0.05, 15.8],
      [0.01, 0.05, 17.8],
      [0.1, 0.1, 8.6],
      [0.05, 0.1, 10.5],
      [0.02, 0.1, 13],
      [0.01, 0.1, 14.9],
      [0.1, 0.5, 2.7],
      [0.05, 0.5, 3.8],
      [0.02, 0.5, 5.4],
      [0.01, 0.5, 6.6],
    ];
    for (const [alpha, beta, f] of table) {
      // n per arm = 2 f (σ/δ)²; a small difference keeps the size away from the smallest design.
      const size = unrounded(normal(means(0.1, alpha, 1 - beta)));
      expect(Math.abs((size * 0.01) / 2 - f)).toBeLessThanOrEqual(0.06);
    }
  });

  it('agree with Chow, Shao & Wang, chapter 3 (from memory): 63 a group for equality', () => {
    expect(feasible(normal(means(0.05, 0.05, 0.8, 0.1))).units).toBe(63);
  });

  it('shrink by 1 − ρ² with a baseline: Borm, Fransen & Lemmens 2007 (read); about half at 0.7: Walters et al. 2019 (read)', () => {
    const plain = unrounded(normal(means(0.2, 0.05, 0.9)));
    const adjusted = unrounded(
      normal({
        ...twoMeans,
        outcome: {
          kind: 'continuous',
          difference: 0.2,
          sd: 1,
          repeated: { baselines: 1, followUps: 1, correlation: 0.7 },
        },
        aim: { find: 'size', power: 0.9 },
      }),
    );
    expect(adjusted / plain).toBeCloseTo(0.51, 9);
    expect(Math.abs(adjusted / plain - 0.5)).toBeLessThanOrEqual(0.02);
  });

  it('lose power to 2 : 1 allocation as in Torgerson’s lecture (read): 80 % becomes 75 %', () => {
    const equal = normal({ ...means(0.1, 0.05, 0.8), aim: { find: 'power', units: 1500 } });
    const even = feasible(normal(means(0.1, 0.05, 0.8))).units;
    const uneven: AppraisalRequest = {
      ...equal,
      design: { family: 'parallel', allocation: [2, 1] },
      aim: { find: 'power', units: Math.round((4 * even) / 3) },
    };
    expect(Math.abs(feasible(uneven).power - 0.75)).toBeLessThanOrEqual(0.005);
  });

  it.each([
    [2, 1.125],
    [3, 4 / 3],
    [4, 1.5625],
  ])('grow in total with allocation %s : 1 as in Pocock 1983 (from memory)', (ratio, inflation) => {
    const request = normal(means(0.005, 0.05, 0.9));
    const even = feasible(request).participants;
    const uneven = feasible({
      ...request,
      design: { family: 'parallel', allocation: [ratio, 1] },
    }).participants;
    expect(uneven / even).toBeCloseTo(inflation, 4);
  });
});
