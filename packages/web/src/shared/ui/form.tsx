import { Field, Input, type InputProps, makeStyles } from '@fluentui/react-components';
import type { ReactNode } from 'react';
import { type Control, type FieldPath, type FieldValues, useController } from 'react-hook-form';
import { Notice } from './notice';

const useStyles = makeStyles({
  form: { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr)', gap: '14px' },
});

/** A form in one column; `fault` is what concerns the whole of it. */
export function Form(props: {
  label: string;
  onSubmit: () => void;
  fault: string | undefined;
  children: ReactNode;
}) {
  const styles = useStyles();
  return (
    <form
      noValidate
      aria-label={props.label}
      className={styles.form}
      onSubmit={(event) => {
        event.preventDefault();
        props.onSubmit();
      }}
    >
      {props.fault && (
        <Notice intent="error" role="alert">
          {props.fault}
        </Notice>
      )}
      {props.children}
    </form>
  );
}

interface TextFieldProps<Values extends FieldValues> {
  label: string;
  hint?: string;
  control: Control<Values>;
  name: FieldPath<Values>;
  type?: InputProps['type'];
  autoComplete: string;
}

/** A labelled text input with its hint and message. */
export function TextField<Values extends FieldValues>(props: TextFieldProps<Values>) {
  const { label, hint, control, name, type = 'text', autoComplete } = props;
  const { field, fieldState } = useController({ control, name });
  const { error } = fieldState;
  return (
    <Field
      label={label}
      hint={hint}
      validationState={error ? 'error' : 'none'}
      validationMessage={error?.message}
    >
      <Input {...field} type={type} autoComplete={autoComplete} />
    </Field>
  );
}
