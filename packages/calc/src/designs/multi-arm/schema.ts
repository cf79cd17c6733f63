import { z } from 'zod';
import { allocation, comparisonsSchema } from '../../request.js';

export const multiArmSchema = z.strictObject({
  family: z.literal('multi-arm'),
  allocation: allocation
    .min(3, 'State three shares or more: control first, then each active arm.')
    .max(11, 'State 11 shares or fewer.'),
  comparisons: comparisonsSchema,
});

export type MultiArmDesign = z.infer<typeof multiArmSchema>;
