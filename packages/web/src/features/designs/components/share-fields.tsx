import { Checkbox, makeStyles, tokens } from '@fluentui/react-components';
import { useEffect, useRef } from 'react';
import { useController } from 'react-hook-form';
import { NumberField } from '../../../shared/ui/number-field';
import { type PartProps, structurePath } from './structure-props';

const useStyles = makeStyles({
  fields: { display: 'grid', gap: '8px', padding: 0, margin: 0, border: 'none', minWidth: 0 },
  legend: { padding: 0, fontWeight: 700, marginBottom: '4px' },
  told: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
  fault: { color: tokens.colorStatusDangerForeground1, fontSize: '13px', lineHeight: '18px' },
});

const path = structurePath('allocation');

/** One share each, how large it is beside the others; the first is what the size counts. */
export function ShareFields({ part, form }: PartProps<'shares'>) {
  const styles = useStyles();
  const { field, fieldState } = useController({ control: form.control, name: path });
  const shares = Array.isArray(field.value) ? (field.value as unknown[]) : undefined;
  const { of: names, unequal } = part;
  const fault = fieldState.error?.message ?? fieldState.error?.root?.message;

  // Sequences come and go as the schedule is drawn up or a number of steps is typed; each finds its share again.
  const known = useRef<unknown[]>([]);
  useEffect(() => {
    const held: unknown = form.getValues(path);
    if (!Array.isArray(held) || held.length === names.length) return;
    known.current = [...held, ...known.current.slice(held.length)];
    form.setValue(path, names.map((_, index) => known.current[index] ?? 1) as never, {
      shouldValidate: true,
    });
  }, [form, names]);

  const differ = (checked: boolean) =>
    form.setValue(path, (checked ? names.map(() => 1) : null) as never, {
      shouldDirty: true,
      shouldValidate: true,
    });

  return (
    <fieldset className={styles.fields}>
      <legend className={styles.legend}>{part.legend}</legend>
      {unequal && (
        <Checkbox
          label={unequal}
          checked={shares !== undefined}
          onChange={(_, { checked }) => differ(checked === true)}
        />
      )}
      {(shares || !unequal) && (
        <>
          <p className={styles.told}>{part.says}</p>
          {names.map((name, index) => (
            <NumberField
              key={name}
              beside
              label={name}
              control={form.control}
              name={structurePath(`allocation.${index}`)}
            />
          ))}
        </>
      )}
      {fault && (
        <p role="alert" className={styles.fault}>
          {fault}
        </p>
      )}
    </fieldset>
  );
}
