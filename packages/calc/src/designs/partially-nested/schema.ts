import { z } from 'zod';
import { allocation, closedProportion, wholeNumber } from '../../request.js';

export const partiallyNestedSchema = z.strictObject({
  family: z.literal('partially-nested'),
  icc: closedProportion('The ICC within treatment groups'),
  groupSize: wholeNumber('The size of a treatment group', 1),
  allocation: allocation.length(2, 'State two shares: control and active.').optional(),
});

export type PartiallyNestedDesign = z.infer<typeof partiallyNestedSchema>;
