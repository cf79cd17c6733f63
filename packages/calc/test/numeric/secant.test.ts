import { describe, expect, it } from 'vitest';
import { secantRoot } from '../../src/numeric/secant.js';

describe('the secant method', () => {
  it('finds √2 from close by, whatever the slope it starts with', () => {
    for (const slope of [2.8, 3, 5]) {
      expect(secantRoot((x) => x * x - 2, 1.41, slope, 1e-14)).toBeCloseTo(Math.SQRT2, 14);
    }
  });

  it('takes a start that is the root', () => {
    expect(secantRoot((x) => x - 3, 3, 1, 1e-12)).toBe(3);
  });

  it('gives nothing where the function has no value or no root', () => {
    expect(secantRoot(() => Number.NaN, 1, 1, 1e-12)).toBeUndefined();
    expect(secantRoot((x) => x * x + 1, 1, 2, 1e-12)).toBeUndefined();
  });
});
