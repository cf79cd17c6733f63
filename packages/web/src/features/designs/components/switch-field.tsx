import { Checkbox, Field } from '@fluentui/react-components';
import { useController } from 'react-hook-form';
import { type PartProps, structurePath } from './structure-props';

/** A part that the design has or has not. */
export function SwitchField({ part, form }: PartProps<'switch'>) {
  const { field, fieldState } = useController({ control: form.control, name: structurePath(part.key) });
  const { error } = fieldState;
  return (
    <Field hint={part.says} validationState={error ? 'error' : 'none'} validationMessage={error?.message}>
      <Checkbox
        label={part.label}
        checked={field.value === (true as unknown)}
        onChange={(_, { checked }) => field.onChange(checked === true)}
        onBlur={field.onBlur}
      />
    </Field>
  );
}
