import { Button, makeStyles, tokens } from '@fluentui/react-components';
import type { OptionView } from '@steelyard/api/contract/design-sets';
import { newOptionSchema } from '@steelyard/api/contract/options';
import type { OptionPlan, Ruling } from '@steelyard/calc';
import { useQueryClient } from '@tanstack/react-query';
import { Form } from '../../../shared/ui/form';
import { RadioField } from '../../../shared/ui/radio-field';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { addOption } from '../api/options';
import { rulingWords } from '../model/ruling-words';

const useStyles = makeStyles({
  form: {
    display: 'grid',
    gap: '10px',
    padding: '10px 12px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '8px',
  },
  actions: { display: 'flex', flexWrap: 'wrap', justifyContent: 'flex-end', gap: '8px' },
});

interface AddAllTheSameProps {
  studyId: string;
  name: string;
  plan: OptionPlan;
  /** What speaks against it: the beginning of a reason. */
  against: string;
  onAdded: (optionId: string) => void;
  onCancel: () => void;
}

const begun = (): { kind: Ruling['kind']; reason: string } => ({ kind: 'not-admissible', reason: '' });

/** Adds a design that the answers speak against, with the ruling that says why it stands there. */
export function AddAllTheSame({ studyId, name, plan, against, onAdded, onCancel }: AddAllTheSameProps) {
  const styles = useStyles();
  const queryClient = useQueryClient();
  const { form, fault, busy, submit, discard } = useKeptForm({
    what: `${studyId}/add/${plan.family}`,
    view: null as OptionView | null,
    valuesOf: () => ({ ruling: begun() }),
    schema: newOptionSchema,
    bodyOf: (values) => ({ name, plan, ...values }),
    send: (body) => addOption(studyId, body),
    onStored: () => void queryClient.invalidateQueries({ queryKey: ['studies', studyId] }),
    onSaved: ({ id }) => onAdded(id),
  });
  const { control } = form;
  return (
    <Form label={`Add ${name} all the same`} fault={fault} onSubmit={() => void submit()}>
      <div className={styles.form}>
        <RadioField
          label="Ruling"
          control={control}
          name="ruling.kind"
          choices={Object.entries(rulingWords).map(([value, label]) => ({ value, label }))}
        />
        <TextAreaField
          label="Reason"
          hint={`Against it: ${against} Say why it is compared all the same.`}
          rows={3}
          control={control}
          name="ruling.reason"
        />
        <div className={styles.actions}>
          <Button
            onClick={() => {
              discard();
              onCancel();
            }}
          >
            Leave it out
          </Button>
          <Button type="submit" appearance="primary" disabledFocusable={busy}>
            Add with this ruling
          </Button>
        </div>
      </div>
    </Form>
  );
}
