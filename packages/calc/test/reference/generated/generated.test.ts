import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise } from '../../../src/index.js';
import { expectClose } from '../../expect-close.js';
import cases from './cases.json' with { type: 'json' };

interface GeneratedCase {
  id: string;
  request: AppraisalRequest;
  expected: Record<string, number | number[]>;
}

describe('appraisals computed in base R by cases.R', () => {
  for (const { id, request, expected } of cases as unknown as GeneratedCase[]) {
    it(`agree for ${id}`, () => {
      const appraisal = appraise(request);
      const answers = {
        ...appraisal,
        ...(appraisal.feasible
          ? { perComparison: appraisal.comparisons.map((comparison) => comparison.power) }
          : { limitingPower: appraisal.infeasible.limitingPower }),
      } as unknown as Record<string, unknown>;
      for (const [field, value] of Object.entries(expected)) {
        expectClose(answers[field], value, 1e-9, `${id}: ${field}`);
      }
    });
  }

  it('cover every family of this version', () => {
    const families = new Set(
      (cases as unknown as GeneratedCase[]).map(({ request }) => request.design.family),
    );
    expect([...families].sort()).toEqual(['cluster', 'crossover', 'multi-arm', 'parallel']);
  });
});
