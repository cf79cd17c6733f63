import { count } from '../../../shared/format/numbers';
import { AllocationFields } from '../components/allocation-fields';
import { allocated, equalShares, inEachArm, parallelSchematic } from './arms';
import type { FamilyUi } from './family-ui';

/** Whole clusters in arms side by side, their participants measured once. */
export const cluster: FamilyUi = {
  name: 'Cluster',
  describes: 'Whole groups are randomised, for treatments that cannot be kept from neighbours.',
  refusal: ({ clusters }) =>
    clusters ? undefined : 'Say in the question what the clusters are called to randomise them.',
  start: () => ({
    family: 'cluster',
    treatments: [0, 1],
    structure: equalShares(2),
    clusterSize: 20,
    overrides: {},
  }),
  whole: allocated,
  summary(plan, size, { clusters }) {
    const each = size?.clusterSize ?? plan.clusterSize;
    if (size?.clusters !== undefined && each !== undefined) {
      return `${count(size.clusters)} ${clusters.many} × ${count(each)}`;
    }
    return each === undefined || Number.isNaN(each) ? clusters.many : `${clusters.many} of ${count(each)}`;
  },
  sizeNoun: (plan, { clusters }) => inEachArm(clusters.many, plan),
  schematic: parallelSchematic,
  Structure: AllocationFields,
};
