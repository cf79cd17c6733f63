import { makeStyles, tokens } from '@fluentui/react-components';
import { newCostPlanSchema } from '@steelyard/api/contract/costs';
import { useQueryClient } from '@tanstack/react-query';
import { type ReactNode, useDeferredValue, useMemo, useState } from 'react';
import type { Control, FieldPath } from 'react-hook-form';
import { Form, TextField } from '../../../shared/ui/form';
import { NumberField } from '../../../shared/ui/number-field';
import { TitledSection } from '../../../shared/ui/titled-section';
import { SaveEnd } from '../../studies/components/save-end';
import { toReplace } from '../../studies/model/assumed';
import { type Effect, effectsOf, type Stored } from '../../studies/model/effects';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { BothVersionsByHistory } from '../../unsaved/components/both-versions';
import { differencesOf } from '../../unsaved/model/differences';
import { keepCosts, putCosts } from '../api/costs';
import { type CostValues, costBodyOf, costValuesOf, typedCosts } from '../model/cost-form';
import {
  costLabel,
  type MoneyLine,
  overheadLine,
  ownLines,
  sharedLines,
  timeLines,
  treatmentLines,
  treatmentName,
} from '../model/cost-lines';

const useStyles = makeStyles({
  fields: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fill, minmax(min(100%, 230px), 1fr))',
    gap: '14px 18px',
    alignItems: 'start',
    marginBottom: '8px',
  },
  told: { marginBottom: '8px', color: tokens.colorNeutralForeground2 },
  group: { margin: '0 0 8px', padding: 0, border: 'none', minWidth: 0 },
  legend: { padding: 0, fontWeight: 700 },
});

/** Money and months as the methodologist and the investigator state them. */
export function CostsForm({ stored }: { stored: Stored }) {
  const styles = useStyles();
  const queryClient = useQueryClient();
  const { study, costs } = stored;
  const treatments = study.treatments.length;
  const [saved, setSaved] = useState<Effect[]>();
  const kept = useKeptForm({
    what: `${study.id}/costs`,
    view: costs,
    valuesOf: (view) => costValuesOf(view ?? costs, treatments),
    schema: newCostPlanSchema,
    bodyOf: costBodyOf,
    send: (body) => putCosts(study.id, body),
    onStored: (view) => view && keepCosts(queryClient, study.id, view),
    onSaved: (view) => setSaved(effectsOf(stored, { costs: view })),
  });
  const { form, values, fault, theirs, submit, takeTheirs, keepMine } = kept;
  const typed = useDeferredValue(JSON.stringify(typedCosts(values) ?? null));
  const effects = useMemo(() => {
    const plan = JSON.parse(typed);
    return plan ? effectsOf(stored, { costs: plan }) : undefined;
  }, [stored, typed]);
  const { control } = form;
  const { currency } = values.costs;

  return (
    <Form label="Costs and accrual" onSubmit={() => void submit()} fault={fault}>
      {theirs?.view && (
        <BothVersionsByHistory
          studyId={study.id}
          what="costs and accrual"
          differences={differencesOf(values, costValuesOf(theirs.view, treatments), costLabel(study))}
          onKeepMine={keepMine}
          onTakeTheirs={takeTheirs}
        />
      )}
      <Part title="Shared by all arms">
        <TextField
          label="Currency"
          hint="Such as EUR, GBP or USD."
          control={control}
          name="costs.currency"
          autoComplete="off"
        />
        {sharedLines(study).map((line) => (
          <Money key={line.key} line={line} unit={currency} control={control} />
        ))}
      </Part>
      <Part title="Of each arm’s own">
        {ownLines.map((line) => (
          <Money key={line.key} line={line} unit={currency} control={control} />
        ))}
        <Money line={overheadLine} unit="%" control={control} />
      </Part>
      <TitledSection title="By treatment" level={2}>
        {treatmentLines(study).map(({ key, label, hint }) => (
          <fieldset key={key} className={styles.group}>
            <legend className={styles.legend}>{label}</legend>
            <p className={styles.told}>{hint}</p>
            <div className={styles.fields}>
              {study.treatments.map(({ name }, place) => (
                <NumberField
                  key={`${place} ${name}`}
                  kind="money"
                  label={treatmentName(study, place)}
                  unit={currency}
                  control={control}
                  name={`costs.${key}.${place}` as FieldPath<CostValues>}
                />
              ))}
            </div>
          </fieldset>
        ))}
      </TitledSection>
      <Part title="Accrual and months">
        {timeLines(study).map(({ key, label, unit, hint }) => (
          <NumberField
            key={key}
            label={label}
            unit={unit}
            hint={hint}
            control={control}
            name={`timeline.${key}`}
          />
        ))}
      </Part>
      <TitledSection title="Where the figures come from" level={2}>
        <TextField
          label="Source"
          hint={
            costs.source === toReplace
              ? `It says “${toReplace}”: these are round figures until you put your own in their place.`
              : 'A quotation, a budget, or who judged them and how.'
          }
          control={control}
          name="source"
          autoComplete="off"
        />
      </TitledSection>
      <SaveEnd
        verb="Save costs and accrual"
        currency={currency}
        kept={kept}
        effects={effects}
        saved={saved}
      />
    </Form>
  );
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  const styles = useStyles();
  return (
    <TitledSection title={title} level={2}>
      <div className={styles.fields}>{children}</div>
    </TitledSection>
  );
}

function Money({ line, unit, control }: { line: MoneyLine; unit: string; control: Control<CostValues> }) {
  const { key, label, hint, kind = 'money' } = line;
  return (
    <NumberField kind={kind} label={label} unit={unit} hint={hint} control={control} name={`costs.${key}`} />
  );
}
