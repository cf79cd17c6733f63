import { Button, Field, makeStyles, Radio, RadioGroup } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { useController, useForm } from 'react-hook-form';
import { useChange } from '../../../shared/api/use-change';
import { DialogBox } from '../../../shared/ui/dialog-box';
import { Form } from '../../../shared/ui/form';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { dropValues, keptValues, useKeptValues } from '../../../shared/ui/use-kept-values';
import { sessionQuery } from '../../access/api/access';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import { recordChoice } from '../api/options';
import { type ChoiceForm, choiceFormSchema, choiceOf } from '../model/choice-form';

const useStyles = makeStyles({
  actions: { display: 'flex', flexWrap: 'wrap', justifyContent: 'flex-end', gap: '8px' },
});

/** Which option, why, and why not each other. */
export function ChoiceDialog({ weighing, onClose }: { weighing: Weighing; onClose: () => void }) {
  const styles = useStyles();
  const { study, designSet, options } = weighing;
  const { choice } = designSet;
  const { change, fault, stale, busy } = useChange(study.id);
  const key = `steelyard-choice/${useQuery(sessionQuery()).data?.id}/${study.id}`;
  const form = useForm<ChoiceForm>({
    defaultValues: keptValues<ChoiceForm>(key) ?? choiceOf(choice),
    resolver: zodResolver(choiceFormSchema(options)),
  });
  useKeptValues(form, key);
  const { control, handleSubmit, watch } = form;
  const { field, fieldState } = useController({ control, name: 'optionId' });
  const chosen = watch('optionId');
  const others = options.filter(({ id }) => id !== chosen);
  const theirs = options.find(({ id }) => id === choice?.optionId);
  const now = theirs ? `Now the choice is ${theirs.name}: ${choice?.why}` : 'Now there is no choice.';

  const send = handleSubmit(({ optionId, why, whyNot }) =>
    change(() =>
      recordChoice(study.id, {
        version: designSet.version,
        optionId,
        why,
        whyNot: others.flatMap(({ id }) => {
          const reason = whyNot[id]?.trim();
          return reason ? [{ optionId: id, why: reason }] : [];
        }),
      }),
    ).then((done) => {
      if (!done) return;
      dropValues(key);
      onClose();
    }),
  );

  return (
    <DialogBox title="Record the choice" onClose={onClose}>
      {(close) => (
        <Form
          label="Choice"
          fault={stale ? `${fault} ${now} Record yours in its place, or cancel.` : fault}
          onSubmit={() => void send()}
        >
          <Field
            label="The option settled on"
            validationState={fieldState.error ? 'error' : 'none'}
            validationMessage={fieldState.error?.message}
          >
            <RadioGroup value={field.value} onChange={(_, { value }) => field.onChange(value)}>
              {options.filter(mayBeChosen).map(({ id, letter, name }) => (
                <Radio key={id} value={id} label={`${letter}, ${name}`} />
              ))}
            </RadioGroup>
          </Field>
          <TextAreaField label="Why this one" rows={3} control={control} name="why" />
          {chosen &&
            others.map((option) => (
              <TextAreaField
                key={option.id}
                label={`Why not ${option.letter}, ${option.name}`}
                hint={mayBeChosen(option) ? undefined : `Ruled out: ${option.ruling?.reason}`}
                control={control}
                name={`whyNot.${option.id}`}
              />
            ))}
          <div className={styles.actions}>
            <Button
              onClick={() => {
                dropValues(key);
                close();
              }}
            >
              Cancel
            </Button>
            <Button type="submit" appearance="primary" disabledFocusable={busy}>
              Record the choice
            </Button>
          </div>
        </Form>
      )}
    </DialogBox>
  );
}

const mayBeChosen = ({ ruling }: Weighed): boolean => ruling?.kind !== 'not-admissible';
