import { count } from '../../../shared/format/numbers';
import { inEachArm, parallelSchematic } from './arms';
import type { FamilyUi } from './family-ui';

/** Whole clusters in arms side by side, their participants measured once. */
export const cluster: FamilyUi = {
  summary(plan, size, { clusters }) {
    const each = size?.clusterSize ?? plan.clusterSize;
    if (size?.clusters !== undefined && each !== undefined) {
      return `${count(size.clusters)} ${clusters.many} × ${count(each)}`;
    }
    return each === undefined ? clusters.many : `${clusters.many} of ${count(each)}`;
  },
  sizeNoun: (plan, { clusters }) => inEachArm(clusters.many, plan),
  schematic: parallelSchematic,
};
