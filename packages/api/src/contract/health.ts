import { z } from 'zod';

export const healthSchema = z.object({
  status: z.literal('ok'),
  version: z.string(),
  database: z.literal('ok'),
});

export type HealthView = z.infer<typeof healthSchema>;
