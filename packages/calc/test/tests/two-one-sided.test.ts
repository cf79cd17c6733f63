import { describe, expect, it } from 'vitest';
import { twoOneSidedPower } from '../../src/tests/two-one-sided.js';
import { referenceTable } from '../reference/outcomes/reference-table.js';

describe('the power of two one-sided tests', () => {
  it('agrees with the exact integral within 1e-13, from 1 df to 4e7 and without', () => {
    const table = referenceTable<'effect' | 'standardError' | 'df' | 'critical' | 'margin' | 'power'>(
      'two-one-sided',
    );
    expect(table.length).toBeGreaterThan(250);
    for (const row of table) {
      const { effect, standardError, df, critical, margin, power } = row;
      const found = twoOneSidedPower(effect, standardError, df || null, critical, margin);
      expect(Math.abs(found - power), JSON.stringify(row)).toBeLessThanOrEqual(1e-13);
    }
  });

  it('does not depend on the sign of the effect, nor on the scale of measurement', () => {
    const power = twoOneSidedPower(1, 0.8, 11, 1.8, 3);
    expect(twoOneSidedPower(-1, 0.8, 11, 1.8, 3)).toBe(power);
    expect(twoOneSidedPower(8, 6.4, 11, 1.8, 24)).toBeCloseTo(power, 14);
  });

  it('is certain without error within the margin, and impossible beyond', () => {
    expect(twoOneSidedPower(1, 0, 10, 1.8, 3)).toBe(1);
    expect(twoOneSidedPower(3, 0, null, 1.8, 3)).toBe(0);
  });

  it('gives NaN for NaN and for what is no standard error or df', () => {
    expect(twoOneSidedPower(Number.NaN, 1, 10, 1.8, 3)).toBeNaN();
    expect(twoOneSidedPower(0, -1, 10, 1.8, 3)).toBeNaN();
    expect(twoOneSidedPower(0, 1, 0, 1.8, 3)).toBeNaN();
    expect(twoOneSidedPower(0, 1, 10, Number.NaN, 3)).toBeNaN();
    expect(twoOneSidedPower(0, 1, null, 1.8, Number.NaN)).toBeNaN();
  });
});
