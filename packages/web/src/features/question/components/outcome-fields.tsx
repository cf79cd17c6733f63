import type { Hypothesis } from '@steelyard/calc';
import type { Control, UseFormSetValue } from 'react-hook-form';
import { TextField } from '../../../shared/ui/form';
import { NumberField } from '../../../shared/ui/number-field';
import { RadioField } from '../../../shared/ui/radio-field';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { betterWords, isRatio } from '../model/outcome-values';
import { basisWords, hypothesisWords, type QuestionValues, usualAlpha } from '../model/question-form';
import { OutcomeKindFields } from './outcome-kind-fields';
import { TargetFields } from './target-fields';

export interface QuestionPartProps {
  control: Control<QuestionValues>;
  values: QuestionValues;
  setValue: UseFormSetValue<QuestionValues>;
}

/** What is measured and how large a difference the trial looks for. */
export function OutcomeFields({ control, values, setValue }: QuestionPartProps) {
  const { kind } = values.plan.outcome;
  return (
    <>
      <OutcomeKindFields
        control={control}
        names={{ label: 'outcomeLabel', kind: 'plan.outcome.kind', unit: 'outcomeUnit' }}
        kind={kind}
        // A difference of means is none of proportions, and only a mean has a unit.
        onChosen={(chosen) => {
          setValue('plan.outcome.difference', undefined);
          if (chosen !== 'continuous') setValue('outcomeUnit', '');
        }}
      />
      <RadioField
        label="Better is"
        control={control}
        name="plan.outcome.better"
        choices={Object.entries(betterWords[kind]).map(([value, label]) => ({ value, label }))}
      />
      <TargetFields
        control={control}
        setValue={setValue}
        within="plan.outcome"
        kind={kind}
        unit={values.outcomeUnit}
        withinMargin={values.plan.test.hypothesis !== 'superiority'}
      />
    </>
  );
}

/** Why the target difference is what it is. */
export function BasisFields({ control }: QuestionPartProps) {
  return (
    <>
      <RadioField
        label="Why this difference"
        control={control}
        name="basis.kind"
        choices={Object.entries(basisWords).map(([value, label]) => ({ value, label }))}
      />
      <TextField
        label="To whom"
        hint="Who finds it important or realistic, such as a panel of people with the condition."
        control={control}
        name="basis.toWhom"
        autoComplete="off"
      />
      <TextAreaField label="Because" control={control} name="basis.why" />
    </>
  );
}

/** How the difference is tested. */
export function TestFields({ control, values, setValue }: QuestionPartProps) {
  const { outcome, test } = values.plan;
  const usual = test.alpha === usualAlpha[test.hypothesis];
  return (
    <>
      <RadioField
        label="Hypothesis"
        control={control}
        name="plan.test.hypothesis"
        choices={Object.entries(hypothesisWords).map(([value, label]) => ({ value, label }))}
        onChosen={(chosen) => {
          setValue('plan.test.sides', chosen === 'superiority' ? 2 : 1);
          if (usual) setValue('plan.test.alpha', usualAlpha[chosen as Hypothesis]);
        }}
      />
      {test.hypothesis !== 'superiority' && (
        <NumberField
          key={`margin-${outcome.kind === 'binary' ? 'percent' : 'number'}`}
          label={outcome.kind === 'binary' ? 'Margin, in percentage points' : 'Margin'}
          hint={
            isRatio(outcome.kind)
              ? 'A ratio above 1: the worst one that would still do, or its inverse.'
              : 'Above 0: the worst difference that would still do.'
          }
          {...(outcome.kind === 'continuous' ? { unit: values.outcomeUnit } : {})}
          {...(outcome.kind === 'binary' ? { kind: 'percent' as const } : {})}
          control={control}
          name="plan.test.margin"
        />
      )}
      <NumberField
        label="Type I error"
        hint={
          test.hypothesis === 'superiority'
            ? undefined
            : 'Of one side: usually 2.5 % for non-inferiority, 5 % for each of the two tests of equivalence.'
        }
        kind="percent"
        control={control}
        name="plan.test.alpha"
      />
      {test.hypothesis === 'superiority' && (
        <RadioField
          label="Sides"
          control={control}
          name="plan.test.sides"
          choices={[
            { value: 2, label: 'Two-sided' },
            { value: 1, label: 'One-sided' },
          ]}
        />
      )}
    </>
  );
}
