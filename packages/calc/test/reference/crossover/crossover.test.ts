import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, explain } from '../../../src/index.js';
import { expectClose } from '../../expect-close.js';
import { texValue } from '../../tex-value.js';
import cases from './cases.json' with { type: 'json' };

interface GeneratedCase {
  id: string;
  request: AppraisalRequest;
  expected: Record<string, number | number[]>;
}

const all = cases as unknown as GeneratedCase[];

describe('crossovers computed in base R by cases.R', () => {
  for (const { id, request, expected } of all) {
    it(`agree for ${id}`, () => {
      const appraisal = appraise(request);
      if (!appraisal.feasible) throw new Error(appraisal.infeasible.message);
      const answers: Record<string, unknown> = {
        ...appraisal,
        exposures: appraisal.arms.map((arm) => arm.exposures),
        perComparison: appraisal.comparisons.map((comparison) => comparison.power),
      };
      for (const [field, value] of Object.entries(expected)) {
        expectClose(answers[field], value, 1e-9, `${id}: ${field}`);
      }
    });
  }

  it('have a working of which every line can be redone from the numbers it shows', () => {
    let redone = 0;
    for (const { id, request } of all) {
      for (const { label, substituted, value } of explain(request)) {
        const again = texValue(substituted);
        if (again === undefined) continue;
        redone += 1;
        // Six digits are shown.
        expect(Math.abs(again - value), `${id}: ${label}: ${substituted}`).toBeLessThanOrEqual(
          2e-5 + 1e-4 * Math.abs(value),
        );
      }
    }
    expect(redone).toBeGreaterThan(500);
  });

  it('cover many sequences, with and without carryover, and every hypothesis', () => {
    const designs = all.map(({ request }) => request.design as unknown as Record<string, unknown>);
    expect(new Set(designs.map(({ sequences }) => String(sequences))).size).toBeGreaterThanOrEqual(20);
    expect(designs.filter(({ carryover }) => carryover).length).toBeGreaterThanOrEqual(15);
    expect(designs.filter(({ comparisons }) => comparisons).length).toBeGreaterThanOrEqual(15);
    expect(new Set(all.map(({ request }) => `${request.outcome.kind} ${request.test.hypothesis}`)).size).toBe(
      4,
    );
  });
});
