import type { ChoiceView } from '@steelyard/api/contract/design-sets';
import type { NewChoice } from '@steelyard/api/contract/options';
import { z } from 'zod';
import type { Weighed } from '../../weigh/model/weighing';

export interface ChoiceForm {
  optionId: string;
  why: string;
  /** By option. */
  whyNot: Record<string, string | undefined>;
}

/** Every option that could have been chosen and was not needs its reason. */
export const choiceFormSchema = (options: readonly Weighed[]) =>
  z
    .object({
      version: z.number().int(),
      optionId: z.string().min(1, 'Choose an option.'),
      why: z.string().trim().min(1, 'Say why this option.').max(4000),
      whyNot: z.record(z.string(), z.string().max(4000).or(z.undefined())),
    })
    .superRefine(({ optionId, whyNot }, context) => {
      for (const { id, name, ruling } of options) {
        if (id === optionId || ruling?.kind === 'not-admissible' || whyNot[id]?.trim()) continue;
        context.addIssue({ code: 'custom', path: ['whyNot', id], message: `Say why not ${name}.` });
      }
    });

export const choiceOf = (choice: ChoiceView | null): ChoiceForm => ({
  optionId: choice?.optionId ?? '',
  why: choice?.why ?? '',
  whyNot: Object.fromEntries((choice?.whyNot ?? []).map(({ optionId, why }) => [optionId, why])),
});

/** The choice as it is sent: a reason for each option that was not chosen and has one. */
export function choiceBodyOf(
  { version, optionId, why, whyNot }: ChoiceForm & { version: number },
  options: readonly Weighed[],
): NewChoice {
  return {
    version,
    optionId,
    why,
    whyNot: options.flatMap(({ id }) => {
      const reason = whyNot[id]?.trim();
      return id !== optionId && reason ? [{ optionId: id, why: reason }] : [];
    }),
  };
}
