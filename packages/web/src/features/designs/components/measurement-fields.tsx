import { Checkbox, makeStyles } from '@fluentui/react-components';
import { useController } from 'react-hook-form';
import { NumberField } from '../../../shared/ui/number-field';
import type { PartProps } from './structure-props';

const useStyles = makeStyles({ fields: { display: 'grid', gap: '8px' } });

/** Whether a continuous outcome is measured once or more often, and how often. */
export function MeasurementFields({ form: { control } }: PartProps<'measurements'>) {
  const styles = useStyles();
  const { field } = useController({ control, name: 'plan.repeated' });
  return (
    <div className={styles.fields}>
      <Checkbox
        label="Measured more than once: baselines before, follow-ups after"
        checked={Boolean(field.value)}
        onChange={(_, { checked }) => field.onChange(checked ? { baselines: 1, followUps: 1 } : null)}
      />
      {field.value && (
        <>
          <NumberField
            beside
            kind="whole"
            label="Baselines"
            hint="Each participant is adjusted for where they began."
            control={control}
            name="plan.repeated.baselines"
          />
          <NumberField
            beside
            kind="whole"
            label="Follow-ups"
            hint="Their mean is compared."
            control={control}
            name="plan.repeated.followUps"
          />
        </>
      )}
    </div>
  );
}
