import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { type LimitKey, type Limits, limitsSchema } from '@steelyard/calc';
import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useForm } from 'react-hook-form';
import { useChange } from '../../../shared/api/use-change';
import { capitalised, list } from '../../../shared/format/lists';
import { DialogBox } from '../../../shared/ui/dialog-box';
import { Form } from '../../../shared/ui/form';
import { NumberField } from '../../../shared/ui/number-field';
import { dropValues, keptValues, useKeptValues } from '../../../shared/ui/use-kept-values';
import { sessionQuery } from '../../access/api/access';
import { putLimits } from '../../designs/api/design-set';
import { limitChips } from '../model/standing-words';
import type { Weighing } from '../model/weighing';

const useStyles = makeStyles({
  told: { color: tokens.colorNeutralForeground2 },
  actions: { display: 'flex', justifyContent: 'flex-end', gap: '8px' },
});

interface LimitsDialogProps {
  weighing: Weighing;
  /** The limit to begin at. */
  first: LimitKey | undefined;
  onClose: () => void;
}

/** The most that exists of each thing an option takes. */
export function LimitsDialog({ weighing, first, onClose }: LimitsDialogProps) {
  const styles = useStyles();
  const { study, limits, currency } = weighing;
  const { change, fault, stale, busy } = useChange(study.id);
  const key = `steelyard-limits/${useQuery(sessionQuery()).data?.id}/${study.id}`;
  const form = useForm<Limits>({
    defaultValues: keptValues<Limits>(key) ?? limits.limits,
    resolver: zodResolver(limitsSchema),
  });
  useKeptValues(form, key);
  const { control, handleSubmit, setFocus } = form;
  const clusters = study.clusters;
  const now = limitChips(weighing).map(({ says }) => says);
  const told = stale
    ? `${fault} Now: ${list(now) || 'no limits'}. Save yours in their place, or cancel.`
    : fault;
  return (
    <DialogBox title="Limits" onClose={onClose}>
      {(close) => (
        <Form
          label="Limits"
          fault={told}
          onSubmit={() =>
            void handleSubmit(async (next) => {
              const body = { version: limits.version, limits: next };
              if (!(await change(() => putLimits(study.id, body)))) return;
              dropValues(key);
              close();
            })()
          }
        >
          <Focused on={() => first && setFocus(first)} />
          <p className={styles.told}>The most that exists. What is left empty has no limit.</p>
          {clusters && (
            <>
              <NumberField
                label={capitalised(clusters.many)}
                kind="whole"
                control={control}
                name="clusters"
              />
              <NumberField
                label={`${capitalised(study.participants.many)} in each ${clusters.one}`}
                kind="whole"
                control={control}
                name="participantsPerCluster"
              />
            </>
          )}
          <NumberField label="Money" kind="money" unit={currency} control={control} name="money" />
          <NumberField label="Months" unit="months" control={control} name="months" />
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
              Set the limits
            </Button>
          </div>
        </Form>
      )}
    </DialogBox>
  );
}

/** Puts the focus where it belongs once the fields are there. */
function Focused({ on }: { on: () => void }) {
  useEffect(on, []);
  return null;
}
