import { makeStyles, tokens } from '@fluentui/react-components';
import { type LimitsView, newLimitsSchema } from '@steelyard/api/contract/limits';
import type { LimitKey, Limits } from '@steelyard/calc';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { capitalised } from '../../../shared/format/lists';
import { NumberField } from '../../../shared/ui/number-field';
import { textOf } from '../../../shared/ui/number-field-text';
import { keepLimits, putLimits } from '../../designs/api/design-set';
import { useKeptForm } from '../../unsaved/api/use-kept-form';
import { BothVersionsByHistory } from '../../unsaved/components/both-versions';
import { KeptDialog } from '../../unsaved/components/kept-dialog';
import { differencesOf } from '../../unsaved/model/differences';
import type { Weighing } from '../model/weighing';

const useStyles = makeStyles({
  told: { color: tokens.colorNeutralForeground2 },
});

interface LimitsDialogProps {
  weighing: Weighing;
  /** The limit to begin at. */
  first: LimitKey | undefined;
  onClose: () => void;
}

interface LimitsForm {
  limits: Limits;
}

const limitsOf = (view: LimitsView | null): LimitsForm => ({ limits: view?.limits ?? {} });
const bodyOf = ({ limits }: LimitsForm, version: number | null) => ({ limits, version });

/** The most that exists of each thing an option takes. */
export function LimitsDialog({ weighing, first, onClose }: LimitsDialogProps) {
  const styles = useStyles();
  const queryClient = useQueryClient();
  const { study, limits, currency } = weighing;
  const { clusters } = study;
  const kept = useKeptForm({
    what: `${study.id}/limits`,
    view: limits,
    valuesOf: limitsOf,
    schema: newLimitsSchema,
    bodyOf,
    send: (body) => putLimits(study.id, body),
    onStored: (view) => keepLimits(queryClient, study.id, view),
  });
  const { control, setFocus } = kept.form;
  const labels: Record<LimitKey, string> = {
    clusters: capitalised(clusters?.many ?? 'clusters'),
    participantsPerCluster: `${capitalised(study.participants.many)} in each ${clusters?.one ?? 'cluster'}`,
    money: 'Money',
    months: 'Months',
  };
  const labelOf = (key: string) => labels[key as LimitKey];
  return (
    <KeptDialog
      title="Limits"
      label="Limits"
      verb="Set the limits"
      kept={kept}
      conflict={
        kept.theirs && (
          <BothVersionsByHistory
            studyId={study.id}
            what="limits"
            differences={differencesOf(told(kept.values), told(limitsOf(kept.theirs.view)), labelOf)}
            onKeepMine={kept.keepMine}
            onTakeTheirs={kept.takeTheirs}
          />
        )
      }
      onClose={onClose}
    >
      <Focused on={() => first && setFocus(`limits.${first}`)} />
      <p className={styles.told}>The most that exists. What is left empty has no limit.</p>
      {clusters && (
        <>
          <NumberField label={labels.clusters} kind="whole" control={control} name="limits.clusters" />
          <NumberField
            label={labels.participantsPerCluster}
            kind="whole"
            control={control}
            name="limits.participantsPerCluster"
          />
        </>
      )}
      <NumberField label={labels.money} kind="money" unit={currency} control={control} name="limits.money" />
      <NumberField label={labels.months} unit="months" control={control} name="limits.months" />
    </KeptDialog>
  );
}

/** Every limit as its field shows it, a missing one too: that there is none may be what was meant. */
const told = ({ limits }: LimitsForm): Record<LimitKey, string> => ({
  clusters: textOf(limits.clusters, 'whole') || 'no limit',
  participantsPerCluster: textOf(limits.participantsPerCluster, 'whole') || 'no limit',
  money: textOf(limits.money, 'money') || 'no limit',
  months: textOf(limits.months, 'number') || 'no limit',
});

/** Puts the focus where it belongs once the fields are there. */
function Focused({ on }: { on: () => void }) {
  useEffect(on, []);
  return null;
}
