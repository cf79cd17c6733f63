import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, CalcError, curve, explain, type Outcome } from '../src/index.js';
import { requestsFor, runs } from './arbitrary-requests.js';
import { everyCombination, isComputed } from './combinations.js';
import { errorOf, withField } from './faults.js';
import { feasible } from './requests.js';
import { texValue } from './tex-value.js';

const aimed = ({ aim }: AppraisalRequest) => (aim as { power: number }).power;
const sized = (request: AppraisalRequest, units: number) =>
  feasible({ ...request, aim: { find: 'power', units } }).power;

/** The same request with more variation between participants, or with fewer events; none where it has no such figure. */
function noisier({ outcome, ...request }: AppraisalRequest): AppraisalRequest | undefined {
  const { design } = request;
  if (outcome.kind === 'continuous') return { ...request, outcome: { ...outcome, sd: 1.1 * outcome.sd } };
  if (outcome.kind === 'time-to-event') {
    return { ...request, outcome: { ...outcome, dropoutHazard: (outcome.dropoutHazard ?? 0) + 0.05 } };
  }
  if (design.family === 'cluster') {
    return outcome.kind === 'count'
      ? { ...request, outcome, design: { ...design, rateCv: (design.rateCv ?? 0) + 0.1 } }
      : design.clusterSize > 1
        ? { ...request, outcome, design: { ...design, icc: (design.icc ?? 0) + 0.05 } }
        : undefined;
  }
  if (outcome.kind === 'count') {
    return { ...request, outcome: { ...outcome, dispersion: (outcome.dispersion ?? 0) + 0.1 } };
  }
  return undefined;
}

/** The target, and how far it is from no effect on the scale it is tested on. */
function distanceOf(outcome: Outcome, target = targetOf(outcome)): number {
  if (outcome.kind === 'continuous') return Math.abs(target);
  if (outcome.kind === 'binary') return Math.abs(target - outcome.control);
  return Math.abs(Math.log(target));
}

function targetOf(outcome: Outcome): number {
  switch (outcome.kind) {
    case 'continuous':
      return outcome.difference;
    case 'binary':
      return outcome.active;
    case 'time-to-event':
      return outcome.hazardRatio;
    case 'count':
      return outcome.rateRatio;
    case 'ordinal':
      return outcome.oddsRatio;
  }
}

const sizedInClusters: readonly string[] = [
  'cluster',
  'cluster-baseline',
  'cluster-crossover',
  'stepped-wedge',
  'cluster-schedule',
];

/** The answer, or nothing where so few units cannot be analysed at all. */
function atLeast<T>(work: () => T): T | undefined {
  try {
    return work();
  } catch (error) {
    if (error instanceof CalcError && error.code === 'too-few-units') return undefined;
    throw error;
  }
}

/** Every path of a request that holds a number. */
function numbersIn(value: unknown, path: string[] = []): string[] {
  if (typeof value === 'number') return [path.join('.')];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => numbersIn(inner, [...path, key]));
}

const computed = everyCombination.filter(isComputed);

