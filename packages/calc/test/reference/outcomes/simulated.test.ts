import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise } from '../../../src/index.js';
import cases from './simulated.json' with { type: 'json' };

interface SimulatedCase {
  id: string;
  kind: 'power' | 'type I error';
  request: AppraisalRequest;
  rejections: number;
  simulations: number;
  departure: number;
  because: string;
}

const simulated = cases as unknown as SimulatedCase[];

function planned({ kind, request }: SimulatedCase): number {
  if (kind === 'type I error') return request.test.alpha / request.test.sides;
  const appraisal = appraise(request);
  if (!appraisal.feasible) throw new Error(appraisal.infeasible.message);
  return appraisal.power;
}

describe('trials simulated in R by simulated.R', () => {
  for (const each of simulated) {
    const { id, kind, rejections, simulations, departure, because } = each;
    const known = departure === 0 ? '' : `, but for up to ${departure} since ${because}`;
    it(`have the planned ${kind} within 4 standard errors for ${id}${known}`, () => {
      const expected = planned(each);
      const standardError = Math.sqrt((expected * (1 - expected)) / simulations);
      expect(Math.abs(rejections / simulations - expected)).toBeLessThanOrEqual(
        4 * standardError + departure,
      );
    });
  }

  it('cover every outcome and hypothesis', () => {
    const kinds = new Set(
      simulated.map(({ request: { outcome, test } }) => `${outcome.kind} ${test.hypothesis}`),
    );
    expect(kinds.size).toBe(13);
  });

  it('say why wherever a departure is allowed', () => {
    for (const { departure, because } of simulated) expect(because === '').toBe(departure === 0);
  });
});
