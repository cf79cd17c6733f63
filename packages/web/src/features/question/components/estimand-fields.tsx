import { Button, Field, makeStyles, Select, tokens } from '@fluentui/react-components';
import { type Control, type FieldPath, useController, useFieldArray } from 'react-hook-form';
import { TextField } from '../../../shared/ui/form';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { type QuestionValues, strategyWords } from '../model/question-form';

const useStyles = makeStyles({
  group: { display: 'grid', gap: '10px', margin: 0, padding: 0, border: 'none', minWidth: 0 },
  legend: { padding: 0, marginBottom: '4px', fontWeight: 700 },
  event: {
    display: 'grid',
    gap: '8px',
    padding: '10px 12px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '8px',
  },
  told: { color: tokens.colorNeutralForeground2 },
  action: { justifySelf: 'start' },
});

interface EstimandFieldsProps {
  control: Control<QuestionValues>;
}

/** What exactly is estimated, by the attributes of ICH E9(R1). */
export function EstimandFields({ control }: EstimandFieldsProps) {
  return (
    <>
      <TextAreaField
        label="Treatment"
        hint="The condition of interest and what it is compared with, as they are to be given."
        control={control}
        name="estimand.treatment"
      />
      <TextAreaField
        label="Population"
        hint="The people the question is about."
        control={control}
        name="estimand.population"
      />
      <TextAreaField
        label="Variable"
        hint="What is observed in each of them, and when."
        control={control}
        name="estimand.variable"
      />
      <IntercurrentEvents control={control} />
      <TextAreaField
        label="Population-level summary"
        hint="What the arms are compared by, such as a difference in means."
        control={control}
        name="estimand.summary"
      />
    </>
  );
}

function IntercurrentEvents({ control }: EstimandFieldsProps) {
  const styles = useStyles();
  const { fields, append, remove } = useFieldArray({ control, name: 'estimand.intercurrentEvents' });
  return (
    <fieldset className={styles.group}>
      <legend className={styles.legend}>Intercurrent events</legend>
      <p className={styles.told}>
        What may happen after treatment begins and bears on the outcome, and how it is dealt with.
      </p>
      {fields.map(({ id }, index) => (
        <div key={id} className={styles.event}>
          <TextField
            label={`Event ${index + 1}`}
            control={control}
            name={`estimand.intercurrentEvents.${index}.event`}
            autoComplete="off"
          />
          <Strategy
            control={control}
            name={`estimand.intercurrentEvents.${index}.strategy`}
            number={index + 1}
          />
          <Button
            className={styles.action}
            aria-label={`Remove event ${index + 1}`}
            onClick={() => remove(index)}
          >
            Remove
          </Button>
        </div>
      ))}
      <Button className={styles.action} onClick={() => append({ event: '', strategy: 'treatment-policy' })}>
        Add an event
      </Button>
    </fieldset>
  );
}

interface StrategyProps extends EstimandFieldsProps {
  name: FieldPath<QuestionValues>;
  number: number;
}

function Strategy({ control, name, number }: StrategyProps) {
  const { field } = useController({ control, name });
  return (
    <Field label={`Strategy for event ${number}`}>
      <Select
        name={field.name}
        ref={field.ref}
        value={String(field.value ?? '')}
        onChange={(_, { value }) => field.onChange(value)}
        onBlur={field.onBlur}
      >
        {Object.entries(strategyWords).map(([value, words]) => (
          <option key={value} value={value}>
            {words}
          </option>
        ))}
      </Select>
    </Field>
  );
}
