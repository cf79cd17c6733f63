import { Button, makeStyles, tokens } from '@fluentui/react-components';
import type { StudyView } from '@steelyard/api/contract/studies';
import { studyStartSchema } from '@steelyard/api/contract/study-start';
import { useQueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { Control } from 'react-hook-form';
import { Form, TextField } from '../../../shared/ui/form';
import { NumberField } from '../../../shared/ui/number-field';
import { RadioField } from '../../../shared/ui/radio-field';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { TitledSection } from '../../../shared/ui/titled-section';
import { OutcomeKindFields } from '../../question/components/outcome-kind-fields';
import { TargetFields } from '../../question/components/target-fields';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { startStudy, studyQuery } from '../api/studies';
import { toReplace } from '../model/assumed';
import { type NewStudyValues, newStudyBodyOf, newStudyValues } from '../model/new-study-form';

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
  const { form, values, changed, fault, busy, submit, discard } = useKeptForm({
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
  const assumes = `Leave it empty where you do not know it yet: a round figure is then taken, marked “${toReplace}”.`;

  return (
    <div className={styles.form}>
      <Form label="New study" onSubmit={() => void submit()} fault={fault}>
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
          <OutcomeKindFields
            control={control}
            names={{ label: 'outcome.label', kind: 'outcome.kind', unit: 'outcome.unit' }}
            kind={outcome.kind}
            onChosen={() => form.setValue('outcome.difference', undefined)}
          />
          <div className={styles.pair}>
            <TargetFields
              control={control}
              setValue={form.setValue}
              within="outcome"
              kind={outcome.kind}
              unit={outcome.unit}
            />
            <NeededField control={control} outcome={outcome} hint={assumes} />
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
          <Button type="submit" appearance="primary" disabledFocusable={busy}>
            Start weighing
          </Button>
          {changed && <Button onClick={discard}>Clear the form</Button>}
        </div>
      </Form>
    </div>
  );
}

/** The planning value that the kind of outcome cannot do without. */
function NeededField(props: {
  control: Control<NewStudyValues>;
  outcome: NewStudyValues['outcome'];
  hint: string;
}) {
  const { outcome, ...field } = props;
  switch (outcome.kind) {
    case 'continuous':
      return <NumberField key="sd" label="Standard deviation" unit={outcome.unit} name="sd" {...field} />;
    case 'binary':
      return (
        <NumberField
          key="proportion"
          label="Control proportion"
          kind="percent"
          name="controlProportion"
          {...field}
        />
      );
    case 'time-to-event':
      return (
        <NumberField
          key="survival"
          label="Controls free of the event by then"
          kind="percent"
          name="controlSurvival"
          {...field}
        />
      );
    case 'count':
      return <NumberField key="rate" label="Control rate" name="controlRate" {...field} />;
    case 'ordinal':
      return null;
  }
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  const styles = useStyles();
  return (
    <TitledSection title={title} level={2}>
      <div className={styles.part}>{children}</div>
    </TitledSection>
  );
}
