import { periodFace } from './periods';

/** Clusters receive both treatments, in one order or the other. */
export const clusterCrossover = periodFace({
  name: 'Cluster crossover',
  describes:
    'Whole groups receive both treatments, one period each; for effects that end with the treatment.',
  suits: { randomises: 'clusters', reversible: true, staged: false },
  structure: {},
  scheduleOf: () => [
    [0, 1],
    [1, 0],
  ],
  parts: (_, { clusters, arms: [control = '', active = ''] }) => [
    {
      part: 'told',
      says: `One sequence of ${clusters.many} begins with ${control}, the other with ${active}; then they change over.`,
    },
    { part: 'picture' },
  ],
});
