import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { AddRegular, DeleteRegular } from '@fluentui/react-icons';
import {
  type Control,
  type FieldError,
  type FieldPath,
  type FieldValues,
  get,
  type UseFormSetValue,
  useFormState,
  useWatch,
} from 'react-hook-form';
import { NumberField } from '../../../shared/ui/number-field';
import type { OutcomeValues } from '../model/outcome-values';

const useStyles = makeStyles({
  categories: { display: 'grid', gap: '8px', border: 0, padding: 0, margin: 0, minWidth: 0 },
  category: { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr) auto', gap: '8px', alignItems: 'end' },
  add: { justifySelf: 'start' },
  wrong: { color: tokens.colorStatusDangerForeground1 },
});

interface TargetFieldsProps<Values extends FieldValues> {
  control: Control<Values>;
  setValue: UseFormSetValue<Values>;
  /** Where the outcome is kept in the form. */
  within: string;
  kind: OutcomeValues['kind'];
  unit: string;
  /** Whether the test shows that there is no more than a margin between the arms, rather than a difference. */
  withinMargin?: boolean;
}

/** How large a difference the trial looks for, in the terms of its kind of outcome. */
export function TargetFields<Values extends FieldValues>(props: TargetFieldsProps<Values>) {
  const { control, setValue, within, kind, unit, withinMargin = false } = props;
  // Where no difference is looked for, the figure is the true one that the size is for.
  const label = (what: string) => (withinMargin ? `Assumed ${what}` : `Target ${what}`);
  const hint = (looksFor: string, alike: 0 | 1) =>
    withinMargin
      ? `What is taken to be true, and the size is for: ${alike} where the arms are alike.`
      : looksFor;
  const at = (field: keyof OutcomeValues) => `${within}.${field}` as FieldPath<Values>;
  switch (kind) {
    case 'continuous':
      return (
        <NumberField
          key="mean"
          label={label('difference')}
          hint={hint(
            'The smallest the trial must be able to find. Active minus control: negative where it lowers the outcome.',
            0,
          )}
          unit={unit}
          control={control}
          name={at('difference')}
        />
      );
    case 'binary':
      return (
        <NumberField
          key="proportion"
          kind="percent"
          label={label('difference, in percentage points')}
          hint={hint(
            'Active minus control: negative where the treatment makes it rarer. The control proportion is in the ledger.',
            0,
          )}
          control={control}
          name={at('difference')}
        />
      );
    case 'time-to-event':
      return (
        <>
          <NumberField
            label={label('hazard ratio')}
            hint={hint('Active over control: below 1 where the treatment delays the event.', 1)}
            control={control}
            name={at('hazardRatio')}
          />
          <NumberField
            label="Survival is stated at"
            hint="The share of controls still free of the event by then is in the ledger."
            unit="months"
            control={control}
            name={at('survivalAt')}
          />
          <NumberField
            label="Accrual"
            hint="Months during which participants join."
            unit="months"
            control={control}
            name={at('accrual')}
          />
          <NumberField
            label="Follow-up after accrual"
            hint="Months from the last to join until the analysis."
            unit="months"
            control={control}
            name={at('followUp')}
          />
        </>
      );
    case 'count':
      return (
        <>
          <NumberField
            label={label('rate ratio')}
            hint={hint(
              'Active over control: below 1 where the treatment makes events rarer. The control rate is in the ledger.',
              1,
            )}
            control={control}
            name={at('rateRatio')}
          />
          <NumberField
            label="Exposure of each participant"
            hint="In the time unit of the control rate: 1 where the rate is by year and each is followed for one."
            control={control}
            name={at('exposure')}
          />
        </>
      );
    case 'ordinal':
      return (
        <>
          <NumberField
            label={label('odds ratio')}
            hint={hint('Odds of being in a category or an earlier one, active over control.', 1)}
            control={control}
            name={at('oddsRatio')}
          />
          <CategoryFields control={control} setValue={setValue} within={within} />
        </>
      );
  }
}

/** The share of controls in each category, in order. */
function CategoryFields<Values extends FieldValues>(props: Omit<TargetFieldsProps<Values>, 'kind' | 'unit'>) {
  const { control, setValue, within } = props;
  const styles = useStyles();
  const name = `${within}.controlProbabilities` as FieldPath<Values>;
  const shares: (number | undefined)[] = useWatch({ control, name });
  const { errors } = useFormState({ control, name });
  // A list of fields has its own complaint at its root.
  const wrong = (get(errors, `${name}.root`) as FieldError | undefined)?.message;
  const put = (next: (number | undefined)[]) => setValue(name, next as never, { shouldDirty: true });
  return (
    <fieldset className={styles.categories}>
      <legend>Share of controls in each category, in order; together 100 %</legend>
      {shares.map((_, place) => (
        <div key={place} className={styles.category}>
          <NumberField
            kind="percent"
            label={`Category ${place + 1}`}
            control={control}
            name={`${name}.${place}` as FieldPath<Values>}
          />
          {shares.length > 2 && (
            <Button
              appearance="subtle"
              icon={<DeleteRegular />}
              aria-label={`Remove category ${place + 1}`}
              onClick={() => put(shares.filter((__, other) => other !== place))}
            />
          )}
        </div>
      ))}
      {wrong && (
        <p role="alert" className={styles.wrong}>
          {wrong}
        </p>
      )}
      <Button className={styles.add} icon={<AddRegular />} onClick={() => put([...shares, undefined])}>
        Add a category
      </Button>
    </fieldset>
  );
}
