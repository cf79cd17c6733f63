import type { Family } from '../family.js';
import { smallerClusters } from '../levers.js';
import { periodFamily, periodPlan } from '../periods/plan.js';
import { type ClusterCrossoverDesign, clusterCrossoverSchema } from './schema.js';

/** Each cluster has a control and an active period, in one order or the other. */
export const clusterCrossover: Family<ClusterCrossoverDesign> = {
  ...periodFamily,
  name: 'Cluster crossover',
  schema: clusterCrossoverSchema,
  levers: [smallerClusters],
  plan: (request) =>
    periodPlan(
      request,
      [
        [0, 1],
        [1, 0],
      ],
      'design',
    ),
};
