import type { Control, FieldPath, FieldValues } from 'react-hook-form';
import { TextField } from '../../../shared/ui/form';
import { RadioField } from '../../../shared/ui/radio-field';
import { kindWords, type OutcomeValues } from '../model/outcome-values';

interface OutcomeKindFieldsProps<Values extends FieldValues> {
  control: Control<Values>;
  /** Where each is kept in the form. */
  names: Record<'label' | 'kind' | 'unit', FieldPath<Values>>;
  kind: OutcomeValues['kind'];
  onChosen: (chosen: string | number) => void;
}

/** What is measured, of what kind it is, and its unit where the kind has one. */
export function OutcomeKindFields<Values extends FieldValues>(props: OutcomeKindFieldsProps<Values>) {
  const { control, names, kind, onChosen } = props;
  return (
    <>
      <TextField
        label="Outcome"
        hint="What is measured in each participant, and when."
        control={control}
        name={names.label}
        autoComplete="off"
      />
      <RadioField
        label="Kind of outcome"
        control={control}
        name={names.kind}
        choices={Object.entries(kindWords).map(([value, { name, says }]) => ({
          value,
          label: `${name}: ${says}`,
        }))}
        onChosen={onChosen}
      />
      {kind === 'continuous' && (
        <TextField
          label="Unit"
          hint="As it stands behind a number, such as g/L; empty where there is none."
          control={control}
          name={names.unit}
          autoComplete="off"
        />
      )}
    </>
  );
}
