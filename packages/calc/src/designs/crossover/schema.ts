import { z } from 'zod';
import { comparisonsSchema, correlation } from '../../request.js';

const sequence = z
  .string()
  .regex(/^[A-J]{2,20}$/, 'Write a sequence as capital letters, one per period, such as AB; A is control.');

export const crossoverSchema = z.strictObject({
  family: z.literal('crossover'),
  sequences: z
    .array(sequence)
    .min(1, 'Name the sequences, such as AB and BA.')
    .max(20, 'Name 20 sequences or fewer.'),
  correlation: correlation('The within-person correlation'),
  carryover: z.boolean().optional(),
  comparisons: comparisonsSchema.optional(),
});

export type CrossoverDesign = z.infer<typeof crossoverSchema>;
