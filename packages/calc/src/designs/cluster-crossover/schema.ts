import { z } from 'zod';
import { periodFields } from '../periods/schema.js';

export const clusterCrossoverSchema = z.strictObject({
  family: z.literal('cluster-crossover'),
  ...periodFields,
});

export type ClusterCrossoverDesign = z.infer<typeof clusterCrossoverSchema>;
