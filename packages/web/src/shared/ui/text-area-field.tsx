import { Field, Textarea } from '@fluentui/react-components';
import { type Control, type FieldPath, type FieldValues, useController } from 'react-hook-form';

interface TextAreaFieldProps<Values extends FieldValues> {
  label: string;
  hint?: string;
  control: Control<Values>;
  name: FieldPath<Values>;
  rows?: number;
}

/** A labelled text of several lines with its hint and message. */
export function TextAreaField<Values extends FieldValues>(props: TextAreaFieldProps<Values>) {
  const { label, hint, control, name, rows = 2 } = props;
  const { field, fieldState } = useController({ control, name });
  const { error } = fieldState;
  return (
    <Field
      label={label}
      hint={hint}
      validationState={error ? 'error' : 'none'}
      validationMessage={error?.message}
    >
      <Textarea {...field} value={field.value ?? ''} rows={rows} resize="vertical" />
    </Field>
  );
}
