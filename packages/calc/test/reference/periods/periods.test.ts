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

function answers(request: AppraisalRequest): Record<string, unknown> {
  const appraisal = appraise(request);
  return appraisal.feasible
    ? { ...appraisal, exposures: appraisal.arms.map((arm) => arm.exposures) }
    : { ...appraisal.infeasible };
}

describe('designs over cluster periods computed in base R by cases.R', () => {
  for (const { id, request, expected } of all) {
    it(`agree for ${id}, ${request.design.family}`, () => {
      const answer = answers(request);
      for (const [field, value] of Object.entries(expected)) {
        expectClose(answer[field], value, 1e-9, `${id}: ${field}`);
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
    expect(redone).toBeGreaterThan(1500);
  });

  it('cover each family, hypothesis and corner', () => {
    const designs = all.map(({ request }) => request.design as unknown as Record<string, unknown>);
    const having = (holds: (design: Record<string, unknown>) => boolean) => designs.filter(holds).length;
    for (const family of ['cluster-baseline', 'cluster-crossover', 'stepped-wedge', 'cluster-schedule']) {
      expect(having((design) => design.family === family)).toBeGreaterThanOrEqual(15);
    }
    const corners: ((design: Record<string, unknown>) => boolean)[] = [
      ({ icc }) => icc === 0,
      ({ icc }) => icc === 0.3,
      ({ cac }) => cac === 1,
      ({ cac }) => cac === 0.2,
      ({ cac }) => cac === 0,
      ({ decay }) => decay === true,
      ({ iac }) => iac === 0.9,
      ({ clusterSize }) => clusterSize === 1,
      ({ clusterSize }) => clusterSize === 5000,
      ({ clusterSizeCv }) => clusterSizeCv === 1,
      ({ allocation }) => allocation !== undefined,
      ({ transitionPeriods }) => transitionPeriods !== undefined,
      ({ schedule }) => JSON.stringify(schedule ?? []).includes('null'),
    ];
    for (const corner of corners) expect(having(corner)).toBeGreaterThanOrEqual(3);
    expect(all.some(({ expected }) => expected.df === 2)).toBe(true);
    expect(all.some(({ request }) => request.test.alpha === 0.001)).toBe(true);
    expect(new Set(all.map(({ request }) => `${request.outcome.kind} ${request.test.hypothesis}`)).size).toBe(
      5,
    );
    expect(new Set(all.map(({ request }) => request.aim.find)).size).toBe(4);
  });
});
