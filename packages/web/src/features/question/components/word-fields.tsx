import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { type Control, useFieldArray } from 'react-hook-form';
import { TextField } from '../../../shared/ui/form';
import type { QuestionValues } from '../model/question-form';

const useStyles = makeStyles({
  pair: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fit, minmax(160px, 1fr))',
    gap: '12px',
    alignItems: 'start',
  },
  treatment: { display: 'flex', alignItems: 'end', gap: '8px', '> :first-child': { flexGrow: 1 } },
  told: { color: tokens.colorNeutralForeground2 },
  action: { justifySelf: 'start', flexShrink: 0 },
});

interface PartProps {
  control: Control<QuestionValues>;
}

/** What the study calls its participants and its clusters. */
export function NounFields({ control }: PartProps) {
  const styles = useStyles();
  const noun = (label: string, name: 'participants' | 'clusters') => (
    <div className={styles.pair}>
      <TextField label={`One ${label}`} control={control} name={`${name}.one`} autoComplete="off" />
      <TextField label={`Several ${label}s`} control={control} name={`${name}.many`} autoComplete="off" />
    </div>
  );
  return (
    <>
      <p className={styles.told}>
        The screens speak your words: “girl” and “girls”, “catchment” and “catchments”. Leave the clusters
        empty where nothing but individuals could be randomised.
      </p>
      {noun('participant', 'participants')}
      {noun('cluster', 'clusters')}
    </>
  );
}

/** The study’s treatments, control first. */
export function TreatmentFields({ control, least }: PartProps & { least: number }) {
  const styles = useStyles();
  const { fields, append, remove } = useFieldArray({ control, name: 'treatments' });
  return (
    <>
      {fields.map(({ id }, index) => (
        <div key={id} className={styles.treatment}>
          <TextField
            label={index === 0 ? 'Control' : `Active treatment${fields.length > 2 ? ` ${index}` : ''}`}
            control={control}
            name={`treatments.${index}.name`}
            autoComplete="off"
          />
          {index === fields.length - 1 && fields.length > least && (
            <Button
              className={styles.action}
              aria-label={`Remove active treatment ${index}`}
              onClick={() => remove(index)}
            >
              Remove
            </Button>
          )}
        </div>
      ))}
      {fields.length < 11 && (
        <Button className={styles.action} onClick={() => append({ name: '' })}>
          Add a treatment
        </Button>
      )}
    </>
  );
}
