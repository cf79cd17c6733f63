import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fCdf, fQuantile, fUpper, fUpperQuantile } from '../../src/distributions/f.js';
import { studentTUpper } from '../../src/distributions/student-t.js';
import { runs } from '../arbitrary-requests.js';
import { expectWithin, referenceTable, relativeError } from './reference-table.js';

describe('the F distribution', () => {
  const tails = referenceTable('f');
  const quantiles = referenceTable('f-quantile');

  it('has both tails within 1e-12 of the exact values', () => {
    expectWithin(1e-12, tails, ({ x = 0, df1 = 0, df2 = 0, lower }) =>
      relativeError(fCdf(x, df1, df2), lower),
    );
    expectWithin(1e-12, tails, ({ x = 0, df1 = 0, df2 = 0, upper }) =>
      relativeError(fUpper(x, df1, df2), upper),
    );
  });

  it('has quantiles within 1e-12 of the exact values', () => {
    expectWithin(1e-12, quantiles, ({ p = 0, df1 = 0, df2 = 0, quantile }) =>
      relativeError(fQuantile(p, df1, df2), quantile),
    );
    expectWithin(1e-12, quantiles, ({ p = 0, df1 = 0, df2 = 0, quantile = 0 }) =>
      relativeError(1 / fUpperQuantile(p, df2, df1), quantile),
    );
  });

  it('is the square of a t value for one degree of freedom above', () => {
    const t = fc.double({ min: 0.01, max: 30, noNaN: true });
    const degrees = fc.double({ min: -1, max: 9, noNaN: true }).map((power) => 10 ** power);
    fc.assert(
      fc.property(t, degrees, (x, df) => {
        expect(relativeError(fUpper(x * x, 1, df), 2 * studentTUpper(x, df))).toBeLessThan(1e-12);
      }),
      runs(3000),
    );
  });

  it('has exact limits', () => {
    expect([-1, 0, Infinity].map((x) => fCdf(x, 2, 3))).toEqual([0, 0, 1]);
    expect([-1, 0, Infinity].map((x) => fUpper(x, 2, 3))).toEqual([1, 1, 0]);
    expect([0, 1].map((p) => fQuantile(p, 2, 3))).toEqual([0, Infinity]);
    expect([0, 1].map((p) => fUpperQuantile(p, 2, 3))).toEqual([Infinity, 0]);
  });

  it('gives NaN for NaN, df that are not positive and finite, and probabilities outside 0 to 1', () => {
    for (const f of [fCdf, fUpper, fQuantile, fUpperQuantile]) {
      expect(f(Number.NaN, 2, 3)).toBeNaN();
      for (const df of [Number.NaN, 0, -1, Infinity]) {
        expect(f(0.3, df, 3)).toBeNaN();
        expect(f(0.3, 2, df)).toBeNaN();
      }
    }
    for (const p of [-0.1, 1.1]) {
      expect(fQuantile(p, 2, 3)).toBeNaN();
      expect(fUpperQuantile(p, 2, 3)).toBeNaN();
    }
  });
});
