import { planningValueFigures } from '@steelyard/api/contract/planning-values';
import { families, optionPlanSchema, planningValueKeys, planningValueTraits } from '@steelyard/calc';
import { z } from 'zod';
import type { OptionDraft } from '../families/family-ui';
import { familyUiOf } from '../families/registry';

const reason = z
  .string({ error: 'Say why this option takes a value of its own.' })
  .trim()
  .min(1, 'Say why this option takes a value of its own.')
  .max(1000);

const overrides = z.strictObject(
  Object.fromEntries(
    planningValueKeys.map((key) => [
      key,
      z.strictObject({ value: planningValueFigures[key], reason }).optional(),
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
    const { family, structure, clusterSize } = plan;
    const design = { family, ...structure, ...(clusterSize === undefined ? {} : { clusterSize }) };
    for (const { path, message } of families[family].schema.safeParse(design).error?.issues ?? []) {
      const [part] = path;
      if (part === 'clusterSize')
        context.addIssue({ code: 'custom', path: ['plan', 'clusterSize'], message });
      else if (part !== undefined && part in structure)
        context.addIssue({ code: 'custom', path: ['plan', 'structure', ...path], message });
    }
  });

/** A stored option with every part that its form shows. */
export function draftOf({ name, plan }: OptionDraft): OptionDraft {
  return { name, plan: familyUiOf(plan.family).whole(plan) };
}

const absent = (value: unknown) => value === undefined || value === null;

/** A form's values as a plan: what was left empty is left out. */
export function cleaned({ name, plan }: OptionDraft): OptionDraft {
  const { units, clusterSize, repeated, overrides, ...rest } = plan;
  const kept = planningValueKeys.flatMap((key) => {
    const override = overrides[key];
    return override && !absent(override.value) ? [[key, override] as const] : [];
  });
  return {
    name,
    plan: {
      ...rest,
      ...(absent(units) ? {} : { units }),
      ...(absent(clusterSize) ? {} : { clusterSize }),
      ...(absent(repeated) ? {} : { repeated }),
      overrides: Object.fromEntries(kept),
    },
  };
}

/** What a number field holds, as a number: NaN for text that is none. */
const numeric = <Value>(held: Value): Value | number => (typeof held === 'string' ? Number.NaN : held);

/** A form's values as an option that can be weighed while it is typed. */
export function weighable(draft: OptionDraft): OptionDraft {
  const { name, plan } = cleaned(draft);
  const { units, clusterSize, repeated, overrides, structure, ...rest } = plan;
  const { allocation } = structure;
  return {
    name,
    plan: {
      ...rest,
      structure: Array.isArray(allocation)
        ? { ...structure, allocation: allocation.map(numeric) }
        : structure,
      ...(units === undefined ? {} : { units: numeric(units) }),
      ...(clusterSize === undefined ? {} : { clusterSize: numeric(clusterSize) }),
      ...(repeated && {
        repeated: { baselines: numeric(repeated.baselines), followUps: numeric(repeated.followUps) },
      }),
      overrides: Object.fromEntries(
        Object.entries(overrides).map(([key, { value, reason }]) => [key, { value: numeric(value), reason }]),
      ),
    },
  };
}

/** Where two versions of an option differ, in words a person can compare. */
export function differences(
  mine: OptionDraft,
  theirs: OptionDraft,
): { label: string; mine: string; theirs: string }[] {
  const [a, b] = [leaves(cleaned(mine)), leaves(cleaned(draftOf(theirs)))];
  return [...new Set([...a.keys(), ...b.keys()])].flatMap((label) => {
    const [own, other] = [a.get(label) ?? 'not stated', b.get(label) ?? 'not stated'];
    return own === other ? [] : [{ label, mine: own, theirs: other }];
  });
}

export const sameOption = (a: OptionDraft, b: OptionDraft): boolean => differences(a, b).length === 0;

function leaves({ name, plan }: OptionDraft): Map<string, string> {
  const { units, clusterSize, repeated, overrides, treatments, structure } = plan;
  const entries: [string, unknown][] = [
    ['Name', name],
    ['Size', units],
    ['Cluster size', clusterSize],
    ['Baselines', repeated?.baselines],
    ['Follow-ups', repeated?.followUps],
    ['Treatments', treatments.map((treatment) => treatment + 1)],
    ...structureLeaves(structure),
    ...planningValueKeys.flatMap((key): [string, unknown][] => [
      [planningValueTraits[key].label, overrides[key]?.value],
      [`${planningValueTraits[key].label}, reason`, overrides[key]?.reason],
    ]),
  ];
  return new Map(entries.flatMap(([label, value]) => (absent(value) ? [] : [[label, inWords(value)]])));
}

const structureLabels: Record<string, string> = {
  allocation: 'Allocation',
  sequences: 'Sequences',
  adjust: 'Adjustment',
  against: 'Compared with',
  powerGoal: 'Power goal',
};

function structureLeaves(structure: Record<string, unknown>): [string, unknown][] {
  return Object.entries(structure).flatMap(([key, value]): [string, unknown][] =>
    typeof value === 'object' && value !== null && !Array.isArray(value)
      ? structureLeaves(value as Record<string, unknown>)
      : [[structureLabels[key] ?? key, value]],
  );
}

const inWords = (value: unknown): string => (Array.isArray(value) ? value.join(', ') : String(value));
