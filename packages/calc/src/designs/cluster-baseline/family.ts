import type { Family } from '../family.js';
import { smallerClusters } from '../levers.js';
import { periodFamily, periodPlan } from '../periods/plan.js';
import { type ClusterBaselineDesign, clusterBaselineSchema } from './schema.js';

/** Whole clusters are allocated to two arms and measured in a period before and one after. */
export const clusterBaseline: Family<ClusterBaselineDesign> = {
  ...periodFamily,
  name: 'Cluster baseline',
  schema: clusterBaselineSchema,
  levers: [smallerClusters],
  plan: (request) =>
    periodPlan(
      request,
      [
        [0, 0],
        [0, 1],
      ],
      'design',
    ),
};
