import { Checkbox, makeStyles, tokens } from '@fluentui/react-components';
import type { StudyView } from '@steelyard/api/contract/studies';
import { type UseFormReturn, useController } from 'react-hook-form';
import { capitalised } from '../../../shared/format/lists';
import type { OptionDraft } from '../../designs/families/family-ui';

const useStyles = makeStyles({
  arms: { display: 'grid', margin: 0, padding: 0, border: 'none', minWidth: 0 },
  legend: { padding: 0, fontWeight: 700 },
  fault: { color: tokens.colorStatusDangerForeground1, fontSize: '13px' },
});

/** Which of the study's treatments the option compares, where there are more than two; the shares follow. */
export function TreatmentsField({ form, study }: { form: UseFormReturn<OptionDraft>; study: StudyView }) {
  const styles = useStyles();
  const { field, fieldState } = useController({ control: form.control, name: 'plan.treatments' });
  if (study.treatments.length < 3) return null;
  const chosen = field.value;
  const fault = fieldState.error?.message ?? fieldState.error?.root?.message;

  const toggle = (treatment: number, checked: boolean) => {
    const next = study.treatments
      .map((_, index) => index)
      .filter((index) => (index === treatment ? checked : chosen.includes(index)));
    const shares = form.getValues('plan.structure.allocation');
    field.onChange(next);
    if (!Array.isArray(shares)) return;
    const shareOf = (index: number) => shares[chosen.indexOf(index)] ?? 1;
    form.setValue('plan.structure.allocation', next.map(shareOf), { shouldDirty: true });
  };

  return (
    <fieldset className={styles.arms}>
      <legend className={styles.legend}>Arms</legend>
      {study.treatments.map(({ name }, treatment) => (
        <Checkbox
          key={name}
          label={`${capitalised(name)}${treatment === 0 ? ', control' : ''}`}
          checked={chosen.includes(treatment)}
          disabled={treatment === 0}
          onChange={(_, { checked }) => toggle(treatment, checked === true)}
        />
      ))}
      {fault && (
        <p role="alert" className={styles.fault}>
          {fault}
        </p>
      )}
    </fieldset>
  );
}
