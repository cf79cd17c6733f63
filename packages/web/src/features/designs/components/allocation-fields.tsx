import { makeStyles, tokens } from '@fluentui/react-components';
import type { FieldPath } from 'react-hook-form';
import { capitalised } from '../../../shared/format/lists';
import { NumberField } from '../../../shared/ui/number-field';
import type { OptionDraft, StructureFormProps } from '../families/family-ui';

const useStyles = makeStyles({
  fields: { display: 'grid', gap: '8px', padding: 0, margin: 0, border: 'none', minWidth: 0 },
  legend: { padding: 0, fontWeight: 700, marginBottom: '4px' },
  told: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
});

/** One share an arm, control first. */
export function AllocationFields({ control, study, plan }: StructureFormProps) {
  const styles = useStyles();
  return (
    <fieldset className={styles.fields}>
      <legend className={styles.legend}>Allocation ratio</legend>
      <p className={styles.told}>How large each arm is beside the others; equal shares are 1 and 1.</p>
      {plan.treatments.map((treatment, arm) => (
        <NumberField
          key={treatment}
          beside
          label={capitalised(study.treatments[treatment]?.name ?? `treatment ${treatment + 1}`)}
          control={control}
          name={`plan.structure.allocation.${arm}` as FieldPath<OptionDraft>}
        />
      ))}
    </fieldset>
  );
}
