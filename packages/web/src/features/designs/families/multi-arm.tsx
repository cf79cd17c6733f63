import { Field, Radio, RadioGroup } from '@fluentui/react-components';
import { type FieldPath, useController } from 'react-hook-form';
import { equalShares } from './arms';
import type { FamilyUi, OptionDraft, StructureFormProps } from './family-ui';
import { parallel } from './parallel';

const adjustments: Record<string, string> = {
  none: 'no adjustment',
  bonferroni: 'Bonferroni',
};

const explained = [
  {
    adjust: 'none',
    label: 'No adjustment',
    says: 'Each comparison with control keeps the whole type I error, as for questions of their own.',
  },
  {
    adjust: 'bonferroni',
    label: 'Bonferroni',
    says: 'The type I error is shared out equally, so that all comparisons together keep it.',
  },
];

const comparisons = { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' };

/** Several active arms against one control: parallel arms, and how their comparisons are adjusted. */
export const multiArm: FamilyUi = {
  ...parallel,
  name: 'Multi-arm',
  describes: 'Several active arms share one control; each is compared with it.',
  refusal: ({ treatments }) =>
    treatments.length < 3 ? 'Name a third treatment in the question to compare several arms.' : undefined,
  start: ({ treatments }) => ({
    family: 'multi-arm',
    treatments: treatments.map((_, index) => index),
    structure: { ...equalShares(treatments.length), comparisons },
    overrides: {},
  }),
  whole(plan) {
    const { structure, ...rest } = parallel.whole(plan);
    return { ...rest, structure: { comparisons, ...structure } };
  },
  summary(plan, size, words) {
    const { adjust } = (plan.structure.comparisons ?? {}) as { adjust?: string };
    const named = adjust === undefined ? undefined : (adjustments[adjust] ?? adjust);
    return [parallel.summary(plan, size, words), ...(named ? [named] : [])].join(', ');
  },
  Structure: MultiArmStructure,
};

function MultiArmStructure(props: StructureFormProps) {
  const { Structure } = parallel;
  const { field, fieldState } = useController({
    control: props.control,
    name: 'plan.structure.comparisons.adjust' as FieldPath<OptionDraft>,
  });
  return (
    <>
      <Structure {...props} />
      <Field label="Adjustment for several comparisons" validationMessage={fieldState.error?.message}>
        <RadioGroup
          value={String(field.value ?? '')}
          onChange={(_, { value }) => field.onChange(value)}
          onBlur={field.onBlur}
        >
          {explained.map(({ adjust, label, says }) => (
            <Radio key={adjust} value={adjust} label={`${label}. ${says}`} />
          ))}
        </RadioGroup>
      </Field>
    </>
  );
}
