import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findRoot } from '../../src/numeric/root.js';
import { runs } from '../arbitrary-requests.js';

describe('findRoot', () => {
  it('finds the root of smooth, steep, flat and stepped functions', () => {
    const cases: [(x: number) => number, number, number, number][] = [
      [(x) => x * x - 2, 0, 2, Math.SQRT2],
      [(x) => Math.exp(x) - 1e6, 0, 300, Math.log(1e6)],
      [(x) => (x - 0.3) ** 9, 0, 1, 0.3],
      [(x) => Math.atan(1e6 * (x - 7)), -100, 1000, 7],
      [(x) => (x < 1 / 3 ? -1 : 1), 0, 1, 1 / 3],
      [(x) => 1 / x - 1e-5, 1, 1e9, 1e5],
    ];
    for (const [f, lo, hi, exact] of cases) {
      const { root, converged } = findRoot(f, lo, hi, { tolerance: 1e-14 });
      expect(converged).toBe(true);
      // The ninth power is 0 within rounding over a wide range.
      expect(Math.abs(root - exact)).toBeLessThan(f(exact + 1e-9) === 0 ? 1e-9 : 2e-14 * Math.max(1, exact));
    }
  });

  it('needs few evaluations for a smooth function', () => {
    let evaluations = 0;
    const cosine = (x: number) => {
      evaluations += 1;
      return Math.cos(x) - x;
    };
    expect(findRoot(cosine, 0, 1, { tolerance: 1e-14 }).root).toBeCloseTo(0.7390851332151607, 14);
    expect(evaluations).toBeLessThanOrEqual(10);
  });

  it('takes known end values instead of evaluating them', () => {
    const seen: number[] = [];
    const f = (x: number) => {
      seen.push(x);
      return x - 0.25;
    };
    expect(findRoot(f, 0, 1, { atLo: -0.25, atHi: 0.75 }).root).toBeCloseTo(0.25, 12);
    expect(seen).not.toContain(0);
    expect(seen).not.toContain(1);
  });

  it('resolves small roots relative to themselves', () => {
    const { root } = findRoot((x) => x - 3e-5, 0, 1, { tolerance: 1e-12 });
    expect(Math.abs(root / 3e-5 - 1)).toBeLessThan(2e-12);
  });

  it('answers at once where an end is the root', () => {
    expect(findRoot((x) => x, 0, 1)).toEqual({ root: 0, converged: true, iterations: 0 });
    expect(findRoot((x) => x - 1, 0, 1)).toEqual({ root: 1, converged: true, iterations: 0 });
  });

  it('says so where there is no sign change, a NaN, or too little time', () => {
    expect(findRoot((x) => x * x + 1, -1, 1)).toEqual({ root: Number.NaN, converged: false, iterations: 0 });
    expect(findRoot(() => Number.NaN, -1, 1).converged).toBe(false);
    expect(findRoot((x) => (Math.abs(x) < 1 ? Number.NaN : x), -2, 2).converged).toBe(false);
    const stopped = findRoot((x) => x ** 3 - 2, 0, 100, { maxIterations: 3, tolerance: 1e-14 });
    expect(stopped).toMatchObject({ converged: false, iterations: 3 });
    expect(stopped.root).toBeGreaterThanOrEqual(0);
    expect(stopped.root).toBeLessThan(100);
  });

  it('gives the same root from either side', () => {
    const position = fc.double({ min: 0.001, max: 0.999, noNaN: true });
    fc.assert(
      fc.property(position, fc.double({ min: 0.1, max: 8, noNaN: true }), (at, power) => {
        const f = (x: number) => Math.sign(x - at) * Math.abs(x - at) ** power;
        const forward = findRoot(f, 0, 1, { tolerance: 1e-13, maxIterations: 200 });
        const backward = findRoot((x) => f(1 - x), 0, 1, { tolerance: 1e-13, maxIterations: 200 });
        expect(forward.converged && backward.converged).toBe(true);
        expect(Math.abs(forward.root - at)).toBeLessThan(1e-12);
        expect(Math.abs(1 - backward.root - at)).toBeLessThan(1e-12);
      }),
      runs(3000),
    );
  });
});
