import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, CalcError, explain } from '../../src/index.js';
import { runs } from '../arbitrary-requests.js';
import { feasible } from '../requests.js';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const hypotheses = fc.constantFrom('superiority', 'non-inferiority', 'equivalence');
const better = fc.constantFrom('higher', 'lower');
const alphas = fc.constantFrom(0.001, 0.01, 0.025, 0.05, 0.1);
const share = real(0.3, 3);

/** Farther from 1 for superiority than against a margin. */
const logRatio = fc.record({ far: real(0.1, 1.2), near: real(-0.1, 0.1), up: fc.boolean() });

const outcomeOf = {
  'time-to-event': fc.record({
    at: real(1, 60),
    probability: real(0.05, 0.97),
    accrual: fc.oneof(fc.constant(0), real(0.1, 40)),
    followUp: real(0.1, 60),
    dropoutHazard: fc.option(real(0, 0.1), { nil: undefined }),
    method: fc.constantFrom(undefined, 'schoenfeld', 'freedman'),
  }),
  count: fc.record({
    controlRate: real(0.02, 10),
    exposure: real(0.2, 4),
    dispersion: fc.option(real(0, 2), { nil: undefined }),
  }),
  ordinal: fc
    .array(real(0.05, 1), { minLength: 2, maxLength: 8 })
    .map((weights) => ({ weights, total: weights.reduce((sum, weight) => sum + weight, 0) })),
  continuous: fc.record({ sd: real(0.5, 4), sdActive: fc.option(real(0.5, 4), { nil: undefined }) }),
  binary: fc.record({ control: real(0.1, 0.9) }),
};

type Kind = keyof typeof outcomeOf;
const kinds = Object.keys(outcomeOf) as Kind[];

/** Requests of two parallel arms that have an answer, with an aim of a size. */
function requestsWith(kind: Kind): fc.Arbitrary<AppraisalRequest> {
  const parts = fc.record({
    own: outcomeOf[kind] as fc.Arbitrary<Record<string, unknown>>,
    ratio: logRatio,
    hypothesis: hypotheses,
    better,
    alpha: alphas,
    allocation: fc.tuple(share, share),
    margin: real(0.15, 0.6),
    power: real(0.3, 0.97),
  });
  return parts.map(({ own, ratio, hypothesis, better, alpha, allocation, margin, power }) => {
    const superiority = hypothesis === 'superiority';
    const effect = superiority ? (ratio.up ? ratio.far : -ratio.far) : ratio.near;
    return JSON.parse(
      JSON.stringify({
        outcome: { ...outcomeFor(kind, own, effect, superiority), better },
        test: {
          hypothesis,
          alpha,
          sides: 1,
          ...(superiority ? {} : { margin: marginFor(kind, own, margin) }),
        },
        design: { family: 'parallel', allocation },
        aim: { find: 'size', power },
      }),
    ) as AppraisalRequest;
  });
}

function outcomeFor(kind: Kind, own: Record<string, unknown>, effect: number, superiority: boolean): object {
  switch (kind) {
    case 'time-to-event': {
      const { at, probability, method, ...rest } = own;
      const formula = superiority ? { method } : {};
      return {
        kind,
        hazardRatio: Math.exp(effect),
        controlSurvival: { at, probability },
        ...rest,
        ...formula,
      };
    }
    case 'count':
      return { kind, rateRatio: Math.exp(effect), ...own };
    case 'ordinal': {
      const { weights, total } = own as { weights: number[]; total: number };
      return {
        kind,
        oddsRatio: Math.exp(effect),
        controlProbabilities: weights.map((weight) => weight / total),
      };
    }
    case 'continuous':
      return { kind, difference: effect * (own.sd as number), ...own };
    case 'binary':
      return { kind, active: (own.control as number) * (1 + effect / 14), ...own };
  }
}

function marginFor(kind: Kind, own: Record<string, unknown>, margin: number): number {
  if (kind === 'continuous') return margin * (own.sd as number);
  return kind === 'binary' ? margin / 4 : Math.exp(margin);
}

const sized = (request: AppraisalRequest, units: number) =>
  feasible({ ...request, aim: { find: 'power', units } }).power;
const aimOf = ({ aim }: AppraisalRequest) => (aim as { power: number }).power;

