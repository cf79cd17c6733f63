import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  normalCdf,
  normalDensity,
  normalQuantile,
  normalUpper,
  normalUpperQuantile,
} from '../../src/distributions/normal.js';
import { runs } from '../arbitrary-requests.js';
import { expectWithin, referenceTable, relativeError } from './reference-table.js';

describe('the normal distribution', () => {
  const tails = referenceTable('normal');
  const quantiles = referenceTable('normal-quantile');

  it('has both tails within 2e-15 of the exact values', () => {
    expectWithin(2e-15, tails, ({ x = 0, lower }) => relativeError(normalCdf(x), lower));
    expectWithin(2e-15, tails, ({ x = 0, upper }) => relativeError(normalUpper(x), upper));
  });

  it('has quantiles within 1e-15 of the exact values', () => {
    expectWithin(1e-15, quantiles, ({ p = 0, upperQuantile }) =>
      relativeError(normalUpperQuantile(p), upperQuantile),
    );
    expectWithin(1e-15, quantiles, ({ p = 0, upperQuantile = 0 }) =>
      relativeError(normalQuantile(p), -upperQuantile),
    );
  });

  it('has the density that its tails imply', () => {
    expect(normalDensity(0)).toBeCloseTo(1 / Math.sqrt(2 * Math.PI), 15);
    for (const x of [-3, -0.4, 1, 6]) {
      const step = 1e-5;
      const slope = (normalUpper(x - step) - normalUpper(x + step)) / (2 * step);
      expect(relativeError(normalDensity(x), slope)).toBeLessThan(1e-8);
    }
  });

  it('has exact limits', () => {
    expect([normalCdf(-Infinity), normalCdf(0), normalCdf(Infinity)]).toEqual([0, 0.5, 1]);
    expect([normalUpper(-Infinity), normalUpper(0), normalUpper(Infinity)]).toEqual([1, 0.5, 0]);
    expect([normalQuantile(0), normalQuantile(0.5), normalQuantile(1)]).toEqual([-Infinity, 0, Infinity]);
    expect([normalUpperQuantile(0), normalUpperQuantile(0.5), normalUpperQuantile(1)]).toEqual([
      Infinity,
      0,
      -Infinity,
    ]);
    expect([normalDensity(-Infinity), normalDensity(Infinity)]).toEqual([0, 0]);
  });

  it('gives NaN for NaN and for probabilities outside 0 to 1', () => {
    for (const f of [normalCdf, normalUpper, normalDensity, normalQuantile, normalUpperQuantile]) {
      expect(f(Number.NaN)).toBeNaN();
    }
    for (const p of [-0.1, 1.1, -Infinity, Infinity]) {
      expect(normalQuantile(p)).toBeNaN();
      expect(normalUpperQuantile(p)).toBeNaN();
    }
  });

  it('never falls as x rises', () => {
    const x = fc.double({ min: -40, max: 40, noNaN: true });
    fc.assert(
      fc.property(x, fc.double({ min: 1e-3, max: 5, noNaN: true }), (from, step) => {
        expect(normalCdf(from + step)).toBeGreaterThanOrEqual(normalCdf(from));
        expect(normalUpper(from + step)).toBeLessThanOrEqual(normalUpper(from));
      }),
      runs(5000),
    );
  });
});
