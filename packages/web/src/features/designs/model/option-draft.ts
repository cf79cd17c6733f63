import { planningValueKeys, planningValueTraits } from '@steelyard/calc';
import type { OptionDraft } from '../families/family-ui';
import { familyUiOf } from '../families/registry';
import { structureInWords } from './structure-words';

/** A stored option with every part that its form shows. */
export function draftOf({ name, plan }: OptionDraft): OptionDraft {
  return { name, plan: familyUiOf(plan.family).whole(plan) };
}

const absent = (value: unknown) => value === undefined || value === null;

/** A form's values as a plan: what was left empty is left out. */
export function cleaned({ name, plan }: OptionDraft): OptionDraft {
  const { units, clusterSize, repeated, multiplicityReason, structure, overrides, ...rest } = plan;
  const kept = planningValueKeys.flatMap((key) => {
    const { value, reason = '' } = overrides[key] ?? {};
    return absent(value) && !reason.trim() ? [] : [[key, { value, reason: reason.trim() }]];
  });
  return {
    name: name.trim(),
    plan: {
      ...rest,
      structure: withoutNull(structure),
      ...(absent(units) ? {} : { units }),
      ...(absent(clusterSize) ? {} : { clusterSize }),
      ...(absent(repeated) ? {} : { repeated }),
      ...(multiplicityReason?.trim() ? { multiplicityReason: multiplicityReason.trim() } : {}),
      overrides: Object.fromEntries(kept),
    },
  };
}

/** A structure without the parts that were switched off, which a form keeps as null. */
function withoutNull(structure: Record<string, unknown>): Record<string, unknown> {
  const parts = Object.entries(structure).filter(([, value]) => value !== null);
  return Object.fromEntries(
    parts.map(([key, value]) => [
      key,
      typeof value === 'object' && !Array.isArray(value)
        ? withoutNull(value as Record<string, unknown>)
        : value,
    ]),
  );
}

/** What a number field holds, as a number: NaN for text that is none. */
const numeric = <Value>(held: Value): Value | number => (typeof held === 'string' ? Number.NaN : held);

/**
 * A form's values as an option that can be weighed while it is typed. What is no figure in the structure is left to
 * calc, which refuses it there.
 */
export function weighable(draft: OptionDraft): OptionDraft {
  const { name, plan } = cleaned(draft);
  const { units, clusterSize, repeated, overrides, ...rest } = plan;
  return {
    name,
    plan: {
      ...rest,
      ...(units === undefined ? {} : { units: numeric(units) }),
      ...(clusterSize === undefined ? {} : { clusterSize: numeric(clusterSize) }),
      ...(repeated && {
        repeated: { baselines: numeric(repeated.baselines), followUps: numeric(repeated.followUps) },
      }),
      overrides: Object.fromEntries(
        Object.entries(overrides).flatMap(([key, { value, reason }]) =>
          absent(value) ? [] : [[key, { value: numeric(value), reason }]],
        ),
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

/** Digits that tell any two numbers apart. */
const exactly = 17;

function leaves({ name, plan }: OptionDraft): Map<string, string> {
  const { units, clusterSize, repeated, multiplicityReason, overrides, treatments, structure } = plan;
  const entries: [string, unknown][] = [
    ['Name', name],
    ['Size', units],
    ['Cluster size', clusterSize],
    ['Baselines', repeated?.baselines],
    ['Follow-ups', repeated?.followUps],
    ['Treatments', treatments.map((treatment) => treatment + 1)],
    ...structureInWords(structure, exactly),
    ['Reason for the stance on several comparisons', multiplicityReason],
    ...planningValueKeys.flatMap((key): [string, unknown][] => [
      [planningValueTraits[key].label, overrides[key]?.value],
      [`${planningValueTraits[key].label}, reason`, overrides[key]?.reason],
    ]),
  ];
  return new Map(entries.flatMap(([label, value]) => (absent(value) ? [] : [[label, inWords(value)]])));
}

const inWords = (value: unknown): string => (Array.isArray(value) ? value.join(', ') : String(value));
