import { Button, makeStyles, tokens } from '@fluentui/react-components';
import type { StudyView } from '@steelyard/api/contract/studies';
import { studyStartSchema } from '@steelyard/api/contract/study-start';
import { useQueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Form, TextField } from '../../../shared/ui/form';
import { NumberField } from '../../../shared/ui/number-field';
import { RadioField } from '../../../shared/ui/radio-field';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { TitledSection } from '../../../shared/ui/titled-section';
import { startStudy, studyQuery } from '../api/studies';
import { useKeptForm } from '../api/use-kept-form';
import { toReplace } from '../model/assumed';
import { newStudyBodyOf, newStudyValues } from '../model/new-study-form';

const useStyles = makeStyles({
  form: { maxWidth: '640px' },
  part: { display: 'grid', gap: '14px' },
  pair: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fit, minmax(min(100%, 200px), 1fr))',
    gap: '14px',
    alignItems: 'start',
  },
  told: { color: tokens.colorNeutralForeground2 },
  actions: { display: 'flex', flexWrap: 'wrap', gap: '8px', alignItems: 'center' },
});

/** All that is needed to weigh a first option; the rest is assumed until somebody replaces it. */
export function NewStudyForm({ onStarted }: { onStarted: (study: StudyView) => void }) {
  const styles = useStyles();
  const queryClient = useQueryClient();
  const { form, values, changed, fault, submit, discard } = useKeptForm({
    what: 'new-study',
    view: null as StudyView | null,
    valuesOf: newStudyValues,
    schema: studyStartSchema,
    bodyOf: newStudyBodyOf,
    send: startStudy,
    onStored: (study) => {
      if (study) queryClient.setQueryData(studyQuery(study.id).queryKey, study);
      void queryClient.invalidateQueries({ queryKey: ['studies'], exact: true });
    },
    onSaved: onStarted,
  });
  const { control } = form;
  const { outcome, randomises } = values;
  const continuous = outcome.kind === 'continuous';
  const assumes = `Leave it empty where you do not know it yet: a round figure is then taken, marked “${toReplace}”.`;

  return (
    <div className={styles.form}>
      <Form label="New study" onSubmit={submit} fault={fault}>
        <Part title="The question">
          <TextAreaField
            label="Question"
            rows={3}
            hint="In words, such as: does the gel lower pain by 1 point in stable neuropathic pain?"
            control={control}
            name="question"
          />
          <div className={styles.pair}>
            <TextField label="Name of the study" control={control} name="name" autoComplete="off" />
            <TextField
              label="Organisation"
              control={control}
              name="organisation"
              autoComplete="organization"
            />
          </div>
          <div className={styles.pair}>
            <TextField label="Control" control={control} name="treatments.0.name" autoComplete="off" />
            <TextField
              label="Active treatment"
              control={control}
              name="treatments.1.name"
              autoComplete="off"
            />
          </div>
        </Part>
        <Part title="Outcome and target difference">
          <TextField
            label="Outcome"
            hint="What is measured in each participant, and when."
            control={control}
            name="outcome.label"
            autoComplete="off"
          />
          <RadioField
            label="Kind of outcome"
            control={control}
            name="outcome.kind"
            choices={[
              { value: 'continuous', label: 'Continuous: a measured amount, compared by its mean' },
              { value: 'binary', label: 'Binary: it happens or it does not, compared by proportions' },
            ]}
            onChosen={() => form.setValue('outcome.difference', undefined)}
          />
          {continuous && (
            <TextField
              label="Unit"
              hint="As it stands behind a number, such as g/L; empty where there is none."
              control={control}
              name="outcome.unit"
              autoComplete="off"
            />
          )}
          <div className={styles.pair}>
            <NumberField
              key={`difference-${outcome.kind}`}
              label={continuous ? 'Target difference' : 'Target difference, in percentage points'}
              hint="The smallest the trial must be able to find. Active minus control: negative where it lowers the outcome."
              kind={continuous ? 'number' : 'percent'}
              {...(continuous ? { unit: outcome.unit } : {})}
              control={control}
              name="outcome.difference"
            />
            {continuous ? (
              <NumberField
                key="sd"
                label="Standard deviation"
                hint={assumes}
                unit={outcome.unit}
                control={control}
                name="sd"
              />
            ) : (
              <NumberField
                key="proportion"
                label="Control proportion"
                hint={assumes}
                kind="percent"
                control={control}
                name="controlProportion"
              />
            )}
          </div>
        </Part>
        <Part title="Who takes part">
          <div className={styles.pair}>
            <TextField
              label="One participant"
              hint="Your own word, such as girl."
              control={control}
              name="participants.one"
              autoComplete="off"
            />
            <TextField
              label="Several participants"
              hint="Such as girls."
              control={control}
              name="participants.many"
              autoComplete="off"
            />
          </div>
          <RadioField
            label="What is randomised"
            control={control}
            name="randomises"
            choices={[
              { value: 'individuals', label: 'Individuals' },
              { value: 'clusters', label: 'Clusters: whole practices, schools, villages' },
            ]}
          />
          {randomises === 'clusters' && (
            <div className={styles.pair}>
              <TextField
                label="One cluster"
                hint="Your own word, such as practice."
                control={control}
                name="clusters.one"
                autoComplete="off"
              />
              <TextField
                label="Several clusters"
                hint="Such as practices."
                control={control}
                name="clusters.many"
                autoComplete="off"
              />
            </div>
          )}
        </Part>
        <p className={styles.told}>
          A first option is drawn for you. Costs, months, attrition and the like are round figures marked “
          {toReplace}” in the ledger and under costs, until you put what you know in their place.
        </p>
        <div className={styles.actions}>
          <Button type="submit" appearance="primary" disabledFocusable={form.formState.isSubmitting}>
            Start weighing
          </Button>
          {changed && <Button onClick={discard}>Clear the form</Button>}
        </div>
      </Form>
    </div>
  );
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  const styles = useStyles();
  return (
    <TitledSection title={title} level={2}>
      <div className={styles.part}>{children}</div>
    </TitledSection>
  );
}
