import { describe, expect, it } from 'vitest';
import { type Appraisal, type AppraisalRequest, appraise } from '../../../src/index.js';
import { expectClose } from '../../expect-close.js';
import cases from './cases.json' with { type: 'json' };
import costs from './costs.json' with { type: 'json' };

/** Values from an independent implementation in R. */
interface ReferenceCase {
  id: string;
  request: AppraisalRequest;
  expected: Record<string, unknown>;
  tolerance: number;
}

function answerTo(field: string, appraisal: Appraisal): unknown {
  if (field === 'limitingPower') return appraisal.feasible ? undefined : appraisal.infeasible.limitingPower;
  if (field === 'perComparison') {
    return appraisal.feasible ? appraisal.comparisons.map((comparison) => comparison.power) : undefined;
  }
  return (appraisal as unknown as Record<string, unknown>)[field];
}

describe('the reference values of the contract', () => {
  for (const { id, request, expected, tolerance } of cases as unknown as ReferenceCase[]) {
    it(`reproduces ${id}`, () => {
      const appraisal = appraise(request);
      for (const [field, value] of Object.entries(expected)) {
        expectClose(answerTo(field, appraisal), value, tolerance, field);
      }
    });
  }
});

interface CostCase {
  id: string;
  request: AppraisalRequest;
  expected: { total: number; months: number; arms: object[] } & Record<string, unknown>;
}

describe('the reference values of money, months and recruitment', () => {
  for (const { id, request, expected } of costs as unknown as CostCase[]) {
    it(`reproduces ${id}`, () => {
      const appraisal = appraise(request);
      if (!appraisal.feasible) throw new Error('expected an answer');
      const { total, months, arms, ...counts } = expected;
      expectClose(appraisal.costs?.total, total, total * 1e-6, 'total');
      expectClose(appraisal.timeline?.months, months, months * 1e-6, 'months');
      arms.forEach((arm, index) => {
        for (const [field, value] of Object.entries(arm) as [string, number][]) {
          const answer = appraisal.costs?.arms[index] as unknown as Record<string, number>;
          expectClose(answer[field], value, Math.max(1, value) * 1e-6, `arms.${index}.${field}`);
        }
      });
      for (const [field, value] of Object.entries(counts)) {
        expect(answerTo(field, appraisal), field).toBe(value);
      }
      const lines = appraisal.costs?.lines.reduce((sum, line) => sum + line.amount, 0);
      expectClose(lines, total, total * 1e-9, 'sum of lines');
    });
  }
});
