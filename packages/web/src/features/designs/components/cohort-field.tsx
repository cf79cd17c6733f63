import { Field, Radio, RadioGroup } from '@fluentui/react-components';
import { planningValueFor } from '@steelyard/calc';
import { useWatch } from 'react-hook-form';
import type { PartProps } from './structure-props';

const path = 'plan.overrides.individualAutocorrelation';

/**
 * New participants in each period, or the same. The design says so by its individual autocorrelation: 0, or what the
 * ledger holds; an option of the other kind overrides that.
 */
export function CohortField({ form, plan, ledger, words: { participants } }: PartProps<'cohort'>) {
  const own = useWatch({ control: form.control, name: path })?.value;
  const shared = planningValueFor('individualAutocorrelation', { ...plan, overrides: {} }, ledger) ?? 0;
  const cohort = typeof own === 'number' ? own > 0 : shared > 0;
  const fresh = `New ${participants.many} are measured in each period.`;
  const same = `The same ${participants.many} are measured in every period.`;
  const measure = (override: { value: number; reason: string } | undefined) => {
    form.setValue(path, override, { shouldDirty: true });
    form.clearErrors(path);
  };
  if (shared === 0 && !cohort) {
    return (
      <p>
        {fresh} To follow the same ones as a closed cohort, state their individual autocorrelation, above 0,
        in the ledger.
      </p>
    );
  }
  if (shared === 0) return <p>{same} This option’s individual autocorrelation is above 0.</p>;
  return (
    <Field label="Who is measured">
      <RadioGroup
        value={cohort ? 'cohort' : 'cross-section'}
        onChange={(_, { value }) => measure(value === 'cohort' ? undefined : { value: 0, reason: fresh })}
      >
        <Radio
          value="cohort"
          label={`Closed cohort. ${same} They resemble themselves by the ledger’s individual autocorrelation.`}
        />
        <Radio value="cross-section" label={`Cross-sections. ${fresh}`} />
      </RadioGroup>
    </Field>
  );
}
