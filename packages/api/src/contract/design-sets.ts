import { holdSchema, optionPlanSchema, rulingSchema } from '@steelyard/calc';
import { z } from 'zod';

export const optionRulingSchema = rulingSchema.extend({ by: z.string(), at: z.iso.datetime() });

export const optionSchema = z.object({
  id: z.uuid(),
  version: z.number().int(),
  name: z.string(),
  plan: optionPlanSchema,
  /** Null until the methodologist has ruled. */
  ruling: optionRulingSchema.nullable(),
});

export const removedOptionSchema = optionSchema.extend({ removedAt: z.iso.datetime() });

/** The option settled on, why, and why not each other. */
export const choiceSchema = z.object({
  optionId: z.uuid(),
  why: z.string(),
  whyNot: z.array(z.object({ optionId: z.uuid(), why: z.string() })),
  by: z.string(),
  at: z.iso.datetime(),
});

/** Options side by side, in the order that gives them their letters. */
export const designSetSchema = z.object({
  id: z.uuid(),
  version: z.number().int(),
  hold: holdSchema,
  options: z.array(optionSchema),
  /** Options that were removed and can be restored, last removed first. */
  removed: z.array(removedOptionSchema),
  choice: choiceSchema.nullable(),
});

/** An option with its request and what the calculation answers, computed in the server. */
export const weighedOptionSchema = z.object({
  optionId: z.uuid(),
  letter: z.string(),
  name: z.string(),
  request: z.record(z.string(), z.unknown()).nullable(),
  appraisal: z.record(z.string(), z.unknown()).nullable(),
  error: z.object({ code: z.string(), path: z.string(), message: z.string() }).nullable(),
  /** How it stands against the power and the limits, as @steelyard/calc's `Standing` lists it field by field. */
  standing: z.looseObject({ fits: z.boolean(), reachesPower: z.boolean() }).nullable(),
  ruling: rulingSchema.nullable(),
});

export const weighSchema = z.object({
  verdict: z.object({ headline: z.string(), detail: z.string() }),
  options: z.array(weighedOptionSchema),
});

export type OptionView = z.infer<typeof optionSchema>;
export type RemovedOptionView = z.infer<typeof removedOptionSchema>;
export type ChoiceView = z.infer<typeof choiceSchema>;
export type Choice = Omit<ChoiceView, 'by'>;
export type DesignSetView = z.infer<typeof designSetSchema>;
export type WeighedOptionView = z.infer<typeof weighedOptionSchema>;
export type WeighView = z.infer<typeof weighSchema>;
