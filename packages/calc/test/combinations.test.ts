import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { appraise, CalcError, familyIds } from '../src/index.js';
import { requestsFor, runs } from './arbitrary-requests.js';
import { combinations, everyCombination, isComputed } from './combinations.js';

describe('the table of what combines with what', () => {
  it('names every family', () => {
    expect(Object.keys(combinations).sort()).toEqual([...familyIds].sort());
  });

  for (const combination of everyCombination) {
    const { family, kind, hypothesis } = combination;
    if (isComputed(combination)) {
      it(`has no false entry: ${family}, ${kind}, ${hypothesis} is computed`, () => {
        fc.assert(
          fc.property(requestsFor(combination), (request) => {
            const appraisal = appraise(request);
            if (!appraisal.feasible) throw new Error(appraisal.infeasible.message);
            expect(appraisal.power).toBeGreaterThanOrEqual((request.aim as { power: number }).power);
          }),
          runs(100),
        );
      });
    } else {
      it(`has no false gap: ${family}, ${kind}, ${hypothesis} is refused, with the reason`, () => {
        fc.assert(
          fc.property(requestsFor(combination), (request) => {
            try {
              appraise(request);
            } catch (error) {
              expect(error).toBeInstanceOf(CalcError);
              const { code, path, message } = error as CalcError;
              expect([code, message.endsWith('.')]).toEqual(['unsupported', true]);
              expect(path).toMatch(/^(outcome|test|design)\./);
              return;
            }
            throw new Error('this should not be computed');
          }),
          runs(100),
        );
      });
    }
  }
});
