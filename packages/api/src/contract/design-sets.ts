import { holdSchema, optionPlanSchema } from '@steelyard/calc';
import { z } from 'zod';

export const optionSchema = z.object({
  id: z.uuid(),
  version: z.number().int(),
  name: z.string(),
  plan: optionPlanSchema,
});

/** Options side by side, in the order that gives them their letters. */
export const designSetSchema = z.object({
  id: z.uuid(),
  version: z.number().int(),
  hold: holdSchema,
  options: z.array(optionSchema),
});

/** An option with its request and what the calculation answers, computed in the server. */
export const weighedOptionSchema = z.object({
  optionId: z.uuid(),
  letter: z.string(),
  name: z.string(),
  request: z.record(z.string(), z.unknown()).nullable(),
  appraisal: z.record(z.string(), z.unknown()).nullable(),
  error: z.object({ code: z.string(), path: z.string(), message: z.string() }).nullable(),
});

export const weighSchema = z.object({
  verdict: z.object({ headline: z.string(), detail: z.string() }),
  options: z.array(weighedOptionSchema),
});

export type OptionView = z.infer<typeof optionSchema>;
export type DesignSetView = z.infer<typeof designSetSchema>;
export type WeighedOptionView = z.infer<typeof weighedOptionSchema>;
export type WeighView = z.infer<typeof weighSchema>;
