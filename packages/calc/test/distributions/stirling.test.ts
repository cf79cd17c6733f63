import { describe, expect, it } from 'vitest';
import { stirlingError } from '../../src/distributions/stirling.js';
import { expectWithin, referenceTable } from './reference-table.js';

describe('stirlingError', () => {
  it('is within 5e-15 of the exact values', () => {
    expectWithin(5e-15, referenceTable('stirling'), ({ a = 0, error = 0 }) =>
      Math.abs(stirlingError(a) - error),
    );
  });

  it('gives NaN where there is no logarithm', () => {
    for (const a of [0, -1, Number.NaN]) expect(stirlingError(a)).toBeNaN();
  });
});
