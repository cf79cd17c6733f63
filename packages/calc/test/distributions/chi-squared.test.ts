import fc from 'fast-check';
import jstat from 'jstat';
import { describe, expect, it } from 'vitest';
import {
  chiSquaredCdf,
  chiSquaredQuantile,
  chiSquaredUpper,
  chiSquaredUpperQuantile,
} from '../../src/distributions/chi-squared.js';
import { runs } from '../arbitrary-requests.js';
import { expectWithin, referenceTable, relativeError } from './reference-table.js';

describe('the chi-squared distribution', () => {
  const tails = referenceTable('chi-squared');
  const quantiles = referenceTable('chi-squared-quantile');

  it('has both tails within 1e-12 of the exact values', () => {
    expectWithin(1e-12, tails, ({ x = 0, df = 0, lower }) => relativeError(chiSquaredCdf(x, df), lower));
    expectWithin(1e-12, tails, ({ x = 0, df = 0, upper }) => relativeError(chiSquaredUpper(x, df), upper));
  });

  it('has quantiles within 1e-12 of the exact values', () => {
    expectWithin(1e-12, quantiles, ({ p = 0, df = 0, quantile }) =>
      relativeError(chiSquaredQuantile(p, df), quantile),
    );
    expectWithin(1e-12, quantiles, ({ p = 0, df = 0, upperQuantile }) =>
      relativeError(chiSquaredUpperQuantile(p, df), upperQuantile),
    );
  });

  it('is an exponential distribution on 2 degrees of freedom', () => {
    for (const x of [1e-10, 0.3, 2, 40, 1000]) {
      expect(relativeError(chiSquaredUpper(x, 2), Math.exp(-x / 2))).toBeLessThan(1e-13);
      expect(relativeError(chiSquaredCdf(x, 2), -Math.expm1(-x / 2))).toBeLessThan(1e-13);
    }
  });

  it('agrees with a general statistics library where that is exact to 1e-9', () => {
    for (const df of [1, 4, 29, 120]) {
      for (const share of [0.3, 0.9, 1.6]) {
        expect(chiSquaredCdf(share * df, df)).toBeCloseTo(jstat.chisquare.cdf(share * df, df), 9);
      }
    }
  });

  it('has exact limits', () => {
    for (const df of [0.1, 2, 1e6]) {
      expect([-1, 0, Infinity].map((x) => chiSquaredCdf(x, df))).toEqual([0, 0, 1]);
      expect([-1, 0, Infinity].map((x) => chiSquaredUpper(x, df))).toEqual([1, 1, 0]);
      expect([0, 1].map((p) => chiSquaredQuantile(p, df))).toEqual([0, Infinity]);
      expect([0, 1].map((p) => chiSquaredUpperQuantile(p, df))).toEqual([Infinity, 0]);
    }
  });

  it('is at its limit, and at once, however far out', () => {
    for (const df of [0.1, 5, 78, 1e6, 1e12]) {
      for (const x of [1e18, 1e150, 1e200, Number.MAX_VALUE]) {
        expect([chiSquaredCdf(x, df), chiSquaredUpper(x, df)]).toEqual([1, 0]);
      }
      if (df > 10) expect([chiSquaredCdf(1e-300, df), chiSquaredUpper(1e-300, df)]).toEqual([0, 1]);
    }
  });

  it('gives NaN for NaN, df that are not positive and finite, and probabilities outside 0 to 1', () => {
    for (const f of [chiSquaredCdf, chiSquaredUpper, chiSquaredQuantile, chiSquaredUpperQuantile]) {
      expect(f(Number.NaN, 5)).toBeNaN();
      for (const df of [Number.NaN, 0, -1, Infinity]) expect(f(0.3, df)).toBeNaN();
    }
    for (const p of [-0.1, 1.1]) {
      expect(chiSquaredQuantile(p, 5)).toBeNaN();
      expect(chiSquaredUpperQuantile(p, 5)).toBeNaN();
    }
  });

  it('never falls as x rises, whichever method is used on the way', () => {
    const power = fc.double({ min: -2, max: 6, noNaN: true });
    const share = fc.double({ min: 0.01, max: 4, noNaN: true });
    fc.assert(
      fc.property(power, share, fc.double({ min: 1, max: 2, noNaN: true }), (tens, from, growth) => {
        const df = 10 ** tens;
        const [low, high] = [from * df, from * df * growth];
        expect(chiSquaredCdf(high, df)).toBeGreaterThanOrEqual(chiSquaredCdf(low, df) * (1 - 1e-12));
        expect(chiSquaredUpper(high, df)).toBeLessThanOrEqual(chiSquaredUpper(low, df) * (1 + 1e-12));
      }),
      runs(5000),
    );
  });
});
