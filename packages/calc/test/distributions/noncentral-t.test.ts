import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { noncentralityFor, noncentralTCdf, noncentralTUpper } from '../../src/distributions/noncentral-t.js';
import { sharpUpper } from '../../src/distributions/noncentral-t-limit.js';
import { normalUpper, normalUpperQuantile } from '../../src/distributions/normal.js';
import { studentTUpper, studentTUpperQuantile } from '../../src/distributions/student-t.js';
import { runs } from '../arbitrary-requests.js';
import { expectWithin, referenceTable, relativeError } from './reference-table.js';

const degrees = fc.double({ min: -1, max: 9, noNaN: true }).map((power) => 10 ** power);
const point = fc.double({ min: -40, max: 40, noNaN: true });

describe('the noncentral t distribution', () => {
  const tails = referenceTable('noncentral-t');
  const solved = referenceTable('noncentrality');

  it('has both tails within 2e-12 of the exact values', () => {
    expectWithin(2e-12, tails, ({ x = 0, df = 0, ncp = 0, lower = 0 }) =>
      Math.abs(noncentralTCdf(x, df, ncp) - lower),
    );
    expectWithin(2e-12, tails, ({ x = 0, df = 0, ncp = 0, upper = 0 }) =>
      Math.abs(noncentralTUpper(x, df, ncp) - upper),
    );
  });

  it('has both tails within a relative 1e-10 down to 1e-20', () => {
    const lowers = tails.filter(({ lower = 0 }) => lower >= 1e-20);
    const uppers = tails.filter(({ upper = 0 }) => upper >= 1e-20);
    expectWithin(1e-10, lowers, ({ x = 0, df = 0, ncp = 0, lower }) =>
      relativeError(noncentralTCdf(x, df, ncp), lower),
    );
    expectWithin(1e-10, uppers, ({ x = 0, df = 0, ncp = 0, upper }) =>
      relativeError(noncentralTUpper(x, df, ncp), upper),
    );
  });

  it('finds the noncentrality for a power within 1e-11 of the exact values', () => {
    expectWithin(
      1e-11,
      solved,
      ({ power = 0, x = 0, df = 0, ncp = 0 }) =>
        Math.abs(noncentralityFor(power, x, df) - ncp) / Math.max(1, Math.abs(ncp)),
    );
  });

  it('is the central t without noncentrality', () => {
    fc.assert(
      fc.property(point, degrees, (x, df) => {
        const central = studentTUpper(x, df);
        if (central > 1e-20) expect(relativeError(noncentralTUpper(x, df, 0), central)).toBeLessThan(1e-10);
      }),
      runs(3000),
    );
  });

  it('is a shifted normal on infinite degrees of freedom', () => {
    expect(noncentralTUpper(1.96, Infinity, 2.8)).toBe(normalUpper(1.96 - 2.8));
    expect(noncentralityFor(0.8, 1.96, Infinity)).toBeCloseTo(1.96 - normalUpperQuantile(0.8), 14);
    expect(relativeError(noncentralTUpper(1.96, 1e18, 2.8), normalUpper(1.96 - 2.8))).toBeLessThan(1e-12);
  });

  it('does not depend on the degrees of freedom at 0', () => {
    for (const df of [0.3, 12, 1e8]) expect(noncentralTUpper(0, df, 1.2)).toBe(normalUpper(-1.2));
  });

  it('has exact limits', () => {
    for (const ncp of [-3, 0, 3]) {
      expect([-Infinity, Infinity].map((x) => noncentralTCdf(x, 9, ncp))).toEqual([0, 1]);
      expect([-Infinity, Infinity].map((x) => noncentralTUpper(x, 9, ncp))).toEqual([1, 0]);
    }
    expect([0, 1].map((power) => noncentralityFor(power, 2, 9))).toEqual([-Infinity, Infinity]);
    expect(noncentralTUpper(2, 9, 60)).toBeCloseTo(1, 12);
    expect(noncentralTUpper(60, 1e6, -10)).toBe(0);
    expect([-1e200, 1e200].map((ncp) => noncentralTUpper(2, 9, ncp))).toEqual([0, 1]);
  });

  it('gives NaN for NaN, df of 0 or less, an infinite noncentrality, and powers outside 0 to 1', () => {
    for (const f of [noncentralTCdf, noncentralTUpper]) {
      for (const [x, df, ncp] of [
        [Number.NaN, 9, 1],
        [2, Number.NaN, 1],
        [2, 9, Number.NaN],
        [2, 0, 1],
        [2, -1, 1],
        [2, 9, Infinity],
      ] as const) {
        expect(f(x, df, ncp)).toBeNaN();
      }
    }
    for (const [power, x, df] of [
      [Number.NaN, 2, 9],
      [-0.1, 2, 9],
      [1.1, 2, 9],
      [0.8, Number.NaN, 9],
      [0.8, Infinity, 9],
      [0.8, 2, 0],
      [0.8, 2, Number.NaN],
    ] as const) {
      expect(noncentralityFor(power, x, df)).toBeNaN();
    }
  });

  it('adds up to 1, turns round with its sign, and rises with the noncentrality', () => {
    fc.assert(
      fc.property(
        point,
        degrees,
        point,
        fc.double({ min: 0.01, max: 3, noNaN: true }),
        (x, df, ncp, more) => {
          const upper = noncentralTUpper(x, df, ncp);
          expect(Math.abs(upper + noncentralTCdf(x, df, ncp) - 1)).toBeLessThan(4e-12);
          expect(noncentralTCdf(-x, df, -ncp)).toBe(upper);
          expect(noncentralTUpper(x, df, ncp + more)).toBeGreaterThanOrEqual(upper * (1 - 1e-10));
        },
      ),
      runs(2000),
    );
  });

  it('finds a noncentrality that has the power asked for', () => {
    const level = fc.double({ min: 1e-3, max: 0.4, noNaN: true });
    const aim = fc.double({ min: 1e-4, max: 0.9999, noNaN: true });
    const realDegrees = fc.double({ min: 0, max: 9, noNaN: true }).map((power) => 10 ** power);
    fc.assert(
      fc.property(aim, level, realDegrees, (power, alpha, df) => {
        const x = studentTUpperQuantile(alpha, df);
        expect(Math.abs(noncentralTUpper(x, df, noncentralityFor(power, x, df)) - power)).toBeLessThan(4e-12);
      }),
      runs(2000),
    );
  });
});

describe('a noncentrality so large that the normal part is sharp', () => {
  it('gives the limit what the trapezoid rule gives where the two meet', () => {
    for (const df of [0.5, 1, 2, 5, 30, 200]) {
      const edge = 199 * Math.sqrt(Math.max(1, df));
      for (const share of [0.3, 0.8, 0.95, 1, 1.05, 1.3, 3]) {
        const x = edge / share;
        expect(Math.abs(noncentralTUpper(x, df, edge) - sharpUpper(x, df, edge))).toBeLessThan(1e-11);
      }
    }
  });

  it('is found again from its power', () => {
    for (const [power, x, df] of [
      [0.8, 1e9, 1],
      [0.8, 3e14, 2],
      [0.3, 1e4, 1],
      [0.999, 300, 1],
      [1e-3, 1e6, 2],
      [0.8, 5000, 100],
    ] as const) {
      expect(noncentralTUpper(x, df, noncentralityFor(power, x, df))).toBeCloseTo(power, 11);
    }
  });
});
