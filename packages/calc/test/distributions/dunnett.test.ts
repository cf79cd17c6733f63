import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dunnettCriticalValue } from '../../src/distributions/dunnett.js';
import { probabilityAnyOutside } from '../../src/distributions/one-factor.js';
import { studentTUpperQuantile } from '../../src/distributions/student-t.js';
import { runs } from '../arbitrary-requests.js';

type Row = [alpha: number, sides: 1 | 2, loadings: number[], df: number | null, criticalValue: number];

const file = new URL('../reference/multiplicity/dunnett.json', import.meta.url);
const { rows } = JSON.parse(readFileSync(file, 'utf8')) as { rows: Row[] };

describe('Dunnett’s critical value', () => {
  it.each(rows)(
    'at %s, %s-sided, loadings %j, %s df, is within a relative 1e-10 of the exact one',
    (...row) => {
      const [alpha, sides, loadings, df, exact] = row;
      const found = dunnettCriticalValue(alpha, sides, loadings, df ?? Infinity);
      expect(Math.abs(found / exact - 1)).toBeLessThan(1e-10);
    },
  );

  const given = fc.record({
    alpha: fc.constantFrom(0.001, 0.01, 0.025, 0.05, 0.1, 0.3),
    sides: fc.constantFrom(1 as const, 2 as const),
    loadings: fc.array(fc.double({ min: -0.97, max: 0.97, noNaN: true }), { minLength: 2, maxLength: 5 }),
    df: fc.oneof(
      fc.double({ min: 0.4, max: 5, noNaN: true }).map((power) => 10 ** power),
      fc.constant(Infinity),
    ),
  });

  it('lies between that of one comparison and Bonferroni’s', () => {
    fc.assert(
      fc.property(given, ({ alpha, sides, loadings, df }) => {
        const value = dunnettCriticalValue(alpha, sides, loadings, df);
        const bonferroni = studentTUpperQuantile(alpha / sides / loadings.length, df);
        expect(value).toBeGreaterThan(studentTUpperQuantile(alpha / sides, df));
        expect(value).toBeLessThanOrEqual(bonferroni * (1 + 1e-11));
      }),
      runs(300),
    );
  });

  it('does not depend on the directions of a two-sided test', () => {
    fc.assert(
      fc.property(given, ({ alpha, loadings, df }) => {
        const value = dunnettCriticalValue(alpha, 2, loadings, df);
        const turned = dunnettCriticalValue(alpha, 2, loadings.map(Math.abs), df);
        expect(Math.abs(value / turned - 1)).toBeLessThan(1e-10);
      }),
      runs(100),
    );
  });

  it('is Student’s for one comparison', () => {
    expect(dunnettCriticalValue(0.05, 2, [0.7], 12)).toBe(studentTUpperQuantile(0.025, 12));
    expect(dunnettCriticalValue(0.05, 1, [0.7], 12)).toBe(studentTUpperQuantile(0.05, 12));
  });

  it('is that of independent values without loadings on infinite degrees of freedom', () => {
    const each = 1 - (1 - 0.05) ** (1 / 3);
    expect(dunnettCriticalValue(0.05, 1, [0, 0, 0], Infinity)).toBeCloseTo(
      studentTUpperQuantile(each, Infinity),
      10,
    );
  });

  it('holds its type I error where the control is a thousandth of an arm', () => {
    const loadings = [1000, 800, 1000].map((ratio) => Math.sqrt(ratio / (1 + ratio)));
    for (const df of [3, 20, 4000]) {
      const value = dunnettCriticalValue(0.001, 2, loadings, df);
      const alpha = probabilityAnyOutside({ loadings, df }, [value, value, value]);
      expect(Math.abs(alpha - 0.001)).toBeLessThan(1e-12);
    }
  });

  it('gives NaN for what is no test', () => {
    expect(dunnettCriticalValue(0, 2, [0.5, 0.5], 10)).toBeNaN();
    expect(dunnettCriticalValue(1, 2, [0.5, 0.5], 10)).toBeNaN();
    expect(dunnettCriticalValue(0.05, 2, [1, 0.5], 10)).toBeNaN();
    expect(dunnettCriticalValue(0.05, 2, [0.5, 0.5], 0)).toBeNaN();
    expect(dunnettCriticalValue(0.05, 2, [0.5, 0.5], Number.NaN)).toBeNaN();
  });
});
