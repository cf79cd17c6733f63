import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { Word } from '../../../shared/ui/words';
import type { Assumption } from '../model/assumptions';

const useStyles = makeStyles({
  values: { display: 'grid', rowGap: '8px' },
  line: {
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr) auto',
    columnGap: '12px',
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
  own: { border: `1px solid ${tokens.colorBrandForeground1}`, fontWeight: 700 },
  note: {
    gridColumn: '1 / 3',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '17px',
    overflowWrap: 'anywhere',
  },
});

/** The planning values an option rests on, each with its range and source, and with its override where it has one. */
export function LedgerValues({ assumptions }: { assumptions: readonly Assumption[] }) {
  const styles = useStyles();
  return (
    <dl className={styles.values}>
      {assumptions.map(({ key, label, used, ledger, reason }) => (
        <div key={key} className={styles.line}>
          <dt className={styles.label}>{label}</dt>
          <dd className={mergeClasses(styles.value, reason !== undefined && styles.own)}>{used}</dd>
          {reason && (
            <dd className={styles.note}>
              <Word is="override">Override</Word>, ledger {ledger?.value ?? 'has no value'}: {reason}
            </dd>
          )}
          {ledger && (
            <dd className={styles.note}>
              {[...(ledger.range ? [ledger.range] : []), ledger.source].join(' · ')}
            </dd>
          )}
        </div>
      ))}
    </dl>
  );
}
