import { planningValueFigures } from '@steelyard/api/contract/planning-values';
import {
  type FamilyId,
  families,
  optionPlanSchema,
  planningValueKeys,
  planningValuesOf,
} from '@steelyard/calc';
import { z } from 'zod';
import { familyUiOf } from '../families/registry';

const value = z.number({ error: 'Enter the value that this option takes.' });

const reason = z
  .string({ error: 'Say why this option takes a value of its own.' })
  .trim()
  .min(1, 'Say why this option takes a value of its own.')
  .max(1000);

const overrides = z.strictObject(
  Object.fromEntries(
    planningValueKeys.map((key) => [
      key,
      z.strictObject({ value: value.pipe(planningValueFigures[key]), reason }).optional(),
    ]),
  ),
);

/** What an option must be to be stored; calc judges the rest when it computes it. */
export const optionDraftSchema = z
  .strictObject({
    name: z.string().trim().min(1, 'Name the option.').max(200),
    plan: optionPlanSchema.extend({ overrides }),
  })
  .superRefine(({ plan }, context) => {
    const fault = familyUiOf(plan.family).fault?.(plan);
    if (fault) context.addIssue({ code: 'custom', path: ['plan', ...fault.path], message: fault.message });
    const { family, structure, clusterSize } = plan;
    const size = clusterSize === undefined ? {} : { clusterSize };
    const design = { family, ...fromLedger(family), ...structure, ...size };
    for (const { path, message } of families[family].schema.safeParse(design).error?.issues ?? []) {
      const [part] = path;
      if (part === 'clusterSize')
        context.addIssue({ code: 'custom', path: ['plan', 'clusterSize'], message });
      else if (part !== undefined && part in structure)
        context.addIssue({ code: 'custom', path: ['plan', 'structure', ...path], message });
    }
  });

/** Stands in for what the ledger adds to a design, so that the schema judges how the structure's parts go together. */
const fromLedger = (family: FamilyId): Record<string, number> =>
  Object.fromEntries(
    planningValuesOf(family).flatMap(({ path }) => {
      const [part, key, ...inner] = path.split('.');
      return part === 'design' && key !== undefined && inner.length === 0 ? [[key, 0.5]] : [];
    }),
  );
