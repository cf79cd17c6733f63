import { limitsSchema } from '@steelyard/calc';
import { z } from 'zod';

/** Without a version nobody has stated any limit yet. */
export const studyLimitsSchema = z.object({ version: z.number().int().nullable(), limits: limitsSchema });

export const newLimitsSchema = z.strictObject({
  limits: limitsSchema,
  /** The version it replaces; null where there was none. */
  version: z.number().int().nullable(),
});

export type LimitsView = z.infer<typeof studyLimitsSchema>;
export type NewLimits = z.input<typeof newLimitsSchema>;
