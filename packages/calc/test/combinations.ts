import type { FamilyId, Hypothesis, OutcomeKind } from '../src/index.js';

const every: readonly Hypothesis[] = ['superiority', 'non-inferiority', 'equivalence'];
const oneSided: readonly Hypothesis[] = ['superiority', 'non-inferiority'];
const superiority: readonly Hypothesis[] = ['superiority'];
const overPeriods = { continuous: every, binary: oneSided };

/** What combines with what, as the contract says; all else is refused. */
export const combinations: Record<FamilyId, Partial<Record<OutcomeKind, readonly Hypothesis[]>>> = {
  parallel: { continuous: every, binary: every, 'time-to-event': every, count: every, ordinal: every },
  'multi-arm': {
    continuous: oneSided,
    binary: oneSided,
    'time-to-event': superiority,
    count: superiority,
    ordinal: superiority,
  },
  crossover: { continuous: every, binary: superiority },
  cluster: { continuous: every, binary: oneSided, count: superiority },
  'cluster-baseline': overPeriods,
  'cluster-crossover': overPeriods,
  'stepped-wedge': overPeriods,
  'cluster-schedule': overPeriods,
  factorial: { continuous: superiority },
  'partially-nested': { continuous: oneSided },
  'three-level-cluster': { continuous: every, binary: oneSided },
};

export const outcomeKinds: readonly OutcomeKind[] = [
  'continuous',
  'binary',
  'time-to-event',
  'count',
  'ordinal',
];
export const hypotheses = every;

export interface Combination {
  family: FamilyId;
  kind: OutcomeKind;
  hypothesis: Hypothesis;
}

/** Each family × outcome × hypothesis there is. */
export const everyCombination: readonly Combination[] = (Object.keys(combinations) as FamilyId[]).flatMap(
  (family) => outcomeKinds.flatMap((kind) => hypotheses.map((hypothesis) => ({ family, kind, hypothesis }))),
);

export const isComputed = ({ family, kind, hypothesis }: Combination): boolean =>
  combinations[family][kind]?.includes(hypothesis) ?? false;
