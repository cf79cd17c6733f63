import { Field, Radio, RadioGroup } from '@fluentui/react-components';
import { type Control, type FieldPath, type FieldValues, useController } from 'react-hook-form';

interface RadioFieldProps<Values extends FieldValues> {
  label: string;
  hint?: string;
  control: Control<Values>;
  name: FieldPath<Values>;
  choices: readonly { value: string | number; label: string }[];
  onChosen?: (value: string | number) => void;
}

/** A choice of one among few; its form value is the chosen one's own, number or text. */
export function RadioField<Values extends FieldValues>(props: RadioFieldProps<Values>) {
  const { label, hint, control, name, choices, onChosen } = props;
  const { field, fieldState } = useController({ control, name });
  const { error } = fieldState;
  return (
    <Field
      label={label}
      hint={hint}
      validationState={error ? 'error' : 'none'}
      // Wrong by not having been made, or by what it requires of something else.
      validationMessage={error && (error.type === 'custom' || !error.type ? error.message : 'Choose one.')}
    >
      <RadioGroup
        name={field.name}
        value={String(field.value ?? '')}
        onBlur={field.onBlur}
        onChange={(_, data) => {
          const chosen = choices.find(({ value }) => String(value) === data.value);
          if (!chosen) return;
          field.onChange(chosen.value);
          onChosen?.(chosen.value);
        }}
      >
        {choices.map((choice) => (
          <Radio key={choice.value} value={String(choice.value)} label={choice.label} />
        ))}
      </RadioGroup>
    </Field>
  );
}
