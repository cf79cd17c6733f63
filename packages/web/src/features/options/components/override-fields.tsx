import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { planningValueTraits } from '@steelyard/calc';
import { useState } from 'react';
import { type UseFormReturn, useWatch } from 'react-hook-form';
import { NumberField } from '../../../shared/ui/number-field';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import type { OptionDraft } from '../../designs/families/family-ui';
import type { Assumption } from '../../weigh/model/assumptions';

const useStyles = makeStyles({
  line: {
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr) auto auto',
    gap: '2px 8px',
    alignItems: 'center',
  },
  label: { overflowWrap: 'anywhere' },
  value: {
    minWidth: '72px',
    padding: '2px 9px',
    textAlign: 'end',
    borderRadius: '5px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: ownTokens.brassSoft,
  },
  note: {
    gridColumn: '1 / -1',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '17px',
    overflowWrap: 'anywhere',
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
  const styles = useStyles();
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
      {ledger && (
        <span className={styles.note}>
          {[...(ledger.range ? [ledger.range] : []), ledger.source].join(' · ')}
        </span>
      )}
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
