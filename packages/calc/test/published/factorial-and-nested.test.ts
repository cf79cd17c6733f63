import { describe, expect, it } from 'vitest';
import type { AppraisalRequest } from '../../src/index.js';
import { feasible, twoMeans } from '../requests.js';

const factorial = (
  difference: number,
  estimand: 'main-effect' | 'interaction',
  aim: AppraisalRequest['aim'],
  alpha = 0.05,
): AppraisalRequest => ({
  outcome: { kind: 'continuous', difference, sd: 1 },
  test: { hypothesis: 'superiority', alpha, sides: 2, reference: 'normal' },
  design: { family: 'factorial', estimand },
  aim,
});

describe('published facts of the 2 × 2 factorial', () => {
  it.each([
    [0.35, 243],
    [0.3, 332],
  ])(
    'take %s SD to %s participants a level at 1 % and power 90 %: Montgomery, Peters & Little 2003, table 1 (read)',
    (difference, perLevel) => {
      const { units } = feasible(factorial(difference, 'main-effect', { find: 'size', power: 0.9 }, 0.01));
      // A level is two cells, so that 243 becomes 244.
      expect(Math.abs(2 * units - perLevel)).toBeLessThanOrEqual(1.5);
    },
  );

  it('give the larger of two effects 97 % power at 664 participants: Montgomery, Peters & Little 2003 (read)', () => {
    const { power } = feasible(factorial(0.35, 'main-effect', { find: 'power', units: 166 }, 0.01));
    expect(power).toBeCloseTo(0.97, 2);
  });

  it('leave an interaction as large as the main effect 29 % of its 80 % power: Brookes et al. 2004 (read)', () => {
    // The size at which the main effect has exactly 80 %, from (z₀.₉₇₅ + z₀.₈)², is 4 × 10 000 at this difference.
    const difference = (1.959964 + 0.8416212) / Math.sqrt(10_000);
    const at = (estimand: 'main-effect' | 'interaction') =>
      feasible(factorial(difference, estimand, { find: 'power', units: 10_000 })).power;
    expect(at('main-effect')).toBeCloseTo(0.8, 5);
    expect(Math.abs(at('interaction') - 0.29)).toBeLessThan(0.005);
  });

  it.each([
    [1, 4],
    [0.2, 100],
  ])(
    'take an interaction of %s times the main effect %s times the participants: Brookes et al. 2004 (read)',
    (ratio, times) => {
      const aim = { find: 'size', power: 0.8 } as const;
      const main = feasible(factorial(0.05, 'main-effect', aim)).participants;
      const interaction = feasible(factorial(0.05 * ratio, 'interaction', aim)).participants;
      expect(interaction / main / times).toBeCloseTo(1, 3);
    },
  );
});

describe('published facts of nested designs', () => {
  it('give three levels the product of two design effects: Teerenstra et al. 2008, Clin Trials 5:486 (read)', () => {
    const { designEffect } = feasible({
      ...twoMeans,
      design: {
        family: 'three-level-cluster',
        iccCluster: 0.05,
        iccSubcluster: 0.3,
        subclusterSize: 4,
        subclustersPerCluster: 10,
      },
    });
    // (1 + 3 × 0.3)(1 + 9ρ*), ρ* = 4 × 0.05/(1 + 3 × 0.3)
    expect(designEffect).toBeCloseTo(3.7, 9);
  });

  it('are best allocated in the ratio √(1 + (m − 1)ρ) to treatment groups: Moerbeek & Wong 2008 (from memory)', () => {
    const error = (active: number) =>
      feasible({
        ...twoMeans,
        design: {
          family: 'partially-nested',
          icc: 0.1,
          groupSize: 10,
          allocation: [20_000 - active, active],
        },
        aim: { find: 'power', units: active / 10 },
      }).standardError;
    const errors = Array.from(
      { length: 900 },
      (_, step) => [error(10_000 + 10 * step), 10_000 + 10 * step] as const,
    );
    const [, best] = errors.reduce((least, each) => (each[0] < least[0] ? each : least));
    expect(best / (20_000 - best)).toBeCloseTo(1.378, 2);
  });
});
