import { makeStyles, tokens } from '@fluentui/react-components';

const useStyles = makeStyles({
  facts: { display: 'grid', rowGap: '4px', marginBottom: '8px' },
  fact: {
    display: 'flex',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'baseline',
    columnGap: '12px',
  },
  name: { flex: '1 1 60%', overflowWrap: 'anywhere' },
  note: {
    flexBasis: '100%',
    marginTop: '-2px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '17px',
  },
  value: { fontWeight: 700, textAlign: 'end', color: tokens.colorNeutralForeground1 },
});

export interface Fact {
  name: string;
  value: string;
  note?: string;
}

/** Names and their values, one pair a line. */
export function Facts({ facts }: { facts: readonly Fact[] }) {
  const styles = useStyles();
  return (
    <dl className={styles.facts}>
      {facts.map(({ name, value, note }) => (
        <div key={name} className={styles.fact}>
          <dt className={styles.name}>{name}</dt>
          <dd className={styles.value}>{value}</dd>
          {note && <dd className={styles.note}>{note}</dd>}
        </div>
      ))}
    </dl>
  );
}
