import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, explain } from '../../../src/index.js';
import { expectClose } from '../../expect-close.js';
import { texValue } from '../../tex-value.js';
import cases from './cases.json' with { type: 'json' };

interface GeneratedCase {
  id: string;
  request: AppraisalRequest;
  expected: Record<string, number | string>;
}

const generated = cases as unknown as GeneratedCase[];

describe('appraisals of every outcome and hypothesis, computed in base R by cases.R', () => {
  for (const { id, request, expected } of generated) {
    it(`agree for ${id}`, () => {
      const appraisal = appraise(request);
      const answers: Record<string, unknown> = appraisal.feasible
        ? { ...appraisal }
        : { ...appraisal.infeasible };
      for (const [field, value] of Object.entries(expected)) {
        expectClose(answers[field], value, 1e-9, `${id}: ${field}`);
      }
    });
  }

  it('have a working of which every line can be redone from the numbers it shows', () => {
    let redone = 0;
    for (const { id, request } of generated) {
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
    expect(redone).toBeGreaterThan(1500);
  });

  it('cover every outcome and hypothesis of two parallel arms, and rates and margins in clusters', () => {
    const kinds = new Set(
      generated.map(
        ({ request: { design, outcome, test } }) => `${design.family} ${outcome.kind} ${test.hypothesis}`,
      ),
    );
    const everyHypothesis = ['superiority', 'non-inferiority', 'equivalence'];
    const expected = [
      ...['time-to-event', 'count', 'ordinal'].flatMap((kind) =>
        everyHypothesis.map((hypothesis) => `parallel ${kind} ${hypothesis}`),
      ),
      ...['continuous', 'binary'].flatMap((kind) =>
        everyHypothesis.slice(1).map((hypothesis) => `parallel ${kind} ${hypothesis}`),
      ),
      'cluster continuous non-inferiority',
      'cluster continuous equivalence',
      'cluster binary non-inferiority',
      'cluster count superiority',
    ];
    expect([...kinds].sort()).toEqual(expected.sort());
  });
});
