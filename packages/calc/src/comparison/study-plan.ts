import { z } from 'zod';
import { familyIds } from '../designs/registry.js';
import { costPlanSchema, openProportion, positive, timelinePlanSchema, wholeNumber } from '../request.js';
import { planningValueKeys } from './planning-values.js';

const power = openProportion('The power');

/** What is kept equal while options are compared; `power` is asked of every option under each hold. */
export const holdSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('power'), power }),
  z.strictObject({ kind: z.literal('budget'), power, budget: positive('The budget') }),
  z.strictObject({ kind: z.literal('sizes'), power }),
]);

/** Whether an option may be chosen at all, and why. */
export const rulingSchema = z.strictObject({
  kind: z.enum(['admissible', 'conditions', 'not-admissible']),
  reason: z.string().trim().min(1, 'Give the reason of the ruling.').max(2000),
});

const overrideSchema = z.strictObject({ value: z.number(), reason: z.string().min(1) });

/** A candidate design as it is stored: structure and size; whatever is uncertain comes from the ledger. */
export const optionPlanSchema = z.strictObject({
  family: z.enum(familyIds),
  /** Which of the study's treatments it compares, control first, as indices into the study's list. */
  treatments: z.array(wholeNumber('A treatment', 0)).min(2),
  /** The structural part of the family's design; the family's own schema checks it once completed. */
  structure: z.record(z.string(), z.unknown()),
  /** Baselines and follow-ups of a repeatedly measured continuous outcome. */
  repeated: z
    .strictObject({
      baselines: wholeNumber('The number of baselines', 0),
      followUps: wholeNumber('The number of follow-ups', 1),
    })
    .optional(),
  /** Units and cluster size as entered: what the hold "sizes" keeps. */
  units: wholeNumber('The number of units', 1).optional(),
  clusterSize: wholeNumber('The cluster size', 1).optional(),
  /** Why several comparisons are adjusted for, and powered, as they are. */
  multiplicityReason: z.string().max(1000, 'Give the reason in 1000 characters or fewer.').optional(),
  overrides: z.partialRecord(z.enum(planningValueKeys), overrideSchema),
});

/** A ledger line as the comparison needs it; one with a family speaks for that family alone. */
export const ledgerEntrySchema = z.strictObject({
  key: z.enum(planningValueKeys),
  family: z.enum(familyIds).nullable(),
  value: z.number(),
});

/** Money and months; `perExposure` and `perClusterPeriod` go by the study's list of treatments. */
export const studyCostsSchema = z.strictObject({ costs: costPlanSchema, timeline: timelinePlanSchema });

export type Hold = z.infer<typeof holdSchema>;
export type Ruling = z.infer<typeof rulingSchema>;
export type OptionPlan = z.infer<typeof optionPlanSchema>;
export type LedgerEntry = z.infer<typeof ledgerEntrySchema>;
export type StudyCosts = z.infer<typeof studyCostsSchema>;
