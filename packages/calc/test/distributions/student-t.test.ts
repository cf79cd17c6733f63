import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { normalUpper, normalUpperQuantile } from '../../src/distributions/normal.js';
import {
  studentTCdf,
  studentTQuantile,
  studentTUpper,
  studentTUpperQuantile,
} from '../../src/distributions/student-t.js';
import { runs } from '../arbitrary-requests.js';
import { expectWithin, referenceTable, relativeError } from './reference-table.js';

const degrees = fc.double({ min: -2, max: 12, noNaN: true }).map((power) => 10 ** power);

describe("Student's t distribution", () => {
  const tails = referenceTable('student-t');
  const quantiles = referenceTable('student-t-quantile');

  it('has both tails within 1e-12 of the exact values', () => {
    expectWithin(1e-12, tails, ({ x = 0, df = 0, lower }) => relativeError(studentTCdf(x, df), lower));
    expectWithin(1e-12, tails, ({ x = 0, df = 0, upper }) => relativeError(studentTUpper(x, df), upper));
  });

  it('has quantiles within 1e-12 of the exact values', () => {
    expectWithin(1e-12, quantiles, ({ p = 0, df = 0, upperQuantile }) =>
      relativeError(studentTUpperQuantile(p, df), upperQuantile),
    );
    expectWithin(1e-12, quantiles, ({ p = 0, df = 0, upperQuantile = 0 }) =>
      relativeError(studentTQuantile(p, df), -upperQuantile),
    );
  });

  it('agrees with its closed forms on 1 and 2 degrees of freedom', () => {
    for (const p of [0.4, 0.1, 0.025, 1e-4]) {
      expect(relativeError(studentTUpperQuantile(p, 1), 1 / Math.tan(Math.PI * p))).toBeLessThan(1e-14);
      const exact = (1 - 2 * p) / Math.sqrt(2 * p * (1 - p));
      expect(relativeError(studentTUpperQuantile(p, 2), exact)).toBeLessThan(1e-14);
    }
  });

  it('is the normal distribution on infinite degrees of freedom', () => {
    for (const x of [-5, 0, 1.96, 30]) expect(studentTUpper(x, Infinity)).toBe(normalUpper(x));
    for (const p of [1e-9, 0.025, 0.7])
      expect(studentTUpperQuantile(p, Infinity)).toBe(normalUpperQuantile(p));
    expect(relativeError(studentTUpper(1.96, 1e15), normalUpper(1.96))).toBeLessThan(1e-13);
  });

  it('has exact limits', () => {
    for (const df of [0.1, 1, 30, 1e9]) {
      expect([studentTCdf(-Infinity, df), studentTCdf(0, df), studentTCdf(Infinity, df)]).toEqual([
        0, 0.5, 1,
      ]);
      expect([studentTUpper(-Infinity, df), studentTUpper(Infinity, df)]).toEqual([1, 0]);
      expect([0, 0.5, 1].map((p) => studentTQuantile(p, df))).toEqual([-Infinity, 0, Infinity]);
      expect([0, 0.5, 1].map((p) => studentTUpperQuantile(p, df))).toEqual([Infinity, 0, -Infinity]);
    }
  });

  it('gives NaN for NaN, df of 0 or less, and probabilities outside 0 to 1', () => {
    for (const f of [studentTCdf, studentTUpper, studentTQuantile, studentTUpperQuantile]) {
      expect(f(Number.NaN, 5)).toBeNaN();
      expect(f(0.3, Number.NaN)).toBeNaN();
      expect(f(0.3, 0)).toBeNaN();
      expect(f(0.3, -1)).toBeNaN();
    }
    for (const p of [-0.1, 1.1]) {
      expect(studentTQuantile(p, 5)).toBeNaN();
      expect(studentTUpperQuantile(p, 5)).toBeNaN();
    }
  });

  it('is symmetric, and its upper tail never rises with x', () => {
    const x = fc.double({ min: -50, max: 50, noNaN: true });
    fc.assert(
      fc.property(x, degrees, fc.double({ min: 0, max: 5, noNaN: true }), (from, df, step) => {
        expect(studentTCdf(from, df)).toBe(studentTUpper(-from, df));
        const rounding = 1e-13 * studentTUpper(from, df);
        expect(studentTUpper(from + step, df)).toBeLessThanOrEqual(studentTUpper(from, df) + rounding);
      }),
      runs(5000),
    );
  });

  it('gives back the probability that a quantile was asked for', () => {
    const p = fc.double({ min: 1e-6, max: 0.999, noNaN: true });
    fc.assert(
      fc.property(p, degrees, (tail, df) => {
        const x = studentTUpperQuantile(tail, df);
        if (Number.isFinite(x)) expect(relativeError(studentTUpper(x, df), tail)).toBeLessThan(1e-12);
      }),
      runs(5000),
    );
  });
});
