import { describe, expect, it } from 'vitest';
import { eventProbability, hazardOf } from '../../src/outcomes/time-to-event.js';
import { referenceTable } from '../reference/outcomes/reference-table.js';

describe('the chance that an event is seen', () => {
  it('agrees with integration over entry times within a relative 1e-14', () => {
    const table = referenceTable<'hazard' | 'accrual' | 'followUp' | 'dropoutHazard' | 'chance'>(
      'event-probability',
    );
    expect(table.length).toBeGreaterThan(300);
    for (const row of table) {
      const found = eventProbability(row.hazard, row.accrual, row.followUp, row.dropoutHazard);
      expect(Math.abs(found / row.chance - 1), JSON.stringify(row)).toBeLessThanOrEqual(1e-14);
    }
  });

  it('tends to the one without accrual as accrual becomes short', () => {
    const without = eventProbability(0.03, 0, 12, 0.01);
    expect(eventProbability(0.03, 1e-9, 12, 0.01)).toBeCloseTo(without, 10);
    expect(eventProbability(0.03, Number.MIN_VALUE, 12, 0.01)).toBe(without);
  });

  it('is 0 without a hazard, λ/(λ + η) in the end, and NaN for NaN', () => {
    expect(eventProbability(0, 12, 12, 0)).toBe(0);
    expect(eventProbability(0.03, 0, 1e12, 0.01)).toBeCloseTo(0.75, 15);
    expect(eventProbability(Number.NaN, 12, 12)).toBeNaN();
  });

  it('comes from a hazard that gives the survival stated', () => {
    expect(hazardOf({ at: 12, probability: Math.exp(-0.36) })).toBeCloseTo(0.03, 15);
  });
});
