import { Button, makeStyles } from '@fluentui/react-components';
import { newPlanningValueSchema } from '@steelyard/api/contract/planning-values';
import { useQueryClient } from '@tanstack/react-query';
import { useDeferredValue, useEffect, useMemo } from 'react';
import { Form, TextField } from '../../../shared/ui/form';
import { NumberField } from '../../../shared/ui/number-field';
import { EffectsTable } from '../../studies/components/effects-table';
import { toReplace } from '../../studies/model/assumed';
import { type Effect, effectsOf, type Stored, withLine } from '../../studies/model/effects';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { BothVersions } from '../../unsaved/components/both-versions';
import { differencesOf } from '../../unsaved/model/differences';
import { keepLine, putPlanningValue } from '../api/ledger';
import { lineBodyOf, lineFields, lineValuesOf, typedLine } from '../model/line-form';
import { figureOf, type Line } from '../model/lines';

const useStyles = makeStyles({
  figures: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fit, minmax(120px, 1fr))',
    gap: '12px',
    maxWidth: '560px',
  },
  actions: { display: 'flex', flexWrap: 'wrap', gap: '8px' },
});

interface LineFormProps {
  studyId: string;
  line: Line;
  stored: Stored;
  onClose: () => void;
  onSaved: (effects: Effect[]) => void;
}

/** One line of the ledger being set, with what that does to every option before it is saved. */
export function LineForm({ studyId, line, stored, onClose, onSaved }: LineFormProps) {
  const styles = useStyles();
  const queryClient = useQueryClient();
  const { kind, unit } = figureOf(line.key, stored.study);
  const { form, values, changed, fault, busy, theirs, submit, discard, takeTheirs, keepMine } = useKeptForm({
    what: `${studyId}/planning-value/${line.id}`,
    view: line.stored,
    valuesOf: lineValuesOf,
    schema: newPlanningValueSchema,
    bodyOf: useMemo(() => lineBodyOf(line), [line]),
    send: (body) => putPlanningValue(studyId, body),
    onStored: (view) => keepLine(queryClient, studyId, line, view),
    onSaved: (view) => {
      onSaved(effectsOf(stored, { ledger: withLine(stored.ledger, view) }));
      onClose();
    },
  });
  const typed = useDeferredValue(typedLine(line, values));
  const value = typed?.value;
  const { key, family } = line;
  const effects = useMemo(
    () =>
      value === undefined
        ? undefined
        : effectsOf(stored, { ledger: withLine(stored.ledger, { key, family, value }) }),
    [stored, key, family, value],
  );
  const { control, setFocus } = form;
  useEffect(() => setFocus('value'), [setFocus]);
  const field = { kind, control, ...(unit ? { unit } : {}) };

  return (
    <Form label={`Set ${line.label}`} onSubmit={() => void submit()} fault={fault}>
      {theirs && (
        <BothVersions
          differences={differencesOf(
            values,
            theirs.view && lineValuesOf(theirs.view),
            (path) => lineFields[path] ?? path,
          )}
          by={theirs.view?.setBy ?? null}
          at={theirs.view?.setAt ?? null}
          onKeepMine={keepMine}
          onTakeTheirs={takeTheirs}
        />
      )}
      <div className={styles.figures}>
        <NumberField label="Value" name="value" {...field} />
        <NumberField label="Lowest" name="low" {...field} />
        <NumberField label="Highest" name="high" {...field} />
      </div>
      <TextField
        label="Source"
        hint={
          line.assumed
            ? `It says “${toReplace}” until you say where the value comes from.`
            : 'A paper, a pilot, a register, or who judged it and how.'
        }
        control={control}
        name="source"
        autoComplete="off"
      />
      {effects && changed && (
        <EffectsTable
          label={`Options before and after ${line.label} changes`}
          effects={effects}
          currency={stored.costs.costs.currency}
        />
      )}
      <div className={styles.actions}>
        <Button type="submit" appearance="primary" disabledFocusable={!changed || busy}>
          Save
        </Button>
        <Button
          onClick={() => {
            discard();
            onClose();
          }}
        >
          {changed ? 'Discard my changes' : 'Close'}
        </Button>
      </div>
    </Form>
  );
}