for (const kind of kinds) {
  const holds = (law: (request: AppraisalRequest) => void, count = 500) =>
    fc.assert(fc.property(requestsWith(kind), law), runs(count));

  describe(`every request of a ${kind} outcome in two arms`, () => {
    it('gets the smallest size that reaches the aim', () => {
      holds((request) => {
        const { units, power } = feasible(request);
        expect(power).toBeGreaterThanOrEqual(aimOf(request));
        for (let less = units - 1; less >= Math.max(1, units - 6); less -= 1) {
          try {
            expect(sized(request, less)).toBeLessThan(aimOf(request));
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

    it('gives the same appraisal after a trip through JSON', () => {
      holds((request) => {
        const appraisal = appraise(request);
        expect(JSON.parse(JSON.stringify(appraisal))).toEqual(appraisal);
      }, 100);
    });

    it('detects, at the size found, a target no farther from no effect than its own', () => {
      holds((request) => {
        if (request.test.hypothesis !== 'superiority') return;
        const { units } = feasible(request);
        const own = targetOf(request);
        const { detectable } = feasible({
          ...request,
          aim: { find: 'effect', units, power: aimOf(request) },
        });
        const [found, asked] = [detectable as number, own.target].map((target) => own.distance(target));
        expect(Math.sign(found as number)).toBe(Math.sign(asked as number));
        expect(Math.abs(found as number)).toBeLessThanOrEqual(Math.abs(asked as number) * (1 + 1e-9));
      });
    });

    it('shows equivalence no more often than non-inferiority either way', () => {
      holds((request) => {
        if (request.test.hypothesis !== 'equivalence') return;
        const { units, power } = feasible(request);
        for (const direction of ['higher', 'lower'] as const) {
          const oneWay = {
            ...request,
            outcome: { ...request.outcome, better: direction },
            test: { ...request.test, hypothesis: 'non-inferiority' as const },
          };
          expect(sized(oneWay, units)).toBeGreaterThanOrEqual(power - 1e-12);
        }
      });
    });

    it('has more power against a wider margin', () => {
      holds((request) => {
        const { margin } = request.test;
        if (margin === undefined) return;
        const { units, power } = feasible(request);
        const wider = { ...request, test: { ...request.test, margin: 1.1 * margin } };
        expect(sized(wider, units)).toBeGreaterThan(power - 1e-12);
      });
    });

    it('explains itself with the numbers of its appraisal', () => {
      holds((request) => {
        const { units, standardError, criticalValue, power, expectedEvents, requiredEvents } =
          feasible(request);
        const steps = explain(request);
        const values = steps.map((step) => step.value);
        for (const figure of [units, standardError, criticalValue, power]) expect(values).toContain(figure);
        for (const figure of [expectedEvents, requiredEvents]) {
          if (figure !== undefined) expect(values).toContain(figure);
        }
        for (const { substituted, value, source } of steps) {
          expect(Number.isFinite(value)).toBe(true);
          expect(source).not.toBe('');
          expect(substituted).not.toMatch(/--|\\times-|\+-|NaN|undefined|10\^\{-?\d+\}\^/);
        }
      }, 100);
    });
  });
}

function targetOf({ outcome }: AppraisalRequest): { target: number; distance: (target: number) => number } {
  switch (outcome.kind) {
    case 'continuous':
      return { target: outcome.difference, distance: (target) => target };
    case 'binary':
      return { target: outcome.active, distance: (target) => target - outcome.control };
    case 'time-to-event':
      return { target: outcome.hazardRatio, distance: Math.log };
    case 'count':
      return { target: outcome.rateRatio, distance: Math.log };
    case 'ordinal':
      return { target: outcome.oddsRatio, distance: Math.log };
  }
}

const parallelTo = (request: AppraisalRequest, outcome: object): AppraisalRequest => ({
  ...request,
  outcome: { ...request.outcome, ...outcome } as AppraisalRequest['outcome'],
});

describe('the outcomes', () => {
  const each = (kind: Kind, law: (request: AppraisalRequest) => void) =>
    fc.assert(fc.property(requestsWith(kind), law), runs(300));

  it('multiply a log ratio by what dilution leaves', () => {
    for (const kind of ['time-to-event', 'count', 'ordinal'] as const) {
      const name = { 'time-to-event': 'hazardRatio', count: 'rateRatio', ordinal: 'oddsRatio' }[kind];
      each(kind, (request) => {
        if (request.test.hypothesis !== 'superiority') return;
        const { target } = targetOf(request);
        const diluted = feasible({ ...request, dilution: { contamination: 0.2, nonAdherence: 0.1 } });
        const moved = feasible(parallelTo(request, { [name]: target ** 0.72 }));
        expect(diluted.units).toBe(moved.units);
        expect(diluted.power).toBeCloseTo(moved.power, 10);
      });
    }
  });

  it('give the same power with arms and categories in the other order', () => {
    each('ordinal', (request) => {
      const { outcome, design } = request;
      if (outcome.kind !== 'ordinal' || design.family !== 'parallel') return;
      const { power, units } = feasible(request);
      const reversed = parallelTo(request, {
        controlProbabilities: [...outcome.controlProbabilities].reverse(),
        oddsRatio: 1 / outcome.oddsRatio,
        better: outcome.better === 'lower' ? 'higher' : 'lower',
      });
      expect(sized(reversed, units)).toBeCloseTo(power, 10);
    });
    each('count', (request) => {
      const { outcome, design } = request;
      if (outcome.kind !== 'count' || design.family !== 'parallel') return;
      const swapped = parallelTo(request, {
        controlRate: outcome.controlRate * outcome.rateRatio,
        rateRatio: 1 / outcome.rateRatio,
        better: outcome.better === 'lower' ? 'higher' : 'lower',
      });
      const even = { family: 'parallel' } as const;
      const { power, units } = feasible({ ...request, design: even });
      expect(sized({ ...swapped, design: even }, units)).toBeCloseTo(power, 10);
    });
  });

  it('give two ordered categories the standard error of a log odds ratio, √(N/(n₀n₁p̄q̄))', () => {
    fc.assert(
      fc.property(real(0.05, 0.95), real(0.1, 5), fc.integer({ min: 2, max: 500 }), (p, oddsRatio, n) => {
        fc.pre(Math.abs(oddsRatio - 1) > 1e-6);
        const { standardError } = feasible({
          outcome: { kind: 'ordinal', controlProbabilities: [p, 1 - p], oddsRatio },
          test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
          design: { family: 'parallel' },
          aim: { find: 'power', units: n },
        });
        const active = (oddsRatio * p) / (oddsRatio * p + 1 - p);
        const mean = (p + active) / 2;
        expect(standardError).toBeCloseTo(Math.sqrt(2 / (n * mean * (1 - mean))), 10);
      }),
      runs(300),
    );
  });

  it('see fewer events with dropout, more with a longer follow-up, and do not mind when survival is stated', () => {
    each('time-to-event', (request) => {
      const { outcome } = request;
      if (outcome.kind !== 'time-to-event') return;
      const at = { ...request, aim: { find: 'power', units: 50 } } as const;
      const events = (part: object) => feasible(parallelTo(at, part)).expectedEvents as number;
      const { accrual, followUp, controlSurvival, dropoutHazard = 0 } = outcome;
      expect(events({ dropoutHazard: dropoutHazard + 0.02 })).toBeLessThan(events({}));
      expect(events({ followUp: followUp + 1 })).toBeGreaterThanOrEqual(events({}));
      const later = { at: 2 * controlSurvival.at, probability: controlSurvival.probability ** 2 };
      expect(events({ controlSurvival: later })).toBeCloseTo(events({}), 9);
      expect(events({ accrual: accrual + 1e-9 })).toBeCloseTo(events({}), 4);
    });
  });

  it('count as Poisson where the dispersion is 0', () => {
    each('count', (request) => {
      const poisson = parallelTo(request, { dispersion: 0 });
      const { dispersion: _, ...unstated } = request.outcome as { dispersion?: number };
      expect(appraise(poisson)).toEqual(
        appraise({ ...request, outcome: unstated as AppraisalRequest['outcome'] }),
      );
    });
  });

  it('have in clusters without variation between them the standard error of as many individuals', () => {
    fc.assert(
      fc.property(
        real(0.02, 5),
        real(0.3, 3),
        fc.integer({ min: 1, max: 300 }),
        (controlRate, ratio, size) => {
          fc.pre(Math.abs(ratio - 1) > 1e-6);
          const request = {
            outcome: { kind: 'count', controlRate, rateRatio: ratio, exposure: 1 },
            test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
          } as const;
          const clustered = feasible({
            ...request,
            design: { family: 'cluster', rateCv: 0, clusterSize: size },
            aim: { find: 'power', units: 12 },
          });
          const individual = feasible({
            ...request,
            design: { family: 'parallel' },
            aim: { find: 'power', units: 12 * size },
          });
          expect(clustered.standardError / individual.standardError).toBeCloseTo(1, 12);
          expect(clustered.designEffect).toBeUndefined();
        },
      ),
      runs(300),
    );
  });

  it('need more clusters the more rates differ between them, and have a limiting power', () => {
    const at = (rateCv: number): AppraisalRequest => ({
      outcome: { kind: 'count', controlRate: 0.3, rateRatio: 0.7, exposure: 1 },
      test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
      design: { family: 'cluster', rateCv, clusterSize: 80 },
      aim: { find: 'size', power: 0.8 },
    });
    const sizes = [0, 0.1, 0.2, 0.4, 0.8].map((rateCv) => feasible(at(rateCv)).units);
    expect([...sizes].sort((a, b) => a - b)).toEqual(sizes);
    expect(new Set(sizes).size).toBe(sizes.length);
    const few = appraise({ ...at(0.4), aim: { find: 'cluster-size', units: 6, power: 0.8 } });
    if (few.feasible) throw new Error('expected no answer');
    const { code, limitingPower, fewestUnits } = few.infeasible;
    expect(code).toBe('clusters');
    const huge = { family: 'cluster', rateCv: 0.4, clusterSize: 1e9 } as const;
    const limit = feasible({ ...at(0.4), design: huge, aim: { find: 'power', units: 6 } }).power;
    expect(limitingPower).toBeCloseTo(limit, 6);
    expect(fewestUnits).toBeGreaterThan(6);
  });
});
