import { Field, Input, makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { useEffect, useId, useRef, useState } from 'react';
import { type Control, type FieldPath, type FieldValues, useController } from 'react-hook-form';
import {
  bareText,
  type Held,
  inUnitShown,
  kept,
  type NumberKind,
  plainValue,
  stepped,
  textOf,
} from './number-field-text';

const useStyles = makeStyles({
  input: { width: '100%', minWidth: 0 },
  text: { minWidth: 0, textAlign: 'end' },
  unit: { color: tokens.colorNeutralForeground2, whiteSpace: 'nowrap' },
  beside: {
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr) minmax(92px, 40%)',
    alignItems: 'center',
    columnGap: '12px',
    // The hint and the message take the whole line below.
    '> :nth-child(n + 3)': { gridColumn: '1 / -1' },
  },
});

export interface NumberFieldProps<Values extends FieldValues> {
  label: string;
  /** As shown behind the number; percent fields show % of themselves. */
  unit?: string;
  kind?: NumberKind;
  control: Control<Values>;
  name: FieldPath<Values>;
  hint?: string;
  /** The label beside the field instead of above it. */
  beside?: boolean;
  disabled?: boolean;
}

/**
 * The field for every number. Its form value is the number as it is kept (a proportion for a percent), `undefined`
 * while it is empty and the text itself while that is no number, so that whatever keeps the form's values keeps it.
 */
export function NumberField<Values extends FieldValues>(props: NumberFieldProps<Values>) {
  const { label, kind = 'number', control, name, hint, beside, disabled } = props;
  const unit = props.unit ?? (kind === 'percent' ? '%' : '');
  const styles = useStyles();
  const unitId = useId();
  const { field, fieldState } = useController({ control, name });
  const [text, setText] = useState(() => textOf(field.value, kind));
  const typed = useRef({ text, value: field.value as Held });
  // Text that is no number already was typed before.
  const [left, setLeft] = useState(typeof typed.current.value === 'string');

  // After a reset, or a value set from elsewhere, what was typed no longer stands for it. The controller's own value
  // will not do: for an emptied field it may fall back on the default.
  useEffect(() => {
    const held = valueAt(control._formValues, name);
    if (Object.is(held, typed.current.value)) return;
    typed.current = { text: textOf(held, kind), value: held };
    setText(typed.current.text);
  });

  const take = (nextText: string, value: Held) => {
    typed.current = { text: nextText, value };
    setText(nextText);
    field.onChange(value);
  };

  const read = (nextText: string) => {
    setLeft(false);
    const bare = bareText(nextText, kind, unit);
    const value = bare === '' ? undefined : (plainValue(bare, kind) ?? nextText);
    take(nextText, value);
    if (typeof value !== 'string') return;
    void import('./number-field-expression').then(({ valueOfExpression }) => {
      const found = valueOfExpression(bare);
      // More may have been typed while the parser was on its way.
      if (typed.current.text === nextText && !Number.isNaN(found)) take(nextText, kept(found, kind));
    });
  };

  const tidy = () => {
    setLeft(true);
    field.onBlur();
    if (plainValue(bareText(text, kind, unit), kind) === undefined) return;
    const tidied = textOf(typed.current.value, kind);
    typed.current = { ...typed.current, text: tidied };
    setText(tidied);
  };

  const noNumber = typeof typed.current.value === 'string';
  const isExpression = !noNumber && plainValue(bareText(text, kind, unit), kind) === undefined;
  const complaint = noNumber
    ? (left || fieldState.error) && `“${text.trim()}” is not a number. Enter one such as ${examples[kind]}.`
    : fieldState.error?.message && inUnitShown(fieldState.error.message, kind);
  const worth =
    isExpression && text.trim() !== '' ? `= ${textOf(roundedForReading(typed.current.value), kind)}` : '';

  return (
    <Field
      label={label}
      hint={worth ? `${worth}${unit ? `\u00a0${unit}` : ''}` : hint}
      className={mergeClasses(beside && styles.beside)}
      validationState={complaint ? 'error' : 'none'}
      validationMessage={complaint || undefined}
    >
      <Input
        name={field.name}
        ref={field.ref}
        value={text}
        disabled={disabled}
        inputMode="decimal"
        autoComplete="off"
        className={styles.input}
        input={{ className: styles.text }}
        aria-describedby={unit ? unitId : undefined}
        contentAfter={
          unit ? (
            <span id={unitId} className={styles.unit}>
              {unit}
            </span>
          ) : undefined
        }
        onChange={(_, data) => read(data.value)}
        onBlur={tidy}
        onKeyDown={(event) => {
          const { value } = typed.current;
          if (!(event.key === 'ArrowUp' || event.key === 'ArrowDown')) return;
          if (typeof value !== 'number' || isExpression) return;
          event.preventDefault();
          const next = stepped(value, kind, event.key === 'ArrowUp' ? 1 : -1);
          take(textOf(next, kind), next);
        }}
      />
    </Field>
  );
}

const valueAt = (values: FieldValues, name: string): Held =>
  name.split('.').reduce<FieldValues | undefined>((part, key) => part?.[key], values) as Held;

const examples: Record<NumberKind, string> = {
  number: '12.5 or √3',
  percent: '12.5',
  whole: '120',
  money: '490,000',
};

const roundedForReading = (value: Held): Held =>
  typeof value === 'number' ? Number(value.toPrecision(5)) : value;
