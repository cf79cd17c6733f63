import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, cheapest, mostPower, type SearchPlan } from '../../../src/index.js';
import cases from './enumerated.json' with { type: 'json' };

interface EnumeratedCase {
  id: string;
  request: AppraisalRequest;
  search: SearchPlan;
  cheapest: { cost: number; recruited: number };
  budget: number;
  mostPower: number;
}

describe('the best designs, found by enumeration in base R', () => {
  for (const { id, request, search, budget, ...expected } of cases as unknown as EnumeratedCase[]) {
    it(`cost as little as the cheapest: ${id}`, () => {
      const best = cheapest(request, search);
      if (!best.found) throw new Error(best.message);
      const { costs, recruited } = best.appraisal;
      expect((costs?.total as number) / expected.cheapest.cost).toBeCloseTo(1, 12);
      expect(recruited).toBe(expected.cheapest.recruited);
      expect(best.proven).toBe(true);
    });

    it(`have as much power as any within the budget: ${id}`, () => {
      const best = mostPower(request, { ...search, within: { money: budget } });
      if (!best.found) throw new Error(best.message);
      expect(best.appraisal.power).toBeCloseTo(expected.mostPower, 9);
      expect(best.appraisal.costs?.total).toBeLessThanOrEqual(budget * (1 + 1e-9));
      expect(best.proven).toBe(true);
    });
  }
});
