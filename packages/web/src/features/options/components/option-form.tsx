import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { type FieldPath, useForm } from 'react-hook-form';
import { ApiError } from '../../../shared/api/client';
import { placeFaults } from '../../../shared/api/faults';
import { capitalised } from '../../../shared/format/lists';
import { count } from '../../../shared/format/numbers';
import { Form, TextField } from '../../../shared/ui/form';
import { NumberField } from '../../../shared/ui/number-field';
import { TitledSection } from '../../../shared/ui/titled-section';
import { Word } from '../../../shared/ui/words';
import { sessionQuery } from '../../access/api/access';
import { keepOption } from '../../designs/api/design-set';
import type { OptionDraft } from '../../designs/families/family-ui';
import { familyUiOf } from '../../designs/families/registry';
import { draftKey, dropDraft, keepDraft } from '../../designs/model/drafts';
import { cleaned, draftOf, optionDraftSchema, sameOption } from '../../designs/model/option-draft';
import { assumptionsOf } from '../../weigh/model/assumptions';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import { changeOption } from '../api/options';
import { Conflict } from './conflict';
import { OverrideFields } from './override-fields';
import { TreatmentsField } from './treatments-field';

const useStyles = makeStyles({
  fields: { display: 'grid', gap: '10px' },
  take: { justifySelf: 'end' },
  actions: {
    position: 'sticky',
    bottom: 0,
    // The panel that scrolls beside the beams is padded this far below.
    '@media (min-width: 1280px)': { bottom: '-20px' },
    zIndex: 1,
    padding: '10px 0 14px',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
    display: 'flex',
    flexWrap: 'wrap',
    justifyContent: 'flex-end',
    alignItems: 'center',
    gap: '8px',
  },
  told: { flexGrow: 1, color: tokens.colorNeutralForeground2, fontSize: '13px' },
});

/** An option as a form: each edit is drawn at once and kept on this device; Save stores it. */
export function OptionForm({ option, weighing }: { option: Weighed; weighing: Weighing }) {
  const styles = useStyles();
  const { study, ledger, hold } = weighing;
  const { stored, draft, plan, words } = option;
  const queryClient = useQueryClient();
  const personId = useQuery(sessionQuery()).data?.id ?? '';
  const key = draftKey(personId, option.id);
  // Another person stored something else meanwhile; nothing can be saved before that is settled.
  const conflicting = draft !== undefined && !sameOption(draftOf(stored), draft.base);
  const [fault, setFault] = useState<string>();
  const [saved, setSaved] = useState(false);
  const form = useForm<OptionDraft>({
    mode: 'onChange',
    defaultValues: draft ? { name: draft.name, plan: draft.plan } : draftOf(stored),
    resolver: (values, context, options) =>
      zodResolver<OptionDraft, unknown, OptionDraft>(optionDraftSchema as never)(
        cleaned(values),
        context,
        options,
      ),
  });
  const { control, handleSubmit, setError, watch, formState } = form;

  useEffect(() => {
    const base = draft?.base ?? draftOf(stored);
    const { unsubscribe } = watch((values) => {
      const edited = structuredClone(values) as OptionDraft;
      if (sameOption(edited, base)) return dropDraft(key);
      setSaved(false);
      keepDraft(key, { ...edited, base });
    });
    return unsubscribe;
  }, [watch, draft?.base, stored, key]);

  useEffect(() => {
    if (!draft) form.reset(draftOf(stored));
  }, [stored.version]);

  const takeStored = () => {
    form.reset(draftOf(stored));
    dropDraft(key);
  };

  const save = async (values: OptionDraft) => {
    setFault(undefined);
    try {
      const option = await changeOption(study.id, stored.id, { version: stored.version, ...values });
      const typed = form.getValues();
      // More may have been typed while this was on its way.
      if (sameOption(typed, values)) dropDraft(key);
      else keepDraft(key, { ...structuredClone(typed), base: draftOf(option) });
      keepOption(queryClient, study.id, option);
      setSaved(true);
    } catch (error) {
      const current = error instanceof ApiError ? error.problem.current : undefined;
      if (current) keepOption(queryClient, study.id, current as typeof stored);
      setFault(placeFaults(error, fieldsOf(values), setError));
    } finally {
      void queryClient.invalidateQueries({ queryKey: ['studies', study.id] });
    }
  };

  const face = familyUiOf(plan.family);
  const taken = option.appraisal?.feasible ? option.appraisal.units : undefined;
  const entered = watch('plan.units');
  return (
    <Form label="Option" fault={conflicting ? undefined : fault} onSubmit={() => void handleSubmit(save)()}>
      {conflicting && (
        <Conflict
          studyId={study.id}
          draft={draft}
          stored={stored}
          onKeepMine={() => keepDraft(key, { ...draft, base: draftOf(stored) })}
          onTakeTheirs={takeStored}
        />
      )}
      <div className={styles.fields}>
        <TextField label="Name" autoComplete="off" control={control} name="name" />
        <NumberField
          beside
          kind="whole"
          label={face.sizeNoun(plan, words)}
          hint={hold.kind === 'sizes' ? undefined : 'Kept when the hold is Sizes.'}
          control={control}
          name="plan.units"
        />
        {hold.kind !== 'sizes' && taken !== undefined && taken !== entered && (
          <Button
            size="small"
            className={styles.take}
            onClick={() => form.setValue('plan.units', taken, { shouldDirty: true, shouldValidate: true })}
          >
            Enter {count(taken)}, as taken now
          </Button>
        )}
        {stored.plan.clusterSize !== undefined && (
          <NumberField
            beside
            kind="whole"
            label={`${capitalised(words.participants.many)} in each ${words.clusters.one}`}
            control={control}
            name="plan.clusterSize"
          />
        )}
      </div>
      <TitledSection level={3} title="Structure">
        <div className={styles.fields}>
          <TreatmentsField form={form} study={study} />
          <face.Structure control={control} study={study} plan={plan} />
        </div>
      </TitledSection>
      <TitledSection
        level={3}
        title={
          <>
            From the <Word is="ledger">ledger</Word>
          </>
        }
      >
        <div className={styles.fields}>
          {assumptionsOf(option, ledger, study.outcomeUnit).map((assumption) => (
            <OverrideFields
              key={assumption.key}
              form={form}
              assumption={assumption}
              outcomeUnit={study.outcomeUnit}
            />
          ))}
        </div>
      </TitledSection>
      <div className={styles.actions}>
        <span role="status" className={styles.told}>
          {draft ? 'Edits not saved' : saved && 'Saved'}
        </span>
        {draft && !conflicting && <Button onClick={takeStored}>Discard</Button>}
        <Button
          type="submit"
          appearance="primary"
          disabledFocusable={!draft || conflicting || formState.isSubmitting}
        >
          Save
        </Button>
      </div>
    </Form>
  );
}

/** Every field that the server may name in a refusal. */
function fieldsOf({ plan }: OptionDraft): FieldPath<OptionDraft>[] {
  const shares = Array.isArray(plan.structure.allocation) ? plan.structure.allocation : [];
  return [
    'name',
    'plan.units',
    'plan.clusterSize',
    'plan.treatments',
    'plan.repeated.baselines',
    'plan.repeated.followUps',
    ...shares.map((_, arm) => `plan.structure.allocation.${arm}` as FieldPath<OptionDraft>),
    ...Object.keys(plan.overrides).map((key) => `plan.overrides.${key}.value` as FieldPath<OptionDraft>),
  ];
}
