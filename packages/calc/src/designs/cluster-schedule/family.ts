import type { Family } from '../family.js';
import { smallerClusters } from '../levers.js';
import { periodFamily, periodPlan } from '../periods/plan.js';
import { type ClusterScheduleDesign, clusterScheduleSchema } from './schema.js';

/** Clusters go through control and active periods in any sequences, measured or not. */
export const clusterSchedule: Family<ClusterScheduleDesign> = {
  ...periodFamily,
  name: 'Cluster schedule',
  schema: clusterScheduleSchema,
  levers: [smallerClusters],
  plan: (request) => periodPlan(request, request.design.schedule, 'design.schedule'),
};
