import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, CalcError, curve, explain, familyIds } from '../src/index.js';
import { requestsOf, runs } from './arbitrary-requests.js';
import { feasible } from './requests.js';

const sized = (request: AppraisalRequest, units: number) =>
  feasible({ ...request, aim: { find: 'power', units } }).power;

for (const family of familyIds) {
  const holds = (law: (request: AppraisalRequest) => void, count = 1000) =>
    fc.assert(fc.property(requestsOf(family), law), runs(count));

  describe(`every ${family} request`, () => {
    it('gets a size that reaches the aim, and none of the next sizes down does', () => {
      holds((request) => {
        const { units, power } = feasible(request);
        expect(power).toBeGreaterThanOrEqual((request.aim as { power: number }).power);
        for (let less = units - 1; less >= Math.max(1, units - 12); less -= 1) {
          try {
            expect(sized(request, less)).toBeLessThan((request.aim as { power: number }).power);
          } catch (error) {
            if (!(error instanceof CalcError) || error.code !== 'too-few-units') throw error;
          }
        }
      });
    });

    it('has more power at twice the size', () => {
      holds((request) => {
        const { units, power } = feasible(request);
        expect(sized(request, 2 * units)).toBeGreaterThanOrEqual(power - 1e-12);
      });
    });

    it('has less power with a larger SD', () => {
      holds((request) => {
        const { outcome } = request;
        if (outcome.kind !== 'continuous') return;
        const { units, power } = feasible(request);
        const noisier = { ...request, outcome: { ...outcome, sd: 1.1 * outcome.sd } };
        if (power < 1 - 1e-9) expect(sized(noisier, units)).toBeLessThan(power);
      });
    });

    it('gives the same appraisal after a trip through JSON', () => {
      holds((request) => {
        const appraisal = appraise(request);
        expect(appraise(JSON.parse(JSON.stringify(request)))).toEqual(appraisal);
        expect(JSON.parse(JSON.stringify(appraisal))).toEqual(appraisal);
      }, 300);
    });

    it('detects, at the size found, an effect no larger than its target', () => {
      holds((request) => {
        const { power } = request.aim as { power: number };
        const { units } = feasible(request);
        const { detectable } = feasible({ ...request, aim: { find: 'effect', units, power } });
        const [target, from] =
          request.outcome.kind === 'continuous'
            ? [request.outcome.difference, 0]
            : request.outcome.kind === 'binary'
              ? [request.outcome.active, request.outcome.control]
              : [Number.NaN, Number.NaN];
        expect(Math.abs((detectable as number) - from)).toBeLessThanOrEqual(
          Math.abs(target - from) * (1 + 1e-9),
        );
      }, 300);
    });

    it('explains itself with the numbers of its appraisal', () => {
      holds((request) => {
        const appraisal = feasible(request);
        const values = explain(request).map((step) => step.value);
        for (const figure of [
          appraisal.units,
          appraisal.standardError,
          appraisal.criticalValue,
          appraisal.power,
        ]) {
          expect(values).toContain(figure);
        }
        for (const { substituted, value } of explain(request)) {
          expect(Number.isFinite(value)).toBe(true);
          expect(substituted).not.toMatch(/--|\\times-|10\^\{-?\d+\}\^/);
        }
      }, 100);
    });

    it('has a curve through its appraisal', () => {
      holds((request) => {
        const { units, power, participants } = feasible(request);
        const [point] = curve(request, { over: 'units', from: units, to: units, points: 2 });
        expect(point).toMatchObject({ size: units, power, participants });
      }, 100);
    });
  });
}

describe('a cluster design with an ICC of 0', () => {
  it('has the standard error of as many individually randomised participants', () => {
    fc.assert(
      fc.property(requestsOf('cluster'), (request) => {
        const { design } = request;
        if (design.family !== 'cluster' || request.outcome.kind !== 'continuous') return;
        const clustered = feasible({ ...request, design: { ...design, icc: 0, allocation: [1, 1] } });
        const individual = feasible({
          ...request,
          design: { family: 'parallel' },
          aim: { find: 'power', units: clustered.participants / 2 },
        });
        expect(clustered.standardError).toBeCloseTo(individual.standardError, 12);
      }),
      runs(300),
    );
  });
});
