import { Button, makeStyles, Radio, RadioGroup } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { type Hold, holdSchema } from '@steelyard/calc';
import { useQuery } from '@tanstack/react-query';
import { Controller, useForm } from 'react-hook-form';
import { useChange } from '../../../shared/api/use-change';
import { DialogBox } from '../../../shared/ui/dialog-box';
import { Form } from '../../../shared/ui/form';
import { NumberField } from '../../../shared/ui/number-field';
import { dropValues, keptValues, useKeptValues } from '../../../shared/ui/use-kept-values';
import { sessionQuery } from '../../access/api/access';
import { putDesignSet } from '../../designs/api/design-set';
import { holdInWords } from '../model/hold-words';
import type { Weighing } from '../model/weighing';

const useStyles = makeStyles({
  actions: { display: 'flex', justifyContent: 'flex-end', gap: '8px' },
});

interface HoldForm {
  kind: Hold['kind'];
  power: number | undefined;
  budget?: number | undefined;
}

export const holdMeanings: Record<Hold['kind'], string> = {
  power: 'Power: each option takes the fewest units that reach it.',
  budget: 'Budget: each option takes the most units within it.',
  sizes: 'Sizes: each option keeps the size entered for it.',
};

/** What is kept equal, and at what. */
export function HoldDialog({ weighing, onClose }: { weighing: Weighing; onClose: () => void }) {
  const styles = useStyles();
  const { study, designSet, hold, limits, currency } = weighing;
  const { change, fault, stale, busy } = useChange(study.id);
  const key = `steelyard-hold/${useQuery(sessionQuery()).data?.id}/${study.id}`;
  const form = useForm<HoldForm, unknown, Hold>({
    defaultValues: keptValues<HoldForm>(key) ?? {
      kind: hold.kind,
      power: hold.power,
      budget: hold.kind === 'budget' ? hold.budget : limits.limits.money,
    },
    resolver: (values, context, options) => {
      const { kind, power, budget } = values;
      const asked = (kind === 'budget' ? { kind, power, budget } : { kind, power }) as HoldForm;
      return zodResolver<HoldForm, unknown, Hold>(holdSchema as never)(asked, context, options);
    },
  });
  useKeptValues(form, key);
  const { control, handleSubmit, watch } = form;
  const kind = watch('kind');
  return (
    <DialogBox title="What is kept equal" onClose={onClose}>
      {(close) => (
        <Form
          label="Hold"
          fault={
            stale
              ? `${fault} Now: ${holdInWords(hold.kind, hold, currency)}. Save yours in its place, or cancel.`
              : fault
          }
          onSubmit={() =>
            void handleSubmit(async (next) => {
              const order = designSet.options.map(({ id }) => id);
              const body = { version: designSet.version, hold: next, order };
              if (!(await change(() => putDesignSet(study.id, body)))) return;
              dropValues(key);
              close();
            })()
          }
        >
          <Controller
            control={control}
            name="kind"
            render={({ field }) => (
              <RadioGroup
                aria-label="Keep equal"
                value={field.value}
                onChange={(_, data) => field.onChange(data.value)}
              >
                {Object.entries(holdMeanings).map(([value, label]) => (
                  <Radio key={value} value={value} label={label} />
                ))}
              </RadioGroup>
            )}
          />
          <NumberField
            label="Power"
            kind="percent"
            hint={kind === 'power' ? undefined : 'What every option is judged by.'}
            control={control}
            name="power"
          />
          {kind === 'budget' && (
            <NumberField label="Budget" kind="money" unit={currency} control={control} name="budget" />
          )}
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
              Hold
            </Button>
          </div>
        </Form>
      )}
    </DialogBox>
  );
}
