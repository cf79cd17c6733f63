import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { planningValueTraits } from '@steelyard/calc';
import { useState } from 'react';
import { type UseFormReturn, useWatch } from 'react-hook-form';
import { NumberField } from '../../../shared/ui/number-field';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import type { OptionDraft } from '../../designs/families/family-ui';
import { useLedgerStyles } from '../../weigh/components/ledger-styles';
import { type Assumption, sourceInWords } from '../../weigh/model/assumptions';

const useStyles = makeStyles({
  line: {
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr) auto auto',
    gap: '2px 8px',
    alignItems: 'center',
  },
  own: {
    gridColumn: '1 / -1',
    display: 'grid',
    gap: '8px',
    marginTop: '4px',
    padding: '8px 10px',
    borderLeft: `3px solid ${tokens.colorBrandForeground1}`,
  },
});

interface OverrideFieldsProps {
  form: UseFormReturn<OptionDraft>;
  assumption: Assumption;
  outcomeUnit: string;
}

/** A planning value as the ledger has it and, beside it, the option's own with the reason. */
export function OverrideFields({ form, assumption, outcomeUnit }: OverrideFieldsProps) {
  const styles = { ...useStyles(), ...useLedgerStyles() };
  const { key, label, ledger } = assumption;
  const override = useWatch({ control: form.control, name: `plan.overrides.${key}` });
  const [opened, setOpened] = useState(false);
  const open = opened || override !== undefined;
  const { unit } = planningValueTraits[key];

  const takeLedger = () => {
    form.setValue(`plan.overrides.${key}`, undefined, { shouldDirty: true });
    form.clearErrors(`plan.overrides.${key}`);
    setOpened(false);
  };

  return (
    <div className={styles.line}>
      <span className={styles.label}>{label}</span>
      <span className={styles.value}>{ledger?.value ?? 'not stated'}</span>
      <Button
        size="small"
        appearance="subtle"
        aria-label={open ? `Take ${label} from the ledger` : `Override ${label}`}
        onClick={() => (open ? takeLedger() : setOpened(true))}
      >
        {open ? 'Undo' : 'Override'}
      </Button>
      {ledger && <span className={styles.note}>{sourceInWords(ledger)}</span>}
      {open && (
        <div className={styles.own}>
          <NumberField
            beside
            label={`${label}, here`}
            kind={unit === 'proportion' ? 'percent' : 'number'}
            unit={unit === 'outcome' ? outcomeUnit : undefined}
            control={form.control}
            name={`plan.overrides.${key}.value`}
          />
          <TextAreaField
            label={`Reason for this ${label}`}
            control={form.control}
            name={`plan.overrides.${key}.reason`}
          />
        </div>
      )}
    </div>
  );
}
