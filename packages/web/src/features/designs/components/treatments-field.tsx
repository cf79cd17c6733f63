import { Checkbox, Field, makeStyles, Radio, RadioGroup, Select, tokens } from '@fluentui/react-components';
import { useController } from 'react-hook-form';
import { capitalised } from '../../../shared/format/lists';
import { familyUiOf } from '../families/registry';
import type { StructureFormProps } from './structure-props';

const useStyles = makeStyles({
  arms: { display: 'grid', margin: 0, padding: 0, border: 'none', minWidth: 0 },
  roles: { display: 'grid', gap: '8px', margin: 0, padding: 0, border: 'none', minWidth: 0 },
  legend: { padding: 0, fontWeight: 700 },
  fault: { color: tokens.colorStatusDangerForeground1, fontSize: '13px' },
});

/** Which of the study's treatments the option compares, where it can choose; what goes by treatment follows. */
export function TreatmentsField({ form, study, plan }: StructureFormProps) {
  const styles = useStyles();
  const { field, fieldState } = useController({ control: form.control, name: 'plan.treatments' });
  const face = familyUiOf(plan.family);
  const { fewest, most } = face.arms(study);
  const names = study.treatments.map(({ name }) => capitalised(name));
  const fault = fieldState.error?.message ?? fieldState.error?.root?.message;
  const chosen = field.value;

  const take = (treatments: number[]) => {
    const { structure } = face.treated(form.getValues('plan'), treatments);
    field.onChange(treatments);
    form.setValue('plan.structure', structure, { shouldDirty: true, shouldValidate: true });
  };

  if (face.roles) {
    /** Whoever had the role changes places with whoever takes it. */
    const place = (role: number, treatment: number) => {
      const given = chosen[role] as number;
      take(chosen.map((each, at) => (at === role ? treatment : each === treatment ? given : each)));
    };
    return (
      <fieldset className={styles.roles}>
        <legend className={styles.legend}>Treatments compared</legend>
        {face.roles.map((role, at) => (
          <Field key={role} label={role}>
            <Select value={chosen[at]} onChange={(_, { value }) => place(at, Number(value))}>
              {names.map((name, treatment) => (
                <option key={name} value={treatment}>
                  {name}
                </option>
              ))}
            </Select>
          </Field>
        ))}
      </fieldset>
    );
  }
  if (names.length < 3) return null;
  if (most === 2) {
    return (
      <Field label={`Compared with ${names[0]}`} validationMessage={fault}>
        <RadioGroup
          value={String(chosen[1])}
          onChange={(_, { value }) => take([chosen[0] ?? 0, Number(value)])}
        >
          {names.slice(1).map((name, index) => (
            <Radio key={name} value={String(index + 1)} label={name} />
          ))}
        </RadioGroup>
      </Field>
    );
  }
  const toggle = (treatment: number, checked: boolean) =>
    take(
      names.flatMap((_, index) => ((index === treatment ? checked : chosen.includes(index)) ? [index] : [])),
    );
  return (
    <fieldset className={styles.arms}>
      <legend className={styles.legend}>Treatments compared</legend>
      {names.map((name, treatment) => {
        const given = chosen.includes(treatment);
        return (
          <Checkbox
            key={name}
            label={`${name}${treatment === 0 ? ', control' : ''}`}
            checked={given}
            disabled={treatment === 0 || (given ? chosen.length <= fewest : chosen.length >= most)}
            onChange={(_, { checked }) => toggle(treatment, checked === true)}
          />
        );
      })}
      {fault && (
        <p role="alert" className={styles.fault}>
          {fault}
        </p>
      )}
    </fieldset>
  );
}
