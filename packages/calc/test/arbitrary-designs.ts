import fc from 'fast-check';
import type { Comparisons, Design, FamilyId, Hypothesis, OutcomeKind } from '../src/index.js';
import type { Combination } from './combinations.js';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const share = real(0.3, 3);
const pair = fc.tuple(share, share);
const constant = <const T>(value: T) => fc.constant(value);

const plainAdjustments = fc.constantFrom<Comparisons['adjust'][]>('none', 'bonferroni');
const perComparison: fc.Arbitrary<Comparisons> = fc.record({
  against: constant('control' as const),
  adjust: plainAdjustments,
  powerGoal: constant('per-comparison' as const),
});
const everyComparison: fc.Arbitrary<Comparisons> = fc.oneof(
  fc.record({
    against: constant('control' as const),
    adjust: fc.constantFrom<Comparisons['adjust'][]>(
      'none',
      'bonferroni',
      'holm',
      'dunnett',
      'fixed-sequence',
    ),
    powerGoal: fc.constantFrom<Comparisons['powerGoal'][]>('per-comparison', 'disjunctive', 'conjunctive'),
  }),
  fc.record({
    against: constant('all-pairs' as const),
    adjust: plainAdjustments,
    powerGoal: constant('per-comparison' as const),
  }),
);

const clusterSizes = {
  icc: real(0, 0.3),
  clusterSize: fc.integer({ min: 1, max: 200 }),
  clusterSizeCv: real(0, 1),
};
const periods = {
  icc: real(0, 0.2),
  cac: real(0.2, 1),
  decay: fc.boolean(),
  iac: real(0, 0.9),
  clusterSize: fc.integer({ min: 1, max: 80 }),
  clusterSizeCv: real(0, 0.8),
};
const periodKeys = ['family', 'icc', 'cac', 'clusterSize'] as const;

/** Schedules in which some period has both treatments, so that treatment and period can be told apart. */
const schedules = fc.constantFrom<(0 | 1 | null)[][][]>(
  [
    [0, 0],
    [0, 1],
  ],
  [
    [0, 1],
    [1, 0],
  ],
  [
    [0, null, 1],
    [null, 0, 1],
    [0, 1, 1],
  ],
  [
    [0, 0, 1, 1],
    [1, 1, 0, 0],
  ],
  [[0], [1]],
);

const oneOutcome: Record<Exclude<FamilyId, 'multi-arm' | 'cluster' | 'crossover'>, fc.Arbitrary<Design>> = {
  parallel: fc.record(
    { family: constant('parallel' as const), allocation: pair },
    { requiredKeys: ['family'] },
  ),
  'cluster-baseline': fc.record(
    { family: constant('cluster-baseline' as const), ...periods, allocation: pair },
    { requiredKeys: [...periodKeys] },
  ),
  'cluster-crossover': fc.record(
    { family: constant('cluster-crossover' as const), ...periods, allocation: pair },
    { requiredKeys: [...periodKeys] },
  ),
  'stepped-wedge': fc.record(
    {
      family: constant('stepped-wedge' as const),
      ...periods,
      steps: fc.integer({ min: 3, max: 6 }),
      baselinePeriods: fc.integer({ min: 1, max: 2 }),
      transitionPeriods: fc.integer({ min: 0, max: 1 }),
    },
    { requiredKeys: [...periodKeys, 'steps'] },
  ),
  'cluster-schedule': fc.record(
    { family: constant('cluster-schedule' as const), ...periods, schedule: schedules },
    { requiredKeys: [...periodKeys, 'schedule'] },
  ),
  factorial: fc.record({
    family: constant('factorial' as const),
    estimand: fc.constantFrom('main-effect' as const, 'interaction' as const),
  }),
  'partially-nested': fc.record(
    {
      family: constant('partially-nested' as const),
      icc: real(0, 0.3),
      groupSize: fc.integer({ min: 1, max: 30 }),
      allocation: pair,
    },
    { requiredKeys: ['family', 'icc', 'groupSize'] },
  ),
  'three-level-cluster': fc
    .record(
      {
        iccCluster: real(0, 0.1),
        further: real(0, 0.3),
        subclusterSize: fc.integer({ min: 1, max: 30 }),
        subclustersPerCluster: fc.integer({ min: 1, max: 10 }),
        allocation: pair,
      },
      { requiredKeys: ['iccCluster', 'further', 'subclusterSize', 'subclustersPerCluster'] },
    )
    .map(({ further, ...design }) => ({
      family: 'three-level-cluster' as const,
      iccSubcluster: design.iccCluster + further,
      ...design,
    })),
};

function multiArm(kind: OutcomeKind): fc.Arbitrary<Design> {
  return fc.record({
    family: constant('multi-arm' as const),
    allocation: fc.array(share, { minLength: 3, maxLength: 5 }),
    comparisons: kind === 'continuous' ? everyComparison : perComparison,
  });
}

function cluster(kind: OutcomeKind, hypothesis: Hypothesis): fc.Arbitrary<Design> {
  const family = constant('cluster' as const);
  if (kind === 'count') {
    const { clusterSize } = clusterSizes;
    return fc.record(
      { family, clusterSize, rateCv: real(0, 0.6), allocation: pair },
      { requiredKeys: ['family', 'clusterSize', 'rateCv'] },
    );
  }
  const twoArms = fc.record(
    { family, ...clusterSizes, allocation: pair },
    { requiredKeys: ['family', 'icc', 'clusterSize'] },
  );
  if (kind !== 'continuous' || hypothesis === 'equivalence') return twoArms;
  const moreArms = fc.record({
    family,
    ...clusterSizes,
    allocation: fc.array(share, { minLength: 3, maxLength: 4 }),
    comparisons: everyComparison,
  });
  return fc.oneof(twoArms, moreArms);
}

/** Sequences that can be told apart within participants; the binary outcome knows AB/BA alone. */
function crossover(kind: OutcomeKind): fc.Arbitrary<Design> {
  const family = constant('crossover' as const);
  const correlation = real(-0.2, 0.95);
  if (kind === 'binary') {
    return fc.record({
      family,
      sequences: fc.constantFrom<string[][]>(['AB', 'BA']),
      correlation: real(-0.02, 0.02),
    });
  }
  const two = fc.record(
    {
      family,
      sequences: fc.constantFrom<string[][]>(['AB', 'BA'], ['BA', 'AB'], ['ABBA', 'BAAB'], ['ABB', 'BAA']),
      correlation,
    },
    { requiredKeys: ['family', 'sequences', 'correlation'] },
  );
  const three = fc.record({
    family,
    sequences: fc.constantFrom<string[][]>(['ABC', 'BCA', 'CAB'], ['ABC', 'BCA', 'CAB', 'CBA', 'ACB', 'BAC']),
    correlation,
    comparisons: perComparison,
  });
  return fc.oneof(two, three);
}

/** Designs of one family that go with an outcome and a hypothesis. */
export function designsOf({ family, kind, hypothesis }: Combination): fc.Arbitrary<Design> {
  if (family === 'multi-arm') return multiArm(kind);
  if (family === 'cluster') return cluster(kind, hypothesis);
  if (family === 'crossover') return crossover(kind);
  return oneOutcome[family];
}
