import { z } from 'zod';
import { allocation } from '../../request.js';

export const parallelSchema = z.strictObject({
  family: z.literal('parallel'),
  allocation: allocation.length(2, 'State two shares: control and active.').optional(),
});

export type ParallelDesign = z.infer<typeof parallelSchema>;
