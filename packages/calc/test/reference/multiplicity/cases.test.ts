import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise } from '../../../src/index.js';
import { expectClose } from '../../expect-close.js';
import cases from './cases.json' with { type: 'json' };

interface GeneratedCase {
  id: string;
  request: AppraisalRequest;
  expected: Record<string, number | number[]>;
}

const all = cases as unknown as GeneratedCase[];

describe('appraisals of several comparisons computed in base R by cases.R', () => {
  for (const { id, request, expected } of all) {
    it(`agree for ${id}`, () => {
      const appraisal = appraise(request);
      if (!appraisal.feasible) throw new Error(appraisal.infeasible.message);
      const answers = {
        ...appraisal,
        perComparison: appraisal.comparisons.map((comparison) => comparison.power),
      } as unknown as Record<string, unknown>;
      for (const [field, value] of Object.entries(expected)) {
        expectClose(answers[field], value, 1e-9, `${id}: ${field}`);
      }
    });
  }

  it('cover every adjustment with every goal, on participants and on clusters', () => {
    const combined = new Set(
      all.map(({ request: { design } }) => {
        if (design.family !== 'multi-arm' && design.family !== 'cluster') throw new Error(design.family);
        return `${design.family} ${design.comparisons?.adjust} ${design.comparisons?.powerGoal}`;
      }),
    );
    expect(combined.size).toBe(2 * 5 * 3);
  });
});
