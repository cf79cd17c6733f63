import { Button, makeStyles } from '@fluentui/react-components';
import { type ReactNode, useEffect } from 'react';
import { count } from '../../../shared/format/numbers';
import { Form, TextField } from '../../../shared/ui/form';
import { NumberField } from '../../../shared/ui/number-field';
import { TitledSection } from '../../../shared/ui/titled-section';
import { Word } from '../../../shared/ui/words';
import { StructureForm } from '../../designs/components/structure-form';
import { familyUiOf } from '../../designs/families/registry';
import { draftOf, sameOption } from '../../designs/model/option-draft';
import { OptionBar } from '../../weigh/components/option-bar';
import { OptionDetails } from '../../weigh/components/option-details';
import { assumptionsOf } from '../../weigh/model/assumptions';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import { useOptionForm } from '../api/use-option-form';
import { Conflict } from './conflict';
import { OverrideFields } from './override-fields';

const useStyles = makeStyles({
  parts: { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr)', gap: '14px' },
  fields: { display: 'grid', gap: '10px' },
  take: { justifySelf: 'end' },
});

interface OptionFormProps {
  option: Weighed;
  weighing: Weighing;
  /** Where the option can be looked at from here. */
  looks: ReactNode;
  /** What may be done with the option as a whole. */
  actions: ReactNode;
  /** Whether its first field takes the focus. */
  focused: boolean;
  onDone: () => void;
}

/** An option as a form: each edit is drawn at once and kept on this device; Save stores it. */
export function OptionForm({ option, weighing, looks, actions, focused, onDone }: OptionFormProps) {
  const styles = useStyles();
  const { study, ledger, hold } = weighing;
  const { stored, draft, plan, words } = option;
  const { form, edited, saved, fault, submit, takeStored, keepMine } = useOptionForm(study.id, option);
  const { control, watch, formState } = form;
  // Another person stored something else meanwhile; nothing can be saved before that is settled.
  const conflicting = draft !== undefined && !sameOption(draftOf(stored), draft.base);

  useEffect(() => {
    if (focused) form.setFocus('name');
  }, [form, focused]);

  const face = familyUiOf(plan.family);
  const taken = option.appraisal?.feasible ? option.appraisal.units : undefined;
  const entered = watch('plan.units');
  return (
    <Form label="Option" fault={conflicting ? undefined : fault} onSubmit={submit}>
      {conflicting && (
        <Conflict
          studyId={study.id}
          draft={draft}
          stored={stored}
          onKeepMine={keepMine}
          onTakeTheirs={takeStored}
        />
      )}
      <OptionDetails
        option={option}
        weighing={weighing}
        actions={actions}
        fields={
          <div className={styles.parts}>
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
                  onClick={() =>
                    form.setValue('plan.units', taken, { shouldDirty: true, shouldValidate: true })
                  }
                >
                  Enter {count(taken)}, as taken now
                </Button>
              )}
              {face.clusterSizeNoun && (
                <NumberField
                  beside
                  kind="whole"
                  label={face.clusterSizeNoun(words)}
                  control={control}
                  name="plan.clusterSize"
                />
              )}
            </div>
            <TitledSection level={3} title="Structure">
              <div className={styles.fields}>
                <StructureForm form={form} study={study} plan={plan} words={words} ledger={ledger} />
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
          </div>
        }
      />
      <OptionBar
        looks={looks}
        told={formState.isSubmitting ? 'Saving' : edited ? 'Edits not saved' : saved && 'Saved'}
      >
        {edited && !conflicting && <Button onClick={takeStored}>Discard</Button>}
        {/* One button in both states: whoever has saved stands on it still. */}
        <Button
          type={edited ? 'submit' : 'button'}
          appearance={edited ? 'primary' : 'secondary'}
          disabledFocusable={conflicting}
          onClick={edited ? undefined : onDone}
        >
          {edited ? 'Save' : 'Done'}
        </Button>
      </OptionBar>
    </Form>
  );
}
