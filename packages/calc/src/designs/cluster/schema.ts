import { z } from 'zod';
import { allocation, closedProportion, comparisonsSchema, quantity, wholeNumber } from '../../request.js';

export const clusterSchema = z.strictObject({
  family: z.literal('cluster'),
  icc: closedProportion('The ICC').optional(),
  rateCv: quantity('The between-cluster CV of the rate', 0).optional(),
  clusterSize: wholeNumber('The cluster size', 1),
  clusterSizeCv: quantity('The CV of cluster size', 0, 100).optional(),
  allocation: allocation.min(2, 'State two shares or more: control first.').max(11).optional(),
  comparisons: comparisonsSchema.optional(),
});

export type ClusterDesign = z.infer<typeof clusterSchema>;
