import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expectation, factorGrid, upperHalf } from '../../src/distributions/one-factor-grid.js';
import { scaleGrid } from '../../src/distributions/one-factor-scale.js';
import { runs } from '../arbitrary-requests.js';

const sharpness = fc.record({
  largestLimit: fc.double({ min: 0.1, max: 3, noNaN: true }).map((power) => 10 ** power),
  smallestLimit: fc.constant(0.1),
  noncentralities: fc.array(fc.double({ min: 0, max: 500, noNaN: true }), { maxLength: 4 }),
  precision: fc.double({ min: 1, max: 20, noNaN: true }),
});
const degrees = fc.double({ min: 0, max: 10, noNaN: true }).map((power) => 10 ** power);

describe('the grid over a shared scale', () => {
  it('holds the whole distribution, and a mean square of 1, for any df and sharpness', () => {
    fc.assert(
      fc.property(degrees, sharpness, (df, sharp) => {
        const { nodes, weights } = scaleGrid(df, sharp);
        const moment = (power: number) =>
          nodes.reduce((sum, s, index) => sum + (weights[index] as number) * s ** power, 0);
        expect(Math.abs(moment(0) - 1)).toBeLessThan(1e-12);
        expect(Math.abs(moment(2) - 1)).toBeLessThan(1e-12);
        expect(nodes.length).toBeLessThan(3000);
      }),
      runs(3000),
    );
  });

  it('is the one node 1 where the scale is known', () => {
    const known = { largestLimit: 2, smallestLimit: 2, noncentralities: [], precision: 1 };
    const { nodes, weights } = scaleGrid(Infinity, known);
    expect([...nodes, ...weights]).toEqual([1, 1]);
  });
});

describe('the grid over a shared normal value', () => {
  const one = { nodes: Float64Array.of(1), weights: Float64Array.of(1) };

  it('holds the whole distribution, a variance of 1 and a fourth moment of 3', () => {
    for (const loadings of [[0.1], [0.7, -0.7], [0.9995, 0.9995], [0.999999]]) {
      const moment = (power: number) => expectation(factorGrid(loadings), one, (z) => z ** power);
      expect(moment(0)).toBeCloseTo(1, 12);
      expect(moment(1)).toBeCloseTo(0, 12);
      expect(moment(2)).toBeCloseTo(1, 10);
      expect(moment(4)).toBeCloseTo(3, 8);
    }
  });

  it('is the same by halves for what is alike at z and −z', () => {
    const whole = factorGrid([0.6, 0.8]);
    const at = (z: number) => Math.exp(-(Math.abs(z) ** 3));
    expect(expectation(upperHalf(whole), one, at)).toBeCloseTo(expectation(whole, one, at), 13);
  });
});
