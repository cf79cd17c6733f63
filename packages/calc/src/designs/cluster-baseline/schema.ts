import { z } from 'zod';
import { periodFields } from '../periods/schema.js';

export const clusterBaselineSchema = z.strictObject({
  family: z.literal('cluster-baseline'),
  ...periodFields,
});

export type ClusterBaselineDesign = z.infer<typeof clusterBaselineSchema>;
