import { z } from 'zod';
import { allocation, closedProportion, wholeNumber } from '../../request.js';

export const threeLevelClusterSchema = z.strictObject({
  family: z.literal('three-level-cluster'),
  iccCluster: closedProportion('The ICC of the cluster'),
  iccSubcluster: closedProportion('The ICC of the subcluster'),
  subclusterSize: wholeNumber('The size of a subcluster', 1),
  subclustersPerCluster: wholeNumber('The number of subclusters in a cluster', 1),
  allocation: allocation.length(2, 'State two shares: control and active.').optional(),
});

export type ThreeLevelClusterDesign = z.infer<typeof threeLevelClusterSchema>;
