import type { Control, UseFormSetValue } from 'react-hook-form';
import { TextField } from '../../../shared/ui/form';
import { NumberField } from '../../../shared/ui/number-field';
import { RadioField } from '../../../shared/ui/radio-field';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { basisWords, type QuestionValues } from '../model/question-form';

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
      <TextField
        label="Outcome"
        hint="What is measured in each participant, and when."
        control={control}
        name="outcomeLabel"
        autoComplete="off"
      />
      <RadioField
        label="Kind of outcome"
        control={control}
        name="plan.outcome.kind"
        choices={[
          { value: 'continuous', label: 'Continuous: a measured amount, compared by its mean' },
          { value: 'binary', label: 'Binary: it happens or it does not, compared by proportions' },
        ]}
        // A difference of means is none of proportions, and a proportion has no unit.
        onChosen={(chosen) => {
          setValue('plan.outcome.difference', undefined);
          if (chosen === 'binary') setValue('outcomeUnit', '');
        }}
      />
      {kind === 'continuous' && (
        <TextField
          label="Unit"
          hint="As it stands behind a number, such as g/L; empty where there is none."
          control={control}
          name="outcomeUnit"
          autoComplete="off"
        />
      )}
      <RadioField
        label="Better is"
        control={control}
        name="plan.outcome.better"
        choices={
          kind === 'continuous'
            ? [
                { value: 'higher', label: 'A higher value' },
                { value: 'lower', label: 'A lower value' },
              ]
            : [
                { value: 'higher', label: 'A larger proportion' },
                { value: 'lower', label: 'A smaller proportion' },
              ]
        }
      />
      {kind === 'continuous' ? (
        <NumberField
          key="mean"
          label="Target difference"
          hint="Active minus control: negative where the treatment lowers the outcome."
          unit={values.outcomeUnit}
          control={control}
          name="plan.outcome.difference"
        />
      ) : (
        <NumberField
          key="proportion"
          kind="percent"
          label="Target difference, in percentage points"
          hint="Active minus control: negative where the treatment makes it rarer. The control proportion is in the ledger."
          control={control}
          name="plan.outcome.difference"
        />
      )}
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
export function TestFields({ control }: QuestionPartProps) {
  return (
    <>
      <NumberField label="Type I error" kind="percent" control={control} name="plan.test.alpha" />
      <RadioField
        label="Sides"
        control={control}
        name="plan.test.sides"
        choices={[
          { value: 2, label: 'Two-sided' },
          { value: 1, label: 'One-sided' },
        ]}
      />
    </>
  );
}
