import { describe, expect, it } from 'vitest';
import { maximum } from '../../src/numeric/maximum.js';

describe('the maximum of a function with one peak', () => {
  it.each([
    ['inside', (x: number) => x * Math.exp(-x), 0, 5, 1],
    ['at the lower end', (x: number) => -x, 0, 1, 0],
    ['at the upper end', (x: number) => x ** 3, -2, 3, 3],
  ])('is found %s', (_, f, lo, hi, peak) => {
    expect(Math.abs(maximum(f, lo, hi) - peak)).toBeLessThanOrEqual(1e-7);
  });
});
