import { describe, expect, it } from 'vitest';
import type { AppraisalRequest, Design } from '../../src/index.js';
import { feasible, twoMeans } from '../requests.js';

const correlated = { icc: 0.05, cac: 0.8 };
const asked = (difference: number, sd: number, design: Design, power = 0.8): AppraisalRequest => ({
  ...twoMeans,
  outcome: { kind: 'continuous', difference, sd },
  design,
  aim: { find: 'size', power },
});

/** Size, df and, to the digits shown, what the page says of the standard error, ncp and power. */
function worked(request: AppraisalRequest) {
  const { units, participants, df, standardError, criticalValue, power, comparisons, designEffect } =
    feasible(request);
  const shown = (value: number, digits: number) => Number(value.toFixed(digits));
  return {
    units,
    participants,
    df,
    se: shown(standardError, 3),
    t: shown(criticalValue, 3),
    ncp: shown(Math.abs(comparisons[0]?.effect as number) / standardError, 3),
    power: shown(100 * power, 1),
    designEffect: designEffect === undefined ? undefined : shown(designEffect, 2),
  };
}

/** The worked examples of docs/, whose figures were worked in R. */
describe('the worked example', () => {
  it('of the stepped wedge takes 6 clusters in each sequence, 7 with decay and 4 as a cohort', () => {
    const wedge = { family: 'stepped-wedge' as const, steps: 4, ...correlated, clusterSize: 15 };
    expect(worked(asked(3, 12, wedge))).toEqual({
      units: 6,
      participants: 1800,
      df: 22,
      se: 0.998,
      t: 2.074,
      ncp: 3.007,
      power: 82,
      designEffect: 3.11,
    });
    expect(worked(asked(3, 12, { ...wedge, decay: true })).units).toBe(7);
    expect(worked(asked(3, 12, { ...wedge, iac: 0.6 })).units).toBe(4);
  });

  it('of a baseline period takes 16 clusters in each arm, or 66 participants in each of 8', () => {
    const baseline = { family: 'cluster-baseline' as const, ...correlated, clusterSize: 20 };
    expect(worked(asked(3, 10, baseline))).toMatchObject({
      units: 16,
      df: 30,
      se: 1.007,
      t: 2.042,
      ncp: 2.98,
      power: 82.2,
    });
    const sized = feasible({
      ...asked(3, 10, baseline),
      aim: { find: 'cluster-size', units: 8, power: 0.8 },
    });
    expect(sized.clusterSize).toBe(66);
  });

  it('of the cluster crossover takes 13 clusters in each order', () => {
    const crossed = { family: 'cluster-crossover' as const, ...correlated, clusterSize: 20 };
    expect(worked(asked(2, 10, crossed))).toEqual({
      units: 13,
      participants: 1040,
      df: 24,
      se: 0.665,
      t: 2.064,
      ncp: 3.007,
      power: 82.3,
      designEffect: 1.15,
    });
  });

  it('of a schedule takes 11 clusters in each sequence', () => {
    const schedule = [
      [0, 0, 1, null],
      [0, null, 1, 1],
      [null, 0, 0, 1],
    ] as (0 | 1 | null)[][];
    const design = { family: 'cluster-schedule' as const, schedule, ...correlated, clusterSize: 15 };
    expect(worked(asked(4, 12, design))).toMatchObject({
      units: 11,
      participants: 1485,
      df: 31,
      se: 1.368,
      t: 2.04,
      ncp: 2.924,
      power: 80.8,
    });
  });

  const sequenced = (sequences: string[], part: object = {}) =>
    asked(1, 2.1, { family: 'crossover', sequences, correlation: 0.6, ...part }, 0.9);

  it('of AB/BA takes 20 in each sequence, of which 25 are recruited', () => {
    expect(worked(sequenced(['AB', 'BA']))).toMatchObject({
      units: 20,
      participants: 40,
      df: 38,
      se: 0.297,
      t: 2.024,
      ncp: 3.367,
      power: 90.7,
    });
    const lost = feasible({ ...sequenced(['AB', 'BA']), attrition: { participants: 0.2 } });
    expect(lost.groups.map(({ recruited }) => recruited)).toEqual([25, 25]);
  });

  it('of ABB/BAA takes 15 in each sequence, with carryover fitted or not', () => {
    const sequences = ['ABB', 'BAA'];
    expect(worked(sequenced(sequences))).toMatchObject({ units: 15, participants: 30, df: 57, power: 91.1 });
    expect(worked(sequenced(sequences, { carryover: true }))).toMatchObject({ units: 15, df: 56 });
  });

  it('of three treatments takes 8 in each order, 10 with carryover', () => {
    const sequences = ['ABC', 'BCA', 'CAB', 'ACB', 'BAC', 'CBA'];
    const comparisons = { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' };
    expect(worked(sequenced(sequences, { comparisons }))).toMatchObject({
      units: 8,
      participants: 48,
      df: 92,
      se: 0.271,
      power: 91.9,
    });
    expect(worked(sequenced(sequences, { comparisons, carryover: true })).units).toBe(10);
  });

  it('of two proportions in the same participants takes 48 in each sequence', () => {
    const design: Design = { family: 'crossover', sequences: ['AB', 'BA'], correlation: 0.3 };
    const pairs = { ...asked(0, 1, design, 0.9), outcome: { kind: 'binary', control: 0.4, active: 0.6 } };
    expect(worked(pairs as AppraisalRequest)).toMatchObject({ units: 48, participants: 96, power: 90.4 });
  });
});
