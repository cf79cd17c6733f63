import { describe, expect, it } from 'vitest';
import { dunnettCriticalValue } from '../../src/distributions/dunnett.js';
import type { AppraisalRequest } from '../../src/index.js';
import { feasible, threeArms } from '../requests.js';

const equal = (count: number) => Array<number>(count).fill(Math.SQRT1_2);

/** For 2 to 9 comparisons at equal allocation, two decimals; rows by df. */
const oneSided: [number, number[]][] = [
  [5, [2.44, 2.68, 2.85, 2.98, 3.08, 3.16, 3.24, 3.3]],
  [8, [2.22, 2.42, 2.55, 2.66, 2.74, 2.81, 2.87, 2.92]],
  [10, [2.15, 2.34, 2.47, 2.56, 2.64, 2.7, 2.76, 2.81]],
  [20, [2.03, 2.19, 2.3, 2.39, 2.46, 2.51, 2.56, 2.6]],
  [30, [1.99, 2.15, 2.25, 2.33, 2.4, 2.45, 2.5, 2.54]],
  [60, [1.95, 2.1, 2.21, 2.28, 2.35, 2.39, 2.44, 2.48]],
  [120, [1.93, 2.08, 2.18, 2.26, 2.32, 2.37, 2.41, 2.45]],
  [Infinity, [1.92, 2.06, 2.16, 2.23, 2.29, 2.34, 2.38, 2.42]],
];
const twoSided: [number, number[]][] = [
  [10, [2.57, 2.76, 2.89, 2.99, 3.07, 3.14, 3.19, 3.24]],
  [20, [2.38, 2.54, 2.65, 2.73, 2.8, 2.86, 2.9, 2.95]],
  [Infinity, [2.21, 2.35, 2.44, 2.51, 2.57, 2.61, 2.65, 2.69]],
];
const twoSidedOnePercent = [2.79, 2.92, 3, 3.06, 3.11, 3.15, 3.19, 3.22];

/** Half a unit of the last decimal, and a little for roundings that the tables themselves missed. */
const rounding = 0.0065;

function expectTable(alpha: number, sides: 1 | 2, df: number, printed: readonly number[]): void {
  for (const [index, value] of printed.entries()) {
    const found = dunnettCriticalValue(alpha, sides, equal(index + 2), df);
    expect(Math.abs(found - value), `${index + 2} comparisons`).toBeLessThan(rounding);
  }
}

describe('published tables of Dunnett', () => {
  it.each(oneSided)('one-sided 5 %%, %s df: 1955, J Am Stat Assoc 50:1096 (read in a reprint)', (df, row) => {
    expectTable(0.05, 1, df, row);
  });

  it.each(twoSided)('two-sided 5 %%, %s df: 1964, Biometrics 20:482 (from memory)', (df, row) => {
    expectTable(0.05, 2, df, row);
  });

  it('two-sided 1 %, normal: 1964, Biometrics 20:482 (from memory)', () => {
    expectTable(0.01, 2, Infinity, twoSidedOnePercent);
  });
});

describe('published facts of several arms', () => {
  const compared = (
    adjust: 'bonferroni' | 'holm' | 'dunnett',
    allocation: number[],
    units: number,
  ): AppraisalRequest => ({
    ...threeArms,
    design: {
      family: 'multi-arm',
      allocation,
      comparisons: { against: 'control', adjust, powerGoal: 'disjunctive' },
    },
    aim: { find: 'power', units },
  });

  it('allow 9 units of breaking strength in Dunnett’s example: 1955, J Am Stat Assoc 50:1096 (from memory)', () => {
    const { criticalValue, standardError, df } = feasible({
      ...compared('dunnett', [1, 1, 1, 1], 3),
      outcome: { kind: 'continuous', difference: 9, sd: Math.sqrt(19) },
      test: { hypothesis: 'superiority', alpha: 0.05, sides: 1 },
    });
    expect(df).toBe(8);
    expect(criticalValue).toBeCloseTo(2.42, 2);
    expect(Math.abs(criticalValue * standardError - 9)).toBeLessThan(0.5);
  });

  it('have the same chance of any success by Holm as by Bonferroni: Vickerstaff, Omar & Ambler 2019, BMC Med Res Methodol 19:129 (read)', () => {
    const [holm, bonferroni] = (['holm', 'bonferroni'] as const).map(
      (adjust) => feasible(compared(adjust, [1, 1, 1], 60)).power,
    );
    expect(holm).toBe(bonferroni);
  });

  it.each([2, 3, 4])(
    'are compared best, %s of them, with a control √K times as large: Dunnett 1955 (from memory)',
    (count) => {
      const total = 120_000;
      const errorAt = (ratio: number) => {
        const units = Math.round((total * ratio) / (ratio + count));
        const arms = Array<number>(count).fill((total - units) / count);
        return feasible(compared('bonferroni', [units, ...arms], units)).standardError;
      };
      const best = errorAt(Math.sqrt(count));
      expect(errorAt(0.97 * Math.sqrt(count))).toBeGreaterThan(best);
      expect(errorAt(1.03 * Math.sqrt(count))).toBeGreaterThan(best);
    },
  );
});
