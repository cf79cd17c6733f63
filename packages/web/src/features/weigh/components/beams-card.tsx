import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { useState } from 'react';
import { beamsFinding } from '../model/beams';
import type { Weighing } from '../model/weighing';
import { Beams } from './beams';
import { BeamsTable } from './beams-table';

const useStyles = makeStyles({
  card: {
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '10px',
    backgroundColor: tokens.colorNeutralBackground1,
    overflow: 'hidden',
  },
  table: { padding: '10px 14px' },
  foot: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: '6px 16px',
    padding: '8px 14px',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '18px',
  },
  finding: { color: tokens.colorNeutralForeground1 },
  toggle: { fontWeight: 400, '@media print': { display: 'none' } },
});

interface BeamsCardProps {
  weighing: Weighing;
  selected: string | undefined;
  onSelect: (optionId: string) => void;
}

/** The options' beams, or the same figures as a table. */
export function BeamsCard({ weighing, selected, onSelect }: BeamsCardProps) {
  const styles = useStyles();
  const [asTable, setAsTable] = useState(false);
  const { options, currency } = weighing;
  return (
    <section aria-label="Options side by side" className={styles.card}>
      {asTable ? (
        <div className={styles.table}>
          <BeamsTable weighing={weighing} />
        </div>
      ) : (
        <Beams weighing={weighing} selected={selected} onSelect={onSelect} />
      )}
      <div className={styles.foot}>
        <p>
          <span className={styles.finding}>{beamsFinding(options, currency)}</span> Control outlined, active
          filled, on one scale.
        </p>
        <Button
          size="small"
          shape="circular"
          className={styles.toggle}
          aria-pressed={asTable}
          onClick={() => setAsTable(!asTable)}
        >
          Table
        </Button>
      </div>
    </section>
  );
}
