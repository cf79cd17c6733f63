import { ledgerEntrySchema, type PlanningValueKey } from '@steelyard/calc';
import { z } from 'zod';

const spread = z.number().gt(0, 'It must be above 0.').max(1e12, 'It must be 1000000000000 or less.');
const between = z
  .number()
  .gt(0, 'It must lie between 0 and 1, both excluded.')
  .lt(1, 'It must lie between 0 and 1, both excluded.');
const correlation = z
  .number()
  .gt(-1, 'It must lie between −1 and 1, both excluded.')
  .lt(1, 'It must lie between −1 and 1, both excluded.');
const lost = z
  .number()
  .min(0, 'It must be 0 or more.')
  .lt(1, 'It must be below 1: nothing would be left to analyse.');

const shared = z.number().min(0, 'It must lie between 0 and 1.').max(1, 'It must lie between 0 and 1.');
const coefficient = z.number().min(0, 'It must be 0 or more.').max(100, 'It must be 100 or less.');

/** What each planning value may be, whichever design draws on it. */
export const planningValueFigures: Record<PlanningValueKey, z.ZodNumber> = {
  sd: spread,
  sdActive: spread,
  controlProportion: between,
  controlSurvival: between,
  dropoutHazard: z.number().min(0, 'It must be 0 or more.').max(1e12, 'It must be 1000000000000 or less.'),
  controlRate: spread,
  dispersion: z.number().min(0, 'It must be 0 or more.').max(1e12, 'It must be 1000000000000 or less.'),
  rateCv: coefficient,
  baselineCorrelation: correlation,
  withinPersonCorrelation: correlation,
  icc: shared,
  iccSubcluster: shared,
  clusterAutocorrelation: shared,
  individualAutocorrelation: shared,
  clusterSizeCv: coefficient,
  attrition: lost,
  clusterAttrition: lost,
  contamination: lost,
  nonAdherence: lost,
};

export const newPlanningValueSchema = ledgerEntrySchema
  .extend({
    low: z.number().nullable(),
    high: z.number().nullable(),
    source: z.string().trim().min(1, 'Say where the value comes from.').max(1000),
    /** The version it replaces; null where there was none. */
    version: z.number().int().nullable(),
  })
  .superRefine(({ key, value, low, high }, context) => {
    for (const [path, figure] of Object.entries({ value, low, high })) {
      const { error } = planningValueFigures[key].nullable().safeParse(figure);
      for (const { message } of error?.issues ?? []) {
        context.addIssue({ code: 'custom', path: [path], message });
      }
    }
    if ((low !== null && low > value) || (high !== null && high < value)) {
      context.addIssue({ code: 'custom', path: ['value'], message: 'The value must lie within its range.' });
    }
  });

/** One value as it stood at a version. */
export const planningValueRevisionSchema = z.object({
  version: z.number().int(),
  value: z.number(),
  low: z.number().nullable(),
  high: z.number().nullable(),
  source: z.string(),
  setBy: z.string(),
  setAt: z.iso.datetime(),
});

/** Newest first. */
export const planningValueHistorySchema = z.object({ entries: z.array(planningValueRevisionSchema) });

export type NewPlanningValue = z.input<typeof newPlanningValueSchema>;
export type PlanningValueRevisionView = z.infer<typeof planningValueRevisionSchema>;
export type PlanningValueHistoryView = z.infer<typeof planningValueHistorySchema>;
