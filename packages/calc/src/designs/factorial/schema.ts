import { z } from 'zod';

export const factorialSchema = z.strictObject({
  family: z.literal('factorial'),
  estimand: z.enum(['main-effect', 'interaction']),
});

export type FactorialDesign = z.infer<typeof factorialSchema>;
