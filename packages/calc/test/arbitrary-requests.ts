import fc from 'fast-check';
import type { AppraisalRequest, FamilyId } from '../src/index.js';

const continuous = fc.record({
  kind: fc.constant('continuous' as const),
  difference: fc.double({ min: 0.05, max: 3, noNaN: true }),
  sd: fc.double({ min: 0.5, max: 4, noNaN: true }),
});

const binary = fc
  .record({
    kind: fc.constant('binary' as const),
    control: fc.double({ min: 0.05, max: 0.95, noNaN: true }),
    active: fc.double({ min: 0.05, max: 0.95, noNaN: true }),
  })
  .filter(({ control, active }) => Math.abs(control - active) > 0.03);

const share = fc.double({ min: 0.3, max: 3, noNaN: true });

const test = fc.record({
  hypothesis: fc.constant('superiority' as const),
  alpha: fc.constantFrom(0.001, 0.01, 0.025, 0.05, 0.1),
  sides: fc.constantFrom(1 as const, 2 as const),
});

const aim = fc.record({
  find: fc.constant('size' as const),
  power: fc.double({ min: 0.3, max: 0.99, noNaN: true }),
});

const designs = {
  parallel: fc.record({
    family: fc.constant('parallel' as const),
    allocation: fc.tuple(share, share),
  }),
  'multi-arm': fc.record({
    family: fc.constant('multi-arm' as const),
    allocation: fc.array(share, { minLength: 3, maxLength: 6 }),
    comparisons: fc.record({
      against: fc.constant('control' as const),
      adjust: fc.constantFrom('none' as const, 'bonferroni' as const),
      powerGoal: fc.constant('per-comparison' as const),
    }),
  }),
  crossover: fc.record({
    family: fc.constant('crossover' as const),
    sequences: fc.constantFrom<string[]>(['AB', 'BA'], ['BA', 'AB']),
    correlation: fc.double({ min: -0.5, max: 0.95, noNaN: true }),
  }),
  cluster: fc.record({
    family: fc.constant('cluster' as const),
    icc: fc.double({ min: 0, max: 0.3, noNaN: true }),
    clusterSize: fc.integer({ min: 1, max: 200 }),
    clusterSizeCv: fc.double({ min: 0, max: 1, noNaN: true }),
    allocation: fc.tuple(share, share),
  }),
} satisfies Record<FamilyId, fc.Arbitrary<unknown>>;

/** Requests of one family that the calculation answers, with an aim of a size. */
export function requestsOf(family: FamilyId): fc.Arbitrary<AppraisalRequest> {
  const outcome = family === 'crossover' ? continuous : fc.oneof(continuous, binary);
  return fc.record({ outcome, test, design: designs[family], aim });
}

/** Whole counts where CI is set, a tenth otherwise. */
export const runs = (count: number) => ({ numRuns: process.env.CI ? count : Math.ceil(count / 10) });
