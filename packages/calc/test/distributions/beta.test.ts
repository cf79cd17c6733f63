import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { betaCdf, betaQuantile, betaUpper, betaUpperQuantile } from '../../src/distributions/beta.js';
import { runs } from '../arbitrary-requests.js';
import { expectWithin, referenceTable, relativeError } from './reference-table.js';

describe('the beta distribution', () => {
  const tails = referenceTable('beta');
  const quantiles = referenceTable('beta-quantile');

  it('has both tails within 1e-12 of the exact values', () => {
    expectWithin(1e-12, tails, ({ x = 0, a = 0, b = 0, lower }) => relativeError(betaCdf(x, a, b), lower));
    expectWithin(1e-12, tails, ({ x = 0, a = 0, b = 0, upper }) => relativeError(betaUpper(x, a, b), upper));
  });

  it('has quantiles within 1e-12 of the exact values', () => {
    expectWithin(1e-12, quantiles, ({ p = 0, a = 0, b = 0, quantile }) =>
      relativeError(betaQuantile(p, a, b), quantile),
    );
    const lowHalf = quantiles.filter(({ quantile = 0 }) => quantile < 0.5);
    expectWithin(1e-12, lowHalf, ({ p = 0, a = 0, b = 0, quantile = 0 }) =>
      relativeError(betaUpperQuantile(p, b, a), 1 - quantile),
    );
  });

  it('agrees with the binomial sum for whole shapes', () => {
    // I_x(2, 3) is the probability of two or more successes in four trials.
    const x = 0.3;
    expect(betaCdf(x, 2, 3)).toBeCloseTo(1 - 0.7 ** 4 - 4 * 0.3 * 0.7 ** 3, 15);
    expect(betaUpper(x, 2, 3)).toBeCloseTo(0.7 ** 4 + 4 * 0.3 * 0.7 ** 3, 15);
  });

  it('is uniform for shapes of 1, and a power for one shape of 1', () => {
    for (const x of [1e-300, 0.2, 0.5, 0.99]) {
      expect(relativeError(betaCdf(x, 1, 1), x)).toBeLessThan(1e-12);
      expect(relativeError(betaQuantile(x, 1, 1), x)).toBeLessThan(1e-12);
      expect(relativeError(betaCdf(x, 0.5, 1), Math.sqrt(x))).toBeLessThan(1e-12);
    }
  });

  it('has exact limits', () => {
    expect([-1, 0, 1, 2].map((x) => betaCdf(x, 2, 3))).toEqual([0, 0, 1, 1]);
    expect([-1, 0, 1, 2].map((x) => betaUpper(x, 2, 3))).toEqual([1, 1, 0, 0]);
    expect([0, 1].map((p) => betaQuantile(p, 2, 3))).toEqual([0, 1]);
    expect([0, 1].map((p) => betaUpperQuantile(p, 2, 3))).toEqual([1, 0]);
  });

  it('gives NaN for NaN, shapes that are not positive and finite, and probabilities outside 0 to 1', () => {
    for (const f of [betaCdf, betaUpper, betaQuantile, betaUpperQuantile]) {
      expect(f(Number.NaN, 2, 3)).toBeNaN();
      for (const shape of [Number.NaN, 0, -1, Infinity]) {
        expect(f(0.3, shape, 3)).toBeNaN();
        expect(f(0.3, 2, shape)).toBeNaN();
      }
    }
    for (const p of [-0.1, 1.1]) {
      expect(betaQuantile(p, 2, 3)).toBeNaN();
      expect(betaUpperQuantile(p, 2, 3)).toBeNaN();
    }
  });

  it('never falls as x rises, and turns round with its shapes', () => {
    const shape = fc.double({ min: -2, max: 5, noNaN: true }).map((power) => 10 ** power);
    const x = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(x, x, shape, shape, (one, other, a, b) => {
        const [low, high] = [Math.min(one, other), Math.max(one, other)];
        expect(betaCdf(high, a, b)).toBeGreaterThanOrEqual(betaCdf(low, a, b) * (1 - 1e-12));
        const mirror = Math.round(low * 1024) / 1024;
        expect(relativeError(betaUpper(1 - mirror, b, a) + 1, betaCdf(mirror, a, b) + 1)).toBeLessThan(1e-12);
      }),
      runs(5000),
    );
  });
});
