import { capitalised } from '../../../shared/format/lists';
import { count } from '../../../shared/format/numbers';
import { allocated, armShares, equalShares, inEachArm, parallelSchematic, treatedByArm } from './arms';
import { comparedAnew, everyStance, stance, withComparisons } from './comparisons';
import type { FamilyUi, StudyWords } from './family-ui';

export const clustersUnnamed = ({ clusters }: { clusters: unknown }): string | undefined =>
  clusters ? undefined : 'Say in the question what the clusters are called to randomise them.';

export const inEachCluster = ({ participants, clusters }: StudyWords): string =>
  `${capitalised(participants.many)} in each ${clusters.one}`;

/** Whole clusters in arms side by side, their participants measured once. */
export const cluster: FamilyUi = {
  name: 'Cluster',
  describes: 'Whole groups are randomised, for treatments that cannot be kept from neighbours.',
  suits: { randomises: 'clusters', staged: false },
  refusal: clustersUnnamed,
  start: () => ({ treatments: [0, 1], structure: equalShares(2), clusterSize: 20, overrides: {} }),
  arms: ({ plan: { outcome, test } }) => ({
    fewest: 2,
    most: outcome.kind === 'continuous' && test.hypothesis !== 'equivalence' ? 11 : 2,
  }),
  whole: (plan) => withComparisons(allocated(plan)),
  treated: (plan, treatments) => comparedAnew(plan, treatedByArm(plan, treatments)),
  summary(plan, size, { clusters }) {
    const each = size?.clusterSize ?? plan.clusterSize;
    const sizes =
      size?.clusters !== undefined && each !== undefined
        ? `${count(size.clusters)} ${clusters.many} × ${count(each)}`
        : sized(clusters.many, each);
    return [sizes, stance(plan)].filter((part) => part !== undefined).join(', ');
  },
  sizeNoun: (plan, { clusters }) => inEachArm(clusters.many, plan),
  clusterSizeNoun: inEachCluster,
  schematic: parallelSchematic,
  structure: (plan, _, words) => [
    armShares(words),
    ...(plan.treatments.length > 2 ? [{ part: 'comparisons', offers: everyStance } as const] : []),
  ],
};

/** “catchments of 20”; the noun alone while no size can be read. */
export const sized = (noun: string, each: unknown): string =>
  typeof each === 'number' && !Number.isNaN(each) ? `${noun} of ${count(each)}` : noun;
