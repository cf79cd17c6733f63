import { makeStyles } from '@fluentui/react-components';
import { newQuestionSchema } from '@steelyard/api/contract/question';
import { useQueryClient } from '@tanstack/react-query';
import { type ReactNode, useDeferredValue, useMemo, useState } from 'react';
import { Form, TextField } from '../../../shared/ui/form';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { TitledSection } from '../../../shared/ui/titled-section';
import { SaveEnd } from '../../studies/components/save-end';
import { type Effect, effectsOf, type Stored } from '../../studies/model/effects';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { BothVersionsByHistory } from '../../unsaved/components/both-versions';
import { differencesOf } from '../../unsaved/model/differences';
import { keepStudy, putQuestion } from '../api/question';
import { questionBodyOf, questionLabel, questionValuesOf, typedPlan } from '../model/question-form';
import { EstimandFields } from './estimand-fields';
import { BasisFields, OutcomeFields, TestFields } from './outcome-fields';
import { NounFields, TreatmentFields } from './word-fields';

const useStyles = makeStyles({
  part: { display: 'grid', gap: '14px', maxWidth: '640px' },
});

/** A study’s question as its methodologist and investigator change it. */
export function QuestionForm({ stored }: { stored: Stored }) {
  const queryClient = useQueryClient();
  const { study, designSet, costs } = stored;
  const [saved, setSaved] = useState<Effect[]>();
  const kept = useKeptForm({
    what: `${study.id}/question`,
    view: study,
    valuesOf: (view) => questionValuesOf(view ?? study),
    schema: newQuestionSchema,
    bodyOf: questionBodyOf,
    send: (body) => putQuestion(study.id, body),
    onStored: (view) => view && keepStudy(queryClient, view),
    onSaved: (view) => setSaved(effectsOf(stored, { question: view.plan })),
  });
  const { form, values, fault, theirs, submit, takeTheirs, keepMine } = kept;
  const asked = useDeferredValue(JSON.stringify(typedPlan(values) ?? null));
  const effects = useMemo(() => {
    const question = JSON.parse(asked);
    return question && asked !== JSON.stringify(study.plan) ? effectsOf(stored, { question }) : undefined;
  }, [stored, asked, study.plan]);
  const { control, setValue } = form;
  const part = { control, values, setValue };
  const currency = costs.costs.currency;

  return (
    <Form label="Question" onSubmit={() => void submit()} fault={fault}>
      {theirs?.view && (
        <BothVersionsByHistory
          studyId={study.id}
          what="the question"
          differences={differencesOf(values, questionValuesOf(theirs.view), questionLabel)}
          onKeepMine={keepMine}
          onTakeTheirs={takeTheirs}
        />
      )}
      <Part title="In words">
        <TextAreaField label="Question" rows={3} control={control} name="question" />
        <TextField label="Name of the study" control={control} name="name" autoComplete="off" />
        <TextField label="Organisation" control={control} name="organisation" autoComplete="off" />
      </Part>
      <Part title="Outcome and target difference">
        <OutcomeFields {...part} />
      </Part>
      <Part title="Basis of the target difference">
        <BasisFields {...part} />
      </Part>
      <Part title="Test">
        <TestFields {...part} />
      </Part>
      <Part title="Estimand, by the attributes of ICH E9(R1)">
        <EstimandFields control={control} />
      </Part>
      <Part title="Treatments">
        <TreatmentFields control={control} least={treatmentsCompared(designSet.options)} />
      </Part>
      <Part title="Words for people and places">
        <NounFields control={control} />
      </Part>
      <SaveEnd verb="Save the question" currency={currency} kept={kept} effects={effects} saved={saved} />
    </Form>
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

/** Options name treatments by their place: those that some option compares stay. */
const treatmentsCompared = (options: Stored['designSet']['options']): number =>
  Math.max(2, ...options.flatMap(({ plan }) => plan.treatments.map((place) => place + 1)));
