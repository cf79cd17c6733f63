import fc from 'fast-check';
import type { Hypothesis, Outcome, OutcomeKind, TestPlan } from '../src/index.js';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const side = fc.constantFrom(-1, 1);
const better = fc.constantFrom('higher' as const, 'lower' as const);
const alpha = fc.constantFrom(0.001, 0.01, 0.025, 0.05, 0.1);

/** How far the expected effect is off the null, in margins: nearer than one, or nothing could be shown. */
const offNull = real(-0.6, 0.6);

/** An outcome with its test, at an effect that the hypothesis can show. */
export interface Question {
  outcome: Outcome;
  test: TestPlan;
}

export function questionsOf(kind: OutcomeKind, hypothesis: Hypothesis): fc.Arbitrary<Question> {
  if (hypothesis === 'superiority') {
    const test = fc.record({
      hypothesis: fc.constant(hypothesis),
      alpha,
      sides: fc.constantFrom(1 as const, 2 as const),
    });
    return fc.record({ outcome: superior[kind], test });
  }
  return fc.record({ within: inMargin[kind], better, alpha }).map(({ within, better, alpha }) => ({
    outcome: { ...within.outcome, better },
    test: { hypothesis, alpha, sides: 1, margin: within.margin },
  }));
}

const sd = real(0.5, 4);
const difference = fc.tuple(real(0.05, 3), side).map(([size, sign]) => size * sign);
const ratio = fc.tuple(real(0.1, 1.2), side).map(([log, sign]) => Math.exp(log * sign));
const survival = fc.record({ at: real(1, 24), probability: real(0.1, 0.9) });
const following = fc.record(
  {
    controlSurvival: survival,
    accrual: fc.oneof(fc.constant(0), real(0.1, 36)),
    followUp: real(0.5, 36),
    dropoutHazard: real(0, 0.05),
  },
  { requiredKeys: ['controlSurvival', 'accrual', 'followUp'] },
);
const counting = fc.record(
  { controlRate: real(0.1, 5), exposure: real(0.2, 4), dispersion: real(0, 2) },
  { requiredKeys: ['controlRate', 'exposure'] },
);
const categories = fc
  .array(fc.integer({ min: 1, max: 20 }), { minLength: 2, maxLength: 7 })
  .map((weights) => weights.map((weight) => weight / weights.reduce((sum, each) => sum + each, 0)));

const superior: Record<OutcomeKind, fc.Arbitrary<Outcome>> = {
  continuous: fc.record({ kind: fc.constant('continuous' as const), difference, sd }),
  binary: fc
    .record({ kind: fc.constant('binary' as const), control: real(0.05, 0.95), active: real(0.05, 0.95) })
    .filter(({ control, active }) => Math.abs(control - active) > 0.03),
  'time-to-event': fc
    .record({ hazardRatio: ratio, following })
    .map(({ hazardRatio, following }) => ({ kind: 'time-to-event' as const, hazardRatio, ...following })),
  count: fc
    .record({ rateRatio: ratio, counting })
    .map(({ rateRatio, counting }) => ({ kind: 'count' as const, rateRatio, ...counting })),
  ordinal: fc.record({
    kind: fc.constant('ordinal' as const),
    controlProbabilities: categories,
    oddsRatio: ratio,
  }),
};

interface InMargin {
  outcome: Outcome;
  margin: number;
}

const ratioMargin = real(0.15, 1);

const inMargin: Record<OutcomeKind, fc.Arbitrary<InMargin>> = {
  continuous: fc.record({ sd, share: offNull, margin: real(0.1, 2) }).map(({ sd, share, margin }) => ({
    outcome: { kind: 'continuous', difference: share * margin + 0, sd },
    margin,
  })),
  binary: fc
    .record({ control: real(0.25, 0.75), share: offNull, margin: real(0.04, 0.3) })
    .map(({ control, share, margin }) => ({
      outcome: { kind: 'binary', control, active: control + share * margin },
      margin,
    })),
  'time-to-event': fc
    .record({ following, share: offNull, log: ratioMargin })
    .map(({ following, share, log }) => ({
      outcome: { kind: 'time-to-event', hazardRatio: Math.exp(share * log), ...following },
      margin: Math.exp(log),
    })),
  count: fc.record({ counting, share: offNull, log: ratioMargin }).map(({ counting, share, log }) => ({
    outcome: { kind: 'count', rateRatio: Math.exp(share * log), ...counting },
    margin: Math.exp(log),
  })),
  ordinal: fc.record({ categories, share: offNull, log: ratioMargin }).map(({ categories, share, log }) => ({
    outcome: { kind: 'ordinal', controlProbabilities: categories, oddsRatio: Math.exp(share * log) },
    margin: Math.exp(log),
  })),
};
