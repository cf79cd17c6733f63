import { describe, expect, it } from 'vitest';
import {
  deviance,
  differenceOfProducts,
  exponentialRemainder,
  logarithmRemainder,
} from '../../src/numeric/remainders.js';
import { expectWithin, referenceTable, relativeError } from '../distributions/reference-table.js';

describe('remainders', () => {
  const table = referenceTable('remainders');

  it('have e^u − 1 − u within 2e-15 of the exact values', () => {
    expectWithin(2e-15, table, ({ u = 0, exponential }) =>
      relativeError(exponentialRemainder(u), exponential),
    );
    expect(exponentialRemainder(0)).toBe(0);
  });

  it('have log(1 + u) − u within 2e-15 of the exact values', () => {
    const within = table.filter(({ u = 0 }) => u > -1);
    expectWithin(2e-15, within, ({ u = 0, logarithm }) => relativeError(logarithmRemainder(u), logarithm));
    expect(logarithmRemainder(0)).toBe(0);
  });

  it('have the deviance within 2e-15 of the exact values', () => {
    expectWithin(2e-15, referenceTable('deviance'), ({ k = 0, m = 0, deviance: exact }) =>
      relativeError(deviance(k, m), exact),
    );
    expect(deviance(3, 3)).toBe(0);
  });
});

describe('differenceOfProducts', () => {
  it('keeps the digits that rounding the products would lose', () => {
    // (2^27 + 1)² − 2^27·(2^27 + 2) is 1, and both products round to the same double.
    const power = 2 ** 27;
    expect(differenceOfProducts(power + 1, power + 1, power, power + 2)).toBe(1);
    expect(differenceOfProducts(3, 4, 5, 2)).toBe(2);
    expect(differenceOfProducts(0.1, 10, 1, 1)).toBe(2 ** -54);
  });
});
