import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { Word } from '../../../shared/ui/words';
import { type Assumption, sourceInWords } from '../model/assumptions';
import { useLedgerStyles } from './ledger-styles';

const useStyles = makeStyles({
  values: { display: 'grid', rowGap: '8px' },
  line: {
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr) auto',
    columnGap: '12px',
    alignItems: 'center',
  },
  own: { border: `1px solid ${tokens.colorBrandForeground1}`, fontWeight: 700 },
});

/** The planning values an option rests on, each with its range and source, and with its override where it has one. */
export function LedgerValues({ assumptions }: { assumptions: readonly Assumption[] }) {
  const styles = { ...useStyles(), ...useLedgerStyles() };
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
          {ledger && <dd className={styles.note}>{sourceInWords(ledger)}</dd>}
        </div>
      ))}
    </dl>
  );
}
