import { holdSchema, optionPlanSchema, rulingSchema } from '@steelyard/calc';
import { z } from 'zod';
import { versionSchema } from './versions.js';

const namedPlanSchema = z.strictObject({
  name: z.string().trim().min(1, 'Name the option.').max(200),
  plan: optionPlanSchema,
});

/** With a ruling from the start, where whoever adds it may rule. */
export const newOptionSchema = namedPlanSchema.extend({ ruling: rulingSchema.optional() });

export const changedOptionSchema = namedPlanSchema.extend({ version: versionSchema });

/** Of the option's version. */
export const newRulingSchema = rulingSchema.extend({ version: versionSchema });

export const newDesignSetSchema = z.strictObject({ hold: holdSchema });

export const changedDesignSetSchema = newDesignSetSchema.extend({
  version: versionSchema,
  /** The ids of all options: their order gives them their letters. */
  order: z.array(z.string()).max(100),
});

const why = (what: string) => z.string().trim().min(1, what).max(4000);

/** Of the design set's version. */
export const newChoiceSchema = z.strictObject({
  version: versionSchema,
  optionId: z.string(),
  why: why('Say why this option.'),
  whyNot: z.array(z.strictObject({ optionId: z.string(), why: why('Say why not this option.') })).max(100),
});

export type NewOption = z.input<typeof newOptionSchema>;
export type ChangedOption = z.input<typeof changedOptionSchema>;
export type NewRuling = z.input<typeof newRulingSchema>;
export type NewDesignSet = z.input<typeof newDesignSetSchema>;
export type ChangedDesignSet = z.input<typeof changedDesignSetSchema>;
export type NewChoice = z.input<typeof newChoiceSchema>;
