import { periodFace } from './periods';

/** Clusters side by side, measured before and after treatment begins in one of the arms. */
export const clusterBaseline = periodFace({
  name: 'Cluster with baseline',
  describes: 'Whole groups are randomised and measured in a period before treatment too.',
  suits: { randomises: 'clusters', staged: false },
  structure: {},
  groups: 'arms',
  scheduleOf: () => [
    [0, 0],
    [0, 1],
  ],
  parts: (_, { clusters, arms: [control = '', active = ''] }) => [
    {
      part: 'told',
      says: `All ${clusters.many} are first measured under ${control}; those of the second arm then change to ${active}.`,
    },
    { part: 'picture' },
  ],
});