for (const combination of computed) {
  const { family, kind, hypothesis } = combination;
  // Each law is tried on a thousand requests of a family, shared out over what it combines with.
  const combinations = computed.filter((other) => other.family === family).length;
  const holds = (law: (request: AppraisalRequest) => void, count = 1000) =>
    fc.assert(fc.property(requestsFor(combination), law), runs(Math.ceil(count / combinations)));

  describe(`every ${family} request of ${hypothesis}, ${kind}`, { timeout: 120_000 }, () => {
    it('gets a size that reaches the aim, and none of the next sizes down does', () => {
      holds((request) => {
        const { units, power } = feasible(request);
        expect(power).toBeGreaterThanOrEqual(aimed(request));
        for (let less = units - 1; less >= Math.max(1, units - 8); less -= 1) {
          try {
            expect(sized(request, less)).toBeLessThan(aimed(request));
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

    it('has less power with more variation, or fewer events', () => {
      holds((request) => {
        const { units, power } = feasible(request);
        const worse = noisier(request);
        if (worse && power < 1 - 1e-9) expect(sized(worse, units)).toBeLessThan(power);
      });
    });

    it('gives the same appraisal after a trip through JSON', () => {
      holds((request) => {
        const appraisal = appraise(request);
        expect(appraise(JSON.parse(JSON.stringify(request)))).toEqual(appraisal);
        expect(JSON.parse(JSON.stringify(appraisal))).toEqual(appraisal);
      }, 300);
    });

    it('is refused at the path of any figure that is none, or is out of all bounds', () => {
      const wrong = fc.constantFrom(Number.NaN, Number.POSITIVE_INFINITY, 1e300, -1e300, '1', {}, true);
      fc.assert(
        fc.property(requestsFor(combination), wrong, fc.nat(), (request, value, which) => {
          const paths = numbersIn(request);
          const path = paths[which % paths.length] as string;
          const error = errorOf(withField(request, path, value));
          expect(error.code).toBe('schema');
          expect(error.path.startsWith(path), `${error.path} for ${path}`).toBe(true);
          expect(error.message.length).toBeGreaterThan(10);
        }),
        runs(Math.ceil(1000 / combinations)),
      );
    });

    if (hypothesis === 'superiority') {
      it('detects, at the size found, an effect no larger than its target', () => {
        holds((request) => {
          const { units } = feasible(request);
          const { detectable } = feasible({
            ...request,
            aim: { find: 'effect', units, power: aimed(request) },
          });
          const { outcome } = request;
          expect(distanceOf(outcome, detectable)).toBeLessThanOrEqual(distanceOf(outcome) * (1 + 1e-9));
        }, 300);
      });
    }

    if (sizedInClusters.includes(family)) {
      it('gets the smallest cluster size that reaches the aim, or the fewest clusters with which one would', () => {
        fc.assert(
          fc.property(requestsFor(combination), fc.integer({ min: 2, max: 60 }), (request, units) => {
            const power = aimed(request);
            const at = (count: number) =>
              appraise({ ...request, aim: { find: 'cluster-size', units: count, power } });
            const appraisal = atLeast(() => at(units));
            if (!appraisal) return;
            if (appraisal.feasible) {
              const { clusterSize } = appraisal as { clusterSize: number };
              const reached = (size: number) =>
                sized(
                  { ...request, design: { ...request.design, clusterSize: size } } as AppraisalRequest,
                  units,
                );
              expect(appraisal.power).toBeGreaterThanOrEqual(power);
              if (clusterSize > 1) expect(reached(clusterSize - 1)).toBeLessThan(power);
              return;
            }
            const { limitingPower, fewestUnits } = appraisal.infeasible;
            expect(limitingPower).toBeLessThanOrEqual(power);
            if (fewestUnits === undefined) return;
            expect(at(fewestUnits).feasible).toBe(true);
            expect(atLeast(() => at(fewestUnits - 1))?.feasible ?? false).toBe(false);
          }),
          runs(Math.ceil(300 / combinations)),
        );
      });
    }

    it('explains itself with the numbers of its appraisal', () => {
      holds((request) => {
        const { units, standardError, criticalValue, power } = feasible(request);
        const steps = explain(request);
        const values = steps.map((step) => step.value);
        for (const figure of [units, standardError, criticalValue, power]) expect(values).toContain(figure);
        for (const { substituted, value } of steps) {
          expect(Number.isFinite(value)).toBe(true);
          expect(substituted).not.toMatch(/--|\\times-|10\^\{-?\d+\}\^|NaN|undefined/);
        }
      }, 100);
    });

    it('has a working of which every line can be redone from the six digits it shows', () => {
      holds((request) => {
        for (const { label, substituted, value } of explain(request)) {
          const again = texValue(substituted);
          if (again === undefined) continue;
          const off = Math.abs(again - value);
          expect(off, `${label}: ${substituted} against ${value}`).toBeLessThanOrEqual(
            2e-4 + 1e-3 * Math.abs(value),
          );
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
